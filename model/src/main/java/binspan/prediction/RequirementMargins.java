package binspan.prediction;

import binspan.merit.ErrorRates;
import binspan.merit.SecretKey;
import binspan.scenario.Requirements;
import binspan.units.Scale;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * How far a prediction is from each requirement, on a scale on which all of them compare: the natural logarithm of the ratio of predicted and required
 * figure, positive where the requirement is met, so that 0.01 is one per cent of room.
 *
 * <p>For the time to the first key it is the key length at the deadline per key bit. Where there is no figure at all (no key, S of 2 or less) the scale
 * goes on below {@value #NO_FIGURE} by what is missing to one, so that searches still see a slope.
 */
public final class RequirementMargins {
    /** Margin at which figures end: below it something more basic is missing. */
    public static final double NO_FIGURE = -20.0;

    /** Largest margin told apart from others. */
    public static final double AMPLE = 20.0;

    private static final double HOPELESS = -1000.0;

    private final List<Requirement> requirements;
    private final double[] required;

    private RequirementMargins(List<Requirement> requirements, double[] required) {
        this.requirements = List.copyOf(requirements);
        this.required = required;
    }

    /** The margins of all stated requirements. */
    public static RequirementMargins of(Requirements require) {
        List<Requirement> stated = new ArrayList<>();
        for (Requirement requirement : Requirement.stateable()) {
            if (requirement.required(require).isPresent()) {
                stated.add(requirement);
            }
        }
        return of(
                stated,
                stated.stream()
                        .mapToDouble(each -> each.required(require).orElseThrow())
                        .toArray());
    }

    /** The same with the fit of the slots as one more, last. */
    public RequirementMargins withSlots() {
        List<Requirement> more = new ArrayList<>(requirements);
        more.add(Requirement.SLOTS);
        double[] figures = Arrays.copyOf(required, more.size());
        figures[required.length] = 1.0;
        return new RequirementMargins(more, figures);
    }

    /** The margins of those requirements that an outcome meets. */
    static RequirementMargins ofMet(List<RequirementOutcome> outcomes) {
        List<RequirementOutcome> met =
                outcomes.stream().filter(RequirementOutcome::met).toList();
        return of(
                met.stream().map(RequirementOutcome::requirement).toList(),
                met.stream().mapToDouble(RequirementOutcome::required).toArray());
    }

    /**
     * The margins of chosen requirements.
     *
     * @param requirements which
     * @param required the required figure of each
     */
    public static RequirementMargins of(List<Requirement> requirements, double... required) {
        return new RequirementMargins(requirements, required.clone());
    }

    /** The requirements in their order. */
    public List<Requirement> requirements() {
        return requirements;
    }

    /** The required figure of one of them. */
    public double required(int index) {
        return required[index];
    }

    /** The predicted figure of one of them, in the requirement's unit; NaN or infinite where the link has none. */
    public double predicted(int index, LinkPrediction prediction) {
        Requirement requirement = requirements.get(index);
        FiniteKeyOutlook finite = requirement == Requirement.FIRST_KEY ? FiniteKeyOutlook.of(prediction) : null;
        return requirement.predicted(prediction, finite);
    }

    /** The margins of all requirements in their order. */
    public double[] of(LinkPrediction prediction) {
        double[] margins = new double[required.length];
        for (int i = 0; i < margins.length; i++) {
            margins[i] = margin(i, prediction);
        }
        return margins;
    }

    /** The least margin; {@link #AMPLE} where nothing is required. */
    public double least(LinkPrediction prediction) {
        double least = AMPLE;
        for (int i = 0; i < required.length; i++) {
            least = Math.min(least, margin(i, prediction));
        }
        return least;
    }

    /** The requirement with the least margin: its index, 0 where nothing is required. */
    public int tightest(LinkPrediction prediction) {
        int tightest = 0;
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < required.length; i++) {
            double margin = margin(i, prediction);
            if (margin < least) {
                least = margin;
                tightest = i;
            }
        }
        return tightest;
    }

    /** Whether all requirements are met. */
    public boolean met(LinkPrediction prediction) {
        for (int i = 0; i < required.length; i++) {
            if (!(margin(i, prediction) >= 0.0)) {
                return false;
            }
        }
        return true;
    }

    /** The margin of one requirement, finite. */
    public double margin(int index, LinkPrediction prediction) {
        Requirement requirement = requirements.get(index);
        double margin = requirement == Requirement.FIRST_KEY
                ? keyAtDeadline(prediction, required[index] * Scale.HOUR)
                : ratio(requirement, required[index], prediction);
        return margin >= HOPELESS ? Math.min(margin, AMPLE) : HOPELESS;
    }

    private static double ratio(Requirement requirement, double required, LinkPrediction prediction) {
        double predicted = requirement.predicted(prediction, null);
        if (!requirement.atLeast()) {
            return predicted == Double.POSITIVE_INFINITY
                    ? NO_FIGURE + missing(requirement, prediction)
                    : required > 0.0 ? Math.max(NO_FIGURE, Math.log(required / predicted)) : -predicted;
        }
        if (!(required > 0.0)) {
            return predicted - required;
        }
        return predicted > 0.0
                ? Math.max(NO_FIGURE, Math.log(predicted / required))
                : NO_FIGURE + missing(requirement, prediction);
    }

    /** What is missing to a figure at all: 0 or less. */
    private static double missing(Requirement requirement, LinkPrediction prediction) {
        return switch (requirement) {
            case KEY_RATE -> Math.min(0.0, secretFraction(prediction));
            case FIVE_SIGMA -> Math.min(0.0, prediction.bell().chsh() - 2.0);
            default -> Math.min(0.0, requirement.predicted(prediction, null));
        };
    }

    /** Secret bits per sifted bit of the better basis, negative where the errors leave none. */
    private static double secretFraction(LinkPrediction prediction) {
        ErrorRates errors = prediction.key().errors();
        double efficiency = prediction.scenario().protocol().errorCorrectionEfficiency();
        double phase = SecretKey.fraction(errors.phase(), errors.phaseErrorOfPhaseKey(), efficiency);
        if (!prediction.counts().hasTimeBasis()) {
            return phase;
        }
        double time = SecretKey.fraction(errors.time(), errors.phaseErrorOfTimeKey(), efficiency);
        return prediction.counts().bothPorts() ? Math.max(time, phase) : time;
    }

    /** Key length beyond the first bit when the deadline comes, per key bit. */
    private static double keyAtDeadline(LinkPrediction prediction, double deadline) {
        return Double.isNaN(prediction.key().asymptoticPerSecond())
                ? HOPELESS
                : prediction.finiteKey().marginPerKeyBit(deadline * prediction.uptimeShare());
    }
}
