package binspan.planner.viewmodel;

import binspan.optics.FibreOptics;
import binspan.optics.TwoPhotonCoherence;
import binspan.scenario.Arm;
import binspan.scenario.Band;
import binspan.scenario.Compensator;
import binspan.scenario.Detector;
import binspan.scenario.FibreSpan;
import binspan.scenario.Gate;
import binspan.scenario.Lineshape;
import binspan.scenario.Pump;
import binspan.scenario.Scenario;
import binspan.units.Digits;
import binspan.units.Scale;
import java.util.OptionalDouble;

/**
 * The same thing stated in another form: a wavelength as a frequency or a channel, a coherence time as a line width, a
 * dispersion as a share, dark counts per second as a probability per gate. What has no equal in the other form, such as
 * a Schmidt number and a measured g2, is left to the user.
 */
final class Equivalent {
    private static final int DIGITS = 8;
    private static final int NOISE_DIGITS = 3;
    private static final double CHANNEL_ZERO_THZ = 190.0;
    private static final double CHANNELS_PER_THZ = 10.0;
    private static final double GATE_NS = 1.0;

    private Equivalent() {}

    /** What a field would have to state for the scenario to stay as it is. */
    static OptionalDouble of(Scenario scenario, FieldPlace place) {
        Object object = PlannedValue.at(scenario, place.parent()).orElse(null);
        double value = Double.NaN;
        if (object instanceof Band band) {
            value = centre(band, place.field().name());
        } else if (object instanceof Pump pump) {
            value = coherence(pump, place.field().name());
        } else if (object instanceof Compensator compensator) {
            value = dispersion(scenario, place, compensator);
        } else if (object instanceof Detector detector) {
            value = perSecond(detector);
        }
        boolean meant = Double.isFinite(value) && place.field().range().contains(value);
        return meant ? OptionalDouble.of(value) : OptionalDouble.empty();
    }

    private static double centre(Band band, String form) {
        double terahertz = band.centreHz() / Scale.TERA;
        return switch (form) {
            case "wavelengthNm" -> rounded(band.centreNm(), DIGITS);
            case "frequencyTHz" -> rounded(terahertz, DIGITS);
            default -> rounded((terahertz - CHANNEL_ZERO_THZ) * CHANNELS_PER_THZ, DIGITS - 2);
        };
    }

    private static double coherence(Pump pump, String form) {
        double time = TwoPhotonCoherence.coherenceTime(pump);
        double shape = pump.lineshape() == Lineshape.LORENTZIAN ? 1.0 : 2.0 * Math.sqrt(Math.log(2.0));
        return form.equals("coherenceTimeNs")
                ? rounded(time / Scale.NANO, DIGITS)
                : rounded(shape / (Math.PI * time) / Scale.MEGA, DIGITS);
    }

    private static double dispersion(Scenario scenario, FieldPlace place, Compensator compensator) {
        Arm arm = place.parent().startsWith("alice") ? scenario.alice() : scenario.bob();
        double nm = scenario.bandOf(arm).centreNm();
        double fibre = arm.path().stream()
                .mapToDouble(each -> each instanceof FibreSpan span ? FibreOptics.dispersionPsPerNm(span, nm) : 0.0)
                .sum();
        return place.field().name().equals("share")
                ? rounded(-compensator.dispersionPsPerNm().orElse(Double.NaN) / fibre, DIGITS)
                : rounded(-compensator.share().orElse(Double.NaN) * fibre, DIGITS);
    }

    /** Dark counts of a gated detector while it is sensitive; those of a free-running one as they are. */
    private static double perSecond(Detector detector) {
        return detector.gate()
                .map(gate -> rounded(gate.darkProbability() / (gate.widthNs() * Scale.NANO), NOISE_DIGITS))
                .orElse(detector.darkCountsPerSecond());
    }

    /** The gate in which a free-running detector would have its dark counts, or the gate that it has. */
    static Gate gate(Detector detector) {
        double dark = rounded(detector.darkCountsPerSecond() * GATE_NS * Scale.NANO, NOISE_DIGITS);
        return detector.gate().orElse(new Gate(OptionalDouble.empty(), GATE_NS, Math.min(1.0, dark)));
    }

    private static double rounded(double value, int digits) {
        return Double.isFinite(value) ? Double.parseDouble(Digits.shortest(value, digits)) : Double.NaN;
    }
}
