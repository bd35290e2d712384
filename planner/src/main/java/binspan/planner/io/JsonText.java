package binspan.planner.io;

import java.io.OutputStream;
import java.io.StringWriter;
import java.util.List;
import java.util.Map;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.PrettyPrinter;
import tools.jackson.core.StreamWriteFeature;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.util.DefaultIndenter;
import tools.jackson.core.util.DefaultPrettyPrinter;
import tools.jackson.core.util.Separators;

/** Writes maps, lists, texts, numbers (as the shortest text that reads back) and flags as JSON, indented by two blanks. */
public final class JsonText {
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
            .disable(StreamWriteFeature.AUTO_CLOSE_TARGET)
            .build();
    private static final double LARGEST_PLAIN = 1e7;

    private JsonText() {}

    /**
     * The JSON text of a tree of values, without a line end.
     *
     * @param tree maps in their order, lists, texts, numbers and flags
     * @throws IllegalArgumentException if it holds anything else, a NaN or an infinity
     */
    public static String of(Object tree) {
        StringWriter text = new StringWriter();
        try (JsonGenerator json = FACTORY.createGenerator(new Indented(), text)) {
            value(json, tree);
        }
        return text.toString();
    }

    /**
     * A generator for large trees: objects and lists inside a list of the outermost object stand on a line each. Closing it leaves the stream open.
     *
     * @param out where the JSON goes, in UTF-8
     */
    public static JsonGenerator generator(OutputStream out) {
        return FACTORY.createGenerator(new Lined(), out);
    }

    /**
     * Writes the members of an object that is begun.
     *
     * @param json where to
     * @param members maps in their order, lists, texts, numbers and flags by name
     */
    public static void members(JsonGenerator json, Map<?, ?> members) {
        for (Map.Entry<?, ?> entry : members.entrySet()) {
            json.writeName((String) entry.getKey());
            value(json, entry.getValue());
        }
    }

    private static void value(JsonGenerator json, Object value) {
        if (value instanceof Map<?, ?> map) {
            object(json, map);
        } else if (value instanceof List<?> list) {
            list(json, list);
        } else if (value instanceof Boolean flag) {
            json.writeBoolean(flag);
        } else if (value instanceof Number number) {
            number(json, number.doubleValue());
        } else if (value instanceof String text) {
            json.writeString(text);
        } else {
            throw new IllegalArgumentException("found " + value + "; allowed maps, lists, texts, numbers and flags");
        }
    }

    private static void object(JsonGenerator json, Map<?, ?> map) {
        json.writeStartObject();
        members(json, map);
        json.writeEndObject();
    }

    private static void list(JsonGenerator json, List<?> list) {
        json.writeStartArray();
        for (Object item : list) {
            value(json, item);
        }
        json.writeEndArray();
    }

    /**
     * Writes a number.
     *
     * @throws IllegalArgumentException if it is NaN or infinite
     */
    public static void number(JsonGenerator json, double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("found " + value + "; allowed a finite number");
        }
        if (value == Math.rint(value) && Math.abs(value) < LARGEST_PLAIN) {
            json.writeNumber((long) value);
        } else {
            json.writeNumber(value);
        }
    }

    /** Layout of the text, the same on every system. */
    private static final class Indented extends ObjectWriteContext.Base {
        @Override
        public PrettyPrinter getPrettyPrinter() {
            return new DefaultPrettyPrinter(separators()).withObjectIndenter(new DefaultIndenter("  ", "\n"));
        }
    }

    private static Separators separators() {
        return Separators.createDefaultInstance().withObjectNameValueSpacing(Separators.Spacing.AFTER);
    }

    /** Layout of a large tree. */
    private static final class Lined extends ObjectWriteContext.Base {
        @Override
        public PrettyPrinter getPrettyPrinter() {
            return new DefaultPrettyPrinter(separators())
                    .withObjectIndenter(new Lines(1))
                    .withArrayIndenter(new Lines(2));
        }
    }

    /** Breaks lines down to a level, 1 for the members of the outermost object. */
    private record Lines(int deepest) implements DefaultPrettyPrinter.Indenter {
        @Override
        public void writeIndentation(JsonGenerator json, int level) {
            json.writeRaw(level > deepest ? " " : "\n" + "  ".repeat(level));
        }

        @Override
        public boolean isInline() {
            return false;
        }
    }
}
