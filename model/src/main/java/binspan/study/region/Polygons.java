package binspan.study.region;

import java.util.ArrayList;
import java.util.List;

/** Convex polygons, their corners counter-clockwise. */
final class Polygons {
    private static final int FEWEST_CORNERS = 3;
    private static final double SMALLEST_AREA = 1e-18;

    private Polygons() {}

    /** What of some polygons lies in one of several parts. */
    static List<List<Spot>> within(List<List<Spot>> polygons, List<List<Stretch>> parts) {
        List<List<Spot>> kept = new ArrayList<>();
        for (List<Spot> polygon : polygons) {
            for (List<Stretch> part : parts) {
                List<Spot> rest = polygon;
                for (Stretch stretch : part) {
                    rest = leftOf(rest, stretch);
                }
                if (part.isEmpty() || area(rest) > SMALLEST_AREA) {
                    kept.add(rest);
                }
            }
        }
        return kept;
    }

    /** What of a polygon lies to the left of a stretch. */
    private static List<Spot> leftOf(List<Spot> polygon, Stretch stretch) {
        List<Spot> kept = new ArrayList<>();
        for (int k = 0; k < polygon.size(); k++) {
            Spot here = polygon.get(k);
            Spot next = polygon.get((k + 1) % polygon.size());
            double left = side(here, stretch);
            double nextLeft = side(next, stretch);
            if (left >= 0.0) {
                kept.add(here);
            }
            if (left * nextLeft < 0.0) {
                kept.add(crossing(here, next, stretch, left / (left - nextLeft)));
            }
        }
        return kept;
    }

    private static double side(Spot spot, Stretch stretch) {
        boolean end = spot.equals(stretch.from()) || spot.equals(stretch.to());
        return end ? 0.0 : spot.leftOf(stretch.from(), stretch.to());
    }

    /** Where a stretch leaves a polygon's edge; on the edge of a cell exactly at the end of the stretch, so that neighbouring cells agree. */
    private static Spot crossing(Spot here, Spot next, Stretch stretch, double share) {
        for (Spot end : List.of(stretch.from(), stretch.to())) {
            boolean acrossU = here.u() == next.u() && end.u() == here.u();
            boolean acrossV = here.v() == next.v() && end.v() == here.v();
            if (acrossU || acrossV) {
                return end;
            }
        }
        return new Spot(here.u() + share * (next.u() - here.u()), here.v() + share * (next.v() - here.v()));
    }

    /** The area of a polygon. */
    static double area(List<Spot> polygon) {
        if (polygon.size() < FEWEST_CORNERS) {
            return 0.0;
        }
        double twice = 0.0;
        for (int k = 1; k < polygon.size() - 1; k++) {
            twice += polygon.get(k + 1).leftOf(polygon.get(0), polygon.get(k));
        }
        return twice / 2.0;
    }
}
