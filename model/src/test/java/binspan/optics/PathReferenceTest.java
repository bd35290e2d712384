package binspan.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.ReferenceCase;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreSpan;
import binspan.scenario.LossElement;
import binspan.scenario.PathElement;
import binspan.units.OpticalFrequency;
import binspan.units.PhysicalConstants;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Losses, delays and dispersion of paths.
 *
 * <p>Group delay and index, silica, splice and Fresnel losses are not part of the model, which takes such losses as inputs;
 * they are kept as a check of the reference table, computed here by other means than its formulas.
 */
final class PathReferenceTest {
    private static final double C = PhysicalConstants.SPEED_OF_LIGHT;
    private static final double NO_STEP = 0.0;

    /** Malitson, J. Opt. Soc. Am. 55, 1205 (1965), from memory: strengths and resonances in um. */
    private static final double[][] MALITSON = {{0.6961663, 0.0684043}, {0.4079426, 0.1162414}, {0.8974794, 9.896161}};

    static Stream<ReferenceCase> cases() {
        return ReferenceCase.of("paths.csv");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("cases")
    void agrees(ReferenceCase c) {
        switch (c.id()) {
            case "fib-delay-1.4682" -> c.check("delay_us", c.in("group_index") * c.in("L_km") * 1e3 / C * 1e6);
            case "fib-192km-index" -> c.check("group_index", c.in("delay_ms") * 1e-3 * C / c.in("L_m"));
            case "fib-loss-1120km-0.16" -> attenuation(c);
            case "fib-pmd-100km" -> polarizationModeDispersion(c);
            case "fib-TCD-6.7ppm" -> relativeDelay(c);
            case "fib-TCD-OTDR" -> delayOfCoil(c);
            case "fib-TCD-39" -> c.check("TCD_ps_km_K", FibreClass.DELAY_PS_PER_KM_K);
            case "sil-n-1550" -> silica(c);
            case "sil-zero-disp" -> silicaZero(c);
            case "fresnel-gap" -> fresnel(c);
            case "budget-50km" -> budget(c);
            case "dis-17x50x0.8", "dis-17x100x0.1" ->
                c.check("dt_ps", spread(c.in("D"), c.in("L_km"), c.in("dlambda_nm")));
            case "dis-implied-192" ->
                c.check("D_times_dlambda_ps_per_km", c.in("dt_ps") / spread(1.0, c.in("L_km"), 1.0));
            default -> splice(c);
        }
        c.finish();
    }

    private static void attenuation(ReferenceCase c) {
        FibreSpan span = span(c.in("L_km"), c.in("alpha_dB_km"), 0.0, 0.0, 0.0);

        OpticalPath path = path(List.of(span), NO_STEP);

        c.check("loss_dB", path.fibreLossDb());
        c.check("transmittance", path.transmittance());
    }

    /** The rms spread is half the mean differential delay times sqrt(3 pi/8), the rms over the mean of a Maxwell distribution. */
    private static void polarizationModeDispersion(ReferenceCase c) {
        FibreSpan span = span(c.in("L_km"), 0.2, 0.0, c.in("PMD_coeff_ps_sqrtkm"), 0.0);

        double rms = path(List.of(span), NO_STEP).pmdRms();

        c.check("mean_DGD_ps", 2.0 * rms * 1e12 / Math.sqrt(3.0 * Math.PI / 8.0));
    }

    /** A coefficient of the table's size changes the delay of the fibre by the table's fraction. */
    private static void relativeDelay(ReferenceCase c) {
        double perKm = path(List.of(span(1.0, 0.2, 0.0, 0.0, 1.0)), 1.0).thermalDelay();
        double transit = c.in("group_index") * 1e3 / C;

        c.check("TCD_ps_km_K", c.in("fractional_delay_per_K") * transit / perKm);
    }

    private static void delayOfCoil(ReferenceCase c) {
        double perCoefficient = path(List.of(span(c.in("L_km"), 0.2, 0.0, 0.0, 1.0)), c.in("dT_K"))
                .thermalDelay();

        c.check("TCD_ps_km_K", c.in("dtau_ns") * 1e-9 / perCoefficient);
    }

    private static void budget(ReferenceCase c) {
        FibreSpan span = new FibreSpan(
                Optional.empty(),
                FibreClass.G652D,
                c.in("L_km"),
                OptionalDouble.of(c.in("alpha_dB_km")),
                OptionalDouble.empty(),
                0.0,
                OptionalDouble.empty(),
                c.in("connectors"),
                c.in("connector_dB"),
                c.in("splices"),
                c.in("splice_dB"),
                0.0,
                List.of());
        LossElement filter = new LossElement(Optional.empty(), c.in("filter_dB"));
        assertThat(c.in("filters")).isEqualTo(2.0);

        c.check("total_dB", path(List.of(span, filter, filter), NO_STEP).lossDb());
    }

    /** Spread in ps of a band dlambda wide: delay differs by beta times the angular frequency. */
    private static double spread(double dispersion, double lengthKm, double dlambdaNm) {
        double wavelength = 1550.0;
        double beta = path(List.of(span(lengthKm, 0.2, dispersion, 0.0, 0.0)), NO_STEP)
                .groupDelayDispersion();
        double width = 1.0 / OpticalFrequency.widthNm(1.0, wavelength) * dlambdaNm;
        return Math.abs(beta) * 2.0 * Math.PI * width * 1e12;
    }

    private static void silica(ReferenceCase c) {
        double um = c.in("lambda_um");
        DerivativeStructure n = index(um);

        c.check("n", n.getValue());
        c.check("group_index", n.getValue() - um * n.getPartialDerivative(1));
        c.check("D_material_ps_nm_km", materialDispersion(um));
    }

    private static void silicaZero(ReferenceCase c) {
        c.check(
                "lambda_zero_material_um",
                new BrentSolver(1e-9).solve(100, PathReferenceTest::materialDispersion, 1.1, 1.5));
    }

    /** -lambda/c d2n/dlambda2: 1 s/(m um) is 1e12 ps/(nm km). */
    private static double materialDispersion(double um) {
        return -um / C * index(um).getPartialDerivative(2) * 1e12;
    }

    private static DerivativeStructure index(double um) {
        DerivativeStructure square = new DerivativeStructure(1, 2, 0, um).pow(2);
        DerivativeStructure sum = new DerivativeStructure(1, 2, 1.0);
        for (double[] term : MALITSON) {
            sum = sum.add(square.multiply(term[0]).divide(square.subtract(term[1] * term[1])));
        }
        return sum.sqrt();
    }

    /** Amplitudes of plane waves at a glass face; two faces without interference pass the geometric sum of all reflections. */
    private static void fresnel(ReferenceCase c) {
        double n = c.in("n");
        double transmitted = 4.0 * n / ((1.0 + n) * (1.0 + n));
        double reflected = 1.0 - transmitted;
        double twoFaces = transmitted * transmitted;

        c.check("single_surface_reflect", reflected);
        c.check("return_loss_dB", -10.0 * Math.log10(reflected));
        c.check("two_surface_loss_dB_incoherent", -10.0 * Math.log10(twoFaces));
    }

    /** Overlap integral of two Gaussian modes, one dimension at a time. */
    private static void splice(ReferenceCase c) {
        double found = switch (c.id()) {
            case "spl-offset", "spl-offset1" ->
                overlapDb(c.in("mode_radius_um"), c.in("mode_radius_um"), c.in("offset_um"), 0.0);
            case "spl-mfd", "spl-mfd2" -> overlapDb(c.in("MFD1_um") / 2.0, c.in("MFD2_um") / 2.0, 0.0, 0.0);
            case "spl-tilt" ->
                overlapDb(
                        c.in("mode_radius_um"),
                        c.in("mode_radius_um"),
                        0.0,
                        2.0 * Math.PI * c.in("n") * Math.toRadians(c.in("tilt_deg")) / c.in("lambda_um"));
            default -> throw new IllegalStateException("no test for " + c.id());
        };
        c.check("loss_dB", found);
    }

    private static double overlapDb(double radius1, double radius2, double offset, double phasePerUm) {
        double across = overlap(radius1, radius2, offset, phasePerUm);
        double along = overlap(radius1, radius2, 0.0, 0.0);
        return -10.0 * Math.log10(across * along);
    }

    /** Square of the overlap of two normalised mode profiles exp(-x^2/w^2), one of them shifted or tilted; a tilt's sines cancel. */
    private static double overlap(double w1, double w2, double offset, double phasePerUm) {
        UnivariateFunction product =
                x -> Math.exp(-x * x / (w1 * w1) - (x - offset) * (x - offset) / (w2 * w2)) * Math.cos(phasePerUm * x);
        double overlap =
                new IterativeLegendreGaussIntegrator(16, 1e-12, 1e-14).integrate(100_000, product, -60.0, 60.0);
        return overlap * overlap / (Math.PI / 2.0 * w1 * w2);
    }

    /** Temperature moves delays only: it changes no loss. */
    @ParameterizedTest(name = "{0} K")
    @ValueSource(doubles = {-20.0, 0.0, 35.0})
    void temperatureLeavesLossAlone(double step) {
        OpticalPath path = path(List.of(span(30.0, 0.2, 17.0, 0.1, 39.0)), step);

        assertThat(path.lossDb()).isCloseTo(6.0, within(1e-12));
        assertThat(path.thermalDelay()).isCloseTo(39e-12 * 30.0 * step, within(1e-20));
    }

    private static OpticalPath path(List<PathElement> elements, double temperatureStep) {
        return OpticalPaths.of(new PathInputs(elements, 1550.0, 0.0, 0.0, 0.0, temperatureStep));
    }

    private static FibreSpan span(double km, double attenuation, double dispersion, double pmd, double delayPerKmK) {
        return new FibreSpan(
                Optional.empty(),
                FibreClass.G652D,
                km,
                OptionalDouble.of(attenuation),
                OptionalDouble.of(dispersion),
                pmd,
                OptionalDouble.empty(),
                0.0,
                0.0,
                0.0,
                0.0,
                delayPerKmK,
                List.of());
    }
}
