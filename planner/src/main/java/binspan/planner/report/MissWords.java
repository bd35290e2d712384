package binspan.planner.report;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.study.Axis;
import binspan.study.window.PointVerdict;
import binspan.study.window.RequirementMargin;
import java.util.List;

/** How far a link is from the requirement that it violates most. */
public final class MissWords {
    private MissWords() {}

    /** For example: {@code the raw visibility is 0.91, required at least 0.95}. */
    public static String of(RequirementMargins margins, LinkPrediction prediction) {
        int tightest = margins.tightest(prediction);
        Requirement requirement = margins.requirements().get(tightest);
        double required = margins.required(tightest);
        return of(requirement, required, requirement.predicted(prediction, FiniteKeyOutlook.of(prediction)));
    }

    /** The same at a point of some axes: {@code timing.windowWidthPs 210 ps: the raw visibility is ...}. */
    public static String at(List<Axis> axes, PointVerdict nearest) {
        RequirementMargin tightest = nearest.tightest();
        double[] point =
                nearest.values().stream().mapToDouble(Double::doubleValue).toArray();
        String where = AxisWords.named(axes, point).replace(TextPage.GLUE, ' ');
        return where + ": " + of(tightest.requirement(), tightest.required(), tightest.predicted());
    }

    /**
     * That nothing meets the requirements, and how near it comes.
     *
     * @param what what was searched
     * @param margins the requirements
     * @param prediction prediction at the point that fails by the least
     */
    public static String nowhere(String what, RequirementMargins margins, LinkPrediction prediction) {
        if (margins.met(prediction)) {
            return what + " inside the model's slots: the window would be wider than the separation,"
                    + " or the slots longer than the pump cycle";
        }
        return what + "; at the nearest point " + of(margins, prediction);
    }

    /** That nothing within the ranges of some axes meets the requirements, and how near it comes. */
    public static String nowhere(List<Axis> axes, PointVerdict nearest) {
        return "nowhere in these ranges do all requirements hold; nearest at " + at(axes, nearest);
    }

    private static String of(Requirement requirement, double required, double predicted) {
        if (requirement == Requirement.SLOTS) {
            return SlotWords.END;
        }
        String value = Double.isFinite(predicted)
                ? "is " + RequirementWords.predicted(requirement, predicted, required)
                : "cannot be had at all";
        return "the " + RequirementWords.noun(requirement) + " " + value + ", required "
                + (requirement.atLeast() ? "at least " : "at most ") + RequirementWords.required(requirement, required);
    }

    /** The same with what costs that requirement most, as whole sentences. */
    public static String reason(RequirementMargins margins, LinkPrediction prediction) {
        Requirement requirement = margins.requirements().get(margins.tightest(prediction));
        String miss = of(margins, prediction);
        return Character.toUpperCase(miss.charAt(0)) + miss.substring(1) + ". "
                + new LargestCost(LinkCheck.brief(prediction)).of(requirement);
    }
}
