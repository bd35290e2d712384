package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the README shows is what the program does. */
final class ReadmeTest {
    private static final Path ROOT = Path.of("..");
    private static final String LAUNCHER = "planner/binspan ";

    @TempDir
    private Path directory;

    /** Every command line of the README without its comment and redirection, files made in a folder of the test. */
    private List<List<String>> commands() throws IOException {
        List<List<String>> commands = new ArrayList<>();
        for (String line : Files.readAllLines(ROOT.resolve("README.md"))) {
            if (line.startsWith(LAUNCHER)) {
                String words =
                        line.substring(LAUNCHER.length()).split(" [#>] ", 2)[0].strip();
                commands.add(List.of(
                        words.replace("my-link.", directory.resolve("my-link").toString() + ".")
                                .replace("scenarios/", ROOT + "/scenarios/")
                                .split(" ")));
            }
        }
        return commands;
    }

    @Test
    void everyCommandRuns() throws IOException {
        List<List<String>> commands = commands();
        assertThat(commands).hasSizeGreaterThan(6);
        for (List<String> command : commands) {
            if (command.get(0).equals("view")) {
                assertOpens(command);
                continue;
            }
            Run run = Run.of(command.toArray(String[]::new));
            assertThat(run.err()).as(command.toString()).isEmpty();
            assertThat(run.status()).as(command.toString()).isZero();
        }
    }

    /** A window would stay open: its command is read, and its file must be one that it could show. */
    private static void assertOpens(List<String> command) {
        Run check = Run.of("check", command.get(1));
        assertThat(command).hasSize(2);
        assertThat(check.err()).as(command.toString()).isEmpty();
    }

    @Test
    void shownVerdictIsTheProgramsOwn() throws IOException {
        List<String> readme = Files.readAllLines(ROOT.resolve("README.md"));
        int from = readme.indexOf("```text") + 1;
        int to = from + readme.subList(from, readme.size()).indexOf("```");
        List<String> verdict = Run.of("check", ROOT + "/scenarios/kestrel-dam-to-millbrook.json")
                .out()
                .lines()
                .toList();
        assertThat(verdict.subList(0, to - from).stream().map(ReadmeTest::digits))
                .isEqualTo(readme.subList(from, to).stream()
                        .map(ReadmeTest::digits)
                        .toList());
    }

    /** A line without the characters that depend on the encoding of the screen. */
    private static String digits(String line) {
        return line.replaceAll("[^A-Za-z0-9.%/,: ]", "").replaceAll(" +", " ").strip();
    }
}
