package binspan.scenario;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * What an object of the scenario file may be: one section, or one of several told apart by their {@code type}.
 *
 * @param byType sections by type; a single one stands under the empty text
 */
public record Content(Map<String, Section> byType) {
    /** Name of the field that tells the sections apart. */
    public static final String TYPE = "type";

    static final Content NONE = new Content(Map.of());

    /** A single section. */
    static Content of(Section section) {
        return new Content(Map.of("", section));
    }

    /** Several sections, told apart by their names as types, in this order. */
    static Content ofTypes(Section... sections) {
        Map<String, Section> byType = new LinkedHashMap<>();
        for (Section section : sections) {
            byType.put(section.name(), section);
        }
        return new Content(Collections.unmodifiableMap(byType));
    }

    /** Whether the object must say its type. */
    public boolean typed() {
        return !byType.containsKey("");
    }

    /** The section of a type, or the single one for the empty text. */
    public Optional<Section> section(String type) {
        return Optional.ofNullable(byType.get(type));
    }

    /**
     * The section that describes a record.
     *
     * @throws java.util.NoSuchElementException if none does
     */
    public Section sectionOf(Record element) {
        return byType.values().stream()
                .filter(section -> section.describes(element))
                .findFirst()
                .orElseThrow();
    }
}
