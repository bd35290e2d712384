package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.io.Preset;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import binspan.scenario.Field;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

final class ListCommandTest {
    private static final Map<String, String> ELEMENTS =
            Map.of("fibre", "duct", "filter", "gate filter", "loss", "[2]", "compensator", "[3]");

    @ParameterizedTest
    @ValueSource(strings = {"fibres", "detectors", "presets", "parameters"})
    void listsAreReadableAtEightyColumns(String topic) {
        Run run = Run.of("list", topic);
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.err()).isEmpty();
        assertThat(run.out().lines().toList())
                .hasSizeGreaterThan(5)
                .allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
    }

    @ParameterizedTest
    @ValueSource(strings = {"fibres", "detectors", "presets", "parameters"})
    void listsAreJsonWhenAsked(String topic) {
        JsonNode rows =
                JsonMapper.shared().readTree(Run.of("list", topic, "--json").out());
        assertThat(rows.isArray()).isTrue();
        assertThat(rows)
                .hasSizeGreaterThan(4)
                .allSatisfy(row -> assertThat(row.get("meaning").asString()).isNotEmpty());
    }

    @Test
    void everyFibreClassIsListedWithItsValues() {
        String list = Run.of("list", "fibres").out();
        for (FibreClass fibre : FibreClass.values()) {
            assertThat(list).contains(fibre.text()).contains(fibre.meaning());
        }
        assertThat(list)
                .contains("G.652.D  0.35  0.22  0.24  16.97  standard single-mode with low water peak")
                .contains("attenuation at most 0.4 dB/km over 1310-1625 nm")
                .contains("dispersion 2.80 to 6.20 ps/(nm km) at\n    1550 nm (bounding lines)");
    }

    @Test
    void everyDetectorClassIsListedWithItsSources() {
        String list = Run.of("list", "detectors").out().replaceAll("\\s+", " ");
        for (DetectorClass detector : DetectorClass.values()) {
            assertThat(list)
                    .contains(detector.text() + " " + detector.meaning())
                    .contains("Source: " + detector.provenance());
        }
        assertThat(list).contains("gated with 2e-5 dark clicks per gate of 1 ns");
    }

    @Test
    void everyPresetIsListed() {
        String list = Run.of("list", "presets").out();
        assertThat(Preset.names()).allSatisfy(name -> assertThat(list).contains(name));
    }

    @Test
    void parameterIsListedWithRangeUnitDefaultAndMeaning() {
        assertThat(Run.of("list", "parameters").out())
                .contains("""

                        link.lengthKm
                            0 to 10000 km: fibre length of both arms together, scaled in proportion
                        """)
                .contains("""

                        alice.analyzer.excessLossDb
                            0 to 60 dB, default 1.5: loss of both paths, the splitting not counted
                        """)
                .contains("""

                        alice.path.LABEL.lengthKm (fibre)
                            0 to 5000 km, required: length of the span
                        """)
                .contains("""

                        source.pump.mode
                            continuous | pulse-pair | pulse-train, required: how the pump light is
                            emitted
                        """)
                .contains("\nprovenance.PATH\n    a text, optional: ")
                .contains("\nspread.PATH.normal\n");
    }

    @Test
    void everyNumberThatIsListedHasAPathThatLeadsToIt() throws Exception {
        Scenario scenario = complete();
        List<ParameterCatalogue.Entry> numbers = ParameterCatalogue.entries().stream()
                .filter(entry -> entry.field().kind().numeric() && !entry.path().startsWith("spread."))
                .toList();
        assertThat(numbers).hasSizeGreaterThan(80).allSatisfy(entry -> {
            Parameter parameter = ParameterPaths.find(scenario, actual(entry));
            assertThat(parameter.meaning()).isEqualTo(entry.field().meaning());
            assertThat(parameter.range()).isEqualTo(entry.field().range());
        });
    }

    @Test
    void flagsTextsAndWordsAreListedToo() {
        assertThat(ParameterCatalogue.entries())
                .extracting(entry -> entry.field().kind())
                .contains(Field.Kind.FLAG, Field.Kind.TEXT, Field.Kind.CHOICE, Field.Kind.CHANNEL, Field.Kind.ENTRIES)
                .doesNotContain(Field.Kind.SECTION, Field.Kind.LIST);
    }

    @Test
    void unknownTopicGetsTheNearest() {
        Run run = Run.of("list", "fibers");
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.err())
                .isEqualTo("binspan: unknown topic fibers; allowed fibres | detectors | presets | parameters;"
                        + " did you mean fibres?\n");
    }

    /** The path of an entry in a scenario that has one element of each type; only bob's detector is gated. */
    private static String actual(ParameterCatalogue.Entry entry) {
        String path = entry.path().contains(".gate.") ? entry.path().replace("alice.", "bob.") : entry.path();
        String element = ELEMENTS.getOrDefault(entry.type(), "");
        String label = element.startsWith("[") ? "." + ParameterCatalogue.LABEL : ParameterCatalogue.LABEL;
        return path.replace(label, element);
    }

    private static Scenario complete() throws Exception {
        try (InputStream in = ScenarioReader.class.getResourceAsStream("pulsed.json")) {
            return ScenarioReader.read(in, "pulsed.json");
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
