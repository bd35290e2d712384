package binspan.study.tuning;

import binspan.prediction.RequirementMargins;
import binspan.scenario.LinkLength;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Crossing;
import binspan.study.Execution;
import binspan.study.PointEvaluator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/** The greatest length at which some requirements hold, for one thread. */
public final class ReachLimits {
    private static final double PRECISION = 1e-7;
    private static final double TUNED_PRECISION = 1e-5;
    private static final double STEP = 1.25;
    private static final int SCAN = 600;
    private static final int MOST_DOUBLINGS = 12;
    private static final int MOST_ATTEMPTS = 4;
    private static final double BEYOND = 1e-3;

    private final Scenario scenario;
    private final RequirementMargins margins;
    private final LinkLength length = new LinkLength();
    private final double longest = length.range().highest();
    private final double planned;
    private final PointEvaluator evaluator;

    public ReachLimits(Scenario scenario, RequirementMargins margins) {
        this.scenario = scenario;
        this.margins = margins;
        this.planned = length.value(scenario).orElseThrow();
        this.evaluator = new PointEvaluator(scenario, List.of(length), margins);
    }

    /** At the settings as written; absent where they hold at no length. */
    public OptionalDouble asWritten() {
        DoubleUnaryOperator margin = evaluator::leastMargin;
        double far = planned;
        for (int i = 0; i < MOST_DOUBLINGS && far < longest && quicklyHolds(far); i++) {
            far = Math.min(longest, 2.0 * far);
        }
        for (int i = SCAN; i >= 0; i--) {
            double km = far * i / SCAN;
            if (margin.applyAsDouble(km) >= 0.0) {
                return OptionalDouble.of(
                        i == SCAN ? km : Crossing.lastGood(margin, km, far * (i + 1) / SCAN, PRECISION));
            }
        }
        return OptionalDouble.empty();
    }

    /** Whether they hold here or a little farther, so that the scan must begin beyond. */
    private boolean quicklyHolds(double km) {
        for (double factor = 1.0; factor > 0.45; factor -= 0.05) {
            if (evaluator.leastMargin(km * factor) >= 0.0) {
                return true;
            }
        }
        return false;
    }

    /**
     * Re-tuned at every length; absent where no settings hold at any length.
     *
     * @param free parameters to tune
     * @param known a length at which they are known to hold, if any
     * @param execution stops the search when asked
     */
    public OptionalDouble retuned(List<Axis> free, OptionalDouble known, Execution execution) {
        TunedLengths tuned = new TunedLengths(scenario, free, Objective.MARGIN, margins, execution);
        DoubleUnaryOperator margin = km -> margins.least(tuned.at(km).prediction());
        double good = known.orElse(0.0);
        if (good == longest || (known.isEmpty() && margin.applyAsDouble(0.0) < 0.0)) {
            return known;
        }
        for (int i = 0; i < MOST_ATTEMPTS; i++) {
            double bad = Math.min(longest, Math.max(good * STEP, planned / 8.0));
            while (margin.applyAsDouble(bad) >= 0.0) {
                good = bad;
                if (bad == longest) {
                    return OptionalDouble.of(longest);
                }
                bad = Math.min(longest, bad * STEP);
            }
            good = Crossing.lastGood(margin, good, bad, TUNED_PRECISION);
            double beyond = good * (1.0 + BEYOND);
            if (beyond > longest || margins.least(tuned.afresh(beyond).prediction()) < 0.0) {
                break;
            }
            good = beyond;
        }
        return OptionalDouble.of(good);
    }
}
