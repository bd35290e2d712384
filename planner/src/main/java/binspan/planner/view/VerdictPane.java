package binspan.planner.view;

import binspan.planner.report.TextStyle;
import binspan.planner.viewmodel.FigureGroup;
import binspan.planner.viewmodel.VerdictModel;
import binspan.planner.viewmodel.VerdictRoom;
import binspan.planner.viewmodel.VerdictSheet;
import binspan.planner.viewmodel.Words;
import java.util.ArrayList;
import java.util.List;
import javafx.css.PseudoClass;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** The verdict beside the link: whether it meets its requirements, what the visibility is lost to, figures of merit, and links to the room page. */
public final class VerdictPane extends BorderPane {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final Label headline = Columns.wrapped("", "headline");
    private final Label computing = Columns.label(Words.of("verdict.computing"), "computing");
    private final Label legend = Columns.label(Words.of("verdict.change.legend"), "soft", "small");
    private final RequirementsView requirements = new RequirementsView();
    private final BudgetView budget = new BudgetView();
    private final List<FiguresView> figures = new ArrayList<>();
    private final VBox groups = new VBox();
    private final VBox content = new VBox();
    private final Hyperlink tightest = new Hyperlink();
    private final Hyperlink cautions = new Hyperlink();

    /**
     * Shows a verdict.
     *
     * @param model what is shown
     * @param showRoom shows the page with headroom, stability, cautions and changes
     */
    public VerdictPane(VerdictModel model, Runnable showRoom) {
        getStyleClass().addAll("panel", "verdict");
        setId("verdict");
        build(showRoom);
        model.sheetProperty().addListener((source, before, sheet) -> show(sheet));
        model.fullProperty().addListener((source, before, room) -> show(room));
        if (model.sheetProperty().get() != null) {
            show(model.sheetProperty().get());
        }
        show(model.fullProperty().get());
        Staleness.follow(model.sheetStaleProperty(), old -> {
            content.pseudoClassStateChanged(STALE, old);
            headline.pseudoClassStateChanged(STALE, old);
            computing.setVisible(old);
            computing.setManaged(old);
        });
        Staleness.follow(model.fullStaleProperty(), old -> tightest.pseudoClassStateChanged(STALE, old));
    }

    private void build(Runnable showRoom) {
        headline.setId("verdict-headline");
        headline.setMaxWidth(Double.MAX_VALUE);
        headline.setFocusTraversable(true);
        headline.setAccessibleRole(AccessibleRole.TEXT);
        computing.setVisible(false);
        computing.setManaged(false);
        computing.setId("verdict-computing");
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
        setBottom(foot(showRoom));
    }

    private VBox foot(Runnable showRoom) {
        tightest.setId("verdict-tightest");
        cautions.setId("verdict-cautions");
        for (Hyperlink link : List.of(tightest, cautions)) {
            link.setTooltip(new Tooltip(Words.of("verdict.tightest.help")));
            link.setWrapText(true);
            link.setOnAction(event -> {
                link.setVisited(false);
                showRoom.run();
            });
        }
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox last = new HBox(cautions, gap, computing, legend);
        last.getStyleClass().add("line");
        VBox foot = new VBox(tightest, last);
        foot.getStyleClass().add("verdict-foot");
        return foot;
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
        int count = sheet.cautions().size();
        cautions.setText(count == 0 ? Words.of("verdict.cautions.no") : Words.of("verdict.cautions", count));
        legend.setVisible(sheet.figuresChanged());
        legend.setManaged(sheet.figuresChanged());
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

    private void show(VerdictRoom room) {
        tightest.setText(
                room == null
                        ? Words.of("verdict.computing")
                        : room.tightest()
                                .map(row -> Words.of("verdict.tightest", row.name(), row.room()))
                                .orElse(Words.of("verdict.tightest.none")));
    }
}
