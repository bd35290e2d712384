package binspan.planner.cli;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.Scenario;
import picocli.CommandLine.Parameters;

/** The scenario file of a command. */
final class ScenarioInput {
    /** Stands for standard input. */
    static final String STANDARD_INPUT = "-";

    @Parameters(paramLabel = "FILE", description = "Scenario file, - for standard input.")
    private String file;

    /** Its name on the command line. */
    String file() {
        return file;
    }

    /** The scenario. */
    Scenario read(Console console) throws InvalidScenarioException {
        return read(file, console);
    }

    /**
     * Reads a scenario.
     *
     * @param file file name, "-" for standard input
     * @param console where standard input comes from
     */
    static Scenario read(String file, Console console) throws InvalidScenarioException {
        return file.equals(STANDARD_INPUT)
                ? ScenarioReader.read(console.in(), "(standard input)")
                : ScenarioReader.read(file);
    }
}
