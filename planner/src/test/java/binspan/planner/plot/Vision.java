package binspan.planner.plot;

/**
 * Colours as they are seen: sRGB to OKLab (matrices of B. Ottosson, "A perceptual color space for image processing",
 * 2020), and full deuteranopia and protanopia on linear sRGB (matrices of G. Machado, M. Oliveira, L. Fernandes, "A
 * physiologically-based model for simulation of color vision deficiency", IEEE TVCG 15, 2009, severity 1). The numbers
 * were compared with several published implementations.
 */
enum Vision {
    NORMAL(new double[][] {{1.0, 0.0, 0.0}, {0.0, 1.0, 0.0}, {0.0, 0.0, 1.0}}),
    DEUTERANOPIA(new double[][] {
        {0.367322, 0.860646, -0.227968}, {0.280085, 0.672501, 0.047413}, {-0.011820, 0.042940, 0.968881}
    }),
    PROTANOPIA(new double[][] {
        {0.152286, 1.052583, -0.204868}, {0.114503, 0.786281, 0.099216}, {-0.003882, -0.048116, 1.051998}
    });

    private static final double[][] TO_CONES = {
        {0.4122214708, 0.5363325363, 0.0514459929},
        {0.2119034982, 0.6806995451, 0.1073969566},
        {0.0883024619, 0.2817188376, 0.6299787005}
    };
    private static final double[][] TO_LAB = {
        {0.2104542553, 0.7936177850, -0.0040720468},
        {1.9779984951, -2.4285922050, 0.4505937099},
        {0.0259040371, 0.7827717662, -0.8086757660}
    };

    private final double[][] matrix;

    Vision(double[][] matrix) {
        this.matrix = matrix;
    }

    /** Lightness, a and b of a colour 0xRRGGBB as seen. */
    double[] lab(int rgb) {
        double[] linear = {linear(rgb >> 16 & 0xff), linear(rgb >> 8 & 0xff), linear(rgb & 0xff)};
        double[] seen = times(matrix, linear);
        for (int i = 0; i < seen.length; i++) {
            seen[i] = Math.max(0.0, Math.min(1.0, seen[i]));
        }
        double[] cones = times(TO_CONES, seen);
        for (int i = 0; i < cones.length; i++) {
            cones[i] = Math.cbrt(cones[i]);
        }
        return times(TO_LAB, cones);
    }

    /** Distance of two colours as seen. */
    double distance(int one, int other) {
        double[] a = lab(one);
        double[] b = lab(other);
        return Math.sqrt((a[0] - b[0]) * (a[0] - b[0]) + (a[1] - b[1]) * (a[1] - b[1]) + (a[2] - b[2]) * (a[2] - b[2]));
    }

    private static double linear(int channel) {
        double c = channel / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }

    private static double[] times(double[][] matrix, double[] vector) {
        double[] product = new double[matrix.length];
        for (int row = 0; row < matrix.length; row++) {
            for (int i = 0; i < vector.length; i++) {
                product[row] += matrix[row][i] * vector[i];
            }
        }
        return product;
    }
}
