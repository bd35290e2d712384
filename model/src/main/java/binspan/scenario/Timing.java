package binspan.scenario;

/**
 * Windows and what moves the photons against them.
 *
 * @param windowWidthPs full width of each slot's window (pulsed) or of the coincidence window (continuous), ps
 * @param cableTemperatureStepK change of the cables' temperature between two alignments of the windows, K
 */
public record Timing(double windowWidthPs, double cableTemperatureStepK) {}
