package binspan.merit;

import binspan.counting.LinkCounts;
import binspan.optics.TwoPhotonCoherence;
import java.util.ArrayList;
import java.util.List;

/**
 * What each cause costs the raw visibility: causes are switched on one after another in the fixed order, each factor is the ratio of successive
 * visibilities, and their product is the raw visibility.
 *
 * @param entries causes with their factors
 */
public record VisibilityBudget(List<Entry> entries) {
    /** Causes in the order in which they are switched on. */
    public enum Cause {
        PUMP_COHERENCE("pump coherence"),
        SPECTRAL("spectral"),
        PHASE("phase"),
        POLARIZATION("polarization"),
        PATH_BALANCE("path balance"),
        SLOT_OVERLAP("slot overlap"),
        MULTI_PAIR("multi-pair"),
        NOISE("dark and background");

        private final String text;

        Cause(String text) {
            this.text = text;
        }

        /** The cause in words. */
        public String text() {
            return text;
        }
    }

    /**
     * One line of the budget.
     *
     * @param cause cause
     * @param factor by which it multiplies the visibility
     */
    public record Entry(Cause cause, double factor) {}

    /** The budget of a link. */
    public static VisibilityBudget of(TwoPhotonCoherence coherence, LinkCounts counts, double raw) {
        double[] visibilities = {
            coherence.pump(),
            coherence.pump() * coherence.spectral(),
            coherence.pump() * coherence.spectral() * coherence.phase(),
            coherence.gamma(),
            counts.balanceContrast(),
            counts.central().of(0, 0).pairContrast(),
            FringeVisibility.of(counts.noiseless()).raw(),
            raw
        };
        List<Entry> entries = new ArrayList<>(visibilities.length);
        Cause[] causes = Cause.values();
        double before = 1.0;
        for (int i = 0; i < causes.length; i++) {
            entries.add(new Entry(causes[i], before > 0.0 && visibilities[i] >= 0.0 ? visibilities[i] / before : 1.0));
            before = visibilities[i];
        }
        return new VisibilityBudget(entries);
    }

    /** The factor of a cause. */
    public double factor(Cause cause) {
        return entries.stream()
                .filter(entry -> entry.cause() == cause)
                .findFirst()
                .orElseThrow()
                .factor();
    }
}
