package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.planner.document.RecentFiles;
import binspan.planner.document.Recovery;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.io.Preset;
import binspan.scenario.ParameterPaths;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Opening, saving, titles, recent files and the copy that survives a crash, on a real directory. */
class LinkFileTest {
    @TempDir
    private Path directory;

    private Path settings;
    private Path copies;
    private Path link;
    private Design design;
    private LinkFile file;

    @BeforeEach
    void begin() throws IOException {
        settings = Files.createDirectory(directory.resolve("settings"));
        copies = Files.createDirectory(directory.resolve("copies"));
        link = directory.resolve("dam.json");
        Files.writeString(link, Designs.shipped("kestrel-dam-to-millbrook").text());
        design = new Design(LinkFile.starter(Preset.PULSE_PAIR));
        file = fileOf(design);
    }

    private LinkFile fileOf(Design of) {
        return new LinkFile(of, new RecentFiles(settings), new Recovery(copies), Background.NONE);
    }

    private void narrow() {
        design.change(
                "window width",
                null,
                scenario ->
                        ParameterPaths.find(scenario, "timing.windowWidthPs").with(scenario, 123.0));
    }

    @Test
    void newLinkHasNoFileAndSaysSo() {
        assertThat(file.pathProperty().get()).isNull();
        assertThat(file.titleProperty().get()).contains(design.scenario().name(), Words.of("window.untitled"));
        assertThat(file.changedElsewhere()).isFalse();
    }

    @Test
    void openedFileGivesTitleAndRecentEntry() throws InvalidScenarioException {
        file.open(link);
        assertThat(design.scenario().name()).startsWith("Kestrel Dam");
        assertThat(file.titleProperty().get())
                .contains("dam.json")
                .doesNotContain(Words.of("window.modified").strip());
        assertThat(file.recent()).extracting(RecentFiles.Entry::file).containsExactly(link.toAbsolutePath());
        narrow();
        assertThat(file.titleProperty().get())
                .contains(Words.of("window.modified").strip());
        design.undo();
        assertThat(file.titleProperty().get())
                .doesNotContain(Words.of("window.modified").strip());
    }

    @Test
    void fileThatIsNoScenarioLeavesEverythingAsItWas() throws IOException, InvalidScenarioException {
        file.open(link);
        Path broken = Files.writeString(directory.resolve("broken.json"), "{ \"formatVersion\": 1 }");
        assertThatThrownBy(() -> file.open(broken)).isInstanceOf(InvalidScenarioException.class);
        assertThat(file.pathProperty().get()).isEqualTo(link);
        assertThat(design.scenario().name()).startsWith("Kestrel Dam");
        assertThat(file.recent()).hasSize(1);
    }

    @Test
    void savedFileHoldsTheTextAndNothingIsModifiedAfterwards()
            throws IOException, InvalidScenarioException, OutputFileException {
        file.open(link);
        narrow();
        Path other = directory.resolve("other.json");
        file.save(other);
        assertThat(Files.readString(other))
                .isEqualTo(design.documentProperty().get().text())
                .contains("123");
        assertThat(design.modifiedProperty().get()).isFalse();
        assertThat(file.pathProperty().get()).isEqualTo(other);
        assertThat(file.titleProperty().get()).contains("other.json");
        assertThat(file.recent()).hasSize(2);
        assertThat(file.recent().get(0).file()).isEqualTo(other.toAbsolutePath());
    }

    @Test
    void changeByAnotherProgramIsNoticed() throws IOException, InvalidScenarioException, OutputFileException {
        file.open(link);
        assertThat(file.changedElsewhere()).isFalse();
        Files.writeString(link, Files.readString(link) + "\n");
        assertThat(file.changedElsewhere()).isTrue();
        file.save(link);
        assertThat(file.changedElsewhere()).isFalse();
        Files.delete(link);
        assertThat(file.changedElsewhere()).isTrue();
    }

    @Test
    void fileThatCannotBeWrittenIsRefusedAndTheWorkStaysModified() throws InvalidScenarioException {
        file.open(link);
        narrow();
        assertThatThrownBy(() -> file.save(directory.resolve("missing").resolve("x.json")))
                .isInstanceOf(OutputFileException.class);
        assertThat(design.modifiedProperty().get()).isTrue();
        assertThat(file.pathProperty().get()).isEqualTo(link);
    }

    @Test
    void copyIsKeptWhileWorkIsUnsavedAndGoesWithSavingUndoingAndClosing() throws Exception {
        file.open(link);
        assertThat(copies).isEmptyDirectory();
        narrow();
        assertThat(copies).isNotEmptyDirectory();
        design.undo();
        assertThat(held()).isFalse();
        narrow();
        file.save(link);
        assertThat(held()).isFalse();
        design.undo();
        assertThat(held()).isTrue();
        file.closed();
        assertThat(held()).isFalse();
    }

    /** Whether a copy holds a scenario; a lock of the running program may stay. */
    private boolean held() throws IOException {
        try (var files = Files.walk(copies)) {
            return files.filter(Files::isRegularFile).anyMatch(each -> {
                try {
                    return Files.readString(each).contains("formatVersion");
                } catch (IOException e) {
                    return false;
                }
            });
        }
    }

    @Test
    void starterTakesThePlaceOfTheFile() throws InvalidScenarioException {
        file.open(link);
        file.begin(Preset.CONTINUOUS);
        assertThat(file.pathProperty().get()).isNull();
        assertThat(design.scenario().pulsed()).isFalse();
        assertThat(design.modifiedProperty().get()).isFalse();
        for (Preset preset : List.of(Preset.values())) {
            assertThat(LinkFile.starter(preset).text()).isEqualTo(preset.scenario());
        }
    }
}
