package binspan.planner.viewmodel;

import binspan.scenario.Compensator;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;

/** The parts of a link and their names, in the order in which one walks along it. */
public final class PartName {
    private PartName() {}

    /** All parts of a scenario: what concerns the whole link first, then alice's arm and bob's, each from the source on. */
    public static List<LinkPart> all(Scenario scenario) {
        List<LinkPart> parts = new ArrayList<>(
                List.of(new LinkPart.Plan(), new LinkPart.Promise(), new LinkPart.Source(), new LinkPart.Bands()));
        for (Site site : Site.values()) {
            parts.add(new LinkPart.Coupling(site));
            for (int i = 0; i < site.arm(scenario).path().size(); i++) {
                parts.add(new LinkPart.Element(site, i));
            }
            parts.add(new LinkPart.Repair(site));
            parts.add(new LinkPart.Analyzer(site));
            for (int i = 0; i < site.arm(scenario).detectors().size(); i++) {
                parts.add(new LinkPart.Port(site, i));
            }
            parts.add(new LinkPart.Clock(site));
        }
        return List.copyOf(parts);
    }

    /** The name of a part: "alice: upper duct, fibre". */
    public static String of(Scenario scenario, LinkPart part) {
        if (part instanceof LinkPart.Element element) {
            return element(scenario, element);
        }
        if (part instanceof LinkPart.Port port) {
            return Words.of("form.part.port", port.site().path(), port.port() + 1);
        }
        String key = "form.part." + part.getClass().getSimpleName().toLowerCase(java.util.Locale.ROOT);
        return Words.of(key, site(part));
    }

    private static String site(LinkPart part) {
        if (part instanceof LinkPart.Coupling coupling) {
            return coupling.site().path();
        }
        if (part instanceof LinkPart.Repair repair) {
            return repair.site().path();
        }
        if (part instanceof LinkPart.Analyzer analyzer) {
            return analyzer.site().path();
        }
        return part instanceof LinkPart.Clock clock ? clock.site().path() : "";
    }

    private static String element(Scenario scenario, LinkPart.Element part) {
        PathElement element = part.site().arm(scenario).path().get(part.index());
        String label = element.label().orElse(Words.of("form.part.unnamed", part.index() + 1));
        return Words.of("form.part.element", part.site().path(), label, type(element));
    }

    private static String type(PathElement element) {
        if (element instanceof FibreSpan) {
            return "fibre";
        }
        if (element instanceof FilterElement) {
            return "filter";
        }
        return element instanceof Compensator ? "compensator" : "loss";
    }
}
