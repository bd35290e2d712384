package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.optics.OpticalPath;
import binspan.prediction.ArmBudget.Entry;
import binspan.prediction.ArmBudget.Kind;
import binspan.scenario.Arm;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The budget of an arm against the path that the prediction adds up in its own order, and against sums by hand. */
final class ArmBudgetTest {
    private static final int LINKS = 300;

    /** Only the order of the additions differs: a few units in the last place. */
    private static final double ROUNDING = 1e-13;

    @Test
    void sumsAreThoseOfThePrediction() {
        RandomChecks.none(LINKS, number -> {
            LinkPrediction prediction = LinkPredictor.predict(RandomScenarios.any(number));
            return complaint(prediction, true) + complaint(prediction, false);
        });
    }

    private static String complaint(LinkPrediction prediction, boolean alice) {
        ArmBudget budget = ArmBudget.of(prediction, alice);
        OpticalPath path = alice ? prediction.pathA() : prediction.pathB();
        Arm arm = alice ? prediction.scenario().alice() : prediction.scenario().bob();
        boolean loss = close(budget.lossDb(), path.lossDb(), path.lossDb());
        double spread = budget.entries().stream()
                .mapToDouble(entry -> Math.abs(entry.dispersionPsPerNm()))
                .sum();
        boolean dispersion = close(budget.dispersionPsPerNm(), path.dispersionPsPerNm(), spread);
        double fibre =
                ofKind(budget, Kind.FIBRE).stream().mapToDouble(Entry::lossDb).sum();
        return loss
                        && dispersion
                        && close(fibre, path.fibreLossDb(), path.fibreLossDb())
                        && budget.entries().size() == arm.path().size() + 3
                ? ""
                : budget + " against " + path;
    }

    private static boolean close(double found, double expected, double scale) {
        return Math.abs(found - expected) <= ROUNDING * Math.max(1.0, scale);
    }

    private static List<Entry> ofKind(ArmBudget budget, Kind kind) {
        return budget.entries().stream().filter(entry -> entry.kind() == kind).toList();
    }

    /** 30 km at 0.2 dB/km and 17 ps/(nm km), added by hand. */
    @Test
    void runningSumsAreThoseOfAHandCalculation() {
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "alice").put("sourceCouplingLossDb", 1.5).put("repairMarginDb", 2.0);
        SampleScenarios.part(stated, "alice.analyzer").put("excessLossDb", 0.75);
        SampleScenarios.part(stated, "alice.path[0]")
                .put("lengthKm", 30.0)
                .put("attenuationDbPerKm", 0.2)
                .put("dispersionPsPerNmKm", 17.0)
                .put("connectors", 2.0)
                .put("connectorLossDb", 0.25);
        Scenario scenario = SampleScenarios.build(stated);
        ArmBudget budget = ArmBudget.of(LinkPredictor.predict(scenario), true);
        Entry fibre = ofKind(budget, Kind.FIBRE).get(0);
        assertThat(budget.entries().get(0).kind()).isEqualTo(Kind.COUPLING);
        assertThat(fibre.lossDb()).isCloseTo(30.0 * 0.2 + 2 * 0.25, within(1e-12));
        assertThat(fibre.runningLossDb()).isCloseTo(1.5 + 6.5, within(1e-12));
        assertThat(fibre.dispersionPsPerNm()).isCloseTo(510.0, within(1e-9));
        assertThat(fibre.lengthKm()).isEqualTo(30.0);
        assertThat(ofKind(budget, Kind.REPAIR_MARGIN).get(0).lossDb()).isEqualTo(2.0);
        assertThat(ofKind(budget, Kind.ANALYZER_EXCESS).get(0).lossDb()).isEqualTo(0.75);
        assertThat(budget.lossDb() - fibre.runningLossDb()).isCloseTo(2.75, within(1e-12));
    }

    @Test
    void everyKindOfElementIsNamed() {
        ArmBudget budget =
                ArmBudget.of(LinkPredictor.predict(SampleScenarios.build(SampleScenarios.everything())), true);
        assertThat(budget.entries())
                .extracting(Entry::kind)
                .contains(Kind.values())
                .startsWith(Kind.COUPLING)
                .endsWith(Kind.REPAIR_MARGIN, Kind.ANALYZER_EXCESS);
        assertThat(ofKind(budget, Kind.FIBRE)).extracting(Entry::label).contains("valley duct");
        assertThat(ofKind(budget, Kind.COMPENSATOR).get(0).dispersionPsPerNm()).isNotZero();
    }
}
