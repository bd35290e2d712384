package binspan.optics;

import java.util.List;

/**
 * All that the captures of a pulsed source depend on; equal inputs give equal captures.
 *
 * @param spectrum joint spectrum
 * @param betaA group-delay dispersion of alice's path, s^2
 * @param betaB the same for bob, s^2
 * @param portsA alice's ports
 * @param portsB bob's ports
 * @param windowWidth full width of each slot's window, s
 * @param separation distance of the slots, s
 * @param lateA how late alice's photons arrive against her windows, s
 * @param lateB the same for bob, s
 * @param endless whether the slots repeat without end (pulse train) instead of three in a cycle
 */
public record CaptureInputs(
        PairSpectrum spectrum,
        double betaA,
        double betaB,
        List<PortTiming> portsA,
        List<PortTiming> portsB,
        double windowWidth,
        double separation,
        double lateA,
        double lateB,
        boolean endless) {

    /** Whether the other inputs are surely equal: the same spectrum object and the same numbers. */
    public boolean same(CaptureInputs other) {
        return separation == other.separation && sameWindow(other);
    }

    /** Whether the central window surely captures the same: everything but the distance of the slots is equal. */
    boolean sameWindow(CaptureInputs other) {
        return sameLight(other)
                && windowWidth == other.windowWidth
                && lateA == other.lateA
                && lateB == other.lateB
                && endless == other.endless
                && PortTiming.same(portsA, other.portsA)
                && PortTiming.same(portsB, other.portsB);
    }

    /** Whether the light surely spreads alike. */
    @SuppressWarnings("ReferenceEquality") // identity is enough here and quicker than comparing the spectra
    boolean sameLight(CaptureInputs other) {
        return spectrum == other.spectrum && betaA == other.betaA && betaB == other.betaB;
    }
}
