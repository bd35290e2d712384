package binspan.planner.document;

import binspan.planner.io.OutputFileException;
import binspan.planner.io.WholeFile;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** A small text file in a directory of the user's. */
final class RememberedFile {
    private static final long LARGEST_BYTES = 1_000_000;

    private RememberedFile() {}

    /** The text of a file, empty if it is missing, unreadable, too large or no UTF-8. */
    static String read(Path file) {
        try {
            return Files.isRegularFile(file) && Files.size(file) <= LARGEST_BYTES ? Files.readString(file) : "";
        } catch (IOException e) {
            return "";
        }
    }

    /**
     * Writes a file whole or not at all; its directory is made if it is missing.
     *
     * @throws OutputFileException if it cannot be written
     */
    static void write(Path file, String text) throws OutputFileException {
        try {
            UserDirectories.make(file.toAbsolutePath().getParent());
        } catch (IOException e) {
            throw new OutputFileException(file + ": its directory cannot be made");
        }
        WholeFile.write(file.toString(), text, true);
    }
}
