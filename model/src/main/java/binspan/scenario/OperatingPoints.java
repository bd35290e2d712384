package binspan.scenario;

import binspan.scenario.DetectorClass.Typical;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The trades of avalanche detectors as lists of operating points: a higher bias detects more and counts more in the dark, a longer dead time leaves fewer
 * afterpulses.
 *
 * <p>Free-running InGaAs: 10 % and 600 /s (Lunghi et al., arXiv:1204.4594), 20 us with 2.2 % afterpulses (Korzh et al., arXiv:1312.2636). Gated InGaAs:
 * 24.3 % and 9.4e-5 per gate at 238 K (abstract). All other points, the growth of dark counts with bias and the decay of afterpulses with dead time
 * are common practice: take the data sheet's where there is one.
 */
final class OperatingPoints {
    private static final double PERCENT = 100.0;
    private static final double NANO_PER_MICRO = 1000.0;

    private OperatingPoints() {}

    /** Efficiency with its dark counts, per second or per gate. */
    private record Bias(double efficiency, double dark) {}

    /** Dead time with the afterpulses that it leaves. */
    private record HoldOff(double deadTimeNs, double afterpulses) {}

    private static final List<Bias> FREE_RUNNING_BIAS =
            List.of(new Bias(0.10, 600.0), new Bias(0.15, 2000.0), new Bias(0.20, 5000.0), new Bias(0.25, 12_000.0));
    private static final List<HoldOff> FREE_RUNNING_HOLD_OFF =
            List.of(new HoldOff(10_000.0, 0.05), new HoldOff(20_000.0, 0.022), new HoldOff(50_000.0, 0.006));
    private static final List<Bias> GATED_BIAS =
            List.of(new Bias(0.10, 5e-6), new Bias(0.15, 1e-5), new Bias(0.20, 2e-5), new Bias(0.243, 9.4e-5));
    private static final List<HoldOff> GATED_HOLD_OFF =
            List.of(new HoldOff(2000.0, 0.08), new HoldOff(10_000.0, 0.03), new HoldOff(30_000.0, 0.01));

    /** The operating points of a class; one, the planning values, where it has no trade to offer. */
    static List<OperatingPoint> of(DetectorClass detectorClass) {
        return switch (detectorClass) {
            case INGAAS_FREE_RUNNING -> grid(detectorClass, FREE_RUNNING_BIAS, FREE_RUNNING_HOLD_OFF);
            case INGAAS_GATED -> grid(detectorClass, GATED_BIAS, GATED_HOLD_OFF);
            default -> List.of(new OperatingPoint("planning values", detectorClass.typical(), detectorClass.gate()));
        };
    }

    private static List<OperatingPoint> grid(DetectorClass detectorClass, List<Bias> biases, List<HoldOff> holdOffs) {
        List<OperatingPoint> points = new ArrayList<>();
        for (Bias bias : biases) {
            for (HoldOff holdOff : holdOffs) {
                points.add(point(detectorClass, bias, holdOff));
            }
        }
        return List.copyOf(points);
    }

    private static OperatingPoint point(DetectorClass detectorClass, Bias bias, HoldOff holdOff) {
        boolean gated = detectorClass.gate().isPresent();
        Typical values = new Typical(
                bias.efficiency(),
                gated ? 0.0 : bias.dark(),
                detectorClass.typical().jitterFwhmPs(),
                holdOff.deadTimeNs(),
                holdOff.afterpulses());
        Optional<Gate> gate =
                detectorClass.gate().map(usual -> new Gate(OptionalDouble.empty(), usual.widthNs(), bias.dark()));
        String meaning = Range.plain(Math.rint(bias.efficiency() * PERCENT * 10.0) / 10.0) + " %, "
                + Range.plain(holdOff.deadTimeNs() / NANO_PER_MICRO) + " us";
        return new OperatingPoint(meaning, values, gate);
    }
}
