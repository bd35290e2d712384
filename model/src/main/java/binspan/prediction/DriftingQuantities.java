package binspan.prediction;

import binspan.optics.Imbalances;
import binspan.scenario.Arm;
import binspan.scenario.Detector;
import binspan.scenario.FibreSpan;
import binspan.scenario.LinkLength;
import binspan.scenario.PathElement;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;

/** The quantities of a link that can drift, each with the step from which a search for its limit starts. */
final class DriftingQuantities {
    /**
     * One quantity.
     *
     * @param path scenario path
     * @param firstStep first step of the search where the planned value is 0, in the parameter's unit
     * @param widestStep widest step, so that no slot is stepped over where lateness by a whole slot looks like none
     * @param bothWays whether too little can fail a requirement as well as too much
     */
    record Quantity(String path, double firstStep, double widestStep, boolean bothWays) {}

    private static final double SHARE_OF_WINDOW = 0.3;

    /** Below this share of the imbalance a pump interferometer cancels any drift of the pump that occurs. */
    private static final double NOTICEABLE_SHARE = 0.01;

    private final Scenario scenario;
    private final List<Quantity> quantities = new ArrayList<>();

    private DriftingQuantities(Scenario scenario) {
        this.scenario = scenario;
    }

    /** The quantities of a scenario, in the order in which an engineer asks for them. */
    static List<Quantity> of(Scenario scenario) {
        DriftingQuantities drifting = new DriftingQuantities(scenario);
        drifting.link();
        drifting.pump();
        drifting.arm("alice", scenario.alice());
        drifting.arm("bob", scenario.bob());
        return drifting.quantities;
    }

    private void link() {
        if (new LinkLength().value(scenario).orElse(0.0) > 0.0) {
            add(LinkLength.PATH, 1.0);
            double widest = lateness() / Math.max(psPerK(scenario.alice()), psPerK(scenario.bob()));
            quantities.add(new Quantity("timing.cableTemperatureStepK", Math.min(0.1, widest), widest, false));
        }
        bothWays("timing.windowWidthPs", 1.0);
        bothWays(scenario.pulsed() ? "source.meanPairsPerCycle" : "source.pairRatePerSecond", 1e-4);
    }

    /** A lateness that no window can miss, ps. */
    private double lateness() {
        return SHARE_OF_WINDOW * scenario.timing().windowWidthPs();
    }

    private static double psPerK(Arm arm) {
        double sum = 0.0;
        for (PathElement element : arm.path()) {
            sum += element instanceof FibreSpan span ? Math.abs(span.delayPsPerKmK()) * span.lengthKm() : 0.0;
        }
        return sum;
    }

    private void pump() {
        boolean interferometer = scenario.source().pump().madeByInterferometer();
        Imbalances imbalances = Imbalances.of(scenario);
        if (Math.abs(imbalances.effective(scenario.source().pump())) > NOTICEABLE_SHARE * imbalances.common()) {
            add("source.pump.frequencyDriftRmsMHz", 1.0);
        }
        if (scenario.source().pump().mode() == PumpMode.PULSE_PAIR) {
            add("source.pump.mismatchPs", 0.1);
        }
        if (interferometer) {
            add("source.pump.phaseNoiseRmsRad", 0.01);
        }
    }

    private void arm(String name, Arm arm) {
        add(name + ".repairMarginDb", 0.1);
        quantities.add(new Quantity(name + ".delayErrorPs", 1.0, lateness(), false));
        add(name + ".clockJitterRmsPs", 1.0);
        add(name + ".analyzer.mismatchPs", 0.1);
        add(name + ".analyzer.phaseNoiseRmsRad", 0.01);
        add(name + ".analyzer.temperatureRmsMilliK", 0.5);
        List<Detector> detectors = arm.detectors();
        boolean alike = detectors.size() == 1
                || (detectors.get(0).jitterFwhmPs() == detectors.get(1).jitterFwhmPs()
                        && noise(detectors.get(0)) == noise(detectors.get(1))
                        && detectors.get(0).gate().isPresent()
                                == detectors.get(1).gate().isPresent());
        if (alike) {
            detector(name + ".detectors", detectors.get(0));
        } else {
            detector(name + ".detectors[0]", detectors.get(0));
            detector(name + ".detectors[1]", detectors.get(1));
        }
    }

    private void detector(String path, Detector detector) {
        add(path + ".jitterFwhmPs", 1.0);
        if (detector.gate().isPresent()) {
            add(path + ".gate.darkProbability", 1e-8);
        } else {
            add(path + ".darkCountsPerSecond", 1.0);
        }
    }

    private static double noise(Detector detector) {
        return detector.gate().isPresent() ? detector.gate().get().darkProbability() : detector.darkCountsPerSecond();
    }

    private void add(String path, double firstStep) {
        quantities.add(new Quantity(path, firstStep, Double.POSITIVE_INFINITY, false));
    }

    private void bothWays(String path, double firstStep) {
        quantities.add(new Quantity(path, firstStep, Double.POSITIVE_INFINITY, true));
    }
}
