package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import javafx.application.Platform;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.layout.StackPane;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.util.WaitForAsyncUtils;

/** What the tests of the window rely on to notice faults is itself able to notice them. */
@ExtendWith(ApplicationExtension.class)
final class ComplaintsTest {
    @Test
    void whatIsThrownOnAnyThreadIsHeard() throws InterruptedException {
        Complaints complaints = new Complaints();
        try {
            Thread worker = new Thread(() -> fail("work"));
            worker.start();
            worker.join();
            Platform.runLater(() -> fail("window"));
            WaitForAsyncUtils.waitForFxEvents();
        } finally {
            complaints.close();
        }
        assertThat(complaints.all()).hasSize(2).anyMatch(each -> each.contains("work"));
        assertThat(complaints.all()).anyMatch(each -> each.contains("window"));
    }

    private static void fail(String where) {
        throw new IllegalStateException(where);
    }

    @Test
    void aColourThatNoSheetKnowsIsHeard() {
        Complaints complaints = new Complaints();
        try {
            Shown.onWindowThread(() -> {
                Label label = new Label("text");
                label.setStyle("-fx-text-fill: -no-such-colour;");
                StackPane root = new StackPane(label);
                Scene scene = new Scene(root);
                new Look().dress(scene);
                root.applyCss();
                return scene;
            });
        } finally {
            complaints.close();
        }
        assertThat(complaints.all()).anyMatch(each -> each.startsWith("style sheets: "));
    }
}
