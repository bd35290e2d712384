package binspan.planner.view;

import binspan.planner.viewmodel.LinkModel;
import binspan.planner.viewmodel.Words;
import binspan.units.Digits;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;

/** Asks where a fibre span is to be split, in the place of the tools. */
final class LinkSplit extends HBox {
    private static final int FIELD_COLUMNS = 6;
    private static final int DIGITS = 4;

    private final LinkModel model;
    private final Runnable close;
    private final TextField where = new TextField();
    private final Label of = new Label();

    LinkSplit(LinkModel model, Runnable close) {
        this.model = model;
        this.close = close;
        getStyleClass().add("link-tools");
        where.setId("link-split-km");
        where.setPrefColumnCount(FIELD_COLUMNS);
        Label title = new Label(Words.of("link.split.where"));
        title.setLabelFor(where);
        Button apply = new Button(Words.of("link.split.do"));
        apply.setId("link-split-do");
        apply.setOnAction(event -> apply());
        where.setOnAction(event -> apply());
        Button cancel = new Button(Words.of("link.split.cancel"));
        cancel.setId("link-split-cancel");
        cancel.setOnAction(event -> close.run());
        getChildren().addAll(title, where, of, apply, cancel);
        addEventHandler(KeyEvent.KEY_PRESSED, this::leave);
    }

    /** Begins in the middle of the selected span. */
    void open() {
        double km = model.commands().selectedKm();
        where.setText(Digits.shortest(km / 2.0, DIGITS));
        of.setText(Words.of("link.split.unit", Digits.shortest(km, DIGITS)));
        of.getStyleClass().remove("bad");
        where.requestFocus();
        where.selectAll();
    }

    private void apply() {
        String refusal = model.commands().splitAt(number());
        if (refusal.isEmpty()) {
            close.run();
        } else {
            of.setText(refusal);
            of.getStyleClass().add("bad");
            where.requestFocus();
        }
    }

    /** What is written, NaN for what is no number. */
    private double number() {
        try {
            return Double.parseDouble(where.getText().strip());
        } catch (NumberFormatException e) {
            return Double.NaN;
        }
    }

    private void leave(KeyEvent event) {
        if (event.getCode() == KeyCode.ESCAPE) {
            close.run();
            event.consume();
        }
    }
}
