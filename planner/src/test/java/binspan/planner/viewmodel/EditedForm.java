package binspan.planner.viewmodel;

import binspan.planner.document.ScenarioDocument;
import binspan.planner.io.InvalidScenarioException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** A form over a shipped scenario, as the window has it. */
public final class EditedForm {
    /** The scenarios that come with the program. */
    public static final List<String> SHIPPED = List.of(
            "eagle-tarn-to-saltmarsh",
            "fernhill-shared-trunk",
            "harrow-ridge-overhead-line",
            "kestrel-dam-to-millbrook",
            "orchard-lane-access",
            "stonebridge-to-lower-weir");

    private final Design design;
    private final FormModel form;

    /** Opens a shipped scenario. */
    public EditedForm(String name) {
        this(document(text(name)));
    }

    private EditedForm(ScenarioDocument document) {
        design = new Design(document);
        form = new FormModel(design, path -> design.documentProperty().get().states(path), design::apply);
    }

    /** A form over a text. */
    static EditedForm over(String text) {
        return new EditedForm(document(text));
    }

    /** The text of a shipped scenario. */
    static String text(String name) {
        try {
            return Files.readString(Path.of("..", "scenarios", name + ".json"));
        } catch (IOException e) {
            throw new IllegalStateException(name, e);
        }
    }

    private static ScenarioDocument document(String text) {
        try {
            return ScenarioDocument.of(text, "link.json");
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
    }

    /** The link behind it. */
    public Design design() {
        return design;
    }

    /** The form. */
    public FormModel form() {
        return form;
    }

    /** The text of the file as it is now. */
    public String text() {
        return design.documentProperty().get().text();
    }

    /** Selects a part. */
    public EditedForm select(LinkPart part) {
        form.select(part);
        return this;
    }

    /** The fields of the selected part. */
    List<FieldModel> fields() {
        return form.rows().stream().flatMap(FormRow::fields).toList();
    }

    /** A field of the selected part by its path. */
    public FieldModel field(String path) {
        return fields().stream()
                .filter(each -> each.path().equals(path))
                .findFirst()
                .orElseThrow();
    }

    /** The row of alternatives that has a field. */
    AlternativesModel alternatives(String path) {
        return form.rows().stream()
                .filter(AlternativesModel.class::isInstance)
                .map(AlternativesModel.class::cast)
                .filter(row -> row.forms().stream()
                        .anyMatch(form -> form.place().path().equals(path)))
                .findFirst()
                .orElseThrow();
    }
}
