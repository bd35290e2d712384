package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.IdealLink;
import binspan.counting.PortPairs;
import binspan.prediction.PhotonSimulation.Ports;
import binspan.prediction.PhotonSimulation.Side;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Predicted singles and coincidences, slot by slot and port by port, against clicks drawn photon by photon from the same numbers: within four standard
 * errors. Dispersion is so strong that both photons of a pair share their lateness and its joint capture is far from the product of two.
 */
final class PhotonByPhotonTest {
    private static final double PICO = PhotonSimulation.PICO;
    private static final double FWHM_PER_RMS = 2.0 * Math.sqrt(2.0 * Math.log(2.0));
    private static final double STANDARD_ERRORS = 4.0;

    /** Variance of a count over its mean: a little above 1 where photons bunch or share a window. */
    private static final double SPREAD = 1.1;

    private static final double DARK = 3e6;
    private static final double EARLY = 0.45;
    private static final double DEAD_NS = 40.0;
    private static final double BANDWIDTH_GHZ = 60.0;
    private static final double JITTER_PS = 25.0;
    private static final double TAIL_SHARE = 0.15;
    private static final double TAIL_PS = 90.0;
    private static final double LATE_PS = 60.0;
    private static final double WINDOW_PS = 400.0;

    /** Poisson pairs through physical filters and 50 km of standard fibre in each arm, bins 1 ns apart. */
    @Test
    void pulsePairOfManyModes() {
        Values stated = stated(IdealLink.pulsePair(), 1.0, -1000.0, -1000.0);
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", 0.09).put("schmidtNumber", 1e9);
        SampleScenarios.part(stated, "source.pump").put("earlyPairFraction", EARLY);
        LinkPrediction predicted = LinkPredictor.predict(IdealLink.build(stated));
        double pumpRms = pumpRms(predicted.scenario());
        Side[] sides = sides(predicted.scenario(), -1000.0, -1000.0);
        double widest = widest(sides, pumpRms);
        PhotonSimulation simulation = new PhotonSimulation(20_260_101L, pumpRms, widest);
        PulsePairTally tally = new PulsePairTally(simulation, sides, 1e-9, WINDOW_PS * PICO);
        double born = 0.09 / bothPass(sides, pumpRms, widest);
        tally.run(8_000_000, () -> simulation.poisson(EARLY * born), () -> simulation.poisson((1.0 - EARLY) * born));

        interfering(predicted, tally);
        compare(predicted, tally);
    }

    /**
     * One thermal mode in each bin, all pairs inside the filters, no dispersion. The central slot sees a superposition of both bins' modes, which
     * particles that choose a path do not make; it has its own test in the basis of photon numbers.
     */
    @Test
    void pulsePairOfOneMode() {
        Values stated = stated(IdealLink.pulsePair(), 1.0, 0.0, 0.0);
        SampleScenarios.part(stated, "source")
                .put("meanPairsPerCycle", 0.2)
                .put("schmidtNumber", 1.0)
                .put("partnerPassProbability", 1.0);
        SampleScenarios.part(stated, "source.pump").put("earlyPairFraction", EARLY);
        LinkPrediction predicted = LinkPredictor.predict(IdealLink.build(stated));
        PhotonSimulation simulation = new PhotonSimulation(77L, pumpRms(predicted.scenario()), 0.0);
        PulsePairTally tally =
                new PulsePairTally(simulation, sides(predicted.scenario(), 0.0, 0.0), 1e-9, WINDOW_PS * PICO);
        tally.run(6_000_000, () -> simulation.thermal(EARLY * 0.2), () -> simulation.thermal((1.0 - EARLY) * 0.2));

        compare(predicted, tally);
    }

