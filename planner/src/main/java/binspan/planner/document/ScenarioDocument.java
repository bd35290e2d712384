package binspan.planner.document;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.Scenario;
import java.util.List;

/** A scenario file in the hands of an editor: its text, which is valid at any time, and the scenario that it states. Never changes; an edit gives another. */
public final class ScenarioDocument {
    static final char BYTE_ORDER_MARK = '\ufeff';

    private final String text;
    private final String name;
    private final Scenario scenario;
    /** The text taken apart, once somebody has asked for it. */
    private volatile TextPart root;

    private ScenarioDocument(String text, String name, Scenario scenario) {
        this.text = text;
        this.name = name;
        this.scenario = scenario;
    }

    /**
     * The document of a text.
     *
     * @param text JSON with comments, as it stands in the file
     * @param name its name in messages
     * @throws InvalidScenarioException if the text is no scenario, with everything that is wrong in it
     */
    public static ScenarioDocument of(String text, String name) throws InvalidScenarioException {
        boolean marked = !text.isEmpty() && text.charAt(0) == BYTE_ORDER_MARK;
        return new ScenarioDocument(text, name, ScenarioReader.parse(marked ? text.substring(1) : text, name));
    }

    /** The text as it would be saved. */
    public String text() {
        return text;
    }

    /** The scenario that the text states, defaults filled in. */
    public Scenario scenario() {
        return scenario;
    }

    /** Its name in messages. */
    public String name() {
        return name;
    }

    /**
     * Whether the text states a value; otherwise its default stands.
     *
     * @param path scenario path, list positions in brackets
     */
    public boolean states(String path) {
        try {
            TextPart whole = root();
            return DocumentPath.of(path, whole).in(whole) != null;
        } catch (RefusedEditException e) {
            return false;
        }
    }

    private TextPart root() {
        TextPart known = root;
        if (known == null) {
            known = TextScanner.scan(text).root();
            root = known;
        }
        return known;
    }

    /**
     * The document after an edit. All changes are made, one after the other, before the result is judged.
     *
     * @param changes what to change; paths and positions are those after the changes before
     * @throws RefusedEditException if a path leads nowhere or the result would be no valid scenario, with everything that
     *     is wrong
     */
    public ScenarioDocument with(List<Change> changes) throws RefusedEditException {
        String changed = ChangeWriter.written(text, changes);
        if (changed.equals(text)) {
            return this;
        }
        try {
            return of(changed, name);
        } catch (InvalidScenarioException e) {
            throw new RefusedEditException(e.errors().stream()
                    .map(error -> new EditProblem(error.path(), error.message()))
                    .toList());
        }
    }

    /** The same document under another name. */
    public ScenarioDocument named(String otherName) {
        return new ScenarioDocument(text, otherName, scenario);
    }
}
