package binspan.study.region;

import binspan.study.Execution;
import binspan.study.region.RegionMap.RequirementContour;
import binspan.study.window.MarginFunction;
import binspan.study.window.PointVerdict;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.NavigableSet;
import java.util.TreeSet;

/** One search for the region of two parameters: grid, crossings, hidden islands, contours, border. */
final class RegionSearch {
    private static final int MOST_ROUNDS = 3;
    private static final double GRID_END = 0.15;
    private static final double CROSSINGS_END = 0.7;
    private static final double HIDDEN_END = 0.8;
    private static final double SHAPE_END = 0.9;

    private final OperatingRegion region;
    private final Execution execution;
    private final MarginFunction function;
    private RegionGrid grid;
    private GridCrossings crossings;

    RegionSearch(OperatingRegion region, Execution execution) {
        this.region = region;
        this.execution = execution;
        this.function = region.function();
    }

    RegionMap result() {
        compute(RegionGrid.shares(region.horizontal()), RegionGrid.shares(region.vertical()), execution);
        RegionGrid asked = grid;
        for (int round = 1; round < MOST_ROUNDS; round++) {
            HiddenSpots hidden = new HiddenSpots(grid, crossings, function, execution).search();
            if (hidden.u().isEmpty() && hidden.v().isEmpty()) {
                break;
            }
            compute(with(grid.u(), hidden.u()), with(grid.v(), hidden.v()), execution.silent());
        }
        execution.reached(HIDDEN_END);
        return new RegionMap(region, asked, contours(), outline());
    }

    private void compute(double[] u, double[] v, Execution run) {
        grid = RegionGrid.of(region, u, v, run.part(0.0, GRID_END));
        crossings = GridCrossings.of(region, grid, run.part(GRID_END, CROSSINGS_END));
    }

    private static double[] with(double[] lines, NavigableSet<Double> more) {
        NavigableSet<Double> all = new TreeSet<>(more);
        Arrays.stream(lines).forEach(all::add);
        return all.stream().mapToDouble(Double::doubleValue).toArray();
    }

    private List<RequirementContour> contours() {
        List<RequirementContour> contours = new ArrayList<>();
        for (int k = 0; k < grid.requirements(); k++) {
            execution.stopIfCancelled();
            contours.add(new RequirementContour(
                    function.margins().requirements().get(k), function.margins().required(k), lines(stretches(k))));
        }
        return contours;
    }

    private List<Stretch> stretches(int requirement) {
        List<Stretch> stretches = new ArrayList<>();
        for (int j = 0; j < grid.v().length - 1; j++) {
            for (int i = 0; i < grid.u().length - 1; i++) {
                new GridCell(grid, crossings, function, i, j).parts(requirement).forEach(stretches::addAll);
            }
        }
        return stretches;
    }

    private RegionOutline outline() {
        RegionShape shape = RegionShape.of(grid, crossings, function, execution.part(HIDDEN_END, SHAPE_END));
        PointVerdict best = function.verdict(new RegionPeak(region, grid, execution.silent()).place());
        execution.reached(1.0);
        return new RegionOutline(
                lines(shape.border()),
                shape.parts(),
                shape.area(region.horizontal(), region.vertical()),
                shape.share(),
                best);
    }

    private List<MapLine> lines(Collection<Stretch> stretches) {
        return StretchChain.join(stretches).stream()
                .map(line -> new MapLine(line.stream().map(this::point).toList()))
                .toList();
    }

    private MapPoint point(Spot spot) {
        return new MapPoint(
                MarginFunction.value(region.horizontal(), spot.u()), MarginFunction.value(region.vertical(), spot.v()));
    }
}