    /** Central and side slots: clicks of both and, from the clicks of each side, accidentals. */
    private static void interfering(LinkPrediction predicted, PulsePairTally tally) {
        double rate = predicted.cyclesPerSecond();
        PortPairs central = predicted.counts().central();
        for (int a = 0; a < 2; a++) {
            for (int b = 0; b < 2; b++) {
                agrees("central", tally.pairs(a, 1, b, 1), central.of(a, b).atCosine(0.0) / rate, tally.cycles());
                double alice = tally.singles(0, a, 1);
                double bob = tally.singles(1, b, 1);
                double accidental = alice / tally.cycles() * bob;
                double error = STANDARD_ERRORS * accidental * Math.sqrt(1.0 / alice + 1.0 / bob);
                assertThat(central.of(a, b).accidentalPerSecond() / rate * tally.cycles())
                        .as("accidentals of ports %d, %d", a, b)
                        .isBetween(accidental - error, accidental + error);
            }
        }
        agrees("side slots", tally.sidePairs(), predicted.counts().sidePerSecond() / rate, tally.cycles());
    }

    /** Outer slots and all photons. */
    private static void compare(LinkPrediction predicted, PulsePairTally tally) {
        double rate = predicted.cyclesPerSecond();
        int[][] outer = {{0, 0}, {2, 2}, {0, 2}, {2, 0}};
        for (int i = 0; i < outer.length; i++) {
            for (int ports = 0; ports < 4; ports++) {
                double expected = predicted
                                .counts()
                                .timeBasis()
                                .get(i)
                                .of(ports / 2, ports % 2)
                                .atCosine(0.0)
                        / rate;
                double counted = tally.pairs(ports / 2, outer[i][0], ports % 2, outer[i][1]);
                agrees("slots " + Arrays.toString(outer[i]), counted, expected, tally.cycles());
            }
        }
        for (int port = 0; port < 2; port++) {
            double alice = predicted.counts().loadsA().get(port).photonsPerSecond() / rate;
            double bob = predicted.counts().loadsB().get(port).photonsPerSecond() / rate;
            agrees("photons of alice", tally.photons(0, port), alice, tally.cycles());
            agrees("photons of bob", tally.photons(1, port), bob, tally.cycles());
        }
    }

    /** Train of 1 GHz: dispersion carries light into the neighbouring slots. */
    @Test
    void pulseTrain() {
        double mean = 0.03;
        Values stated = stated(IdealLink.pulseTrain(), 1.0, -1600.0, -1200.0);
        SampleScenarios.part(stated, "source").put("meanPairsPerCycle", mean).put("schmidtNumber", 1e9);
        LinkPrediction predicted = LinkPredictor.predict(IdealLink.build(stated));
        double pumpRms = pumpRms(predicted.scenario());
        Side[] sides = sides(predicted.scenario(), -1600.0, -1200.0);
        double widest = widest(sides, pumpRms);
        PhotonSimulation simulation = new PhotonSimulation(4242L, pumpRms, widest);
        TrainTally tally = new TrainTally(simulation, sides, 1e-9, WINDOW_PS * PICO);
        tally.run(12_000_000, mean / bothPass(sides, pumpRms, widest));

        double rate = predicted.cyclesPerSecond();
        for (int a = 0; a < 2; a++) {
            for (int b = 0; b < 2; b++) {
                agrees(
                        "same slot",
                        tally.pairs(a, b, 0),
                        predicted.counts().central().of(a, b).atCosine(0.0) / rate,
                        tally.pulses());
            }
        }
        double side = 0.0;
        for (int ports = 0; ports < 4; ports++) {
            side += tally.pairs(ports / 2, ports % 2, 1) + tally.pairs(ports / 2, ports % 2, -1);
        }
        agrees("next slots", side, predicted.counts().sidePerSecond() / rate, tally.pulses());
    }

