package binspan.planner.report;

import binspan.prediction.Caution;
import binspan.prediction.LinkCheck;
import binspan.scenario.Detector;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;

/** Cautions, safety and what the figures are not. */
public final class VerdictNotes {
    /** Title of the cautions. */
    public static final String CAUTIONS = "Cautions";

    /** Title of the safety notes. */
    public static final String SAFETY = "Before any fibre is touched";

    private VerdictNotes() {}

    static void write(LinkCheck check, TextPage page) {
        cautions(check, page);
        page.heading(SAFETY);
        safety(check.prediction().scenario()).forEach(words -> page.wrapped("  ", "  ", words));
    }

    /** What must be known before any fibre is touched, and what the figures are not. */
    public static List<String> safety(Scenario scenario) {
        List<String> notes = new ArrayList<>();
        notes.add("Laser light in these fibres is invisible. Do not look into fibre ends or connectors; treat every"
                + " fibre as live until it is measured dark. Local rules and licensed practice come first.");
        if (cryogenic(scenario)) {
            notes.add(
                    "Nanowire detectors are cooled with helium: cold surfaces burn, and escaping gas displaces the air"
                            + " of a room. Follow the cryostat's instructions and the site's rules.");
        }
        notes.add("All figures are an estimate, not a security proof.");
        return List.copyOf(notes);
    }

    private static void cautions(LinkCheck check, TextPage page) {
        if (check.cautions().isEmpty()) {
            return;
        }
        page.heading(CAUTIONS);
        for (Caution caution : check.cautions()) {
            page.wrapped("  - ", "    ", page.style().clean(caution.text()) + " [" + caution.code() + "]");
        }
    }

    private static boolean cryogenic(Scenario scenario) {
        return cryogenic(scenario.alice().detectors())
                || cryogenic(scenario.bob().detectors());
    }

    private static boolean cryogenic(Iterable<Detector> detectors) {
        for (Detector detector : detectors) {
            if (detector.detectorClass().isPresent()
                    && detector.detectorClass().get().cryogenic()) {
                return true;
            }
        }
        return false;
    }
}
