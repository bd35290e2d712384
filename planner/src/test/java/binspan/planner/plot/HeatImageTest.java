package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import org.jfree.data.Range;
import org.junit.jupiter.api.Test;

final class HeatImageTest {
    /** A plane stays a plane between points, even or not: the closed form of linear interpolation. */
    @Test
    void coloursRunLinearlyBetweenPoints() {
        double[] x = {0.0, 0.1, 0.45, 1.0};
        double[] y = {0.0, 0.8, 1.0};
        double[][] z = Lattices.of(x, y, (a, b) -> 0.7 * a + 0.3 * b).values();
        BufferedImage image = HeatImage.of(x, y, z, new Range(0.0, 1.0));
        for (int row = 0; row < image.getHeight(); row += 17) {
            for (int column = 0; column < image.getWidth(); column += 13) {
                double a = (column + 0.5) / image.getWidth();
                double b = 1.0 - (row + 0.5) / image.getHeight();
                double share = 0.7 * a + 0.3 * b;
                assertThat(image.getRGB(column, row) & 0xffffff)
                        .isIn(ColourScale.rgb(share - 1e-9), ColourScale.rgb(share + 1e-9));
            }
        }
    }

    @Test
    void missingValuesStayClearUpToHalfWay() {
        double[] side = {0.0, 1.0, 2.0};
        double[][] z = {{1.0, 1.0, 1.0}, {1.0, 1.0, 1.0}, {1.0, 1.0, Double.NaN}};
        BufferedImage image = HeatImage.of(side, side, z, new Range(0.0, 1.0));
        assertThat(image.getRGB(image.getWidth() - 1, 0) >>> 24).isZero();
        assertThat(image.getRGB(0, 0)).isEqualTo(0xff000000 | ColourScale.rgb(1.0));
        assertThat(image.getRGB(image.getWidth() - 1, image.getHeight() - 1))
                .isEqualTo(0xff000000 | ColourScale.rgb(1.0));
        assertThat(image.getRGB(image.getWidth() - 1, image.getHeight() / 4 - 4) >>> 24)
                .isZero();
        assertThat(image.getRGB(image.getWidth() - 1, image.getHeight() / 4 + 4) >>> 24)
                .isEqualTo(0xff);
    }
}
