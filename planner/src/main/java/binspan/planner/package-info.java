/**
 * The planning tool around the model: entry point of the command line.
 *
 * <p>{@code io} reads and writes files, {@code document} is the scenario file in the hands of an editor, {@code report}, {@code table}, {@code plot} and
 * {@code picture} present results, {@code export} puts together what a study hands out, {@code viewmodel} and {@code view} are the window, {@code cli}
 * holds the commands; each uses those before it only.
 */
package binspan.planner;
