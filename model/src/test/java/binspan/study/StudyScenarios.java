package binspan.study;

import binspan.scenario.ParameterPaths;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.Arrays;
import java.util.List;

/** Links with requirements for the tests of studies. */
public final class StudyScenarios {
    private StudyScenarios() {}

    /** The sample pulse-pair link with requirements that it misses by a little as written and can meet. */
    public static Scenario demanding() {
        return SampleScenarios.build(SampleScenarios.pulsePair()
                .put(
                        "require",
                        new Values()
                                .put("rawVisibilityAtLeast", 0.95)
                                .put("chshAtLeast", 2.5)
                                .put("phaseBasisQberAtMost", 0.05)
                                .put("keyRateAtLeastBps", 500.0)
                                .put("firstKeyWithinHours", 24.0)
                                .put("fiveSigmaWithinHours", 1.0)));
    }

    /** The sample pulse-pair link with modest requirements. */
    public static Scenario modest() {
        return SampleScenarios.build(SampleScenarios.pulsePair()
                .put(
                        "require",
                        new Values()
                                .put("rawVisibilityAtLeast", 0.85)
                                .put("timeBasisQberAtMost", 0.08)
                                .put("keyRateAtLeastBps", 100.0)));
    }

    /** The same link with one requirement. */
    public static Scenario requiring(String name, double value) {
        return SampleScenarios.build(SampleScenarios.pulsePair().put("require", new Values().put(name, value)));
    }

    /** An axis with two steps. */
    public static Axis axis(Scenario scenario, String path, double from, double to, boolean logarithmic) {
        return new Axis(ParameterPaths.find(scenario, path), from, to, 2, logarithmic);
    }

    /** Axes with the usual ranges. */
    public static List<Axis> usual(Scenario scenario, String... paths) {
        return Arrays.stream(paths)
                .map(path -> DefaultAxes.of(scenario, ParameterPaths.find(scenario, path)))
                .toList();
    }

    /** A point of a square grid over two axes, their ends included. */
    public static double[] gridPoint(List<Axis> axes, int index, int side) {
        int column = index / side;
        int row = index % side;
        return new double[] {axes.get(0).at(column / (side - 1.0)), axes.get(1).at(row / (side - 1.0))};
    }
}
