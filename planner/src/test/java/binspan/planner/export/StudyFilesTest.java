package binspan.planner.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.planner.io.OutputFileException;
import binspan.planner.plot.Axis;
import binspan.planner.plot.Interval;
import binspan.planner.plot.Picture;
import binspan.planner.plot.RangeBar;
import binspan.planner.plot.RangeBars;
import binspan.planner.table.Table;
import binspan.planner.table.TableJson;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class StudyFilesTest {
    private static final Picture PICTURE = new Picture(
            "Box",
            "",
            new RangeBars(
                    "", List.of(new RangeBar(Axis.linear("Width", "ps").within(0.0, 9.0), new Interval(1, 2), 1.5))));

    @TempDir
    private Path directory;

    private final AtomicInteger computed = new AtomicInteger();

    private final StudyReport report = new StudyReport(
            TableJson.head("Dam to town", "sweep"),
            new Table(List.of("x", "name"), writer -> {
                computed.incrementAndGet();
                writer.number(1.5);
                writer.text("B\u00e4renfels");
                writer.endRow();
            }),
            style -> "summary\n",
            Optional.of(() -> PICTURE));

    @Test
    void filesHoldTheSameAsTheTexts() throws Exception {
        assertThat(computed).hasValue(0);
        Path csv = directory.resolve("a.csv");
        Path json = directory.resolve("a.json");
        StudyFiles.csv(report, csv.toString(), false);
        StudyFiles.json(report, json.toString(), false);
        assertThat(computed).hasValue(2);
        assertThat(StudyFiles.csvText(report)).isEqualTo("x,name\r\n1.5,B\u00e4renfels\r\n");
        assertThat(Files.readString(csv)).isEqualTo(StudyFiles.csvText(report));
        assertThat(StudyFiles.jsonText(report)).contains("\"study\": \"sweep\"", "\"name\":");
        assertThat(Files.readString(json)).isEqualTo(StudyFiles.jsonText(report));
    }

    @Test
    void existingFilesAreReplacedOnlyWhenAllowed() throws Exception {
        Path file = directory.resolve("a.csv");
        Files.writeString(file, "mine");
        assertThatThrownBy(() -> StudyFiles.csv(report, file.toString(), false))
                .isInstanceOf(OutputFileException.class);
        assertThat(Files.readString(file)).isEqualTo("mine");
        StudyFiles.csv(report, file.toString(), true);
        assertThat(Files.readString(file)).startsWith("x,name");
    }

    @Test
    void pictureIsDrawnByTheEndingOfItsFile() throws Exception {
        Path file = directory.resolve("a.svg");
        StudyFiles.picture(report, file.toString(), false);
        assertThat(Files.readString(file)).contains("<svg");
        assertThatThrownBy(() ->
                        StudyFiles.picture(report, directory.resolve("a.gif").toString(), false))
                .isInstanceOf(OutputFileException.class);
    }

    @Test
    void studyWithoutAPictureHasNone() {
        StudyReport bare = new StudyReport(report.description(), report.table(), report.summary(), Optional.empty());
        assertThatThrownBy(() ->
                        StudyFiles.picture(bare, directory.resolve("a.png").toString(), false))
                .isInstanceOf(NoSuchElementException.class);
    }

    @Test
    void tableThatBreaksOffLeavesNoFile() {
        StudyReport broken = new StudyReport(
                report.description(),
                new Table(List.of("x"), writer -> {
                    throw new IOException("gone");
                }),
                report.summary(),
                Optional.empty());
        Path file = directory.resolve("b.csv");
        assertThatThrownBy(() -> StudyFiles.csv(broken, file.toString(), false))
                .isInstanceOf(OutputFileException.class);
        assertThat(file).doesNotExist();
        assertThatThrownBy(() -> StudyFiles.csvText(broken)).isInstanceOf(UncheckedIOException.class);
    }
}
