package binspan.prediction;

import binspan.merit.FiniteKey;

/**
 * Finite key of the stated acquisition, wall-clock times counting the uptime share.
 *
 * @param bits length of the key after the acquisition, whole bits; NaN where the detected ports allow no key
 * @param bitsPerSecond that length over the acquisition's wall-clock time
 * @param secondsToFirstKey wall-clock time to the first bit, s; infinite or NaN if there is none
 */
public record FiniteKeyOutlook(double bits, double bitsPerSecond, double secondsToFirstKey) {
    private static final FiniteKeyOutlook NONE = new FiniteKeyOutlook(Double.NaN, Double.NaN, Double.NaN);

    /** The outlook of a predicted link. */
    public static FiniteKeyOutlook of(LinkPrediction prediction) {
        if (Double.isNaN(prediction.key().asymptoticPerSecond())) {
            return NONE;
        }
        FiniteKey key = prediction.finiteKey();
        double bits = Math.max(0.0, Math.floor(key.bits(prediction.uptime())));
        return new FiniteKeyOutlook(
                bits,
                bits / prediction.scenario().acquisition().durationS(),
                key.secondsToFirstBit() / prediction.uptimeShare());
    }
}
