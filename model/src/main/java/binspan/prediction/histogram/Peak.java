package binspan.prediction.histogram;

/**
 * A peak of a histogram.
 *
 * @param kind what arrives there
 * @param time mean arrival of the light, lateness included and detector tails not, s
 */
public record Peak(Kind kind, double time) {
    /** What arrives in a peak. */
    public enum Kind {
        /** Singles of a pulse pair: born early, short path. */
        EARLY_SHORT,
        /** Singles of a pulse pair: born early on the long path, or late on the short one. */
        CENTRAL_SLOT,
        /** Singles of a pulse pair: born late, long path. */
        LATE_LONG,
        /** Singles of a pulse train: a slot like any other. */
        TRAIN_SLOT,
        /** Pairs whose photons took paths of equal length: they interfere. */
        SAME_PATHS,
        /** Pairs of which alice's photon took the long path and bob's the short one. */
        ALICE_LONG,
        /** Pairs of which bob's photon took the long path and alice's the short one. */
        BOB_LONG
    }
}
