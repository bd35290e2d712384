package binspan.planner.view;

import binspan.planner.export.CheckForm;
import binspan.planner.io.OutputFileException;
import binspan.planner.io.WholeFile;
import binspan.planner.plot.PngImage;
import binspan.planner.viewmodel.LatestTask;
import binspan.planner.viewmodel.PlannerModel;
import binspan.planner.viewmodel.Words;
import binspan.prediction.LinkCheck;
import binspan.scenario.Scenario;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.scene.SnapshotParameters;
import javafx.scene.image.WritableImage;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.layout.Region;
import javafx.scene.transform.Transform;

/** Hands out what the window shows: verdicts and pictures, to files and to the clipboard. */
final class Exports {
    /** Pixels for each pixel of the window, so that pictures stay sharp in print. */
    private static final double SHARPNESS = 2.0;

    private final PlannerModel model;
    private final FileQuestions files;
    private final LatestTask task;
    private final Supplier<Region> whole;
    private final Supplier<Region> page;
    private final Supplier<Region> link;

    /**
     * Exports of a window.
     *
     * @param model what it shows
     * @param files asks for file names
     * @param task computes in the background
     * @param regions the whole window, the page that is shown and the link
     */
    Exports(PlannerModel model, FileQuestions files, LatestTask task, Regions regions) {
        this.model = model;
        this.files = files;
        this.task = task;
        this.whole = regions.whole();
        this.page = regions.page();
        this.link = regions.link();
    }

    /** What pictures are taken of. */
    record Regions(Supplier<Region> whole, Supplier<Region> page, Supplier<Region> link) {}

    /** The verdict as the command line prints it, into a file. */
    void verdict() {
        check(CheckForm.VERDICT, ".txt", "file.kind.text");
    }

    /** The verdict for programs. */
    void json() {
        check(CheckForm.JSON, ".json", "file.kind.json");
    }

    /** The calculation line by line. */
    void worksheet() {
        check(CheckForm.WORKSHEET, ".txt", "file.kind.text");
    }

    private void check(CheckForm form, String ending, String kind) {
        String proposed = proposed(Words.of("file.name." + form.name()), ending);
        Optional<String> file = files.toSave(Words.of("file.export.title"), proposed, Words.of(kind), ending)
                .map(Object::toString);
        file.ifPresent(name -> checked(check -> write(() -> form.write(check, name, true), name)));
    }

    private String proposed(String what, String ending) {
        String name = Filing.fileName(model.design().scenario().name());
        return name.substring(0, name.lastIndexOf('.')) + "-" + what + ending;
    }

    /** Puts the verdict on the clipboard. */
    void copyVerdict() {
        checked(check -> {
            ClipboardContent content = new ClipboardContent();
            content.putString(CheckForm.VERDICT.plain(check));
            copied(content);
        });
    }

    private void checked(Consumer<LinkCheck> use) {
        Scenario scenario = model.design().scenario();
        task.run(progress -> LinkCheck.of(scenario), use);
    }

    /** A picture of the whole window into a PNG file. */
    void window() {
        WritableImage image = picture(whole.get());
        files.toSave(
                        Words.of("file.export.title"),
                        proposed(Words.of("file.name.WINDOW"), ".png"),
                        Words.of("file.kind.picture"),
                        ".png")
                .map(Object::toString)
                .ifPresent(name -> write(
                        () -> WholeFile.write(name, out -> out.write(PngImage.encoded(FxImages.of(image))), true),
                        name));
    }

    /** Puts a picture of the page on the clipboard. */
    void copyPage() {
        copy(page.get());
    }

    /** Puts a picture of the link on the clipboard. */
    void copyLink() {
        copy(link.get());
    }

    private void copy(Region region) {
        ClipboardContent content = new ClipboardContent();
        content.putImage(picture(region));
        copied(content);
    }

    private void copied(ClipboardContent content) {
        Clipboard.getSystemClipboard().setContent(content);
        model.design().notice(Words.of("dialog.copied"));
    }

    private static WritableImage picture(Region region) {
        SnapshotParameters sharp = new SnapshotParameters();
        sharp.setTransform(Transform.scale(SHARPNESS, SHARPNESS));
        return region.snapshot(sharp, null);
    }

    /** Writes a file. */
    @FunctionalInterface
    private interface Writing {
        void run() throws OutputFileException;
    }

    private void write(Writing writing, String name) {
        try {
            writing.run();
            model.design().notice(Words.of("file.written", name));
        } catch (OutputFileException e) {
            model.design().notice(e.getMessage());
        }
    }
}
