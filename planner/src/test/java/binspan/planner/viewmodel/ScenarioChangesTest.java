package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.report.ParameterWords;
import binspan.scenario.Arm;
import binspan.scenario.Edits;
import binspan.scenario.LossElement;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import binspan.scenario.SpreadShape;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class ScenarioChangesTest {
    private static final Scenario LINK = VerdictLinks.meeting();

    private static List<String> texts(Scenario after) {
        return ScenarioChanges.between(LINK, after).stream()
                .map(ScenarioChange::text)
                .toList();
    }

    private static Scenario withAlice(List<PathElement> path) {
        Arm alice = Edits.withPath(LINK.alice(), path);
        return Edits.withArms(LINK, alice, LINK.bob());
    }

    @Test
    void nothingDiffersFromItself() {
        assertThat(ScenarioChanges.between(LINK, VerdictLinks.meeting())).isEmpty();
    }

    /** Each number by itself, set through the registry of parameters: one line that ends with the new value. */
    @ParameterizedTest
    @CsvSource({
        "imbalanceNs, 2.5, 2.5 ns",
        "source.pump.repetitionRateMHz, 90, 90 MHz",
        "source.idler.channel, 31, C31",
        "source.signal.bandwidthFwhmGHz, 50, 50 GHz",
        "alice.repairMarginDb, 2.25, 2.25 dB",
        "alice.detectors[1].deadTimeNs, 35, 35 ns",
        "bob.detectors[0].darkCountsPerSecond, 12000, 12 k/s",
        "bob.analyzer.temperatureRmsMilliK, 7, 7 mK",
        "acquisition.fringePoints, 20, 20",
        "protocol.secrecyEpsilon, 1e-9, 1e-9",
    })
    void numbersAreToldWithTheirUnits(String path, double value, String shown) {
        List<ScenarioChange> changes = ScenarioChanges.between(LINK, VerdictLinks.with(LINK, path, value));
        assertThat(changes).hasSize(1);
        assertThat(changes.get(0).what()).isEqualTo(ParameterWords.name(path));
        assertThat(changes.get(0).after()).isEqualTo(shown);
        assertThat(changes.get(0).before()).isNotEqualTo(shown).isNotEmpty();
    }

    @Test
    void numberThatWasNotStatedIsToldSo() {
        assertThat(texts(VerdictLinks.with(LINK, "source.schmidtNumber", 1.5)))
                .containsExactly("Schmidt number: not stated \u2192 1.5");
    }

    @Test
    void requirementsKeepTheirNames() {
        assertThat(texts(VerdictLinks.with(LINK, "require.phaseBasisQberAtMost", 0.031)))
                .hasSize(1)
                .allSatisfy(text -> assertThat(text)
                        .startsWith("required phase-basis error rate: ")
                        .endsWith("3.1 %"));
    }

    @Test
    void elementsAddedAndRemovedAreOneLineEach() {
        List<PathElement> path = new ArrayList<>(LINK.alice().path());
        path.add(new LossElement(Optional.of("monitor tap"), 0.4));
        assertThat(texts(withAlice(path))).containsExactly("alice: added: monitor tap");
        List<PathElement> shorter =
                LINK.alice().path().subList(1, LINK.alice().path().size());
        String label = LINK.alice().path().get(0).label().orElseThrow();
        assertThat(texts(withAlice(shorter))).containsExactly("alice: removed: " + label);
    }

    @Test
    void unlabelledElementsAreFoundByTheirKind() {
        List<PathElement> path = new ArrayList<>(LINK.alice().path());
        path.add(0, new LossElement(Optional.empty(), 0.4));
        Scenario before = withAlice(path);
        path.set(0, new LossElement(Optional.empty(), 0.6));
        assertThat(ScenarioChanges.between(before, withAlice(path)))
                .containsExactly(new ScenarioChange("loss, alice's element [0]", "0.4 dB", "0.6 dB"));
        assertThat(ScenarioChanges.between(LINK, withAlice(path)))
                .containsExactly(new ScenarioChange("alice: added: loss", "", ""));
    }

    @Test
    void anotherOrderIsTold() {
        List<PathElement> path = new ArrayList<>(LINK.alice().path());
        Collections.reverse(path);
        assertThat(path).hasSizeGreaterThan(1);
        assertThat(texts(withAlice(path)))
                .hasSize(1)
                .allSatisfy(text -> assertThat(text).startsWith("alice: order changed to "));
    }

    @Test
    void spreadsAndNotesAreTold() {
        Scenario after = new Scenario(
                LINK.formatVersion(),
                "Another name",
                LINK.imbalanceNs(),
                LINK.source(),
                LINK.alice(),
                LINK.bob(),
                LINK.timing(),
                LINK.protocol(),
                LINK.acquisition(),
                LINK.require(),
                Map.of("timing.windowWidthPs", Spread.of(SpreadShape.UNIFORM, 0.05, true)),
                Map.of());
        List<String> texts = texts(after);
        assertThat(texts)
                .contains("name: " + LINK.name() + " \u2192 Another name")
                .contains("spread, window width: not stated \u2192 uniform 5 %");
        assertThat(texts)
                .filteredOn(text -> text.startsWith("provenance, "))
                .hasSize(LINK.provenance().size());
    }
}
