package binspan.study.box;

import java.util.SplittableRandom;
import org.apache.commons.math3.random.SobolSequenceGenerator;

/** Sobol points in the unit cube (directions of Joe and Kuo 2008), moved by a seeded shift modulo 1 (Cranley and Patterson 1976). */
final class ShiftedSobol {
    private ShiftedSobol() {}

    /** So many points as the sequence has them, the corner at its start left out: all lie strictly inside. */
    static double[][] plain(int count, int axes) {
        SobolSequenceGenerator sequence = new SobolSequenceGenerator(axes);
        sequence.nextVector();
        double[][] points = new double[count][];
        for (int i = 0; i < count; i++) {
            points[i] = sequence.nextVector();
        }
        return points;
    }

    /** So many points, shifted by a seed. */
    static double[][] shifted(int count, int axes, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double[] shift = random.doubles(axes).toArray();
        double[][] points = plain(count, axes);
        for (double[] point : points) {
            for (int j = 0; j < axes; j++) {
                point[j] = (point[j] + shift[j]) % 1.0;
            }
        }
        return points;
    }
}
