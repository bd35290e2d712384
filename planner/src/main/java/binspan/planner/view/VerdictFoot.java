package binspan.planner.view;

import binspan.planner.viewmodel.VerdictRoom;
import binspan.planner.viewmodel.VerdictSheet;
import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.Optional;
import javafx.css.PseudoClass;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** The foot of the verdict: what is tightest, cautions and changes in a line each as far as there is room; every line leads to the headroom page. */
final class VerdictFoot extends VBox {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final Hyperlink tightest;
    private final Hyperlink next;
    private final Hyperlink caution;
    private final Hyperlink changes;
    private final Hyperlink cautions;
    private final Label computing = Columns.label(Words.of("verdict.computing"), "computing");
    private final Label legend = Columns.label(Words.of("verdict.change.legend"), "soft", "small");
    private final HBox last;

    /**
     * An empty foot.
     *
     * @param showRoom shows the headroom page
     */
    VerdictFoot(Runnable showRoom) {
        getStyleClass().add("verdict-foot");
        tightest = link("verdict-tightest", showRoom);
        tightest.setWrapText(true);
        next = line("verdict-next", showRoom);
        caution = line("verdict-caution", showRoom);
        changes = line("verdict-changes", showRoom);
        cautions = link("verdict-cautions", showRoom);
        cautions.setMinWidth(USE_PREF_SIZE);
        computing.setId("verdict-computing");
        showComputing(false);
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        last = new HBox(cautions, gap, computing, legend);
        last.getStyleClass().add("line");
        getChildren().addAll(tightest, next, changes, caution, last);
    }

    private static Hyperlink link(String id, Runnable showRoom) {
        Hyperlink link = new Hyperlink();
        link.setId(id);
        link.setTooltip(new Tooltip(Words.of("verdict.tightest.help")));
        link.setOnAction(event -> {
            link.setVisited(false);
            showRoom.run();
        });
        return link;
    }

    /** A link of one line that may be left out, cut at the width of the foot. */
    private static Hyperlink line(String id, Runnable showRoom) {
        Hyperlink line = link(id, showRoom);
        line.setPrefWidth(0.0);
        line.setMaxWidth(Double.MAX_VALUE);
        present(line, false);
        return line;
    }

    private static void present(Region part, boolean wanted) {
        part.setVisible(wanted);
        part.setManaged(wanted);
    }

    void showComputing(boolean busy) {
        present(computing, busy);
    }

    void showStale(boolean old) {
        tightest.pseudoClassStateChanged(STALE, old);
        next.pseudoClassStateChanged(STALE, old);
    }

    void show(VerdictSheet sheet) {
        int count = sheet.cautions().size();
        cautions.setText(count == 0 ? Words.of("verdict.cautions.no") : Words.of("verdict.cautions", count));
        caution.setText(
                count == 0
                        ? ""
                        : Words.of(
                                "verdict.cautions.first",
                                sheet.cautions().get(0).text()));
        int changed = sheet.changes().size();
        changes.setText(changed == 0 ? "" : Words.of("verdict.changes.count", changed));
        present(legend, sheet.figuresChanged());
    }

    /** Shows the headroom; null while it is searched. */
    void show(VerdictRoom room) {
        if (room == null) {
            tightest.setText(Words.of("verdict.computing"));
            return;
        }
        tightest.setText(text("verdict.tightest", room.tightest()).orElse(Words.of("verdict.tightest.none")));
        next.setText(text("verdict.tightest.next", room.nextTightest()).orElse(""));
    }

    private static Optional<String> text(String key, Optional<VerdictRoom.Row> row) {
        return row.map(each -> Words.of(key, each.name(), each.sidedLimit()));
    }

    /** Presents as many lines as a height holds: the next tightest first, then changes, then the first caution. */
    void fit(double width, double height) {
        double inside = width - snappedLeftInset() - snappedRightInset();
        double left = height
                - snappedTopInset()
                - snappedBottomInset()
                - tightest.prefHeight(inside)
                - last.prefHeight(inside);
        double line = cautions.prefHeight(-1.0);
        for (Hyperlink each : List.of(next, changes, caution)) {
            boolean wanted = !each.getText().isEmpty() && line <= left;
            present(each, wanted);
            left -= wanted ? line : 0.0;
        }
    }
}
