package binspan.planner.view;

import binspan.planner.report.VerdictNotes;
import binspan.planner.report.Version;
import binspan.planner.viewmodel.Design;
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

    private final Notices notices;
    private final Design design;

    Help(Notices notices, Design design) {
        this.notices = notices;
        this.design = design;
    }

    /** Keys of the window. */
    void keys() {
        say("dialog.keys.title", KEYS.stream().map(Words::of).toList());
    }

    /** Invisible light, cold, and what a plan is worth. */
    void care() {
        say("dialog.care.title", VerdictNotes.safety(design.scenario()));
    }

    /** Version and licence. */
    void about() {
        notices.say(AlertType.INFORMATION, Words.of("dialog.about.title"), Words.of("dialog.about", Version.text()));
    }

    private void say(String title, List<String> texts) {
        notices.say(AlertType.INFORMATION, Words.of(title), String.join("\n\n", texts));
    }
}
