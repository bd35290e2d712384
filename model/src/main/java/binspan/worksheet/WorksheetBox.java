package binspan.worksheet;

/**
 * Captured share of light with a flat-top spectrum: dispersion spreads it into a box, blurred by a Gaussian. Where the
 * box is far narrower than the blur, the Gaussian takes its variance in.
 */
final class WorksheetBox {
    private static final double NARROW = 1e-3;

    private WorksheetBox() {}

    /**
     * Formula of the captured share; box width and blur must stand on lines.
     *
     * @param width symbol of the full width of the box
     * @param blur symbol of the rms of the Gaussian
     * @param late how late the light is against the middle of the window, ready to stand in a formula
     */
    static String capture(WorksheetPage page, String width, String blur, String late) {
        String x = "{" + width + "}";
        String sigma = "{" + blur + "}";
        if (page.value(width) <= NARROW * page.value(blur)) {
            return WorksheetCaptures.erf("{w}", late, "sqrt(" + sigma + "^2 + " + x + "^2/12)");
        }
        String argument = late.indexOf(' ') >= 0 ? "(" + late + ")" : late;
        String ramp = sigma + "/" + x + " (I((z + " + x + "/2)/" + sigma + ") - I((z - " + x + "/2)/" + sigma + "))";
        return "G({w}/2 - " + argument + ") - G(-{w}/2 - " + argument + "), G(z) = " + ramp
                + ", I(y) = y Phi(y) + phi(y)";
    }
}
