package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkPart.Element;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.Map;

/** Changes of a document that add, remove, move and split path elements. */
final class PathEdits {
    private PathEdits() {}

    static List<Change> add(Site site, int index, Kind kind) {
        return List.of(new Change.Insert(list(site), index, Map.of("type", "loss", "lossDb", 0.5)));
    }

    static List<Change> remove(Element element) {
        return List.of(new Change.Delete(list(element.site()), element.index()));
    }

    static List<Change> move(Element element, int to) {
        return List.of(new Change.Move(list(element.site()), element.index(), to));
    }

    static List<Change> split(Scenario scenario, Element span, double km) {
        return List.of();
    }

    private static String list(Site site) {
        return site.path() + ".path";
    }
}
