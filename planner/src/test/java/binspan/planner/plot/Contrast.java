package binspan.planner.plot;

import java.awt.Color;

/** Contrast ratio of two colours by the definitions of W3C, Web Content Accessibility Guidelines 2.1, "relative luminance" and "contrast ratio". */
final class Contrast {
    private static final double FLARE = 0.05;

    private Contrast() {}

    static double of(Color one, Color other) {
        double a = luminance(one);
        double b = luminance(other);
        return (Math.max(a, b) + FLARE) / (Math.min(a, b) + FLARE);
    }

    private static double luminance(Color colour) {
        return 0.2126 * linear(colour.getRed())
                + 0.7152 * linear(colour.getGreen())
                + 0.0722 * linear(colour.getBlue());
    }

    private static double linear(int channel) {
        double c = channel / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }

    /** A translucent colour laid over an opaque one. */
    static Color over(Color upper, Color lower) {
        double share = upper.getAlpha() / 255.0;
        return new Color(
                mixed(upper.getRed(), lower.getRed(), share),
                mixed(upper.getGreen(), lower.getGreen(), share),
                mixed(upper.getBlue(), lower.getBlue(), share));
    }

    private static int mixed(int upper, int lower, double share) {
        return (int) Math.round(share * upper + (1.0 - share) * lower);
    }
}
