/**
 * Studies of one scenario, each a record that checks its description and a {@code run}; here what all share (axes, variations, tables, threads) and
 * sweeps, in the packages below windows, regions, boxes, tuning, comparison and tolerance. {@link binspan.study.Execution} says on how many threads a
 * study runs, hears its progress and can stop it.
 */
package binspan.study;
