package binspan.planner.report;

import binspan.prediction.Requirement;
import binspan.scenario.Requirements;
import binspan.units.Scale;
import java.util.ArrayList;
import java.util.List;

/**
 * A stated requirement with the figure of merit that it is held against.
 *
 * @param requirement which
 * @param required required figure, in the requirement's unit
 */
public record RequiredFigure(Requirement requirement, double required) {
    /** The stated requirements in their fixed order. */
    public static List<RequiredFigure> of(Requirements require) {
        List<RequiredFigure> stated = new ArrayList<>();
        for (Requirement requirement : Requirement.stateable()) {
            requirement.required(require).ifPresent(value -> stated.add(new RequiredFigure(requirement, value)));
        }
        return stated;
    }

    /** Published name of the figure. */
    public String figure() {
        return figure(requirement);
    }

    /** The required figure in the unit of the published one. */
    public double limit() {
        return required * scale();
    }

    /** A published figure in the unit of the requirement. */
    public double inUnit(double figure) {
        return figure / scale();
    }

    private double scale() {
        return requirement.unit().equals("h") ? Scale.HOUR : 1.0;
    }

    static String figure(Requirement requirement) {
        return switch (requirement) {
            case RAW_VISIBILITY -> "visibility.raw";
            case CHSH -> "bell.chsh";
            case PHASE_QBER -> "qber.phase";
            case TIME_QBER -> "qber.time";
            case KEY_RATE -> "key.asymptoticBps";
            case CAR -> "coincidence.car";
            case FIRST_KEY -> "key.secondsToFirstKey";
            case FIVE_SIGMA -> "bell.secondsToFiveSigma";
            case SLOTS -> throw new IllegalArgumentException("the fit of the slots is no figure of a check");
        };
    }
}
