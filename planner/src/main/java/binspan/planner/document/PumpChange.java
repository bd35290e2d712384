package binspan.planner.document;

import binspan.planner.document.Change.Put;
import binspan.planner.document.Change.Remove;
import binspan.scenario.Band;
import binspan.scenario.Pump;
import binspan.scenario.PumpFields;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import binspan.units.Scale;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * Another pump for the same link, with as many pairs and uncorrelated photons per second as before. Fields that have no
 * effect with the new pump go; what it needs besides is added with usual values. Gated detectors stay: a continuous pump,
 * which has no slots to gate, is then refused by the document.
 */
public final class PumpChange {
    private static final double USUAL_RATE_MHZ = 80.0;
    private static final double USUAL_EMISSION_PS = 40.0;
    private static final double SLOTS = 3.0;
    private static final double PICO_PER_NANO = 1000.0;
    private static final double MEGA_PER_NANO = 1000.0;
    private static final MathContext DIGITS = new MathContext(12);
    private static final MathContext TWO_DIGITS = new MathContext(2, RoundingMode.FLOOR);

    private static final String PUMP = "source.pump.";
    private static final Set<String> OF_PAIRS =
            Set.of("repetitionRateMHz", "preparation", "mismatchPs", "earlyPairFraction", "phaseNoiseRmsRad");
    private static final List<String> SIDES = List.of("signal", "idler");

    private final List<Change> changes = new ArrayList<>();
    private final Scenario scenario;
    private final PumpMode mode;

    private PumpChange(Scenario scenario, PumpMode mode) {
        this.scenario = scenario;
        this.mode = mode;
    }

    /**
     * The changes that give a scenario another pump, none if it has that pump already.
     *
     * @param scenario the scenario of the document
     * @param mode the pump it shall have
     */
    public static List<Change> to(Scenario scenario, PumpMode mode) {
        PumpChange change = new PumpChange(scenario, mode);
        if (scenario.source().pump().mode() != mode) {
            change.pump();
            change.light();
        }
        return List.copyOf(change.changes);
    }

    private void pump() {
        Pump pump = scenario.source().pump();
        changes.add(new Put(PUMP + "mode", mode.text()));
        if (mode == PumpMode.PULSE_PAIR) {
            changes.add(new Put(PUMP + "repetitionRateMHz", pairRateMHz()));
        } else {
            OF_PAIRS.stream().sorted().forEach(this::withdraw);
        }
        if (mode == PumpMode.CONTINUOUS) {
            withdraw("pairEmissionFwhmPs");
            remove("source.schmidtNumber");
            remove("source.unheraldedG2");
        } else if (pump.pairEmissionFwhmPs().isEmpty()) {
            changes.add(new Put(PUMP + "pairEmissionFwhmPs", USUAL_EMISSION_PS));
        }
        if (mode == PumpMode.PULSE_PAIR
                && (pump.coherenceTimeNs().isPresent() || pump.linewidthMHz().isPresent())) {
            changes.add(new Put(PUMP + "preparation", "modulator"));
        }
    }

    private void withdraw(String field) {
        remove(PUMP + field);
    }

    private void remove(String path) {
        changes.add(new Remove(path));
        changes.add(new Remove("spread." + path));
        changes.add(new Remove("provenance." + path));
    }

    /** Cycles per second of a pulse pair: those stated, or the usual ones, or as many as leave room for three slots and the window. */
    private double pairRateMHz() {
        double slotsNs = SLOTS * scenario.imbalanceNs() + scenario.timing().windowWidthPs() / PICO_PER_NANO;
        double fitting =
                new BigDecimal(MEGA_PER_NANO / slotsNs).round(TWO_DIGITS).doubleValue();
        return scenario.source().pump().repetitionRateMHz().orElse(Math.min(USUAL_RATE_MHZ, fitting));
    }

    private void light() {
        double perSecond = cyclesPerSecond(scenario.source().pump().mode());
        double factor = perSecond / cyclesPerSecond(mode);
        String brightness = scenario.pulsed() ? "meanPairsPerCycle" : "pairRatePerSecond";
        OptionalDouble present = scenario.pulsed()
                ? scenario.source().meanPairsPerCycle()
                : scenario.source().pairRatePerSecond();
        convert("source.", brightness, present.orElseThrow(), factor);
        for (String side : SIDES) {
            Band band = side.equals("signal")
                    ? scenario.source().signal()
                    : scenario.source().idler();
            String field = scenario.pulsed() ? "uncorrelatedPhotonsPerCycle" : "uncorrelatedPhotonsPerSecond";
            double photons =
                    scenario.pulsed() ? band.uncorrelatedPhotonsPerCycle() : band.uncorrelatedPhotonsPerSecond();
            convert("source." + side + ".", field, photons, factor);
        }
    }

    /** States a number per cycle or second in the way of the new pump; none is left out. */
    private void convert(String parent, String field, double value, double factor) {
        String now = PumpFields.insteadOf(field, mode).orElse(field);
        if (!now.equals(field)) {
            changes.add(new Remove(parent + field));
        }
        if (value != 0.0) {
            changes.add(new Put(parent + now, rounded(value * factor)));
        }
        convertSpread(parent + field, parent + now, factor);
        convertProvenance(parent + field, parent + now);
    }

    private void convertSpread(String before, String now, double factor) {
        Spread spread = scenario.spread().get(before);
        if (spread == null) {
            return;
        }
        Map<String, Object> converted = new LinkedHashMap<>();
        converted.put(spread.shape().text(), spread.relative() ? spread.width() : rounded(spread.width() * factor));
        if (spread.relative()) {
            converted.put("relative", true);
        }
        changes.add(new Remove("spread." + before));
        changes.add(new Put("spread." + now, converted));
    }

    private void convertProvenance(String before, String now) {
        String words = scenario.provenance().get(before);
        if (words != null && !before.equals(now)) {
            changes.add(new Remove("provenance." + before));
            changes.add(new Put("provenance." + now, words));
        }
    }

    /** Cycles per second of a pump in this link; 1 for a continuous one, whose light is counted per second. */
    private double cyclesPerSecond(PumpMode pump) {
        return switch (pump) {
            case CONTINUOUS -> 1.0;
            case PULSE_TRAIN -> 1.0 / (scenario.imbalanceNs() * Scale.NANO);
            case PULSE_PAIR -> Scale.MEGA * pairRateMHz();
        };
    }

    private static double rounded(double value) {
        return new BigDecimal(value).round(DIGITS).doubleValue();
    }
}
