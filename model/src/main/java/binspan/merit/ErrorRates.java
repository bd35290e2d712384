package binspan.merit;

import binspan.counting.LinkCounts;
import binspan.optics.AnalyzerPaths;

/**
 * Error rates of both bases and the phase errors of the keys made from them.
 *
 * @param phase error rate e_X of the phase basis
 * @param time error rate e_Z of the time basis; NaN without a time basis
 * @param phaseErrorOfTimeKey e_ph(Z): what an eavesdropper may know of the time bits; NaN without a time basis
 * @param phaseErrorOfPhaseKey e_ph(X) of the phase bits; equal to e_Z with balanced analyzers
 */
public record ErrorRates(double phase, double time, double phaseErrorOfTimeKey, double phaseErrorOfPhaseKey) {
    private static final double RANDOM = 0.5;

    /**
     * Error rates of a link.
     *
     * @param counts counts
     * @param sifted what sifting keeps
     * @param visibility raw visibility of ports (1,1), used where a side detects one port only (fair sampling assumed)
     * @param phaseOffset static phase error delta, rad
     */
    public static ErrorRates of(LinkCounts counts, SiftedRates sifted, double visibility, double phaseOffset) {
        double cosine = Math.cos(phaseOffset);
        double matched = counts.central().equalLessUnequal(cosine);
        double contrast = counts.bothPorts() ? matched / sifted.central() : visibility * cosine;
        double phase = clip((1.0 - contrast) / 2.0);
        if (!counts.hasTimeBasis()) {
            return new ErrorRates(phase, Double.NaN, Double.NaN, phase);
        }
        double interference = (matched - counts.central().equalLessUnequal(-cosine)) / 2.0;
        return new ErrorRates(
                phase,
                clip((sifted.earlyLate() + sifted.lateEarly()) / sifted.time()),
                phaseErrorOfTimeKey(interference, sifted),
                phaseErrorOfPhaseKey(counts, sifted));
    }

    /** e_ph(Z) = [1 - I/Q_Z]/2, I the sum over port pairs of (-1)^(o+q) [P(delta) - P(delta + pi)]/2. */
    private static double phaseErrorOfTimeKey(double interference, SiftedRates sifted) {
        return clip((1.0 - interference / sifted.time()) / 2.0);
    }

    /** e_ph(X) = [N02 lA sB/(sA lB) + N20 sA lB/(lA sB)]/Q_X: slots 0 and 2 weigh the bins s : l, slot 1 weighs them l : s. */
    private static double phaseErrorOfPhaseKey(LinkCounts counts, SiftedRates sifted) {
        AnalyzerPaths a = counts.alice().paths();
        AnalyzerPaths b = counts.bob().paths();
        double ratio = (a.long1() + a.long2())
                * (b.short1() + b.short2())
                / ((a.short1() + a.short2()) * (b.long1() + b.long2()));
        return clip((sifted.earlyLate() * ratio + sifted.lateEarly() / ratio) / sifted.central());
    }

    /** To [0, 1/2]; what cannot be computed is as bad as random. */
    private static double clip(double rate) {
        return rate >= 0.0 && rate <= RANDOM ? rate : rate < 0.0 ? 0.0 : RANDOM;
    }
}
