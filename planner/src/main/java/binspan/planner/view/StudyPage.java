package binspan.planner.view;

import binspan.planner.export.StudyReport;
import binspan.planner.report.TextStyle;
import binspan.planner.view.StudyHandout.Desk;
import binspan.planner.viewmodel.LatestTask;
import binspan.planner.viewmodel.StudyModel;
import binspan.planner.viewmodel.StudyRun;
import binspan.planner.viewmodel.TableLines;
import binspan.planner.viewmodel.Words;
import binspan.scenario.Scenario;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.css.PseudoClass;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextArea;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/** The frame that all studies share: options, how far it has come, and the result as picture, summary or table. */
public final class StudyPage extends BorderPane {
    private static final TextStyle ON_SCREEN = new TextStyle(false, true);
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final StudyModel<?> model;
    private final StudyPicture picture;
    private final StudyTableView table;
    private final TextArea summary = new TextArea();
    private final LatestTask contents;
    private final VBox result = new VBox();

    /** What the texts of a result are made of. */
    private record Texts(String summary, TableLines lines) {}

    /**
     * A page.
     *
     * @param model the study
     * @param options controls of its options
     * @param look theme and scale
     * @param files asks where to write
     */
    StudyPage(StudyModel<?> model, Region options, Look look, FileQuestions files) {
        this.model = model;
        this.picture = new StudyPicture(model.name(), look, model.background());
        this.table = new StudyTableView(look, model.name() + "-table");
        this.contents = LatestTask.lengthy(model.background());
        getStyleClass().add("study-page");
        setId(model.name() + "-page");
        picture.setId(model.name() + "-picture");
        setTop(new VBox(
                new OptionsRoom(options, this, present()), new StudyStatus(model), problems(), failures(), stale()));
        getTop().getStyleClass().add("study-top");
        setCenter(new StackPane(empty(), result(files)));
        model.run().resultProperty().addListener((source, before, after) -> show(after));
        model.run().staleProperty().addListener((source, before, after) -> pseudoClassStateChanged(STALE, after));
        addEventHandler(KeyEvent.KEY_PRESSED, this::key);
        show(model.run().resultProperty().get());
    }

    /** Puts something below the result, which is there when the result is. */
    void below(Node node) {
        result.getChildren().add(node);
    }

    private StudyBanner problems() {
        return new StudyBanner(model.name() + "-problem", "problem", model.problemProperty());
    }

    private StudyBanner failures() {
        return new StudyBanner(model.name() + "-failure", "failure", model.run().failureProperty());
    }

    private StudyBanner stale() {
        return new StudyBanner(
                model.name() + "-stale",
                "stale",
                Bindings.when(model.run().staleProperty())
                        .then(Words.of("studies.stale"))
                        .otherwise(""));
    }

    private BooleanBinding present() {
        return model.run().resultProperty().isNotNull();
    }

    private Node empty() {
        String part = "studies." + model.name();
        Label question = new Label(Words.of(part + ".question"));
        question.getStyleClass().add("title");
        Label answer = new Label(Words.of(part + ".answer"));
        Label notes = new Label(Words.of(part + ".notes"));
        notes.getStyleClass().add("soft");
        VBox box = new VBox(question, answer, notes);
        box.getStyleClass().add("study-empty");
        box.getChildren().forEach(each -> wrapped((Label) each));
        return explained(box, question);
    }

    /** In a low window the explanation is longer than its room. */
    private ScrollPane explained(VBox box, Label question) {
        ScrollPane scroll = new ScrollPane(box);
        scroll.setId(model.name() + "-explanation");
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setAccessibleText(question.getText());
        scroll.focusTraversableProperty()
                .bind(Bindings.createBooleanBinding(
                        () -> box.getHeight() > scroll.getViewportBounds().getHeight(),
                        box.heightProperty(),
                        scroll.viewportBoundsProperty()));
        scroll.visibleProperty().bind(present().not());
        return scroll;
    }

    private static void wrapped(Label label) {
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
    }

    private Node result(FileQuestions files) {
        summary.setId(model.name() + "-summary");
        summary.setEditable(false);
        summary.getStyleClass().add("study-summary");
        summary.setAccessibleText(Words.of("studies.summary"));
        StudyViews views = new StudyViews(model.name(), picture, summary, table);
        views.add(new StudyHandout(
                        model.name(),
                        new Desk(model.design(), model.background()),
                        model.run().resultProperty().map(found -> found.report()),
                        picture::image,
                        files)
                .menus());
        result.getChildren().addAll(views.bar(), views.shown());
        result.getStyleClass().add("study-result");
        result.visibleProperty().bind(present());
        return result;
    }

    private void show(StudyRun.Result<?> found) {
        if (found == null) {
            return;
        }
        StudyReport report = found.report();
        Scenario scenario = model.design().scenario();
        picture.show(report.picture().orElse(null), Words.of("studies." + model.name() + ".question"));
        contents.run(progress -> texts(report, scenario), texts -> {
            summary.setText(texts.summary());
            table.show(texts.lines());
        });
    }

    private static Texts texts(StudyReport report, Scenario scenario) {
        return new Texts(report.summary().apply(ON_SCREEN), TableLines.of(report.table(), scenario));
    }

    private void key(KeyEvent event) {
        boolean running = model.run().stateProperty().get() == StudyRun.State.RUNNING;
        if (event.getCode() == KeyCode.ENTER && !running) {
            model.start();
            event.consume();
        } else if (event.getCode() == KeyCode.ESCAPE && running) {
            model.run().cancel();
            event.consume();
        }
    }
}
