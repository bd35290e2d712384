package binspan.planner.report;

import binspan.prediction.Caution;
import binspan.prediction.LinkCheck;
import binspan.scenario.Detector;
import binspan.scenario.Scenario;

/** Cautions, safety and what the figures are not. */
final class VerdictNotes {
    private VerdictNotes() {}

    static void write(LinkCheck check, TextPage page) {
        cautions(check, page);
        page.heading("Before any fibre is touched");
        note(
                page,
                "Laser light in these fibres is invisible. Do not look into fibre ends or connectors; treat every"
                        + " fibre as live until it is measured dark. Local rules and licensed practice come first.");
        if (cryogenic(check.prediction().scenario())) {
            note(
                    page,
                    "Nanowire detectors are cooled with helium: cold surfaces burn, and escaping gas displaces the air"
                            + " of a room. Follow the cryostat's instructions and the site's rules.");
        }
        note(page, "All figures are an estimate, not a security proof.");
    }

    private static void cautions(LinkCheck check, TextPage page) {
        if (check.cautions().isEmpty()) {
            return;
        }
        page.heading("Cautions");
        for (Caution caution : check.cautions()) {
            page.wrapped("  - ", "    ", page.style().clean(caution.text()) + " [" + caution.code() + "]");
        }
    }

    private static void note(TextPage page, String words) {
        page.wrapped("  ", "  ", words);
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
