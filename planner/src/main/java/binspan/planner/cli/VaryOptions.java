package binspan.planner.cli;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Option;

/** The option {@code --vary PATH=FROM:TO[:STEPS][:log]}, given once for each parameter. */
final class VaryOptions {
    private static final String NAME = "--vary";

    @Option(
            names = NAME,
            required = true,
            paramLabel = "PATH=FROM:TO[:STEPS][:log]",
            description = "Parameter to vary by its scenario path, from one value to another; STEPS is the number of"
                    + " values, log spaces them by equal ratios. Once for each parameter.")
    private List<String> texts;

    /**
     * The varied parameters in the order given, for a study that tabulates points.
     *
     * @param scenario scenario that the paths lead into
     * @param steps number of values where it is not stated, for one parameter, for two, ...; as many as are allowed
     * @throws UsageException if a path or a range is wrong, or if there are too many
     */
    List<Axis> grid(Scenario scenario, List<Integer> steps) throws UsageException {
        List<Axis> axes = new ArrayList<>();
        for (PathOption option : options(scenario, steps.size())) {
            axes.add(axis(option, steps.get(texts.size() - 1)));
        }
        return axes;
    }

    /**
     * The same for a study that looks between the points: parameters that take whole numbers only are refused.
     *
     * @throws UsageException if a path or a range is wrong, or if there are too many
     */
    List<Axis> steady(Scenario scenario, int... steps) throws UsageException {
        List<Axis> axes = new ArrayList<>();
        for (PathOption option : options(scenario, steps.length)) {
            axes.add(axis(option.steady(), steps[texts.size() - 1]));
        }
        return axes;
    }

    private List<PathOption> options(Scenario scenario, int most) throws UsageException {
        if (texts.size() > most) {
            throw UsageException.of(NAME + " \"" + texts.get(most) + "\": found " + texts.size()
                    + " varied parameters; allowed 1 to " + most);
        }
        List<PathOption> options = new ArrayList<>();
        for (String text : texts) {
            options.add(PathOption.of(scenario, NAME, text));
        }
        return options;
    }

    private static Axis axis(PathOption option, int steps) throws UsageException {
        try {
            WrittenRange range = WrittenRange.of(option.rest());
            return option.whole()
                    ? whole(option, range, steps)
                    : axis(option, range, range.steps().orElse(steps));
        } catch (IllegalArgumentException e) {
            throw option.refused(e);
        }
    }

    private static Axis axis(PathOption option, WrittenRange range, int steps) {
        return new Axis(option.parameter(), range.from(), range.to(), steps, range.logarithmic());
    }

    /** The values of a parameter that takes whole numbers only. */
    private static Axis whole(PathOption option, WrittenRange range, int steps) {
        Axis axis = axis(option, range, range.steps().orElse(2));
        if (axis.logarithmic() || axis.from() != Math.rint(axis.from()) || axis.to() != Math.rint(axis.to())) {
            throw new IllegalArgumentException(
                    "found " + option.rest() + "; allowed whole numbers in even steps, without log");
        }
        long span = (long) (axis.to() - axis.from());
        if (range.steps().isEmpty()) {
            return axis(option, range, evenSteps(span, steps));
        }
        if (span % (axis.steps() - 1) != 0) {
            throw new IllegalArgumentException("found " + axis.steps() + " steps, which are not whole; allowed for"
                    + " example " + evenSteps(span, axis.steps()));
        }
        return axis;
    }

    /** The number of values nearest to a wanted one whose distance is a whole number. */
    private static int evenSteps(long span, int wanted) {
        int best = 2;
        for (int steps = 2; steps <= Math.min(span + 1, Axis.MOST_STEPS); steps++) {
            boolean whole = span % (steps - 1) == 0;
            if (whole && ratio(steps, wanted) < ratio(best, wanted)) {
                best = steps;
            }
        }
        return best;
    }

    private static double ratio(int steps, int wanted) {
        return Math.abs(Math.log((double) steps / wanted));
    }
}
