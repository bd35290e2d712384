/** The commands: what each reads, prints and returns. */
package binspan.planner.cli;
