package binspan.planner.view;

import binspan.planner.document.Recovery;
import binspan.planner.document.Settings;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.PlannerModel;
import binspan.planner.viewmodel.Words;
import java.nio.file.Path;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.time.format.FormatStyle;
import java.util.Locale;
import java.util.Optional;
import javafx.application.Platform;
import javafx.scene.Scene;
import javafx.scene.control.Alert.AlertType;
import javafx.scene.layout.Region;
import javafx.stage.Stage;
import javafx.stage.WindowEvent;

/** One run of the window: begins as the last one ended, offers what a crash has left, and ends without losing anything. */
final class Session {
    private static final DateTimeFormatter TIME =
            DateTimeFormatter.ofLocalizedDateTime(FormatStyle.MEDIUM).withLocale(Locale.ROOT);
    private static final double NARROWEST = 1000.0;
    private static final double LOWEST = 660.0;

    private final Stage stage;
    private final Places places;
    private final Settings settings;
    private final Look look = new Look();
    private final PlannerModel model;
    private final Notices notices;
    private final FileQuestions files;
    private final Filing filing;
    private final MainWindow window;

    /**
     * Where the session keeps what outlives it.
     *
     * @param settings directory of settings and recent files
     * @param recovery directory of copies of unsaved work
     */
    record Places(Path settings, Path recovery) {
        /** The usual directories of the user. */
        static Places usual() {
            return new Places(Settings.defaultDirectory(), Recovery.defaultDirectory());
        }
    }

    Session(Stage stage, Places places) {
        this(stage, places, Background.of(Platform::runLater), null);
    }

    /**
     * A session.
     *
     * @param stage its window, not yet shown
     * @param places where it keeps what outlives it
     * @param background where long work is done
     * @param answers answers questions for files; null for the system's dialogs
     */
    Session(Stage stage, Places places, Background background, FileQuestions answers) {
        this.stage = stage;
        this.places = places;
        settings = Settings.read(places.settings());
        look.themeProperty().set(Theme.of(settings.theme()));
        look.scalePercentProperty().set(nearestScale(settings.scalePercent()));
        model = new PlannerModel(background, places.settings(), places.recovery());
        notices = new Notices(stage, look);
        files = answers != null
                ? answers
                : new FileQuestions(stage, settings.lastDirectory().orElse(null));
        filing = new Filing(model.design(), model.file(), files, notices, model.form()::refused);
        window = new MainWindow(model, WindowParts.of(model, look, files, this::showRoom), look);
        window.menus(menus().bar(this::close));
        window.followPage(this::watch);
    }

    /** Only what is shown follows each step of a drag. */
    private void watch(String page) {
        PlannerModel.Studies studies = model.studies();
        model.slots().watchedProperty().set(page.equals("slots"));
        model.map().watchedProperty().set(page.equals("map"));
        studies.reach().watchedProperty().set(page.equals("reach"));
        studies.detectors().watchedProperty().set(page.equals("detectors"));
        studies.tolerance().watchedProperty().set(page.equals("tolerance"));
        studies.sweep().watchedProperty().set(page.equals("sweep"));
        studies.tune().watchedProperty().set(page.equals("tune"));
    }

    private WindowMenus menus() {
        Exports exports = new Exports(
                model,
                files,
                model.checks(),
                new Exports.Regions(
                        () -> (Region) window.root(), () -> window.shown().content(), window::link));
        return new WindowMenus(model, look, filing, exports, window, new Help(notices, model.design()));
    }

    private void showRoom() {
        window.show("room");
    }

    /** Closes the window as its own button does. */
    private void close() {
        stage.fireEvent(new WindowEvent(stage, WindowEvent.WINDOW_CLOSE_REQUEST));
    }

    private static int nearestScale(int percent) {
        return Look.SCALES.stream()
                .min((a, b) -> Integer.compare(Math.abs(a - percent), Math.abs(b - percent)))
                .orElseThrow();
    }

    /**
     * Shows the window.
     *
     * @param file scenario to open, null for a starter
     * @param theme its name, null for the last one
     * @param scale per cent, null for the last one
     */
    void show(String file, String theme, Integer scale) {
        if (theme != null) {
            look.themeProperty().set(Theme.of(theme));
        }
        if (scale != null) {
            look.scalePercentProperty().set(nearestScale(scale));
        }
        Scene scene = new Scene(window.root(), settings.windowWidth(), settings.windowHeight());
        look.dress(scene);
        stage.setScene(scene);
        stage.setMinWidth(NARROWEST);
        stage.setMinHeight(LOWEST);
        stage.titleProperty().bind(model.file().titleProperty());
        stage.setOnCloseRequest(event -> {
            if (!filing.mayLeave()) {
                event.consume();
            }
        });
        Optional<InvalidScenarioException> refused = file == null ? Optional.empty() : filing.opened(Path.of(file));
        stage.show();
        window.begin();
        refused.ifPresent(errors -> filing.refuse(Path.of(file), errors));
        if (file == null) {
            model.design().notice(Words.of("dialog.new"));
        }
        offerLeftWork();
    }

    private void offerLeftWork() {
        for (Recovery.Found found : Recovery.left(places.recovery())) {
            String name =
                    found.original().map(path -> path.getFileName().toString()).orElse(Words.of("window.untitled"));
            String time = TIME.withZone(ZoneId.systemDefault()).format(found.written());
            switch (notices.leftWork(name, time)) {
                case TAKE -> {
                    take(found);
                    return;
                }
                case DISCARD -> found.discard();
                case LATER -> {
                    return;
                }
            }
        }
    }

    private void take(Recovery.Found found) {
        try {
            model.file().recover(found);
        } catch (InvalidScenarioException e) {
            notices.lines(
                    AlertType.ERROR, Words.of("dialog.recover.title"), Words.of("file.recover.refused"), e.lines());
        }
    }

    /** Remembers settings and removes the copy of unsaved work: the window was closed in order. */
    void closed() {
        model.file().closed();
        Settings last = settings.withTheme(look.themeProperty().get().text())
                .withScalePercent(look.scalePercentProperty().get());
        if (stage.getScene() != null) {
            last = last.withWindow(
                    (int) stage.getScene().getWidth(), (int) stage.getScene().getHeight());
        }
        if (files.directory() != null) {
            last = last.withLastDirectory(files.directory());
        }
        try {
            last.write(places.settings());
        } catch (OutputFileException e) {
            // Nothing but the look of the next window is lost, and nobody is there to read about it.
            model.design().notice(e.getMessage());
        }
    }

    PlannerModel model() {
        return model;
    }

    MainWindow window() {
        return window;
    }

    Look look() {
        return look;
    }
}
