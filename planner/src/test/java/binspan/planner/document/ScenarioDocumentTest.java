package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import binspan.planner.document.Change.Delete;
import binspan.planner.document.Change.Insert;
import binspan.planner.document.Change.Put;
import binspan.planner.document.Change.Remove;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.DetectorClass;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Documents stay valid scenario files through every edit, and refuse in the words of the command line. */
final class ScenarioDocumentTest {
    private static final ScenarioDocument KESTREL = ShippedDocuments.named("kestrel-dam-to-millbrook");
    private static final ScenarioDocument AVALANCHE = ShippedDocuments.named("avalanche");

    private static ScenarioDocument with(ScenarioDocument document, Change... changes) throws RefusedEditException {
        return document.with(List.of(changes));
    }

    /** Sets apart by lines: what an edit of one line leaves of all others. */
    private static void assertOneLineChanged(ScenarioDocument before, ScenarioDocument after, String old, String now) {
        assertThat(before.text()).containsOnlyOnce(old);
        assertThat(after.text()).isEqualTo(before.text().replace(old, now));
    }

    @Test
    void aValueChangesAndNothingElse() throws RefusedEditException {
        ScenarioDocument after = with(KESTREL, new Put("source.meanPairsPerCycle", 0.035));
        assertOneLineChanged(KESTREL, after, "\"meanPairsPerCycle\": 0.04,  ", "\"meanPairsPerCycle\": 0.035,  ");
        assertThat(after.scenario())
                .isEqualTo(ParameterPaths.find(KESTREL.scenario(), "source.meanPairsPerCycle")
                        .with(KESTREL.scenario(), 0.035));
    }

