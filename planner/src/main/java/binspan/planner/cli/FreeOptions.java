package binspan.planner.cli;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.tuning.Tuning;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Option;

/** The option {@code --free PATH[=FROM:TO]}: what a search may set, given once for each parameter. */
final class FreeOptions {
    private static final String NAME = "--free";
    private static final double DECADE = 10.0;

    @Option(
            names = NAME,
            paramLabel = "PATH[=FROM:TO]",
            description = "Parameter to set freely, by its scenario path; without a range a twentieth to twenty times"
                    + " its planned value. Once for each parameter.")
    private List<String> texts = new ArrayList<>();

    /** Whether the option was given. */
    boolean given() {
        return !texts.isEmpty();
    }

    /**
     * The free parameters that were named, or the usual ones of a tuning.
     *
     * @throws UsageException if a path or a range is wrong, if there are too many, or if the usual ones have no range
     */
    List<Axis> axes(Scenario scenario) throws UsageException {
        return given()
                ? axes(scenario, Tuning.MOST_FREE)
                : UsageException.unless(NAME, () -> DefaultAxes.tuned(scenario));
    }

    /**
     * The free parameters with their ranges, in the order given. A search takes their logarithm where the range is the default one or spans a decade,
     * unless {@code :log} or {@code :lin} says otherwise.
     *
     * @param scenario scenario that the paths lead into
     * @param most how many are allowed
     * @throws UsageException if a path or a range is wrong, if a parameter takes whole numbers only, or if there are too many
     */
    List<Axis> axes(Scenario scenario, int most) throws UsageException {
        if (texts.size() > most) {
            throw UsageException.of(NAME + " \"" + texts.get(most) + "\": found " + texts.size()
                    + " free parameters; allowed 1 to " + most);
        }
        List<Axis> axes = new ArrayList<>();
        for (String text : texts) {
            PathOption option = PathOption.of(scenario, NAME, text).steady();
            try {
                axes.add(text.contains("=") ? stated(option) : DefaultAxes.of(scenario, option.parameter()));
            } catch (IllegalArgumentException e) {
                throw option.refused(e);
            }
        }
        return axes;
    }

    private static Axis stated(PathOption option) {
        WrittenRange range = WrittenRange.of(option.rest());
        if (range.steps().isPresent()) {
            throw new IllegalArgumentException("found " + range.steps().getAsInt() + " steps; allowed FROM:TO alone");
        }
        boolean decade = range.from() > 0.0 && range.to() >= DECADE * range.from();
        boolean logarithmic = range.spacing().isEmpty() ? decade : range.logarithmic();
        return new Axis(option.parameter(), range.from(), range.to(), 2, logarithmic);
    }
}
