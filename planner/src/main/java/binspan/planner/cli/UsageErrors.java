package binspan.planner.cli;

import binspan.planner.io.Printable;
import binspan.scenario.Nearest;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** Says in one or two lines what is wrong with a command line. */
final class UsageErrors {
    private static final String ERROR = "Error: ";
    private static final List<Class<?>> COUNTS = List.of(int.class, long.class);

    private UsageErrors() {}

    /**
     * Reports an error of the command line.
     *
     * @param error the error
     * @param words all words of the command line
     * @param console where to report it
     * @return exit status
     */
    static int report(ParameterException error, String[] words, Console console) {
        CommandLine command = error.getCommandLine();
        String name = command.getCommandSpec().qualifiedName();
        console.out().flush();
        console.err().println(name + ": " + reason(error, words));
        console.err().println(name + " --help explains " + help(command));
        return ExitStatus.REFUSED;
    }

    private static String help(CommandLine command) {
        return command.getParent() == null ? "the commands" : "the command";
    }

    private static String reason(ParameterException error, String[] words) {
        CommandLine command = error.getCommandLine();
        if (error instanceof UnmatchedArgumentException unmatched
                && !unmatched.getUnmatched().isEmpty()) {
            return unknown(unmatched.getUnmatched().get(0), command);
        }
        if (error instanceof MissingParameterException missing) {
            return missing(missing, words, command);
        }
        if (error.getArgSpec() instanceof OptionSpec option && COUNTS.contains(option.type())) {
            return option.longestName() + ": found \"" + Printable.line(error.getValue())
                    + "\"; allowed a whole number";
        }
        String message = error.getMessage();
        String plain = message.startsWith(ERROR) ? message.substring(ERROR.length()) : message;
        return plain.isEmpty() ? plain : Character.toLowerCase(plain.charAt(0)) + plain.substring(1);
    }

    /** A misspelt option leaves its parameters missing: the option is what to say. */
    private static String missing(MissingParameterException error, String[] words, CommandLine command) {
        for (String word : words) {
            if (isOption(word) && !command.getCommandSpec().optionsMap().containsKey(name(word))) {
                return unknown(word, command);
            }
        }
        ArgSpec argument = error.getMissing().get(0);
        String option = argument instanceof OptionSpec named ? named.longestName() + " " : "";
        return "missing " + option + argument.paramLabel();
    }

    /** A word without the value that an option may carry. */
    private static String name(String word) {
        return isOption(word) ? word.split("=", 2)[0] : word;
    }

    private static boolean isOption(String word) {
        return word.startsWith("-") && word.length() > 1;
    }

    private static String unknown(String word, CommandLine command) {
        boolean option = isOption(word);
        List<String> known = new ArrayList<>(
                option
                        ? command.getCommandSpec().optionsMap().keySet()
                        : command.getSubcommands().keySet());
        String kind = option ? "unknown option " : known.isEmpty() ? "one word too many: " : "unknown command ";
        List<String> near = Nearest.to(name(word), known);
        return kind + name(word) + (near.isEmpty() ? "" : "; did you mean " + String.join(" or ", near) + "?");
    }
}
