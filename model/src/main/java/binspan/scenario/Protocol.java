package binspan.scenario;

/**
 * Key distillation.
 *
 * @param errorCorrectionEfficiency bits disclosed by error correction over the Shannon limit
 * @param secrecyEpsilon failure probability of secrecy
 * @param correctnessEpsilon failure probability of correctness
 */
public record Protocol(double errorCorrectionEfficiency, double secrecyEpsilon, double correctnessEpsilon) {}
