package binspan.counting;

import binspan.optics.PairSpectrum;
import binspan.optics.PortTiming;
import java.util.List;

/**
 * What the counting of a continuous-pump source depends on.
 *
 * @param alice light of alice's arm, photons per second
 * @param bob light of bob's arm, photons per second
 * @param spectrum joint spectrum
 * @param betaSum sum of both paths' group-delay dispersions, s^2
 * @param portsA alice's ports
 * @param portsB bob's ports
 * @param gamma two-photon coherence, 0 to 1
 * @param pairsPerSecond pair rate, 1/s
 * @param windowWidth full width of the coincidence window, s
 * @param imbalanceA imbalance T_A of alice's analyzer, s
 * @param imbalanceB imbalance T_B of bob's analyzer, s
 * @param late how late alice's photons arrive against bob's, s
 */
public record ContinuousInputs(
        ArmLight alice,
        ArmLight bob,
        PairSpectrum spectrum,
        double betaSum,
        List<PortTiming> portsA,
        List<PortTiming> portsB,
        double gamma,
        double pairsPerSecond,
        double windowWidth,
        double imbalanceA,
        double imbalanceB,
        double late) {}
