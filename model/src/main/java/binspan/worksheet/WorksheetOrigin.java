package binspan.worksheet;

import binspan.scenario.Arm;
import binspan.scenario.Scenario;
import java.util.Map;

/**
 * Where the inputs of a scenario come from: the scenario's own notes, found under every path that addresses the field
 * or an object around it.
 */
final class WorksheetOrigin {
    /** Source of an input for which the scenario notes none. */
    static final String SCENARIO = "scenario";

    private final Scenario scenario;
    private final Map<String, String> notes;

    WorksheetOrigin(Scenario scenario) {
        this.scenario = scenario;
        this.notes = scenario.provenance();
    }

    /**
     * The note on a field.
     *
     * @param path scenario path with positions, such as {@code alice.path[0].lengthKm}
     * @param otherwise what stands where there is no note
     */
    String of(String path, String otherwise) {
        if (notes.isEmpty()) {
            return otherwise;
        }
        String around = path;
        while (!around.isEmpty()) {
            String note = noted(around);
            if (note != null) {
                return note;
            }
            around = around.substring(0, Math.max(0, Math.max(around.lastIndexOf('.'), around.lastIndexOf('['))));
        }
        return otherwise;
    }

    private String noted(String path) {
        String label = label(path);
        String own = spelled(path, label);
        int dot = path.indexOf('.');
        boolean arm = path.startsWith("alice.") || path.startsWith("bob.");
        return own == null && arm ? spelled("both" + path.substring(dot), label) : own;
    }

    /** The note under the path itself, with the label of a path element, or for all items of a list. */
    private String spelled(String path, String label) {
        String note = notes.get(path);
        int open = path.indexOf('[');
        if (note != null || open < 0) {
            return note;
        }
        String list = path.substring(0, open);
        String rest = path.substring(path.indexOf(']', open) + 1);
        String labelled = label.isEmpty() ? null : notes.get(list + "." + label + rest);
        return labelled != null ? labelled : notes.get(list + rest);
    }

    /** The label of the path element that a path leads through, empty if it has none. */
    private String label(String path) {
        Arm arm = path.startsWith("alice.path[")
                ? scenario.alice()
                : path.startsWith("bob.path[") ? scenario.bob() : null;
        if (arm == null) {
            return "";
        }
        int item = Integer.parseInt(path.substring(path.indexOf('[') + 1, path.indexOf(']')));
        return arm.path().get(item).label().orElse("");
    }
}