    /** Continuous pump: the differences of all click times in windows about the three peaks. */
    @Test
    void continuousPump() {
        double pairs = 2e7;
        double seconds = 0.2;
        Values stated = stated(IdealLink.continuous(), 1.0, -1600.0, 500.0);
        SampleScenarios.part(stated, "source").put("pairRatePerSecond", pairs);
        LinkPrediction predicted = LinkPredictor.predict(IdealLink.build(stated));
        Side[] sides = sides(predicted.scenario(), -1600.0, 500.0);
        double widest = widest(sides, 0.0);
        PhotonSimulation simulation = new PhotonSimulation(99L, 0.0, widest);
        ContinuousTally tally = new ContinuousTally(simulation, sides, 1e-9, WINDOW_PS * PICO);
        tally.run(seconds, pairs / bothPass(sides, 0.0, widest));

        double side = 0.0;
        for (int a = 0; a < 2; a++) {
            agrees(
                    "singles of alice",
                    tally.singles(0, a),
                    predicted.counts().loadsA().get(a).recordedPerSecond(),
                    seconds);
            agrees(
                    "singles of bob",
                    tally.singles(1, a),
                    predicted.counts().loadsB().get(a).recordedPerSecond(),
                    seconds);
            for (int b = 0; b < 2; b++) {
                agrees(
                        "central peak",
                        tally.pairs(a, b, 0.0),
                        predicted.counts().central().of(a, b).atCosine(0.0),
                        seconds);
                side += tally.pairs(a, b, 1e-9) + tally.pairs(a, b, -1e-9);
            }
        }
        agrees("side peaks", side, predicted.counts().sidePerSecond(), seconds);
    }

    /** A dead time that leaves the detectors ready five sixths of the time; pairs that deaden both sides together keep more than the product. */
    @Test
    void continuousPumpWithDeadTime() {
        double seconds = 0.25;
        Values stated = stated(IdealLink.continuous(), 1.0, -1600.0, 500.0);
        SampleScenarios.part(stated, "source").put("pairRatePerSecond", 4e6);
        IdealLink.detectors(stated, "alice", "deadTimeNs", DEAD_NS);
        IdealLink.detectors(stated, "bob", "deadTimeNs", DEAD_NS);
        LinkPrediction predicted = LinkPredictor.predict(IdealLink.build(stated));
        Side[] sides = sides(predicted.scenario(), -1600.0, 500.0);
        double widest = widest(sides, 0.0);
        ContinuousTally tally =
                new ContinuousTally(new PhotonSimulation(5L, 0.0, widest), sides, 1e-9, WINDOW_PS * PICO);
        tally.run(seconds, 4e6 / bothPass(sides, 0.0, widest));
        tally.deaden(DEAD_NS * 1e-9);

        for (int a = 0; a < 2; a++) {
            agrees(
                    "singles of alice",
                    tally.singles(0, a),
                    predicted.counts().loadsA().get(a).recordedPerSecond(),
                    seconds);
            agrees(
                    "singles of bob",
                    tally.singles(1, a),
                    predicted.counts().loadsB().get(a).recordedPerSecond(),
                    seconds);
            for (int b = 0; b < 2; b++) {
                agrees(
                        "central peak",
                        tally.pairs(a, b, 0.0),
                        predicted.counts().central().of(a, b).atCosine(0.0),
                        seconds);
            }
        }
    }

    /** Counts against the expected number, whose root is their standard error. */
    private static void agrees(String what, double counted, double expectedPerTrial, double trials) {
        double expected = expectedPerTrial * trials;
        double error = Math.sqrt(expected * SPREAD);
        assertThat(counted)
                .as("%s: %.1f standard errors", what, (counted - expected) / error)
                .isBetween(expected - STANDARD_ERRORS * error, expected + STANDARD_ERRORS * error);
    }

