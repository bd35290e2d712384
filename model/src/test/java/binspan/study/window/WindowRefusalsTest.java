package binspan.study.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.box.ToleranceBox;
import binspan.study.box.ToleranceBox.Sense;
import binspan.study.region.OperatingRegion;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What the studies of windows refuse, how they are stopped and what they report on the way. */
final class WindowRefusalsTest {
    private static final Scenario LINK = WindowLinks.pulsePair();
    private static final Axis PAIRS = WindowLinks.axis(LINK, "source.meanPairsPerCycle", 1e-3, 0.2, true);
    private static final Axis WIDTH = WindowLinks.axis(LINK, "timing.windowWidthPs", 50.0, 3000.0, false);

    @Test
    void scenarioWithoutRequirementsIsRefused() {
        Scenario idle = SampleScenarios.build(SampleScenarios.pulsePair());
        String message = "the scenario states no requirement; state at least one in its section \"require\"";
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new OperatingWindow(idle, PAIRS))
                .withMessage(message);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new OperatingRegion(idle, PAIRS, WIDTH))
                .withMessage(message);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new ToleranceBox(idle, List.of(PAIRS), Sense.SHARE, false, 1))
                .withMessage(message);
    }

    @Test
    void requirementsAndCountsAreNoAxes() {
        Axis required = WindowLinks.axis(LINK, "require.carAtLeast", 1.0, 20.0, false);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new OperatingWindow(LINK, required))
                .withMessage("require.carAtLeast: is a requirement; vary a property of the link");
        Axis points = WindowLinks.axis(LINK, "acquisition.fringePoints", 10.0, 20.0, false);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new OperatingWindow(LINK, points))
                .withMessage("acquisition.fringePoints: takes whole numbers only; vary a parameter that has no steps");
    }

    @Test
    void sameParameterTwiceIsRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new OperatingRegion(LINK, WIDTH, WIDTH))
                .withMessage("timing.windowWidthPs: found twice; allowed once");
    }

    @Test
    void parametersOfAnotherPumpAreRefused() {
        Axis rate =
                new Axis(binspan.scenario.ParameterPaths.find(LINK, "source.pairRatePerSecond"), 1e5, 1e6, 129, false);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new OperatingWindow(LINK, rate))
                .withMessageContaining("source.meanPairsPerCycle");
    }

    @Test
    void numberOfAxesOfABoxIsLimited() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new ToleranceBox(LINK, List.of(), Sense.SHARE, false, 1))
                .withMessage("found 0 parameters of a box; allowed 1 to 6");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new ToleranceBox(LINK, Collections.nCopies(7, PAIRS), Sense.SHARE, false, 1))
                .withMessage("found 7 parameters of a box; allowed 1 to 6");
    }

    @Test
    void largeMapsAreRefused() {
        Axis pairs = new Axis(PAIRS.parameter(), 1e-3, 0.2, 4001, true);
        Axis width = new Axis(WIDTH.parameter(), 50.0, 3000.0, 4001, false);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new OperatingRegion(LINK, pairs, width))
                .withMessage("found 16008001 points of the map; allowed 4000000: take fewer steps");
    }

    @Test
    void relativeToleranceNeedsARangeOffZero() {
        Axis delay = WindowLinks.axis(LINK, "alice.delayErrorPs", -10.0, 10.0, false);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new ToleranceBox(LINK, List.of(delay), Sense.TOLERANCE, false, 1))
                .withMessage(
                        "alice.delayErrorPs: found -10 to 10; a relative tolerance needs a range on one side of 0");
    }

    @Test
    void heldPlannedValueMustBeInsideAndKnown() {
        Axis wide = WindowLinks.axis(LINK, "timing.windowWidthPs", 500.0, 3000.0, false);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new ToleranceBox(LINK, List.of(wide), Sense.SHARE, true, 1))
                .withMessage("timing.windowWidthPs: found 400 in the scenario; to hold the box there its range must"
                        + " contain it, found 500 to 3000");
        Axis modes = WindowLinks.axis(LINK, "source.schmidtNumber", 1.0, 10.0, false);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new ToleranceBox(LINK, List.of(modes), Sense.SHARE, true, 1))
                .withMessage(
                        "source.schmidtNumber: the scenario leaves it to be computed; state it to hold the box there");
    }

    /** A study that can be run. */
    @FunctionalInterface
    interface Study {
        Object run(Execution execution);
    }

    static List<Study> studies() {
        return List.of(
                new OperatingWindow(LINK, PAIRS)::run,
                new OperatingRegion(LINK, PAIRS, WIDTH)::run,
                new ToleranceBox(LINK, List.of(PAIRS, WIDTH), Sense.SHARE, false, 1)::run,
                new ToleranceBox(LINK, List.of(PAIRS, WIDTH), Sense.TOLERANCE, true, 1)::run);
    }

    @ParameterizedTest
    @MethodSource("studies")
    void studyStopsWhenAsked(Study study) {
        AtomicInteger asked = new AtomicInteger();
        Progress impatient = new Progress() {
            @Override
            public void reached(double share) {
                // not looked at
            }

            @Override
            public boolean cancelled() {
                return asked.incrementAndGet() > 5;
            }
        };
        assertThatThrownBy(() -> study.run(new Execution(2, impatient, 0.0, 1.0)))
                .isInstanceOf(CancellationException.class);
    }

    @ParameterizedTest
    @MethodSource("studies")
    void progressRisesToOne(Study study) {
        List<Double> heard = new ArrayList<>();
        Progress listening = new Progress() {
            @Override
            public void reached(double share) {
                heard.add(share);
            }

            @Override
            public boolean cancelled() {
                return false;
            }
        };
        study.run(new Execution(1, listening, 0.0, 1.0));
        assertThat(heard).isSorted().hasSizeGreaterThan(3);
        assertThat(heard.get(0)).isBetween(0.0, 0.3);
        assertThat(heard.get(heard.size() - 1)).isEqualTo(1.0);
    }
}
