package binspan.planner.document;

/**
 * A comment in a JSON text.
 *
 * @param start offset of its first slash
 * @param end offset behind it, before the line break for one to the end of the line
 * @param line whether it goes to the end of the line
 */
record TextComment(int start, int end, boolean line) {}
