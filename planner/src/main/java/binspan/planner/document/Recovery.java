package binspan.planner.document;

import binspan.planner.io.OutputFileException;
import java.io.IOException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * Copies of a document that is not saved yet, for the case that the program ends without saving. One object keeps one
 * copy, in a file named by process and number; the copy is a scenario file that can be read by hand.
 */
public final class Recovery {
    private static final AtomicInteger COUNTER = new AtomicInteger();
    private static final String ENDING = ".json";

    private final Path file;
    private final Clock clock;
    private final long process;

    /**
     * A copy that a process left.
     *
     * @param copy file of the copy
     * @param original file that the document was read from, absent for one that was never saved
     * @param written when the copy was written
     * @param text text of the document
     * @param savedDigest SHA-256 of the text that the document was saved with last, hexadecimal
     */
    public record Found(Path copy, Optional<Path> original, Instant written, String text, String savedDigest) {
        /** Whether a text is the one that the document was saved with last: if not, its file has changed since. */
        public boolean basedOn(String savedText) {
            return RecoveryCopy.digest(savedText).equals(savedDigest);
        }

        /** Deletes the copy, if it is still there and can be. */
        public void discard() {
            delete(copy);
        }
    }

    /**
     * Copies of one document of this process.
     *
     * @param directory where they are kept; made when first needed
     */
    public Recovery(Path directory) {
        this(directory, Clock.systemUTC(), ProcessHandle.current().pid());
    }

    Recovery(Path directory, Clock clock, long process) {
        this.file = directory.resolve(process + "-" + COUNTER.incrementAndGet() + ENDING);
        this.clock = clock;
        this.process = process;
    }

    /** The usual directory of the user. */
    public static Path defaultDirectory() {
        return UserDirectories.present().state().resolve("recovery");
    }

    /**
     * Writes the copy, in place of the one before.
     *
     * @param text text of the document
     * @param originalFile file that it was read from, null for one that was never saved
     * @param savedText text that it was saved with last, empty for none
     * @return the file
     * @throws OutputFileException if it cannot be written
     */
    public Path write(String text, Path originalFile, String savedText) throws OutputFileException {
        Instant started = RecoveryCopy.started(process).orElse(Instant.EPOCH);
        RememberedFile.write(
                file,
                new RecoveryCopy(
                                Optional.ofNullable(originalFile).map(Path::toAbsolutePath),
                                clock.instant(),
                                started,
                                RecoveryCopy.digest(savedText),
                                text)
                        .written());
        return file;
    }

    /** Deletes the copy: the document is saved or given up. */
    public void clear() {
        delete(file);
    }

    /**
     * Copies of processes that no longer run, the newest first. Those that are damaged are left out.
     *
     * @param directory where they are kept
     */
    public static List<Found> left(Path directory) {
        List<Found> found = new ArrayList<>();
        try (DirectoryStream<Path> files = Files.newDirectoryStream(directory, "*" + ENDING)) {
            files.forEach(file -> found(file).ifPresent(found::add));
        } catch (IOException | DirectoryIteratorException e) {
            return List.copyOf(found);
        }
        found.sort(Comparator.comparing(Found::written).reversed());
        return List.copyOf(found);
    }

    private static Optional<Found> found(Path file) {
        String name = file.getFileName().toString();
        if (!name.matches("[0-9]{1,18}-[0-9]{1,9}\\.json")) {
            return Optional.empty();
        }
        long process = Long.parseLong(name.substring(0, name.indexOf('-')));
        return RecoveryCopy.read(file)
                .filter(copy -> !copy.running(process))
                .map(copy -> new Found(file, copy.original(), copy.time(), copy.text(), copy.savedDigest()));
    }

    private static void delete(Path file) {
        try {
            Files.deleteIfExists(file);
        } catch (IOException e) {
            // It stays and is offered once more when the program starts.
            file.toFile().deleteOnExit();
        }
    }
}
