package binspan.prediction;

import binspan.scenario.Choice;
import binspan.scenario.DetectorClass;
import binspan.scenario.PassbandShape;
import binspan.scenario.Photon;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioBuilder;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Values;
import binspan.units.OpticalFrequency;
import binspan.units.Scale;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/**
 * Random valid scenarios, each fixed by its number: all pump modes, filter shapes, detectors and path elements, everyday links as well as links whose
 * numbers lie anywhere in the ranges that the registry allows.
 */
public final class RandomScenarios {
    private static final long SEED = 20_260_131L;
    private static final double[] WILDNESS = {0.0, 0.03, 0.1, 0.4};
    private static final double OTHER_FILTERS = 0.5;
    /** Lower, because the captures of a pulsed source with a flat-top filter are integrals over its whole joint spectrum. */
    private static final double OTHER_FILTERS_PULSED = 0.08;

    private static final double OTHER_FILTERS_PULSED_WILD = 0.015;

    private static final double LOWEST_CHANNEL = 18.0;
    private static final double HIGHEST_CHANNEL = 58.0;

    private final RandomObject root;
    private final PumpMode mode;
    private final List<PassbandShape> shapes;

    private RandomScenarios(long number, double wildness, boolean gaussianOnly) {
        SplittableRandom random = new SplittableRandom(SEED + number);
        this.root = new RandomObject(ScenarioSections.SCENARIO, "", random, wildness);
        this.mode = (PumpMode) root.pick(List.of(PumpMode.values()));
        boolean others = !gaussianOnly && root.chance(otherFilters(wildness > 0.0));
        this.shapes = others ? otherShapes() : List.of(PassbandShape.GAUSSIAN);
    }

    private double otherFilters(boolean wild) {
        if (mode == PumpMode.CONTINUOUS) {
            return OTHER_FILTERS;
        }
        return wild ? OTHER_FILTERS_PULSED_WILD : OTHER_FILTERS_PULSED;
    }

    private List<PassbandShape> otherShapes() {
        return root.chance(0.3) ? List.of(PassbandShape.FLAT_TOP) : List.of(PassbandShape.values());
    }

    /** Any valid scenario. */
    public static Scenario any(long number) {
        return build(stated(number));
    }

    /** What the file of any valid scenario states. */
    static Values stated(long number) {
        double wildness = WILDNESS[(int) Math.floorMod(number, (long) WILDNESS.length)];
        return new RandomScenarios(number, wildness, false).drawn();
    }

    /** A scenario with everyday numbers only. */
    public static Scenario everyday(long number) {
        return build(new RandomScenarios(number, 0.0, false).drawn());
    }

    /** A scenario with everyday numbers and Gaussian filters only. */
    public static Scenario everydayGaussian(long number) {
        return build(new RandomScenarios(number, 0.0, true).drawn());
    }

    static Scenario build(Values stated) {
        ScenarioBuilder.Outcome outcome = ScenarioBuilder.build(stated);
        return outcome.scenario().orElseThrow(() -> new AssertionError(outcome.problems()));
    }

    private Values drawn() {
        root.put("formatVersion", 1.0).put("name", "random");
        if (mode == PumpMode.PULSE_TRAIN) {
            // A train of pulses femtoseconds apart takes long to count and says nothing.
            root.put("imbalanceNs", root.between(0.1, 4.0));
        } else {
            root.number("imbalanceNs", 0.3, 4.0);
        }
        root.put("source", source());
        boolean exchanged = root.chance(0.3);
        root.put("alice", arm("alice", exchanged ? Photon.IDLER : Photon.SIGNAL));
        root.put("bob", arm("bob", exchanged ? Photon.SIGNAL : Photon.IDLER));
        RandomObject timing = root.child("timing").number("windowWidthPs", 60.0, 1200.0);
        root.put(
                "timing",
                timing.perhaps(0.3, "cableTemperatureStepK", -0.1, 0.1).values());
        root.put("protocol", protocol());
        RandomObject acquisition = root.child("acquisition").number("durationS", 60.0, 1e6);
        acquisition.perhaps(0.5, "uptimeShare", 0.2, 1.0).count("fringePoints", 3, 40);
        root.put(
                "acquisition", acquisition.number("secondsPerPoint", 1.0, 100.0).values());
        return root.values();
    }

    private Values protocol() {
        RandomObject protocol = root.child("protocol").number("errorCorrectionEfficiency", 1.0, 1.3);
        return protocol.number("secrecyEpsilon", 1e-12, 1e-5)
                .number("correctnessEpsilon", 1e-15, 1e-9)
                .values();
    }

