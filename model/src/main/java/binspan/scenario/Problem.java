package binspan.scenario;

/**
 * Something wrong with a scenario.
 *
 * @param path where, as a scenario path; empty for the whole file
 * @param message what was found and what is allowed
 */
public record Problem(String path, String message) {}
