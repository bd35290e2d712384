package binspan.planner.cli;

import binspan.planner.export.CheckForm;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.report.TextStyle;
import binspan.prediction.LinkCheck;
import java.io.PrintStream;
import java.util.List;

/** Checks scenarios one after the other. */
final class Check {
    private final Console console;
    private final CheckForm form;
    private final boolean several;
    private int printed;

    private Check(Console console, CheckForm form, boolean several) {
        this.console = console;
        this.form = form;
        this.several = several;
    }

    /**
     * Checks files, each one whatever befell those before it.
     *
     * @param files file names, "-" for standard input
     * @param form what to print
     * @param console where to print it
     * @return the worst exit status
     */
    static int run(List<String> files, CheckForm form, Console console) {
        Check check = new Check(console, form, files.size() > 1);
        int worst = ExitStatus.MET;
        for (String file : files) {
            worst = Math.max(worst, check.statusOf(file));
            if (console.abandoned()) {
                return worst;
            }
        }
        check.end();
        return worst;
    }

    private int statusOf(String file) {
        try {
            LinkCheck outcome = LinkCheck.of(ScenarioInput.read(file, console));
            print(file, outcome);
            return outcome.met() ? ExitStatus.MET : ExitStatus.UNMET;
        } catch (InvalidScenarioException | RuntimeException e) {
            return ExitStatus.of(e, console);
        }
    }

    private void print(String file, LinkCheck outcome) {
        PrintStream out = console.out();
        begin(file, out);
        out.print(form.text(outcome, TextStyle.ofStandardOutput(console.colour())));
    }

    /** Several results are told apart by the file's name, or as items of one JSON list. */
    private void begin(String file, PrintStream out) {
        if (several && form == CheckForm.JSON) {
            out.print(printed == 0 ? "[\n" : ",\n");
        } else if (several) {
            out.print(printed == 0 ? "" : "\n");
            out.println(file + ":");
        }
        printed++;
    }

    private void end() {
        PrintStream out = console.out();
        if (form == CheckForm.JSON && several) {
            out.print(printed == 0 ? "[]\n" : "\n]\n");
        } else if (form == CheckForm.JSON && printed > 0) {
            out.print("\n");
        }
    }
}
