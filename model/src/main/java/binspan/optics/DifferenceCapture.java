package binspan.optics;

/** Probability that the time difference t_A - t_B of a continuous-pump pair falls into a window. */
public final class DifferenceCapture {
    private DifferenceCapture() {}

    /**
     * Captured share of the pairs.
     *
     * @param spectrum joint spectrum of a continuous pump
     * @param betaSum beta_A + beta_B, s^2
     * @param a alice's port
     * @param b bob's port
     * @param window its start and end about the mean difference, s
     */
    public static double of(PairSpectrum spectrum, double betaSum, PortTiming a, PortTiming b, Window window) {
        Passband both = spectrum.mirrored();
        double near = ArrivalTime.nearFieldDifference(spectrum) + a.variance() + b.variance();
        if (both.gaussian()) {
            return difference(window, Math.sqrt(near + betaSum * betaSum * both.variance()), a, b);
        }
        double sigma = Math.sqrt(near);
        if (both.flat() && !a.tailed() && !b.tailed()) {
            return WindowCapture.box(window.from(), window.to(), 2.0 * both.halfWidth() * Math.abs(betaSum), sigma);
        }
        DetuningNodes.View view = new DetuningNodes.View(window, sigma, a.tailTime(), b.tailTime());
        DetuningNodes nodes = DetuningNodes.of(both, betaSum, view);
        double captured = 0.0;
        for (int i = 0; i < nodes.count(); i++) {
            captured += nodes.weight[i] * difference(window.shifted(-betaSum * nodes.detuning[i]), sigma, a, b);
        }
        return captured / both.area();
    }

    /** Difference of two clicks that may each have a tail: alice's tail makes it later, bob's earlier. */
    private static double difference(Window window, double sigma, PortTiming a, PortTiming b) {
        double core = WindowCapture.gaussian(window.from(), window.to(), sigma);
        if (!a.tailed() && !b.tailed()) {
            return core;
        }
        double late = WindowCapture.tailed(window.from(), window.to(), sigma, a.tailTime());
        double early = WindowCapture.tailed(-window.to(), -window.from(), sigma, b.tailTime());
        double p = a.tailFraction();
        double q = b.tailFraction();
        double times = a.tailTime() + b.tailTime();
        double bothTails = (a.tailTime() * late + b.tailTime() * early) / times;
        return (1.0 - p) * (1.0 - q) * core + p * (1.0 - q) * late + (1.0 - p) * q * early + p * q * bothTails;
    }
}
