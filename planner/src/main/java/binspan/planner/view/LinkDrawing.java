package binspan.planner.view;

import binspan.planner.viewmodel.LinkItem;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkLabels;
import binspan.planner.viewmodel.LinkLayout;
import binspan.planner.viewmodel.LinkLayout.Column;
import binspan.planner.viewmodel.LinkModel;
import binspan.planner.viewmodel.LossProfile;
import binspan.planner.viewmodel.Site;
import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.scene.Node;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Pane;

/** The drawn link: its symbols side by side with the running loss under them, in the width that it is given. */
final class LinkDrawing extends Pane {
    private static final double PROFILE_TEXT = 0.85;
    private static final double ROUNDING = 0.01;
    private static final double LEAST_PROFILE_EM = 4.0;

    private final LinkModel model;
    private final Look look;
    private final LossCanvas losses;
    private final List<LinkNode> nodes = new ArrayList<>();
    private final ReadOnlyObjectWrapper<LinkLayout> places = new ReadOnlyObjectWrapper<>(this, "places");
    private final LinkMouse mouse;
    private double room;

    LinkDrawing(LinkModel model, Look look) {
        this.model = model;
        this.look = look;
        this.losses = new LossCanvas(look);
        getStyleClass().add("link-drawing");
        getChildren().add(losses);
        model.itemsProperty().addListener((property, before, now) -> draw());
        model.roomProperty().addListener((property, before, now) -> profile());
        model.selectedProperty().addListener((property, before, now) -> mark());
        heightProperty().addListener((property, before, now) -> profile());
        look.follow(this::draw);
        this.mouse = new LinkMouse(model, this);
        getChildren().addAll(mouse.marks());
        addEventHandler(MouseEvent.ANY, mouse);
    }

    /** Draws within a width. */
    void fill(double width) {
        if (width != room) {
            room = width;
            draw();
        }
    }

    /** Where everything stands. */
    LinkLayout places() {
        return places.get();
    }

    /** The same, as it changes. */
    ReadOnlyObjectProperty<LinkLayout> placesProperty() {
        return places.getReadOnlyProperty();
    }

    /** The node of a thing. */
    LinkNode node(int item) {
        return nodes.get(item);
    }

    /** The thing of a node, -1 for none. */
    int item(Node node) {
        return nodes.indexOf(node);
    }

    private void draw() {
        List<LinkItem> items = model.items();
        double em = look.em(1.0);
        LinkLayout layout = LinkLayout.of(items, room, em);
        boolean focused = nodes.stream().anyMatch(LinkNode::isFocused);
        resizeTo(items.size());
        LinkLabels labels = LinkLabels.of(items, layout, em);
        for (int i = 0; i < layout.columns().size(); i++) {
            Column column = layout.columns().get(i);
            for (int item : column.items()) {
                int place = column.items().indexOf(item);
                nodes.get(item)
                        .show(
                                new LinkNode.Drawn(
                                        items.get(item), column, labels.places().get(i), place, ports(items, item)),
                                em);
            }
        }
        setPrefWidth(Math.floor(layout.width() + ROUNDING));
        setMinHeight((LinkNode.HEIGHT_EM + LEAST_PROFILE_EM) * em);
        places.set(layout);
        mark();
        if (focused) {
            focus();
        }
        profile();
    }

    /** Focuses what is selected. */
    void focus() {
        int selected = model.selectedProperty().get();
        if (selected >= 0) {
            nodes.get(selected).requestFocus();
        }
    }

    /** Takes back what the hand is doing; says whether it was doing anything. */
    boolean cancel() {
        return mouse.cancel();
    }

    private void resizeTo(int count) {
        while (nodes.size() > count) {
            getChildren().remove(nodes.remove(nodes.size() - 1));
        }
        while (nodes.size() < count) {
            LinkNode node = new LinkNode(nodes.size());
            nodes.add(node);
            getChildren().add(nodes.size(), node);
        }
    }

    private static int ports(List<LinkItem> items, int item) {
        return (int) items.stream()
                .filter(other -> other.kind() == Kind.PORT
                        && other.site().equals(items.get(item).site()))
                .count();
    }

    /** Marks what is selected; without a selection the source is where the keyboard enters. */
    private void mark() {
        int selected = model.selectedProperty().get();
        for (int i = 0; i < nodes.size() && i < model.items().size(); i++) {
            nodes.get(i).selected(i == selected);
            if (selected < 0 && model.items().get(i).kind() == Kind.SOURCE) {
                nodes.get(i).setFocusTraversable(true);
            }
        }
    }

    private void profile() {
        double top = look.em(LinkNode.HEIGHT_EM);
        LinkLayout layout = places.get();
        losses.setLayoutY(top);
        losses.setWidth(layout.width());
        losses.setHeight(Math.max(0.0, getHeight() - top));
        List<LossProfile> profiles = new ArrayList<>();
        for (Site site : Site.values()) {
            profiles.add(LossProfile.of(site, model.items(), layout, look.em(PROFILE_TEXT)));
        }
        losses.draw(profiles, layout, model.roomProperty().get(), model.roomIsPresent());
    }

    @Override
    protected void layoutChildren() {
        // everything has its place from draw()
    }
}
