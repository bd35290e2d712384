package binspan.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** The spot of a map at which the least margin is largest: a climb from the highest peaks of the grid. */
final class RegionPeak {
    private static final int CLIMBS = 2;
    private static final int ROUNDS = 2;
    private static final int GENERATIONS = 100;

    private final RegionGrid grid;
    private final MarginFunction function;

    RegionPeak(RegionGrid grid, MarginFunction function) {
        this.grid = grid;
        this.function = function;
    }

    /** Its shares along both axes. */
    double[] place() {
        double[] best = null;
        for (int[] peak : peaks()) {
            double[] place = climbed(grid.u()[peak[0]], grid.v()[peak[1]]);
            if (best == null || function.least(place) > function.least(best)) {
                best = place;
            }
        }
        return best;
    }

    private double[] climbed(double u, double v) {
        double[] place = {u, v};
        for (int round = 0; round < ROUNDS; round++) {
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
