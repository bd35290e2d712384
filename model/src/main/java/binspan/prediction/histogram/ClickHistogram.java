package binspan.prediction.histogram;

import binspan.optics.TimeBins;
import binspan.optics.Window;
import java.util.List;

/**
 * Recorded clicks of one port, or of all ports of a side, per second and bin, by their cause; the causes add. Times are relative to the centre of the
 * central slot.
 *
 * <p>Pulse pair: folded over the cycle. Pulse train: folded over the period and shown for several of them, so that one period holds all clicks.
 * Continuous pump: nothing to fold on, so all clicks spread evenly over the time shown.
 *
 * @param bins the bins
 * @param windows windows of the slots in rising order; empty for a continuous pump
 * @param peaks peaks in rising order; empty for a continuous pump
 * @param light clicks by light of the source
 * @param dark dark counts; of a gated detector, inside its gates
 * @param background clicks by stray light and classical channels
 * @param afterpulses afterpulses
 */
public record ClickHistogram(
        TimeBins bins,
        List<Window> windows,
        List<Peak> peaks,
        BinRates light,
        BinRates dark,
        BinRates background,
        BinRates afterpulses) {
    /** Copies the lists. */
    public ClickHistogram {
        windows = List.copyOf(windows);
        peaks = List.copyOf(peaks);
    }

    /** All but the light. */
    public BinRates noise() {
        return BinRates.sum(List.of(dark, background, afterpulses));
    }

    /** All causes together. */
    public BinRates recorded() {
        return BinRates.sum(List.of(light, dark, background, afterpulses));
    }

    /** Ports added. */
    static ClickHistogram sum(List<ClickHistogram> ports) {
        ClickHistogram first = ports.get(0);
        return new ClickHistogram(
                first.bins,
                first.windows,
                first.peaks,
                BinRates.sum(ports.stream().map(ClickHistogram::light).toList()),
                BinRates.sum(ports.stream().map(ClickHistogram::dark).toList()),
                BinRates.sum(ports.stream().map(ClickHistogram::background).toList()),
                BinRates.sum(ports.stream().map(ClickHistogram::afterpulses).toList()));
    }
}
