package binspan.optics;

import binspan.scenario.Arm;
import binspan.scenario.Detector;
import binspan.units.GaussianWidth;
import binspan.units.Scale;
import java.util.List;

/**
 * How sharply one output port's click tells when the photon arrived; the light's own spread is not included.
 *
 * @param variance Gaussian part: detector jitter, site clock, tag bin, polarization mode dispersion, s^2
 * @param tailFraction share of the clicks with an exponential tail
 * @param tailTime time constant of that tail, s
 */
public record PortTiming(double variance, double tailFraction, double tailTime) {
    /**
     * The ports of an arm.
     *
     * @param arm the arm
     * @param pmdRms rms delay spread by polarization mode dispersion, s
     */
    public static List<PortTiming> of(Arm arm, double pmdRms) {
        double clock = arm.clockJitterRmsPs() * Scale.PICO;
        double bin = arm.tagBinPs() * Scale.PICO;
        double site = clock * clock + bin * bin / 12.0 + pmdRms * pmdRms;
        List<Detector> detectors = arm.detectors();
        return detectors.size() == 1
                ? List.of(of(detectors.get(0), site))
                : List.of(of(detectors.get(0), site), of(detectors.get(1), site));
    }

    private static PortTiming of(Detector detector, double site) {
        double jitter = GaussianWidth.rms(detector.jitterFwhmPs()) * Scale.PICO;
        boolean tailed = detector.jitterTailFraction() > 0.0 && detector.jitterTailPs() > 0.0;
        return new PortTiming(
                jitter * jitter + site,
                tailed ? detector.jitterTailFraction() : 0.0,
                tailed ? detector.jitterTailPs() * Scale.PICO : 0.0);
    }

    /** Whether another port tells the time exactly as well. */
    public boolean same(PortTiming other) {
        return variance == other.variance && tailFraction == other.tailFraction && tailTime == other.tailTime;
    }

    /** Whether all ports of one list tell the time exactly as well as those of another. */
    static boolean same(List<PortTiming> ports, List<PortTiming> others) {
        boolean same = ports.size() == others.size();
        for (int i = 0; same && i < ports.size(); i++) {
            same = ports.get(i).same(others.get(i));
        }
        return same;
    }

    /** Whether clicks have an exponential tail. */
    public boolean tailed() {
        return tailFraction > 0.0;
    }

    /**
     * Probability that a click falls into a window.
     *
     * @param from start of the window about the photon's mean arrival, s
     * @param to its end, s
     * @param sigma rms of the Gaussian part together with whatever else spreads it, s
     */
    double capture(double from, double to, double sigma) {
        double core = WindowCapture.gaussian(from, to, sigma);
        return tailed() ? core + tailFraction * (WindowCapture.tailed(from, to, sigma, tailTime) - core) : core;
    }
}
