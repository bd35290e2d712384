package binspan.planner.io;

import java.io.IOException;
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
        write(file, part -> Files.writeString(part, text, StandardCharsets.UTF_8), replace);
    }

    /**
     * Writes a file of any kind.
     *
     * @param file its name
     * @param bytes all that it holds
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the file exists and may not be replaced, or cannot be written
     */
    public static void write(String file, byte[] bytes, boolean replace) throws OutputFileException {
        write(file, part -> Files.write(part, bytes), replace);
    }

    /** What fills the temporary file. */
    private interface Content {
        void writeTo(Path part) throws IOException;
    }

    private static void write(String file, Content content, boolean replace) throws OutputFileException {
        try {
            write(Path.of(file), content, replace);
        } catch (FileAlreadyExistsException e) {
            throw new OutputFileException(file + ": exists already; --force replaces it");
        } catch (InvalidPathException e) {
            throw new OutputFileException(file + ": not a file name on this system");
        } catch (NoSuchFileException e) {
            throw new OutputFileException(file + ": no such directory");
        } catch (AccessDeniedException e) {
            throw new OutputFileException(file + ": not writable: permission denied");
        } catch (IOException e) {
            throw new OutputFileException(file + ": not writable");
        }
    }

    private static void write(Path path, Content content, boolean replace) throws IOException, OutputFileException {
        if (Files.isDirectory(path)) {
            throw new OutputFileException(path + ": found a directory; allowed a file name");
        }
        if (!replace && Files.exists(path)) {
            throw new FileAlreadyExistsException(path.toString());
        }
        Path part = path.resolveSibling(
                path.getFileName() + "." + ProcessHandle.current().pid() + ".part");
        try {
            content.writeTo(part);
            CopyOption[] options = replace ? new CopyOption[] {StandardCopyOption.REPLACE_EXISTING} : new CopyOption[0];
            Files.move(part, path, options);
        } finally {
            Files.deleteIfExists(part);
        }
    }
}
