package binspan.counting;

/**
 * One port's clicks in one window, whatever the other side does.
 *
 * @param click probability of a click
 * @param noClick probability of none
 * @param spread 1 + n/K for detected photons n
 */
record WindowClicks(double click, double noClick, double spread) {
    /**
     * Clicks of a window.
     *
     * @param photons detected photons n
     * @param noise noise clicks d
     * @param modes Schmidt number K
     */
    static WindowClicks of(double photons, double noise, double modes) {
        double click = ClickStatistics.click(photons, noise, modes);
        return new WindowClicks(click, 1.0 - click, 1.0 + photons / modes);
    }
}
