package binspan.planner.view;

import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.function.Supplier;
import javafx.application.Platform;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javax.imageio.ImageIO;

/** Parts of the window shown without a display, as pictures. */
final class Shown {
    private Shown() {}

    /** What a piece of code returns on the window's thread. */
    static <T> T onWindowThread(Supplier<T> code) {
        CompletableFuture<T> result = new CompletableFuture<>();
        Platform.runLater(() -> {
            try {
                result.complete(code.get());
            } catch (RuntimeException | Error e) {
                result.completeExceptionally(e);
            }
        });
        try {
            return result.get();
        } catch (InterruptedException | ExecutionException e) {
            throw new IllegalStateException(e);
        }
    }

    /** Draws a part of the window in a size into a PNG file. */
    static void picture(Parent part, Look look, double width, double height, File file) {
        onWindowThread(() -> {
            Scene scene = new Scene(part, width, height);
            look.dress(scene);
            part.applyCss();
            part.layout();
            try {
                ImageIO.write(FxImages.of(scene.snapshot(null)), "png", file);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
            return file;
        });
    }
}
