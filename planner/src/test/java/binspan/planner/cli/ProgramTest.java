package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

final class ProgramTest {

    @Test
    void versionIsOneLine() {
        Run run = Run.of("--version");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out()).matches("binspan \\S+\n");
        assertThat(Run.of("-V")).isEqualTo(run);
    }

    @Test
    void helpNamesEveryCommand() {
        Run run = Run.of("--help");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.err()).isEmpty();
        assertThat(run.out()).contains("check", "sweep", "new", "list", "schema", "completion", "Examples:");
        assertThat(Run.of("help")).isEqualTo(run);
    }

    @ParameterizedTest
    @ValueSource(strings = {"check", "sweep", "new", "list", "schema", "completion"})
    void helpOfACommandHasExamplesAndFitsEightyColumns(String command) {
        Run run = Run.of(command, "--help");
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out()).contains("Usage: binspan " + command, "Examples:\n  ");
        assertThat(run.out().lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
        assertThat(Run.of("help", command)).isEqualTo(run);
    }

    @ParameterizedTest
    @CsvSource({
        "chek, binspan: unknown command chek; did you mean check?",
        "lsit fibres, binspan: unknown command lsit; did you mean list?",
        "simulate, binspan: unknown command simulate",
        "--verson, binspan: unknown option --verson; did you mean --version?",
        "check --jsn f, binspan check: unknown option --jsn; did you mean --json?",
        "check --jsn, binspan check: unknown option --jsn; did you mean --json?",
        "check --json=yes f, binspan check: invalid value for option '--json': 'yes' is not a boolean",
        "new pulse-pair --outputs=f, binspan new: unknown option --outputs; did you mean --output?",
        "list fibres extra, 'binspan list: one word too many: extra'",
        "check, binspan check: missing FILE",
        "new, binspan new: missing PRESET",
        "list, binspan list: missing TOPIC",
        "'', binspan: missing command"
    })
    void wrongCommandLineGetsTwoLinesAndStatusTwo(String words, String message) {
        Run run = Run.of(words.isEmpty() ? new String[0] : words.split(" ", -1));
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.out()).isEmpty();
        assertThat(run.errLines()).hasSize(2).first().isEqualTo(message);
        assertThat(run.errLines().get(1))
                .endsWith(message.startsWith("binspan:") ? "explains the commands" : "explains the command");
    }

    @Test
    void wordsWithAnAtSignAreNotFilesOfArguments() {
        assertThat(Run.of("check", "@words").err()).isEqualTo("@words: no such file\n");
        assertThat(Run.of("new", "@words").err()).startsWith("binspan: unknown preset @words");
    }

    @Test
    void readerThatHasGoneEndsTheOutputQuietly() {
        assertThat(Run.writing(failing("Broken pipe"), "list", "parameters"))
                .isEqualTo(new Run(ExitStatus.MET, "", ""));
    }

    @Test
    void fullDiskIsAFailure() {
        assertThat(Run.writing(failing("No space left on device"), "list", "parameters"))
                .isEqualTo(new Run(
                        ExitStatus.FAILED, "", "binspan: the program failed: standard output cannot be written\n"));
    }

    @ParameterizedTest
    @CsvSource({"xterm,, true", "xterm, '', true", "xterm, 1, false", "dumb,, false", ",, false"})
    void coloursNeedATerminalThatShowsThem(String terminal, String noColour, boolean wanted) {
        Map<String, String> environment = new java.util.HashMap<>();
        environment.put("TERM", terminal);
        environment.put("NO_COLOR", noColour);
        environment.values().removeIf(java.util.Objects::isNull);
        assertThat(Console.wantsColour(environment)).isEqualTo(wanted);
    }

    @Test
    void capturedOutputHasNoColours() {
        assertThat(Run.of("--help").out()).doesNotContain("\u001b");
        assertThat(Run.of("chek").err()).doesNotContain("\u001b");
    }

    private static OutputStream failing(String reason) {
        return new OutputStream() {
            @Override
            public void write(int b) throws IOException {
                throw new IOException(reason);
            }
        };
    }
}
