/**
 * The scenario document behind a window: a text that is always a valid scenario file, edited value by value.
 *
 * <p>An edit is a list of {@link binspan.planner.document.Change}s; it touches the characters of the changed values and
 * nothing else, so that comments, layout and order of the file stay, and the result is read again like any file. What
 * the command line would refuse is refused here in the same words. Around it stand the history of a document, copies
 * for the case of a crash, and the few things that a window remembers from one day to the next.
 */
package binspan.planner.document;
