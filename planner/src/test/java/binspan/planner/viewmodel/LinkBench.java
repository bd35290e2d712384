package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.document.RefusedEditException;
import binspan.planner.document.ScenarioDocument;
import binspan.planner.io.InvalidScenarioException;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
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
    private final List<Scenario> seen = new ArrayList<>();

    /** The bench of a shipped link. */
    public LinkBench(String name) {
        this(shipped(name));
    }

    /** The bench of a document. */
    public LinkBench(ScenarioDocument document) {
        design = new Design(document.scenario());
        design.scenarioProperty().addListener((property, before, now) -> seen.add(now));
        model = new LinkModel(design, Background.NONE, new Desk(document)::edit);
    }

    /** A shipped document. */
    public static ScenarioDocument shipped(String name) {
        try {
            return ScenarioDocument.of(Files.readString(Path.of("..", "scenarios", name + ".json")), name);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
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

    /** The scenarios in the order in which they were shown. */
    public List<Scenario> seen() {
        return seen;
    }

    /** Labels of an arm's path, from the source on. */
    public List<String> labels(Site site) {
        return site.arm(design.scenario()).path().stream()
                .map(PathElement::label)
                .map(label -> label.orElse(""))
                .toList();
    }

    private final class Desk {
        private ScenarioDocument document;

        Desk(ScenarioDocument document) {
            this.document = document;
        }

        boolean edit(String what, List<Change> changes) {
            try {
                document = document.with(changes);
            } catch (RefusedEditException e) {
                design.notice(e.getMessage());
                return false;
            }
            done.add(what);
            return design.change(what, null, before -> document.scenario());
        }
    }
}
