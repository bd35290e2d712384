package binspan.scenario;

import static binspan.scenario.Field.choice;
import static binspan.scenario.Field.list;
import static binspan.scenario.Field.number;
import static binspan.scenario.Field.section;

import binspan.scenario.DetectorClass.Typical;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** The arms of the link in the scenario file: analyzer, detectors and clock of a site. */
final class SiteSections {
    private static final Range SHARE = Range.of(1e-6, 1 - 1e-6);
    private static final String CLASS_VALUE = "of the detector class";

    private static final Section ANALYZER = new Section(
            "analyzer",
            Analyzer.class,
            number(
                            "mismatchPs",
                            "ps",
                            Range.of(-10_000, 10_000),
                            "this interferometer's imbalance minus the common imbalance")
                    .orElse(0.0),
            number("excessLossDb", "dB", Range.of(0, 60), "loss of both paths, the splitting not counted")
                    .orElse(1.5),
            number("longPathExtraLossDb", "dB", Range.of(0, 60), "loss that the long path has on top")
                    .orElse(0.0),
            number(
                            "inputShortFraction",
                            "",
                            SHARE,
                            "share of the power that the first splitter sends into the short path")
                    .orElse(0.5),
            number(
                            "outputShortToPort1",
                            "",
                            SHARE,
                            "share of the short path's power that the second splitter sends to port 1")
                    .orElse(0.5),
            number("phaseNoiseRmsRad", "rad", Range.of(0, 10), "phase noise rms, temperature not counted")
                    .orElse(0.05),
            number("temperatureRmsMilliK", "mK", Range.of(0, 1e6), "temperature fluctuation rms")
                    .orElse(0.0),
            number(
                            "relativeDelayPerK",
                            "1/K",
                            Range.of(-1e-2, 1e-2),
                            "relative change of the imbalance with temperature")
                    .orElse(8.2e-6),
            number("phaseSettingErrorRad", "rad", Range.of(-6.2832, 6.2832), "static error of the phase setting")
                    .orElse(0.0),
            number(
                            "polarizationOverlap",
                            "",
                            Range.of(0, 1),
                            "modulus of the amplitude overlap of the two paths' polarizations")
                    .orElse(1.0),
            number(
                            "pathDispersionPs2",
                            "ps^2",
                            Range.of(-1e6, 1e6),
                            "group-delay dispersion of the long path minus the short one")
                    .orElse(0.0));

    private static final Section GATE = new Section(
            "gate",
            Gate.class,
            number("rateMHz", "MHz", Range.of(1e-6, 1e6), "gates per second").optional("one for every slot"),
            number("widthNs", "ns", Range.of(1e-6, 1e6), "sensitive width of a gate")
                    .orElse(1.0),
            number("darkProbability", "", Range.of(0, 1), "dark click probability per gate"));

    private static final Section DETECTOR = new Section(
                    "detector",
                    Detector.class,
                    choice("class", DetectorClass.class, "catalogue class whose values stand where none is given")
                            .optional(),
                    fromClass(number("efficiency", "", Range.of(1e-6, 1), "detection efficiency"), Typical::efficiency),
                    number(
                                    "darkCountsPerSecond",
                                    "1/s",
                                    Range.of(0, 1e10),
                                    "recorded dark counts of a free-running detector")
                            .orElse(SiteSections::darkCounts, CLASS_VALUE),
                    number("backgroundCountsPerSecond", "1/s", Range.of(0, 1e10), "recorded counts from stray light")
                            .orElse(0.0),
                    section("gate", GATE, "gating, instead of free-running dark counts")
                            .optional(SiteSections::gate, CLASS_VALUE),
                    fromClass(
                            number("jitterFwhmPs", "ps", Range.of(0, 1e6), "timing jitter with its electronics, FWHM"),
                            Typical::jitterFwhmPs),
                    number("jitterTailFraction", "", Range.of(0, 1), "share of the clicks with an exponential tail")
                            .orElse(0.0),
                    number("jitterTailPs", "ps", Range.of(0, 1e12), "time constant of that tail")
                            .orElse(0.0),
                    fromClass(
                            number("deadTimeNs", "ns", Range.of(0, 1e9), "dead time after a click"),
                            Typical::deadTimeNs),
                    fromClass(
                            number("afterpulseProbability", "", Range.of(0, 1), "afterpulses per click"),
                            Typical::afterpulseProbability))
            .atMostOneOf("darkCountsPerSecond", "gate");

    private SiteSections() {}

    /** An arm whose photon is the given one unless the file says otherwise. */
    static Section arm(String name, Photon photon) {
        return new Section(
                name,
                Arm.class,
                choice("photon", Photon.class, "which photon of the pair travels here")
                        .orElse(siblings -> photon, photon.text() + ", or the one that the other arm leaves"),
                number(
                                "sourceCouplingLossDb",
                                "dB",
                                Range.of(0, 200),
                                "loss from inside the passband to the first path element")
                        .orElse(2.5),
                list("path", PathSections.ELEMENTS, Range.of(0, 200), "elements from the source to the analyzer"),
                number("repairMarginDb", "dB", Range.of(0, 200), "loss set aside for later splices")
                        .orElse(0.0),
                section("analyzer", ANALYZER, "unbalanced interferometer").orEmpty(),
                list("detectors", Content.of(DETECTOR), Range.of(1, 2), "one for each detected output port"),
                number("clockJitterRmsPs", "ps", Range.of(0, 1e6), "jitter of the site clock against the source, rms")
                        .orElse(10.0),
                number("tagBinPs", "ps", Range.of(0, 1e6), "bin width of the time tagger")
                        .orElse(1.0),
                number("delayErrorPs", "ps", Range.of(-1e6, 1e6), "how late the photons arrive against the windows")
                        .orElse(0.0));
    }

    private static Field fromClass(Field field, ToDoubleFunction<Typical> value) {
        return field.orElse(
                siblings -> detectorClass(siblings)
                        .<Object>map(c -> value.applyAsDouble(c.typical()))
                        .orElse(null),
                CLASS_VALUE);
    }

    private static Object darkCounts(Map<String, Object> siblings) {
        if (siblings.containsKey("gate")) {
            return 0.0;
        }
        return detectorClass(siblings)
                .<Object>map(c -> c.typical().darkCountsPerSecond())
                .orElse(null);
    }

    private static Object gate(Map<String, Object> siblings) {
        return siblings.containsKey("darkCountsPerSecond")
                ? null
                : detectorClass(siblings).flatMap(DetectorClass::gate).orElse(null);
    }

    private static Optional<DetectorClass> detectorClass(Map<String, Object> siblings) {
        return Optional.ofNullable((DetectorClass) siblings.get("class"));
    }
}
