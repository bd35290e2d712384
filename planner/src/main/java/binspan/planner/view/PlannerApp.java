package binspan.planner.view;

import java.util.List;
import java.util.Map;
import java.util.logging.Level;
import java.util.logging.Logger;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.stage.Stage;

/** The window as an application of the desktop. */
public final class PlannerApp extends Application {
    /** Kept, so that its level stays: it would complain about JavaFX on the class path. */
    private static final Logger JAVAFX_LOG = Logger.getLogger("javafx");

    private Session session;

    /** Made by the toolkit. */
    public PlannerApp() {}

    /**
     * Opens the window and returns when it is closed.
     *
     * @param words a scenario file if any, {@code --theme=light} or {@code dark}, {@code --scale=PERCENT}
     */
    public static void open(List<String> words) {
        JAVAFX_LOG.setLevel(Level.SEVERE);
        // Pictures are drawn in memory; on some systems two owners of the screen would block each other.
        System.setProperty("java.awt.headless", "true");
        launch(PlannerApp.class, words.toArray(String[]::new));
    }

    @Override
    public void start(Stage stage) {
        Map<String, String> named = getParameters().getNamed();
        List<String> files = getParameters().getUnnamed();
        session = new Session(stage, Session.Places.usual());
        session.show(
                files.isEmpty() ? null : files.get(0),
                named.get("theme"),
                named.containsKey("scale") ? Integer.valueOf(named.get("scale")) : null);
    }

    @Override
    public void stop() {
        if (session != null) {
            session.closed();
        }
        Platform.exit();
    }
}
