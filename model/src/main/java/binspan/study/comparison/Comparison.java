package binspan.study.comparison;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Workers;
import binspan.study.tuning.Objective;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.CancellationException;
import java.util.function.Function;
import java.util.stream.IntStream;

/**
 * Several links side by side, each tuned for itself.
 *
 * @param options the links
 * @param free parameters to tune in each, made for its scenario; none means as written
 * @param objective what they are tuned for under their requirements
 */
public record Comparison(List<LinkOption> options, Function<Scenario, List<Axis>> free, Objective objective) {
    /** Keeps the options. */
    public Comparison {
        options = List.copyOf(options);
    }

    /**
     * What was found about one link.
     *
     * @param option the link
     * @param setting the best setting of its devices
     * @param free what was tuned
     * @param values best values of it
     * @param prediction prediction at the best setting and values
     * @param finite its finite key
     * @param meets whether all requirements hold
     * @param leastMargin least margin of all requirements
     * @param tightest the requirement with the least margin; null where none is stated
     * @param reachKm greatest length at which all stated requirements hold, tuned at every length; absent where none does or none is stated
     */
    public record Entry(
            LinkOption option,
            LinkOption.Setting setting,
            List<Axis> free,
            List<Double> values,
            LinkPrediction prediction,
            FiniteKeyOutlook finite,
            boolean meets,
            double leastMargin,
            Requirement tightest,
            OptionalDouble reachKm) {}

    /**
     * Tunes and ranks: links that meet all requirements first, by the objective; then the others, by how little they fail.
     *
     * @throws CancellationException if it shall stop
     * @throws IllegalArgumentException if a parameter cannot be tuned in one of the links
     */
    public List<Entry> run(Execution execution) {
        Entry[] entries = new Entry[options.size()];
        Workers.run(options.size(), 1, execution, () -> (first, end) -> {
            for (int i = first; i < end; i++) {
                entries[i] = new ComparisonEntry(this, options.get(i), execution.inside()).entry();
            }
        });
        return IntStream.range(0, entries.length)
                .mapToObj(i -> entries[i])
                .sorted(Comparator.comparing((Entry entry) -> !entry.meets()).thenComparing(entry -> -rank(entry)))
                .toList();
    }

    private double rank(Entry entry) {
        RequirementMargins margins =
                RequirementMargins.of(entry.prediction().scenario().require());
        double value = entry.meets() ? objective.merit(entry.prediction(), margins) : entry.leastMargin();
        return Double.isNaN(value) ? Double.NEGATIVE_INFINITY : value;
    }
}