    /** Unequal splitters, paths and detectors; dispersion as of a fibre, in ps^2. */
    static Values stated(Values stated, double separationNs, double betaA, double betaB) {
        stated.put("imbalanceNs", separationNs);
        for (String band : List.of("signal", "idler")) {
            SampleScenarios.part(stated, "source." + band).put("bandwidthFwhmGHz", BANDWIDTH_GHZ);
        }
        fibre(stated, "alice", "signal", betaA);
        fibre(stated, "bob", "idler", betaB);
        SampleScenarios.part(stated, "alice.analyzer")
                .put("inputShortFraction", 0.47)
                .put("longPathExtraLossDb", 0.4);
        SampleScenarios.part(stated, "bob.analyzer").put("outputShortToPort1", 0.54);
        SampleScenarios.part(stated, "alice.detectors[1]").put("efficiency", 0.85);
        SampleScenarios.part(stated, "bob.detectors[0]").put("efficiency", 0.9);
        for (String arm : List.of("alice", "bob")) {
            IdealLink.detectors(stated, arm, "darkCountsPerSecond", DARK);
            IdealLink.detectors(stated, arm, "jitterFwhmPs", JITTER_PS * FWHM_PER_RMS);
        }
        IdealLink.detectors(stated, "bob", "jitterTailFraction", TAIL_SHARE);
        IdealLink.detectors(stated, "bob", "jitterTailPs", TAIL_PS);
        SampleScenarios.part(stated, "alice").put("delayErrorPs", LATE_PS);
        SampleScenarios.part(stated, "timing").put("windowWidthPs", WINDOW_PS);
        return stated;
    }

    /** An element with the dispersion of a fibre: D = -2 pi c beta/lambda^2. */
    private static void fibre(Values stated, String arm, String band, double betaPs2) {
        double metres = IdealLink.build(stated).source().signal().centreNm() * 1e-9;
        if (band.equals("idler")) {
            metres = IdealLink.build(stated).source().idler().centreNm() * 1e-9;
        }
        double perNm = -2.0 * Math.PI * 299_792_458.0 / (metres * metres) * betaPs2 * 1e-24 * 1e12 * 1e-9;
        Values element =
                new Values("compensator").put("dispersionPsPerNm", perNm).put("lossDb", 0.0);
        SampleScenarios.part(stated, arm).put("path", List.of(element));
    }

    static double pumpRms(Scenario scenario) {
        return FWHM_PER_RMS
                / (2.0 * scenario.source().pump().pairEmissionFwhmPs().orElseThrow() * PICO);
    }

    static Side[] sides(Scenario scenario, double betaA, double betaB) {
        double filter = 2.0 * Math.PI * BANDWIDTH_GHZ * 1e9 / FWHM_PER_RMS;
        double e = Math.pow(10.0, -0.04);
        Side alice = new Side(
                filter,
                betaA * PICO * PICO,
                new Ports(0.47 * 0.5, 0.47 * 0.5 * 0.85),
                new Ports(0.53 * 0.5 * e, 0.53 * 0.5 * e * 0.85),
                JITTER_PS * PICO,
                0.0,
                0.0,
                LATE_PS * PICO,
                DARK);
        Side bob = new Side(
                filter,
                betaB * PICO * PICO,
                new Ports(0.5 * 0.54 * 0.9, 0.5 * 0.46),
                new Ports(0.5 * 0.46 * 0.9, 0.5 * 0.54),
                JITTER_PS * PICO,
                TAIL_SHARE,
                TAIL_PS * PICO,
                0.0,
                DARK);
        assertThat(scenario.alice().detectors()).hasSize(2);
        return new Side[] {alice, bob};
    }

    static double widest(Side[] sides, double pumpRms) {
        return 5.0 * (Math.max(sides[0].filterRms(), sides[1].filterRms()) + pumpRms);
    }

    /** Share of the drawn pairs of which both photons pass, by direct summation over both detunings. */
    static double bothPass(Side[] sides, double pumpRms, double widest) {
        int cells = 2000;
        double sum = 0.0;
        for (int i = 0; i < cells; i++) {
            double a = widest * (2.0 * (i + 0.5) / cells - 1.0);
            double passA = Math.exp(-a * a / (2.0 * sides[0].filterRms() * sides[0].filterRms()));
            double passB = 0.0;
            double norm = 0.0;
            for (int j = -60; j <= 60; j++) {
                double z = j / 10.0;
                double b = z * pumpRms - a;
                norm += Math.exp(-z * z / 2.0);
                passB += Math.exp(-z * z / 2.0 - b * b / (2.0 * sides[1].filterRms() * sides[1].filterRms()));
            }
            sum += passA * passB / norm / cells;
        }
        return sum;
    }
}
