package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.prediction.LinkCheck;
import binspan.prediction.RequirementOutcome;

/** One line for each stated requirement: required, predicted, margin, and met or not in a word and a sign. */
public final class VerdictRequirements {
    private static final int NAME = 26;
    private static final int NUMBER = 13;

    private VerdictRequirements() {}

    static void write(LinkCheck check, TextPage page) {
        if (check.outcomes().isEmpty()) {
            return;
        }
        TextStyle style = page.style();
        page.gap();
        page.line(style.strong(left("Requirement", NAME)
                + right("required", NUMBER)
                + right("predicted", NUMBER)
                + right("margin", NUMBER)));
        for (RequirementOutcome outcome : check.outcomes()) {
            page.line(line(outcome, style));
        }
    }

    private static String line(RequirementOutcome outcome, TextStyle style) {
        String required = required(outcome, style);
        String predicted = predicted(outcome);
        String margin = margin(outcome);
        String word = outcome.met() ? style.good(style.met() + " met") : style.bad(style.notMet() + " NOT MET");
        String name = left(RequirementWords.name(outcome.requirement()), NAME);
        return name + right(required, NUMBER) + right(predicted, NUMBER) + right(margin, NUMBER) + "  " + word;
    }

    /** The required figure with its sign. */
    public static String required(RequirementOutcome outcome, TextStyle style) {
        String bound = outcome.requirement().atLeast() ? style.atLeast() : style.atMost();
        return bound + " " + RequirementWords.required(outcome.requirement(), outcome.required());
    }

    /** The predicted figure. */
    public static String predicted(RequirementOutcome outcome) {
        if (outcome.predicted().isEmpty()) {
            return outcome.met() ? "no limit" : RequirementWords.missing(outcome.requirement());
        }
        return RequirementWords.predicted(
                outcome.requirement(), outcome.predicted().getAsDouble(), outcome.required());
    }

    /** The room that is left with its sign, empty where there is no figure. */
    public static String margin(RequirementOutcome outcome) {
        return outcome.margin().isEmpty()
                ? ""
                : RequirementWords.margin(
                        outcome.requirement(), outcome.margin().getAsDouble());
    }
}
