package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.prediction.Requirement;
import binspan.scenario.Values;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What is named as the largest cost is what was made the largest. */
final class LargestCostTest {
    private static String cost(Values stated, Requirement requirement) {
        return new LargestCost(ReportScenarios.check(stated)).of(requirement);
    }

    private static Values analyzer(String field, double value) {
        Values stated = ReportScenarios.good();
        stated.section("alice").section("analyzer").put(field, value);
        return stated;
    }

    @Test
    void causesOfTheVisibilityAreTold() {
        assertThat(cost(analyzer("phaseNoiseRmsRad", 0.6), Requirement.RAW_VISIBILITY))
                .contains("phase noise");
        assertThat(cost(analyzer("mismatchPs", 4.0), Requirement.RAW_VISIBILITY))
                .contains("mismatch of the imbalances");
        assertThat(cost(analyzer("polarizationOverlap", 0.8), Requirement.CHSH)).contains("polarization");
        assertThat(cost(analyzer("longPathExtraLossDb", 6.0), Requirement.RAW_VISIBILITY))
                .contains("unequal weight of the two paths");
        Values bright = ReportScenarios.good();
        bright.section("source").put("meanPairsPerCycle", 0.2);
        assertThat(cost(bright, Requirement.PHASE_QBER)).contains("several pairs at once");
    }

    @Test
    void staticPhaseErrorCostsTheTestButNotTheFringe() {
        Values stated = analyzer("phaseSettingErrorRad", 0.5);
        assertThat(cost(stated, Requirement.CHSH)).isEqualTo("The largest loss, 12.2 %, is by the static phase error.");
        assertThat(cost(stated, Requirement.RAW_VISIBILITY)).contains("several pairs at once");
    }

    @Test
    void accidentalsComeFromPairsOrFromNoise() {
        assertThat(cost(ReportScenarios.good(), Requirement.CAR)).contains("different pairs");
        assertThat(cost(ReportScenarios.failing(), Requirement.CAR))
                .contains("Dark counts and background")
                .contains("bob's singles");
    }

    @Test
    void timeBasisSuffersFromSlotsThatRunIntoOneAnother() {
        Values stated = ReportScenarios.good();
        stated.put("imbalanceNs", 0.25);
        stated.section("timing").put("windowWidthPs", 240.0);
        assertThat(cost(stated, Requirement.TIME_QBER)).contains("neighbouring slot");
        assertThat(cost(ReportScenarios.good(), Requirement.TIME_QBER)).contains("different pairs");
        assertThat(cost(ReportScenarios.continuous(), Requirement.TIME_QBER))
                .isEqualTo("Only a pulse pair has a time basis.");
    }

    @Test
    void keyThatLacksBitsIsToldTheWayThatLosesThem() {
        Values stated = ReportScenarios.good();
        stated.section("require").put("keyRateAtLeastBps", 1e5);
        ((Values) ((List<?>) stated.section("bob").get("path")).get(0)).put("lengthKm", 90.0);
        assertThat(cost(stated, Requirement.KEY_RATE)).startsWith("Only ").contains("sifted", "bob's fibre costs most");
        assertThat(cost(stated, Requirement.FIVE_SIGMA)).contains("bob's fibre costs most");
    }

    @Test
    void keyThatErrorsEatIsToldTheErrors() {
        Values stated = analyzer("phaseNoiseRmsRad", 0.9);
        assertThat(cost(stated, Requirement.KEY_RATE))
                .startsWith("The errors leave ")
                .contains("phase noise");
        assertThat(cost(stated, Requirement.FIRST_KEY)).startsWith("The errors leave ");
        assertThat(cost(analyzer("phaseNoiseRmsRad", 0.9), Requirement.FIVE_SIGMA))
                .contains("phase noise");
    }

    @Test
    void keyWithoutPortsIsToldSo() {
        assertThat(cost(ReportScenarios.onePort(), Requirement.KEY_RATE))
                .isEqualTo("The detected ports allow no key: both ports are needed on both sides.");
    }
}
