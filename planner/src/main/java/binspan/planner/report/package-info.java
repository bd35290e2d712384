/**
 * What a check says: its verdict for a person, its result as JSON for a program, its worksheet for whoever checks the
 * calculation.
 *
 * <p>All three read the same {@link binspan.prediction.LinkCheck} and compute no physics. Text is at most 80 columns wide
 * and plain ASCII unless a {@link binspan.planner.report.TextStyle} allows more; colour never says anything that a word
 * and a sign do not say as well. Every figure has a unit and three significant digits, errors one or two.
 */
package binspan.planner.report;
