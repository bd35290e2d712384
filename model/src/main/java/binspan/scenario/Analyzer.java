package binspan.scenario;

/**
 * An unbalanced interferometer with two output ports.
 *
 * @param mismatchPs imbalance of this interferometer minus the common imbalance, ps
 * @param excessLossDb loss of both paths, the splitting not counted, dB
 * @param longPathExtraLossDb loss that the long path has on top, dB
 * @param inputShortFraction share of the power that the first splitter sends into the short path
 * @param outputShortToPort1 share of the short path's power that the second splitter sends to port 1
 * @param phaseNoiseRmsRad phase noise, temperature not counted, rad rms
 * @param temperatureRmsMilliK temperature fluctuation, mK rms
 * @param relativeDelayPerK relative change of the imbalance with temperature, 1/K
 * @param phaseSettingErrorRad static error of the phase setting, rad
 * @param polarizationOverlap modulus of the amplitude overlap of the two paths' polarizations
 * @param pathDispersionPs2 group-delay dispersion of the long path minus that of the short one, ps^2
 */
public record Analyzer(
        double mismatchPs,
        double excessLossDb,
        double longPathExtraLossDb,
        double inputShortFraction,
        double outputShortToPort1,
        double phaseNoiseRmsRad,
        double temperatureRmsMilliK,
        double relativeDelayPerK,
        double phaseSettingErrorRad,
        double polarizationOverlap,
        double pathDispersionPs2) {}
