package binspan.planner.plot;

/**
 * A required value, drawn as a line with its failing side hatched.
 *
 * @param label its words, for example {@code required ≥ 0.88}
 * @param value required value
 * @param atLeast whether larger values meet it; otherwise smaller ones do
 */
public record RequirementLine(String label, double value, boolean atLeast) {
    private static final String REQUIRED = "required ";

    /** The same without the word, where there is little room. */
    RequirementLine brief() {
        return label.startsWith(REQUIRED)
                ? new RequirementLine(label.substring(REQUIRED.length()), value, atLeast)
                : this;
    }

    /** A limit in the usual words, its value written in a unit of its own. */
    public static RequirementLine of(String written, double value, boolean atLeast) {
        return new RequirementLine(REQUIRED + (atLeast ? "\u2265 " : "\u2264 ") + written, value, atLeast);
    }
}
