package binspan.study.region;

import binspan.study.Execution;
import binspan.study.window.BoundedClimb;
import binspan.study.window.InnerRoot;
import binspan.study.window.MarginFunction;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.NavigableSet;
import java.util.TreeSet;
import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;

/**
 * Islands and holes smaller than a cell: every peak of a margin that stays below zero at the crossings of the lines, and every hollow that stays above,
 * is followed; where the followed spot contradicts the map, more lines are laid through it.
 */
final class HiddenSpots {
    private static final int GENERATIONS = 60;
    private static final double GOAL = 1e-9;
    private static final int MOST_FOLLOWED = 48;
    private static final int LINES = 6;
    private static final double BEYOND = 1.25;

    private final RegionGrid grid;
    private final GridCrossings crossings;
    private final MarginFunction function;
    private final Execution execution;
    private final NavigableSet<Double> u = new TreeSet<>();
    private final NavigableSet<Double> v = new TreeSet<>();

    HiddenSpots(RegionGrid grid, GridCrossings crossings, MarginFunction function, Execution execution) {
        this.grid = grid;
        this.crossings = crossings;
        this.function = function;
        this.execution = execution;
    }

    /** Lines to be laid across the first axis. */
    NavigableSet<Double> u() {
        return u;
    }

    /** Lines to be laid across the second axis. */
    NavigableSet<Double> v() {
        return v;
    }

    /** Looks for them all: each requirement's own, then those of the least margin. */
    HiddenSpots search() {
        for (int k = 0; k <= grid.requirements(); k++) {
            List<int[]> turns = turns(k);
            for (int[] turn : turns.subList(0, Math.min(turns.size(), MOST_FOLLOWED))) {
                execution.stopIfCancelled();
                follow(k, turn[0], turn[1]);
            }
        }
        return this;
    }

    private boolean all(int k) {
        return k == grid.requirements();
    }

    private double at(int k, int i, int j) {
        return all(k) ? grid.least(i, j) : grid.margin(k, i, j);
    }

    private double at(int k, Spot spot) {
        return all(k) ? function.least(spot.u(), spot.v()) : function.one(k, spot.u(), spot.v());
    }

    /** The crossings that turn back before zero, the nearest to zero first. */
    private List<int[]> turns(int k) {
        List<int[]> turns = new ArrayList<>();
        for (int j = 0; j < grid.v().length; j++) {
            for (int i = 0; i < grid.u().length; i++) {
                if (turnsBack(k, i, j)) {
                    turns.add(new int[] {i, j});
                }
            }
        }
        ToDoubleFunction<int[]> distance = turn -> Math.abs(at(k, turn[0], turn[1]));
        turns.sort(Comparator.comparingDouble(distance));
        return turns;
    }

    private boolean turnsBack(int k, int i, int j) {
        double here = at(k, i, j);
        if (here >= 0.0 && all(k)) {
            return false;
        }
        double side = here < 0.0 ? 1.0 : -1.0;
        double difference = 0.0;
        for (int b = Math.max(0, j - 1); b <= Math.min(grid.v().length - 1, j + 1); b++) {
            for (int a = Math.max(0, i - 1); a <= Math.min(grid.u().length - 1, i + 1); a++) {
                double over = side * (here - at(k, a, b));
                if (over < 0.0) {
                    return false;
                }
                difference = Math.max(difference, over);
            }
        }
        return difference > 0.0 && Math.abs(here) <= GridCrossings.FARTHEST * difference;
    }

    private void follow(int k, int i, int j) {
        double side = at(k, i, j) < 0.0 ? 1.0 : -1.0;
        double[] lowest = {grid.u()[Math.max(0, i - 1)], grid.v()[Math.max(0, j - 1)]};
        double[] highest = {
            grid.u()[Math.min(grid.u().length - 1, i + 1)], grid.v()[Math.min(grid.v().length - 1, j + 1)]
        };
        double[] found = new BoundedClimb(place -> side * at(k, new Spot(place[0], place[1])), lowest, highest)
                .from(new double[] {grid.u()[i], grid.v()[j]}, GENERATIONS, GOAL);
        Spot spot = new Spot(found[0], found[1]);
        boolean holds = at(k, spot) >= 0.0;
        if (holds == side > 0.0 && holds != drawn(k, spot)) {
            lay(u, place -> at(k, new Spot(place, spot.v())), spot.u(), lowest[0], highest[0]);
            lay(v, place -> at(k, new Spot(spot.u(), place)), spot.v(), lowest[1], highest[1]);
        }
    }

    /** Whether the map shows that it holds at a spot. */
    private boolean drawn(int k, Spot spot) {
        int i = RegionGrid.cell(grid.u(), spot.u());
        int j = RegionGrid.cell(grid.v(), spot.v());
        GridCell cell = new GridCell(grid, crossings, function, i, j);
        int first = all(k) ? 0 : k;
        int end = all(k) ? k : k + 1;
        for (int each = first; each < end; each++) {
            if (!cell.holds(each, spot)) {
                return false;
            }
        }
        return true;
    }

    /** Lays lines from a little below to a little above the stretch on which the margin keeps its sign. */
    private static void lay(
            NavigableSet<Double> lines, DoubleUnaryOperator along, double middle, double lowest, double highest) {
        double below = middle - reach(along, middle, lowest);
        double above = reach(along, middle, highest) - middle;
        for (int line = -LINES; line <= LINES; line++) {
            double share = BEYOND * line / LINES;
            double place = middle + share * (line < 0 ? below : above);
            if (place > lowest && place < highest) {
                lines.add(place);
            }
        }
    }

    private static double reach(DoubleUnaryOperator along, double middle, double end) {
        boolean changes = along.applyAsDouble(middle) >= 0.0 != along.applyAsDouble(end) >= 0.0;
        return changes ? InnerRoot.between(along, Math.min(middle, end), Math.max(middle, end)) : end;
    }
}
