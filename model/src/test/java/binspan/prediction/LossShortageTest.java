package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import org.junit.jupiter.api.Test;

/** Shortage of loss against a closed form and against predictions of links that lose so much less. */
final class LossShortageTest {
    /** Without noise and dead time and with few clicks the key falls as the transmittance (common practice). */
    @Test
    void keyOfAQuietLinkGrowsByTheDecibel() {
        double rate = LinkCheck.of(quiet(null)).prediction().key().asymptoticPerSecond();
        LossShortage shortage = LossShortage.of(quiet(rate * Math.pow(10.0, 0.15)));
        assertThat(shortage.alice().orElseThrow()).isCloseTo(1.5, within(0.01));
        assertThat(shortage.bob().orElseThrow()).isCloseTo(1.5, within(0.01));
    }

    @Test
    void nothingIsShortWhereAllIsMetAndNothingHelpsBeyondNoLoss() {
        double rate = LinkCheck.of(quiet(null)).prediction().key().asymptoticPerSecond();
        assertThat(LossShortage.of(quiet(rate * 0.9)).alice()).hasValue(0.0);
        assertThat(LossShortage.of(quiet(rate * 1e9)).alice()).isEmpty();
        assertThat(LossShortage.of(quiet(rate * 1e9)).bob()).isEmpty();
    }

    /** With the margin of the file smaller by the shortage all is met, by a little less it is not. */
    @Test
    void requirementIsMetJustThere() {
        Values stated = sample(8.0);
        double rate = LinkCheck.of(build(stated, null)).prediction().key().asymptoticPerSecond();
        double less = LossShortage.of(build(stated, 2.0 * rate)).alice().orElseThrow();
        assertThat(LinkCheck.of(build(sample(8.0 - less), 2.0 * rate)).met()).isTrue();
        assertThat(LinkCheck.of(build(sample(8.0 - less + 0.01), 2.0 * rate)).met())
                .isFalse();
    }

    private static Values sample(double aliceMarginDb) {
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "alice").put("repairMarginDb", aliceMarginDb);
        return stated;
    }

    private static Scenario quiet(Double keyRate) {
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", 1e-4);
        for (String arm : new String[] {"alice", "bob"}) {
            SampleScenarios.part(stated, arm)
                    .list("detectors")
                    .forEach(
                            detector -> detector.put("darkCountsPerSecond", 0.0).put("deadTimeNs", 0.0));
        }
        return build(stated, keyRate);
    }

    private static Scenario build(Values stated, Double keyRate) {
        Values require = keyRate == null ? new Values() : new Values().put("keyRateAtLeastBps", keyRate);
        return SampleScenarios.build(stated.put("require", require));
    }
}
