package binspan.planner.io;

import binspan.planner.io.Node.ListNode;
import binspan.planner.io.Node.Member;
import binspan.planner.io.Node.NumberNode;
import binspan.planner.io.Node.ObjectNode;
import binspan.planner.io.Node.TextNode;
import binspan.planner.io.Node.WordNode;
import java.util.ArrayList;
import java.util.List;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.json.JsonReadFeature;

/** Reads a JSON text with comments into a tree of values that know their places. */
final class TreeReader {
    static final int DEEPEST = 50;
    static final int LONGEST_NAME = 1000;

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(JsonReadFeature.ALLOW_JAVA_COMMENTS)
            // Accepted here so that the walk refuses it like any other number that is not allowed.
            .enable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS)
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(DEEPEST)
                    .maxNameLength(LONGEST_NAME)
                    .build())
            .build();

    private final JsonParser parser;
    private final String text;

    private TreeReader(JsonParser parser, String text) {
        this.parser = parser;
        this.text = text;
    }

    /**
     * Reads a text that holds one JSON value.
     *
     * @throws SyntaxException at the first place where it is no JSON
     */
    static ObjectNode read(String text) throws SyntaxException {
        try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), text)) {
            return new TreeReader(parser, text).document();
        }
    }

    private ObjectNode document() throws SyntaxException {
        Node root = null;
        try {
            JsonToken first = parser.nextToken();
            if (first == null) {
                throw new SyntaxException(FileText.endOf(text), "found an empty file; allowed a scenario object");
            }
            root = value(first);
            if (parser.nextToken() != null) {
                throw SyntaxWords.trailing(text, parser.currentTokenLocation());
            }
            return scenario(root);
        } catch (JacksonException e) {
            throw root == null ? SyntaxWords.of(e, text, place()) : SyntaxWords.afterwards(e, text, place());
        }
    }

    private static ObjectNode scenario(Node root) throws SyntaxException {
        if (root instanceof ObjectNode object) {
            return object;
        }
        throw new SyntaxException(root.place(), "found " + root.found() + "; allowed a scenario object");
    }

    private Node value(JsonToken token) {
        Place place = place();
        return switch (token) {
            case START_OBJECT -> new ObjectNode(place, members());
            case START_ARRAY -> new ListNode(place, items());
            case VALUE_STRING -> new TextNode(place, parser.getString());
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT ->
                new NumberNode(place, parser.getString(), parser.getDoubleValue());
            default -> new WordNode(place, parser.getString());
        };
    }

    private List<Member> members() {
        List<Member> members = List.of();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String name = parser.currentName();
            Place place = place();
            members = appended(members, new Member(name, place, value(parser.nextToken())));
        }
        return members;
    }

    private List<Node> items() {
        List<Node> items = List.of();
        JsonToken token = parser.nextToken();
        while (token != JsonToken.END_ARRAY) {
            items = appended(items, value(token));
            token = parser.nextToken();
        }
        return items;
    }

    /** Makes room only where there is something to hold: a hostile file can have millions of empty lists. */
    private static <T> List<T> appended(List<T> list, T item) {
        List<T> open = list.isEmpty() ? new ArrayList<>(4) : list;
        open.add(item);
        return open;
    }

    private Place place() {
        TokenStreamLocation location = parser.currentTokenLocation();
        return new Place(Math.max(1, location.getLineNr()), Math.max(1, location.getColumnNr()));
    }
}
