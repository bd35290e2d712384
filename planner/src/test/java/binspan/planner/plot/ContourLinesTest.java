package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Against closed forms of the lines. */
final class ContourLinesTest {
    private static final Axis X = Axis.linear("X", "");

    private static List<List<Point>> lines(Lattice lattice, double level) {
        return ContourLines.of(X, X, lattice, level);
    }

    @Test
    void circleIsOneClosedLineOfItsRadius() {
        Lattice lattice = Lattices.of(Lattices.even(-2.0, 2.0, 81), Lattices.even(-2.0, 2.0, 81), Math::hypot);
        List<List<Point>> lines = lines(lattice, 1.3);
        assertThat(lines).hasSize(1);
        assertThat(lines.get(0).get(0)).isEqualTo(lines.get(0).get(lines.get(0).size() - 1));
        assertThat(lines.get(0))
                .allSatisfy(
                        point -> assertThat(Math.hypot(point.x(), point.y())).isCloseTo(1.3, within(1e-3)));
        assertThat(length(lines.get(0))).isCloseTo(2.0 * Math.PI * 1.3, within(5e-3));
    }

    private static double length(List<Point> line) {
        double length = 0.0;
        for (int i = 1; i < line.size(); i++) {
            length += Math.hypot(
                    line.get(i).x() - line.get(i - 1).x(),
                    line.get(i).y() - line.get(i - 1).y());
        }
        return length;
    }

    @Test
    void planeIsOneOpenLineFromSideToSide() {
        Lattice lattice =
                Lattices.of(Lattices.even(0.0, 1.0, 11), new double[] {0.0, 0.1, 0.7, 1.0}, (x, y) -> 2.0 * x + y);
        List<Point> line = lines(lattice, 1.5).get(0);
        assertThat(lines(lattice, 1.5)).hasSize(1);
        assertThat(line)
                .allSatisfy(point -> assertThat(2.0 * point.x() + point.y()).isCloseTo(1.5, within(1e-12)));
        assertThat(Math.abs(line.get(0).y() - line.get(line.size() - 1).y())).isCloseTo(1.0, within(1e-12));
    }

    @Test
    void logarithmicAxesKeepPowerLawsExact() {
        Axis log = Axis.logarithmic("X", "");
        double[] values = Lattices.even(-2.0, 1.0, 13);
        for (int i = 0; i < values.length; i++) {
            values[i] = Math.pow(10.0, values[i]);
        }
        Lattice lattice = Lattices.of(values, values, (x, y) -> Math.log(x * x * y));
        List<List<Point>> lines = ContourLines.of(log, log, lattice, Math.log(0.01));
        assertThat(lines).hasSize(1);
        assertThat(lines.get(0))
                .allSatisfy(
                        point -> assertThat(point.x() * point.x() * point.y()).isCloseTo(0.01, within(1e-9)));
    }

    /** Around the middle of a saddle the lines must not cross: two pieces, one on each side. */
    @Test
    void saddleGivesTwoPieces() {
        Lattice lattice = Lattices.of(new double[] {-1.0, 1.0}, new double[] {-1.0, 1.0}, (x, y) -> x * y);
        assertThat(lines(lattice, 0.2)).hasSize(2).allSatisfy(line -> {
            assertThat(line).hasSize(2);
            assertThat(line.get(0).x() * line.get(0).y()).isPositive();
            assertThat(Math.signum(line.get(0).x()))
                    .isEqualTo(Math.signum(line.get(1).x()));
        });
        assertThat(lines(lattice, -0.2))
                .hasSize(2)
                .allSatisfy(
                        line -> assertThat(line.get(0).x() * line.get(0).y()).isNegative());
    }

    @Test
    void cellsWithoutAValueInterruptTheLine() {
        Lattice lattice = Lattices.of(
                Lattices.even(0.0, 4.0, 5),
                Lattices.even(0.0, 1.0, 2),
                (x, y) -> x == 2.0 && y == 1.0 ? Double.NaN : y);
        List<List<Point>> lines = lines(lattice, 0.5);
        assertThat(lines).hasSize(2);
        assertThat(lines.stream().flatMap(List::stream).mapToDouble(Point::x)).doesNotContain(2.0);
    }

    @Test
    void levelsThatAreNeverReachedGiveNothing() {
        Lattice lattice = Lattices.of(Lattices.even(0.0, 1.0, 3), Lattices.even(0.0, 1.0, 3), (x, y) -> x);
        assertThat(lines(lattice, 2.0)).isEmpty();
    }

    @Test
    void placesThatAreNotOnTheAxisAreRefused() {
        Lattice lattice = Lattices.of(new double[] {0.0, 1.0}, new double[] {0.0, 1.0}, (x, y) -> x);
        assertThatThrownBy(() -> ContourLines.of(Axis.logarithmic("Loss", "dB"), X, lattice, 0.5))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("Loss");
        assertThatThrownBy(() -> new Lattice(new double[] {1.0, 1.0}, new double[] {0.0, 1.0}, new double[2][2]))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
