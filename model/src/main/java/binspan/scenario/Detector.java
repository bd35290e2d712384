package binspan.scenario;

import java.util.Optional;

/**
 * A single-photon detector at one output port.
 *
 * @param detectorClass catalogue class whose values stand where the file gives none
 * @param efficiency detection efficiency
 * @param darkCountsPerSecond recorded dark counts of a free-running detector, 1/s; 0 for a gated one
 * @param backgroundCountsPerSecond recorded counts from stray light, while it is sensitive, 1/s
 * @param gate gating, absent for a free-running detector
 * @param jitterFwhmPs timing jitter with its electronics, ps FWHM
 * @param jitterTailFraction share of the clicks with an exponential tail
 * @param jitterTailPs time constant of that tail, ps
 * @param deadTimeNs dead time after a click, not extended by further photons, ns
 * @param afterpulseProbability afterpulses per click
 */
public record Detector(
        Optional<DetectorClass> detectorClass,
        double efficiency,
        double darkCountsPerSecond,
        double backgroundCountsPerSecond,
        Optional<Gate> gate,
        double jitterFwhmPs,
        double jitterTailFraction,
        double jitterTailPs,
        double deadTimeNs,
        double afterpulseProbability) {}
