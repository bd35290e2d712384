package binspan.scenario;

import java.util.OptionalDouble;

/**
 * The light that pumps the pairs.
 *
 * @param mode continuous, pulse pair or pulse train
 * @param wavelengthNm vacuum wavelength of the light that pumps the pairs, nm
 * @param repetitionRateMHz pulse pair: pump cycles per second, MHz
 * @param pairEmissionFwhmPs pulsed: intensity FWHM of the pulse in which pairs are born, ps
 * @param preparation how the pulse pair is made
 * @param mismatchPs bin separation minus the common imbalance, ps
 * @param earlyPairFraction pulse pair: share of the pairs born in the early bin
 * @param coherenceTimeNs 1/e time of the pump's |g1|, ns
 * @param linewidthMHz FWHM of the pump line instead, MHz
 * @param lineshape shape of that line
 * @param phaseNoiseRmsRad phase noise of the pump interferometer, rad rms
 * @param frequencyDriftRmsMHz frequency drift of the pump light between calibrations, MHz rms
 */
public record Pump(
        PumpMode mode,
        OptionalDouble wavelengthNm,
        OptionalDouble repetitionRateMHz,
        OptionalDouble pairEmissionFwhmPs,
        Preparation preparation,
        double mismatchPs,
        double earlyPairFraction,
        OptionalDouble coherenceTimeNs,
        OptionalDouble linewidthMHz,
        Lineshape lineshape,
        double phaseNoiseRmsRad,
        double frequencyDriftRmsMHz) {

    /**
     * Whether an unbalanced interferometer makes the two pulses, so that pump coherence drops out and its own phase
     * noise counts.
     */
    public boolean madeByInterferometer() {
        return mode == PumpMode.PULSE_PAIR && preparation == Preparation.INTERFEROMETER;
    }
}
