package binspan.planner.view;

import javafx.beans.value.ObservableValue;
import javafx.css.PseudoClass;
import javafx.scene.Node;

/** States of controls that the style sheets know. */
final class Marks {
    private static final PseudoClass WRONG = PseudoClass.getPseudoClass("wrong");

    private Marks() {}

    /** Marks a control while there is an error. */
    static void error(Node node, ObservableValue<String> error) {
        error.addListener((source, before, now) -> node.pseudoClassStateChanged(WRONG, !now.isEmpty()));
        node.pseudoClassStateChanged(WRONG, !error.getValue().isEmpty());
    }
}
