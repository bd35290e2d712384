package binspan.planner.viewmodel;

import binspan.merit.VisibilityBudget;
import binspan.planner.report.VerdictBudget;
import binspan.prediction.LinkPrediction;
import binspan.units.Digits;
import java.util.ArrayList;
import java.util.List;

/**
 * What each cause takes from the visibility, as steps down from 1 to the raw visibility.
 *
 * @param steps the causes in their order
 * @param floor visibility at which the scale of their bars begins
 */
public record Budget(List<Step> steps, double floor) {
    /**
     * One cause.
     *
     * @param cause its name
     * @param factor by which it multiplies the visibility
     * @param loss what it takes, in words
     * @param from visibility before it
     * @param to visibility after it
     */
    public record Step(String cause, String factor, String loss, double from, double to) {}

    static Budget of(LinkPrediction prediction) {
        List<Step> steps = new ArrayList<>();
        double visibility = 1.0;
        for (VisibilityBudget.Entry entry : prediction.budget().entries()) {
            double after = visibility * entry.factor();
            steps.add(new Step(
                    entry.cause().text(),
                    Digits.decimals(entry.factor(), 4),
                    VerdictBudget.loss(entry.factor()),
                    visibility,
                    after));
            visibility = after;
        }
        return new Budget(
                List.copyOf(steps), VerdictBudget.floor(prediction.fringe().raw()));
    }

    /** The place of a visibility on the scale of the bars, 0 to 1. */
    public double share(double visibility) {
        return Math.max(0.0, Math.min(1.0, (visibility - floor) / (1.0 - floor)));
    }

    /** The budget for somebody who hears it. */
    public String spoken() {
        List<String> parts = new ArrayList<>();
        steps.forEach(step -> parts.add(step.cause() + " " + step.loss()));
        return VerdictBudget.TITLE + ": " + String.join(", ", parts);
    }
}
