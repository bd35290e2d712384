package binspan.planner.viewmodel;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/** Calls and words in the sources of the window, found in their text. */
final class SourceCalls {
    private static final Path SOURCES = Path.of("src/main/java/binspan/planner");
    private static final Pattern LITERAL = Pattern.compile("\"((?:[^\"\\\\]|\\\\.)*)\"");

    private SourceCalls() {}

    /** Texts of the classes of a package. */
    static List<String> texts(String packageName) {
        try (Stream<Path> files = Files.list(SOURCES.resolve(packageName))) {
            return files.filter(file -> file.toString().endsWith(".java"))
                    .sorted()
                    .map(SourceCalls::read)
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String read(Path file) {
        try {
            return Files.readString(file).replaceAll("(?m)^\\s*(?://|/?\\*).*$", "");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** What stands between the parentheses of each call whose name matches. */
    static List<String> arguments(String text, String name) {
        List<String> found = new ArrayList<>();
        Matcher call = Pattern.compile(name + "\\s*\\(").matcher(text);
        while (call.find()) {
            found.add(text.substring(call.end(), end(text, call.end(), ')')));
        }
        return found;
    }

    /** The first of several arguments. */
    static String first(String arguments) {
        return arguments.substring(0, end(arguments, 0, ','));
    }

    /** Where a closing sign stands that belongs to no inner parenthesis and no literal; the end if nowhere. */
    private static int end(String text, int from, char sign) {
        int depth = 0;
        boolean quoted = false;
        for (int i = from; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '"' && (i == 0 || text.charAt(i - 1) != '\\')) {
                quoted = !quoted;
            } else if (!quoted && depth == 0 && c == sign) {
                return i;
            } else if (!quoted) {
                depth += c == '(' ? 1 : c == ')' ? -1 : 0;
            }
        }
        return text.length();
    }

    /** String literals of a piece of source. */
    static List<String> literals(String text) {
        return LITERAL.matcher(text).results().map(match -> match.group(1)).toList();
    }
}
