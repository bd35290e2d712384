package binspan.planner.viewmodel;

import binspan.planner.export.StudyDefaults;
import binspan.planner.export.SweepReport;
import binspan.planner.export.WindowReport;
import binspan.planner.report.MissWords;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import binspan.study.Sweep;
import binspan.study.window.OperatingIntervals;
import binspan.study.window.OperatingWindow;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

/** The figures of merit along one or two parameters, or the windows of one. */
public final class SweepModel extends StudyModel<SweepModel.Kind> {
    private final ObjectProperty<Kind> kind = new SimpleObjectProperty<>(this, "kind", Kind.SWEEP);
    private final WrittenAxis first;
    private final WrittenAxis second;
    private final ObservableList<FigureColumn> known = FXCollections.observableArrayList();
    /** Kept, so that those who listen to it are not forgotten. */
    private final ObservableList<FigureColumn> choices = FXCollections.unmodifiableObservableList(known);

    private final ObservableList<FigureColumn> shown = FXCollections.observableArrayList();

    /** What is sought. */
    public enum Kind {
        SWEEP,
        WINDOW
    }

    /** The study of a link, not run yet: along the width of the window. */
    public SweepModel(Design design, Background background) {
        super("sweep", design, background);
        Scenario scenario = design.scenario();
        first = new WrittenAxis(scenario, "timing.windowWidthPs");
        second = new WrittenAxis(scenario, scenario.pulsed() ? "source.meanPairsPerCycle" : "source.pairRatePerSecond");
        second.usedProperty().set(false);
        follow(kind);
        follow(first.parts());
        follow(second.parts());
        follow(shown);
        followDesign(() -> renew(design.scenario()));
        check();
    }

    private void renew(Scenario scenario) {
        first.renew(scenario);
        second.renew(scenario);
        check();
    }

    @Override
    Function<Execution, StudyRun.Result<Kind>> work(Scenario scenario) {
        return kind.get() == Kind.WINDOW ? window(scenario) : sweep(scenario);
    }

    private Function<Execution, StudyRun.Result<Kind>> window(Scenario scenario) {
        Axis axis = first.axis(scenario, OperatingWindow.FEWEST_SAMPLES);
        OperatingWindow window = new OperatingWindow(scenario, axis);
        return execution -> {
            OperatingIntervals found = window.run(execution);
            if (found.windows().isEmpty()) {
                throw new IllegalArgumentException(
                        MissWords.nowhere(List.of(axis), found.nearest().orElseThrow()));
            }
            return new StudyRun.Result<>(WindowReport.of(scenario, found), Kind.WINDOW);
        };
    }

    private Function<Execution, StudyRun.Result<Kind>> sweep(Scenario scenario) {
        int steps = StudyDefaults.SWEEP_STEPS.get(second.usedProperty().get() ? 1 : 0);
        List<Axis> axes = new ArrayList<>(List.of(first.axis(scenario, steps)));
        if (second.usedProperty().get()) {
            axes.add(second.axis(scenario, steps));
        }
        List<String> names = shown.stream().map(FigureColumn::name).toList();
        new Sweep(scenario, axes, List.of());
        return execution -> {
            List<FigureColumn> asked = names.isEmpty() ? List.of() : FigureColumns.named(scenario, names);
            Sweep sweep = new Sweep(scenario, axes, SweepReport.computed(scenario, asked));
            StudyTable table = sweep.run(execution);
            return new StudyRun.Result<>(SweepReport.of(sweep, table, asked), Kind.SWEEP);
        };
    }

    /** Finds in the background which figures of merit the link has. */
    public void findFigures() {
        Scenario scenario = design().scenario();
        background().workers().execute(() -> {
            List<FigureColumn> found = FigureColumns.all(scenario);
            background().window().execute(() -> know(found));
        });
    }

    private void know(List<FigureColumn> found) {
        if (!found.equals(known)) {
            known.setAll(found);
            shown.retainAll(found);
        }
    }

    /** What is sought; for the windows the first parameter counts alone. */
    public ObjectProperty<Kind> kindProperty() {
        return kind;
    }

    /** The first parameter, always used. */
    public WrittenAxis first() {
        return first;
    }

    /** The second parameter; used where its property says so. */
    public WrittenAxis second() {
        return second;
    }

    /** Figures of merit of the link, once they are found. */
    public ObservableList<FigureColumn> known() {
        return choices;
    }

    /** Figures to show; empty for the usual ones in the picture and all in the table. */
    public ObservableList<FigureColumn> shown() {
        return shown;
    }
}