    private Values source() {
        RandomObject source = root.child("source");
        double sum = pump(source);
        double signal = root.between(LOWEST_CHANNEL, HIGHEST_CHANNEL);
        source.put("signal", band(source.child("signal"), signal));
        source.put("idler", band(source.child("idler"), sum - signal));
        if (mode == PumpMode.CONTINUOUS) {
            source.number("pairRatePerSecond", 1e5, 3e7);
        } else {
            source.number("meanPairsPerCycle", 0.003, 0.15);
        }
        if (source.chance(0.1)) {
            source.number("schmidtNumber", 1.0, 30.0);
        } else {
            source.perhaps(0.1, "unheraldedG2", 1.0, 1.6);
        }
        return source.perhaps(0.1, "partnerPassProbability", 0.4, 1.0).values();
    }

    /** Draws the pump and returns the channel numbers of signal and idler together. */
    private double pump(RandomObject source) {
        RandomObject pump = source.child("pump").put("mode", mode);
        double sum = root.between(70.0, 80.0);
        if (pump.chance(0.5)) {
            double exact =
                    OpticalFrequency.toWavelengthNm(OpticalFrequency.ofChannel(sum) + OpticalFrequency.ofChannel(0.0));
            pump.number("wavelengthNm", exact, exact * (1.0 + 3e-5));
        }
        if (mode == PumpMode.PULSE_PAIR) {
            pump.number("repetitionRateMHz", 10.0, 250.0).word("preparation");
            pump.perhaps(0.4, "mismatchPs", -3.0, 3.0).perhaps(0.4, "earlyPairFraction", 0.3, 0.7);
        }
        if (mode == PumpMode.PULSE_TRAIN) {
            // Pulses as long as many periods take long to count as well.
            pump.put("pairEmissionFwhmPs", pump.between(2.0, 200.0));
        } else if (mode == PumpMode.PULSE_PAIR) {
            pump.number("pairEmissionFwhmPs", 5.0, 200.0);
        }
        if (pump.chance(0.3)) {
            pump.number("coherenceTimeNs", 10.0, 1e4);
        } else {
            pump.perhaps(0.6, "linewidthMHz", 0.0, 20.0);
        }
        pump.word("lineshape").perhaps(0.5, "phaseNoiseRmsRad", 0.0, 0.2);
        source.put("pump", pump.perhaps(0.5, "frequencyDriftRmsMHz", 0.0, 10.0).values());
        return sum;
    }

    private Values band(RandomObject band, double channel) {
        switch (band.whole(0, 2)) {
            case 0 -> band.number("channel", channel, channel);
            case 1 -> band.number("frequencyTHz", frequency(channel), frequency(channel));
            default -> band.number("wavelengthNm", wavelength(channel), wavelength(channel));
        }
        band.number("bandwidthFwhmGHz", 25.0, 170.0).put("passband", passband());
        String noise = mode == PumpMode.CONTINUOUS ? "uncorrelatedPhotonsPerSecond" : "uncorrelatedPhotonsPerCycle";
        double usual = mode == PumpMode.CONTINUOUS ? 1e6 : 0.01;
        return band.perhaps(0.3, noise, 0.0, usual).values();
    }

    private static double frequency(double channel) {
        return OpticalFrequency.ofChannel(channel) / Scale.TERA;
    }

    private static double wavelength(double channel) {
        return OpticalFrequency.toWavelengthNm(OpticalFrequency.ofChannel(channel));
    }

    private Choice passband() {
        return root.pick(shapes);
    }

    private Values arm(String name, Photon photon) {
        RandomObject arm = root.child(name).put("photon", photon).number("sourceCouplingLossDb", 0.5, 6.0);
        arm.put("path", path(arm)).perhaps(0.5, "repairMarginDb", 0.0, 3.0).put("analyzer", analyzer(arm));
        List<Values> detectors = new ArrayList<>();
        RandomObject first = detector(arm);
        detectors.add(first.values());
        if (arm.chance(0.7)) {
            detectors.add(arm.chance(0.7) ? first.values() : detector(arm).values());
        }
        arm.put("detectors", detectors).perhaps(0.5, "clockJitterRmsPs", 0.0, 50.0);
        return arm.perhaps(0.5, "tagBinPs", 0.0, 50.0)
                .perhaps(0.4, "delayErrorPs", -100.0, 100.0)
                .values();
    }

    private Values analyzer(RandomObject arm) {
        RandomObject analyzer = arm.child("analyzer").perhaps(0.4, "mismatchPs", -3.0, 3.0);
        analyzer.number("excessLossDb", 0.3, 4.0).perhaps(0.3, "longPathExtraLossDb", 0.0, 3.0);
        analyzer.perhaps(0.3, "inputShortFraction", 0.3, 0.7).perhaps(0.3, "outputShortToPort1", 0.3, 0.7);
        analyzer.perhaps(0.7, "phaseNoiseRmsRad", 0.0, 0.3).perhaps(0.4, "temperatureRmsMilliK", 0.0, 20.0);
        analyzer.perhaps(0.3, "relativeDelayPerK", -1e-5, 1e-5).perhaps(0.3, "phaseSettingErrorRad", -0.5, 0.5);
        return analyzer.perhaps(0.3, "polarizationOverlap", 0.9, 1.0)
                .perhaps(0.3, "pathDispersionPs2", -5.0, 5.0)
                .values();
    }

