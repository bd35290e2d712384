package binspan.planner.plot;

/**
 * A required value, drawn as a line with its failing side hatched.
 *
 * @param label its words, for example {@code required ≥ 0.88}
 * @param value required value
 * @param atLeast whether larger values meet it; otherwise smaller ones do
 */
public record RequirementLine(String label, double value, boolean atLeast) {
    /** The same with sign and number alone, where there is little room. */
    RequirementLine brief() {
        return new RequirementLine((atLeast ? "\u2265 " : "\u2264 ") + NumberText.withUnit(value, ""), value, atLeast);
    }

    /** A lower limit in the usual words. */
    public static RequirementLine atLeast(double value, String unit) {
        return new RequirementLine("required \u2265 " + NumberText.withUnit(value, unit), value, true);
    }

    /** An upper limit in the usual words. */
    public static RequirementLine atMost(double value, String unit) {
        return new RequirementLine("required \u2264 " + NumberText.withUnit(value, unit), value, false);
    }
}
