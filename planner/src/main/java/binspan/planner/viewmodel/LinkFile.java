package binspan.planner.viewmodel;

import binspan.planner.document.RecentFiles;
import binspan.planner.document.Recovery;
import binspan.planner.document.ScenarioDocument;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.io.Preset;
import binspan.planner.io.ScenarioReader;
import binspan.planner.io.WholeFile;
import java.nio.file.Path;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

/** The file of the link that is being designed: opening, saving, recent ones, the copy that survives a crash. */
public final class LinkFile {
    private final Design design;
    private final RecentFiles recentFiles;
    private final Recovery recovery;
    private final LatestTask copying;
    private final ReadOnlyObjectWrapper<Path> path = new ReadOnlyObjectWrapper<>(this, "path");
    private final ReadOnlyStringWrapper title = new ReadOnlyStringWrapper(this, "title", "");
    private final ObservableList<RecentFiles.Entry> recent = FXCollections.observableArrayList();
    /** What the file held when it was read or written; null without a file. */
    private String onDisk;

    private boolean ended;

    /**
     * The file of a design.
     *
     * @param design the link
     * @param recentFiles where recent files are listed
     * @param recovery where the copy of unsaved work is kept
     * @param background writes that copy
     */
    public LinkFile(Design design, RecentFiles recentFiles, Recovery recovery, Background background) {
        this.design = design;
        this.recentFiles = recentFiles;
        this.recovery = recovery;
        this.copying = LatestTask.quick(background);
        recent.setAll(recentFiles.entries());
        design.documentProperty().addListener((source, before, now) -> copy());
        design.modifiedProperty().addListener((source, before, now) -> retitle());
        design.scenarioProperty().addListener((source, before, now) -> retitle());
        retitle();
    }

    /** The file, null for a link that was never saved. */
    public ReadOnlyObjectProperty<Path> pathProperty() {
        return path.getReadOnlyProperty();
    }

    /** Title of the window: the file, or the link's name, and whether it has changed. */
    public ReadOnlyStringProperty titleProperty() {
        return title.getReadOnlyProperty();
    }

    /** Files opened or saved lately, the last one first. */
    public ObservableList<RecentFiles.Entry> recent() {
        return recent;
    }

    /**
     * Opens a file.
     *
     * @throws InvalidScenarioException if it holds no valid scenario, with everything that is wrong in it
     */
    public void open(Path file) throws InvalidScenarioException {
        String text = ScenarioReader.text(file.toString());
        ScenarioDocument document = ScenarioDocument.of(text, file.toString());
        onDisk = text;
        path.set(file);
        design.begin(document);
        remember(file);
    }

    /** Begins with a starter. */
    public void begin(Preset preset) {
        begin(starter(preset));
    }

    private void begin(ScenarioDocument document) {
        onDisk = null;
        path.set(null);
        design.begin(document);
        retitle();
    }

    /** The document of a starter. */
    public static ScenarioDocument starter(Preset preset) {
        try {
            return ScenarioDocument.of(preset.scenario(), preset.text());
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException("starter " + preset.text(), e);
        }
    }

    /** Whether another program has changed or removed the file since it was read or written. */
    public boolean changedElsewhere() {
        if (path.get() == null) {
            return false;
        }
        try {
            return !ScenarioReader.text(path.get().toString()).equals(onDisk);
        } catch (InvalidScenarioException e) {
            return true;
        }
    }

    /**
     * Saves into a file, which from then on is the file of this link.
     *
     * @throws OutputFileException if it cannot be written; the old one stays as it is
     */
    public void save(Path file) throws OutputFileException {
        String text = design.documentProperty().get().text();
        WholeFile.write(file.toString(), text, true);
        onDisk = text;
        path.set(file);
        design.markSaved();
        remember(file);
        copy();
        retitle();
    }

    /**
     * Takes up the work that a crash has left, on top of what its file holds where that is still the same.
     *
     * @throws InvalidScenarioException if the copy holds no valid scenario
     */
    public void recover(Recovery.Found found) throws InvalidScenarioException {
        ScenarioDocument left = ScenarioDocument.of(
                found.text(), found.original().map(Path::toString).orElse("recovered"));
        ScenarioDocument base = found.original().flatMap(this::read).orElse(null);
        boolean same = base != null && found.basedOn(base.text());
        // A file that is another now counts as changed elsewhere: saving asks before it replaces it.
        onDisk = same ? base.text() : null;
        path.set(found.original().orElse(null));
        design.resume(left, same ? base : null, Words.of("file.recovered.step"));
        copy();
        found.discard();
        design.notice(Words.of("file.recovered"));
        retitle();
    }

    private Optional<ScenarioDocument> read(Path file) {
        try {
            return Optional.of(ScenarioDocument.of(ScenarioReader.text(file.toString()), file.toString()));
        } catch (InvalidScenarioException e) {
            return Optional.empty();
        }
    }

    /** Removes the copy of unsaved work: the program ends in order. */
    public void closed() {
        copying.cancel();
        synchronized (recovery) {
            ended = true;
            recovery.clear();
        }
    }

    private void remember(Path file) {
        try {
            recentFiles.add(file);
        } catch (OutputFileException e) {
            design.notice(e.getMessage());
        }
        recent.setAll(recentFiles.entries());
        retitle();
    }

    private void copy() {
        boolean modified = design.modifiedProperty().get();
        String text = design.documentProperty().get().text();
        Path original = path.get();
        String saved = onDisk;
        copying.run(progress -> kept(modified, text, original, saved == null ? "" : saved), kept -> {
            if (!kept) {
                design.notice(Words.of("file.noCopy"));
            }
        });
    }

    /** Keeps the copy of unsaved work up to date; whether that could be done. */
    private boolean kept(boolean modified, String text, Path original, String saved) {
        // The end waits for a copy that is being written, and none is written after it.
        synchronized (recovery) {
            if (!modified || ended) {
                recovery.clear();
                return true;
            }
            try {
                recovery.write(text, original, saved);
                return true;
            } catch (OutputFileException e) {
                return false;
            }
        }
    }

    private void retitle() {
        String name = path.get() == null
                ? design.scenario().name() + " (" + Words.of("window.untitled") + ")"
                : String.valueOf(path.get().getFileName());
        String changed = design.modifiedProperty().get() ? Words.of("window.modified") : "";
        title.set(Words.of("window.title", name, changed));
    }
}
