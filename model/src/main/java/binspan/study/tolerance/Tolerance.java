package binspan.study.tolerance;

import binspan.prediction.RequirementMargins;
import binspan.scenario.Scenario;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.Sweep;
import binspan.study.Variation;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.CancellationException;

/**
 * How surely a link that is built with spread parameters meets its requirements, how its figures of merit scatter and which spread makes it fail.
 *
 * <p>The parameters are independent of each other. The builds are Sobol points; their number is best a power of two.
 *
 * @param scenario the link as planned
 * @param spreads what spreads, applied in this order
 * @param samples number of builds, {@value #FEWEST_SAMPLES} to {@value #MOST_SAMPLES}
 * @param seed of the randomised points; the same seed gives the same result on any number of threads
 * @param columns figures of merit to tabulate, in any number
 */
public record Tolerance(
        Scenario scenario, List<ParameterSpread> spreads, int samples, long seed, List<FigureColumn> columns) {
    /** Fewest builds. */
    public static final int FEWEST_SAMPLES = 16;

    /** Most builds; the numbers kept of them allow so many only with few spreads and figures. */
    public static final int MOST_SAMPLES = 10_000_000;

    /** Most numbers kept of all builds, some 400 MB: values, figures, margins and required figures. */
    public static final long MOST_NUMBERS = Sweep.MOST_NUMBERS;

    /**
     * Checks the description.
     *
     * @throws IllegalArgumentException if nothing spreads, if there are too many builds or numbers, or if a spread has no meaning in this scenario or
     *     beside the others
     */
    public Tolerance {
        spreads = List.copyOf(spreads);
        columns = List.copyOf(columns);
        if (spreads.isEmpty() || spreads.size() > SobolPoints.MOST_DIMENSIONS) {
            throw new IllegalArgumentException("found " + spreads.size() + " spread parameters; allowed 1 to "
                    + SobolPoints.MOST_DIMENSIONS + ": state them in the scenario's spread section or add one");
        }
        if (samples < FEWEST_SAMPLES || samples > MOST_SAMPLES) {
            throw new IllegalArgumentException(
                    "found " + samples + " samples; allowed " + FEWEST_SAMPLES + " to " + MOST_SAMPLES);
        }
        requireRoom(scenario, samples, spreads.size() + columns.size());
        requireApart(scenario, distributions(scenario, spreads), seed);
    }

    private static void requireRoom(Scenario scenario, int samples, int columns) {
        int required = RequirementMargins.of(scenario.require()).requirements().size();
        double numbers = (double) samples * (columns + 2 * required + 1);
        if (numbers > MOST_NUMBERS) {
            throw new IllegalArgumentException(String.format(
                    Locale.ROOT,
                    "found %.3g numbers of all builds; allowed %d: take fewer samples or fewer figures",
                    numbers,
                    MOST_NUMBERS));
        }
    }

    /** Tries the first two builds, in which no two parameters take the same share of their spreads. */
    private static void requireApart(Scenario scenario, List<SpreadDistribution> distributions, long seed) {
        BuildSampler sampler = new BuildSampler(distributions, seed);
        Variation.check(scenario, sampler.parameters(), sampler.at(0));
        Variation.check(scenario, sampler.parameters(), sampler.next());
    }

    private static List<SpreadDistribution> distributions(Scenario scenario, List<ParameterSpread> spreads) {
        return spreads.stream()
                .map(spread -> SpreadDistribution.of(scenario, spread))
                .toList();
    }

    /** The distributions of the spread parameters in their order, as they are sampled. */
    public List<SpreadDistribution> distributions() {
        return distributions(scenario, spreads);
    }

    /**
     * Predicts all builds and evaluates them.
     *
     * @throws CancellationException if it shall stop
     */
    public ToleranceResult run(Execution execution) {
        return new ToleranceBuilds(this).run(execution);
    }
}
