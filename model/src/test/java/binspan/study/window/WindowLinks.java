package binspan.study.window;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RandomScenarios;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.prediction.SlotFit;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import binspan.study.Axis;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;

/** Links with requirements for the tests of windows, and their margins computed from nothing each time: no memory, no shared code of the searches. */
public final class WindowLinks {
    private WindowLinks() {}

    /** A link with requirements, given as names and figures in turn. */
    public static Scenario requiring(Values stated, Object... requirements) {
        Values require = new Values();
        for (int i = 0; i < requirements.length; i += 2) {
            require.put((String) requirements[i], requirements[i + 1]);
        }
        return SampleScenarios.build(stated.put("require", require));
    }

    /** The sample pulse pair with everyday requirements. */
    public static Scenario pulsePair() {
        return requiring(
                SampleScenarios.pulsePair(),
                "rawVisibilityAtLeast",
                0.85,
                "chshAtLeast",
                2.4,
                "timeBasisQberAtMost",
                0.05,
                "keyRateAtLeastBps",
                500.0,
                "carAtLeast",
                10.0);
    }

    /** The sample link with a continuous pump and everyday requirements. */
    public static Scenario continuous() {
        return requiring(SampleScenarios.continuous(), "rawVisibilityAtLeast", 0.8, "keyRateAtLeastBps", 10.0);
    }

    /** An everyday link with requirements that it meets with 2 to 60 per cent of room. */
    public static Scenario random(long number) {
        Scenario scenario = RandomScenarios.everydayGaussian(number);
        LinkPrediction prediction = LinkPredictor.predict(scenario);
        SplittableRandom random = new SplittableRandom(number);
        for (Requirement requirement : Requirement.stateable()) {
            double eased = 1.0 + random.nextDouble(0.02, 0.6);
            double predicted = RequirementMargins.of(List.of(requirement), 1.0).predicted(0, prediction);
            double required = requirement.atLeast() ? predicted / eased : predicted * eased;
            Parameter parameter = ParameterPaths.find(scenario, "require." + requirement.fieldName());
            if (random.nextInt(3) > 0 && required > 1e-12 && parameter.range().contains(required)) {
                scenario = parameter.with(scenario, required);
            }
        }
        return scenario;
    }

    /** An axis of 129 steps. */
    public static Axis axis(Scenario scenario, String path, double from, double to, boolean logarithmic) {
        return new Axis(ParameterPaths.find(scenario, path), from, to, 129, logarithmic);
    }

    /** The prediction at values of some axes. */
    public static LinkPrediction prediction(Scenario scenario, Axis[] axes, double... values) {
        Scenario varied = scenario;
        for (int i = 0; i < values.length; i++) {
            varied = axes[i].parameter().with(varied, values[i]);
        }
        return LinkPredictor.predict(varied);
    }

    /** The least margin at values of some axes. */
    public static double least(Scenario scenario, Axis[] axes, double... values) {
        return margins(scenario).least(prediction(scenario, axes, values));
    }

    /** The stated requirements and, where the slots fit as written, that they go on to. */
    public static RequirementMargins margins(Scenario scenario) {
        RequirementMargins stated = RequirementMargins.of(scenario.require());
        return SlotFit.room(scenario) >= 0.0 ? stated.withSlots() : stated;
    }

    /** The margin of one requirement at values of some axes. */
    public static double margin(Scenario scenario, Requirement requirement, Axis[] axes, double... values) {
        RequirementMargins margins = margins(scenario);
        return margins.margin(margins.requirements().indexOf(requirement), prediction(scenario, axes, values));
    }

    /** The least margins at equally spaced shares of an axis, computed on all processors. */
    static double[] scan(Scenario scenario, Axis axis, int steps) {
        return IntStream.rangeClosed(0, steps)
                .parallel()
                .mapToDouble(i -> least(scenario, new Axis[] {axis}, place(axis, i, steps)))
                .toArray();
    }

    /** A place of such a scan. */
    static double place(Axis axis, int step, int steps) {
        return step == steps ? axis.to() : axis.at((double) step / steps);
    }
}