    private List<Values> path(RandomObject arm) {
        List<Values> path = new ArrayList<>();
        boolean classical = false;
        int elements = arm.whole(0, 5);
        for (int i = 0; i < elements; i++) {
            switch (arm.whole(0, 5)) {
                case 0 ->
                    path.add(arm.item("path", "loss").number("lossDb", 0.1, 3.0).values());
                case 1 -> path.add(filter(arm));
                case 2 -> path.add(compensator(arm));
                default -> {
                    RandomObject fibre = fibre(arm);
                    classical |= fibre.values().has("classicalChannels");
                    path.add(fibre.values());
                }
            }
        }
        if (classical) {
            path.add(filter(arm));
        }
        return path;
    }

    private RandomObject fibre(RandomObject arm) {
        RandomObject fibre = arm.item("path", "fibre").word("fibre").number("lengthKm", 1.0, 120.0);
        fibre.perhaps(0.4, "attenuationDbPerKm", 0.16, 0.4).perhaps(0.4, "dispersionPsPerNmKm", -5.0, 20.0);
        fibre.perhaps(0.4, "pmdPsPerSqrtKm", 0.0, 0.5).perhaps(0.2, "measuredLossDb", 0.2, 30.0);
        fibre.perhaps(0.4, "connectors", 0.0, 10.0).perhaps(0.4, "connectorLossDb", 0.1, 0.5);
        fibre.perhaps(0.4, "splices", 0.0, 30.0).perhaps(0.4, "spliceLossDb", 0.02, 0.1);
        fibre.perhaps(0.2, "delayPsPerKmK", 30.0, 40.0);
        if (fibre.chance(0.15)) {
            List<Values> channels = new ArrayList<>();
            for (int i = fibre.whole(1, 3); i > 0; i--) {
                channels.add(classicalChannel(fibre));
            }
            fibre.put("classicalChannels", channels);
        }
        return fibre;
    }

    private static Values classicalChannel(RandomObject fibre) {
        RandomObject channel = fibre.child("classicalChannels").number("launchDbm", -40.0, 5.0);
        channel.number("wavelengthNm", 1300.0, 1625.0).perhaps(0.5, "attenuationDbPerKm", 0.2, 0.4);
        return channel.word("direction")
                .number("ramanCoefficientPerKmNm", 1e-12, 1e-8)
                .values();
    }

    private Values filter(RandomObject arm) {
        RandomObject filter = arm.item("path", "filter").number("bandwidthFwhmGHz", 25.0, 200.0);
        filter.put("passband", passband()).perhaps(0.6, "lossDb", 0.3, 3.0);
        return filter.perhaps(0.6, "isolationDb", 60.0, 140.0).values();
    }

    private static Values compensator(RandomObject arm) {
        RandomObject compensator = arm.item("path", "compensator");
        if (compensator.chance(0.6)) {
            compensator.number("share", 0.5, 2.0);
        } else {
            compensator.number("dispersionPsPerNm", -2000.0, 500.0);
        }
        if (compensator.chance(0.6)) {
            compensator.number("figureOfMeritPsPerNmDb", 100.0, 450.0);
        }
        return compensator.number("lossDb", 0.0, 4.0).values();
    }

    private RandomObject detector(RandomObject arm) {
        RandomObject detector = arm.child("detectors");
        boolean catalogue = detector.chance(0.5);
        if (catalogue) {
            List<DetectorClass> known = new ArrayList<>(List.of(DetectorClass.values()));
            known.removeIf(each -> mode == PumpMode.CONTINUOUS && each.gate().isPresent());
            detector.put("class", detector.pick(known));
        } else if (mode != PumpMode.CONTINUOUS && detector.chance(0.3)) {
            RandomObject gate = detector.child("gate").perhaps(0.4, "rateMHz", 10.0, 1000.0);
            detector.put(
                    "gate",
                    gate.number("widthNs", 0.3, 3.0)
                            .number("darkProbability", 1e-6, 1e-4)
                            .values());
        } else {
            detector.number("darkCountsPerSecond", 1.0, 1e4);
        }
        double needed = catalogue ? 0.3 : 1.0;
        detector.perhaps(needed, "efficiency", 0.05, 0.95).perhaps(needed, "jitterFwhmPs", 10.0, 500.0);
        detector.perhaps(needed, "deadTimeNs", 0.0, 3e4).perhaps(needed, "afterpulseProbability", 0.0, 0.1);
        if (detector.chance(0.2)) {
            detector.number("jitterTailFraction", 0.0, 0.5).number("jitterTailPs", 20.0, 500.0);
        }
        return detector.perhaps(0.3, "backgroundCountsPerSecond", 0.0, 1000.0);
    }
}
