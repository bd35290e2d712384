package binspan.planner.viewmodel;

import binspan.planner.report.VerdictHead;
import binspan.planner.report.VerdictNotes;
import binspan.prediction.Caution;
import binspan.prediction.LinkCheck;
import binspan.scenario.Scenario;
import java.util.List;

/**
 * What the verdict shows at once; what takes longer is the {@link VerdictRoom}.
 *
 * @param check what was found
 * @param headline whether the requirements are met
 * @param requirements the stated ones
 * @param budget of the visibility
 * @param figures of merit
 * @param safety what must be known before any fibre is touched
 * @param changes what differs from the saved link
 */
public record VerdictSheet(
        LinkCheck check,
        String headline,
        List<RequirementRow> requirements,
        Budget budget,
        List<FigureGroup> figures,
        List<String> safety,
        List<ScenarioChange> changes) {

    /**
     * The sheet of a link.
     *
     * @param now check of the link, headroom left out
     * @param saved the same of the saved link
     */
    static VerdictSheet of(LinkCheck now, LinkCheck saved) {
        Scenario scenario = now.prediction().scenario();
        return new VerdictSheet(
                now,
                VerdictHead.answer(now),
                RequirementRow.of(now, saved),
                Budget.of(now.prediction()),
                VerdictFigures.of(now, saved),
                VerdictNotes.safety(scenario),
                ScenarioChanges.between(saved.prediction().scenario(), scenario));
    }

    /** The link that it is about. */
    public Scenario scenario() {
        return check.prediction().scenario();
    }

    /** Whether any requirement is stated. */
    public boolean judged() {
        return !requirements.isEmpty();
    }

    /** Whether all stated requirements are met. */
    public boolean met() {
        return check.met();
    }

    /** What to be careful about. */
    public List<Caution> cautions() {
        return check.cautions();
    }

    /** Whether any figure differs noticeably from the saved link. */
    public boolean figuresChanged() {
        return requirements.stream().anyMatch(row -> row.change().effect() != ChangeMark.Effect.NONE)
                || figures.stream()
                        .flatMap(group -> group.rows().stream())
                        .anyMatch(row -> row.change().effect() != ChangeMark.Effect.NONE);
    }
}
