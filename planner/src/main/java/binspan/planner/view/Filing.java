package binspan.planner.view;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.io.Preset;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.FormModel.RefusedEntry;
import binspan.planner.viewmodel.LinkFile;
import binspan.planner.viewmodel.Words;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Supplier;
import javafx.scene.control.Alert.AlertType;

/** Opens and saves scenario files, asking where something could be lost. */
final class Filing {
    private static final String ENDING = ".json";

    private final Design design;
    private final LinkFile file;
    private final FileQuestions files;
    private final Notices notices;
    private final Supplier<Optional<RefusedEntry>> refused;

    /**
     * Files of a design.
     *
     * @param design what is saved
     * @param file where
     * @param files asks for file names
     * @param notices asks the rest
     * @param refused an entry that is shown and not part of the design
     */
    Filing(
            Design design,
            LinkFile file,
            FileQuestions files,
            Notices notices,
            Supplier<Optional<RefusedEntry>> refused) {
        this.design = design;
        this.file = file;
        this.files = files;
        this.notices = notices;
        this.refused = refused;
    }

    /** Begins with a starter, unless unsaved changes are to be kept. */
    void begin(Preset preset) {
        if (mayLeave()) {
            file.begin(preset);
        }
    }

    /** Asks for a file and opens it. */
    void open() {
        if (mayLeave()) {
            files.toOpen(Words.of("file.open.title"), Words.of("file.kind.scenario"), ENDING)
                    .ifPresent(this::opening);
        }
    }

    /** Opens a file. */
    void open(Path path) {
        if (mayLeave()) {
            opening(path);
        }
    }

    private void opening(Path path) {
        opened(path).ifPresent(errors -> refuse(path, errors));
    }

    /** Opens a file; gives what is wrong with one that cannot be opened, the present link then stays. */
    Optional<InvalidScenarioException> opened(Path path) {
        try {
            file.open(path);
            files.begin(path);
            return Optional.empty();
        } catch (InvalidScenarioException e) {
            return Optional.of(e);
        }
    }

    /** Tells why a file cannot be opened. */
    void refuse(Path path, InvalidScenarioException errors) {
        notices.lines(
                AlertType.ERROR,
                Words.of("file.open.title"),
                Words.of("file.open.refused", path.getFileName()),
                errors.lines());
    }

    /** Saves; asks for a name where there is none yet. */
    boolean save() {
        Path path = file.pathProperty().get();
        if (path == null) {
            return saveAs();
        }
        boolean may = mayLeaveOut()
                && (!file.changedElsewhere()
                        || notices.confirmed(
                                Words.of("file.save.title"),
                                Words.of("file.save.changedElsewhere", path.getFileName()),
                                Words.of("file.save.replace")));
        return may && written(path);
    }

    /** A refused entry is not saved, which nobody should learn from the file. */
    private boolean mayLeaveOut() {
        return refused.get()
                .map(entry -> notices.confirmed(
                        Words.of("file.save.title"),
                        Words.of("file.save.refused", entry.text(), entry.path(), entry.part(), entry.error()),
                        Words.of("file.save.without")))
                .orElse(true);
    }

    /** Asks for a name and saves. */
    boolean saveAs() {
        if (!mayLeaveOut()) {
            return false;
        }
        Path path = file.pathProperty().get();
        String proposed = path == null ? fileName(design.scenario().name()) : String.valueOf(path.getFileName());
        Optional<Path> answer =
                files.toSave(Words.of("file.saveAs.title"), proposed, Words.of("file.kind.scenario"), ENDING);
        return answer.isPresent() && written(answer.get());
    }

    private boolean written(Path path) {
        try {
            file.save(path);
            design.notice(Words.of("file.saved", path));
            return true;
        } catch (OutputFileException e) {
            notices.say(AlertType.ERROR, Words.of("file.save.title"), e.getMessage());
            return false;
        }
    }

    /** Whether the present link may be left: nothing unsaved, or saved now, or given up on purpose. */
    boolean mayLeave() {
        if (!design.modifiedProperty().get()) {
            return true;
        }
        return switch (notices.unsaved(design.scenario().name())) {
            case SAVE -> save();
            case DISCARD -> true;
            case CANCEL -> false;
        };
    }

    /** A file name made of a link's name: "Kestrel Dam to Millbrook" gives kestrel-dam-to-millbrook.json. */
    static String fileName(String link) {
        String plain = link.toLowerCase(java.util.Locale.ROOT).replaceAll("[^a-z0-9]+", "-");
        String trimmed = plain.replaceAll("^-|-$", "");
        return (trimmed.isEmpty() ? "link" : trimmed) + ENDING;
    }
}
