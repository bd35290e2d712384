package binspan.planner.viewmodel;

import binspan.optics.TimeBins;
import binspan.optics.Window;
import java.util.List;

/**
 * An arrival-time histogram as the window draws it.
 *
 * @param id name for tests and styles: alice, bob, pair
 * @param title what is counted
 * @param note rates in words
 * @param bins bins of the time axis, s
 * @param layers what stands on one another, the lowest first
 * @param windows windows in rising order, s; of a side one for each slot
 * @param central index of the window that can be dragged
 * @param peaks names of the peaks with their times
 */
public record SlotPlot(
        String id,
        String title,
        String note,
        TimeBins bins,
        List<Layer> layers,
        List<Window> windows,
        int central,
        List<NamedPeak> peaks) {
    /** Copies the lists. */
    public SlotPlot {
        layers = List.copyOf(layers);
        windows = List.copyOf(windows);
        peaks = List.copyOf(peaks);
    }

    /** What a layer shows. */
    public enum Kind {
        /** Dark counts, background, afterpulses; of pairs: accidentals. */
        NOISE,
        /** Light of the source; of pairs: the side peaks. */
        LIGHT,
        /** Interfering pairs at the worst phase. */
        WORST,
        /** What the best phase adds to the worst. */
        CONTRAST
    }

    /**
     * A layer.
     *
     * @param kind what it shows
     * @param name in words
     * @param perSecond events per second in each bin; nobody changes the array
     */
    @SuppressWarnings("ArrayRecordComponent") // for drawing, which neither changes nor compares layers
    public record Layer(Kind kind, String name, double[] perSecond) {}

    /**
     * The name of a peak.
     *
     * @param time mean arrival, s
     * @param name in words
     */
    public record NamedPeak(double time, String name) {}

    /** The highest bin, all layers together, 1/s. */
    public double highest() {
        double highest = 0.0;
        for (int bin = 0; bin < bins.count(); bin++) {
            double sum = 0.0;
            for (Layer layer : layers) {
                sum += layer.perSecond()[bin];
            }
            highest = Math.max(highest, sum);
        }
        return highest;
    }
}
