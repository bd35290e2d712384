package binspan.scenario;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A dispersion compensator; its dispersion is given directly or as a share of the fibre's.
 *
 * @param label unique name
 * @param dispersionPsPerNm dispersion at the photon's wavelength, ps/nm
 * @param share share of the arm's fibre dispersion that it takes away
 * @param lossDb insertion loss that does not depend on the dispersion, dB
 * @param figureOfMeritPsPerNmDb dispersion per loss, ps/(nm dB): adds loss in proportion to the dispersion
 */
public record Compensator(
        Optional<String> label,
        OptionalDouble dispersionPsPerNm,
        OptionalDouble share,
        double lossDb,
        OptionalDouble figureOfMeritPsPerNmDb)
        implements PathElement {}
