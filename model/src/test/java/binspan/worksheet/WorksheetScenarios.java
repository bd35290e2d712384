package binspan.worksheet;

import static binspan.scenario.SampleScenarios.part;

import binspan.prediction.LinkCheck;
import binspan.scenario.DetectorClass;
import binspan.scenario.Direction;
import binspan.scenario.FibreClass;
import binspan.scenario.Lineshape;
import binspan.scenario.PassbandShape;
import binspan.scenario.Preparation;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.List;

/**
 * Links with every cause at work and nothing alike on both sides, so that a formula with the wrong number in it shows.
 */
final class WorksheetScenarios {
    private WorksheetScenarios() {}

    static Worksheet sheet(Values stated) {
        return Worksheet.of(LinkCheck.of(SampleScenarios.build(stated)));
    }

    /** A pulse pair carved by a modulator, both arms and all ports different. */
    static Values pulsePair() {
        Values stated = uneven(SampleScenarios.pulsePair());
        part(stated, "source.pump")
                .put("preparation", Preparation.MODULATOR)
                .put("linewidthMHz", 1.0)
                .put("lineshape", Lineshape.GAUSSIAN)
                .put("mismatchPs", 0.4)
                .put("earlyPairFraction", 0.44);
        part(stated, "source.signal").put("uncorrelatedPhotonsPerCycle", 0.002);
        return stated;
    }

    static Values continuous() {
        Values stated = uneven(SampleScenarios.continuous());
        part(stated, "source.signal").put("uncorrelatedPhotonsPerSecond", 3e5);
        part(stated, "timing").put("windowWidthPs", 700.0);
        return stated;
    }

    static Values pulseTrain() {
        Values stated = uneven(SampleScenarios.pulseTrain());
        part(stated, "alice.path[0]").put("lengthKm", 80.0);
        return stated;
    }

    private static Values uneven(Values stated) {
        part(stated, "source.pump").put("frequencyDriftRmsMHz", 4.0);
        part(stated, "source.idler").put("bandwidthFwhmGHz", 50.0);
        part(stated, "timing").put("cableTemperatureStepK", 0.02);
        part(stated, "bob.path[0]").put("lengthKm", 22.0).put("splices", 6.0).put("pmdPsPerSqrtKm", 0.2);
        part(stated, "bob").put("repairMarginDb", 0.7).put("delayErrorPs", 8.0);
        part(stated, "alice.analyzer")
                .put("mismatchPs", 0.5)
                .put("inputShortFraction", 0.46)
                .put("outputShortToPort1", 0.53)
                .put("longPathExtraLossDb", 0.2)
                .put("temperatureRmsMilliK", 4.0)
                .put("phaseSettingErrorRad", 0.06)
                .put("polarizationOverlap", 0.995)
                .put("pathDispersionPs2", 0.03);
        part(stated, "bob.analyzer").put("mismatchPs", -0.3).put("phaseNoiseRmsRad", 0.08);
        part(stated, "bob.detectors[1]")
                .put("efficiency", 0.7)
                .put("jitterFwhmPs", 90.0)
                .put("backgroundCountsPerSecond", 400.0)
                .put("afterpulseProbability", 0.01);
        return stated;
    }

    /**
     * Flat-top filters at the source, a Gaussian and classical light behind alice's fibre, a compensator on bob's side.
     */
    static Values flatTops() {
        Values stated = SampleScenarios.pulsePair();
        part(stated, "source.signal").put("passband", PassbandShape.FLAT_TOP);
        part(stated, "source.idler").put("passband", PassbandShape.FLAT_TOP);
        part(stated, "alice.path[0]")
                .put("classicalChannels", List.of(channel(Direction.FORWARD), channel(Direction.BACKWARD)));
        List<Values> alice = new ArrayList<>(stated.section("alice").list("path"));
        alice.add(new Values("filter")
                .put("label", "receive filter")
                .put("bandwidthFwhmGHz", 60.0)
                .put("isolationDb", 95.0));
        part(stated, "alice").put("path", alice);
        List<Values> bob = new ArrayList<>(stated.section("bob").list("path"));
        bob.add(new Values("compensator").put("share", 0.95).put("lossDb", 0.5).put("figureOfMeritPsPerNmDb", 250.0));
        part(stated, "bob").put("path", bob);
        return stated;
    }

    private static Values channel(Direction direction) {
        return new Values()
                .put("launchDbm", -3.0)
                .put("wavelengthNm", 1310.0)
                .put("direction", direction)
                .put("ramanCoefficientPerKmNm", 1e-10);
    }

    /** One gated port on bob's side, statistics measured, other fibre classes. */
    static Values gated() {
        Values stated = SampleScenarios.pulsePair();
        part(stated, "source").put("unheraldedG2", 1.2).put("partnerPassProbability", 0.72);
        part(stated, "alice.path[0]").put("fibre", FibreClass.G655D).put("measuredLossDb", 7.1);
        part(stated, "bob.path[0]").put("fibre", FibreClass.G654E);
        Values gate = new Values().put("rateMHz", 100.0).put("widthNs", 0.3).put("darkProbability", 1e-5);
        part(stated, "bob")
                .put(
                        "detectors",
                        List.of(new Values()
                                .put("class", DetectorClass.INGAAS_GATED)
                                .put("gate", gate)));
        return stated;
    }
}
