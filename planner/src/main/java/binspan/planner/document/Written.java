package binspan.planner.document;

import binspan.planner.io.JsonText;
import binspan.scenario.Choice;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** New values as they are written into a file: on one line, or one member a line where that grows too long. */
final class Written {
    private static final int LONGEST_LINE = 140;
    private static final String STEP = "  ";

    private final String lineBreak;

    /** Writes with the line ends of a file. */
    Written(String lineBreak) {
        this.lineBreak = lineBreak;
    }

    /** A member of an object. */
    String member(String name, Object value, String indentation) {
        return JsonText.of(name) + ": " + value(value, indentation);
    }

    /**
     * A value.
     *
     * @param value number, text, flag, choice, or maps and lists of them
     * @param indentation blanks before the line in which it begins
     * @throws IllegalArgumentException if it holds anything else
     */
    String value(Object value, String indentation) {
        String line = line(value);
        boolean fits = line.length() + indentation.length() <= LONGEST_LINE;
        return fits || !(value instanceof Map<?, ?> || value instanceof List<?>) ? line : lines(value, indentation);
    }

    /** An object with each member on a line of its own. */
    String lines(Object value, String indentation) {
        List<String> parts = new ArrayList<>();
        String inner = indentation + STEP;
        if (value instanceof Map<?, ?> map) {
            map.forEach((name, each) -> parts.add(inner + member((String) name, each, inner)));
        } else {
            ((List<?>) value).forEach(each -> parts.add(inner + value(each, inner)));
        }
        return enclosed(value, lineBreak + String.join("," + lineBreak, parts) + lineBreak + indentation);
    }

    private static String line(Object value) {
        List<String> parts = new ArrayList<>();
        if (value instanceof Map<?, ?> map) {
            map.forEach((name, each) -> parts.add(JsonText.of(name) + ": " + line(each)));
        } else if (value instanceof List<?> list) {
            list.forEach(each -> parts.add(line(each)));
        } else {
            return scalar(value);
        }
        return enclosed(value, parts.isEmpty() ? "" : " " + String.join(", ", parts) + " ");
    }

    private static String enclosed(Object value, String inside) {
        return value instanceof Map<?, ?> ? "{" + inside + "}" : "[" + inside + "]";
    }

    /** What is no JSON number is written as well: reading then refuses it in its own words. */
    private static String scalar(Object value) {
        if (value instanceof Choice choice) {
            return JsonText.of(choice.text());
        }
        boolean notJson = value instanceof Double number
                && (!Double.isFinite(number) || (number == 0.0 && Math.copySign(1.0, number) < 0.0));
        String json = notJson ? value.toString() : JsonText.of(value);
        return value instanceof Double ? json.replace(".0E", "e").replace('E', 'e') : json;
    }
}
