package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.document.ScenarioDocument;
import binspan.scenario.PathElement;
import java.util.ArrayList;
import java.util.List;

/** A shipped link in a document, with the models that draw it: every edit goes through the text of the file. */
public final class LinkBench {
    /** Names of the links that come with the program. */
    public static final List<String> SHIPPED = List.of(
            "kestrel-dam-to-millbrook",
            "stonebridge-to-lower-weir",
            "eagle-tarn-to-saltmarsh",
            "orchard-lane-access",
            "fernhill-shared-trunk",
            "harrow-ridge-overhead-line");

    private final Design design;
    private final LinkModel model;
    private final List<String> done = new ArrayList<>();

    /** The bench of a shipped link. */
    public LinkBench(String name) {
        this(shipped(name));
    }

    /** The bench of a document. */
    public LinkBench(ScenarioDocument document) {
        design = new Design(document);
        model = new LinkModel(design, Background.NONE, this::edit);
    }

    /** A shipped document. */
    public static ScenarioDocument shipped(String name) {
        return Designs.shipped(name);
    }

    /** The shared design. */
    public Design design() {
        return design;
    }

    /** The drawn link. */
    public LinkModel model() {
        return model;
    }

    /** The edits in words. */
    public List<String> done() {
        return done;
    }

    /** Labels of an arm's path, from the source on. */
    public List<String> labels(Site site) {
        return site.arm(design.scenario()).path().stream()
                .map(PathElement::label)
                .map(label -> label.orElse(""))
                .toList();
    }

    private boolean edit(String what, List<Change> changes) {
        boolean edited = design.edit(what, changes);
        if (edited) {
            done.add(what);
        }
        return edited;
    }
}
