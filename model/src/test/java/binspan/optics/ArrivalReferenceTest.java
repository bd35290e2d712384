package binspan.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.IdealLink;
import binspan.ReferenceCase;
import binspan.scenario.Arm;
import binspan.scenario.PassbandShape;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import binspan.units.GaussianWidth;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Windows, widths in quadrature and broadening by dispersion. */
final class ArrivalReferenceTest {
    private static final double PICO = 1e-12;
    private static final double NO_MEASUREMENT = Double.NaN;

    static Stream<ReferenceCase> cases() {
        return ReferenceCase.of("arrival.csv");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("cases")
    void agrees(ReferenceCase c) {
        switch (c.id()) {
            case "det-gauss-capture-0.5", "det-gauss-capture-1", "det-gauss-capture-2" -> window(c);
            case "tail-emg" -> tail(c);
            case "det-fwhm-sigma" -> c.check("FWHM_ps", GaussianWidth.fwhm(c.in("sigma_ps")));
            case "det-quadrature-192km" -> deployed(c);
            case "dis-gauss-pulse" -> pulse(c);
            case "dis-biphoton-0.5--216.8" -> biphoton(c);
            case "dis-chua" -> excess(c);
            default -> throw new IllegalStateException("no test for " + c.id());
        }
        c.finish();
    }

    private static void window(ReferenceCase c) {
        double width = c.in("window_over_FWHM") * 80.0 * PICO;
        c.check("fraction", WindowCapture.gaussian(-width / 2.0, width / 2.0, GaussianWidth.rms(80.0 * PICO)));
    }

    /** Three in ten clicks late by an exponential: the port mixes both shapes. */
    private static void tail(ReferenceCase c) {
        double half = c.in("half_window_ps") * PICO;
        double sigma = c.in("sigma_ps") * PICO;
        double tailed = WindowCapture.tailed(-half, half, sigma, c.in("tail_ps") * PICO);
        double core = WindowCapture.gaussian(-half, half, sigma);
        PortTiming port = new PortTiming(sigma * sigma, 0.3, c.in("tail_ps") * PICO);

        c.check("tailed", tailed);
        c.check("gaussian", core);
        c.check("mixed_30_percent", port.capture(-half, half, sigma));
    }

    /** 192 km: the light's spread by dispersion, the detector and the clock of one arm, as the model adds them. */
    private static void deployed(ReferenceCase c) {
        double light = GaussianWidth.rms(c.in("dispersion_ps") * PICO);
        double port =
                port(c.in("jitter_ps"), GaussianWidth.rms(c.in("clock_ps"))).variance();

        double total = GaussianWidth.fwhm(Math.sqrt(light * light + port)) / PICO;

        c.check("total_FWHM_ps", total);
        c.check("published_FWHM_ps", total);
    }

    /** 41 ps of instrument and the excess of the fibres make the total. */
    private static void excess(ReferenceCase c) {
        double total = GaussianWidth.rms(c.in("total_ps") * PICO);
        double instrument = port(c.in("instrument_ps"), 0.0).variance();
        c.check("excess_ps", GaussianWidth.fwhm(Math.sqrt(total * total - instrument)) / PICO);
    }

    private static PortTiming port(double jitterFwhmPs, double clockRmsPs) {
        Values link = IdealLink.pulsePair();
        IdealLink.detectors(link, "alice", "jitterFwhmPs", jitterFwhmPs);
        SampleScenarios.part(link, "alice").put("clockJitterRmsPs", clockRmsPs);
        Arm alice = IdealLink.build(link).alice();
        return PortTiming.of(alice, 0.0).get(0);
    }

    /**
     * A transform-limited Gaussian pulse: an arm's photon whose filter is far narrower than the pump's spectrum. The dispersion
     * length is where the pulse has grown by sqrt 2.
     */
    private static void pulse(ReferenceCase c) {
        double rms = GaussianWidth.rms(c.in("FWHM_in_ps") * PICO);
        PairSpectrum spectrum = spectrum(0.5 / rms, 1e5 * 0.5 / rms);
        double perKm = c.in("beta2_ps2_km") * PICO * PICO;

        c.check("FWHM_out_ps", GaussianWidth.fwhm(Math.sqrt(singles(spectrum, perKm * c.in("L_km")))) / PICO);
        c.check(
                "LD_km",
                new BrentSolver(1e-9).solve(100, km -> singles(spectrum, perKm * km) / (rms * rms) - 2.0, 0.1, 20.0));
    }

    private static double singles(PairSpectrum spectrum, double beta) {
        return ArrivalTime.of(spectrum, beta, 0.0).singlesA();
    }

    /** Two equal filters whose product has the joint width: each is wider by sqrt 2. */
    private static void biphoton(ReferenceCase c) {
        double joint = 2.0 * Math.PI * GaussianWidth.rms(c.in("joint_spectrum_FWHM_THz") * 1e12);
        PairSpectrum spectrum = spectrum(joint * Math.sqrt(2.0), 0.0);
        double sum = c.in("sum_GDD_ps2") * PICO * PICO;

        double variance = ArrivalTime.differenceVariance(spectrum, sum);

        c.check("corr_FWHM_ps", GaussianWidth.fwhm(Math.sqrt(variance)) / PICO);
        assertThat(ArrivalTime.differenceVariance(spectrum, 0.0)).isCloseTo(0.25 / (joint * joint), within(1e-40));
    }

    private static PairSpectrum spectrum(double filterRms, double pumpRms) {
        Passband filter = Passband.of(GaussianWidth.fwhm(filterRms / (2.0 * Math.PI)), PassbandShape.GAUSSIAN);
        return PairSpectra.of(
                new SpectrumInputs(filter, filter, pumpRms, 0.0, NO_MEASUREMENT, NO_MEASUREMENT, NO_MEASUREMENT));
    }
}
