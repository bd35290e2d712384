package binspan.planner.plot;

import java.awt.Color;
import java.util.List;

/**
 * The colours of a picture. Colours of the maps themselves are the same in all themes, see {@link ColourScale}.
 *
 * @param ground what lies below
 * @param ink words and lines
 * @param fill areas that mean something
 * @param series lines of series by their index, apart from each other also without red or green cones
 */
public record PlotTheme(Ground ground, Ink ink, Fill fill, List<Color> series) {
    private static final int HALO = 0xdc;
    private static final int VEIL = 0x73;
    private static final int MAP_HATCH = 0x88;

    /** Dark on white: for paper and files. */
    public static final PlotTheme LIGHT = new PlotTheme(
            new Ground(Color.WHITE, new Color(0xe6e6e6), new Color(0xf1f2f4)),
            new Ink(
                    new Color(0x1f2328),
                    new Color(0x50575e),
                    new Color(0xb4b9bf),
                    new Color(0xe2e4e7),
                    new Color(0xf0f1f3)),
            new Fill(
                    colour(0.56, 0.09, 245.0),
                    colour(0.80, 0.06, 245.0),
                    new Color(0x2f, 0x9e, 0x77, 0x38),
                    colour(0.42, 0.09, 165.0)),
            List.of(
                    colour(0.33, 0.170, 265.0),
                    colour(0.68, 0.160, 47.0),
                    colour(0.50, 0.080, 186.0),
                    colour(0.66, 0.170, 297.0),
                    colour(0.27, 0.085, 22.0),
                    colour(0.65, 0.100, 195.0),
                    colour(0.51, 0.150, 273.0),
                    colour(0.38, 0.065, 228.0)));

    /** Light on dark grey: for a dark screen. */
    public static final PlotTheme DARK = new PlotTheme(
            new Ground(new Color(0x1e2227), new Color(0x43484f), new Color(0x2b3036)),
            new Ink(
                    new Color(0xe6e8eb),
                    new Color(0xa9b0b8),
                    new Color(0x6b727a),
                    new Color(0x353a41),
                    new Color(0x292e34)),
            new Fill(
                    colour(0.64, 0.10, 245.0),
                    colour(0.50, 0.08, 245.0),
                    new Color(0x3f, 0xc8, 0x98, 0x30),
                    colour(0.80, 0.11, 165.0)),
            List.of(
                    colour(0.745, 0.130, 254.0),
                    colour(0.770, 0.160, 70.0),
                    colour(0.780, 0.115, 171.0),
                    colour(0.615, 0.200, 281.0),
                    colour(0.620, 0.190, 32.0),
                    colour(0.938, 0.080, 188.0),
                    colour(0.605, 0.050, 264.0),
                    colour(0.935, 0.185, 120.0)));

    /** Copies the colours of the series. */
    public PlotTheme {
        series = List.copyOf(series);
    }

    /**
     * What lies below.
     *
     * @param background of the page, the plots and whatever stands free on them
     * @param blank where a map has no value
     * @param range the whole of a range of which a part is allowed
     */
    public record Ground(Color background, Color blank, Color range) {}

    /**
     * Words and lines.
     *
     * @param text words, requirements, marks
     * @param soft second words, outlines, axes
     * @param hatch failing sides of requirements
     * @param grid grid lines
     * @param faintGrid grid lines of minor ticks
     */
    public record Ink(Color text, Color soft, Color hatch, Color grid, Color faintGrid) {}

    /**
     * Areas that mean something.
     *
     * @param bar bars that meet the requirements, allowed parts of ranges
     * @param histogram bars of histograms
     * @param met stretches where all requirements are met, translucent
     * @param metEdge the edges of such a stretch
     */
    public record Fill(Color bar, Color histogram, Color met, Color metEdge) {}

    /** The colour 0xRRGGBB of the series with an index from 0; they repeat. */
    public int seriesRgb(int index) {
        return seriesColour(index).getRGB() & 0xffffff;
    }

    Color seriesColour(int index) {
        return series.get(Math.floorMod(index, series.size()));
    }

    /** Behind words that stand in a plot. */
    Color halo() {
        return faded(ground.background(), HALO);
    }

    /** Over the part of a map where requirements are not met. */
    Color veil() {
        return faded(ground.background(), VEIL);
    }

    /** Hatching over that part. */
    Color mapHatch() {
        return faded(ink.text(), MAP_HATCH);
    }

    private static Color faded(Color colour, int alpha) {
        return new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), alpha);
    }

    private static Color colour(double lightness, double chroma, double hueDegrees) {
        return new Color(OkLab.ofHue(lightness, chroma, hueDegrees).rgb());
    }
}
