package binspan.planner.report;

import binspan.prediction.LinkCheck;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementOutcome;

/** For a link that fails, in plain sentences: which requirement by how much, and what costs most. */
public final class VerdictFailure {
    private VerdictFailure() {}

    static void write(LinkCheck check, TextPage page) {
        if (check.met()) {
            return;
        }
        LargestCost cost = new LargestCost(check);
        page.heading("Why not");
        String told = "";
        for (RequirementOutcome outcome : check.outcomes()) {
            if (!outcome.met()) {
                String why = cost.of(outcome.requirement());
                page.wrapped(
                        "  - ", "    ", missed(outcome) + " " + (why.equals(told) ? "The cause is the same." : why));
                told = why;
            }
        }
    }

    /** Why a link does not meet a requirement: by how much, and what costs most. */
    public static String why(LinkCheck check, RequirementOutcome outcome) {
        return missed(outcome) + " " + new LargestCost(check).of(outcome.requirement());
    }

    private static String missed(RequirementOutcome outcome) {
        Requirement requirement = outcome.requirement();
        String required = RequirementWords.required(requirement, outcome.required());
        if (outcome.margin().isEmpty()) {
            return RequirementWords.absent(requirement) + "; " + required + " is required.";
        }
        double missing = Math.abs(outcome.margin().getAsDouble());
        String size = RequirementWords.amount(requirement, missing);
        double ratio = missing / outcome.required();
        String share = ratio <= 1.0 ? " (" + Figure.percent(ratio) + " of it)" : "";
        return RequirementWords.subject(requirement) + (requirement.atLeast() ? " falls short of " : " exceeds ")
                + required + " by " + size + share + ".";
    }
}
