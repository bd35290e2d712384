package binspan.study;

import binspan.scenario.Compensator;
import binspan.scenario.Field;
import binspan.scenario.FieldParameter;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.PathElement;
import binspan.scenario.Range;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;

/** Ranges in which a parameter is searched when nobody says otherwise (common practice), and the parameters that are tuned by default. */
public final class DefaultAxes {
    private static final double FACTOR = 20.0;
    private static final double ALMOST = 0.999;
    private static final double PICO_PER_NANO = 1000.0;
    private static final String WINDOW = "timing.windowWidthPs";

    private DefaultAxes() {}

    /**
     * A twentieth to twenty times the planned value in logarithmic steps; a negative one from twice itself to 0; a window no wider than the separation;
     * all within the parameter's allowed range.
     *
     * @throws IllegalArgumentException if the planned value is 0 or absent, or is a whole number
     */
    public static Axis of(Scenario scenario, Parameter parameter) {
        if (parameter instanceof FieldParameter field && field.field().kind() == Field.Kind.COUNT) {
            throw new IllegalArgumentException(parameter.path() + ": found a whole number; allowed a continuous value");
        }
        double planned = parameter.value(scenario).orElse(0.0);
        if (planned == 0.0) {
            throw new IllegalArgumentException(
                    parameter.path() + ": no planned value to search around; state the range as =FROM:TO");
        }
        Range range = parameter.range();
        if (planned < 0.0) {
            return new Axis(parameter, inside(range, planned, 2.0 * planned), inside(range, planned, 0.0), 2, false);
        }
        double highest = inside(range, planned, planned * FACTOR);
        if (parameter.path().equals(WINDOW)) {
            highest = Math.max(planned, Math.min(highest, scenario.imbalanceNs() * PICO_PER_NANO));
        }
        return new Axis(parameter, inside(range, planned, planned / FACTOR), highest, 2, true);
    }

    /** A wanted end pulled into the range; just short of an end that is itself excluded. */
    private static double inside(Range range, double planned, double wanted) {
        double end = Math.max(range.lowest(), Math.min(range.highest(), wanted));
        return range.contains(end) ? end : planned + ALMOST * (end - planned);
    }

    /** What an engineer tunes first: the pairs, the window and compensators of a stated dispersion. */
    public static List<Axis> tuned(Scenario scenario) {
        List<String> paths = new ArrayList<>();
        paths.add(scenario.pulsed() ? "source.meanPairsPerCycle" : "source.pairRatePerSecond");
        paths.add(WINDOW);
        compensators("alice", scenario.alice().path(), paths);
        compensators("bob", scenario.bob().path(), paths);
        return paths.stream()
                .map(path -> of(scenario, ParameterPaths.find(scenario, path)))
                .toList();
    }

    private static void compensators(String arm, List<PathElement> path, List<String> paths) {
        for (int i = 0; i < path.size(); i++) {
            boolean tunable = path.get(i) instanceof Compensator compensator
                    && compensator.dispersionPsPerNm().orElse(0.0) != 0.0;
            if (tunable) {
                String label = path.get(i).label().orElse("");
                String element = label.isEmpty() ? "[" + i + "]" : "." + label;
                paths.add(arm + ".path" + element + ".dispersionPsPerNm");
            }
        }
    }
}
