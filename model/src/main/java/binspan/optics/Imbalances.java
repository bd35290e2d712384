package binspan.optics;

import binspan.scenario.Pump;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;

/**
 * Delays of the interferometers, s.
 *
 * @param common nominal imbalance and bin separation T
 * @param alice T_A, the common one and alice's mismatch
 * @param bob T_B, the same for bob
 * @param pump T_P, distance of the pump pulses; pulse train: the period T
 */
public record Imbalances(double common, double alice, double bob, double pump) {
    /** The imbalances of a scenario. */
    public static Imbalances of(Scenario scenario) {
        double common = scenario.imbalanceNs() * Scale.NANO;
        boolean pair = scenario.source().pump().mode() == PumpMode.PULSE_PAIR;
        return new Imbalances(
                common,
                common + scenario.alice().analyzer().mismatchPs() * Scale.PICO,
                common + scenario.bob().analyzer().mismatchPs() * Scale.PICO,
                common + (pair ? scenario.source().pump().mismatchPs() * Scale.PICO : 0.0));
    }

    /** Delay over which a drift of the pump frequency turns the phase: (T_A + T_B)/2, less T_P where an interferometer makes the pulse pair. */
    public double effective(Pump pump) {
        double mean = (alice + bob) / 2.0;
        return pump.madeByInterferometer() ? mean - this.pump : mean;
    }

    /** Delay between the two emissions that interfere: T_P pulsed, the mean imbalance with a continuous pump. */
    public double emissions(Pump pump) {
        return pump.mode() == PumpMode.CONTINUOUS ? (alice + bob) / 2.0 : this.pump;
    }
}
