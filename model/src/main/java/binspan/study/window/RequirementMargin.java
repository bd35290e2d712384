package binspan.study.window;

import binspan.prediction.Requirement;

/**
 * One requirement at one point of a study.
 *
 * @param requirement which
 * @param required required figure, in the requirement's unit
 * @param predicted predicted figure; NaN or infinite where the link has none
 * @param margin room on the scale of {@link binspan.prediction.RequirementMargins}: 0.01 is one per cent, negative where it fails
 */
public record RequirementMargin(Requirement requirement, double required, double predicted, double margin) {
    /** Whether the requirement is met. */
    public boolean met() {
        return margin >= 0.0;
    }
}
