package binspan.scenario;

import static binspan.scenario.Field.Kind.CHANNEL;
import static binspan.scenario.Field.Kind.ENTRIES;
import static binspan.scenario.Field.Kind.FLAG;
import static binspan.scenario.Field.Kind.TEXT;
import static binspan.scenario.Field.choice;
import static binspan.scenario.Field.count;
import static binspan.scenario.Field.number;
import static binspan.scenario.Field.plain;
import static binspan.scenario.Field.section;

import java.util.List;
import java.util.Map;

/**
 * The registry of scenario parameters: every field of the file with unit, range, default and meaning, once. Reading and
 * its messages, listings, sweeps, spreads, form fields and the JSON Schema all come from here.
 */
public final class ScenarioSections {
    /** The only version of the file format. */
    public static final int FORMAT_VERSION = 1;

    private static final Range PHOTONS_PER_SECOND = Range.of(0, 1e13);
    private static final Range QBER = Range.of(0, 0.5);
    private static final Range HOURS = Range.of(1e-6, 1e6);
    private static final Range EPSILON = Range.of(1e-30, 0.1);

    private static final Section PUMP = new Section(
                    "pump",
                    Pump.class,
                    choice("mode", PumpMode.class, "how the pump light is emitted"),
                    number(
                                    "wavelengthNm",
                                    "nm",
                                    Range.of(200, 2000),
                                    "vacuum wavelength of the light that pumps the pairs")
                            .optional("not checked"),
                    number("repetitionRateMHz", "MHz", Range.of(1e-6, 1e6), "pulse-pair: pump cycles per second")
                            .optional("needed with a pulse-pair pump"),
                    number(
                                    "pairEmissionFwhmPs",
                                    "ps",
                                    Range.of(1e-3, 1e6),
                                    "pulsed: intensity FWHM of the pulse in which pairs are born")
                            .optional("needed with a pulsed pump"),
                    choice("preparation", Preparation.class, "how the pulse pair is made")
                            .orElse(Preparation.INTERFEROMETER),
                    number("mismatchPs", "ps", Range.of(-10_000, 10_000), "bin separation minus the common imbalance")
                            .orElse(0.0),
                    number("earlyPairFraction", "", Range.of(0, 1), "pulse-pair: share of the pairs born early")
                            .orElse(0.5),
                    number("coherenceTimeNs", "ns", Range.of(1e-6, 1e12), "1/e time of the pump's |g1|")
                            .optional("perfectly coherent"),
                    number(
                                    "linewidthMHz",
                                    "MHz",
                                    Range.of(0, 1e6),
                                    "FWHM of the pump line, instead of the coherence time")
                            .optional("perfectly coherent"),
                    choice("lineshape", Lineshape.class, "shape of the pump line")
                            .orElse(Lineshape.LORENTZIAN),
                    number("phaseNoiseRmsRad", "rad", Range.of(0, 10), "phase noise of the pump interferometer, rms")
                            .orElse(0.0),
                    number(
                                    "frequencyDriftRmsMHz",
                                    "MHz",
                                    Range.of(0, 1e6),
                                    "drift of the pump frequency between calibrations, rms")
                            .orElse(0.0))
            .atMostOneOf("coherenceTimeNs", "linewidthMHz");

    private static final Section BAND = new Section(
                    "band",
                    Band.class,
                    number("wavelengthNm", "nm", Range.of(400, 2000), "centre as vacuum wavelength")
                            .optional("one of wavelengthNm, frequencyTHz, channel is needed"),
                    number("frequencyTHz", "THz", Range.of(150, 750), "centre as frequency, instead")
                            .optional("one of wavelengthNm, frequencyTHz, channel is needed"),
                    new Field(
                                    "channel",
                                    CHANNEL,
                                    "",
                                    Range.of(-60, 99),
                                    Field.Presence.REQUIRED,
                                    siblings -> null,
                                    "",
                                    List.of(),
                                    Content.NONE,
                                    "centre as customary channel number, 190 THz + number/10 THz, instead")
                            .optional("one of wavelengthNm, frequencyTHz, channel is needed"),
                    number(
                            "bandwidthFwhmGHz",
                            "GHz",
                            Range.of(1e-3, 20_000),
                            "full width at half maximum of the filter at the source"),
                    choice("passband", PassbandShape.class, "shape of the passband")
                            .orElse(PassbandShape.GAUSSIAN),
                    number(
                                    "uncorrelatedPhotonsPerCycle",
                                    "",
                                    Range.of(0, 100),
                                    "pulsed: photons in the passband that never had a partner, per cycle")
                            .orElse(0.0),
                    number("uncorrelatedPhotonsPerSecond", "1/s", PHOTONS_PER_SECOND, "continuous: the same as a rate")
                            .orElse(0.0))
            .exactlyOneOf("wavelengthNm", "frequencyTHz", "channel");

