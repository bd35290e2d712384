package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.prediction.Headroom;
import binspan.prediction.Requirement;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Scenario paths and requirements in the words of the trade. */
final class WordsTest {
    @ParameterizedTest
    @CsvSource({
        "link.lengthKm, 'fibre length, both arms'",
        "timing.windowWidthPs, window width",
        "source.pump.frequencyDriftRmsMHz, 'pump frequency drift, rms'",
        "source.pump.mismatchPs, pump imbalance mismatch",
        "source.pump.phaseNoiseRmsRad, 'pump phase noise, rms'",
        "alice.analyzer.mismatchPs, alice analyzer imbalance mismatch",
        "bob.analyzer.phaseNoiseRmsRad, 'bob analyzer phase noise, rms'",
        "bob.analyzer.temperatureRmsMilliK, 'bob analyzer temperature, rms'",
        "alice.detectors.jitterFwhmPs, 'alice detector jitter, FWHM'",
        "alice.detectors[1].darkCountsPerSecond, alice port 2 dark counts",
        "bob.detectors[0].gate.darkProbability, bob port 1 dark clicks of a gate",
        "bob.repairMarginDb, bob extra loss",
        "alice.some.otherField, alice.some.otherField"
    })
    void pathsHaveWords(String path, String words) {
        assertThat(DriftWords.of(path)).isEqualTo(words);
    }

    @Test
    void everyQuantityOfTheHeadroomHasWords() {
        for (Headroom each : ReportScenarios.check(ReportScenarios.failing()).headroom()) {
            assertThat(DriftWords.of(each.path())).isNotEqualTo(each.path());
        }
    }

    @Test
    void roomIsMeasuredAgainstThePlanOrTheUsualSize() {
        assertThat(DriftWords.relativeRoom("timing.windowWidthPs", 400.0, 300.0))
                .isEqualTo(0.25);
        assertThat(DriftWords.relativeRoom("alice.delayErrorPs", 0.0, -25.0)).isEqualTo(0.5);
        assertThat(DriftWords.relativeRoom("alice.delayErrorPs", -100.0, -150.0))
                .isEqualTo(0.5);
    }

    @ParameterizedTest
    @EnumSource
    void everyRequirementHasWordsThatFitItsColumn(Requirement requirement) {
        assertThat(RequirementWords.name(requirement)).isNotBlank().hasSizeLessThan(26);
        assertThat(RequirementWords.subject(requirement)).matches("(The|S) .+");
        assertThat(RequirementWords.absent(requirement)).isNotBlank();
    }

    @Test
    void figuresTakeTheirOwnUnits() {
        assertThat(RequirementWords.required(Requirement.TIME_QBER, 0.07)).isEqualTo("7 %");
        assertThat(RequirementWords.required(Requirement.KEY_RATE, 2500.0)).isEqualTo("2.50 kbit/s");
        assertThat(RequirementWords.predicted(Requirement.FIRST_KEY, 0.25, 24.0))
                .isEqualTo("15.0 min");
        assertThat(RequirementWords.predicted(Requirement.CHSH, 2.2996, 2.3)).isEqualTo("2.2996");
        assertThat(RequirementWords.predicted(Requirement.RAW_VISIBILITY, 0.85, 0.85))
                .isEqualTo("0.850");
        assertThat(RequirementWords.margin(Requirement.FIVE_SIGMA, -3.25)).isEqualTo("-3.3 h");
        assertThat(RequirementWords.margin(Requirement.PHASE_QBER, 0.0123)).isEqualTo("+1.2 %");
        assertThat(RequirementWords.amount(Requirement.KEY_RATE, 99.6)).isEqualTo("99.6 bit/s");
        assertThat(RequirementWords.amount(Requirement.FIRST_KEY, 30.0)).isEqualTo("30.0 h");
        assertThat(RequirementWords.amount(Requirement.TIME_QBER, 0.0063)).isEqualTo("0.63 percentage points");
    }
}
