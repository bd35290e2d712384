package binspan.planner.view;

import binspan.planner.viewmodel.PlannerModel.Studies;
import binspan.planner.viewmodel.StudyModel;
import binspan.planner.viewmodel.StudyRun;
import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.function.Supplier;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.geometry.Rectangle2D;
import javafx.scene.image.WritableImage;
import javafx.scene.robot.Robot;
import javafx.stage.Stage;
import javax.imageio.ImageIO;

/**
 * Opens the real window on a display, goes through all pages of two links in both themes at 100 and 200 % and takes a
 * picture of the screen each time. Run by {@code planner/pictures}.
 */
public final class PictureTour {
    private static final List<String> LINKS = List.of("kestrel-dam-to-millbrook", "stonebridge-to-lower-weir");
    private static final double WIDTH = 1280.0;
    private static final double HEIGHT = 800.0;
    private static final int PERCENT = 100;
    private static final long PATIENCE_SECONDS = 120;

    private PictureTour() {}

    /** One argument: the directory for the pictures, then if wanted the names of the pages. */
    public static void main(String[] args) {
        Application.launch(Tour.class, args);
    }

    private static String name(String link, String page, Theme theme, int scale) {
        return link.substring(0, link.indexOf('-')) + "-" + page + "-" + theme.text() + "-" + scale + ".png";
    }

    private static void opened(Session session, String link) {
        Shown.onWindowThread(() -> {
            try {
                session.model().file().open(Path.of("../scenarios/" + link + ".json"));
            } catch (binspan.planner.io.InvalidScenarioException e) {
                throw new IllegalStateException(e);
            }
            return link;
        });
        Studies studies = session.model().studies();
        for (StudyModel<?> study :
                List.of(studies.reach(), studies.detectors(), studies.tolerance(), studies.sweep(), studies.tune())) {
            Shown.onWindowThread(() -> {
                study.start();
                return study;
            });
            until(() -> study.run().stateProperty().get() != StudyRun.State.RUNNING);
        }
    }

    private static void looked(Session session, Stage stage, Theme theme, int scale) {
        Shown.onWindowThread(() -> {
            session.look().themeProperty().set(theme);
            session.look().scalePercentProperty().set(scale);
            stage.setX(0.0);
            stage.setY(0.0);
            stage.setWidth(WIDTH * scale / PERCENT);
            stage.setHeight(HEIGHT * scale / PERCENT);
            return scale;
        });
    }

    private static void pictured(Session session, Stage stage, String page, File file) {
        Shown.onWindowThread(() -> {
            session.window().show(page);
            return page;
        });
        // Long enough for the exact map, which waits until nothing moves.
        pause(page.equals("map") ? 3500 : 1500);
        WritableImage image = Shown.onWindowThread(() -> new Robot()
                .getScreenCapture(
                        null, new Rectangle2D(stage.getX(), stage.getY(), stage.getWidth(), stage.getHeight())));
        try {
            ImageIO.write(FxImages.of(image), "png", file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static void until(Supplier<Boolean> done) {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
        while (!Shown.onWindowThread(done) && System.nanoTime() < end) {
            pause(100);
        }
    }

    private static void pause(long millis) {
        try {
            Thread.sleep(millis);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    /** The tour as an application of the desktop. */
    public static final class Tour extends Application {
        /** Made by the toolkit. */
        public Tour() {}

        @Override
        public void start(Stage stage) throws IOException {
            Path places = Files.createTempDirectory("pictures");
            Session session = new Session(stage, new Session.Places(places, places));
            session.show("../scenarios/" + LINKS.get(0) + ".json", "light", PERCENT);
            Thread tour = new Thread(() -> tour(session, stage), "tour");
            tour.setDaemon(true);
            tour.start();
        }

        private void tour(Session session, Stage stage) {
            List<String> arguments = getParameters().getRaw();
            List<String> pages = arguments.size() > 1
                    ? arguments.subList(1, arguments.size())
                    : Shown.onWindowThread(session.window()::keys);
            try {
                for (String link : LINKS) {
                    opened(session, link);
                    for (int scale : List.of(PERCENT, 2 * PERCENT)) {
                        for (Theme theme : Theme.values()) {
                            looked(session, stage, theme, scale);
                            for (String page : pages) {
                                pictured(
                                        session,
                                        stage,
                                        page,
                                        new File(arguments.get(0), name(link, page, theme, scale)));
                            }
                        }
                    }
                }
            } finally {
                Platform.exit();
            }
        }
    }
}
