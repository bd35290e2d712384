package binspan.study.region;

import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.window.MarginFunction;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * The region in which all requirements hold: in each cell the polygon that their stretches leave. The edges that two cells share cancel; what remains is
 * the border.
 */
final class RegionShape {
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(4, 0.0, 1.0);

    private final Map<Stretch, Integer> open = new LinkedHashMap<>();
    private final List<Integer> parents = new ArrayList<>();

    private RegionShape() {}

    static RegionShape of(RegionGrid grid, GridCrossings crossings, MarginFunction function, Execution execution) {
        RegionShape shape = new RegionShape();
        for (int j = 0; j < grid.v().length - 1; j++) {
            execution.reached((double) j / (grid.v().length - 1));
            for (int i = 0; i < grid.u().length - 1; i++) {
                shape.add(polygons(new GridCell(grid, crossings, function, i, j), grid.requirements()));
            }
        }
        return shape;
    }

    private static List<List<Spot>> polygons(GridCell cell, int requirements) {
        List<List<Spot>> polygons = List.of(cell.corners());
        for (int k = 0; k < requirements && !polygons.isEmpty(); k++) {
            polygons = Polygons.within(polygons, cell.parts(k));
        }
        return polygons;
    }

    private void add(List<List<Spot>> polygons) {
        for (List<Spot> polygon : polygons) {
            int number = parents.size();
            parents.add(number);
            for (int k = 0; k < polygon.size(); k++) {
                add(new Stretch(polygon.get(k), polygon.get((k + 1) % polygon.size())), number);
            }
        }
    }

    private void add(Stretch edge, int polygon) {
        if (edge.from().equals(edge.to())) {
            return;
        }
        Integer neighbour = open.remove(edge.reversed());
        if (neighbour == null) {
            open.put(edge, polygon);
        } else {
            parents.set(root(polygon), root(neighbour));
        }
    }

    private int root(int polygon) {
        int root = polygon;
        while (parents.get(root) != root) {
            parents.set(root, parents.get(parents.get(root)));
            root = parents.get(root);
        }
        return root;
    }

    /** The border, the region to the left. */
    Collection<Stretch> border() {
        return open.keySet();
    }

    /** Number of parts that do not touch along an edge. */
    int parts() {
        Set<Integer> roots = new HashSet<>();
        for (int polygon = 0; polygon < parents.size(); polygon++) {
            roots.add(root(polygon));
        }
        return roots.size();
    }

    /** The area as a share of the map, in the axes' own scales. */
    double share() {
        double share = 0.0;
        for (Stretch edge : border()) {
            share += (edge.from().u() + edge.to().u())
                    / 2.0
                    * (edge.to().v() - edge.from().v());
        }
        return share;
    }

    /** The area in the unit of the first axis times that of the second. */
    double area(Axis horizontal, Axis vertical) {
        double area = 0.0;
        for (Stretch edge : border()) {
            double du = edge.to().u() - edge.from().u();
            double dv = edge.to().v() - edge.from().v();
            area += dv == 0.0
                    ? 0.0
                    : RULE.integrate(t -> horizontal.at(edge.from().u() + t * du)
                            * slope(vertical, edge.from().v() + t * dv)
                            * dv);
        }
        return area;
    }

    /** Growth of an axis' value with the share of the way. */
    private static double slope(Axis axis, double share) {
        return axis.logarithmic() ? axis.at(share) * Math.log(axis.to() / axis.from()) : axis.to() - axis.from();
    }
}
