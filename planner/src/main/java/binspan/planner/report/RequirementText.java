package binspan.planner.report;

import binspan.prediction.Requirement;

/** A requirement in a few words: {@code raw visibility ≥ 0.88}. */
public final class RequirementText {
    private RequirementText() {}

    /** Name, sign and required figure. */
    public static String of(Requirement requirement, double required) {
        return RequirementWords.name(requirement)
                + (requirement.atLeast() ? " \u2265 " : " \u2264 ")
                + RequirementWords.required(requirement, required);
    }

    /** Its name. */
    public static String name(Requirement requirement) {
        return RequirementWords.name(requirement);
    }
}
