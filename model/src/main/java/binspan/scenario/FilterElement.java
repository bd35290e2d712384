package binspan.scenario;

import java.util.Optional;

/**
 * A filter in the path, centred on the photon's band.
 *
 * @param label unique name
 * @param bandwidthFwhmGHz full width at half maximum, GHz
 * @param passband shape of the passband
 * @param lossDb insertion loss in the passband, dB
 * @param isolationDb attenuation of classical channels outside the passband, dB
 */
public record FilterElement(
        Optional<String> label, double bandwidthFwhmGHz, PassbandShape passband, double lossDb, double isolationDb)
        implements PathElement {}
