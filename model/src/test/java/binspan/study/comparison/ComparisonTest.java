package binspan.study.comparison;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import binspan.prediction.LinkPredictor;
import binspan.prediction.RequirementMargins;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import binspan.scenario.LossElement;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.study.DefaultAxes;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.StudyScenarios;
import binspan.study.tuning.Objective;
import binspan.study.tuning.SourcePosition;
import binspan.study.tuning.Tuning;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Comparing links: each tuned for itself, ranked, with the best operating point of an avalanche detector. */
final class ComparisonTest {
    private static List<Comparison.Entry> compared(LinkOption... options) {
        return new Comparison(List.of(options), DefaultAxes::tuned, Objective.KEY)
                .run(Execution.parallel(Progress.NONE));
    }

    @Test
    void nanowiresBeatAvalanchesAndAMixedPairLiesBetween() {
        Scenario scenario = StudyScenarios.modest();
        List<Comparison.Entry> ranked = compared(
                LinkOptions.detectors(scenario, DetectorClass.INGAAS_FREE_RUNNING, DetectorClass.INGAAS_FREE_RUNNING),
                LinkOptions.detectors(scenario, DetectorClass.SNSPD, DetectorClass.INGAAS_FREE_RUNNING),
                LinkOptions.detectors(scenario, DetectorClass.SNSPD, DetectorClass.SNSPD));
        assertThat(ranked.stream().map(entry -> entry.option().name()))
                .containsExactly("snspd", "snspd/ingaas-free-running", "ingaas-free-running");
    }

    /** Each operating point tuned on its own: none is better than the one chosen. */
    @Test
    void bestOperatingPointIsChosen() {
        Scenario scenario = StudyScenarios.requiring("carAtLeast", 1.0);
        LinkOption option =
                LinkOptions.detectors(scenario, DetectorClass.INGAAS_FREE_RUNNING, DetectorClass.INGAAS_FREE_RUNNING);
        assertThat(option.settings()).hasSize(12);
        Comparison.Entry chosen = compared(option).get(0);
        double best = option.settings().stream()
                .mapToDouble(
                        setting -> Tuning.of(setting.scenario(), DefaultAxes.tuned(setting.scenario()), Objective.KEY)
                                .run(Execution.SINGLE)
                                .prediction()
                                .key()
                                .asymptoticPerSecond())
                .max()
                .orElseThrow();
        assertThat(chosen.prediction().key().asymptoticPerSecond()).isCloseTo(best, within(1e-3 * best));
        assertThat(chosen.setting().meaning()).matches("[0-9.]+ %, [0-9]+ us");
    }

    @Test
    void failingLinksStandLastByHowLittleTheyFail() {
        Scenario scenario = StudyScenarios.requiring("keyRateAtLeastBps", 3000.0);
        List<Comparison.Entry> ranked = compared(
                LinkOptions.fibre(scenario, FibreClass.G655C),
                LinkOption.of("twice as long", longer(scenario, 2.0)),
                LinkOption.of("half again", longer(scenario, 1.5)),
                LinkOption.of("as written", scenario));
        assertThat(ranked.get(ranked.size() - 1).option().name()).isEqualTo("twice as long");
        assertThat(ranked.get(ranked.size() - 1).meets()).isFalse();
        assertThat(ranked.get(0).meets()).isTrue();
        assertThat(ranked.get(ranked.size() - 2).leastMargin())
                .isGreaterThan(ranked.get(ranked.size() - 1).leastMargin());
    }

    private static Scenario longer(Scenario scenario, double factor) {
        OptionalDouble alice = OptionalDouble.of(SourcePosition.fibreKm(scenario.alice()) * factor);
        OptionalDouble bob = OptionalDouble.of(SourcePosition.fibreKm(scenario.bob()) * factor);
        return new Route(
                        "longer",
                        new Route.ArmRoute(alice, OptionalDouble.empty(), Optional.empty()),
                        new Route.ArmRoute(bob, OptionalDouble.empty(), Optional.empty()))
                .through(scenario);
    }

    @Test
    void withoutAnElementItsLossIsGone() {
        Scenario scenario = SampleScenarios.build(SampleScenarios.everything());
        String label = scenario.alice().path().stream()
                .filter(LossElement.class::isInstance)
                .flatMap(each -> each.label().stream())
                .findFirst()
                .orElseThrow();
        Scenario without =
                LinkOptions.without(scenario, label).settings().get(0).scenario();
        assertThat(without.alice().path()).hasSize(scenario.alice().path().size() - 1);
        assertThatThrownBy(() -> LinkOptions.without(scenario, label + "x")).hasMessageContaining("did you mean");
    }

    @Test
    void gatesNeedSlots() {
        Scenario continuous = SampleScenarios.build(SampleScenarios.continuous());
        assertThatThrownBy(() -> LinkOptions.detectors(continuous, DetectorClass.SNSPD, DetectorClass.INGAAS_GATED))
                .hasMessageContaining("a continuous pump has no slots to gate");
    }

    @Test
    void routesGoThroughTheTemplate() {
        Scenario template = StudyScenarios.modest();
        Route measured = new Route(
                "measured",
                new Route.ArmRoute(OptionalDouble.of(12.0), OptionalDouble.of(5.5), Optional.empty()),
                Route.ArmRoute.AS_TEMPLATE);
        List<RouteSurvey.Verdict> verdicts = new RouteSurvey(template, false)
                .judge(
                        List.of(measured, new Route("same", Route.ArmRoute.AS_TEMPLATE, Route.ArmRoute.AS_TEMPLATE)),
                        Execution.SINGLE);
        assertThat(verdicts.get(0).prediction().pathA().fibreLossDb()).isCloseTo(5.5, within(1e-12));
        assertThat(verdicts.get(1).leastMargin())
                .isEqualTo(RequirementMargins.of(template.require()).least(LinkPredictor.predict(template)));
    }
}
