package binspan.planner.view;

import java.util.function.Consumer;
import javafx.animation.PauseTransition;
import javafx.beans.value.ObservableValue;
import javafx.util.Duration;

/** Tells when what is shown has been out of date for so long that one should know. */
final class Staleness {
    private static final Duration PATIENCE = Duration.millis(150.0);

    private Staleness() {}

    /**
     * Follows whether something is out of date.
     *
     * @param stale whether it is
     * @param tell is told true once that has lasted, and false as soon as it is over
     */
    static void follow(ObservableValue<Boolean> stale, Consumer<Boolean> tell) {
        PauseTransition patience = new PauseTransition(PATIENCE);
        patience.setOnFinished(event -> tell.accept(stale.getValue()));
        stale.addListener((source, before, now) -> {
            if (now) {
                patience.playFromStart();
            } else {
                patience.stop();
                tell.accept(false);
            }
        });
        if (stale.getValue()) {
            patience.playFromStart();
        }
    }
}
