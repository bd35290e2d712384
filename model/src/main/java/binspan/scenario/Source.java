package binspan.scenario;

import java.util.OptionalDouble;

/**
 * The photon-pair source.
 *
 * @param pump pump light
 * @param meanPairsPerCycle pulsed: mean pairs per cycle (pulse pair: both bins together; train: per pulse) with both
 *     photons inside all filters of their arm, before any loss
 * @param pairRatePerSecond continuous: the same as a rate, 1/s
 * @param schmidtNumber stated Schmidt number of the doubly filtered pair in one bin; otherwise computed
 * @param unheraldedG2 measured unheralded g2(0) of one bin in alice's arm, instead of a Schmidt number
 * @param partnerPassProbability measured probability that a photon's partner passes its filters, losses apart;
 *     otherwise computed
 * @param signal filter band of the signal photon at the source
 * @param idler filter band of the idler photon at the source
 */
public record Source(
        Pump pump,
        OptionalDouble meanPairsPerCycle,
        OptionalDouble pairRatePerSecond,
        OptionalDouble schmidtNumber,
        OptionalDouble unheraldedG2,
        OptionalDouble partnerPassProbability,
        Band signal,
        Band idler) {}
