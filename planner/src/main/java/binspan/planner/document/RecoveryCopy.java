package binspan.planner.document;

import binspan.planner.io.JsonText;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.DateTimeException;
import java.time.Instant;
import java.util.HexFormat;
import java.util.Optional;

/**
 * What a recovery copy holds: some lines of comment, then the text of the document, so that the whole is a scenario file
 * itself.
 *
 * @param original file of the document, if it has one
 * @param time when the copy was written
 * @param started when the process that wrote it began, to the second at least
 * @param savedDigest SHA-256 of the text as saved last
 * @param text text of the document
 */
record RecoveryCopy(Optional<Path> original, Instant time, Instant started, String savedDigest, String text) {
    private static final String TITLE =
            "// Copy of a document that was not saved; the document begins below these lines.";
    private static final String[] NAMES = {
        "// file: ", "// written: ", "// process since: ", "// saved: ", "// characters: "
    };
    private static final int LINES = NAMES.length + 1;
    private static final long LARGEST_BYTES = 20_000_000;

    /** The copy as a text. */
    String written() {
        String[] values = {
            JsonText.of(original.map(Path::toString).orElse("")),
            time.toString(),
            started.toString(),
            savedDigest,
            Integer.toString(text.length())
        };
        StringBuilder copy = new StringBuilder(TITLE).append('\n');
        for (int i = 0; i < NAMES.length; i++) {
            copy.append(NAMES[i]).append(values[i]).append('\n');
        }
        return copy.append(text).toString();
    }

    /** Reads a copy; absent if it is unreadable or damaged. */
    static Optional<RecoveryCopy> read(Path file) {
        try {
            return Files.size(file) > LARGEST_BYTES ? Optional.empty() : parsed(Files.readString(file));
        } catch (IOException | DateTimeException | IllegalArgumentException | IndexOutOfBoundsException e) {
            return Optional.empty();
        }
    }

    private static Optional<RecoveryCopy> parsed(String copy) {
        String[] lines = copy.split("\n", LINES + 1);
        if (lines.length <= LINES || !lines[0].equals(TITLE)) {
            return Optional.empty();
        }
        String[] values = new String[NAMES.length];
        for (int i = 0; i < NAMES.length; i++) {
            if (!lines[i + 1].startsWith(NAMES[i])) {
                return Optional.empty();
            }
            values[i] = lines[i + 1].substring(NAMES[i].length());
        }
        String text = lines[LINES];
        if (!values[0].matches("\".*\"") || Integer.parseInt(values[4]) != text.length()) {
            return Optional.empty();
        }
        String path = TextScanner.unquoted(values[0]);
        Optional<Path> original = path.isEmpty() ? Optional.empty() : Optional.of(Path.of(path));
        return Optional.of(
                new RecoveryCopy(original, Instant.parse(values[1]), Instant.parse(values[2]), values[3], text));
    }

    /** Whether the process that wrote it runs still; another that has its number now began at another time. */
    boolean running(long process) {
        boolean alive = ProcessHandle.of(process).map(ProcessHandle::isAlive).orElse(false);
        Optional<Instant> now = started(process);
        boolean known = now.isPresent() && started.isAfter(Instant.EPOCH);
        return alive && (!known || Math.abs(now.get().getEpochSecond() - started.getEpochSecond()) <= 2);
    }

    static Optional<Instant> started(long process) {
        return ProcessHandle.of(process).flatMap(handle -> handle.info().startInstant());
    }

    static String digest(String text) {
        try {
            MessageDigest sha = MessageDigest.getInstance("SHA-256");
            return HexFormat.of().formatHex(sha.digest(text.getBytes(StandardCharsets.UTF_8)));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("SHA-256 is part of every Java", e);
        }
    }
}
