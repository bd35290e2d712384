package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.LinkLength;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Margins: zero or more exactly where a check says that a requirement is met, finite, and without steps as a link gets longer. */
final class RequirementMarginsTest {
    @Test
    void signIsThatOfTheCheck() {
        RandomChecks.none(400, number -> {
            Scenario scenario = RandomScenarios.any(number);
            LinkPrediction prediction = LinkPredictor.predict(scenario);
            RequirementMargins margins = RequirementMargins.of(scenario.require());
            List<RequirementOutcome> outcomes = RequirementOutcome.all(prediction, FiniteKeyOutlook.of(prediction));
            for (int i = 0; i < outcomes.size(); i++) {
                double margin = margins.margin(i, prediction);
                if (!Double.isFinite(margin) || margin >= 0.0 != outcomes.get(i).met()) {
                    return outcomes.get(i) + " has the margin " + margin;
                }
            }
            return "";
        });
    }

    /** One per cent above the requirement is one per cent of room. */
    @Test
    void isTheLogarithmOfTheRatio() {
        LinkPrediction prediction = LinkPredictor.predict(SampleScenarios.build(SampleScenarios.pulsePair()));
        double raw = prediction.fringe().raw();
        RequirementMargins margins = RequirementMargins.of(List.of(Requirement.RAW_VISIBILITY), raw / 1.01);
        assertThat(margins.least(prediction)).isCloseTo(Math.log(1.01), within(1e-12));
        double error = prediction.key().errors().phase();
        RequirementMargins errors = RequirementMargins.of(List.of(Requirement.PHASE_QBER), error * 0.99);
        assertThat(errors.least(prediction)).isCloseTo(Math.log(0.99), within(1e-12));
    }

    /** Along a growing length no margin jumps, not even where the key or the violation ends. */
    @ParameterizedTest
    @EnumSource(value = Requirement.class, mode = EnumSource.Mode.EXCLUDE, names = "SLOTS")
    void fallsWithoutSteps(Requirement requirement) {
        Scenario scenario = SampleScenarios.build(SampleScenarios.pulsePair());
        double required =
                requirement == Requirement.RAW_VISIBILITY ? 0.85 : requirement == Requirement.KEY_RATE ? 10.0 : 5.0;
        RequirementMargins margins = RequirementMargins.of(List.of(requirement), required);
        LinkPredictor predictor = new LinkPredictor();
        double before = margins.least(predictor.of(new LinkLength().with(scenario, 60.0)));
        double first = before;
        for (double km = 60.05; km < 700.0; km += 0.05) {
            double margin = margins.least(predictor.of(new LinkLength().with(scenario, km)));
            assertThat(margin).as("at %f km", km).isCloseTo(before, within(0.5 + 0.01 * Math.abs(before)));
            before = margin;
        }
        assertThat(before).isLessThan(first);
    }

    @Test
    void goesOnWhereThereIsNoFigure() {
        Values stated = SampleScenarios.pulsePair();
        stated.put("require", new Values().put("keyRateAtLeastBps", 100.0));
        Scenario scenario = SampleScenarios.build(stated);
        Parameter noise = ParameterPaths.find(scenario, "both.analyzer.phaseNoiseRmsRad");
        RequirementMargins margins = RequirementMargins.of(scenario.require());
        double some = margins.least(LinkPredictor.predict(noise.with(scenario, 1.0)));
        double more = margins.least(LinkPredictor.predict(noise.with(scenario, 1.2)));
        assertThat(some).isLessThan(RequirementMargins.NO_FIGURE);
        assertThat(more).isLessThan(some);
    }

    @Test
    void nothingRequiredIsAmple() {
        LinkPrediction prediction = LinkPredictor.predict(SampleScenarios.build(SampleScenarios.pulsePair()));
        RequirementMargins none = RequirementMargins.of(List.of());
        assertThat(none.least(prediction)).isEqualTo(RequirementMargins.AMPLE);
        assertThat(none.met(prediction)).isTrue();
    }
}
