package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class WholeFileTest {
    @TempDir
    private Path directory;

    @Test
    void textIsWrittenInUtf8AndNothingElseLeft() throws Exception {
        Path file = directory.resolve("link.json");
        WholeFile.write(file.toString(), "größe\n", false);
        assertThat(file).hasContent("größe\n");
        assertThat(directory).isDirectoryContaining(path -> path.equals(file)).isDirectoryNotContaining("glob:**.part");
    }

    @Test
    void bytesAreWrittenAsTheyAre() throws Exception {
        byte[] bytes = {0, -1, 10, 13, -128};
        Path file = directory.resolve("map.png");
        WholeFile.write(file.toString(), bytes, false);
        assertThat(file).hasBinaryContent(bytes);
        assertThatThrownBy(() -> WholeFile.write(file.toString(), new byte[0], false))
                .isInstanceOf(OutputFileException.class)
                .hasMessage(file + ": exists already; --force replaces it");
        assertThat(file).hasBinaryContent(bytes);
    }

    @Test
    void existingFileIsKept() throws Exception {
        Path file = Files.writeString(directory.resolve("link.json"), "old");
        assertThatThrownBy(() -> WholeFile.write(file.toString(), "new", false))
                .isInstanceOf(OutputFileException.class)
                .hasMessage(file + ": exists already; --force replaces it");
        assertThat(file).hasContent("old");
        assertThat(directory).isDirectoryNotContaining("glob:**.part");
    }

    @Test
    void existingFileIsReplacedWhenAsked() throws Exception {
        Path file = Files.writeString(directory.resolve("link.json"), "old and longer");
        WholeFile.write(file.toString(), "new", true);
        assertThat(file).hasContent("new");
    }

    @Test
    void newFileHasTheUsualPermissions() throws Exception {
        Path usual = Files.writeString(directory.resolve("usual"), "x");
        Path file = directory.resolve("link.json");
        WholeFile.write(file.toString(), "x", false);
        assertThat(Files.getPosixFilePermissions(file)).isEqualTo(Files.getPosixFilePermissions(usual));
    }

    @Test
    void missingDirectoryAndDirectoryItselfAreSaid() {
        String missing = directory.resolve("no/link.json").toString();
        assertThatThrownBy(() -> WholeFile.write(missing, "x", true)).hasMessage(missing + ": no such directory");
        assertThatThrownBy(() -> WholeFile.write(directory.toString(), "x", true))
                .hasMessage(directory + ": found a directory; allowed a file name");
        assertThatThrownBy(() -> WholeFile.write("a\0b", "x", true))
                .hasMessage("a\\u0000b: not a file name on this system");
    }

    @Test
    void fileWhoseParentIsAFileIsSaid() throws IOException {
        String inside = Files.writeString(directory.resolve("file"), "x")
                .resolve("link.json")
                .toString();
        assertThatThrownBy(() -> WholeFile.write(inside, "x", false))
                .isInstanceOf(OutputFileException.class)
                .hasMessageStartingWith(inside + ": not writable");
    }
}
