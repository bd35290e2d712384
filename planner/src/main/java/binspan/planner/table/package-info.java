/**
 * Tables of studies as CSV and JSON. A {@link binspan.planner.table.Table} is a header and rows that are handed over one after the other, so that large
 * tables are written as they come; {@link binspan.planner.table.StudyRows} makes one of a study's points.
 */
package binspan.planner.table;
