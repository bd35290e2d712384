package binspan.study.tolerance;

import binspan.scenario.Parameter;
import java.util.Arrays;
import java.util.List;

/** Draws builds of a link for one thread: the values of all parameters that its spreads move. A build depends on its number and the seed alone. */
final class BuildSampler {
    private final PlacedSpread[] places;
    private final int[] spread;
    private final int[] first;
    private final SobolPoints points;

    BuildSampler(List<SpreadDistribution> distributions, long seed) {
        this.places =
                distributions.stream().flatMap(each -> each.places().stream()).toArray(PlacedSpread[]::new);
        this.spread = new int[places.length];
        this.first = new int[distributions.size()];
        this.points = new SobolPoints(distributions.size(), seed);
        int end = 0;
        for (int i = 0; i < first.length; i++) {
            first[i] = end;
            end += distributions.get(i).places().size();
            Arrays.fill(spread, first[i], end, i);
        }
    }

    /** The parameters that are moved, in the order of their values. */
    List<Parameter> parameters() {
        return Arrays.stream(places).map(PlacedSpread::parameter).toList();
    }

    /** The place of the first value of a spread. */
    int first(int spreadNumber) {
        return first[spreadNumber];
    }

    /** The values of a build by its number, 0 for the first. */
    double[] at(int build) {
        return values(points.at(build));
    }

    /** The values of the build after the last one. */
    double[] next() {
        return values(points.next());
    }

    private double[] values(double[] point) {
        double[] values = new double[places.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = places[i].at(point[spread[i]]);
        }
        return values;
    }
}
