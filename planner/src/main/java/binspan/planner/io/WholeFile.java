package binspan.planner.io;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.CopyOption;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Writes files whole or not at all: to a temporary name, then renamed. */
public final class WholeFile {
    /** Writes what a file shall hold. */
    @FunctionalInterface
    public interface Contents {
        /**
         * Writes all of it.
         *
         * @param out buffered; left open
         */
        void to(OutputStream out) throws IOException;
    }

    private WholeFile() {}

    /**
     * Writes a text file in UTF-8.
     *
     * @param file its name
     * @param text all that it holds
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the file exists and may not be replaced, or cannot be written
     */
    public static void write(String file, String text, boolean replace) throws OutputFileException {
        write(file, out -> out.write(text.getBytes(StandardCharsets.UTF_8)), replace);
    }

    /**
     * Writes a file piece by piece; nothing of it stays if the pieces end in an exception or the program is stopped.
     *
     * @param file its name
     * @param contents writes all that it holds
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the file exists and may not be replaced, or cannot be written
     */
    public static void write(String file, Contents contents, boolean replace) throws OutputFileException {
        told(file, () -> write(refused(file, replace), contents, replace));
    }

    /**
     * Refuses a file that could not be written, before the work on it begins.
     *
     * @param file its name
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the file exists and may not be replaced, or if its directory is missing or not
     *     writable
     */
    public static void check(String file, boolean replace) throws OutputFileException {
        told(file, () -> checkDirectory(refused(file, replace)));
    }

    /** Work on a file. */
    @FunctionalInterface
    private interface Step {
        void run() throws IOException, OutputFileException;
    }

    private static void told(String file, Step step) throws OutputFileException {
        try {
            step.run();
        } catch (FileAlreadyExistsException e) {
            throw new OutputFileException(file + ": exists already; --force replaces it");
        } catch (InvalidPathException e) {
            throw new OutputFileException(file + ": not a file name on this system");
        } catch (NoSuchFileException e) {
            throw new OutputFileException(file + ": no such directory");
        } catch (AccessDeniedException e) {
            throw new OutputFileException(file + ": not writable: permission denied");
        } catch (UnfinishedFiles.StoppedException e) {
            throw new OutputFileException(file + ": not written: the program was stopped");
        } catch (IOException e) {
            throw new OutputFileException(file + ": not writable");
        }
    }

    private static Path refused(String file, boolean replace) throws IOException, OutputFileException {
        Path path = Path.of(file);
        if (file.isEmpty() || Files.isDirectory(path)) {
            throw new OutputFileException(
                    (file.isEmpty() ? "found an empty name" : file + ": found a directory") + "; allowed a file name");
        }
        if (!replace && Files.exists(path)) {
            throw new FileAlreadyExistsException(file);
        }
        if (Files.exists(path) && !Files.isRegularFile(path)) {
            throw new OutputFileException(file + ": found a device; allowed a file name");
        }
        return path;
    }

    private static void checkDirectory(Path path) throws IOException {
        Path directory = path.toAbsolutePath().getParent();
        if (!Files.exists(directory)) {
            throw new NoSuchFileException(path.toString());
        }
        if (!Files.isDirectory(directory)) {
            throw new IOException("not a directory");
        }
        if (!Files.isWritable(directory)) {
            throw new AccessDeniedException(path.toString());
        }
    }

    private static void write(Path path, Contents contents, boolean replace) throws IOException {
        Path part = path.resolveSibling(
                path.getFileName() + "." + ProcessHandle.current().pid() + ".part");
        try {
            try (OutputStream out = UnfinishedFiles.begin(part)) {
                contents.to(out);
            }
            CopyOption[] options = replace ? new CopyOption[] {StandardCopyOption.REPLACE_EXISTING} : new CopyOption[0];
            UnfinishedFiles.finish(part, path, options);
        } finally {
            UnfinishedFiles.end(part);
        }
    }
}
