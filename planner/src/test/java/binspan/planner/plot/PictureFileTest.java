package binspan.planner.plot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.planner.io.OutputFileException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

final class PictureFileTest {
    private static final Picture PICTURE = SamplePictures.page(SamplePictures.ranges());

    @TempDir
    private Path directory;

    private String file(String name) {
        return directory.resolve(name).toString();
    }

    @Test
    void endingDecidesTheFormat() throws Exception {
        PictureFile.of(file("box.PNG")).write(PICTURE, false);
        PictureFile.of(file("box.svg")).write(PICTURE, false);
        assertThat(ImageIO.read(directory.resolve("box.PNG").toFile()).getWidth())
                .isEqualTo(2400);
        assertThat(Files.readString(directory.resolve("box.svg")))
                .startsWith("<?xml")
                .contains("<svg");
        assertThat(directory).isDirectoryNotContaining("glob:**.part");
    }

    @ParameterizedTest
    @ValueSource(strings = {"box.pdf", "box", "png", "box.svg.txt", ""})
    void otherEndingsAreRefusedBeforeAnythingIsDrawn(String name) {
        assertThatThrownBy(() -> PictureFile.of(name))
                .isInstanceOf(OutputFileException.class)
                .hasMessage(name + ": not the ending of a picture; allowed .png or .svg");
    }

    @Test
    void missingDirectoryLeavesNothingBehind() throws Exception {
        String missing = file("no/box.png");
        assertThatThrownBy(() -> PictureFile.of(missing).write(PICTURE, true))
                .isInstanceOf(OutputFileException.class)
                .hasMessage(missing + ": no such directory");
        assertThat(directory).isEmptyDirectory();
    }

    @Test
    void existingFileIsKeptUnlessItMayBeReplaced() throws Exception {
        Path kept = Files.writeString(directory.resolve("box.svg"), "old");
        assertThatThrownBy(() -> PictureFile.of(kept.toString()).write(PICTURE, false))
                .hasMessage(kept + ": exists already; --force replaces it");
        assertThat(kept).hasContent("old");
        PictureFile.of(kept.toString()).write(PICTURE, true);
        assertThat(Files.readString(kept)).contains("<svg");
    }

    /** Words that JDK 17 and 25 used on a machine whose fonts had been taken away. */
    @Test
    void missingFontsAreRecognised() {
        Throwable bare = new Error("Probable fatal error: No physical fonts found.");
        assertThat(MissingFonts.isCause(bare)).isTrue();
        assertThat(MissingFonts.isCause(new ExceptionInInitializerError(bare))).isTrue();
        assertThat(MissingFonts.isCause(new UnsatisfiedLinkError("libfreetype.so.6: cannot open")))
                .isTrue();
        assertThat(MissingFonts.isCause(new OutOfMemoryError("Java heap space")))
                .isFalse();
    }
}
