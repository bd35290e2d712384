package binspan.counting;

import binspan.scenario.Detector;
import binspan.scenario.Gate;
import binspan.units.Scale;

/**
 * What one detector records in all and how much of the time it is ready.
 *
 * <p>R_raw = photons + dark + background; recorded R = R_raw (1 + p_after) live with live = 1/(1 + R_raw (1 + p_after) dead time), the dead time not
 * extended by further photons. A gated detector meets its light and noise inside the gates only.
 *
 * @param photonsPerSecond detected photons of the source, before dead time, 1/s
 * @param darkPerSecond dark counts, 1/s
 * @param backgroundPerSecond counts from stray and classical light, 1/s
 * @param recordedPerSecond recorded counts, 1/s
 * @param liveFraction share of the time in which it is ready
 * @param noiseDensity noise clicks (dark, background, afterpulses) per second of open gate, 1/s
 * @param gateShare share of the slots that have a gate
 * @param deadTime dead time, s
 */
public record DetectorLoad(
        double photonsPerSecond,
        double darkPerSecond,
        double backgroundPerSecond,
        double recordedPerSecond,
        double liveFraction,
        double noiseDensity,
        double gateShare,
        double deadTime) {

    /**
     * The load of a detector.
     *
     * @param detector the detector
     * @param photonsPerSecond photons that it would detect were it always ready, 1/s
     * @param strayPerSecond counts from classical light in the fibre, while it is sensitive, 1/s
     * @param slotsPerSecond slots per second; infinite for a continuous pump
     */
    public static DetectorLoad of(
            Detector detector, double photonsPerSecond, double strayPerSecond, double slotsPerSecond) {
        double light = detector.backgroundCountsPerSecond() + strayPerSecond;
        if (detector.gate().isEmpty()) {
            return of(detector, photonsPerSecond, new Noise(detector.darkCountsPerSecond(), light, 1.0, 1.0));
        }
        Gate gate = detector.gate().get();
        double gates = gate.rateMHz().isPresent() ? gate.rateMHz().getAsDouble() * Scale.MEGA : slotsPerSecond;
        double duty = Math.min(1.0, gates * gate.widthNs() * Scale.NANO);
        double share = Math.min(1.0, gates / slotsPerSecond);
        Noise noise =
                new Noise(gate.darkProbability() / (gate.widthNs() * Scale.NANO) * duty, light * duty, duty, share);
        return of(detector, photonsPerSecond * share, noise);
    }

    /** The same detector with light of the source only: no dark counts, background or afterpulses. */
    public static DetectorLoad noiseless(Detector detector, DetectorLoad loaded) {
        double deadTime = detector.deadTimeNs() * Scale.NANO;
        double live = 1.0 / (1.0 + loaded.photonsPerSecond() * deadTime);
        double photons = loaded.photonsPerSecond();
        return new DetectorLoad(photons, 0.0, 0.0, photons * live, live, 0.0, loaded.gateShare(), deadTime);
    }

    private record Noise(double darkPerSecond, double backgroundPerSecond, double duty, double gateShare) {}

    private static DetectorLoad of(Detector detector, double photons, Noise noise) {
        double deadTime = detector.deadTimeNs() * Scale.NANO;
        double raw = photons + noise.darkPerSecond() + noise.backgroundPerSecond();
        double clicks = raw * (1.0 + detector.afterpulseProbability());
        double live = 1.0 / (1.0 + clicks * deadTime);
        double afterpulses = detector.afterpulseProbability() * raw * live;
        double density = (noise.darkPerSecond() + noise.backgroundPerSecond() + afterpulses) / noise.duty();
        return new DetectorLoad(
                photons,
                noise.darkPerSecond(),
                noise.backgroundPerSecond(),
                clicks * live,
                live,
                density,
                noise.gateShare(),
                deadTime);
    }

    /** Mean noise clicks d in a window of the given width, s; a window wider than the gate is closed outside it. */
    public double noiseClicks(double window, Detector detector) {
        double open = detector.gate().isPresent()
                ? Math.min(window, detector.gate().get().widthNs() * Scale.NANO)
                : window;
        return noiseDensity * open;
    }

    /**
     * Share of the time in which two detectors are both ready: pairs that reach both deaden them together, so it is more than the product.
     *
     * @param a one detector
     * @param b the other
     * @param commonPerSecond pairs that reach both, in any slots, 1/s
     */
    public static double jointLive(DetectorLoad a, DetectorLoad b, double commonPerSecond) {
        double both = a.liveFraction * b.liveFraction;
        double correlated = both * (1.0 + commonPerSecond * Math.min(a.deadTime, b.deadTime) * Math.sqrt(both));
        return Math.min(correlated, Math.min(a.liveFraction, b.liveFraction));
    }
}
