package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import binspan.counting.DetectorLoad;
import binspan.planner.document.Change.Delete;
import binspan.planner.document.Change.Put;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.Arm;
import binspan.scenario.Compensator;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.PathElement;
import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Elements come, go, move and are split; a split span predicts what the whole one did. */
final class ElementEditsTest {
    private static final ScenarioDocument FERNHILL = ShippedDocuments.named("fernhill-shared-trunk");
    private static final double EXACT_PERCENT = 1e-7;

    @ParameterizedTest
    @ValueSource(strings = {"fibre", "loss", "filter", "compensator"})
    void templatesAreValidAnywhereInEveryScenario(String type) throws RefusedEditException {
        for (ScenarioDocument document : ShippedDocuments.all()) {
            for (int at = 0; at <= document.scenario().bob().path().size(); at++) {
                ScenarioDocument after = document.with(ElementEdits.add(document.scenario(), "bob", type, at));
                ScenarioDocument twice = after.with(ElementEdits.add(after.scenario(), "bob", type, at));
                PathElement added = twice.scenario().bob().path().get(at);
                assertThat(added.label()).isPresent();
                assertThat(twice.with(ElementEdits.remove("bob", at)).scenario())
                        .isEqualTo(after.scenario());
            }
        }
    }

    @Test
    void templatesFitTheArm() throws RefusedEditException {
        Arm bob = FERNHILL.with(ElementEdits.add(FERNHILL.scenario(), "bob", "filter", 5))
                .scenario()
                .bob();
        assertThat(((FilterElement) bob.path().get(5)).bandwidthFwhmGHz())
                .isEqualTo(FERNHILL.scenario().source().idler().bandwidthFwhmGHz());
        ScenarioDocument compensated = FERNHILL.with(ElementEdits.add(FERNHILL.scenario(), "alice", "compensator", 5));
        assertThat(LinkPredictor.predict(compensated.scenario()).pathA().dispersionPsPerNm())
                .isCloseTo(0.0, within(1e-9));
        ScenarioDocument kestrel = ShippedDocuments.named("kestrel-dam-to-millbrook");
        ScenarioDocument bare = kestrel.with(List.of(new Delete("alice.path", 1)));
        ScenarioDocument useless = bare.with(ElementEdits.add(bare.scenario(), "alice", "compensator", 0));
        assertThat(((Compensator) useless.scenario().alice().path().get(0)).dispersionPsPerNm())
                .hasValue(0.0);
    }

    @Test
    void aFilterThatClassicalLightNeedsIsNotRemoved() {
        assertThatExceptionOfType(RefusedEditException.class)
                .isThrownBy(() -> FERNHILL.with(List.of(new Delete("alice.path", 4), new Delete("alice.path", 3))))
                .withMessageStartingWith("alice.path[1].classicalChannels: found classical light and no filter");
    }

    @Test
    void aMoveThereAndBackLeavesTheText() throws RefusedEditException {
        for (ScenarioDocument document : ShippedDocuments.all()) {
            int last = document.scenario().bob().path().size() - 1;
            try {
                ScenarioDocument there = document.with(ElementEdits.move("bob", 0, last));
                assertThat(there.with(ElementEdits.move("bob", last, 0)).text()).isEqualTo(document.text());
            } catch (RefusedEditException e) {
                assertThat(e).hasMessageContaining("no filter after this fibre");
            }
        }
    }

    /** The whole span is the independent means: nothing may tell it from its two parts. */
    @ParameterizedTest
    @CsvSource({"0.5", "0.1", "0.937"})
    void aSplitChangesNoPrediction(double share) throws RefusedEditException {
        int splits = 0;
        for (ScenarioDocument shipped : ShippedDocuments.all()) {
            ScenarioDocument document = withoutLeaks(shipped);
            LinkPrediction whole = LinkPredictor.predict(document.scenario());
            for (String arm : List.of("alice", "bob")) {
                List<PathElement> path = ("alice".equals(arm)
                                ? document.scenario().alice()
                                : document.scenario().bob())
                        .path();
                for (int i = 0; i < path.size(); i++) {
                    if (path.get(i) instanceof FibreSpan span) {
                        ScenarioDocument split =
                                document.with(ElementEdits.split(document.scenario(), arm, i, share * span.lengthKm()));
                        assertSame(LinkPredictor.predict(split.scenario()), whole);
                        splits++;
                    }
                }
            }
        }
        assertThat(splits).isGreaterThan(20);
    }

    /**
     * The classical light that gets through the filters, and with it what is not kept, is taken away; so are connectors
     * and splices in fibre that carries classical light. Both have a test of their own below.
     */
    private static ScenarioDocument withoutLeaks(ScenarioDocument document) throws RefusedEditException {
        ScenarioDocument tight = document;
        for (String arm : List.of("alice", "bob")) {
            List<PathElement> path = ("alice".equals(arm)
                            ? document.scenario().alice()
                            : document.scenario().bob())
                    .path();
            for (int i = 0; i < path.size(); i++) {
                String at = arm + ".path[" + i + "].";
                if (path.get(i) instanceof FilterElement) {
                    tight = tight.with(List.of(new Put(at + "isolationDb", 300)));
                } else if (path.get(i) instanceof FibreSpan span
                        && !span.classicalChannels().isEmpty()) {
                    tight = tight.with(List.of(new Put(at + "connectors", 0), new Put(at + "splices", 0)));
                }
            }
        }
        return tight;
    }

