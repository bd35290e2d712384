package binspan.worksheet;

import binspan.scenario.Detector;
import binspan.scenario.DetectorClass;

/** Tells which values of a detector are those of its catalogue class. */
final class WorksheetClassValue {
    private WorksheetClassValue() {}

    /** Source of a detector's field where the scenario notes none: the class whose value it has, or the scenario. */
    static String source(Detector detector, String field) {
        if (detector.detectorClass().isEmpty()) {
            return WorksheetOrigin.SCENARIO;
        }
        DetectorClass known = detector.detectorClass().get();
        return same(detector, known, field)
                ? "of the class " + known.text() + ", common practice"
                : WorksheetOrigin.SCENARIO;
    }

    private static boolean same(Detector detector, DetectorClass known, String field) {
        DetectorClass.Typical typical = known.typical();
        return switch (field) {
            case "efficiency" -> detector.efficiency() == typical.efficiency();
            case "darkCountsPerSecond" -> detector.darkCountsPerSecond() == typical.darkCountsPerSecond();
            case "jitterFwhmPs" -> detector.jitterFwhmPs() == typical.jitterFwhmPs();
            case "deadTimeNs" -> detector.deadTimeNs() == typical.deadTimeNs();
            case "afterpulseProbability" -> detector.afterpulseProbability() == typical.afterpulseProbability();
            case "gate.rateMHz", "gate.widthNs", "gate.darkProbability" ->
                detector.gate().equals(known.gate());
            default -> false;
        };
    }
}
