package binspan.planner.plot;

/**
 * The colours of heat maps: from a dark blue through greens to a pale yellow, lightness rising all the way, so that the
 * order survives without colour. The steps are of equal length in OKLab.
 */
public final class ColourScale {
    private static final int COLOURS = 256;
    private static final int FINE = 8192;
    private static final int[] RGB = table();

    private ColourScale() {}

    /** The colour 0xRRGGBB at a share of the scale, 0 to 1; shares beyond take the end. */
    public static int rgb(double share) {
        return RGB[(int) Math.round(Math.max(0.0, Math.min(1.0, share)) * (COLOURS - 1))];
    }

    /** The path through the colours; its chroma stays within what sRGB can show. */
    private static OkLab path(double t) {
        double lightness = 0.24 + 0.72 * t;
        double chroma = 0.074 + 0.14 * t * t * (1.0 - t);
        return OkLab.ofHue(lightness, chroma, 275.0 - 170.0 * t);
    }

    private static int[] table() {
        double[] along = lengths();
        int[] colours = new int[COLOURS];
        int fine = 0;
        for (int i = 0; i < COLOURS; i++) {
            double wanted = along[FINE] * i / (COLOURS - 1);
            while (fine < FINE && along[fine] < wanted) {
                fine++;
            }
            colours[i] = path((double) fine / FINE).rgb();
        }
        return colours;
    }

    private static double[] lengths() {
        double[] along = new double[FINE + 1];
        for (int i = 1; i <= FINE; i++) {
            along[i] = along[i - 1] + path((double) i / FINE).distance(path((double) (i - 1) / FINE));
        }
        return along;
    }
}
