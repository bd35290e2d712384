package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.Field.Presence;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.lang.reflect.Type;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The registry against the records that it describes and against the naming rule of the file format. */
final class RegistryTest {

    /** Endings of field names and the unit that each announces, the longest that fits counting. */
    private static final Map<String, String> UNIT_BY_ENDING = Map.ofEntries(
            Map.entry("Nm", "nm"),
            Map.entry("PerKmNm", "1/(km nm)"),
            Map.entry("PsPerNm", "ps/nm"),
            Map.entry("Ns", "ns"),
            Map.entry("Ps", "ps"),
            Map.entry("Ps2", "ps^2"),
            Map.entry("MHz", "MHz"),
            Map.entry("GHz", "GHz"),
            Map.entry("THz", "THz"),
            Map.entry("Rad", "rad"),
            Map.entry("Db", "dB"),
            Map.entry("PsPerNmDb", "ps/(nm dB)"),
            Map.entry("Dbm", "dBm"),
            Map.entry("Km", "km"),
            Map.entry("DbPerKm", "dB/km"),
            Map.entry("PsPerNmKm", "ps/(nm km)"),
            Map.entry("PsPerSqrtKm", "ps/sqrt(km)"),
            Map.entry("K", "K"),
            Map.entry("MilliK", "mK"),
            Map.entry("PerK", "1/K"),
            Map.entry("PsPerKmK", "ps/(km K)"),
            Map.entry("PerSecond", "1/s"),
            Map.entry("secondsPerPoint", "s"),
            Map.entry("durationS", "s"),
            Map.entry("Hours", "h"),
            Map.entry("Bps", "bit/s"));

    @ParameterizedTest
    @MethodSource("sections")
    void fieldsAreTheComponentsInTheirOrder(Section section) {
        List<String> components = Arrays.stream(section.type().getRecordComponents())
                .map(RecordComponent::getName)
                .map(name -> name.equals("detectorClass") ? "class" : name)
                .toList();

        assertThat(section.fields()).extracting(Field::name).containsExactlyElementsOf(components);
        assertThat(section.type().getDeclaredConstructors())
                .as("one way to construct it")
                .hasSize(1);
    }

    @ParameterizedTest
    @MethodSource("fields")
    void fieldHasTheTypeOfItsComponent(Entry entry) {
        Field field = entry.field();
        Type component = entry.component().getGenericType();
        boolean optional = field.presence() == Presence.OPTIONAL;

        switch (field.kind()) {
            case NUMBER, CHANNEL -> assertThat(component).isEqualTo(optional ? OptionalDouble.class : double.class);
            case COUNT -> assertThat(component).isEqualTo(int.class);
            case FLAG -> assertThat(component).isEqualTo(boolean.class);
            case TEXT -> assertThat(bare(component, optional)).isEqualTo(String.class);
            case CHOICE -> assertThat(field.choices()).isEqualTo(constants(bare(component, optional)));
            case SECTION ->
                assertThat(field.content().section("").orElseThrow().type()).isEqualTo(bare(component, optional));
            case LIST -> assertHolds(field.content(), argument(component, 0));
            case ENTRIES -> assertThat(argument(component, 0)).isEqualTo(String.class);
        }
    }

    @ParameterizedTest
    @MethodSource("fields")
    void everyFieldSaysWhatItMeans(Entry entry) {
        assertThat(entry.field().meaning()).isNotBlank().doesNotEndWith(".");
        assertThat(entry.field().allowed()).isNotBlank();
    }

    @ParameterizedTest
    @MethodSource("numericFields")
    void rangeIsFiniteAndNotEmpty(Entry entry) {
        Range range = entry.field().range();

        assertThat(range.lowest()).isFinite();
        assertThat(range.highest()).isFinite();
        assertThat(Math.abs(range.highest()))
                .as("a limit that was thought about")
                .isLessThanOrEqualTo(1e13);
        if (entry.field().name().equals("formatVersion")) {
            assertThat(range.contains(1)).isTrue();
        } else {
            assertThat(range.lowest()).isLessThan(range.highest());
        }
    }

