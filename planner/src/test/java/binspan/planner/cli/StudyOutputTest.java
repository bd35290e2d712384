package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.planner.export.StudyReport;
import binspan.planner.io.OutputFileException;
import binspan.planner.plot.Axis;
import binspan.planner.plot.Bar;
import binspan.planner.plot.BarPanel;
import binspan.planner.plot.Picture;
import binspan.planner.plot.RankedBars;
import binspan.planner.table.Table;
import binspan.planner.table.TableJson;
import java.io.ByteArrayOutputStream;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import picocli.CommandLine;

/** Outputs of a study that can be drawn. */
final class StudyOutputTest {
    private static Picture picture() {
        Bar bar = new Bar(3.0, true, "3 bit/s");
        BarPanel panel = new BarPanel(Axis.linear("Key", "bit/s"), List.of(bar), Optional.empty());
        return new Picture("Links", "", new RankedBars("", List.of("ridge"), List.of(panel)));
    }

    @TempDir
    private Path directory;

    private final ByteArrayOutputStream screen = new ByteArrayOutputStream();
    private final Console console = Console.of(
            InputStream.nullInputStream(),
            new OutputSink(screen),
            new PrintStream(screen, true, StandardCharsets.UTF_8),
            Map.of());

    private static StudyOutput output(String... words) {
        return CommandLine.populateCommand(new StudyOutput(), words);
    }

    private static StudyReport report(Supplier<Picture> picture) {
        Table table = new Table(List.of("x"), writer -> {
            writer.number(1.0);
            writer.endRow();
        });
        return new StudyReport(
                TableJson.head("Dam to town", "sweep"), table, style -> "summary\n", Optional.ofNullable(picture));
    }

    private String printed(StudyOutput output, StudyReport report) throws OutputFileException {
        output.deliver(report, console);
        console.finish();
        return screen.toString(StandardCharsets.UTF_8);
    }

    @ParameterizedTest
    @CsvSource({"map.png, PNG", "map.svg, <svg", "MAP.PNG, PNG", "a.png.svg, <svg"})
    void pictureIsDrawnInTheFormatOfItsName(String name, String drawn) throws Exception {
        Path file = directory.resolve(name);
        StudyOutput output = output("--plot", file.toString());
        output.check("link.json");
        assertThat(printed(output, report(StudyOutputTest::picture)))
                .isEqualTo("summary\n\n" + "Written: " + file + "\n");
        assertThat(Files.readString(file, StandardCharsets.ISO_8859_1)).contains(drawn);
    }

    @Test
    void hintNamesWhatTheStudyOffers() throws Exception {
        assertThat(printed(output(), report(null)))
                .isEqualTo("summary\n\n--csv FILE or --json FILE writes the table.\n");
        screen.reset();
        assertThat(printed(output(), report(StudyOutputTest::picture)))
                .isEqualTo("summary\n\n--csv FILE or --json FILE writes the table; --plot FILE.png or FILE.svg draws"
                        + "\nit.\n");
    }

    @Test
    void dataOnStandardOutputStandAlone() throws Exception {
        StudyOutput output =
                output("--csv", "-", "--plot", directory.resolve("map.png").toString());
        output.check();
        assertThat(output.summarised()).isFalse();
        assertThat(printed(output, report(StudyOutputTest::picture))).isEqualTo("x\r\n1\r\n");
    }

    @Test
    void drawingThatFailsLeavesNothing() {
        StudyOutput output = output("--plot", directory.resolve("map.png").toString());
        Supplier<Picture> failing = () -> {
            throw new IllegalStateException("boom");
        };
        assertThatThrownBy(() -> output.deliver(report(failing), console)).hasMessage("boom");
        assertThat(directory).isEmptyDirectory();
    }

    @Test
    void existingPictureIsKept() throws Exception {
        Path file = Files.writeString(directory.resolve("map.png"), "old");
        assertThatThrownBy(() -> output("--plot", file.toString()).check())
                .isInstanceOf(OutputFileException.class)
                .hasMessage(file + ": exists already; --force replaces it");
        assertThatThrownBy(() -> output("--plot", "map.gif").check())
                .isInstanceOf(OutputFileException.class)
                .hasMessage("map.gif: not the ending of a picture; allowed .png or .svg");
    }
}
