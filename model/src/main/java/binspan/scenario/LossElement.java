package binspan.scenario;

import java.util.Optional;

/**
 * A component that only loses light: patch panel, switch, monitor tap.
 *
 * @param label unique name
 * @param lossDb insertion loss, dB
 */
public record LossElement(Optional<String> label, double lossDb) implements PathElement {}
