package binspan.study.tolerance;

import binspan.study.Execution;
import binspan.study.StudyTable;
import binspan.study.Workers;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.function.IntFunction;

/** Counts, statistics and drivers of a tolerance study's builds; columns are shared among threads, each evaluated by one in the order of the builds. */
final class ToleranceEvaluation {
    private static final double COUNTED = 0.5;
    private static final double RANKED = 0.75;

    private final ToleranceBuilds builds;
    private final StudyTable table;
    private final int required;

    ToleranceEvaluation(ToleranceBuilds builds) {
        this.builds = builds;
        this.table = builds.table();
        this.required = builds.margins().requirements().size();
    }

    ToleranceResult run(Execution execution) {
        List<FigureStatistics> figures = each(table.columns().size(), execution.part(0.0, COUNTED), this::figure);
        List<int[]> ranks = each(required + 1, execution.part(COUNTED, RANKED), this::ranksOfMargin);
        List<FailureDriver> drivers =
                each(table.paths().size(), execution.part(RANKED, 1.0), parameter -> driver(parameter, ranks));
        return new ToleranceResult(builds, shares(), figures, ranked(drivers));
    }

    private static <T> List<T> each(int items, Execution execution, IntFunction<T> result) {
        Object[] results = new Object[items];
        Workers.run(items, 1, execution, () -> (first, end) -> {
            for (int i = first; i < end; i++) {
                results[i] = result.apply(i);
            }
        });
        List<T> list = new ArrayList<>();
        for (Object each : results) {
            @SuppressWarnings("unchecked") // made by the function above
            T made = (T) each;
            list.add(made);
        }
        return list;
    }

    private FigureStatistics figure(int column) {
        return FigureStatistics.of(table.columns().get(column), table.figuresOf(column));
    }

    /** Ranks of the margin of a requirement, or of the least one behind the last. */
    private int[] ranksOfMargin(int requirement) {
        return Ranks.doubled(requirement < required ? builds.marginsOf(requirement) : builds.least());
    }

    private FailureDriver driver(int parameter, List<int[]> ranksOfMargins) {
        double[] values = table.variedOf(parameter);
        int[] ranks = Ranks.doubled(values);
        List<Double> correlations = ranksOfMargins.stream()
                .map(each -> Ranks.correlation(ranks, each))
                .toList();
        double[] met = new double[table.rows()];
        for (int i = 0; i < met.length; i++) {
            met[i] = table.meets(i) ? 1.0 : 0.0;
        }
        return new FailureDriver(
                table.paths().get(parameter),
                correlations.get(required),
                correlations.subList(0, required),
                FirstOrderIndex.of(values, ranks, builds.least()),
                FirstOrderIndex.of(values, ranks, met));
    }

    private List<RequirementShare> shares() {
        List<RequirementShare> shares = new ArrayList<>();
        for (int i = 0; i < required; i++) {
            int met = (int) Arrays.stream(builds.marginsOf(i))
                    .filter(margin -> margin >= 0.0)
                    .count();
            shares.add(new RequirementShare(
                    builds.margins().requirements().get(i),
                    builds.margins().required(i),
                    BuildShare.of(met, table.rows())));
        }
        return shares;
    }

    /** The strongest driver first; where an index does not exist or is shared, in the order given. */
    private List<FailureDriver> ranked(List<FailureDriver> drivers) {
        boolean some = table.met() > 0 && table.met() < table.rows();
        List<FailureDriver> sorted = new ArrayList<>(drivers);
        sorted.sort(Comparator.comparingDouble(driver ->
                -strength(some ? driver.failure().share() : driver.margin().share())));
        return sorted;
    }

    private static double strength(double share) {
        return Double.isNaN(share) ? Double.NEGATIVE_INFINITY : share;
    }
}