    private static void assertSame(LinkPrediction now, LinkPrediction before) {
        Percentage exact = Percentage.withPercentage(EXACT_PERCENT);
        assertThat(now.fringe().raw()).isCloseTo(before.fringe().raw(), exact);
        assertThat(now.key().asymptoticPerSecond()).isCloseTo(before.key().asymptoticPerSecond(), exact);
        for (int port = 0; port < before.counts().loadsA().size(); port++) {
            DetectorLoad load = before.counts().loadsA().get(port);
            DetectorLoad nowLoad = now.counts().loadsA().get(port);
            assertThat(nowLoad.photonsPerSecond()).isCloseTo(load.photonsPerSecond(), exact);
            assertThat(nowLoad.backgroundPerSecond()).isCloseTo(load.backgroundPerSecond(), exact);
        }
    }

    /**
     * What is not exactly kept: connectors and splices of the second span weaken the Raman light of the first, which those
     * of a whole span do not. The background falls by less than their loss.
     */
    @Test
    void connectorsBehindACutWeakenTheRamanLightBeforeIt() throws RefusedEditException {
        ScenarioDocument document = withoutLeaks(ShippedDocuments.named("coexistence"));
        ScenarioDocument connected = document.with(
                List.of(new Put("alice.path[0].connectors", 2), new Put("alice.path[0].connectorLossDb", 0.3)));
        double ratio = backgroundOfSplit(connected) / background(connected);
        double allOfSecondDb = 0.3;
        assertThat(-10.0 * Math.log10(ratio)).isBetween(0.01, allOfSecondDb);
    }

    /**
     * Nor is the leakage: a channel that both spans list counts as leaving both. The light of the first, less the loss of
     * the second, comes on top; both parts are sums of decibels.
     */
    @Test
    void lightThatRunsOnLeaksFromBothSpans() throws RefusedEditException {
        ScenarioDocument darkened = FERNHILL;
        for (int i = 0; i < 2; i++) {
            darkened = darkened.with(
                    List.of(new Put("alice.path[1].classicalChannels[" + i + "].ramanCoefficientPerKmNm", 0)));
        }
        double launched = -10.0;
        double classicalWholeDb = 0.35 * 22.0;
        double classicalFirstDb = classicalWholeDb / 2.0;
        double photonSecondDb = 5.2 / 2.0;
        double once = Math.pow(10.0, (launched - classicalWholeDb) / 10.0);
        double twice = once + Math.pow(10.0, (launched - classicalFirstDb - photonSecondDb) / 10.0);
        assertThat(backgroundOfSplit(darkened) / background(darkened))
                .isCloseTo(twice / once, Percentage.withPercentage(1e-6));
    }

    private static double backgroundOfSplit(ScenarioDocument document) throws RefusedEditException {
        int fibre = document.scenario().alice().path().get(0) instanceof FibreSpan ? 0 : 1;
        FibreSpan span = (FibreSpan) document.scenario().alice().path().get(fibre);
        return background(
                document.with(ElementEdits.split(document.scenario(), "alice", fibre, span.lengthKm() / 2.0)));
    }

    private static double background(ScenarioDocument document) {
        return LinkPredictor.predict(document.scenario())
                .counts()
                .loadsA()
                .get(0)
                .backgroundPerSecond();
    }

    @Test
    void aSplitIsWrittenLikeItsNeighbours() throws RefusedEditException {
        ScenarioDocument kestrel = ShippedDocuments.named("kestrel-dam-to-millbrook");
        ScenarioDocument after = kestrel.with(ElementEdits.split(kestrel.scenario(), "alice", 1, 10.2));
        String first = "      { \"type\": \"fibre\", \"label\": \"upper duct\", \"fibre\": \"G.652.D\", \"lengthKm\": ";
        assertThat(after.text())
                .isEqualTo(kestrel.text()
                        .replace(
                                first + "30.2, \"measuredLossDb\": 7.1 },",
                                first + "10.2, \"measuredLossDb\": 2.3980132450331 },\n"
                                        + first.replace("upper duct", "upper duct 2")
                                        + "20, \"measuredLossDb\": 4.7019867549669 },"));
    }

    @ParameterizedTest
    @CsvSource({
        "alice, 0, 1, alice.path[0]: found no fibre; allowed a fibre to split",
        "alice, 7, 1, alice.path[7]: found no fibre; allowed a fibre to split",
        "carol, 1, 1, found arm \"carol\"; allowed alice | bob",
        "alice, 1, 0, alice.path[1]: found a cut at 0 km; allowed above 0 to below 22 km",
        "alice, 1, NaN, alice.path[1]: found a cut at NaN km; allowed above 0 to below 22 km"
    })
    void splitsWithoutAPlaceAreRefused(String arm, int index, double atKm, String words) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ElementEdits.split(FERNHILL.scenario(), arm, index, atKm))
                .withMessage(words);
    }

    @Test
    void unknownTypesAreRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ElementEdits.add(FERNHILL.scenario(), "bob", "mirror", 0))
                .withMessage("found \"mirror\"; allowed fibre | loss | filter | compensator");
    }
}
