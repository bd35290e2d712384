package binspan.planner.cli;

import binspan.planner.io.OutputFileException;
import binspan.planner.io.Preset;
import java.util.ArrayList;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** The command {@code binspan new}. */
@Command(
        name = "new",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Writes a starter scenario with comments.",
        description = "Writes a complete scenario that can be checked as it is and edited into your own.",
        footer = {
            "",
            "Examples:",
            "  binspan new pulse-pair --output dam-to-town.json",
            "  binspan new coexistence",
            "  binspan list presets"
        })
final class NewCommand implements Callable<Integer> {
    private final Console console;

    @Parameters(
            paramLabel = "PRESET",
            completionCandidates = Names.class,
            description = "Which one: ${COMPLETION-CANDIDATES}.")
    private String preset;

    @Mixin
    private Destination destination;

    /** The presets, for completion. */
    static final class Names extends ArrayList<String> {
        private static final long serialVersionUID = 1L;

        Names() {
            super(Preset.names());
        }
    }

    NewCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws UsageException, OutputFileException {
        Preset found = Preset.find(preset).orElseThrow(() -> UsageException.unknown("preset", preset, Preset.names()));
        destination.write(found.scenario(), console);
        return ExitStatus.MET;
    }
}
