package binspan.planner.view;

import binspan.planner.viewmodel.Words;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Alert;
import javafx.scene.control.Alert.AlertType;
import javafx.scene.control.ButtonBar.ButtonData;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.stage.Window;

/** Questions and messages in dialogs, in the look of the window. */
final class Notices {
    private static final double TEXT_WIDTH = 46.0;
    private static final double LINES_WIDTH = 64.0;
    private static final int MOST_ROWS = 14;

    private final Window owner;
    private final Look look;

    Notices(Window owner, Look look) {
        this.owner = owner;
        this.look = look;
    }

    /** What to do with changes that are not saved. */
    enum Answer {
        SAVE,
        DISCARD,
        CANCEL
    }

    /** What to do with work that a crash has left. */
    enum LeftWork {
        TAKE,
        DISCARD,
        LATER
    }

    /** Asks what to do with work that a crash has left. */
    LeftWork leftWork(String link, String time) {
        ButtonType take = button("dialog.recover.take", ButtonData.YES);
        ButtonType discard = button("dialog.recover.discard", ButtonData.NO);
        ButtonType later = button("dialog.recover.later", ButtonData.CANCEL_CLOSE);
        Alert alert =
                alert(AlertType.CONFIRMATION, Words.of("dialog.recover.title"), Words.of("dialog.recover", link, time));
        alert.getButtonTypes().setAll(take, discard, later);
        Optional<ButtonType> chosen = alert.showAndWait();
        return chosen.filter(take::equals).isPresent()
                ? LeftWork.TAKE
                : chosen.filter(discard::equals).isPresent() ? LeftWork.DISCARD : LeftWork.LATER;
    }

    /** Asks what to do with changes that would be lost. */
    Answer unsaved(String link) {
        ButtonType save = button("dialog.unsaved.save", ButtonData.YES);
        ButtonType discard = button("dialog.unsaved.discard", ButtonData.NO);
        Alert alert = alert(AlertType.CONFIRMATION, Words.of("dialog.unsaved.title"), Words.of("dialog.unsaved", link));
        alert.getButtonTypes().setAll(save, discard, ButtonType.CANCEL);
        Optional<ButtonType> chosen = alert.showAndWait();
        return chosen.filter(save::equals).isPresent()
                ? Answer.SAVE
                : chosen.filter(discard::equals).isPresent() ? Answer.DISCARD : Answer.CANCEL;
    }

    /** Asks a question with one way to go on. */
    boolean confirmed(String title, String question, String goOn) {
        ButtonType yes = new ButtonType(goOn, ButtonData.OK_DONE);
        Alert alert = alert(AlertType.CONFIRMATION, title, question);
        alert.getButtonTypes().setAll(yes, ButtonType.CANCEL);
        return alert.showAndWait().filter(yes::equals).isPresent();
    }

    /** Says something that needs to be read. */
    void say(AlertType type, String title, String text) {
        alert(type, title, text).showAndWait();
    }

    /** Shows lines that one may want to copy, such as all errors of a file. */
    void lines(AlertType type, String title, String text, List<String> lines) {
        Alert alert = alert(type, title, text);
        TextArea area = new TextArea(String.join("\n", lines));
        area.setEditable(false);
        area.setWrapText(true);
        area.setPrefRowCount(Math.min(MOST_ROWS, lines.size() + 2));
        area.setPrefWidth(look.em(LINES_WIDTH));
        alert.getDialogPane().setExpandableContent(area);
        alert.getDialogPane().setExpanded(true);
        alert.showAndWait();
    }

    private static ButtonType button(String key, ButtonData data) {
        return new ButtonType(Words.of(key), data);
    }

    private Alert alert(AlertType type, String title, String text) {
        Alert alert = new Alert(type);
        alert.initOwner(owner);
        alert.setTitle(title);
        alert.setHeaderText(null);
        Label label = new Label(text);
        label.setWrapText(true);
        label.setMaxWidth(look.em(TEXT_WIDTH));
        label.setMinHeight(Label.USE_PREF_SIZE);
        alert.getDialogPane().setContent(label);
        look.apply(alert.getDialogPane().getScene());
        return alert;
    }
}
