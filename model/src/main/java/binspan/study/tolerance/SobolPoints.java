package binspan.study.tolerance;

import java.util.SplittableRandom;
import org.apache.commons.math3.random.SobolSequenceGenerator;

/**
 * Points of the unit cube that fill it more evenly than independent ones: the Sobol sequence with the direction numbers of Joe and Kuo (SIAM J. Sci.
 * Comput. 30, 2635, 2008), randomised by a digital shift (L'Ecuyer and Lemieux 2002, from memory).
 *
 * <p>The shift makes each point uniform in the cube and leaves all points together as balanced as the sequence, whose first point is not skipped. Balance
 * is best with a power of two of points. One object serves one thread; a point depends on its number and the seed alone.
 */
final class SobolPoints {
    /** Most coordinates. */
    static final int MOST_DIMENSIONS = 1000;

    private static final int BITS = 52;
    private static final double CELLS = 0x1p52;

    private final SobolSequenceGenerator sequence;
    private final long[] shift;

    /**
     * The points of a seed.
     *
     * @param dimensions number of coordinates, 1 to {@value #MOST_DIMENSIONS}
     * @param seed of the shift
     */
    SobolPoints(int dimensions, long seed) {
        this.sequence = new SobolSequenceGenerator(dimensions);
        this.shift = new SplittableRandom(seed)
                .longs(dimensions)
                .map(bits -> bits >>> (Long.SIZE - BITS))
                .toArray();
    }

    /** A point by its number, 0 for the first; those after it follow by {@link #next}. */
    double[] at(int number) {
        return shifted(sequence.skipTo(number));
    }

    /** The point after the last one. */
    double[] next() {
        return shifted(sequence.nextVector());
    }

    /** The middle of the shifted cell, so that no coordinate is 0 or 1. */
    private double[] shifted(double[] point) {
        for (int i = 0; i < point.length; i++) {
            long cell = (long) (point[i] * CELLS) ^ shift[i];
            point[i] = (cell + 0.5) / CELLS;
        }
        return point;
    }
}