    @Test
    void anEditWithoutEffectGivesTheSameDocument() throws RefusedEditException {
        assertThat(with(KESTREL, new Remove("source.schmidtNumber"))).isSameAs(KESTREL);
        assertThat(KESTREL.with(List.of())).isSameAs(KESTREL);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "alice.detectors[0].efficiency | 1.2 | alice.detectors[0].efficiency | found 1.2; allowed 1e-6 to 1",
                "imbalanceNs | NaN | imbalanceNs | found NaN; allowed 1e-6 to 10000 ns",
                "timing.windowWidthPs | -Infinity | timing.windowWidthPs | found -Infinity; allowed 0.001 to 1e7 ps"
            })
    void numbersOutOfRangeAreRefused(String path, double value, String where, String words) {
        RefusedEditException refused =
                catchThrowableOfType(RefusedEditException.class, () -> with(KESTREL, new Put(path, value)));
        assertThat(refused.problems()).hasSize(1);
        assertThat(refused.problems().get(0).path()).isEqualTo(where);
        assertThat(refused.problems().get(0).message()).isEqualTo(words);
    }

    @Test
    void everythingThatIsWrongWithAnEditIsSaid() {
        RefusedEditException refused = catchThrowableOfType(
                RefusedEditException.class,
                () -> with(
                        KESTREL,
                        new Put("name", ""),
                        new Put("bob.repairMarginDb", "1"),
                        new Put("bob.colour", "red")));
        assertThat(refused.problems())
                .extracting(EditProblem::path)
                .containsExactly("name", "bob.repairMarginDb", "bob.colour");
        assertThat(refused.problems().get(1).message())
                .isEqualTo("found \"1\"; allowed a number, 0 to 200 dB, without quotes");
        assertThat(refused).hasMessageContaining("bob.colour: unknown field; allowed photon");
    }

    @Test
    void aRefusedStepInsideAnEditThatIsValidInTheEndIsNone() throws RefusedEditException {
        ScenarioDocument after = with(
                KESTREL,
                new Delete("alice.detectors", 0),
                new Delete("alice.detectors", 0),
                new Insert("alice.detectors", 0, Map.of("class", "up-conversion")));
        assertThat(after.scenario().alice().detectors()).hasSize(1);
        assertThatExceptionOfType(RefusedEditException.class)
                .isThrownBy(() -> with(KESTREL, new Delete("bob.detectors", 0), new Delete("bob.detectors", 0)))
                .withMessage("bob.detectors: found a list of 0; allowed a list of 1 to 2 objects");
    }

    @Test
    void aFieldTakesThePlaceOfThoseItExcludes() throws RefusedEditException {
        ScenarioDocument after = with(
                KESTREL,
                new Put("source.idler.frequencyTHz", 193.0),
                new Put("source.schmidtNumber", 3.0),
                new Put("source.unheraldedG2", 1.4),
                new Put("source.pump.linewidthMHz", 1.0),
                new Put("source.pump.coherenceTimeNs", 100.0));
        assertThat(after.scenario().source().idler().channel()).isEmpty();
        assertThat(after.scenario().source().schmidtNumber()).isEmpty();
        assertThat(after.scenario().source().pump().linewidthMHz()).isEmpty();
        assertThat(after.text()).contains("\"idler\": { \"bandwidthFwhmGHz\": 45, \"frequencyTHz\": 193 }");
    }

    @Test
    void gatesAndDarkCountsExcludeOneAnother() throws RefusedEditException {
        ScenarioDocument free = with(AVALANCHE, new Put("alice.detectors[0].darkCountsPerSecond", 1500));
        assertThat(free.scenario().alice().detectors().get(0).gate()).isEmpty();
        ScenarioDocument gated = with(free, new Put("alice.detectors[0].gate.darkProbability", 3e-5));
        assertThat(gated.states("alice.detectors[0].darkCountsPerSecond")).isFalse();
        assertThat(gated.scenario()
                        .alice()
                        .detectors()
                        .get(0)
                        .gate()
                        .orElseThrow()
                        .darkProbability())
                .isEqualTo(3e-5);
    }

    @Test
    void gateOfAClassIsStatedInFullWhenOneValueOfItIs() throws RefusedEditException {
        ScenarioDocument ofClass = with(AVALANCHE, new Remove("bob.detectors[1].gate"));
        assertThat(ofClass.scenario().bob().detectors().get(1).gate()).isEqualTo(DetectorClass.INGAAS_GATED.gate());
        ScenarioDocument wider = with(ofClass, new Put("bob.detectors[1].gate.widthNs", 1.5));
        assertThat(wider.scenario()
                        .bob()
                        .detectors()
                        .get(1)
                        .gate()
                        .orElseThrow()
                        .darkProbability())
                .isEqualTo(2e-5);
    }

    @Test
    void relabellingKeepsSpreadsAndProvenanceInTheFile() throws RefusedEditException {
        ScenarioDocument after = with(KESTREL, new Put("alice.path[1].label", "dam duct"));
        assertThat(after.text()).isEqualTo(KESTREL.text().replace("upper duct", "dam duct"));
        assertThat(after.scenario().spread())
                .containsEntry(
                        "alice.path.dam duct.measuredLossDb",
                        KESTREL.scenario().spread().get("alice.path.upper duct.measuredLossDb"));
    }

    @Test
    void entriesOfADeletedElementGoWithIt() throws RefusedEditException {
        ScenarioDocument after = with(KESTREL, new Delete("alice.path", 1));
        assertThat(after.text()).doesNotContain("upper duct");
        assertThat(after.scenario().provenance()).hasSize(6).containsKey("bob.path.lower duct.lengthKm");
    }

    @Test
    void byteOrderMarkSchemaAndLineEndsStay() throws InvalidScenarioException, RefusedEditException {
        String text = "\ufeff"
                + KESTREL.text()
                        .replaceFirst("\n\\{\n", "\n{\n  \"\\$schema\": \"s.json\",\n")
                        .stripTrailing();
        ScenarioDocument document = ScenarioDocument.of(text.replace("\n", "\r\n"), "marked");
        ScenarioDocument after = with(
                document,
                new Put("protocol.secrecyEpsilon", 1e-9),
                new Delete("bob.path", 0),
                new Insert("bob.path", 0, Map.of("type", "loss", "lossDb", 1)));
        assertThat(after.text())
                .startsWith("\ufeff//")
                .contains("\"$schema\": \"s.json\",\r\n")
                .endsWith("}");
        assertThat(after.text().replace("\r\n", "")).doesNotContain("\r").doesNotContain("\n");
        assertThat(after.name()).isEqualTo("marked");
        assertThat(after.named("other").name()).isEqualTo("other");
    }

    @Test
    void aTextThatIsNoScenarioIsNoDocument() {
        assertThatExceptionOfType(InvalidScenarioException.class)
                .isThrownBy(() -> ScenarioDocument.of("{}", "empty"))
                .withMessageContaining("empty:1:1: name: missing");
    }

    @Test
    void statedValuesAreToldFromDefaults() {
        assertThat(KESTREL.states("alice.path[1].measuredLossDb")).isTrue();
        assertThat(KESTREL.states("alice.path[1].splices")).isFalse();
        assertThat(KESTREL.states("alice.path[9].splices")).isFalse();
        assertThat(KESTREL.states("spread.both.detectors.efficiency")).isTrue();
        assertThat(KESTREL.states("..")).isFalse();
    }

    @Test
    void scenarioIsWhatAReaderFindsInTheText() throws InvalidScenarioException {
        for (ScenarioDocument document : ShippedDocuments.all()) {
            Scenario read = ScenarioReader.parse(document.text(), document.name());
            assertThat(document.scenario()).isEqualTo(read);
        }
    }
}
