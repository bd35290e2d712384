package binspan.prediction.histogram;

import binspan.optics.TimeBins;
import binspan.optics.Window;
import java.util.List;

/**
 * Coincidences of one pair of ports, or of all, per second and bin. Pulsed: bob's arrival relative to the centre of his central slot in the cycles in which
 * alice clicks inside her central window. Continuous: t_A - t_B.
 *
 * <p>Side peaks, central peak at one phase and accidentals add. The bins inside the window sum to the predicted coincidences at best and worst phase and
 * to the predicted accidentals. A pulsed source's click statistics are not linear in the pairs: all pairs are scaled by the factor that holds in bob's
 * central window at the port pair's own worst phase, the central peak then so that the window's sum is the predicted rate exactly, and accidentals by
 * bob's clicks per expected event of that window. Beyond the window this is right to first order in the clicks per slot.
 *
 * @param bins the bins
 * @param window bob's central window, or that of the time difference
 * @param peaks peaks in rising order
 * @param sidePeaks pairs whose photons took paths of unequal length, or that were born in other slots than the interfering ones
 * @param centralBest interfering pairs at the best phase of ports (1,1)
 * @param centralWorst interfering pairs at the worst phase of ports (1,1)
 * @param accidentalLight accidentals of light with light
 * @param accidentalNoise accidentals in which a dark count, background or an afterpulse takes part
 */
public record CoincidenceHistogram(
        TimeBins bins,
        Window window,
        List<Peak> peaks,
        BinRates sidePeaks,
        BinRates centralBest,
        BinRates centralWorst,
        BinRates accidentalLight,
        BinRates accidentalNoise) {
    /** Copies the list. */
    public CoincidenceHistogram {
        peaks = List.copyOf(peaks);
    }

    /** All accidentals. */
    public BinRates accidentals() {
        return accidentalLight.plus(accidentalNoise);
    }

    /** Everything at the best phase of ports (1,1). */
    public BinRates best() {
        return BinRates.sum(List.of(sidePeaks, centralBest, accidentalLight, accidentalNoise));
    }

    /** Everything at the worst phase of ports (1,1). */
    public BinRates worst() {
        return BinRates.sum(List.of(sidePeaks, centralWorst, accidentalLight, accidentalNoise));
    }

    /** Pairs of ports added. */
    static CoincidenceHistogram sum(List<CoincidenceHistogram> pairs) {
        CoincidenceHistogram first = pairs.get(0);
        return new CoincidenceHistogram(
                first.bins,
                first.window,
                first.peaks,
                BinRates.sum(pairs.stream().map(CoincidenceHistogram::sidePeaks).toList()),
                BinRates.sum(
                        pairs.stream().map(CoincidenceHistogram::centralBest).toList()),
                BinRates.sum(
                        pairs.stream().map(CoincidenceHistogram::centralWorst).toList()),
                BinRates.sum(pairs.stream()
                        .map(CoincidenceHistogram::accidentalLight)
                        .toList()),
                BinRates.sum(pairs.stream()
                        .map(CoincidenceHistogram::accidentalNoise)
                        .toList()));
    }
}
