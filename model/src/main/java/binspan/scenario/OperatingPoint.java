package binspan.scenario;

import java.util.Optional;

/**
 * One setting out of those between which a detector of a class can be operated.
 *
 * @param meaning the setting in a few words
 * @param values planning values at this setting
 * @param gate gating at this setting; absent for a free-running detector
 */
public record OperatingPoint(String meaning, DetectorClass.Typical values, Optional<Gate> gate) {
    /** A detector of the class at this setting, without background or tail. */
    public Detector detector(DetectorClass detectorClass) {
        return new Detector(
                Optional.of(detectorClass),
                values.efficiency(),
                values.darkCountsPerSecond(),
                0.0,
                gate,
                values.jitterFwhmPs(),
                0.0,
                0.0,
                values.deadTimeNs(),
                values.afterpulseProbability());
    }
}
