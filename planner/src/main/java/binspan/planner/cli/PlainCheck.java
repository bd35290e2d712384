package binspan.planner.cli;

import binspan.planner.export.CheckForm;
import java.util.ArrayList;
import java.util.List;

/**
 * A {@code check} of files with no more than one plain option. The most frequent command line is read here, without
 * waiting for the parser of all others to load; both read it alike.
 *
 * @param files file names
 * @param form what to print
 */
record PlainCheck(List<String> files, CheckForm form) {
    /** The check that a command line asks for, or null if it is anything less plain. */
    static PlainCheck of(String[] args) {
        if (args.length == 0 || !args[0].equals("check")) {
            return null;
        }
        List<String> files = new ArrayList<>();
        CheckForm form = CheckForm.VERDICT;
        for (int i = 1; i < args.length; i++) {
            if (!args[i].startsWith("-") || args[i].equals(ScenarioInput.STANDARD_INPUT)) {
                files.add(args[i]);
            } else if (form == CheckForm.VERDICT && option(args[i]) != null) {
                form = option(args[i]);
            } else {
                return null;
            }
        }
        return files.isEmpty() ? null : new PlainCheck(files, form);
    }

    private static CheckForm option(String word) {
        return switch (word) {
            case CheckCommand.JSON -> CheckForm.JSON;
            case CheckCommand.WORKSHEET -> CheckForm.WORKSHEET;
            default -> null;
        };
    }
}
