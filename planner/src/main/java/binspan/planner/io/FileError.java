package binspan.planner.io;

/**
 * One error of a file, for a program that shows it beside the value.
 *
 * @param line line, the first is 1
 * @param column column in characters, the first is 1
 * @param path scenario path of the value, list positions in brackets; empty for the whole file
 * @param message what was found and what is allowed, in the words of the command line
 */
public record FileError(int line, int column, String path, String message) {}
