package binspan.study.region;

import binspan.study.Execution;
import binspan.study.window.MarginFunction;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Follows narrow bands through the grid. Where a margin passes zero twice on one edge of a cell and on no other, or where a crossing of lines has a sign that
 * at most one of its neighbours shares, a band may go on unseen: all edges of the cells there are solved again with more samples, and so on from cell to cell.
 */
final class LooseEnds {
    private static final int SAMPLES = 32;
    private static final int[][] STEPS = {{1, 0}, {-1, 0}, {0, 1}, {0, -1}};

    private final RegionGrid grid;
    private final GridCrossings crossings;
    private final MarginFunction function;
    private final Execution execution;
    private final Deque<int[]> cells = new ArrayDeque<>();
    private final Set<GridEdge> solved = new HashSet<>();

    LooseEnds(RegionGrid grid, GridCrossings crossings, MarginFunction function, Execution execution) {
        this.grid = grid;
        this.crossings = crossings;
        this.function = function;
        this.execution = execution;
    }

    void follow() {
        for (int j = 0; j < grid.v().length - 1; j++) {
            for (int i = 0; i < grid.u().length - 1; i++) {
                cells.add(new int[] {i, j});
            }
        }
        while (!cells.isEmpty()) {
            execution.stopIfCancelled();
            int[] cell = cells.removeFirst();
            List<GridEdge> edges = edges(cell[0], cell[1]);
            if (loose(edges) || corner(cell[0], cell[1])) {
                edges.forEach(this::solve);
            }
        }
    }

    private static List<GridEdge> edges(int i, int j) {
        return List.of(GridEdge.bottom(i, j), GridEdge.right(i, j), GridEdge.top(i, j), GridEdge.left(i, j));
    }

    /** Whether a requirement has crossings on one of the edges only. */
    private boolean loose(List<GridEdge> edges) {
        for (int k = 0; k < grid.requirements(); k++) {
            int crossed = 0;
            for (GridEdge edge : edges) {
                crossed += crossings.on(k, edge).length > 0 ? 1 : 0;
            }
            if (crossed == 1) {
                return true;
            }
        }
        return false;
    }

    /** Whether a corner of a cell has a sign that at most one of its neighbours shares. */
    private boolean corner(int i, int j) {
        for (int k = 0; k < grid.requirements(); k++) {
            if (lonely(k, i, j) || lonely(k, i + 1, j) || lonely(k, i, j + 1) || lonely(k, i + 1, j + 1)) {
                return true;
            }
        }
        return false;
    }

    private boolean lonely(int k, int i, int j) {
        int neighbours = 0;
        int alike = 0;
        for (int[] step : STEPS) {
            int a = i + step[0];
            int b = j + step[1];
            if (a >= 0 && b >= 0 && a < grid.u().length && b < grid.v().length) {
                neighbours++;
                alike += grid.margin(k, a, b) >= 0.0 == grid.margin(k, i, j) >= 0.0 ? 1 : 0;
            }
        }
        return alike <= 1 && alike < neighbours;
    }

    /** Solves an edge again, once, and looks at the cells on both of its sides if there is more to it. */
    private void solve(GridEdge edge) {
        if (solved.add(edge) && crossings.solveEdge(edge, SAMPLES, function, execution)) {
            add(edge.row() ? edge.step() : edge.line(), edge.row() ? edge.line() : edge.step());
            add(edge.row() ? edge.step() : edge.line() - 1, edge.row() ? edge.line() - 1 : edge.step());
        }
    }

    private void add(int i, int j) {
        if (i >= 0 && j >= 0 && i < grid.u().length - 1 && j < grid.v().length - 1) {
            cells.add(new int[] {i, j});
        }
    }
}
