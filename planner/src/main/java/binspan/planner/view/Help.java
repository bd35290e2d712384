package binspan.planner.view;

import binspan.planner.report.Version;
import binspan.planner.viewmodel.Words;
import java.util.List;
import javafx.scene.control.Alert.AlertType;

/** What the window tells about itself. */
final class Help {
    private static final List<String> KEYS = List.of(
            "help.keys.file",
            "help.keys.edit",
            "help.keys.pages",
            "help.keys.link",
            "help.keys.form",
            "help.keys.map",
            "help.keys.slots");
    private static final List<String> CARE = List.of("help.care.light", "help.care.cold", "help.care.trust");

    private final Notices notices;

    Help(Notices notices) {
        this.notices = notices;
    }

    /** Keys of the window. */
    void keys() {
        say("dialog.keys.title", KEYS);
    }

    /** Invisible light, cold, and what a plan is worth. */
    void care() {
        say("dialog.care.title", CARE);
    }

    /** Version and licence. */
    void about() {
        notices.say(AlertType.INFORMATION, Words.of("dialog.about.title"), Words.of("dialog.about", Version.text()));
    }

    private void say(String title, List<String> keys) {
        String text = String.join("\n\n", keys.stream().map(Words::of).toList());
        notices.say(AlertType.INFORMATION, Words.of(title), text);
    }
}
