package binspan.study;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkOptics;
import binspan.prediction.LinkPrediction;
import binspan.prediction.ResultField;
import java.util.List;

/** Reads figures of merit out of predictions, for one thread; those that depend on the light alone only when the light has changed. */
public final class FigureReader {
    private final FigureColumn[] columns;
    private final boolean[] optical;
    private final double[] known;
    private final boolean finiteKey;
    private LinkOptics optics;

    public FigureReader(List<FigureColumn> columns) {
        this.columns = columns.toArray(FigureColumn[]::new);
        this.optical = new boolean[this.columns.length];
        this.known = new double[this.columns.length];
        boolean finite = false;
        for (int i = 0; i < optical.length; i++) {
            optical[i] = this.columns[i].field().stage() == ResultField.Stage.OPTICS;
            finite |= this.columns[i].field().stage() == ResultField.Stage.FINITE_KEY;
        }
        this.finiteKey = finite;
    }

    /**
     * Reads all figures.
     *
     * @param prediction the prediction
     * @param into where they go, one after the other
     * @param at position of the first
     */
    public void read(LinkPrediction prediction, double[] into, int at) {
        renew(prediction);
        FiniteKeyOutlook finite = finiteKey ? FiniteKeyOutlook.of(prediction) : null;
        for (int i = 0; i < columns.length; i++) {
            into[at + i] = optical[i] ? known[i] : columns[i].of(prediction, finite);
        }
    }

    @SuppressWarnings("ReferenceEquality") // optics that are reused are the same object
    private void renew(LinkPrediction prediction) {
        if (prediction.optics() != optics) {
            optics = prediction.optics();
            for (int i = 0; i < columns.length; i++) {
                if (optical[i]) {
                    known[i] = columns[i].of(prediction, null);
                }
            }
        }
    }
}
