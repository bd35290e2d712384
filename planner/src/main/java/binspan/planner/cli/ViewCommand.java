package binspan.planner.cli;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.view.PlannerApp;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The command {@code binspan view}. */
@Command(
        name = "view",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Opens a window in which a link is shaped by hand.",
        customSynopsis = {"binspan view [FILE] [--theme light|dark] [--scale PERCENT]"},
        description = {
            "Draws the link, its arrival times and its operating map; every change shows at",
            "once whether the link still works. Without FILE it begins with a starter."
        },
        footer = {
            "",
            "Examples:",
            "  binspan view dam-to-town.json",
            "  binspan view dam-to-town.json --theme dark --scale 150",
            "",
            "Exit status: 0 closed, 2 bad input or usage or no display, 3 the program's own",
            "failure."
        })
final class ViewCommand implements Callable<Integer> {
    private static final int SMALLEST = 100;
    private static final int LARGEST = 200;

    private final Console console;

    @Parameters(paramLabel = "FILE", arity = "0..1", description = "Scenario file.")
    private String file;

    @Option(names = "--theme", paramLabel = "light|dark", description = "Light or dark; as last time if not given.")
    private String theme;

    @Option(names = "--scale", paramLabel = "PERCENT", description = "Size of everything, 100 to 200.")
    private Integer scale;

    ViewCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws UsageException, InvalidScenarioException {
        List<String> words = words();
        if (file != null) {
            ScenarioReader.read(file);
        }
        NoDisplay.refuse(System.getProperty("os.name"), console.environment());
        try {
            PlannerApp.open(words);
        } catch (RuntimeException | LinkageError e) {
            throw NoDisplay.because(e);
        }
        return ExitStatus.MET;
    }

    private List<String> words() throws UsageException {
        List<String> words = new ArrayList<>();
        if (file != null) {
            words.add(file);
        }
        if (theme != null) {
            if (!List.of("light", "dark").contains(theme)) {
                throw UsageException.unknown("theme", theme, List.of("light", "dark"));
            }
            words.add("--theme=" + theme);
        }
        if (scale != null) {
            if (scale < SMALLEST || scale > LARGEST) {
                throw UsageException.of(
                        String.format(Locale.ROOT, "--scale %d: allowed %d to %d", scale, SMALLEST, LARGEST));
            }
            words.add("--scale=" + scale);
        }
        return words;
    }
}
