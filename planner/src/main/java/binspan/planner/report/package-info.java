/** What a check says: its verdict in words, its result as JSON, its worksheet. */
package binspan.planner.report;
