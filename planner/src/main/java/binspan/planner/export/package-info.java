/**
 * What a finished study or check hands out, for the command line and for any other surface: a
 * {@link binspan.planner.export.StudyReport} holds summary, table, head of the JSON and picture, each made only where it
 * is wanted; every study has a factory of its own. {@link binspan.planner.export.StudyFiles} writes them,
 * {@link binspan.planner.export.CheckForm} tells of a check, {@link binspan.planner.export.StudyDefaults} says what a
 * study does when nobody says otherwise.
 */
package binspan.planner.export;
