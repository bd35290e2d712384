package binspan.planner.view;

import binspan.planner.report.Figure;
import binspan.planner.viewmodel.LinkItem;
import binspan.planner.viewmodel.LinkLayout.Column;
import binspan.planner.viewmodel.LinkModel;
import binspan.planner.viewmodel.LinkRoom;
import binspan.planner.viewmodel.Site;
import binspan.planner.viewmodel.Words;
import java.util.Optional;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/** The link, drawn: the top of the window. */
public final class LinkStrip extends VBox {
    private final LinkModel model;
    private final LinkDrawing drawing;
    private final ScrollPane scroll;
    private final LinkTools tools;
    private final LinkSplit split;
    private final StackPane bar;

    /**
     * Draws a link.
     *
     * @param model the link
     * @param look theme and scale
     */
    public LinkStrip(LinkModel model, Look look) {
        this.model = model;
        this.drawing = new LinkDrawing(model, look);
        this.tools = new LinkTools(model, this::openSplit);
        this.split = new LinkSplit(model, this::closeSplit);
        this.scroll = new ScrollPane(drawing);
        this.bar = new StackPane(tools);
        getStyleClass().addAll("panel", "link-strip");
        setAccessibleRole(AccessibleRole.TOOL_BAR);
        setAccessibleText(Words.of("link.strip"));
        scroll.setFitToHeight(true);
        scroll.setVbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setFocusTraversable(false);
        scroll.viewportBoundsProperty()
                .addListener((property, before, now) -> drawing.fill(Math.floor(now.getWidth())));
        VBox.setVgrow(scroll, Priority.ALWAYS);
        getChildren().addAll(head(), scroll);
        drawing.addEventHandler(KeyEvent.KEY_PRESSED, new LinkKeys(model, drawing, tools));
        model.selectedProperty().addListener((property, before, now) -> reveal(now.intValue()));
        drawing.placesProperty()
                .addListener((property, before, now) ->
                        reveal(model.selectedProperty().get()));
    }

    private HBox head() {
        HBox head = new HBox(site(Site.ALICE), gap(), bar, gap(), site(Site.BOB));
        head.getStyleClass().add("link-head");
        return head;
    }

    private static Region gap() {
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        return gap;
    }

    private Label site(Site site) {
        Label label = new Label();
        label.setId("link-site-" + site.path());
        label.getStyleClass().add("title");
        label.setMinWidth(Region.USE_PREF_SIZE);
        Tooltip tooltip = new Tooltip();
        label.setTooltip(tooltip);
        Runnable show = () -> {
            label.setText(Words.of("link.site", site.path(), Figure.decibels(total(site))));
            Optional<LinkRoom> room = model.roomProperty().get();
            tooltip.setText(room.map(known -> LinkTexts.about(known, site)).orElse(""));
        };
        model.itemsProperty().addListener((property, before, now) -> show.run());
        model.roomProperty().addListener((property, before, now) -> show.run());
        show.run();
        return label;
    }

    private double total(Site site) {
        return model.items().stream()
                .filter(item -> item.site().equals(Optional.of(site)))
                .mapToDouble(LinkItem::runningDb)
                .max()
                .orElse(0.0);
    }

    private void openSplit() {
        bar.getChildren().setAll(split);
        split.open();
    }

    private void closeSplit() {
        bar.getChildren().setAll(tools);
        drawing.focus();
    }

    /** Scrolls so that a thing is seen. */
    private void reveal(int item) {
        double hidden = drawing.places().width() - scroll.getViewportBounds().getWidth();
        if (item < 0 || item >= model.items().size() || hidden <= 0.0) {
            return;
        }
        Column column = drawing.places().of(item);
        double from = scroll.getHvalue() * hidden;
        double least = column.right() - scroll.getViewportBounds().getWidth();
        double to = Math.max(least, Math.min(from, column.x()));
        scroll.setHvalue(Math.max(0.0, Math.min(1.0, to / hidden)));
    }
}
