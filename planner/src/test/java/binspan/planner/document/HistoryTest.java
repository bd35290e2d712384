package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.Change.Put;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Undo and redo against a plain list of what was pushed. */
final class HistoryTest {
    private static final ScenarioDocument START = ShippedDocuments.named("pulse-pair");

    private static ScenarioDocument window(double ps) {
        try {
            return START.with(List.of(new Put("timing.windowWidthPs", ps)));
        } catch (RefusedEditException e) {
            throw new AssertionError(e);
        }
    }

    @Test
    void beginsWithNothingToUndo() {
        History history = new History(START);
        assertThat(history.canUndo()).isFalse();
        assertThat(history.canRedo()).isFalse();
        assertThat(history.undoText()).isEmpty();
        assertThat(history.redoText()).isEmpty();
        assertThat(history.undo()).isSameAs(START);
        assertThat(history.redo()).isSameAs(START);
        assertThat(history.saved()).isNull();
        assertThat(history.modified()).isTrue();
    }

    @Test
    void stepsAreUndoneAndRedone() {
        History history = new History(START);
        history.push(window(100), "narrow", null);
        history.push(window(900), "widen", null);
        assertThat(history.undoText()).isEqualTo("widen");
        assertThat(history.undo().text()).isEqualTo(window(100).text());
        assertThat(history.redoText()).isEqualTo("widen");
        assertThat(history.undo()).isSameAs(START);
        assertThat(history.redo().text()).isEqualTo(window(100).text());
        history.push(window(300), "other", null);
        assertThat(history.canRedo()).isFalse();
        assertThat(history.undo().text()).isEqualTo(window(100).text());
    }

    @Test
    void aDragIsOneStep() {
        History history = new History(START);
        history.push(window(100), "drag", "window");
        history.push(window(110), "drag", "window");
        history.push(window(120), "drag", "window");
        history.settle();
        history.push(window(130), "drag", "window");
        assertThat(history.undo().text()).isEqualTo(window(120).text());
        assertThat(history.undo()).isSameAs(START);
        assertThat(history.canUndo()).isFalse();
    }

    @Test
    void aDragBackToItsStartIsNoStep() {
        History history = new History(START);
        history.push(window(100), "drag", "window");
        history.push(START, "drag", "window");
        history.settle();
        assertThat(history.canUndo()).isFalse();
        history.push(START, "nothing", null);
        assertThat(history.canUndo()).isFalse();
    }

    @Test
    void anotherKeyIsAnotherStep() {
        History history = new History(START);
        history.push(window(100), "drag", "a");
        history.push(window(110), "drag", "b");
        assertThat(history.undo().text()).isEqualTo(window(100).text());
        history.push(window(115), "drag", "b");
        assertThat(history.undo().text()).isEqualTo(window(100).text());
    }

    @Test
    void modifiedAsksForTheTextAlone() {
        History history = new History(START);
        history.markSaved();
        assertThat(history.modified()).isFalse();
        history.push(window(100), "narrow", null);
        assertThat(history.modified()).isTrue();
        history.push(window(START.scenario().timing().windowWidthPs()), "back", null);
        assertThat(history.modified()).isFalse();
        history.undo();
        history.markSaved();
        assertThat(history.saved().text()).isEqualTo(window(100).text());
        assertThat(history.redo().text()).isEqualTo(START.text());
        assertThat(history.modified()).isTrue();
    }

    @Test
    void longRunsFollowAPlainList() {
        Random random = new Random(4);
        History history = new History(START);
        List<ScenarioDocument> list = new ArrayList<>(List.of(START));
        int at = 0;
        for (int i = 0; i < 300; i++) {
            switch (random.nextInt(3)) {
                case 0 -> {
                    list = new ArrayList<>(list.subList(0, at + 1));
                    list.add(window(100 + i));
                    at++;
                    history.push(list.get(at), "step " + i, null);
                }
                case 1 -> {
                    at = Math.max(0, at - 1);
                    history.undo();
                }
                default -> {
                    at = Math.min(list.size() - 1, at + 1);
                    history.redo();
                }
            }
            assertThat(history.current()).isSameAs(list.get(at));
            assertThat(history.canUndo()).isEqualTo(at > 0);
            assertThat(history.canRedo()).isEqualTo(at < list.size() - 1);
        }
    }
}
