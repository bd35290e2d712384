package binspan.prediction;

/**
 * How far one quantity can drift before the first requirement fails, all others staying as planned.
 *
 * @param path scenario path of the quantity
 * @param unit its unit
 * @param value planned value
 * @param limit value at which the first of the requirements that are met now fails
 * @param requirement which one that is
 */
public record Headroom(String path, String unit, double value, double limit, Requirement requirement) {}
