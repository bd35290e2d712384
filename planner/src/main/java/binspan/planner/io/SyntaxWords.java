package binspan.planner.io;

import tools.jackson.core.JacksonException;
import tools.jackson.core.TokenStreamLocation;

/** Says in the project's words where and why a text is no JSON. */
final class SyntaxWords {
    private static final String NAME = "a field name in double quotes";
    private static final String NUMBER = "a number such as 12, 0.5 or 1e-3";
    private static final String VALUE = "a value: a number, a text in double quotes, true, false, an object or a list";
    private static final String NUMBER_CHARACTERS = "+-.0123456789";

    /** What is allowed, by a part of the parser's own message; the first that fits counts. */
    private static final String[][] ALLOWED = {
        {"in a comment", "*/ at the end of the comment"},
        {"for a comment", "// or /* at the start of a comment"},
        {"separate Object entries", "a comma or }"},
        {"separate Array entries", "a comma or ]"},
        {"a colon to separate", "a colon after the field name"},
        {"start property name", NAME},
        {"for Object starting", "}"},
        {"marker for Object", "} at the end of the object"},
        {"for Array starting", "]"},
        {"marker for Array", "] at the end of the list"},
        {"closing quote", "\" at the end of the text"},
        {"Illegal unquoted", "a text on one line, without control characters"},
        {"escape", "an escape such as \\\" or \\u00e9"},
        {"numeric value", NUMBER},
        {"hexadecimal", NUMBER},
        {"Number value length", "a number of at most 1000 characters"},
        {"Name length", "a field name of at most " + TreeReader.LONGEST_NAME + " characters"},
        {"nesting depth", "at most " + TreeReader.DEEPEST + " levels of objects and lists"},
    };

    private SyntaxWords() {}

    /** The error of a parser inside the value of the file. */
    static SyntaxException of(JacksonException error, String text, Place reached) {
        TokenStreamLocation location = error.getLocation();
        String allowed = allowed(error.getOriginalMessage());
        if (!located(location)) {
            return new SyntaxException(reached, "found more; allowed " + allowed);
        }
        int offset = (int) Math.min(location.getCharOffset(), text.length());
        Place place = place(location);
        if (allowed.equals(NUMBER) || (allowed.equals(VALUE) && isNumeric(text, offset))) {
            return number(text, offset, place);
        }
        boolean closing = text.startsWith("}", offset) || text.startsWith("]", offset);
        return closing && (allowed.equals(NAME) || allowed.equals(VALUE)) && behindComma(text, offset)
                ? new SyntaxException(
                        place, "found " + text.charAt(offset) + " behind a comma; allowed no comma after the last")
                : new SyntaxException(place, "found " + found(text, offset) + "; allowed " + allowed);
    }

    /** The error of a parser behind the value of the file. */
    static SyntaxException afterwards(JacksonException error, String text, Place reached) {
        boolean comment = error.getOriginalMessage().contains("comment");
        return comment || !located(error.getLocation())
                ? of(error, text, reached)
                : trailing(text, error.getLocation());
    }

    /** Anything but comments behind the value of the file. */
    static SyntaxException trailing(String text, TokenStreamLocation location) {
        String found = found(text, (int) Math.min(location.getCharOffset(), text.length()));
        return new SyntaxException(place(location), "found " + found + " after the scenario; allowed nothing more");
    }

    private static boolean located(TokenStreamLocation location) {
        return location != null && location.getLineNr() > 0 && location.getCharOffset() >= 0;
    }

    private static Place place(TokenStreamLocation location) {
        return new Place(location.getLineNr(), location.getColumnNr());
    }

    /** The whole of a number that is spelt wrongly; the parser points somewhere inside it. */
    private static SyntaxException number(String text, int offset, Place place) {
        int start = offset;
        while (start > 0 && isNumeric(text, start - 1)) {
            start--;
        }
        int end = start;
        while (end < text.length() && (isNumeric(text, end) || Character.isLetterOrDigit(text.charAt(end)))) {
            end++;
        }
        Place begin = new Place(place.line(), place.column() - (offset - start));
        String found = Printable.shortened(text.substring(start, Math.max(end, offset)));
        return new SyntaxException(begin, "found " + found + "; allowed " + NUMBER);
    }

    private static boolean isNumeric(String text, int offset) {
        return offset < text.length() && NUMBER_CHARACTERS.indexOf(text.charAt(offset)) >= 0;
    }

    private static boolean behindComma(String text, int offset) {
        return text.substring(0, offset).stripTrailing().endsWith(",");
    }

    /** What stands at an offset: a word, a character or the end. */
    private static String found(String text, int offset) {
        if (offset >= text.length()) {
            return "the end of the file";
        }
        int end = offset;
        while (end < text.length() && Character.isLetterOrDigit(text.charAt(end))) {
            end++;
        }
        return end > offset ? Printable.shortened(text.substring(offset, end)) : character(text.charAt(offset));
    }

    private static String character(char c) {
        return switch (c) {
            case '\n', '\r' -> "the end of the line";
            case ' ' -> "a blank";
            case '\t' -> "a tab";
            case ',' -> "a comma";
            case ':' -> "a colon";
            case '"' -> "a double quote";
            case '\'' -> "a single quote";
            default -> String.valueOf(c);
        };
    }

    private static String allowed(String message) {
        for (String[] each : ALLOWED) {
            if (message.contains(each[0])) {
                return each[1];
            }
        }
        return VALUE;
    }
}
