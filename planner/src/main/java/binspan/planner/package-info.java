/**
 * The planning tool around the model: entry point of the command line.
 *
 * <p>{@code io} reads and writes files, {@code report} presents a result, {@code cli} holds the commands; {@code cli}
 * uses both, they do not use it. {@code document} is the scenario file in the hands of an editor and uses {@code io}.
 */
package binspan.planner;
