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

    @Test
    void contentsAreWrittenPieceByPiece() throws Exception {
        Path file = directory.resolve("table.csv");
        WholeFile.write(
                file.toString(),
                out -> {
                    for (int i = 0; i < 100_000; i++) {
                        out.write(i % 251);
                    }
                },
                false);
        byte[] bytes = Files.readAllBytes(file);
        assertThat(bytes).hasSize(100_000);
        assertThat(bytes[99_999]).isEqualTo((byte) (99_999 % 251));
    }

    @Test
    void nothingIsLeftOfContentsThatFail() {
        Path file = directory.resolve("table.csv");
        assertThatThrownBy(() -> WholeFile.write(
                        file.toString(),
                        out -> {
                            out.write(new byte[200_000]);
                            throw new IOException("No space left on device");
                        },
                        false))
                .isInstanceOf(OutputFileException.class)
                .hasMessage(file + ": not writable");
        assertThatThrownBy(() -> WholeFile.write(
                        file.toString(),
                        out -> {
                            out.write(new byte[200_000]);
                            throw new IllegalStateException("boom");
                        },
                        false))
                .hasMessage("boom");
        assertThat(directory).isEmptyDirectory();
    }

    @Test
    void failureKeepsTheFileThatWasToBeReplaced() throws Exception {
        Path file = Files.writeString(directory.resolve("table.csv"), "old");
        assertThatThrownBy(() -> WholeFile.write(
                        file.toString(),
                        out -> {
                            throw new IOException("No space left on device");
                        },
                        true))
                .isInstanceOf(OutputFileException.class);
        assertThat(file).hasContent("old");
    }

    @Test
    void whatCannotBeWrittenIsRefusedBeforehand() throws Exception {
        Path file = Files.writeString(directory.resolve("link.json"), "old");
        WholeFile.check(directory.resolve("new.json").toString(), false);
        WholeFile.check(file.toString(), true);
        WholeFile.check("new.json", false);
        assertRefused(file.toString(), false, file + ": exists already; --force replaces it");
        assertRefused(directory.toString(), true, directory + ": found a directory; allowed a file name");
        assertRefused(directory + "/no/x", true, directory + "/no/x: no such directory");
        assertRefused(file + "/x", true, file + "/x: not writable");
        assertRefused("", true, "found an empty name; allowed a file name");
        assertRefused("/dev/null", true, "/dev/null: found a device; allowed a file name");
        assertThat(file).hasContent("old");
        assertThat(directory).isDirectoryNotContaining(path -> !path.equals(file));
    }

    private static void assertRefused(String file, boolean replace, String message) {
        assertThatThrownBy(() -> WholeFile.check(file, replace))
                .isInstanceOf(OutputFileException.class)
                .hasMessage(message);
    }
}
