/**
 * The command line: words to commands, exceptions to exit statuses, catalogues and starters to the terminal. Commands are thin; what they print of a
 * link or a study comes from {@link binspan.planner.export}, what they read from {@link binspan.planner.io}. Text goes to standard output, errors to standard
 * error.
 */
package binspan.planner.cli;
