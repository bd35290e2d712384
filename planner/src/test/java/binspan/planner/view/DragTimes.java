package binspan.planner.view;

import binspan.planner.viewmodel.PlannerModel;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.function.DoubleConsumer;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.beans.value.ObservableValue;
import javafx.stage.Stage;

/**
 * Opens the real window without a display, drags two numbers of four links while the map is shown and prints how soon
 * verdict and map follow. Run by {@code planner/drag-times}.
 */
public final class DragTimes {
    private static final List<String> LINKS = List.of(
            "kestrel-dam-to-millbrook", "stonebridge-to-lower-weir", "orchard-lane-access", "eagle-tarn-to-saltmarsh");
    private static final int WARM_UP = 100;
    private static final int STEPS = 300;
    private static final long STEP_NANOS = 16_000_000L;
    private static final long SETTLING_MILLIS = 3000;

    private DragTimes() {}

    /** No arguments, or the name of the page to show instead of the map. */
    public static void main(String[] args) {
        Application.launch(Drags.class, args);
    }

    /** Something that is dragged. */
    private record Drag(String name, DoubleConsumer to) {}

    /** The window that is dragged in. */
    public static final class Drags extends Application {
        private Session session;

        /** Made by the toolkit. */
        public Drags() {}

        @Override
        public void start(Stage stage) throws IOException {
            Path places = Files.createTempDirectory("drag-times");
            session = new Session(stage, new Session.Places(places, places));
            session.show("../scenarios/" + LINKS.get(0) + ".json", "light", 100);
            Thread hand = new Thread(this::drags, "hand");
            hand.setDaemon(true);
            hand.start();
        }

        private void drags() {
            try {
                String page = getParameters().getRaw().stream().findFirst().orElse("map");
                Shown.onWindowThread(() -> {
                    session.window().show(page);
                    return page;
                });
                System.out.printf("%d steps of 16 ms, the first %d not counted; page: %s%n", STEPS, WARM_UP, page);
                System.out.println("times in ms: median, 95 %, longest; busy: longest wait of the window's thread;");
                System.out.println("processor time per step: of the window's thread, of the whole program");
                System.out.println("link         dragged  | verdict           | map               | busy  | processor");
                LINKS.forEach(this::drags);
            } finally {
                Platform.exit();
            }
        }

        private void drags(String link) {
            PlannerModel model = session.model();
            Shown.onWindowThread(() -> {
                try {
                    model.file().open(Path.of("../scenarios/" + link + ".json"));
                } catch (binspan.planner.io.InvalidScenarioException e) {
                    throw new IllegalStateException(e);
                }
                return link;
            });
            for (Drag drag : List.of(window(), repair())) {
                pause(SETTLING_MILLIS);
                measure(link.substring(0, link.indexOf('-')), drag);
                Shown.onWindowThread(() -> {
                    model.design().settle();
                    model.design().undo();
                    return link;
                });
            }
        }

        private Drag window() {
            double planned = session.model().slots().window();
            return new Drag("window", share -> session.model().slots().window(planned * (0.8 + 0.4 * share), this));
        }

        private Drag repair() {
            Scenario scenario = session.model().design().scenario();
            Parameter margin = ParameterPaths.find(scenario, "alice.repairMarginDb");
            return new Drag(
                    "margin",
                    share -> session.model()
                            .design()
                            .change("margin", this, now -> margin.with(now, 0.5 + 1.5 * share)));
        }

        private void measure(String link, Drag drag) {
            DragClock verdict = new DragClock(STEPS);
            DragClock map = new DragClock(STEPS);
            Heartbeat heart = new Heartbeat();
            ProcessorTime before = null;
            Runnable deaf = Shown.onWindowThread(() -> listening(verdict, map));
            long start = System.nanoTime();
            for (int step = 0; step < STEPS; step++) {
                if (step == WARM_UP) {
                    heart.start();
                    before = ProcessorTime.now();
                }
                // Back and forth, never the same number twice in a row.
                double share = 0.5 - 0.5 * Math.cos(step * 0.0731);
                int at = step;
                Platform.runLater(() -> {
                    verdict.changed(at);
                    map.changed(at);
                    drag.to().accept(share);
                });
                pause(Math.max(0L, (start + (step + 1) * STEP_NANOS - System.nanoTime()) / 1_000_000L));
            }
            ProcessorTime used = ProcessorTime.now().since(before);
            double busy = heart.stop();
            // What was on its way may arrive.
            pause(500);
            Shown.onWindowThread(() -> {
                deaf.run();
                return link;
            });
            int counted = STEPS - WARM_UP;
            System.out.printf(
                    Locale.ROOT,
                    "%-12s %-8s | %s | %s | %5.1f | %5.1f %5.1f%n",
                    link,
                    drag.name(),
                    verdict.text(WARM_UP),
                    map.text(WARM_UP),
                    busy,
                    used.window() / counted,
                    used.program() / counted);
        }

        /** Stops the clocks whenever something new is shown; returns what ends that. */
        private Runnable listening(DragClock verdict, DragClock map) {
            Runnable endVerdict = listening(session.model().verdict().sheetProperty(), verdict);
            Runnable endMap = listening(session.model().map().shapeProperty(), map);
            return () -> {
                endVerdict.run();
                endMap.run();
            };
        }

        private static <T> Runnable listening(ObservableValue<T> shown, DragClock clock) {
            javafx.beans.value.ChangeListener<T> listener = (source, before, now) -> clock.shown();
            shown.addListener(listener);
            return () -> shown.removeListener(listener);
        }

        private static void pause(long millis) {
            try {
                Thread.sleep(millis);
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
            }
        }
    }
}