    private static final Section SOURCE = new Section(
                    "source",
                    Source.class,
                    section("pump", PUMP, "pump light"),
                    number(
                                    "meanPairsPerCycle",
                                    "",
                                    Range.of(1e-12, 100),
                                    "pulsed: mean pairs per cycle with both photons inside all filters, before any loss")
                            .optional("needed with a pulsed pump"),
                    number("pairRatePerSecond", "1/s", Range.of(1e-3, 1e13), "continuous: the same as a rate")
                            .optional("needed with a continuous pump"),
                    number("schmidtNumber", "", Range.of(1, 1e9), "Schmidt number of the filtered pair in one bin")
                            .optional("computed"),
                    number(
                                    "unheraldedG2",
                                    "",
                                    Range.of(1, 2),
                                    "measured unheralded g2(0) of one bin in alice's arm, instead")
                            .optional("computed"),
                    number(
                                    "partnerPassProbability",
                                    "",
                                    Range.of(1e-6, 1),
                                    "measured probability that a photon's partner passes its filters")
                            .optional("computed"),
                    section("signal", BAND, "filter band of the signal photon"),
                    section("idler", BAND, "filter band of the idler photon"))
            .atMostOneOf("schmidtNumber", "unheraldedG2");

    private static final Section TIMING = new Section(
            "timing",
            Timing.class,
            number("windowWidthPs", "ps", Range.of(1e-3, 1e7), "full width of the window"),
            number(
                            "cableTemperatureStepK",
                            "K",
                            Range.of(-200, 200),
                            "change of the cables' temperature between two alignments of the windows")
                    .orElse(0.0));

    private static final Section PROTOCOL = new Section(
            "protocol",
            Protocol.class,
            number(
                            "errorCorrectionEfficiency",
                            "",
                            Range.of(1, 5),
                            "bits disclosed by error correction over the Shannon limit")
                    .orElse(1.16),
            number("secrecyEpsilon", "", EPSILON, "failure probability of secrecy")
                    .orElse(1e-10),
            number("correctnessEpsilon", "", EPSILON, "failure probability of correctness")
                    .orElse(1e-15));

    private static final Section ACQUISITION = new Section(
            "acquisition",
            Acquisition.class,
            number("durationS", "s", Range.of(1e-3, 1e10), "wall-clock time of a key or Bell run")
                    .orElse(3600.0),
            number("uptimeShare", "", Range.of(1e-6, 1), "share of it in which the link works")
                    .orElse(1.0),
            count("fringePoints", Range.of(3, 100_000), "phase settings of a fringe scan")
                    .orElse(16),
            number("secondsPerPoint", "s", Range.of(1e-6, 1e8), "measuring time at each")
                    .orElse(30.0));

    private static final Section REQUIRE = new Section(
            "require",
            Requirements.class,
            number("rawVisibilityAtLeast", "", Range.of(0, 1), "raw two-photon visibility")
                    .optional("not required"),
            number("chshAtLeast", "", Range.of(0, 2.829), "CHSH S").optional("not required"),
            number("phaseBasisQberAtMost", "", QBER, "error rate of the phase basis")
                    .optional("not required"),
            number("timeBasisQberAtMost", "", QBER, "error rate of the time basis")
                    .optional("not required"),
            number("keyRateAtLeastBps", "bit/s", Range.of(0, 1e12), "asymptotic secret key rate")
                    .optional("not required"),
            number("carAtLeast", "", Range.of(0, 1e12), "coincidence-to-accidental ratio")
                    .optional("not required"),
            number("firstKeyWithinHours", "h", HOURS, "time to the first finite key")
                    .optional("not required"),
            number("fiveSigmaWithinHours", "h", HOURS, "time to a CHSH violation by five standard deviations")
                    .optional("not required"));

    private static final Range WIDTH = Range.above(0, 1e13);
    private static final Section SPREAD = new Section(
                    "spread",
                    Spread.class,
                    number("normal", "", WIDTH, "standard deviation")
                            .optional("one of normal, uniform, triangular is needed"),
                    number("uniform", "", WIDTH, "half width").optional("one of normal, uniform, triangular is needed"),
                    number("triangular", "", WIDTH, "half width of the base")
                            .optional("one of normal, uniform, triangular is needed"),
                    plain("relative", FLAG, "whether the width is a share of the planned value")
                            .orElse(false))
            .exactlyOneOf("normal", "uniform", "triangular");

    /** The whole file. */
    public static final Section SCENARIO = new Section(
            "scenario",
            Scenario.class,
            count("formatVersion", Range.of(FORMAT_VERSION, FORMAT_VERSION), "version of the file format"),
            plain("name", TEXT, "name of the link"),
            number(
                    "imbalanceNs",
                    "ns",
                    Range.of(1e-6, 1e4),
                    "nominal imbalance of all interferometers and bin separation (train: pulse period)"),
            section("source", SOURCE, "photon-pair source"),
            section("alice", SiteSections.arm("alice", Photon.SIGNAL), "arm and site of alice"),
            section("bob", SiteSections.arm("bob", Photon.IDLER), "arm and site of bob"),
            section("timing", TIMING, "windows and what moves them"),
            section("protocol", PROTOCOL, "key distillation").orEmpty(),
            section("acquisition", ACQUISITION, "measuring times").orEmpty(),
            section("require", REQUIRE, "what the link must reach").orEmpty(),
            entries("spread", Content.of(SPREAD), "spreads for tolerance studies, by scenario path"),
            entries("provenance", Content.NONE, "where a number comes from, by scenario path"));

    private ScenarioSections() {}

    private static Field entries(String name, Content content, String meaning) {
        return new Field(
                        name,
                        ENTRIES,
                        "",
                        WIDTH,
                        Field.Presence.REQUIRED,
                        siblings -> null,
                        "",
                        List.of(),
                        content,
                        meaning)
                .orElse(Map.of());
    }
}
