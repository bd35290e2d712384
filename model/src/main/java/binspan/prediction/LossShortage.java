package binspan.prediction;

import binspan.scenario.Arm;
import binspan.scenario.Edits;
import binspan.scenario.Scenario;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/**
 * How much less loss an arm would need until every stated requirement is met. The loss is taken off the repair margin, below zero if need be: it
 * strengthens the pairs, not the light of classical channels.
 *
 * @param alice in alice's arm alone, dB; 0 where all is met already, absent where even an arm without loss does not help
 * @param bob in bob's arm alone, dB
 */
public record LossShortage(OptionalDouble alice, OptionalDouble bob) {
    private static final int STEPS = 32;
    private static final double FINE_DB = 1e-3;

    /**
     * The shortage of a link. Of several stretches of loss in which all is met the nearest of {@value #STEPS} even steps down to no loss is found.
     *
     * @param scenario the link
     */
    public static LossShortage of(Scenario scenario) {
        RequirementMargins margins = RequirementMargins.of(scenario.require());
        LinkPredictor predictor = new LinkPredictor();
        return new LossShortage(
                nearest(
                        less -> margins.least(predictor.of(
                                Edits.withArms(scenario, relieved(scenario.alice(), less), scenario.bob()))),
                        ArmBudget.of(scenario, true).lossDb()),
                nearest(
                        less -> margins.least(predictor.of(
                                Edits.withArms(scenario, scenario.alice(), relieved(scenario.bob(), less)))),
                        ArmBudget.of(scenario, false).lossDb()));
    }

    private static OptionalDouble nearest(DoubleUnaryOperator leastMargin, double lossDb) {
        double failing = 0.0;
        for (int i = 0; i <= STEPS; i++) {
            double less = lossDb * i / STEPS;
            if (leastMargin.applyAsDouble(less) >= 0.0) {
                return OptionalDouble.of(i == 0 ? 0.0 : boundary(leastMargin, failing, less));
            }
            failing = less;
        }
        return OptionalDouble.empty();
    }

    /** The least loss taken off that suffices, by halving; margins may leap where a figure ends. */
    private static double boundary(DoubleUnaryOperator leastMargin, double failing, double met) {
        double low = failing;
        double high = met;
        while (high - low > FINE_DB) {
            double middle = (low + high) / 2.0;
            if (leastMargin.applyAsDouble(middle) >= 0.0) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    private static Arm relieved(Arm arm, double lessDb) {
        return new Arm(
                arm.photon(),
                arm.sourceCouplingLossDb(),
                arm.path(),
                arm.repairMarginDb() - lessDb,
                arm.analyzer(),
                arm.detectors(),
                arm.clockJitterRmsPs(),
                arm.tagBinPs(),
                arm.delayErrorPs());
    }
}
