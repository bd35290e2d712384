package binspan.planner.plot;

/**
 * A colour in OKLab, where equal distances look about equally different (B. Ottosson, "A perceptual color space for
 * image processing", 2020).
 *
 * @param lightness 0 black to 1 white
 * @param a green to red
 * @param b blue to yellow
 */
public record OkLab(double lightness, double a, double b) {
    private static final double LINEAR_PART = 0.0031308;
    private static final double GAMMA = 2.4;

    /** A colour of a lightness, a chroma and a hue in degrees. */
    public static OkLab ofHue(double lightness, double chroma, double hueDegrees) {
        double hue = Math.toRadians(hueDegrees);
        return new OkLab(lightness, chroma * Math.cos(hue), chroma * Math.sin(hue));
    }

    /** How different two colours look. */
    public double distance(OkLab other) {
        double dl = lightness - other.lightness;
        double da = a - other.a;
        double db = b - other.b;
        return Math.sqrt(dl * dl + da * da + db * db);
    }

    /** The colour as 0xRRGGBB of sRGB, channels beyond it cut off. */
    public int rgb() {
        double l = cube(lightness + 0.3963377774 * a + 0.2158037573 * b);
        double m = cube(lightness - 0.1055613458 * a - 0.0638541728 * b);
        double s = cube(lightness - 0.0894841775 * a - 1.2914855480 * b);
        int red = channel(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s);
        int green = channel(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s);
        int blue = channel(-0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s);
        return red << 16 | green << 8 | blue;
    }

    private static double cube(double x) {
        return x * x * x;
    }

    private static int channel(double linear) {
        double encoded = linear <= LINEAR_PART ? 12.92 * linear : 1.055 * Math.pow(linear, 1.0 / GAMMA) - 0.055;
        return (int) Math.round(255.0 * Math.max(0.0, Math.min(1.0, encoded)));
    }
}
