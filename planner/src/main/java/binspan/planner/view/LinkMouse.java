package binspan.planner.view;

import binspan.planner.viewmodel.LinkDrop;
import binspan.planner.viewmodel.LinkItem;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkModel;
import binspan.planner.viewmodel.LinkPart.Element;
import java.util.List;
import javafx.event.EventHandler;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;

/** The hand on the drawn link: a click selects, the source is dragged along the fibre, elements among one another. */
final class LinkMouse implements EventHandler<MouseEvent> {
    private static final double FIRM = 4.0;

    private final LinkModel model;
    private final LinkDrawing drawing;
    private final Label place = new Label();
    private final Region drop = new Region();
    private int held = -1;
    private boolean dragging;
    private double fromX;
    private double pxPerKm;

    LinkMouse(LinkModel model, LinkDrawing drawing) {
        this.model = model;
        this.drawing = drawing;
        place.getStyleClass().add("link-place");
        place.setId("link-place");
        drop.getStyleClass().add("link-drop");
        marks().forEach(mark -> {
            mark.setMouseTransparent(true);
            mark.setVisible(false);
        });
    }

    /** What is shown while something is dragged. */
    List<Node> marks() {
        return List.of(drop, place);
    }

    @Override
    public void handle(MouseEvent event) {
        if (event.getEventType() == MouseEvent.MOUSE_PRESSED && event.getButton() == MouseButton.PRIMARY) {
            press(event);
        } else if (event.getEventType() == MouseEvent.MOUSE_DRAGGED && held >= 0) {
            drag(event);
        } else if (event.getEventType() == MouseEvent.MOUSE_RELEASED && held >= 0) {
            release(event);
        }
    }

    private void press(MouseEvent event) {
        Node node = event.getTarget() instanceof Node target ? target : null;
        while (node != null && drawing.item(node) < 0) {
            node = node.getParent();
        }
        held = node == null ? -1 : drawing.item(node);
        dragging = false;
        if (held >= 0) {
            fromX = x(event);
            model.select(held);
            drawing.focus();
            event.consume(); // or the scroll pane takes the focus
        }
    }

    private double x(MouseEvent event) {
        return drawing.sceneToLocal(new Point2D(event.getSceneX(), event.getSceneY()))
                .getX();
    }

    private void drag(MouseEvent event) {
        boolean begins = !dragging && Math.abs(x(event) - fromX) >= FIRM;
        if (begins) {
            dragging = true;
            begin();
        }
        if (dragging && held().kind() == Kind.SOURCE) {
            model.source().to((x(event) - fromX) / pxPerKm);
            showPlace();
        } else if (dragging && held().part() instanceof Element element) {
            showDrop(drop(element, x(event)), element);
        }
    }

    private void begin() {
        pxPerKm = drawing.places().pxPerKm();
        if (held().kind() == Kind.SOURCE) {
            model.source().begin();
        }
    }

    private LinkItem held() {
        return model.items().get(held);
    }

    private LinkDrop drop(Element element, double x) {
        return LinkDrop.of(model.items(), drawing.places(), element, x);
    }

    private void release(MouseEvent event) {
        if (dragging && held().kind() == Kind.SOURCE && model.source().moving()) {
            model.source().end();
        } else if (dragging && held().part() instanceof Element element) {
            model.commands().move(element, drop(element, x(event)).index());
        }
        letGo();
    }

    /** Ends what is going on as if nothing had been; says whether anything was. */
    boolean cancel() {
        boolean was = dragging;
        model.source().cancel();
        letGo();
        return was;
    }

    private void letGo() {
        held = -1;
        dragging = false;
        place.setVisible(false);
        drop.setVisible(false);
    }

    private void showPlace() {
        place.setVisible(model.source().moving());
        place.setText(model.source().text());
        place.autosize();
        double centre = drawing.places().of(held).centre() - place.getWidth() / 2.0;
        place.relocate(Math.max(0.0, Math.min(drawing.getWidth() - place.getWidth(), centre)), 0.0);
    }

    private void showDrop(LinkDrop where, Element element) {
        drop.setVisible(where.index() != element.index());
        LinkNode node = drawing.node(held);
        drop.autosize();
        drop.resizeRelocate(where.x() - drop.getWidth() / 2.0, node.getLayoutY(), drop.prefWidth(-1), node.getHeight());
    }
}
