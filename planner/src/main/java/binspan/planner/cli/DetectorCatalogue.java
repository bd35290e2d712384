package binspan.planner.cli;

import binspan.planner.report.DetectorClassWords;
import binspan.planner.report.FibreClassWords;
import binspan.scenario.DetectorClass;
import binspan.scenario.DetectorClass.Typical;
import binspan.scenario.Gate;
import binspan.scenario.Range;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The detector classes as a listing. */
final class DetectorCatalogue {
    private static final String NOTE = DetectorClassWords.PLANNED + " " + FibreClassWords.REPLACED;

    private DetectorCatalogue() {}

    /** The listing for a terminal. */
    static String text() {
        StringBuilder text = new StringBuilder();
        for (DetectorClass detector : DetectorClass.values()) {
            text.append(detector.text()).append('\n');
            text.append(Paragraph.of(detector.meaning(), 4));
            text.append(Paragraph.of(values(detector), 4));
            text.append(Paragraph.of("Source: " + detector.provenance(), 4)).append('\n');
        }
        return text.append(Paragraph.of(NOTE, 0)).toString();
    }

    private static String values(DetectorClass detector) {
        Typical typical = detector.typical();
        String dark = detector.gate()
                .map(DetectorClassWords::gating)
                .orElse(Range.plain(typical.darkCountsPerSecond()) + " dark counts per second");
        return "Efficiency " + Range.plain(typical.efficiency()) + ", " + dark + ", jitter "
                + Range.plain(typical.jitterFwhmPs())
                + " ps FWHM, dead time " + Range.plain(typical.deadTimeNs()) + " ns, afterpulses "
                + Range.plain(typical.afterpulseProbability()) + "; " + Range.plain(detector.shortestNm()) + " to "
                + Range.plain(detector.longestNm()) + " nm.";
    }

    /** The listing as rows of named values; what a class does not have is absent. */
    static List<Map<String, Object>> rows() {
        List<Map<String, Object>> rows = new ArrayList<>();
        for (DetectorClass detector : DetectorClass.values()) {
            rows.add(row(detector, detector.typical()));
        }
        return rows;
    }

    private static Map<String, Object> row(DetectorClass detector, Typical typical) {
        Map<String, Object> row = new LinkedHashMap<>();
        row.put("class", detector.text());
        row.put("meaning", detector.meaning());
        row.put("efficiency", typical.efficiency());
        detector.gate()
                .ifPresentOrElse(
                        gate -> row.put("gate", gateRow(gate)),
                        () -> row.put("darkCountsPerSecond", typical.darkCountsPerSecond()));
        row.put("jitterFwhmPs", typical.jitterFwhmPs());
        row.put("deadTimeNs", typical.deadTimeNs());
        row.put("afterpulseProbability", typical.afterpulseProbability());
        row.put("shortestNm", detector.shortestNm());
        row.put("longestNm", detector.longestNm());
        row.put("source", detector.provenance());
        return row;
    }

    private static Map<String, Object> gateRow(Gate gate) {
        Map<String, Object> row = new LinkedHashMap<>();
        row.put("widthNs", gate.widthNs());
        row.put("darkProbability", gate.darkProbability());
        return row;
    }
}
