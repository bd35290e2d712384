package binspan.planner.viewmodel;

/**
 * Something in which two scenarios differ.
 *
 * @param what the field in words, or the whole change where nothing is changed into something else
 * @param before its old value, empty for an element added or removed
 * @param after its new value
 */
public record ScenarioChange(String what, String before, String after) {
    /** Whether a value became another. */
    public boolean ofValue() {
        return !before.isEmpty() || !after.isEmpty();
    }

    /** The change in one line. */
    public String text() {
        return ofValue() ? Words.of("verdict.changed.value", what, before, after) : what;
    }
}
