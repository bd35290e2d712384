package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.report.RequirementText;
import binspan.prediction.LinkCheck;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementOutcome;
import java.util.List;
import org.junit.jupiter.api.Test;

final class RequirementRowTest {
    private static double ofRoom(double ratio) {
        return RequirementRow.barShare(Math.log(ratio));
    }

    /** Closed forms: ln 2/ln 101, ln 11/ln 101 and 1. */
    @Test
    void barsAreLogarithmicInTheRoom() {
        assertThat(ofRoom(1.01)).isCloseTo(Math.log(2.0) / Math.log(101.0), within(1e-12));
        assertThat(ofRoom(1.1)).isCloseTo(Math.log(11.0) / Math.log(101.0), within(1e-12));
        assertThat(ofRoom(2.0)).isCloseTo(1.0, within(1e-12));
        assertThat(ofRoom(1.01)).isCloseTo(0.15, within(0.001));
        assertThat(ofRoom(1.1)).isCloseTo(0.52, within(0.001));
    }

    @Test
    void barsAreSymmetricAndEnd() {
        assertThat(RequirementRow.barShare(0.0)).isZero();
        assertThat(ofRoom(1.0 / 1.1)).isCloseTo(-ofRoom(1.1), within(1e-12));
        assertThat(ofRoom(5.0)).isEqualTo(1.0);
        assertThat(RequirementRow.barShare(-1000.0)).isEqualTo(-1.0);
    }

    @Test
    void barsGrowWithTheRoom() {
        double last = -1.5;
        for (double margin = -0.69; margin < 0.69; margin += 0.01) {
            assertThat(RequirementRow.barShare(margin)).isGreaterThan(last);
            last = RequirementRow.barShare(margin);
        }
    }

    @Test
    void rowsSayWhatTheCheckFound() {
        LinkCheck check = LinkCheck.of(VerdictLinks.withAll());
        List<RequirementRow> rows = RequirementRow.of(check, check);
        assertThat(rows).hasSameSizeAs(check.outcomes()).hasSize(8);
        for (int i = 0; i < rows.size(); i++) {
            RequirementOutcome outcome = check.outcomes().get(i);
            RequirementRow row = rows.get(i);
            assertThat(row.name() + " " + row.required())
                    .isEqualTo(RequirementText.of(outcome.requirement(), outcome.required()));
            assertThat(row.met()).isEqualTo(outcome.met());
            assertThat(Math.signum(row.barShare()))
                    .isEqualTo(Math.signum(outcome.margin().orElseThrow()));
            assertThat(row.margin()).startsWith(outcome.met() ? "+" : "-");
            assertThat(row.change()).isEqualTo(ChangeMark.NONE);
            assertThat(row.why().isEmpty()).isEqualTo(outcome.met());
        }
    }

    /** The bar of a visibility follows from the figures of the check: ln(predicted/required). */
    @Test
    void barOfTheVisibilityIsThatOfItsRatio() {
        LinkCheck check = LinkCheck.of(VerdictLinks.withAll());
        double ratio = check.prediction().fringe().raw() / 0.85;
        assertThat(RequirementRow.of(check, check).get(0).barShare())
                .isCloseTo(Math.log(1.0 + 100.0 * (ratio - 1.0)) / Math.log(101.0), within(1e-9));
    }

    private static RequirementRow row(LinkCheck check, Requirement requirement) {
        return RequirementRow.of(check, check).stream()
                .filter(row -> row.requirement() == requirement)
                .findFirst()
                .orElseThrow();
    }

    /** The figure of merit below says the same word. */
    @Test
    void keyThatNeverComesHasNoMargin() {
        LinkCheck check = LinkCheck.of(VerdictLinks.with(VerdictLinks.withAll(), "timing.cableTemperatureStepK", 1.0));
        RequirementRow first = row(check, Requirement.FIRST_KEY);
        assertThat(first.met()).isFalse();
        assertThat(first.predicted()).isEqualTo("never");
        assertThat(first.margin()).isEmpty();
        assertThat(VerdictFigures.of(check, check).stream().flatMap(group -> group.rows().stream()))
                .contains(new FigureRow("time to the first key", "never", ChangeMark.NONE));
    }

    @Test
    void marginsOfErrorRatesAreInPercentagePoints() {
        LinkCheck check = LinkCheck.of(VerdictLinks.withAll());
        RequirementRow phase = row(check, Requirement.PHASE_QBER);
        double points = 100.0 * (0.08 - check.prediction().key().errors().phase());
        assertThat(phase.margin()).endsWith(" pt");
        assertThat(Double.parseDouble(phase.margin().replace(" pt", ""))).isCloseTo(points, within(0.05));
        assertThat(phase.spoken()).contains(phase.margin().replace("pt", "percentage points"));
    }

    /** A time that rises is worse, and its arrow still goes up. */
    @Test
    void directionOfAChangeIsThatOfTheNumber() {
        LinkCheck saved = LinkCheck.of(VerdictLinks.withAll());
        LinkCheck now = LinkCheck.of(VerdictLinks.with(VerdictLinks.withAll(), "timing.windowWidthPs", 200.0));
        RequirementRow sigma = RequirementRow.of(now, saved).stream()
                .filter(row -> row.requirement() == Requirement.FIVE_SIGMA)
                .findFirst()
                .orElseThrow();
        double before = saved.prediction().bell().secondsTo(5.0);
        double after = now.prediction().bell().secondsTo(5.0);
        assertThat(sigma.change().direction()).isEqualTo((int) Math.signum(after - before));
        assertThat(sigma.change().effect())
                .isEqualTo(after > before ? ChangeMark.Effect.WORSE : ChangeMark.Effect.BETTER);
    }

    @Test
    void speaksOneSentence() {
        LinkCheck check = LinkCheck.of(VerdictLinks.failing());
        RequirementRow row = RequirementRow.of(check, check).get(0);
        assertThat(row.spoken())
                .startsWith(
                        "not met: raw visibility " + row.predicted() + ", required " + row.required() + ", margin -")
                .contains("falls short of");
    }
}
