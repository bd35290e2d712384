package binspan.planner.view;

import binspan.planner.report.TextStyle;
import binspan.planner.viewmodel.FigureGroup;
import binspan.planner.viewmodel.VerdictModel;
import binspan.planner.viewmodel.VerdictRoom;
import binspan.planner.viewmodel.VerdictSheet;
import java.util.ArrayList;
import java.util.List;
import javafx.css.PseudoClass;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.VBox;

/** The verdict beside the link: whether it meets its requirements, what the visibility is lost to, figures of merit, and links to the headroom page. */
public final class VerdictPane extends BorderPane {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final Label headline = Columns.wrapped("", "headline");
    private final RequirementsView requirements = new RequirementsView();
    private final BudgetView budget = new BudgetView();
    private final List<FiguresView> figures = new ArrayList<>();
    private final VBox groups = new VBox();
    private final VBox content = new VBox();
    private final VerdictFoot foot;

    /**
     * Shows a verdict.
     *
     * @param model what is shown
     * @param showHeadroom shows the page with headroom, stability, cautions and changes
     */
    public VerdictPane(VerdictModel model, Runnable showHeadroom) {
        getStyleClass().addAll("panel", "verdict");
        setId("verdict");
        foot = new VerdictFoot(showHeadroom);
        build();
        model.sheetProperty().addListener((source, before, sheet) -> show(sheet));
        model.fullProperty().addListener((source, before, room) -> showRoom(room));
        if (model.sheetProperty().get() != null) {
            show(model.sheetProperty().get());
        }
        showRoom(model.fullProperty().get());
        Staleness.follow(model.sheetStaleProperty(), old -> {
            content.pseudoClassStateChanged(STALE, old);
            headline.pseudoClassStateChanged(STALE, old);
            foot.showComputing(old);
        });
        Staleness.follow(model.fullStaleProperty(), foot::showStale);
    }

    private void build() {
        headline.setId("verdict-headline");
        headline.setMaxWidth(Double.MAX_VALUE);
        headline.setFocusTraversable(true);
        headline.setAccessibleRole(AccessibleRole.TEXT);
        content.getStyleClass().add("verdict-content");
        content.getChildren().addAll(requirements, budget, groups);
        groups.getStyleClass().add("figure-groups");
        ScrollPane scroll = new ScrollPane(content);
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setFocusTraversable(false);
        scroll.setId("verdict-scroll");
        setTop(headline);
        setCenter(scroll);
        setBottom(foot);
    }

    private void show(VerdictSheet sheet) {
        String sign = sheet.met() ? TextStyle.PLAIN_UNICODE.met() : TextStyle.PLAIN_UNICODE.notMet();
        headline.setText(sheet.judged() ? sign + " " + sheet.headline() : sheet.headline());
        headline.setAccessibleText(sheet.headline());
        String state = !sheet.judged() ? "unjudged" : sheet.met() ? "meets" : "fails";
        Columns.restyle(headline, "label", "headline", state);
        requirements.show(sheet.requirements());
        budget.show(sheet.budget());
        show(sheet.figures());
        foot.show(sheet);
        requestLayout();
    }

    private void show(List<FigureGroup> shown) {
        if (figures.size() != shown.size()) {
            figures.clear();
            shown.forEach(group -> figures.add(new FiguresView()));
            groups.getChildren().setAll(figures);
        }
        for (int i = 0; i < figures.size(); i++) {
            figures.get(i).setId("verdict-figures-" + (i + 1));
            figures.get(i).show(shown.get(i));
        }
    }

    private void showRoom(VerdictRoom room) {
        foot.show(room);
        requestLayout();
    }
}
