package binspan.study.tolerance;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.BitSet;
import org.apache.commons.math3.random.SobolSequenceGenerator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Points against what defines a Sobol sequence and a digital shift. */
final class SobolPointsTest {
    private static final int DIMENSIONS = 12;
    private static final int POINTS = 1 << 10;

    /** In every coordinate, each of 2^k equal intervals holds exactly one of the first 2^k points: a (0, 1)-sequence (Sobol 1967). */
    @ParameterizedTest
    @ValueSource(longs = {0, 1, 42, -7})
    void everyIntervalOfEveryCoordinateHoldsOnePoint(long seed) {
        SobolPoints points = new SobolPoints(DIMENSIONS, seed);
        BitSet[] hit = new BitSet[DIMENSIONS];
        Arrays.setAll(hit, i -> new BitSet());
        for (int number = 0; number < POINTS; number++) {
            double[] point = number == 0 ? points.at(0) : points.next();
            for (int i = 0; i < DIMENSIONS; i++) {
                assertThat(point[i]).isStrictlyBetween(0.0, 1.0);
                hit[i].set((int) (point[i] * POINTS));
            }
        }
        assertThat(hit).allSatisfy(each -> assertThat(each.cardinality()).isEqualTo(POINTS));
    }

    /** The first two coordinates are a (0, 2)-sequence: each of the 16 x 64 boxes of equal size holds one of 1,024 points (Sobol 1967). */
    @Test
    void everyBoxOfTheFirstTwoCoordinatesHoldsOnePoint() {
        SobolPoints points = new SobolPoints(2, 3);
        BitSet hit = new BitSet();
        for (int number = 0; number < POINTS; number++) {
            double[] point = points.at(number);
            int column = (int) (point[0] * 16);
            hit.set(64 * column + (int) (point[1] * 64));
        }
        assertThat(hit.cardinality()).isEqualTo(POINTS);
    }

    @Test
    void pointsDifferFromTheSequenceByOneShift() {
        SobolSequenceGenerator sequence = new SobolSequenceGenerator(DIMENSIONS);
        SobolPoints points = new SobolPoints(DIMENSIONS, 5);
        long[] shift = new long[DIMENSIONS];
        for (int number = 0; number < POINTS; number++) {
            double[] plain = sequence.nextVector();
            double[] point = points.at(number);
            for (int i = 0; i < DIMENSIONS; i++) {
                long found = cell(plain[i]) ^ cell(point[i]);
                assertThat(found).isEqualTo(number == 0 ? found : shift[i]);
                shift[i] = found;
            }
        }
        assertThat(Arrays.stream(shift).distinct().count()).isEqualTo(DIMENSIONS);
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 255, 256, 1000, 1_000_000})
    void pointsAreTheSameFromWhereverTheyAreWalked(int start) {
        SobolPoints walked = new SobolPoints(3, 9);
        walked.at(start);
        for (int number = start + 1; number < start + 300; number++) {
            assertThat(walked.next()).containsExactly(new SobolPoints(3, 9).at(number));
        }
    }

    @Test
    void otherSeedsGiveOtherPoints() {
        assertThat(new SobolPoints(2, 1).at(0)).isNotEqualTo(new SobolPoints(2, 2).at(0));
    }

    private static long cell(double coordinate) {
        return (long) (coordinate * 0x1p52);
    }
}
