package binspan.counting;

/** Which slots the photons and pairs of a pulsed source fall into, seen through the windows: detected means per cycle. */
sealed interface SlotPattern permits PulsePairPattern, PulseTrainPattern {
    /** Detected photons of alice in the window of a slot, n(a). */
    double alice(int port, int slot);

    /** Detected photons of bob in the window of a slot. */
    double bob(int port, int slot);

    /** Detected pairs in a pair of windows averaged over the phase, c(a,b). */
    double base(int portA, int portB, int slotA, int slotB);

    /** Half the difference of c(a,b) between best and worst phase; negative where phase 0 is the minimum. */
    double amplitude(int portA, int portB, int slotA, int slotB);

    /** Slot of the interfering window. */
    int central();

    /** Number of slots of a cycle that have windows of their own. */
    int slots();

    /** Contrast of ports (1,1) that balanced counting of single pairs would show without any overlap of the slots. */
    double balanceContrast();
}
