package binspan.planner.viewmodel;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import java.util.ArrayList;
import java.util.List;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

/** What a search may set: the usual parameters of the link, each of which can be left out, and further ones. */
public final class FreeParameters {
    private final Design design;
    private final Runnable changed;
    private final ObservableList<WrittenAxis> axes = FXCollections.observableArrayList();
    /** Kept, so that those who listen to it are not forgotten. */
    private final ObservableList<WrittenAxis> shown = FXCollections.unmodifiableObservableList(axes);

    private final List<WrittenAxis> added = new ArrayList<>();

    /**
     * The usual parameters of the link as it is now.
     *
     * @param design the link
     * @param changed is called when anything changes
     */
    FreeParameters(Design design, Runnable changed) {
        this.design = design;
        this.changed = changed;
        renew(design.scenario());
    }

    /** Follows the link. */
    void follow() {
        renew(design.scenario());
        changed.run();
    }

    private void renew(Scenario scenario) {
        List<String> wanted = usual(scenario);
        List<String> present = axes.stream()
                .filter(axis -> !added.contains(axis))
                .map(axis -> axis.pathProperty().get())
                .toList();
        if (wanted.equals(present)) {
            axes.forEach(axis -> axis.renew(scenario));
        } else {
            List<WrittenAxis> renewed = new ArrayList<>();
            wanted.forEach(path -> renewed.add(known(path, scenario)));
            renewed.addAll(added);
            axes.setAll(renewed);
        }
    }

    private WrittenAxis known(String path, Scenario scenario) {
        return axes.stream()
                .filter(axis -> axis.pathProperty().get().equals(path))
                .findFirst()
                .orElseGet(() -> listened(new WrittenAxis(scenario, path)));
    }

    private static List<String> usual(Scenario scenario) {
        try {
            return DefaultAxes.tuned(scenario).stream()
                    .map(axis -> axis.parameter().path())
                    .toList();
        } catch (IllegalArgumentException e) {
            return List.of();
        }
    }

    private WrittenAxis listened(WrittenAxis axis) {
        for (var part : axis.parts()) {
            part.addListener(source -> changed.run());
        }
        return axis;
    }

    /** Adds a parameter with its usual range, unless it is there; it is used in any case. */
    public void add(String path) {
        for (WrittenAxis axis : axes) {
            if (axis.pathProperty().get().equals(path)) {
                axis.usedProperty().set(true);
                return;
            }
        }
        WrittenAxis axis = listened(new WrittenAxis(design.scenario(), path));
        added.add(axis);
        axes.add(axis);
        changed.run();
    }

    /** All parameters, whether used or not. */
    public ObservableList<WrittenAxis> axes() {
        return shown;
    }

    /**
     * Those that are used.
     *
     * @throws IllegalArgumentException if one is written wrongly
     */
    List<Axis> used(Scenario scenario) {
        return axes.stream()
                .filter(axis -> axis.usedProperty().get())
                .map(axis -> axis.axis(scenario, 2))
                .toList();
    }
}
