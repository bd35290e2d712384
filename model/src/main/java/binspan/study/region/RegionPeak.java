package binspan.study.region;

import binspan.study.Execution;
import binspan.study.Workers;
import binspan.study.window.BoundedClimb;
import binspan.study.window.MarginFunction;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/** The spot of a map at which the least margin is largest: a climb from the highest peaks of the grid. */
final class RegionPeak {
    private static final int CLIMBS = 2;
    private static final int ROUNDS = 2;
    private static final int GENERATIONS = 100;

    private final RegionGrid grid;
    private final OperatingRegion region;
    private final Execution execution;

    RegionPeak(OperatingRegion region, RegionGrid grid, Execution execution) {
        this.region = region;
        this.grid = grid;
        this.execution = execution;
    }

    /** Its shares along both axes. */
    double[] place() {
        List<int[]> peaks = peaks();
        double[][] places = new double[peaks.size()][];
        Workers.run(places.length, 1, execution, () -> {
            MarginFunction function = region.function();
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    places[i] = climbed(function, peaks.get(i));
                }
            };
        });
        MarginFunction function = region.function();
        return Arrays.stream(places)
                .max(Comparator.comparingDouble(function::least))
                .orElseThrow();
    }

    private double[] climbed(MarginFunction function, int[] peak) {
        double[] place = {grid.u()[peak[0]], grid.v()[peak[1]]};
        for (int round = 0; round < ROUNDS; round++) {
            execution.stopIfCancelled();
            double[] lowest = {beside(grid.u(), place[0], -1), beside(grid.v(), place[1], -1)};
            double[] highest = {beside(grid.u(), place[0], 1), beside(grid.v(), place[1], 1)};
            place = new BoundedClimb(function::least, lowest, highest).from(place, GENERATIONS, 0.0);
        }
        return place;
    }

    /** The second line from a place on, or the last one. */
    private static double beside(double[] lines, double place, int direction) {
        int cell = RegionGrid.cell(lines, place);
        int line = direction < 0 ? cell - 1 : cell + 2;
        return lines[Math.max(0, Math.min(lines.length - 1, line))];
    }

    /** The highest crossings that no neighbour exceeds, the highest first. */
    private List<int[]> peaks() {
        List<int[]> peaks = new ArrayList<>();
        for (int j = 0; j < grid.v().length; j++) {
            for (int i = 0; i < grid.u().length; i++) {
                if (peak(i, j)) {
                    peaks.add(new int[] {i, j});
                }
            }
        }
        peaks.sort(Comparator.comparingDouble(peak -> -grid.least(peak[0], peak[1])));
        return peaks.subList(0, Math.min(CLIMBS, peaks.size()));
    }

    private boolean peak(int i, int j) {
        for (int b = Math.max(0, j - 1); b <= Math.min(grid.v().length - 1, j + 1); b++) {
            for (int a = Math.max(0, i - 1); a <= Math.min(grid.u().length - 1, i + 1); a++) {
                if (grid.least(a, b) > grid.least(i, j)) {
                    return false;
                }
            }
        }
        return true;
    }
}
