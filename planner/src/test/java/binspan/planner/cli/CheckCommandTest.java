package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.io.Preset;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

final class CheckCommandTest {
    private static final String GOOD = Preset.PULSE_PAIR.scenario();
    private static final String NAME = "Tarnbeck Dam to Alder Street control room";

    @TempDir
    private Path directory;

    private String file(String name, String text) throws IOException {
        return Files.writeString(directory.resolve(name), text).toString();
    }

    private static String named(String name) {
        return GOOD.replace(NAME, name);
    }

    @Test
    void goodScenarioGetsAVerdict() throws IOException {
        Run run = Run.of("check", file("good.json", GOOD));
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out()).contains(NAME);
        assertThat(run.err()).isEmpty();
    }

    @Test
    void unmetRequirementIsStatusOneWhateverElseIsMet() throws IOException {
        String good = file("good.json", GOOD);
        String unmet = file("unmet.json", GOOD.replace("\"chshAtLeast\": 2.3", "\"chshAtLeast\": 2.82"));
        assertThat(Run.of("check", unmet).status()).isEqualTo(ExitStatus.UNMET);
        assertThat(Run.of("check", unmet, good).status()).isEqualTo(ExitStatus.UNMET);
        assertThat(Run.of("check", unmet, "no.json", good).status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(Run.of("check", unmet).err()).isEmpty();
    }

    @Test
    void badScenarioGetsItsErrorsOnStandardError() throws IOException {
        String file = file("bad.json", GOOD.replace("\"imbalanceNs\": 2.0", "\"imbalanceNs\": -2.0"));
        Run run = Run.of("check", file);
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.out()).isEmpty();
        assertThat(run.errLines()).containsExactly(file + ":10:18: imbalanceNs: found -2.0; allowed 1e-6 to 10000 ns");
    }

    @Test
    void missingFileIsBadInput() {
        Run run = Run.of("check", directory.resolve("no.json").toString());
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.err()).isEqualTo(directory.resolve("no.json") + ": no such file\n");
    }

    @Test
    void dashIsStandardInput() {
        assertThat(Run.reading(GOOD.getBytes(StandardCharsets.UTF_8), "check", "-")
                        .out())
                .contains(NAME);
        Run empty = Run.of("check", "-");
        assertThat(empty.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(empty.err()).isEqualTo("(standard input):1:1: found an empty file; allowed a scenario object\n");
    }

    @Test
    void severalFilesAreToldApartAndTheWorstStatusCounts() throws IOException {
        String first = file("a.json", named("First"));
        String bad = file("b.json", "{");
        String last = file("c.json", named("Last"));
        Run run = Run.of("check", first, bad, last);
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.out())
                .startsWith(first + ":\n")
                .contains("\n\n" + last + ":\n")
                .doesNotContain(bad);
        assertThat(run.out()).containsSubsequence("First", last, "Last");
        assertThat(run.err()).startsWith(bad + ":1:2: ");
    }

    @Test
    void oneResultIsAJsonObject() throws IOException {
        Run run = Run.of("check", "--json", file("a.json", GOOD));
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out()).startsWith("{").endsWith("}\n").contains("\"scenario\": \"" + NAME + "\"");
    }

    @Test
    void severalResultsAreOneJsonList() throws IOException {
        String first = file("a.json", named("First"));
        String bad = file("b.json", "[]");
        String last = file("c.json", named("Last"));
        Run run = Run.of("check", first, bad, last, "--json");
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.out()).startsWith("[\n{").endsWith("}\n]\n");
        assertThat(run.out()).containsSubsequence("\"First\"", "}", ",\n{", "\"Last\"");
        assertThat(run.errLines()).containsExactly(bad + ":1:1: found a list; allowed a scenario object");
    }

    @Test
    void listOfNoResultsIsStillAList() {
        Run run = Run.of("check", "--json", "no.json", "neither.json");
        assertThat(run.out()).isEqualTo("[]\n");
        assertThat(run.errLines()).containsExactly("no.json: no such file", "neither.json: no such file");
        assertThat(Run.of("check", "--json", "no.json").out()).isEmpty();
    }

    @Test
    void worksheetIsPrintedWhenAsked() throws IOException {
        Run run = Run.of("check", "--worksheet", file("a.json", GOOD));
        assertThat(run.status()).isEqualTo(ExitStatus.MET);
        assertThat(run.out()).contains(NAME);
    }

    @Test
    void jsonAndWorksheetExcludeEachOther() throws IOException {
        Run run = Run.of("check", "--json", "--worksheet", file("a.json", GOOD));
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines())
                .containsExactly(
                        "binspan check: --json, --worksheet are mutually exclusive (specify only one)",
                        "binspan check --help explains the command");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "F",
                "F --json",
                "--json F",
                "--worksheet F",
                "F F",
                "F F --json",
                "-",
                "F -",
                "no.json",
                "--json --json F"
            })
    void plainCommandLineIsReadAsByTheParserOfAllOthers(String words) throws IOException {
        String file = file("a.json", GOOD);
        List<String> args = new ArrayList<>(List.of("check"));
        for (String word : words.split(" ", -1)) {
            args.add(word.equals("F") ? file : word);
        }
        Run plain = Run.of(args.toArray(String[]::new));
        // A double dash changes nothing but that the plain reading does not apply.
        List<String> parsed = new ArrayList<>(args);
        parsed.add("--");
        assertThat(PlainCheck.of(parsed.toArray(String[]::new))).isNull();
        assertThat(Run.of(parsed.toArray(String[]::new))).isEqualTo(plain);
    }

    @Test
    void ownFailureIsOneLineAndNotItsInsides() {
        InputStream failing = failing();
        Run run = Run.with(failing, Map.of(), "check", "-");
        assertThat(run.status()).isEqualTo(ExitStatus.FAILED);
        assertThat(run.errLines())
                .containsExactly("binspan: the program failed: an error of its own, not of the input;"
                        + " BINSPAN_DEBUG=1 shows where");
    }

    @Test
    void ownFailureShowsWhereWhenDebugging() {
        Run run = Run.with(failing(), Map.of("BINSPAN_DEBUG", "1"), "check", "-");
        assertThat(run.status()).isEqualTo(ExitStatus.FAILED);
        assertThat(run.err()).contains("IllegalStateException: boom").contains("\tat ");
    }

    @Test
    void failureOfOneFileDoesNotKeepOthersFromTheirVerdict() throws IOException {
        Run run = Run.with(failing(), Map.of(), "check", "-", file("a.json", GOOD));
        assertThat(run.status()).isEqualTo(ExitStatus.FAILED);
        assertThat(run.out()).contains(NAME);
    }

    private static InputStream failing() {
        return new InputStream() {
            @Override
            public int read() {
                throw new IllegalStateException("boom");
            }

            @Override
            public int read(byte[] bytes, int offset, int length) {
                throw new IllegalStateException("boom");
            }
        };
    }
}
