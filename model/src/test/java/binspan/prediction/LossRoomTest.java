package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import binspan.study.StudyScenarios;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Room for more loss against predictions of links that lose so much, and where a closed form is known. */
final class LossRoomTest {
    private static final double SLIGHTLY_DB = 1e-3;

    @Test
    void requirementHoldsJustInsideAndFailsJustBeyond() {
        Scenario scenario = StudyScenarios.modest();
        LossRoom room = room(scenario);
        double alice = room.alice().orElseThrow().extraDb();
        double bob = room.bob().orElseThrow().extraDb();
        double both = room.both().orElseThrow().extraDb();
        assertThat(met(scenario, alice - SLIGHTLY_DB, 0.0)).isTrue();
        assertThat(met(scenario, alice + SLIGHTLY_DB, 0.0)).isFalse();
        assertThat(met(scenario, 0.0, bob - SLIGHTLY_DB)).isTrue();
        assertThat(met(scenario, 0.0, bob + SLIGHTLY_DB)).isFalse();
        assertThat(met(scenario, both - SLIGHTLY_DB, both - SLIGHTLY_DB)).isTrue();
        assertThat(met(scenario, both + SLIGHTLY_DB, both + SLIGHTLY_DB)).isFalse();
    }

    @Test
    void unequalMarginsGrowByTheSame() {
        Values stated = SampleScenarios.pulsePair().put("require", new Values().put("rawVisibilityAtLeast", 0.85));
        SampleScenarios.part(stated, "bob").put("repairMarginDb", 1.7);
        Scenario scenario = SampleScenarios.build(stated);
        double both = room(scenario).both().orElseThrow().extraDb();
        assertThat(met(scenario, both - SLIGHTLY_DB, both - SLIGHTLY_DB)).isTrue();
        assertThat(met(scenario, both + SLIGHTLY_DB, both + SLIGHTLY_DB)).isFalse();
    }

    /** Without noise and dead time and with few clicks the coincidence rate falls as the transmittance (common practice). */
    @Test
    void rateOfAQuietLinkFallsByTheDecibel() {
        Values stated = SampleScenarios.pulsePair();
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", 1e-4);
        for (String arm : new String[] {"alice", "bob"}) {
            SampleScenarios.part(stated, arm)
                    .list("detectors")
                    .forEach(
                            detector -> detector.put("darkCountsPerSecond", 0.0).put("deadTimeNs", 0.0));
        }
        LinkCheck open = LinkCheck.of(SampleScenarios.build(stated));
        double rate = open.prediction().key().asymptoticPerSecond();
        Scenario scenario =
                SampleScenarios.build(stated.put("require", new Values().put("keyRateAtLeastBps", rate / 10.0)));
        LossRoom room = room(scenario);
        assertThat(room.alice().orElseThrow().extraDb()).isCloseTo(10.0, within(0.02));
        assertThat(room.both().orElseThrow().extraDb()).isCloseTo(5.0, within(0.01));
        assertThat(room.both().orElseThrow().requirement()).isEqualTo(Requirement.KEY_RATE);
    }

    @Test
    void absentWhereNothingIsMet() {
        LossRoom unasked = room(SampleScenarios.build(SampleScenarios.pulsePair()));
        LossRoom failed = room(StudyScenarios.requiring("rawVisibilityAtLeast", 0.9999));
        for (LossRoom room : new LossRoom[] {unasked, failed}) {
            assertThat(room).isEqualTo(new LossRoom(Optional.empty(), Optional.empty(), Optional.empty()));
        }
    }

    private static LossRoom room(Scenario scenario) {
        return LossRoom.of(
                scenario, LinkCheck.brief(LinkPredictor.predict(scenario)).outcomes());
    }

    private static boolean met(Scenario scenario, double extraA, double extraB) {
        Scenario weaker = SampleScenarios.with(
                scenario, "alice.repairMarginDb", scenario.alice().repairMarginDb() + extraA);
        weaker = SampleScenarios.with(
                weaker, "bob.repairMarginDb", scenario.bob().repairMarginDb() + extraB);
        return LinkCheck.brief(LinkPredictor.predict(weaker)).met();
    }
}
