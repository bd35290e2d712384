package binspan.planner.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadFeature;
import tools.jackson.core.json.JsonFactory;

/** JSON read back by a strict parser, duplicate names refused. */
public final class JsonTree {
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .build();

    private JsonTree() {}

    /**
     * A value.
     *
     * @param value text, number, flag, or the children of an object or list
     */
    public record Node(Object value) {
        /** Names of an object as dotted paths, objects inside it opened out. */
        public List<String> names() {
            List<String> names = new ArrayList<>();
            members().forEach((name, node) -> {
                if (node.value() instanceof Map<?, ?>) {
                    node.names().forEach(inner -> names.add(name + "." + inner));
                } else {
                    names.add(name);
                }
            });
            return names;
        }

        /** The value under names that lead inwards. */
        public Node at(String... path) {
            Node node = this;
            for (String name : path) {
                node = node.members().get(name);
            }
            return node;
        }

        public List<Node> items() {
            return ((List<?>) value).stream().map(Node.class::cast).toList();
        }

        private Map<String, Node> members() {
            Map<String, Node> members = new LinkedHashMap<>();
            ((Map<?, ?>) value).forEach((name, node) -> members.put((String) name, (Node) node));
            return members;
        }
    }

    public static Node of(String text) {
        try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), text)) {
            parser.nextToken();
            Node node = read(parser);
            if (parser.nextToken() != null) {
                throw new IllegalArgumentException("text after the value");
            }
            return node;
        }
    }

    private static Node read(JsonParser parser) {
        return switch (parser.currentToken()) {
            case START_OBJECT -> object(parser);
            case START_ARRAY -> list(parser);
            case VALUE_STRING -> new Node(parser.getString());
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Node(parser.getDoubleValue());
            case VALUE_TRUE -> new Node(true);
            case VALUE_FALSE -> new Node(false);
            default -> throw new IllegalArgumentException("found " + parser.currentToken());
        };
    }

    private static Node object(JsonParser parser) {
        Map<String, Node> members = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String name = parser.currentName();
            parser.nextToken();
            members.put(name, read(parser));
        }
        return new Node(members);
    }

    private static Node list(JsonParser parser) {
        List<Node> items = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            items.add(read(parser));
        }
        return new Node(items);
    }
}
