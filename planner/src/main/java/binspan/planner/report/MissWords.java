package binspan.planner.report;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;

/** How far a link is from the requirement that it violates most. */
public final class MissWords {
    private MissWords() {}

    /** For example: {@code the raw visibility is 0.91, required at least 0.95}. */
    public static String of(RequirementMargins margins, LinkPrediction prediction) {
        int tightest = margins.tightest(prediction);
        Requirement requirement = margins.requirements().get(tightest);
        double required = margins.required(tightest);
        double predicted = requirement.predicted(prediction, FiniteKeyOutlook.of(prediction));
        String value = Double.isFinite(predicted)
                ? "is " + RequirementWords.predicted(requirement, predicted, required)
                : "cannot be had at all";
        return "the " + RequirementWords.name(requirement) + " " + value + ", required "
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
