package binspan.planner.cli;

import java.util.concurrent.Callable;
import picocli.AutoComplete;
import picocli.CommandLine.Command;

/** The command {@code binspan completion}. */
@Command(
        name = "completion",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Prints a script that completes commands in bash and zsh.",
        footer = {"", "Examples:", "  source <(binspan completion)", "  binspan completion > ~/.binspan-completion"})
final class CompletionCommand implements Callable<Integer> {
    private final Console console;

    CompletionCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() {
        console.out().print(AutoComplete.bash("binspan", Commands.tree(console)));
        return ExitStatus.MET;
    }
}
