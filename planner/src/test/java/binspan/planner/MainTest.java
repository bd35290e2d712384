package binspan.planner;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The program as a process of its own. */
final class MainTest {
    @TempDir
    private Path directory;

    private Process start(String... args) throws IOException {
        List<String> command = new ArrayList<>(List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-XX:TieredStopAtLevel=1",
                "-cp",
                System.getProperty("java.class.path"),
                Main.class.getName()));
        command.addAll(List.of(args));
        return new ProcessBuilder(command).start();
    }

    private static String text(InputStream stream) throws IOException {
        return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    }

    private static int end(Process process) throws InterruptedException {
        assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        return process.exitValue();
    }

    @Test
    void presetIsWrittenAndCheckedThroughStandardInput() throws Exception {
        Process made = start("new", "pulse-pair");
        String scenario = text(made.getInputStream()).replace("Alder", "Älder");
        assertThat(end(made)).isZero();
        Process check = start("check", "-");
        check.getOutputStream().write(scenario.getBytes(StandardCharsets.UTF_8));
        check.getOutputStream().close();
        assertThat(text(check.getInputStream()))
                .contains("Tarnbeck Dam to Älder Street control room")
                .doesNotContain("\u001b");
        assertThat(text(check.getErrorStream())).isEmpty();
        assertThat(end(check)).isZero();
    }

    @Test
    void badInputEndsWithStatusTwo() throws Exception {
        Path file = Files.writeString(directory.resolve("bad.json"), "{\n  \"name\": 3\n}");
        Process check = start("check", file.toString());
        assertThat(text(check.getInputStream())).isEmpty();
        assertThat(text(check.getErrorStream()))
                .contains(file + ":2:11: name: found 3; allowed a text, in double quotes\n");
        assertThat(end(check)).isEqualTo(2);
    }

    @Test
    void readerThatGoesAwayIsNoFailure() throws Exception {
        Process list = start("list", "parameters", "--json");
        list.getInputStream().close();
        assertThat(text(list.getErrorStream())).isEmpty();
        assertThat(end(list)).isZero();
    }

    @Test
    void completionScriptCompletes() throws Exception {
        Process made = start("completion");
        Path script = Files.writeString(directory.resolve("completion"), text(made.getInputStream()));
        String ask = "source '" + script
                + "'; COMP_WORDS=(binspan new pulse-t); COMP_CWORD=2; COMP_LINE='binspan new pulse-t';"
                + " _complete_binspan; echo \"${COMPREPLY[@]}\"";
        Process bash = new ProcessBuilder("bash", "-c", ask).start();
        assertThat(text(bash.getInputStream())).isEqualTo("pulse-train\n");
        assertThat(end(bash)).isZero();
    }
}
