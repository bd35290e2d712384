package binspan.counting;

/** Coincidences of one port of alice with one of bob, in one pair of windows, against the two-photon phase. */
public sealed interface PortPair permits PulsedPortPair, ContinuousPortPair {
    /**
     * Coincidence rate.
     *
     * @param phase two-photon phase, rad; 0 is the maximum of ports (1,1)
     * @return 1/s
     */
    default double perSecond(double phase) {
        return atCosine(Math.cos(phase));
    }

    /** Coincidence rate at a cosine of the phase, 1/s. */
    double atCosine(double cosine);

    /** Accidental coincidences: those of independent clicks, 1/s. */
    double accidentalPerSecond();

    /** Contrast that single pairs alone would show, accidentals and noise left out: positive where phase 0 is the maximum. */
    double pairContrast();
}
