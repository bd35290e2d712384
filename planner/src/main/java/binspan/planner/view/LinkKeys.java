package binspan.planner.view;

import binspan.planner.viewmodel.LinkModel;
import binspan.planner.viewmodel.Site;
import javafx.event.EventHandler;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;

/** The keyboard on the drawn link. */
final class LinkKeys implements EventHandler<KeyEvent> {
    private final LinkModel model;
    private final LinkDrawing drawing;
    private final LinkTools tools;

    LinkKeys(LinkModel model, LinkDrawing drawing, LinkTools tools) {
        this.model = model;
        this.drawing = drawing;
        this.tools = tools;
    }

    @Override
    public void handle(KeyEvent event) {
        boolean plain = !event.isShortcutDown() && !event.isControlDown() && !event.isMetaDown();
        if (plain && (event.isAltDown() ? move(event.getCode()) : step(event.getCode()) || act(event.getCode()))) {
            event.consume();
        }
    }

    private boolean move(KeyCode key) {
        if (key != KeyCode.LEFT && key != KeyCode.RIGHT) {
            return false;
        }
        model.commands().towards(key == KeyCode.LEFT ? Site.ALICE : Site.BOB).run();
        drawing.focus();
        return true;
    }

    private boolean step(KeyCode key) {
        if (key != KeyCode.LEFT && key != KeyCode.RIGHT) {
            return false;
        }
        model.selectNeighbour(key == KeyCode.LEFT ? -1 : 1);
        drawing.focus();
        return true;
    }

    private boolean act(KeyCode key) {
        switch (key) {
            case DELETE, BACK_SPACE -> {
                model.commands().remove().run();
                drawing.focus();
            }
            case INSERT -> tools.add();
            case S -> tools.split();
            case ESCAPE -> {
                return drawing.cancel();
            }
            default -> {
                return false;
            }
        }
        return true;
    }
}
