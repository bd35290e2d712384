package binspan.planner.plot;

import java.awt.image.BufferedImage;
import java.util.Arrays;
import org.jfree.data.Range;

/**
 * A lattice as an image: colours between its points run linearly, and where more than half of the weight of a pixel lies
 * on missing values it stays clear.
 */
final class HeatImage {
    private static final int WIDTH = 480;
    private static final int HEIGHT = 360;
    private static final int OPAQUE = 0xff000000;
    private static final double HALF = 0.5;

    private final double[] x;
    private final double[] y;
    private final double[][] z;

    private HeatImage(double[] x, double[] y, double[][] z) {
        this.x = x;
        this.y = y;
        this.z = z;
    }

    /** Positions in all three directions, and the range of positions that the colours span. */
    static BufferedImage of(double[] x, double[] y, double[][] z, Range colours) {
        HeatImage source = new HeatImage(x, y, z);
        BufferedImage image = new BufferedImage(WIDTH, HEIGHT, BufferedImage.TYPE_INT_ARGB);
        for (int row = 0; row < HEIGHT; row++) {
            double up = place(y, 1.0 - (row + HALF) / HEIGHT);
            for (int column = 0; column < WIDTH; column++) {
                double value = source.value(place(x, (column + HALF) / WIDTH), up);
                if (!Double.isNaN(value)) {
                    double share = (value - colours.getLowerBound()) / colours.getLength();
                    image.setRGB(column, row, OPAQUE | ColourScale.rgb(share));
                }
            }
        }
        return image;
    }

    /** The index, with its fraction, at a share of the way along positions. */
    private static double place(double[] positions, double share) {
        double wanted = positions[0] + share * (positions[positions.length - 1] - positions[0]);
        int index = Arrays.binarySearch(positions, wanted);
        int after = index >= 0 ? index : -index - 1;
        int before = Math.max(0, Math.min(positions.length - 2, after - 1));
        return before + (wanted - positions[before]) / (positions[before + 1] - positions[before]);
    }

    private double value(double across, double up) {
        int column = Math.min(x.length - 2, (int) across);
        int row = Math.min(y.length - 2, (int) up);
        double weights = 0.0;
        double sum = 0.0;
        for (int corner = 0; corner < 4; corner++) {
            int right = corner % 2;
            int above = corner / 2;
            double value = z[row + above][column + right];
            double weight = side(across - column, right) * side(up - row, above);
            weights += Double.isNaN(value) ? 0.0 : weight;
            sum += Double.isNaN(value) ? 0.0 : weight * value;
        }
        return weights >= HALF ? sum / weights : Double.NaN;
    }

    private static double side(double fraction, int far) {
        return far == 1 ? fraction : 1.0 - fraction;
    }
}
