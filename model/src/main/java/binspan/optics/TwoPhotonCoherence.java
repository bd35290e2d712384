package binspan.optics;

import binspan.scenario.Analyzer;
import binspan.scenario.Lineshape;
import binspan.scenario.Pump;
import binspan.scenario.Scenario;
import binspan.units.Scale;

/**
 * What is left of the interference between the two ways a pair can take, by cause.
 *
 * @param pump coherence of the pump between the two emissions
 * @param spectral overlap of imbalances within the joint spectrum
 * @param phase phase noise
 * @param polarization polarization overlap of the analyzers' paths
 * @param phaseOffset static phase error delta, rad
 */
public record TwoPhotonCoherence(double pump, double spectral, double phase, double polarization, double phaseOffset) {
    /** The coherence of a scenario. */
    public static TwoPhotonCoherence of(Scenario scenario, PairSpectrum spectrum, Imbalances imbalances) {
        Analyzer a = scenario.alice().analyzer();
        Analyzer b = scenario.bob().analyzer();
        Pump pump = scenario.source().pump();
        SpectralCoherence.Mismatch mismatch = new SpectralCoherence.Mismatch(
                imbalances.alice() - imbalances.pump(),
                imbalances.bob() - imbalances.pump(),
                a.pathDispersionPs2() * Scale.PICO * Scale.PICO,
                b.pathDispersionPs2() * Scale.PICO * Scale.PICO);
        return new TwoPhotonCoherence(
                pump.madeByInterferometer() ? 1.0 : pumpCoherence(pump, imbalances.emissions(pump)),
                SpectralCoherence.of(spectrum, mismatch),
                PhaseVariance.of(scenario, imbalances).coherence(),
                a.polarizationOverlap() * b.polarizationOverlap(),
                a.phaseSettingErrorRad() + b.phaseSettingErrorRad());
    }

    /** All causes together, gamma, 0 to 1. */
    public double gamma() {
        return pump * spectral * phase * polarization;
    }

    /**
     * Modulus of the pump's degree of coherence: exp(-T/tc) Lorentzian, exp(-(T/tc)^2) Gaussian.
     *
     * @param pump pump; 1 where neither coherence time nor line width is stated
     * @param delay delay T of the two emissions, s, of either sign
     */
    public static double pumpCoherence(Pump pump, double delay) {
        double ratio = Math.abs(delay) / coherenceTime(pump);
        return Math.exp(pump.lineshape() == Lineshape.LORENTZIAN ? -ratio : -ratio * ratio);
    }

    /** Coherence time tc in s: stated, or 1/(pi linewidth) Lorentzian, 2 sqrt(ln 2)/(pi linewidth) Gaussian; infinite if nothing is stated. */
    public static double coherenceTime(Pump pump) {
        if (pump.coherenceTimeNs().isPresent()) {
            return pump.coherenceTimeNs().getAsDouble() * Scale.NANO;
        }
        double width = pump.linewidthMHz().orElse(0.0) * Scale.MEGA;
        double shape = pump.lineshape() == Lineshape.LORENTZIAN ? 1.0 : 2.0 * Math.sqrt(Math.log(2.0));
        return shape / (Math.PI * width);
    }
}
