package binspan.planner.io;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;

/** The text of a scenario file: at most 10 MB of UTF-8. */
final class FileText {
    private static final int LARGEST_BYTES = 10_000_000;
    private static final char BYTE_ORDER_MARK = '\ufeff';

    private FileText() {}

    /**
     * Reads a file.
     *
     * @param file its name
     * @throws InvalidScenarioException if it is missing, a directory, unreadable, too large or not UTF-8
     */
    static String of(String file) throws InvalidScenarioException {
        try {
            Path path = Path.of(file);
            if (Files.isDirectory(path)) {
                throw refused(file, "found a directory; allowed a scenario file");
            }
            try (InputStream in = Files.newInputStream(path)) {
                return of(in, file);
            }
        } catch (NoSuchFileException e) {
            throw refused(file, "no such file");
        } catch (AccessDeniedException e) {
            throw refused(file, "not readable: permission denied");
        } catch (InvalidPathException e) {
            throw refused(file, "not a file name on this system");
        } catch (IOException e) {
            throw refused(file, "not readable");
        }
    }

    /**
     * Reads a stream to its end.
     *
     * @param in the stream, left open
     * @param name its name for messages
     * @throws InvalidScenarioException if it is too large or not UTF-8
     * @throws IOException if it cannot be read
     */
    static String of(InputStream in, String name) throws InvalidScenarioException, IOException {
        byte[] bytes = in.readNBytes(LARGEST_BYTES + 1);
        if (bytes.length > LARGEST_BYTES) {
            throw refused(name, "found more than 10 MB; allowed a scenario of at most 10 MB");
        }
        return decoded(bytes, name);
    }

    private static String decoded(byte[] bytes, String name) throws InvalidScenarioException {
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length + 1);
        boolean wrong = decoder.decode(in, out, true).isError();
        String text = out.flip().toString();
        if (wrong) {
            throw refused(name + ":" + endOf(text), notUtf8(bytes[in.position()]));
        }
        return text.isEmpty() || text.charAt(0) != BYTE_ORDER_MARK ? text : text.substring(1);
    }

    private static String notUtf8(byte found) {
        return "found the byte 0x" + Integer.toHexString(found & 0xff)
                + ", which is not UTF-8 here; allowed UTF-8 text";
    }

    /** The place behind the last character of a text. */
    static Place endOf(String text) {
        int line = 1;
        int start = 0;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '\n' || (c == '\r' && !text.startsWith("\n", i + 1))) {
                line++;
                start = i + 1;
            }
        }
        return new Place(line, text.length() - start + 1);
    }

    private static InvalidScenarioException refused(String file, String message) {
        return new InvalidScenarioException(List.of(Printable.line(file + ": " + message)));
    }
}
