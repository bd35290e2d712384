package binspan.prediction;

import binspan.units.Scale;
import java.util.ArrayList;
import java.util.List;

/**
 * How tightly something must be held: the headroom of temperatures, phases, frequencies and mismatches in the units of their control.
 *
 * @param quantity what must be held
 * @param unit K, MHz, ps or rad
 * @param limit modulus of the value at which the first requirement fails
 */
public record StabilityLimit(String quantity, String unit, double limit) {
    /** The limits that the headroom contains. */
    static List<StabilityLimit> of(List<Headroom> headroom) {
        List<StabilityLimit> limits = new ArrayList<>();
        for (Headroom each : headroom) {
            String path = each.path();
            if (path.endsWith("temperatureRmsMilliK")) {
                limits.add(
                        new StabilityLimit(site(path) + " analyzer temperature rms", "K", each.limit() * Scale.MILLI));
            } else if (path.endsWith("analyzer.phaseNoiseRmsRad")) {
                limits.add(new StabilityLimit(site(path) + " analyzer phase noise rms", "rad", each.limit()));
            } else if (path.endsWith("analyzer.mismatchPs")) {
                limits.add(new StabilityLimit(site(path) + " analyzer mismatch", "ps", Math.abs(each.limit())));
            } else if (path.startsWith("source.pump")) {
                limits.add(new StabilityLimit(pump(path), each.unit(), Math.abs(each.limit())));
            } else if (path.equals("timing.cableTemperatureStepK")) {
                limits.add(new StabilityLimit("cable temperature step", "K", Math.abs(each.limit())));
            }
        }
        return limits;
    }

    private static String site(String path) {
        return path.substring(0, path.indexOf('.'));
    }

    private static String pump(String path) {
        if (path.endsWith("frequencyDriftRmsMHz")) {
            return "pump frequency drift rms";
        }
        return path.endsWith("mismatchPs") ? "pump mismatch" : "pump interferometer phase noise rms";
    }
}
