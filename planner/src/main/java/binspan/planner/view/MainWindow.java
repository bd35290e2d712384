package binspan.planner.view;

import binspan.planner.viewmodel.PlannerModel;
import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/**
 * The arrangement of the window: the link on top, the form of what is selected and the pages under it, the verdict at
 * the right, a line of notices below.
 */
final class MainWindow implements WindowMenus.Pages {
    private static final String PAGE = "page-";
    private static final double GAP = 0.5;
    private static final double FORM_WIDTH = 25.8;
    private static final double FORM_NARROWEST = 23.0;
    private static final double VERDICT_WIDTH = 27.5;
    private static final double VERDICT_NARROWEST = 24.0;
    private static final double PAGES_NARROWEST = 34.0;
    private static final double PAGES_LOWEST = 34.0;
    private static final double LINK_HEIGHT = 15.8;

    private final Look look;
    private final BorderPane root = new BorderPane();
    private final TabPane pages = new TabPane();
    private final HBox lower;
    private final VBox left;
    private final HBox whole;
    private final Parts parts;

    /**
     * The parts of the window.
     *
     * @param link the link, drawn
     * @param form form of the selected part
     * @param verdict verdict
     * @param pages pages in the middle, in their order
     */
    record Parts(Region link, Region form, Region verdict, List<Page> pages) {}

    /**
     * A page.
     *
     * @param key its name in the bundle
     * @param content what it shows
     */
    record Page(String key, Region content) {}

    /** Arranges the parts. */
    MainWindow(PlannerModel model, Parts parts, Look look) {
        this.look = look;
        this.parts = parts;
        pages.setId("pages");
        pages.setTabClosingPolicy(TabPane.TabClosingPolicy.UNAVAILABLE);
        parts.pages().forEach(page -> pages.getTabs().add(tab(page)));
        pages.getSelectionModel().select(0);
        lower = new HBox(parts.form(), pages);
        HBox.setHgrow(pages, Priority.ALWAYS);
        left = new VBox(parts.link(), lower);
        VBox.setVgrow(lower, Priority.ALWAYS);
        whole = new HBox(left, parts.verdict());
        HBox.setHgrow(left, Priority.ALWAYS);
        root.setId("planner");
        ScrollPane room = new ScrollPane(whole);
        room.setId("planner-scroll");
        room.setFitToWidth(true);
        room.setFitToHeight(true);
        room.setFocusTraversable(false);
        root.setCenter(room);
        root.setBottom(status(model));
        look.follow(this::sizes);
    }

    private void sizes() {
        double gap = look.em(GAP);
        lower.setSpacing(gap);
        left.setSpacing(gap);
        whole.setSpacing(gap);
        whole.setPadding(new Insets(gap));
        width(parts.form(), FORM_NARROWEST, FORM_WIDTH);
        width(parts.verdict(), VERDICT_NARROWEST, VERDICT_WIDTH);
        // Form and verdict get their usual width first; what is left belongs to link and pages.
        left.setMinWidth(look.em(FORM_NARROWEST + PAGES_NARROWEST) + gap);
        left.setPrefWidth(look.em(FORM_NARROWEST + PAGES_NARROWEST) + gap);
        lower.setMinHeight(look.em(PAGES_LOWEST));
        pages.setMinWidth(look.em(PAGES_NARROWEST));
        pages.setPrefWidth(look.em(PAGES_NARROWEST));
        parts.link().setMinSize(0.0, look.em(LINK_HEIGHT));
        parts.link().setPrefHeight(look.em(LINK_HEIGHT));
        parts.link().setMaxHeight(look.em(LINK_HEIGHT));
    }

    private void width(Region part, double narrowest, double usual) {
        part.setMinWidth(look.em(narrowest));
        part.setPrefWidth(look.em(usual));
        part.setMaxWidth(look.em(usual));
    }

    private static Tab tab(Page page) {
        Tab tab = new Tab(Words.of("page." + page.key()));
        tab.setId(PAGE + page.key());
        // A page that nobody has looked at costs nothing at the start.
        tab.selectedProperty().addListener((source, before, selected) -> tab.setContent(page.content()));
        return tab;
    }

    private static Node status(PlannerModel model) {
        Label notice = new Label();
        notice.setId("notice");
        notice.textProperty().bind(model.design().noticeProperty());
        HBox line = new HBox(notice);
        line.getStyleClass().add("status");
        return line;
    }

    /** Puts the menus on top. */
    void menus(Node menus) {
        root.setTop(menus);
    }

    /** Everything. */
    Parent root() {
        return root;
    }

    /** Puts the cursor where work begins: on the form. */
    void begin() {
        first(parts.form()).ifPresent(Node::requestFocus);
    }

    @Override
    public void nextPart() {
        List<Node> stops = List.of(parts.link(), parts.form(), pages, parts.verdict());
        Node owner = root.getScene().getFocusOwner();
        int at = -1;
        for (int i = 0; i < stops.size(); i++) {
            if (owner != null && within(owner, stops.get(i))) {
                at = i;
            }
        }
        first(stops.get((at + 1) % stops.size())).ifPresent(Node::requestFocus);
    }

    private static boolean within(Node node, Node part) {
        return node != null && (node == part || within(node.getParent(), part));
    }

    /** The first control of a part that the keyboard reaches. */
    private static Optional<Node> first(Node part) {
        if (part.isFocusTraversable() && part.isVisible() && !part.isDisabled()) {
            return Optional.of(part);
        }
        return part instanceof Parent parent
                ? parent.getChildrenUnmodifiable().stream()
                        .filter(Node::isVisible)
                        .flatMap(child -> first(child).stream())
                        .findFirst()
                : Optional.empty();
    }

    /** The link, drawn. */
    Region link() {
        return parts.link();
    }

    @Override
    public List<String> keys() {
        return parts.pages().stream().map(Page::key).toList();
    }

    @Override
    public void show(String key) {
        pages.getSelectionModel().select(keys().indexOf(key));
    }

    /** The page that is shown. */
    Page shown() {
        return parts.pages().get(pages.getSelectionModel().getSelectedIndex());
    }

    @Override
    public void followPage(Consumer<String> change) {
        pages.getSelectionModel()
                .selectedIndexProperty()
                .addListener((source, before, now) -> change.accept(keys().get(now.intValue())));
        change.accept(shown().key());
    }
}
