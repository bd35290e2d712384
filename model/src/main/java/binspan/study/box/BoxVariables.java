package binspan.study.box;

import java.util.List;

/** The numbers that describe a box in one of its senses, and how large it counts. */
sealed interface BoxVariables permits ShareBox, EqualToleranceBox {
    /** The box of some numbers. */
    Box box(double[] numbers);

    /** A box around a place. */
    double[] around(double[] place, double size);

    /** The lengths whose product is the size of the box, each a sum of the numbers with these factors. */
    double[][] lengths(int numbers);

    /** What is to be made as large as possible: the sum of the logarithms of the lengths. */
    default double gain(double[] numbers) {
        double gain = 0.0;
        for (double[] factors : lengths(numbers.length)) {
            gain += Math.log(product(factors, numbers));
        }
        return gain;
    }

    private static double product(double[] factors, double[] numbers) {
        double product = 0.0;
        for (int k = 0; k < numbers.length; k++) {
            product += factors[k] * numbers[k];
        }
        return product;
    }

    /** The least numbers to be reached with one step of a relative length. */
    double[] lowest(double[] numbers, double length);

    /** The largest numbers to be reached with one step of a relative length. */
    double[] highest(double[] numbers, double length);

    /** The box shrunk by a share of its size. */
    double[] shrunk(double[] numbers, double share);

    /** The same, faces at the ends of their axes left where they are. */
    double[] shrunkInside(double[] numbers, double share);

    /** The ways in which the box can give up a place. */
    List<Retreat> retreats(double[] numbers, double[] relative);

    /** The ways in which the box can be made larger at the end of a search, one after the other, to be gone as far as the requirements allow. */
    List<double[]> pushes(double[] numbers);

    /**
     * A way to give up a place of the box.
     *
     * @param from the numbers with which the place lies on a face
     * @param to the numbers of the smallest box on that way
     * @param relative the place on the face, in relative coordinates
     */
    @SuppressWarnings("ArrayRecordComponent") // never compared
    record Retreat(double[] from, double[] to, double[] relative) {
        /** The numbers part of the way along. */
        double[] at(double share) {
            double[] numbers = new double[from.length];
            for (int k = 0; k < numbers.length; k++) {
                numbers[k] = from[k] + share * (to[k] - from[k]);
            }
            return numbers;
        }
    }
}
