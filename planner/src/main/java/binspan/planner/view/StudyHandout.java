package binspan.planner.view;

import binspan.planner.export.StudyFiles;
import binspan.planner.export.StudyReport;
import binspan.planner.io.OutputFileException;
import binspan.planner.report.TextStyle;
import binspan.planner.viewmodel.Background;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.Words;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.function.Supplier;
import javafx.beans.value.ObservableValue;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.image.Image;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;

/** Copies and exports what a study has found; everything is made and written in the background. */
final class StudyHandout {
    private static final TextStyle PLAIN = new TextStyle(false, true);

    private final String name;
    private final Design design;
    private final Background background;
    private final ObservableValue<StudyReport> report;
    private final Supplier<Image> picture;
    private final FileQuestions files;

    /**
     * The handout of a study.
     *
     * @param name its name, which ids and file names hold
     * @param desk the link and where files are made
     * @param report what it has to show, null before it is done
     * @param picture the picture as it is on the screen, null where there is none
     * @param files asks for file names
     */
    StudyHandout(
            String name, Desk desk, ObservableValue<StudyReport> report, Supplier<Image> picture, FileQuestions files) {
        this.name = name;
        this.design = desk.design();
        this.background = desk.background();
        this.report = report;
        this.picture = picture;
        this.files = files;
    }

    /** The link and where files are made. */
    record Desk(Design design, Background background) {}

    /** Writes a report to a file. */
    @FunctionalInterface
    private interface Writing {
        void to(StudyReport report, String file, boolean replace) throws OutputFileException;
    }

    /** The menus to copy and to export. */
    List<MenuButton> menus() {
        MenuItem copied = item("copy.picture", this::copyPicture);
        MenuButton copy = menu(
                "copy",
                copied,
                item("copy.table", () -> copy("table", () -> StudyFiles.csvText(report()))),
                item(
                        "copy.summary",
                        () -> copy("summary", () -> report().summary().apply(PLAIN))));
        copied.disableProperty().bind(undrawn());
        return List.of(copy, export());
    }

    /** Whether there is no picture to hand out. */
    private ObservableValue<Boolean> undrawn() {
        return report.map(found -> found.picture().isEmpty()).orElse(true);
    }

    /** The menu to export. */
    MenuButton export() {
        MenuItem png = item("export.png", () -> export(".png", StudyFiles::picture));
        MenuItem svg = item("export.svg", () -> export(".svg", StudyFiles::picture));
        png.disableProperty().bind(undrawn());
        svg.disableProperty().bind(undrawn());
        return menu(
                "export",
                item("export.csv", () -> export(".csv", StudyFiles::csv)),
                item("export.json", () -> export(".json", StudyFiles::json)),
                png,
                svg);
    }

    private MenuButton menu(String key, MenuItem... items) {
        MenuButton button = new MenuButton(Words.of("studies." + key), null, items);
        button.setId(name + "-" + key);
        return button;
    }

    private MenuItem item(String key, Runnable action) {
        MenuItem item = new MenuItem(Words.of("studies." + key));
        item.setId(name + "-" + key.replace('.', '-'));
        item.setOnAction(event -> action.run());
        return item;
    }

    private StudyReport report() {
        return report.getValue();
    }

    private void copyPicture() {
        Image image = picture.get();
        if (image != null) {
            ClipboardContent content = new ClipboardContent();
            content.putImage(image);
            put(content, "picture");
        }
    }

    private void copy(String what, Supplier<String> text) {
        background.workers().execute(() -> {
            String made = text.get();
            background.window().execute(() -> {
                ClipboardContent content = new ClipboardContent();
                content.putString(made);
                put(content, what);
            });
        });
    }

    private void put(ClipboardContent content, String what) {
        Clipboard.getSystemClipboard().setContent(content);
        design.notice(Words.of("studies.copied", Words.of("studies." + what)));
    }

    private void export(String ending, Writing writing) {
        String kind = ending.substring(1).toUpperCase(Locale.ROOT);
        StudyReport report = report();
        files.toSave(Words.of("studies.export.title"), proposed() + ending, kind, ending)
                .ifPresent(file -> background.workers().execute(() -> write(report, file, writing)));
    }

    private String proposed() {
        String words = design.scenario().name().toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]+", "-");
        return words + "-" + name;
    }

    /** The question has settled already whether an existing file is replaced. */
    private void write(StudyReport report, Path file, Writing writing) {
        String words;
        try {
            writing.to(report, file.toString(), true);
            words = Words.of("studies.export.written", file);
        } catch (OutputFileException e) {
            words = e.getMessage();
        }
        String said = words;
        background.window().execute(() -> design.notice(said));
    }
}
