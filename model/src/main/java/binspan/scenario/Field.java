package binspan.scenario;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One field of the scenario file: the single statement of its kind, unit, range, default and meaning.
 *
 * @param name name in the file
 * @param kind what it holds
 * @param unit unit of a number, empty for a bare one
 * @param range allowed numbers
 * @param presence whether it may be left out
 * @param byDefault value that stands where it is left out
 * @param defaultText that value in words
 * @param choices allowed words of a choice
 * @param content sections of an object or list
 * @param meaning what it means, one phrase
 */
public record Field(
        String name,
        Kind kind,
        String unit,
        Range range,
        Presence presence,
        DefaultValue byDefault,
        String defaultText,
        List<? extends Choice> choices,
        Content content,
        String meaning) {

    /** What a field holds. */
    public enum Kind {
        NUMBER("a number"),
        COUNT("a whole number"),
        FLAG("true or false"),
        TEXT("a text"),
        CHANNEL("a channel such as \"C30\""),
        CHOICE("a word"),
        SECTION("an object"),
        LIST("a list of objects"),
        ENTRIES("an object of paths");

        private final String words;

        Kind(String words) {
            this.words = words;
        }

        /** The kind in words. */
        public String words() {
            return words;
        }

        /** Whether values of this kind can be swept. */
        public boolean numeric() {
            return this == NUMBER || this == COUNT || this == CHANNEL;
        }
    }

    /** Whether a field may be left out. */
    public enum Presence {
        REQUIRED,
        DEFAULTED,
        OPTIONAL
    }

    /** Value of a field that is left out, given what its object holds. */
    @FunctionalInterface
    public interface DefaultValue {
        /** The default, or null where the other fields do not determine one. */
        Object given(Map<String, Object> siblings);
    }

    private static final Range ANY = Range.of(-Double.MAX_VALUE, Double.MAX_VALUE);
    private static final DefaultValue NONE = siblings -> null;

    /** A required number. */
    public static Field number(String name, String unit, Range range, String meaning) {
        return new Field(name, Kind.NUMBER, unit, range, Presence.REQUIRED, NONE, "", List.of(), Content.NONE, meaning);
    }

    /** A required whole number. */
    public static Field count(String name, Range range, String meaning) {
        return new Field(name, Kind.COUNT, "", range, Presence.REQUIRED, NONE, "", List.of(), Content.NONE, meaning);
    }

    /** A required text or other value without a number. */
    public static Field plain(String name, Kind kind, String meaning) {
        return new Field(name, kind, "", ANY, Presence.REQUIRED, NONE, "", List.of(), Content.NONE, meaning);
    }

    /** A required word out of an enumeration. */
    public static <E extends Enum<E> & Choice> Field choice(String name, Class<E> type, String meaning) {
        List<E> choices = List.of(type.getEnumConstants());
        return new Field(name, Kind.CHOICE, "", ANY, Presence.REQUIRED, NONE, "", choices, Content.NONE, meaning);
    }

    /** A required object. */
    public static Field section(String name, Section section, String meaning) {
        return new Field(
                name, Kind.SECTION, "", ANY, Presence.REQUIRED, NONE, "", List.of(), Content.of(section), meaning);
    }

    /** A required list of objects; the range is that of its length. */
    public static Field list(String name, Content content, Range length, String meaning) {
        return new Field(name, Kind.LIST, "", length, Presence.REQUIRED, NONE, "", List.of(), content, meaning);
    }

    /** The same field, a fixed value standing where it is left out. */
    public Field orElse(Object value) {
        String words = value instanceof Double number
                ? Range.plain(number)
                : value instanceof Choice word ? word.text() : value.toString();
        return orElse(siblings -> value, words);
    }

    /** The same field with a default that depends on the other fields of its object. */
    public Field orElse(DefaultValue value, String words) {
        return new Field(name, kind, unit, range, Presence.DEFAULTED, value, words, choices, content, meaning);
    }

    /** The same object, its own defaults standing where it is left out. */
    Field orEmpty() {
        return orElse(siblings -> new Values(), "its defaults");
    }

    /** The same field, allowed to be absent. */
    public Field optional() {
        return optional("");
    }

    /** The same field, allowed to be absent, with what then happens in words. */
    public Field optional(String words) {
        return optional(NONE, words);
    }

    /** The same field, allowed to be absent, unless the other fields of its object determine it. */
    Field optional(DefaultValue value, String words) {
        return new Field(name, kind, unit, range, Presence.OPTIONAL, value, words, choices, content, meaning);
    }

    /** The component of the record where the file says nothing. */
    Object absent() {
        return kind.numeric() ? OptionalDouble.empty() : Optional.empty();
    }

    /** The component of the record that holds a value of the file, null where an object has problems of its own. */
    Object component(Object value) {
        if (presence != Presence.OPTIONAL) {
            return kind == Kind.COUNT && value instanceof Double number ? (Object) number.intValue() : value;
        }
        return value instanceof Double number ? OptionalDouble.of(number) : Optional.ofNullable(value);
    }

    /** That it is missing, in words. */
    public String missing() {
        return "missing; needs " + allowed() + ": " + meaning;
    }

    /** What is allowed here, in words. */
    public String allowed() {
        return switch (kind) {
            case NUMBER -> range.text(unit);
            case COUNT, CHANNEL -> kind.words() + ", " + range.text(unit);
            case CHOICE -> String.join(" | ", choices.stream().map(Choice::text).toList());
            case LIST -> "a list of " + range.text("") + " objects";
            default -> kind.words();
        };
    }
}
