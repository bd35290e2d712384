package binspan.prediction;

/**
 * Something that the person who trusts the verdict should know.
 *
 * @param code stable short name
 * @param text what was found and what it means
 */
public record Caution(String code, String text) {}
