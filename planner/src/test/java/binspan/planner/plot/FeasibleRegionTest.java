package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.PathIterator;
import java.util.List;
import java.util.function.DoubleBinaryOperator;
import org.junit.jupiter.api.Test;

/** Against areas in closed form. */
final class FeasibleRegionTest {
    private static final double[] SIDE = Lattices.even(0.0, 1.0, 101);

    private static FeasibleRegion of(DoubleBinaryOperator margin) {
        return FeasibleRegion.of(SIDE, SIDE, Lattices.of(SIDE, SIDE, margin).values());
    }

    /** The area of loops by the shoelace formula, holes counted against the rest by their sense of turning. */
    private static double area(FeasibleRegion region) {
        double sum = 0.0;
        double[] at = new double[2];
        double[] start = new double[2];
        double[] to = new double[6];
        for (PathIterator i = region.inside().getPathIterator(null); !i.isDone(); i.next()) {
            int kind = i.currentSegment(to);
            double[] next = kind == PathIterator.SEG_CLOSE ? start.clone() : new double[] {to[0], to[1]};
            if (kind == PathIterator.SEG_MOVETO) {
                start = next;
            } else {
                sum += at[0] * next[1] - next[0] * at[1];
            }
            at = next;
        }
        return Math.abs(sum) / 2.0;
    }

    @Test
    void discInTheMiddleHasItsAreaAndAClosedBorder() {
        FeasibleRegion region = of((x, y) -> 0.3 - Math.hypot(x - 0.5, y - 0.5));
        assertThat(area(region)).isCloseTo(Math.PI * 0.09, within(2e-4));
        assertThat(region.border()).hasSize(1);
        List<Point> border = region.border().get(0);
        assertThat(border.get(0)).isEqualTo(border.get(border.size() - 1));
    }

    @Test
    void quarterDiscClosesAlongTheEdgeButItsBorderDoesNotRunThere() {
        FeasibleRegion region = of((x, y) -> 0.6 - Math.hypot(x, y));
        assertThat(area(region)).isCloseTo(Math.PI * 0.36 / 4.0, within(2e-4));
        assertThat(region.border().stream().flatMap(List::stream))
                .allSatisfy(
                        point -> assertThat(Math.hypot(point.x(), point.y())).isCloseTo(0.6, within(1e-3)));
        assertThat(region.inside().contains(0.01, 0.01)).isTrue();
        assertThat(region.inside().contains(0.5, 0.5)).isFalse();
    }

    @Test
    void wholeMapIsInsideWithoutABorder() {
        FeasibleRegion region = of((x, y) -> 1.0);
        assertThat(area(region)).isCloseTo(1.0, within(1e-12));
        assertThat(region.border()).isEmpty();
    }

    @Test
    void nothingIsInsideWhereNoMarginIs() {
        assertThat(of((x, y) -> -1.0).border()).isEmpty();
        FeasibleRegion unknown = of((x, y) -> Double.NaN);
        assertThat(area(unknown)).isZero();
        FeasibleRegion half = of((x, y) -> x < 0.5 ? 1.0 : Double.NaN);
        assertThat(area(half)).isCloseTo(0.495, within(0.006));
    }

    @Test
    void limitlessMarginsKeepTheBorderBetweenTheirPoints() {
        FeasibleRegion region = of((x, y) -> x < 0.5 ? Double.POSITIVE_INFINITY : Double.NEGATIVE_INFINITY);
        assertThat(region.border().stream().flatMap(List::stream))
                .isNotEmpty()
                .allSatisfy(point -> assertThat(point.x()).isBetween(0.49, 0.5));
    }
}
