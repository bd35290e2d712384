package binspan.planner.view;

import binspan.planner.viewmodel.VerdictRoom;
import binspan.planner.viewmodel.VerdictSheet;
import binspan.planner.viewmodel.Words;
import javafx.css.PseudoClass;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** The foot of the verdict: the tightest headroom and the number of cautions, which lead to the headroom page, and what the marks of change mean. */
final class VerdictFoot extends VBox {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final Hyperlink tightest;
    private final Hyperlink cautions;
    private final Label computing = Columns.label(Words.of("verdict.computing"), "computing");
    private final Label legend = Columns.label(Words.of("verdict.change.legend"), "soft", "small");

    /**
     * An empty foot.
     *
     * @param showRoom shows the headroom page
     */
    VerdictFoot(Runnable showRoom) {
        getStyleClass().add("verdict-foot");
        tightest = link("verdict-tightest", showRoom);
        tightest.setWrapText(true);
        cautions = link("verdict-cautions", showRoom);
        cautions.setMinWidth(USE_PREF_SIZE);
        computing.setId("verdict-computing");
        showComputing(false);
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox last = new HBox(cautions, gap, computing, legend);
        last.getStyleClass().add("line");
        getChildren().addAll(tightest, last);
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

    private static void present(Region part, boolean wanted) {
        part.setVisible(wanted);
        part.setManaged(wanted);
    }

    void showComputing(boolean busy) {
        present(computing, busy);
    }

    void showStale(boolean old) {
        tightest.pseudoClassStateChanged(STALE, old);
    }

    void show(VerdictSheet sheet) {
        int count = sheet.cautions().size();
        cautions.setText(count == 0 ? Words.of("verdict.cautions.no") : Words.of("verdict.cautions", count));
        present(legend, sheet.figuresChanged());
    }

    /** Shows the headroom; null while it is searched. */
    void show(VerdictRoom room) {
        if (room == null) {
            tightest.setText(Words.of("verdict.computing"));
            return;
        }
        tightest.setText(room.tightest()
                .map(row -> Words.of("verdict.tightest", row.name(), row.sidedLimit()))
                .orElse(Words.of("verdict.tightest.none")));
    }
}
