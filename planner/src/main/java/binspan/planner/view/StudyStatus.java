package binspan.planner.view;

import binspan.planner.report.Figure;
import binspan.planner.report.ProgressLine;
import binspan.planner.viewmodel.StudyModel;
import binspan.planner.viewmodel.StudyRun;
import binspan.planner.viewmodel.StudyRun.State;
import binspan.planner.viewmodel.Words;
import javafx.animation.Animation;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.util.Duration;

/** Starts and stops a study and says how far it has come. */
final class StudyStatus extends HBox {
    private static final Duration BEAT = Duration.millis(200.0);
    private static final double PERCENT = 100.0;

    private final StudyModel<?> model;
    private final StudyRun<?> run;
    private final Timeline beats;
    private final Button button = new Button();

    StudyStatus(StudyModel<?> model) {
        this.model = model;
        this.run = model.run();
        this.beats = new Timeline(new KeyFrame(BEAT, event -> run.beat()));
        beats.setCycleCount(Animation.INDEFINITE);
        getStyleClass().add("study-status");
        setAlignment(Pos.CENTER_LEFT);
        ProgressBar bar = bar();
        getChildren().addAll(button(), bar, line());
        run.stateProperty().addListener((source, before, after) -> beat(after));
    }

    private void beat(State state) {
        if (state == State.RUNNING) {
            beats.play();
        } else {
            beats.stop();
        }
    }

    private BooleanBinding running() {
        return run.stateProperty().isEqualTo(State.RUNNING);
    }

    private Button button() {
        button.setId(model.name() + "-run");
        button.getStyleClass().add("study-run");
        button.setMinWidth(Region.USE_PREF_SIZE);
        button.textProperty()
                .bind(Bindings.when(running()).then(Words.of("studies.cancel")).otherwise(Words.of("studies.run")));
        Tooltip hint = new Tooltip();
        hint.textProperty()
                .bind(Bindings.when(running())
                        .then(Words.of("studies.cancel.hint"))
                        .otherwise(Words.of("studies.run.hint")));
        button.setTooltip(hint);
        button.disableProperty()
                .bind(model.problemProperty().isNotEmpty().and(running().not()));
        button.setOnAction(event -> turn());
        return button;
    }

    private void turn() {
        if (run.stateProperty().get() == State.RUNNING) {
            run.cancel();
        } else {
            model.start();
        }
    }

    private ProgressBar bar() {
        ProgressBar bar = new ProgressBar();
        bar.setId(model.name() + "-progress");
        bar.progressProperty().bind(run.progressProperty());
        bar.visibleProperty().bind(running());
        bar.managedProperty().bind(bar.visibleProperty());
        bar.accessibleTextProperty()
                .bind(Bindings.createStringBinding(
                        () -> Words.of("studies.progress", percent()), run.progressProperty()));
        return bar;
    }

    private String percent() {
        return Integer.toString(
                (int) Math.floor(PERCENT * run.progressProperty().get()));
    }

    private Label line() {
        Label line = new Label();
        line.setId(model.name() + "-status");
        line.getStyleClass().add("soft");
        line.textProperty()
                .bind(Bindings.createStringBinding(
                        this::words, run.stateProperty(), run.progressProperty(), run.elapsedProperty()));
        line.setMinWidth(Region.USE_PREF_SIZE);
        HBox.setHgrow(line, Priority.ALWAYS);
        return line;
    }

    private String words() {
        double seconds = run.elapsedProperty().get();
        String time = Figure.duration(seconds);
        boolean kept = run.resultProperty().get() != null;
        return switch (run.stateProperty().get()) {
            case IDLE, FAILED -> "";
            case RUNNING -> running(seconds);
            case DONE -> Words.of("studies.done", time);
            case CANCELLED -> Words.of(kept ? "studies.cancelled.kept" : "studies.cancelled", time);
        };
    }

    private String running(double seconds) {
        double share = run.progressProperty().get();
        String time = Math.round(seconds) + " s";
        return share > 0.0
                ? Words.of("studies.running.left", percent(), time, ProgressLine.left(seconds * (1.0 - share) / share))
                : Words.of("studies.running", time);
    }
}
