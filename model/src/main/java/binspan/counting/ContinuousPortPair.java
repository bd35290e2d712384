package binspan.counting;

/**
 * Coincidences with a continuous pump: captured pairs and, linear in both rates, accidentals.
 *
 * @param basePerSecond coincidences of true pairs averaged over the phase, 1/s
 * @param amplitudePerSecond half the difference between best and worst phase, signed, 1/s
 * @param accidentalPerSecond product of the recorded singles and the window, 1/s
 */
public record ContinuousPortPair(double basePerSecond, double amplitudePerSecond, double accidentalPerSecond)
        implements PortPair {
    @Override
    public double atCosine(double cosine) {
        return basePerSecond + amplitudePerSecond * cosine + accidentalPerSecond;
    }

    @Override
    public double pairContrast() {
        return basePerSecond > 0.0 ? amplitudePerSecond / basePerSecond : 0.0;
    }
}
