package binspan.planner.io;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A scenario with errors and the messages that it must get; the cases stand in {@code broken.txt}, which explains their
 * form.
 *
 * @param name what is wrong
 * @param raw the file, one character for each byte
 * @param messages the messages in their order, without the name of the file
 */
record BrokenScenario(String name, String raw, List<String> messages) {
    private static final String CASE = "== ";
    private static final Pattern ESCAPE = Pattern.compile("\\\\([nrt\\\\]|x[0-9a-f]{2})");

    /** All cases. */
    static List<BrokenScenario> all() {
        List<BrokenScenario> cases = new ArrayList<>();
        for (String section : ("\n" + text("broken.txt")).split("\n" + CASE, -1)) {
            if (!section.startsWith("\n#")) {
                cases.add(parse(section));
            }
        }
        return cases;
    }

    /** A file beside the cases, byte by byte. */
    static String text(String file) {
        try (InputStream in = BrokenScenario.class.getResourceAsStream(file)) {
            return new String(in.readAllBytes(), StandardCharsets.ISO_8859_1);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static BrokenScenario parse(String section) {
        String[] lines = section.split("\n", -1);
        String text = "";
        String change = "";
        List<String> messages = new ArrayList<>();
        for (String line : List.of(lines).subList(1, lines.length)) {
            String word = line.split(" ", 2)[0];
            String rest = line.substring(Math.min(line.length(), word.length() + 1));
            switch (word) {
                case "file" -> text = text(rest);
                case "text" -> text = unescaped(rest);
                case "change" -> change = unescaped(rest);
                case "to" -> text = changed(text, change, unescaped(rest), lines[0]);
                case "gets" -> messages.add(rest);
                case "" -> {}
                default -> throw new IllegalStateException(lines[0] + ": unknown line " + line);
            }
        }
        return new BrokenScenario(lines[0], text, messages);
    }

    private static String changed(String text, String from, String to, String name) {
        int at = text.indexOf(from);
        if (at < 0 || text.indexOf(from, at + 1) >= 0) {
            throw new IllegalStateException(name + ": must occur once: " + from);
        }
        return text.substring(0, at) + to + text.substring(at + from.length());
    }

    private static String unescaped(String text) {
        return ESCAPE.matcher(text).replaceAll(match -> Matcher.quoteReplacement(meant(match.group(1))));
    }

    private static String meant(String escape) {
        return switch (escape.charAt(0)) {
            case 'n' -> "\n";
            case 'r' -> "\r";
            case 't' -> "\t";
            case 'x' -> String.valueOf((char) Integer.parseInt(escape.substring(1), 16));
            default -> escape;
        };
    }

    /** The bytes of the file. */
    byte[] bytes() {
        return raw.getBytes(StandardCharsets.ISO_8859_1);
    }

    @Override
    public String toString() {
        return name;
    }
}
