package binspan.planner.io;

import binspan.planner.io.Node.NumberNode;
import binspan.planner.io.Node.TextNode;
import binspan.planner.io.Node.WordNode;
import binspan.planner.io.ScalarReader.Reading;
import binspan.scenario.Choice;
import binspan.scenario.Field;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A value as a person types it, read like the value of a file.
 *
 * @param value number, text or flag, as a scenario file holds it; null if it is not allowed
 * @param error what was found and what is allowed, in the words of the command line; empty if all is well
 */
public record TypedValue(Object value, String error) {
    private static final Pattern NUMBER = Pattern.compile("[+-]?(?:[0-9]+\\.?[0-9]*|\\.[0-9]+)(?:[eE][+-]?[0-9]+)?");
    private static final Pattern COMMA = Pattern.compile("([+-]?[0-9]*),([0-9]+(?:[eE][+-]?[0-9]+)?)");
    private static final Set<String> NO_NUMBERS = Set.of("NaN", "Infinity", "+Infinity", "-Infinity");

    /**
     * Reads the value of a field that is neither an object nor a list.
     *
     * @param field the registry's entry
     * @param typed text without blanks at its ends
     */
    public static TypedValue of(Field field, String typed) {
        Reading reading = ScalarReader.read(field, node(field, typed));
        if (reading.error() != null) {
            return new TypedValue(null, Printable.line(reading.error() + hint(field, typed)));
        }
        return new TypedValue(written(field, reading.value(), typed), "");
    }

    private static Node node(Field field, String typed) {
        return switch (field.kind()) {
            case NUMBER, COUNT -> numeric(typed);
            case FLAG -> typed.equals("true") || typed.equals("false") ? word(typed) : text(typed);
            default -> text(typed);
        };
    }

    private static Node numeric(String typed) {
        if (NUMBER.matcher(typed).matches() || NO_NUMBERS.contains(typed)) {
            return new NumberNode(Place.START, typed, Double.parseDouble(typed));
        }
        return word(Printable.shortened(typed));
    }

    private static Node word(String typed) {
        return new WordNode(Place.START, typed);
    }

    private static Node text(String typed) {
        return new TextNode(Place.START, typed);
    }

    private static String hint(Field field, String typed) {
        Matcher comma = COMMA.matcher(typed);
        boolean number = field.kind() == Field.Kind.NUMBER || field.kind() == Field.Kind.COUNT;
        return number && comma.matches()
                ? "; the decimal sign is a point: " + comma.group(1) + "." + comma.group(2)
                : "";
    }

    private static Object written(Field field, Object value, String typed) {
        if (value instanceof Choice choice) {
            return choice.text();
        }
        if (field.kind() != Field.Kind.CHANNEL) {
            return value;
        }
        return typed.startsWith("C") ? typed : "C" + typed;
    }
}
