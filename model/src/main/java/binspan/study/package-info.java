/**
 * Studies of one scenario: sweeps, operating windows, tuning, reach, comparison, tolerance, routes. Each is a pure function of a scenario and a
 * description; {@link binspan.study.Execution} says on how many threads it runs, hears its progress and can stop it.
 */
package binspan.study;
