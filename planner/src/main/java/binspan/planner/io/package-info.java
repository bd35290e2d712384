/**
 * Reading of scenario files and writing of files.
 *
 * <p>A file becomes a tree of {@link binspan.planner.io.Node}s that know their places, the tree becomes what the file
 * states, walked against the parameter registry of {@code binspan.scenario}, and that becomes the scenario. Whatever is
 * wrong on the way is a {@link binspan.planner.io.Finding} with line, column and path; all findings of a file are
 * reported together.
 */
package binspan.planner.io;
