package binspan.planner.document;

/**
 * Why an edit is refused.
 *
 * @param path scenario path of the value, empty for the whole document
 * @param message what was found and what is allowed, in the words of the command line
 */
public record EditProblem(String path, String message) {}
