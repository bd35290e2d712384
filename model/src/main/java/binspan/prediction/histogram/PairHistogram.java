package binspan.prediction.histogram;

/**
 * Coincidences of a link.
 *
 * @param first ports (1,1)
 * @param all all pairs of ports added, at the best and the worst phase of ports (1,1): unequal ports are then at their worst and best
 */
public record PairHistogram(CoincidenceHistogram first, CoincidenceHistogram all) {}
