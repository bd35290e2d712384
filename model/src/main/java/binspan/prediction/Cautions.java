package binspan.prediction;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Collects the cautions of a prediction: where the model strains, where a value is unusual, and what a key or Bell test does not prove. */
final class Cautions {
    private final List<Caution> found = new ArrayList<>();

    private Cautions() {}

    static List<Caution> of(LinkPrediction prediction, FiniteKeyOutlook finite) {
        Cautions cautions = new Cautions();
        TimingCautions.add(prediction, cautions);
        SourceCautions.add(prediction, cautions);
        DetectorCautions.add(prediction, cautions);
        PlausibilityCautions.add(prediction, finite, cautions);
        SecurityCautions.add(prediction, cautions);
        return List.copyOf(cautions.found);
    }

    /** Adds a caution if its condition holds; the text is formatted with the arguments in English notation. */
    void when(boolean condition, String code, String text, Object... arguments) {
        if (condition) {
            found.add(new Caution(code, String.format(Locale.ROOT, text, arguments)));
        }
    }

    /** Adds a caution that always holds. */
    void always(String code, String text) {
        found.add(new Caution(code, text));
    }
}
