package binspan.planner.viewmodel;

import binspan.scenario.FibreSpan;
import binspan.scenario.LinkLength;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.List;

/** Finds the part of the link that holds a number. */
public final class PartOfPath {
    private static final String ELEMENTS = "path";

    private PartOfPath() {}

    /**
     * The part of the link whose form shows a path; the plan for what belongs to no other.
     *
     * @param scenario the link
     * @param path scenario path; one for both sides leads to alice's, the length of the link to its first fibre
     */
    public static LinkPart find(Scenario scenario, String path) {
        if (path.equals(LinkLength.PATH)) {
            return firstFibre(scenario);
        }
        int dot = path.indexOf('.');
        String rest = path.substring(dot + 1);
        return switch (dot < 0 ? path : path.substring(0, dot)) {
            case "source" ->
                rest.startsWith("signal.") || rest.startsWith("idler.") ? new LinkPart.Bands() : new LinkPart.Source();
            case "require" -> new LinkPart.Promise();
            case "alice", "both" -> ofArm(scenario, Site.ALICE, rest);
            case "bob" -> ofArm(scenario, Site.BOB, rest);
            default -> new LinkPart.Plan();
        };
    }

    private static LinkPart firstFibre(Scenario scenario) {
        for (Site site : Site.values()) {
            List<PathElement> elements = site.arm(scenario).path();
            for (int i = 0; i < elements.size(); i++) {
                if (elements.get(i) instanceof FibreSpan) {
                    return new LinkPart.Element(site, i);
                }
            }
        }
        return new LinkPart.Plan();
    }

    private static LinkPart ofArm(Scenario scenario, Site site, String rest) {
        String field = rest.split("[.\\[]", 2)[0];
        return switch (field) {
            case "photon", "sourceCouplingLossDb" -> new LinkPart.Coupling(site);
            case ELEMENTS -> element(scenario, site, rest.substring(ELEMENTS.length()));
            case "repairMarginDb" -> new LinkPart.Repair(site);
            case "analyzer" -> new LinkPart.Analyzer(site);
            case "detectors" -> new LinkPart.Port(site, Math.max(0, index(rest.substring(field.length()))));
            case "clockJitterRmsPs", "tagBinPs", "delayErrorPs" -> new LinkPart.Clock(site);
            default -> new LinkPart.Plan();
        };
    }

    private static LinkPart element(Scenario scenario, Site site, String tail) {
        List<PathElement> elements = site.arm(scenario).path();
        int found = index(tail);
        int longest = 0;
        for (int i = 0; i < elements.size(); i++) {
            String label = elements.get(i).label().orElse("");
            if (label.length() > longest && (tail + ".").startsWith("." + label + ".")) {
                found = i;
                longest = label.length();
            }
        }
        return found >= 0 && found < elements.size() ? new LinkPart.Element(site, found) : new LinkPart.Plan();
    }

    /** The number in the brackets at the start, -1 without any. */
    private static int index(String tail) {
        return tail.matches("\\[\\d{1,6}].*") ? Integer.parseInt(tail.substring(1, tail.indexOf(']'))) : -1;
    }
}
