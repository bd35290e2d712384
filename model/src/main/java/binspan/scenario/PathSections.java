package binspan.scenario;

import static binspan.scenario.Field.Kind.TEXT;
import static binspan.scenario.Field.choice;
import static binspan.scenario.Field.list;
import static binspan.scenario.Field.number;
import static binspan.scenario.Field.plain;

import java.util.List;

/** The elements of a path in the scenario file. */
final class PathSections {
    private static final Range LOSS = Range.of(0, 200);
    private static final Range WAVELENGTH = Range.of(400, 2000);
    private static final Range BANDWIDTH = Range.of(1e-3, 20_000);

    private static final Field LABEL = plain("label", TEXT, "unique name by which the element is addressed")
            .optional();

    private static final Section CLASSICAL = new Section(
            "classical channel",
            ClassicalChannel.class,
            number("launchDbm", "dBm", Range.of(-80, 30), "launched power"),
            number("wavelengthNm", "nm", WAVELENGTH, "vacuum wavelength of the classical light"),
            number("attenuationDbPerKm", "dB/km", Range.of(0, 20), "fibre attenuation at that wavelength")
                    .optional("of the fibre class"),
            choice("direction", Direction.class, "with (forward) or against the photons")
                    .orElse(Direction.FORWARD),
            number(
                    "ramanCoefficientPerKmNm",
                    "1/(km nm)",
                    Range.of(0, 1e-3),
                    "spontaneous Raman cross-section into the photon's band"));

    private static final Section FIBRE = new Section(
            "fibre",
            FibreSpan.class,
            LABEL,
            choice("fibre", FibreClass.class, "fibre class by ITU-T Recommendation"),
            number("lengthKm", "km", Range.of(0, 5000), "length of the span"),
            number("attenuationDbPerKm", "dB/km", Range.of(0, 20), "attenuation at the photon's wavelength")
                    .optional("of the fibre class"),
            number(
                            "dispersionPsPerNmKm",
                            "ps/(nm km)",
                            Range.of(-1000, 1000),
                            "chromatic dispersion at the photon's wavelength")
                    .optional("of the fibre class"),
            number("pmdPsPerSqrtKm", "ps/sqrt(km)", Range.of(0, 20), "polarization mode dispersion")
                    .orElse(FibreClass.PMD_PS_PER_SQRT_KM),
            number(
                            "measuredLossDb",
                            "dB",
                            LOSS,
                            "loss of the whole span as measured; replaces attenuation, connectors and splices")
                    .optional("computed"),
            number("connectors", "", Range.of(0, 10_000), "number of connectors")
                    .orElse(0.0),
            number("connectorLossDb", "dB", Range.of(0, 10), "loss of each connector")
                    .orElse(0.3),
            number("splices", "", Range.of(0, 10_000), "number of splices").orElse(0.0),
            number("spliceLossDb", "dB", Range.of(0, 10), "loss of each splice").orElse(0.05),
            number("delayPsPerKmK", "ps/(km K)", Range.of(-1000, 1000), "temperature coefficient of the delay")
                    .orElse(FibreClass.DELAY_PS_PER_KM_K),
            list("classicalChannels", Content.of(CLASSICAL), Range.of(0, 200), "classical light in the same fibre")
                    .orElse(List.of()));

    private static final Section LOSS_ELEMENT =
            new Section("loss", LossElement.class, LABEL, number("lossDb", "dB", LOSS, "insertion loss"));

    private static final Section FILTER = new Section(
            "filter",
            FilterElement.class,
            LABEL,
            number("bandwidthFwhmGHz", "GHz", BANDWIDTH, "full width at half maximum"),
            choice("passband", PassbandShape.class, "shape of the passband").orElse(PassbandShape.GAUSSIAN),
            number("lossDb", "dB", LOSS, "insertion loss in the passband").orElse(0.8),
            number("isolationDb", "dB", Range.of(0, 300), "attenuation of classical channels outside the passband")
                    .orElse(100.0));

    private static final Section COMPENSATOR = new Section(
                    "compensator",
                    Compensator.class,
                    LABEL,
                    number("dispersionPsPerNm", "ps/nm", Range.of(-1e6, 1e6), "dispersion at the photon's wavelength")
                            .optional("one of dispersionPsPerNm, share is needed"),
                    number("share", "", Range.of(-2, 2), "share of the arm's fibre dispersion that it takes away")
                            .optional("one of dispersionPsPerNm, share is needed"),
                    number("lossDb", "dB", LOSS, "insertion loss that does not depend on the dispersion")
                            .orElse(0.0),
                    number(
                                    "figureOfMeritPsPerNmDb",
                                    "ps/(nm dB)",
                                    Range.of(1e-3, 1e5),
                                    "dispersion per loss: adds loss with the dispersion")
                            .optional())
            .exactlyOneOf("dispersionPsPerNm", "share");

    /** Path elements by their type. */
    static final Content ELEMENTS = Content.ofTypes(FIBRE, LOSS_ELEMENT, FILTER, COMPENSATOR);

    private PathSections() {}
}
