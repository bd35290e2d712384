package binspan.counting;

/**
 * Coincidences of two windows of a pulsed source by the threshold-detector statistics.
 *
 * @param cyclesPerSecond cycles in which both detectors are ready, 1/s
 * @param accidental probability of independent clicks in both windows
 * @param noClick product of the probabilities of no click
 * @param spread (1 + n_a/K)(1 + n_b/K)
 * @param modes Schmidt number K
 * @param base detected pairs c averaged over the phase
 * @param amplitude half the difference of c between best and worst phase, signed
 */
public record PulsedPortPair(
        double cyclesPerSecond,
        double accidental,
        double noClick,
        double spread,
        double modes,
        double base,
        double amplitude)
        implements PortPair {

    @Override
    public double atCosine(double cosine) {
        double pairs = Math.max(0.0, base + amplitude * cosine);
        return cyclesPerSecond * (accidental + noClick * ClickStatistics.correlation(pairs, spread, modes));
    }

    /** The same with best and worst phase exchanged. */
    PulsedPortPair opposite() {
        return amplitude == 0.0
                ? this
                : new PulsedPortPair(cyclesPerSecond, accidental, noClick, spread, modes, base, -amplitude);
    }

    @Override
    public double accidentalPerSecond() {
        return cyclesPerSecond * accidental;
    }

    @Override
    public double pairContrast() {
        return base > 0.0 ? amplitude / base : 0.0;
    }
}
