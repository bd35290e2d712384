package binspan.planner.cli;

import binspan.planner.io.OutputFileException;
import binspan.planner.io.WholeFile;
import picocli.CommandLine.Option;

/** Where a command puts the text that it makes. */
final class Destination {
    @Option(
            names = {"-o", "--output"},
            paramLabel = "FILE",
            description = "Write to this file instead of standard output. An existing file is kept.")
    private String output;

    @Option(names = "--force", description = "Replace an existing file.")
    private boolean force;

    /** Writes the text: to the file, whole or not at all, or to standard output. */
    void write(String text, Console console) throws OutputFileException {
        if (output == null) {
            console.out().print(text);
        } else {
            WholeFile.write(output, text, force);
        }
    }
}