    @ParameterizedTest
    @MethodSource("numericFields")
    void unitStandsAtTheEndOfTheName(Entry entry) {
        String name = entry.field().name();
        String announced = UNIT_BY_ENDING.keySet().stream()
                .filter(name::endsWith)
                .max(Comparator.comparingInt(String::length))
                .map(UNIT_BY_ENDING::get)
                .orElse("");

        assertThat(entry.field().unit()).isEqualTo(announced);
    }

    @ParameterizedTest
    @MethodSource("defaultedNumbers")
    void defaultLiesInItsRangeAndIsStatedInWords(Entry entry) {
        Field field = entry.field();
        if (field.defaultText().equals("of the detector class")) {
            for (DetectorClass known : DetectorClass.values()) {
                Object value = field.byDefault().given(Map.of("class", known));
                assertThat(field.range().contains((Double) value))
                        .as(known.text())
                        .isTrue();
            }
        } else {
            double value = ((Number) field.byDefault().given(Map.of())).doubleValue();
            assertThat(field.range().contains(value)).isTrue();
            assertThat(Double.parseDouble(field.defaultText())).isEqualTo(value);
        }
    }

    @ParameterizedTest
    @MethodSource("fields")
    void alternativesNameFieldsThatMayBeLeftOut(Entry entry) {
        for (Section.Alternatives group : entry.section().alternatives()) {
            assertThat(group.fields())
                    .hasSizeGreaterThan(1)
                    .allSatisfy(name -> assertThat(entry.section().field(name))
                            .hasValueSatisfying(
                                    field -> assertThat(field.presence()).isNotEqualTo(Presence.REQUIRED)));
        }
    }

    @Test
    void allSectionsOfTheFileFormatAreThereInTheirOrder() {
        assertThat(sections().map(named -> named.getPayload().name()))
                .containsExactly(
                        "scenario",
                        "source",
                        "pump",
                        "band",
                        "alice",
                        "fibre",
                        "classical channel",
                        "loss",
                        "filter",
                        "compensator",
                        "analyzer",
                        "detector",
                        "gate",
                        "bob",
                        "timing",
                        "protocol",
                        "acquisition",
                        "require",
                        "spread");
    }

    private static void assertHolds(Content content, Type element) {
        Class<?> type = (Class<?>) element;
        List<Class<?>> types = type.isSealed() ? List.of(type.getPermittedSubclasses()) : List.of(type);

        assertThat(content.byType().values().stream().<Class<?>>map(Section::type))
                .containsExactlyInAnyOrderElementsOf(types);
        assertThat(content.typed()).isEqualTo(type.isSealed());
    }

    private static Type bare(Type component, boolean optional) {
        return optional ? argument(component, 0) : component;
    }

    private static Type argument(Type component, int index) {
        return ((ParameterizedType) component).getActualTypeArguments()[index];
    }

    private static List<Object> constants(Type type) {
        return List.of(((Class<?>) type).getEnumConstants());
    }

    /** A field with the section in which it stands. */
    record Entry(Section section, Field field) {
        RecordComponent component() {
            return section.type().getRecordComponents()[section.indexOf(field.name())];
        }

        @Override
        public String toString() {
            return section.name() + "." + field.name();
        }
    }

    static Stream<Named<Section>> sections() {
        Map<Section, String> found = new LinkedHashMap<>();
        collect(ScenarioSections.SCENARIO, found);
        return found.keySet().stream().map(section -> Named.of(section.name(), section));
    }

    private static void collect(Section section, Map<Section, String> found) {
        if (found.putIfAbsent(section, section.name()) == null) {
            section.fields()
                    .forEach(field -> field.content().byType().values().forEach(inner -> collect(inner, found)));
        }
    }

    static Stream<Entry> fields() {
        return sections()
                .map(Named::getPayload)
                .flatMap(section -> section.fields().stream().map(field -> new Entry(section, field)));
    }

    static Stream<Entry> defaultedNumbers() {
        return numericFields().filter(entry -> entry.field().presence() == Presence.DEFAULTED);
    }

    static Stream<Entry> numericFields() {
        return fields().filter(entry -> entry.field().kind().numeric());
    }
}
