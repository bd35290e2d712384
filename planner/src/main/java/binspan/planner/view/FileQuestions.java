package binspan.planner.view;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.stage.FileChooser;
import javafx.stage.FileChooser.ExtensionFilter;
import javafx.stage.Window;

/** Asks which file is meant. The system's own dialogs answer; tests answer themselves. */
class FileQuestions {
    private final Window owner;
    private Path directory;

    /** Dialogs of a window that begin in a directory, which may be null. */
    FileQuestions(Window owner, Path directory) {
        this.owner = owner;
        this.directory = directory;
    }

    /** A file to read. */
    Optional<Path> toOpen(String title, String kind, String ending) {
        return answered(chooser(title, kind, List.of("*" + ending)).showOpenDialog(owner));
    }

    /** A file to write; the dialog asks before an existing one is chosen. */
    Optional<Path> toSave(String title, String proposed, String kind, String... endings) {
        FileChooser chooser = chooser(
                title, kind, List.of(endings).stream().map(each -> "*" + each).toList());
        chooser.setInitialFileName(proposed);
        return answered(chooser.showSaveDialog(owner));
    }

    /** Begins the next questions in the directory of a file. */
    final void begin(Path file) {
        directory = file.toAbsolutePath().getParent();
    }

    /** The directory of the last answer, null before the first. */
    Path directory() {
        return directory;
    }

    private FileChooser chooser(String title, String kind, List<String> patterns) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().add(new ExtensionFilter(kind, patterns));
        if (directory != null && directory.toFile().isDirectory()) {
            chooser.setInitialDirectory(directory.toFile());
        }
        return chooser;
    }

    private Optional<Path> answered(File file) {
        if (file == null) {
            return Optional.empty();
        }
        begin(file.toPath());
        return Optional.of(file.toPath());
    }
}
