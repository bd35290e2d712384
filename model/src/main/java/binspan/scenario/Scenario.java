package binspan.scenario;

import java.util.Map;

/**
 * A planned time-bin entanglement link: the whole scenario file.
 *
 * @param formatVersion version of the file format
 * @param name name of the link
 * @param imbalanceNs nominal imbalance of all interferometers, which is also the bin separation (pulse train: the pulse
 *     period), ns
 * @param source pair source
 * @param alice arm and site of alice
 * @param bob arm and site of bob
 * @param timing windows and their drift
 * @param protocol key distillation
 * @param acquisition measuring times
 * @param require what the link must reach
 * @param spread parameter spreads for tolerance studies, by scenario path
 * @param provenance where a number comes from, by scenario path
 */
public record Scenario(
        int formatVersion,
        String name,
        double imbalanceNs,
        Source source,
        Arm alice,
        Arm bob,
        Timing timing,
        Protocol protocol,
        Acquisition acquisition,
        Requirements require,
        Map<String, Spread> spread,
        Map<String, String> provenance) {

    public Scenario {
        spread = Entries.copyOf(spread);
        provenance = Entries.copyOf(provenance);
    }

    /** The filter band of the photon that an arm carries. */
    public Band bandOf(Arm arm) {
        return arm.photon() == Photon.SIGNAL ? source.signal() : source.idler();
    }

    /** Whether the pairs are born in pulses, so that the arrival slots are known. */
    public boolean pulsed() {
        return source.pump().mode() != PumpMode.CONTINUOUS;
    }
}
