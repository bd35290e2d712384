package binspan.planner.view;

import binspan.planner.report.VerdictHeadroom;
import binspan.planner.report.VerdictNotes;
import binspan.planner.report.VerdictStability;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.PartOfPath;
import binspan.planner.viewmodel.ScenarioChange;
import binspan.planner.viewmodel.VerdictModel;
import binspan.planner.viewmodel.VerdictRoom;
import binspan.planner.viewmodel.VerdictSheet;
import binspan.planner.viewmodel.VerdictText;
import binspan.planner.viewmodel.Words;
import binspan.prediction.Caution;
import java.util.List;
import javafx.css.PseudoClass;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** The page of headroom, stability, cautions and what has changed since the link was saved. */
public final class RoomPage extends BorderPane {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");
    private static final KeyCombination COPY = new KeyCodeCombination(KeyCode.C, KeyCombination.SHORTCUT_DOWN);
    private static final double[] HALVES = {50.0, 50.0};

    private final VerdictModel model;
    private final HeadroomTable table;
    private final Label title = Columns.label("", "heading");
    private final Label computing = Columns.label(Words.of("verdict.computing"), "computing");
    private final VBox stability = block("room-stability");
    private final VBox cautions = block("room-cautions");
    private final VBox changes = block("room-changes");
    private final VBox safety = block("room-safety");
    private VerdictSheet shown;

    /**
     * Shows the room of a verdict.
     *
     * @param model what is shown
     * @param design whose selection follows the chosen quantity
     * @param look scale of the table
     */
    public RoomPage(VerdictModel model, Design design, Look look) {
        this.model = model;
        this.table = new HeadroomTable(
                look, row -> design.selectionProperty().set(PartOfPath.find(design.scenario(), row.path())));
        getStyleClass().addAll("panel", "room");
        setId("room");
        build();
        model.sheetProperty().addListener((source, before, sheet) -> show(sheet));
        model.fullProperty().addListener((source, before, room) -> show(room));
        table.showComputing();
        if (model.sheetProperty().get() != null) {
            show(model.sheetProperty().get());
        }
        if (model.fullProperty().get() != null) {
            show(model.fullProperty().get());
        }
        computing.setVisible(false);
        Staleness.follow(model.fullStaleProperty(), old -> {
            table.pseudoClassStateChanged(STALE, old);
            stability.pseudoClassStateChanged(STALE, old);
            computing.setVisible(old);
        });
        addEventFilter(KeyEvent.KEY_PRESSED, event -> {
            if (COPY.match(event)) {
                copy();
                event.consume();
            }
        });
    }

    private static VBox block(String id) {
        VBox block = new VBox();
        block.setId(id);
        block.getStyleClass().add("room-block");
        block.setFocusTraversable(true);
        block.setAccessibleRole(AccessibleRole.TEXT);
        block.setOnMousePressed(event -> block.requestFocus());
        return block;
    }

    private void build() {
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox head = new HBox(title, Columns.label(VerdictHeadroom.ORDER, "soft", "small"), gap, computing);
        head.getStyleClass().add("room-head");
        title.setMinWidth(Region.USE_PREF_SIZE);
        VBox left = new VBox(cautions, safety);
        VBox right = new VBox(stability, changes);
        left.getStyleClass().add("room-column");
        right.getStyleClass().add("room-column");
        GridPane columns = Columns.grid(HALVES);
        columns.getStyleClass().add("room-columns");
        columns.addRow(0, left, right);
        VBox content = new VBox(head, table, columns);
        content.getStyleClass().add("room-content");
        ScrollPane scroll = new ScrollPane(content);
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setId("room-scroll");
        setCenter(scroll);
    }

    private void show(VerdictRoom room) {
        title.setText(room.title());
        table.show(room);
        List<Node> lines = room.limits().stream()
                .map(limit -> pair(limit.quantity(), limit.value()))
                .toList();
        fill(stability, VerdictStability.TITLE, lines, Words.of("verdict.stability.none"));
        if (!lines.isEmpty()) {
            stability.getChildren().add(1, Columns.wrapped(VerdictStability.MEANING, "soft", "small"));
        }
        stability.setAccessibleText(VerdictStability.TITLE + ": "
                + joined(room.limits().stream()
                        .map(limit -> limit.quantity() + " " + limit.value())
                        .toList()));
    }

    /** Renews what differs from the last sheet: during a drag that is little. */
    private void show(VerdictSheet sheet) {
        VerdictSheet last = shown;
        shown = sheet;
        if (last == null || !last.cautions().equals(sheet.cautions())) {
            showCautions(sheet);
        }
        if (last == null || !last.changes().equals(sheet.changes())) {
            showChanges(sheet);
        }
        if (last == null || !last.safety().equals(sheet.safety())) {
            showSafety(sheet);
        }
    }

    private void showCautions(VerdictSheet sheet) {
        List<String> warnings = sheet.cautions().stream().map(VerdictText::line).toList();
        List<Node> lines = sheet.cautions().stream().map(RoomPage::caution).toList();
        fill(cautions, VerdictNotes.CAUTIONS, lines, Words.of("verdict.cautions.none"));
        cautions.setAccessibleText(VerdictNotes.CAUTIONS + ": " + joined(warnings));
    }

    private void showChanges(VerdictSheet sheet) {
        String heading = Words.of("verdict.changes");
        List<String> texts = sheet.changes().stream().map(ScenarioChange::text).toList();
        fill(changes, heading, paragraphs(texts), Words.of("verdict.changes.none"));
        changes.setAccessibleText(heading + ": " + joined(texts));
    }

    private void showSafety(VerdictSheet sheet) {
        fill(safety, VerdictNotes.SAFETY, paragraphs(sheet.safety()), "");
        safety.setAccessibleText(VerdictNotes.SAFETY + ": " + joined(sheet.safety()));
    }

    private static List<Node> paragraphs(List<String> texts) {
        return texts.stream().map(text -> (Node) Columns.wrapped(text)).toList();
    }

    private static String joined(List<String> lines) {
        return String.join("; ", lines);
    }

    private static void fill(VBox block, String title, List<Node> lines, String empty) {
        block.getChildren().setAll(Columns.wrapped(title, "heading"));
        if (lines.isEmpty()) {
            block.getChildren().add(Columns.wrapped(empty, "soft"));
        } else {
            block.getChildren().addAll(lines);
        }
    }

    private static Node caution(Caution caution) {
        Label text = Columns.wrapped(VerdictText.line(caution));
        HBox line = new HBox(Columns.label("!", "warn", "sign"), text);
        line.getStyleClass().add("line");
        return line;
    }

    private static Node pair(String name, String value) {
        Label quantity = Columns.wrapped(name);
        quantity.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(quantity, Priority.ALWAYS);
        Label figure = Columns.label(value, "figure");
        figure.setMinWidth(Region.USE_PREF_SIZE);
        HBox pair = new HBox(quantity, figure);
        pair.getStyleClass().add("line");
        return pair;
    }

    /** Puts the page as text on the clipboard. */
    private void copy() {
        if (model.sheetProperty().get() != null) {
            ClipboardContent content = new ClipboardContent();
            content.putString(VerdictText.of(
                    model.sheetProperty().get(), model.fullProperty().get()));
            Clipboard.getSystemClipboard().setContent(content);
        }
    }
}
