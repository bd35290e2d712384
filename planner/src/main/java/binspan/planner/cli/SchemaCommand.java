package binspan.planner.cli;

import binspan.planner.io.OutputFileException;
import binspan.planner.io.ScenarioSchema;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** The command {@code binspan schema}. */
@Command(
        name = "schema",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Writes the JSON Schema of scenario files.",
        description = "Editors complete and check a scenario that names the schema in its field \"$$schema\".",
        footer = {"", "Examples:", "  binspan schema --output binspan-scenario.schema.json"})
final class SchemaCommand implements Callable<Integer> {
    private final Console console;

    @Mixin
    private Destination destination;

    SchemaCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws OutputFileException {
        destination.write(ScenarioSchema.text(), console);
        return ExitStatus.MET;
    }
}
