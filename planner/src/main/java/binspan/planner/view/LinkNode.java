package binspan.planner.view;

import binspan.planner.report.Figure;
import binspan.planner.viewmodel.LinkItem;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkLabels;
import binspan.planner.viewmodel.LinkLayout.Column;
import binspan.planner.viewmodel.Words;
import binspan.units.Digits;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.Group;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.Region;
import javafx.scene.transform.Scale;

/** One thing of the drawn link: symbol, words over it and loss under it; can be focused and selected. */
final class LinkNode extends Region {
    /** Where the light runs, em below the top of the drawing. */
    static final double LIGHT_EM = 4.6;

    /** Height of words, symbol and loss, em. */
    static final double HEIGHT_EM = 7.9;

    private static final PseudoClass SELECTED = PseudoClass.getPseudoClass("selected");
    private static final double UNIT = 12.0;
    private static final double ROW_EM = 1.15;
    private static final double TOP_EM = 0.1;
    private static final double SYMBOL_EM = 2.45;
    private static final double WIDE_LOSS_EM = 4.6;
    private static final double OUTSIDE_EM = 2.0;
    private static final double INSIDE_EM = 0.9;

    private final Label name = label("link-name");
    private final Label detail = label("link-detail");
    private final Label loss = label("link-loss");
    private final Tooltip tooltip = new Tooltip();
    private Drawn last;
    private double lastEm;

    LinkNode(int index) {
        getStyleClass().add("link-item");
        setId("link-item-" + index);
        setFocusTraversable(false);
        setPickOnBounds(false); // words reach over neighbours, the ground does not
        setAccessibleRole(AccessibleRole.BUTTON);
        Tooltip.install(this, tooltip);
    }

    /**
     * What is drawn, and where.
     *
     * @param item the thing
     * @param column its column
     * @param label where its words go
     * @param place its place in the column, from the top
     * @param ports detectors at its site
     */
    record Drawn(LinkItem item, Column column, LinkLabels.Place label, int place, int ports) {}

    /** Draws a thing at a text size. */
    void show(Drawn drawn, double em) {
        if (em == lastEm && drawn.equals(last)) {
            return;
        }
        last = drawn;
        lastEm = em;
        LinkItem item = drawn.item();
        boolean scaled = item.kind() != Kind.FIBRE || drawn.column().toScale();
        String text = scaled ? item.description() : Words.of("link.described.fold", item.description());
        setAccessibleText(text);
        tooltip.setText(text);
        double top = top(drawn, em);
        resizeRelocate(drawn.column().x(), top, drawn.column().width(), bottom(drawn, em) - top);
        Group symbol = LinkSymbols.of(item.kind(), drawn.column().width() * UNIT / em, drawn.ports(), scaled);
        symbol.getTransforms().add(new Scale(em / UNIT * (item.left() ? 1.0 : -1.0), em / UNIT));
        symbol.setLayoutX(drawn.column().width() / 2.0);
        symbol.setLayoutY(LIGHT_EM * em - top + portOffset(drawn) * em / UNIT);
        getChildren().setAll(symbol, name, detail, loss);
        words(drawn, em, top);
        loss(drawn, em, top);
    }

    void selected(boolean selected) {
        pseudoClassStateChanged(SELECTED, selected);
        setFocusTraversable(selected);
    }

    private static double portOffset(Drawn drawn) {
        if (drawn.item().kind() != Kind.PORT) {
            return 0.0;
        }
        return drawn.place() == 0 ? -LinkSymbols.PORT_Y : LinkSymbols.PORT_Y;
    }

    private static double top(Drawn drawn, double em) {
        return (drawn.place() == 0 ? SYMBOL_EM : LIGHT_EM) * em;
    }

    private static double bottom(Drawn drawn, double em) {
        return drawn.place() == 0 && drawn.column().items().size() > 1 ? LIGHT_EM * em : HEIGHT_EM * em;
    }

    private void words(Drawn drawn, double em, double top) {
        LinkLabels.Place place = drawn.label();
        if (drawn.place() > 0) {
            lowerPort(drawn, em, top);
            return;
        }
        String more = place.both() ? drawn.item().detail() : "";
        int row = place.both() && more.isEmpty() ? 1 : place.row();
        double x = place.x() - drawn.column().x();
        put(name, place.text(), x, (TOP_EM + row * ROW_EM) * em - top, place.width());
        put(detail, more, x, (TOP_EM + ROW_EM) * em - top, place.width());
    }

    /** The lower port has its words under it, where nothing is lost, and over the clock's place. */
    private void lowerPort(Drawn drawn, double em, double top) {
        double outside = OUTSIDE_EM * em;
        double inside = INSIDE_EM * em;
        double y = (HEIGHT_EM - ROW_EM - TOP_EM) * em - top;
        put(name, "", 0.0, 0.0, 0.0);
        put(
                detail,
                drawn.item().detail(),
                drawn.item().left() ? -outside : -inside,
                y,
                drawn.column().width() + outside + inside);
    }

    private void loss(Drawn drawn, double em, double top) {
        double db = drawn.item().lossDb();
        double width = drawn.column().width();
        String text = width >= WIDE_LOSS_EM * em ? Figure.decibels(db) : Digits.decimals(db, 1);
        put(loss, db > 0.0 ? text : "", 0.0, (HEIGHT_EM - ROW_EM - TOP_EM) * em - top, width);
    }

    private void put(Label label, String text, double x, double y, double width) {
        label.setText(text);
        label.setVisible(!text.isEmpty());
        label.resizeRelocate(x, y, width, label.prefHeight(-1));
    }

    private static Label label(String style) {
        Label label = new Label();
        label.getStyleClass().add(style);
        label.setAlignment(Pos.CENTER);
        label.setManaged(false);
        return label;
    }

    @Override
    protected void layoutChildren() {
        for (Node child : getChildren()) {
            if (child instanceof Label label) {
                label.resize(label.getWidth(), label.prefHeight(-1));
            }
        }
    }
}
