package binspan.prediction;

import binspan.scenario.PumpMode;

/** What a Bell test or key of this kind does not prove. */
final class SecurityCautions {
    private SecurityCautions() {}

    static void add(LinkPrediction p, Cautions cautions) {
        cautions.always(
                "post-selection",
                "Only photons in the central slot are kept, which leaves the post-selection loophole: S above 2 certifies source and alignment here, not"
                        + " device independence.");
        if (p.scenario().source().pump().mode() == PumpMode.PULSE_PAIR) {
            cautions.always(
                    "watch-outer-times",
                    "Clicks outside slots 0 to 2 must be recorded and watched; clicks in both bases of one cycle must be assigned at random.");
        } else {
            cautions.always(
                    "double-clicks", "Clicks of both ports in one window must be assigned at random, not thrown away.");
        }
        cautions.always(
                "estimate-not-proof",
                "A plan is an estimate, not a security proof; the finite-key bounds assume what their publications assume of sources and detectors.");
    }
}
