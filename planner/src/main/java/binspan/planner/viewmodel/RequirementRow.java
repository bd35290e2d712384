package binspan.planner.viewmodel;

import binspan.planner.report.Figure;
import binspan.planner.report.RequirementWords;
import binspan.planner.report.TextStyle;
import binspan.planner.report.VerdictFailure;
import binspan.planner.report.VerdictRequirements;
import binspan.prediction.LinkCheck;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.prediction.RequirementOutcome;
import java.util.ArrayList;
import java.util.List;

/**
 * A stated requirement against the prediction.
 *
 * @param requirement which
 * @param name its name
 * @param required the required figure with its sign
 * @param predicted the predicted figure
 * @param margin the room with its sign, empty without a figure
 * @param met whether it is met
 * @param barShare length of its bar, -1 to 1, see {@link #barShare(double)}
 * @param change of the predicted figure against the saved link
 * @param why why it is not met, empty where it is
 */
public record RequirementRow(
        Requirement requirement,
        String name,
        String required,
        String predicted,
        String margin,
        boolean met,
        double barShare,
        ChangeMark change,
        String why) {

    private static final double SHARPNESS = 100.0;

    static List<RequirementRow> of(LinkCheck now, LinkCheck saved) {
        RequirementMargins margins =
                RequirementMargins.of(now.prediction().scenario().require());
        List<RequirementRow> rows = new ArrayList<>();
        for (int i = 0; i < now.outcomes().size(); i++) {
            RequirementOutcome outcome = now.outcomes().get(i);
            rows.add(new RequirementRow(
                    outcome.requirement(),
                    RequirementWords.name(outcome.requirement()),
                    VerdictRequirements.required(outcome, TextStyle.PLAIN_UNICODE),
                    VerdictRequirements.predicted(outcome),
                    margin(outcome),
                    outcome.met(),
                    barShare(margins.margin(i, now.prediction())),
                    change(outcome, now, saved),
                    outcome.met() ? "" : VerdictFailure.why(now, outcome)));
        }
        return List.copyOf(rows);
    }

    /**
     * The length of a bar on a scale that is symmetric and logarithmic but for the neighbourhood of 0:
     * {@code sign(m) ln(1 + 100 r)/ln 101} with the room r = exp(|m|) - 1, not beyond -1 and 1. One per cent of room gives
     * 0.150, ten 0.520, a hundred 1.
     *
     * @param logRatio margin m as {@link RequirementMargins} gives it
     */
    public static double barShare(double logRatio) {
        double room = Math.expm1(Math.abs(logRatio));
        return Math.copySign(Math.min(1.0, Math.log1p(SHARPNESS * room) / Math.log1p(SHARPNESS)), logRatio);
    }

    private static String margin(RequirementOutcome outcome) {
        return outcome.margin().isEmpty()
                ? ""
                : RequirementWords.room(outcome.requirement(), outcome.margin().getAsDouble());
    }

    private static ChangeMark change(RequirementOutcome outcome, LinkCheck now, LinkCheck saved) {
        Requirement requirement = outcome.requirement();
        return ChangeMark.of(
                requirement.predicted(saved.prediction(), saved.finite()),
                requirement.predicted(now.prediction(), now.finite()),
                requirement.atLeast() ? ChangeMark.Aim.HIGH : ChangeMark.Aim.LOW,
                difference -> RequirementWords.difference(requirement, difference),
                value -> RequirementWords.tuned(requirement, value, value, true));
    }

    /** The row for somebody who hears it. */
    public String spoken() {
        String verdict = Words.of(met ? "verdict.met" : "verdict.not-met");
        String text = Words.of("verdict.requirement.spoken", verdict, name, predicted, required);
        String room = margin.isEmpty() ? "" : ", " + Words.of("verdict.margin.spoken", Figure.spelt(margin));
        String since = change.spoken().isEmpty() ? "" : "; " + change.spoken();
        return text + room + since + (why.isEmpty() ? "" : ". " + why);
    }
}
