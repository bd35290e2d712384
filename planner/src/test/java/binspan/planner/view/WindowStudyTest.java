package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.viewmodel.StudyRun;
import binspan.planner.viewmodel.StudyRun.State;
import binspan.planner.viewmodel.ToleranceModel;
import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import javafx.scene.Node;
import javafx.scene.control.Label;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;

/** Studies run while the window stays alive, stop when told to, and say when they are out of date. */
@ExtendWith(ApplicationExtension.class)
final class WindowStudyTest {
    private static final long SERVED_MILLIS = 200;
    private static final int SEVERAL = 5;

    @TempDir
    private Path directory;

    private WholeWindow window;

    @BeforeEach
    void open(FxRobot robot) throws IOException {
        window = new WholeWindow(robot, directory).showing(WholeWindow.copy("kestrel-dam-to-millbrook", directory));
        window.page("tolerance");
        window.until("quiet", () -> window.working() == 0);
    }

    @AfterEach
    void end() {
        window.end();
    }

    private ToleranceModel tolerance() {
        return window.model().studies().tolerance();
    }

    private State state() {
        return window.get(((StudyRun<?>) tolerance().run()).stateProperty()::get);
    }

    @Test
    void aStudyIsRunSeenAndOutOfDateWhenTheLinkChanges(FxRobot robot) {
        window.act(() -> tolerance().buildsProperty().set(256));
        robot.clickOn("#tolerance-run");
        window.until("done", () -> state() == State.DONE);
        StudyPicture picture = window.part("tolerance-picture", StudyPicture.class);
        window.until("picture", () -> picture.image() != null);
        assertThat(picture.image().getWidth()).isGreaterThan(300.0);
        assertThat(window.part("tolerance-status", Label.class).getText()).startsWith("done in ");
        Node stale = window.part("tolerance-stale", Node.class);
        assertThat(stale.isVisible()).isFalse();
        window.act(() -> window.model().slots().window(500e-12, null));
        assertThat(stale.isVisible()).isTrue();
        window.act(() -> window.model().design().undo());
        assertThat(stale.isVisible()).isFalse();
    }

    @Test
    void aLongStudyLeavesTheWindowAliveAndStopsAtOnce(FxRobot robot) {
        window.act(() -> tolerance().buildsProperty().set(65_536));
        robot.clickOn("#tolerance-run");
        window.until("under way", () -> tolerance().run().progressProperty().get() > 0.0);
        int served = 0;
        for (int asked = 0; asked < 10 * SEVERAL && served < SEVERAL; asked++) {
            long start = System.nanoTime();
            State state = state();
            boolean prompt = System.nanoTime() - start <= TimeUnit.MILLISECONDS.toNanos(SERVED_MILLIS);
            assertThat(state).isEqualTo(State.RUNNING);
            served += prompt ? 1 : 0;
        }
        assertThat(served).isEqualTo(SEVERAL);
        long start = System.nanoTime();
        window.act(() -> tolerance().run().cancel());
        window.until("its threads have ended", () -> window.working() == 0);
        assertThat(System.nanoTime() - start).isLessThan(TimeUnit.SECONDS.toNanos(1));
        assertThat(state()).isEqualTo(State.CANCELLED);
        assertThat(window.part("tolerance-status", Label.class).getText()).startsWith("cancelled after ");
        assertThat(window.part("tolerance-picture", StudyPicture.class).image()).isNull();
    }
}
