package binspan.optics;

import binspan.ReferenceCase;
import binspan.scenario.ClassicalChannel;
import binspan.scenario.Direction;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.PassbandShape;
import binspan.units.Decibels;
import binspan.units.OpticalFrequency;
import binspan.units.PhysicalConstants;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Raman light of classical channels: power by the integrals, photons per second through a whole path.
 *
 * <p>Thermal occupation and the coefficient that follows from the Raman gain are not part of the model, which takes the
 * coefficient as an input; they are kept as a check of the reference table.
 */
final class RamanReferenceTest {
    private static final double BOLTZMANN = 1.380649e-23;
    private static final double TERA = 1e12;

    static Stream<ReferenceCase> cases() {
        return ReferenceCase.of("raman.csv");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("cases")
    void agrees(ReferenceCase c) {
        switch (c.id()) {
            case "ram-eq-10km", "ram-eq-50km" -> light(c, c.in("alpha_dB_km"), c.in("alpha_dB_km"));
            case "ram-oband-50km" -> light(c, c.in("alpha_pump_dB_km"), c.in("alpha_quantum_dB_km"));
            case "ram-peak-length" -> strongest(c);
            case "ram-bwd-saturation" -> endless(c);
            case "ram-rho-from-gain" -> gain(c);
            default -> occupation(c);
        }
        c.finish();
    }

    private static void light(ReferenceCase c, double classicalDb, double quantumDb) {
        double launched = c.in("P0_mW") * 1e-3;
        double strength = c.in("rho_per_km_nm") * c.in("filter_nm");
        double classical = classicalDb * Decibels.NEPERS_PER_DB;
        double quantum = quantumDb * Decibels.NEPERS_PER_DB;

        c.check("P_fwd_W", RamanNoise.forward(launched, strength, classical, quantum, c.in("L_km")));
        c.check("P_bwd_W", RamanNoise.backward(launched, strength, classical, quantum, c.in("L_km")));
        c.check("rate_fwd_cps", photons(c, classicalDb, quantumDb, Direction.FORWARD));
        c.check("rate_bwd_cps", photons(c, classicalDb, quantumDb, Direction.BACKWARD));
    }

    /** The whole path: fibre with the channel, then a rectangular filter that leaks nothing and loses nothing. */
    private static double photons(ReferenceCase c, double classicalDb, double quantumDb, Direction direction) {
        double wavelength = c.in("lambda_q_nm");
        ClassicalChannel channel =
                new ClassicalChannel(0.0, 1550.0, OptionalDouble.of(classicalDb), direction, c.in("rho_per_km_nm"));
        FibreSpan span = new FibreSpan(
                Optional.empty(),
                FibreClass.G652D,
                c.in("L_km"),
                OptionalDouble.of(quantumDb),
                OptionalDouble.empty(),
                0.0,
                OptionalDouble.empty(),
                0.0,
                0.0,
                0.0,
                0.0,
                0.0,
                List.of(channel));
        double widthGHz = c.in("filter_nm") / OpticalFrequency.widthNm(1e9, wavelength);
        FilterElement filter = new FilterElement(Optional.empty(), widthGHz, PassbandShape.FLAT_TOP, 0.0, 300.0);
        return OpticalPaths.of(new PathInputs(List.of(span, filter), wavelength, 0.0, 0.0, 0.0, 0.0))
                .strayPhotonsPerSecond();
    }

    private static void strongest(ReferenceCase c) {
        double attenuation = c.in("alpha_dB_km") * Decibels.NEPERS_PER_DB;
        double found = new BrentOptimizer(1e-9, 1e-12)
                .optimize(
                        new UnivariateObjectiveFunction(
                                km -> Math.log(RamanNoise.forward(1.0, 1.0, attenuation, attenuation, km))),
                        GoalType.MAXIMIZE,
                        new SearchInterval(1.0, 200.0),
                        MaxEval.unlimited())
                .getPoint();
        c.check("L_max_forward_km", found);
    }

    private static void endless(ReferenceCase c) {
        double attenuation = c.in("alpha_dB_km") * Decibels.NEPERS_PER_DB;
        double strength = c.in("rho_per_km_nm") * c.in("filter_nm");
        c.check(
                "P_bwd_L_to_inf_W",
                RamanNoise.backward(c.in("P0_mW") * 1e-3, strength, attenuation, attenuation, 2000.0));
    }

    /** Bose and Einstein: 1/(exp(h nu/kT) - 1); Stokes light goes with n + 1, anti-Stokes light with n. */
    private static void occupation(ReferenceCase c) {
        double n = thermal(c);
        c.check("n_thermal", n);
        c.check("antiStokes_over_Stokes", n / (n + 1.0));
    }

    private static void gain(ReferenceCase c) {
        double frequency = OpticalFrequency.ofWavelengthNm(c.in("pump_nm")) - c.in("shift_THz") * TERA;
        double hertzPerNm = 1e9 / OpticalFrequency.widthNm(1e9, OpticalFrequency.toWavelengthNm(frequency));
        double density =
                2.0 * PhysicalConstants.PLANCK * frequency * c.in("C_R_per_W_km_unpolarised") * (thermal(c) + 1.0);
        c.check("lambda_stokes_nm", OpticalFrequency.toWavelengthNm(frequency));
        c.check("rho_per_km_nm", density * hertzPerNm);
    }

    private static double thermal(ReferenceCase c) {
        return 1.0 / Math.expm1(PhysicalConstants.PLANCK * c.in("shift_THz") * TERA / (BOLTZMANN * c.in("T_K")));
    }
}
