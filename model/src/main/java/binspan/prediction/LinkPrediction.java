package binspan.prediction;

import binspan.counting.LinkCounts;
import binspan.merit.BellTest;
import binspan.merit.FiniteKey;
import binspan.merit.FringeVisibility;
import binspan.merit.SecretKey;
import binspan.merit.VisibilityBudget;
import binspan.optics.ArrivalTime;
import binspan.optics.Imbalances;
import binspan.optics.OpticalPath;
import binspan.optics.PairSpectrum;
import binspan.optics.PortTiming;
import binspan.optics.TwoPhotonCoherence;
import binspan.scenario.Arm;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.units.Scale;
import java.util.List;

/**
 * Everything predicted of a link with every intermediate, finite-key statistics apart.
 *
 * @param scenario the link
 * @param optics all that happens to the light before it is counted
 * @param counts counts
 * @param fringe fringe of ports (1,1)
 * @param bell CHSH test
 * @param key error rates, sifted and asymptotic key
 */
public record LinkPrediction(
        Scenario scenario,
        LinkOptics optics,
        LinkCounts counts,
        FringeVisibility fringe,
        BellTest bell,
        SecretKey key) {

    /** Joint spectrum of the pairs. */
    public PairSpectrum spectrum() {
        return optics.spectrum();
    }

    /** Alice's path. */
    public OpticalPath pathA() {
        return optics.alice().path();
    }

    /** Bob's path. */
    public OpticalPath pathB() {
        return optics.bob().path();
    }

    /** Timing of alice's ports. */
    public List<PortTiming> portsA() {
        return optics.alice().ports();
    }

    /** Timing of bob's ports. */
    public List<PortTiming> portsB() {
        return optics.bob().ports();
    }

    /** Spread of the arrival times by the light; continuous: of no meaning for singles. */
    public ArrivalTime arrival() {
        return optics.arrival();
    }

    /** Delays of the interferometers. */
    public Imbalances imbalances() {
        return optics.imbalances();
    }

    /** Two-photon coherence by cause. */
    public TwoPhotonCoherence coherence() {
        return optics.coherence();
    }

    /** Visibility budget. */
    public VisibilityBudget budget() {
        return VisibilityBudget.of(coherence(), counts, fringe.raw());
    }

    /** Pump cycles per second: stated for a pulse pair, one each period for a train; NaN for a continuous pump. */
    public double cyclesPerSecond() {
        return cyclesPerSecond(scenario);
    }

    static double cyclesPerSecond(Scenario scenario) {
        return switch (scenario.source().pump().mode()) {
            case PULSE_PAIR -> scenario.source().pump().repetitionRateMHz().orElseThrow() * Scale.MEGA;
            case PULSE_TRAIN -> 1.0 / (scenario.imbalanceNs() * Scale.NANO);
            case CONTINUOUS -> Double.NaN;
        };
    }

    /** Mean pairs of the brighter bin of a cycle; NaN for a continuous pump. */
    public double binPairs() {
        double mean = scenario.source().meanPairsPerCycle().orElse(Double.NaN);
        double early = scenario.source().pump().earlyPairFraction();
        return scenario.source().pump().mode() == PumpMode.PULSE_PAIR ? mean * Math.max(early, 1.0 - early) : mean;
    }

    /** Window width, s. */
    public double windowWidth() {
        return scenario.timing().windowWidthPs() * Scale.PICO;
    }

    /** How late an arm's photons arrive against its windows, s: its delay error and the cables' temperature step at its worst. */
    public static double late(Arm arm, OpticalPath path) {
        return arm.delayErrorPs() * Scale.PICO + path.thermalDelay();
    }

    /** Share of the acquisition time in which the link works. */
    public double uptimeShare() {
        return scenario.acquisition().uptimeShare();
    }

    /** Working seconds of the acquisition. */
    public double uptime() {
        return scenario.acquisition().durationS() * uptimeShare();
    }

    /** Mean counts of a point of the fringe scan. */
    public double countsPerPoint() {
        return fringe.meanPerSecond() * scenario.acquisition().secondsPerPoint();
    }

    /** Counting error of the raw visibility of that scan. */
    public double visibilitySigma() {
        return FringeVisibility.sigma(fringe.raw(), scenario.acquisition().fringePoints(), countsPerPoint());
    }

    /** Rms of t_A - t_B of ports (1,1) with a continuous pump, s. */
    public double correlationRms() {
        double beta = pathA().groupDelayDispersion() + pathB().groupDelayDispersion();
        return Math.sqrt(ArrivalTime.differenceVariance(spectrum(), beta)
                + portsA().get(0).variance()
                + portsB().get(0).variance());
    }

    /** Rms arrival of an arm's singles at its worst port, detector tails not counted, s; with a continuous pump that of the time difference. */
    public double arrivalRms(boolean alice) {
        if (!scenario.pulsed()) {
            return correlationRms();
        }
        double worst = 0.0;
        for (PortTiming port : alice ? portsA() : portsB()) {
            worst = Math.max(worst, port.variance());
        }
        return Math.sqrt((alice ? arrival().singlesA() : arrival().singlesB()) + worst);
    }

    /** Modes that the source can fill per second: f 2K, f K for a train, those of the mirrored passband with a continuous pump. */
    public double modesPerSecond() {
        if (!scenario.pulsed()) {
            return spectrum().mirrored().modesPerSecond();
        }
        double bins = scenario.source().pump().mode() == PumpMode.PULSE_PAIR ? 2.0 : 1.0;
        return cyclesPerSecond() * bins * spectrum().schmidtNumber();
    }

    /**
     * How much had to be computed anew since another prediction of the same predictor: 0 counts only, 1 coherence and captures as well, 2 the spread of
     * the light as well, 3 the joint spectrum as well.
     */
    @SuppressWarnings("ReferenceEquality") // stages that are reused are the same objects
    public int renewedSince(LinkPrediction before) {
        if (spectrum() != before.spectrum()) {
            return 3;
        }
        if (arrival() != before.arrival()) {
            return 2;
        }
        return optics == before.optics ? 0 : 1;
    }

    /** Finite key that the link collects with time. */
    public FiniteKey finiteKey() {
        return FiniteKey.of(counts, key, scenario.protocol());
    }
}
