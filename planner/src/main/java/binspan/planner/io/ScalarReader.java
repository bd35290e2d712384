package binspan.planner.io;

import binspan.planner.io.Node.NumberNode;
import binspan.planner.io.Node.TextNode;
import binspan.planner.io.Node.WordNode;
import binspan.scenario.Choice;
import binspan.scenario.Field;
import binspan.scenario.Nearest;
import binspan.scenario.Range;
import java.util.ArrayList;
import java.util.List;

/** Reads single values: numbers, words, texts, flags and channels. */
final class ScalarReader {
    static final int LONGEST_TEXT = 1000;
    private static final int LONGEST_CHANNEL = 24;

    private ScalarReader() {}

    /**
     * A value as read.
     *
     * @param value what stands in the scenario: the value itself, or where that is not allowed one that keeps its
     *     absence from being a second error; null for none
     * @param error what was found and what is allowed, null if all is well
     */
    record Reading(Object value, String error) {
        static Reading right(Object value) {
            return new Reading(value, null);
        }

        static Reading wrong(Object standIn, Node node, String allowed) {
            return new Reading(standIn, "found " + node.found() + "; allowed " + allowed);
        }
    }

    /** Reads a value of a field that is neither an object nor a list. */
    static Reading read(Field field, Node node) {
        return switch (field.kind()) {
            case NUMBER, COUNT -> number(field, node);
            case CHOICE -> choice(field, node);
            case CHANNEL -> channel(field, node);
            case FLAG -> flag(field, node);
            default -> text(field, node);
        };
    }

    private static Reading number(Field field, Node node) {
        double standIn = inside(field.range());
        if (!(node instanceof NumberNode number)) {
            return Reading.wrong(standIn, node, allowedNumber(field) + withoutQuotes(node));
        }
        double value = number.value();
        boolean whole = field.kind() != Field.Kind.COUNT || value == Math.rint(value);
        return whole && Double.isFinite(value) && field.range().contains(value)
                ? Reading.right(value)
                : Reading.wrong(standIn, node, field.allowed());
    }

    private static String allowedNumber(Field field) {
        return field.kind() == Field.Kind.COUNT ? field.allowed() : field.kind().words() + ", " + field.allowed();
    }

    private static String withoutQuotes(Node node) {
        return node instanceof TextNode ? ", without quotes" : "";
    }

    private static double inside(Range range) {
        return range.lowestOpen() ? range.lowest() + (range.highest() - range.lowest()) / 2 : range.lowest();
    }

    private static Reading choice(Field field, Node node) {
        Choice standIn =
                field.presence() == Field.Presence.OPTIONAL ? field.choices().get(0) : null;
        if (!(node instanceof TextNode word)) {
            return Reading.wrong(standIn, node, field.allowed() + ", in double quotes");
        }
        Choice exact = named(field, word.text());
        if (exact != null) {
            return Reading.right(exact);
        }
        String near = nearest(word.text(), words(field));
        return near == null
                ? Reading.wrong(standIn, node, field.allowed())
                : Reading.wrong(named(field, near), node, field.allowed() + "; did you mean \"" + near + "\"?");
    }

    private static Choice named(Field field, String word) {
        for (Choice choice : field.choices()) {
            if (choice.text().equals(word)) {
                return choice;
            }
        }
        return null;
    }

    private static List<String> words(Field field) {
        List<String> words = new ArrayList<>();
        for (Choice choice : field.choices()) {
            words.add(choice.text());
        }
        return words;
    }

    /** The known word that a misspelt one most likely meant, or null. */
    static String nearest(String found, List<String> known) {
        if (found.length() > LONGEST_TEXT) {
            return null;
        }
        List<String> near = Nearest.to(found, known);
        return near.isEmpty() ? null : near.get(0);
    }

    private static Reading channel(Field field, Node node) {
        double number = node instanceof TextNode text ? channelNumber(text.text()) : Double.NaN;
        return field.range().contains(number)
                ? Reading.right(number)
                : Reading.wrong(inside(field.range()), node, field.allowed());
    }

    /** The number of a channel such as C30 or C30.5, NaN if it is none. */
    private static double channelNumber(String text) {
        int sign = text.startsWith("C") ? 1 : 0;
        int whole = text.startsWith("-", sign) ? sign + 1 : sign;
        int point = digitsEnd(text, whole);
        int end = text.startsWith(".", point) ? digitsEnd(text, point + 1) : point;
        boolean complete = point > whole && end == text.length() && !text.endsWith(".");
        return complete && text.length() <= LONGEST_CHANNEL ? Double.parseDouble(text.substring(sign)) : Double.NaN;
    }

    private static int digitsEnd(String text, int start) {
        int end = start;
        while (end < text.length() && text.charAt(end) >= '0' && text.charAt(end) <= '9') {
            end++;
        }
        return end;
    }

    private static Reading flag(Field field, Node node) {
        return node instanceof WordNode word && !word.word().equals("null")
                ? Reading.right(Boolean.valueOf(word.word()))
                : Reading.wrong(null, node, field.kind().words());
    }

    private static Reading text(Field field, Node node) {
        return text(node, field.kind().words());
    }

    /** Reads a text that can stand on one line of output. */
    static Reading text(Node node, String allowed) {
        if (!(node instanceof TextNode text)) {
            return Reading.wrong(null, node, allowed + ", in double quotes");
        }
        String value = text.text();
        return !value.isBlank() && value.length() <= LONGEST_TEXT && Printable.oneLine(value)
                ? Reading.right(value)
                : Reading.wrong(null, node, allowed + " of 1 to " + LONGEST_TEXT + " characters on one line");
    }
}
