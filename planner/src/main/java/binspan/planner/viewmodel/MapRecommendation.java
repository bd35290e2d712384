package binspan.planner.viewmodel;

import binspan.study.box.OperatingBox;
import binspan.study.region.RegionMap;
import binspan.study.window.PointVerdict;
import java.util.Optional;

/**
 * The point of the map to set the link to.
 *
 * @param kind why this one
 * @param point its values and all requirements there, all met
 */
public record MapRecommendation(Kind kind, PointVerdict point) {
    /** What distinguishes the point. */
    public enum Kind {
        /** It is the middle of the largest box, in the scales of the axes: as far from all its sides as can be. */
        BOX_MIDDLE,
        /** No other point meets its tightest requirement by more. */
        LEAST_MARGIN
    }

    /** Along the horizontal axis, in its unit. */
    public double x() {
        return point.values().get(0);
    }

    /** Along the vertical axis. */
    public double y() {
        return point.values().get(1);
    }

    /** The middle of a box; empty without a box. */
    static Optional<MapRecommendation> middle(MapQuestion asked, OperatingBox box) {
        if (!box.found()) {
            return Optional.empty();
        }
        PointVerdict middle =
                asked.verdict(box.sides().get(0).centre(), box.sides().get(1).centre());
        return Optional.of(new MapRecommendation(Kind.BOX_MIDDLE, middle)).filter(each -> middle.met());
    }

    /** The best point of a map; empty where nothing holds. */
    static Optional<MapRecommendation> best(RegionMap map) {
        return Optional.of(new MapRecommendation(Kind.LEAST_MARGIN, map.best()))
                .filter(each -> each.point().met());
    }
}
