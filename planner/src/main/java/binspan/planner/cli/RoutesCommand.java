package binspan.planner.cli;

import binspan.planner.export.RoutesReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.table.RouteLedger;
import binspan.planner.table.TableException;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.comparison.RouteSurvey;
import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code binspan routes}. */
@Command(
        name = "routes",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Judges and ranks a table of candidate routes.",
        customSynopsis = {
            "binspan routes FILE --table ROUTES.csv [--tune]",
            "                      [--csv FILE] [--json FILE] [--plot FILE] [--force]"
        },
        description = {
            "Puts each route of a table through the scenario as template, checks it and",
            "ranks all by their least margin, with the reason where one fails. The table is",
            "CSV with a header:",
            "  name                  name of the route",
            "  alice.lengthKm        length of alice's fibre; bob.lengthKm likewise",
            "  alice.measuredLossDb  loss of it as measured, instead or as well",
            "  fibre                 fibre class of all spans; or alice.fibre, bob.fibre",
            "Each arm with fibre needs a length or a loss; an empty fibre class is the",
            "template's. Connectors and splices keep their density, and a measured loss",
            "replaces them. leastMargin is the natural logarithm of predicted over required."
        },
        footer = {
            "",
            "Examples:",
            "  binspan routes dam-to-town.json --table routes.csv",
            "  binspan routes dam-to-town.json --table routes.csv --tune --csv ranking.csv",
            "",
            "A bad row is reported with its line, and the others go on. Exit status: 0 all",
            "routes meet all requirements, 1 some do not, 2 bad input or bad rows, 3 the",
            "program's own failure."
        })
final class RoutesCommand implements Callable<Integer> {
    private final Console console;

    @Mixin
    private ScenarioInput input;

    @Option(names = "--table", required = true, paramLabel = "ROUTES.csv", description = "Table of candidate routes.")
    private String routes;

    @Option(
            names = "--tune",
            description =
                    "Tune mean pairs, window and compensators of every route for the least margin before it is judged.")
    private boolean tune;

    @Mixin
    private StudyOutput output;

    RoutesCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call()
            throws InvalidScenarioException, UsageException, OutputFileException, TableException, IOException {
        output.check(input.file(), routes);
        Scenario template = input.read(console);
        List<FigureColumn> columns = FigureColumns.all(template);
        RouteSurvey survey = new RouteSurvey(template, tune);
        List<Parameter> parameters = UsageException.unless("--tune", survey::parameters);
        try (RouteLedger ledger = new RouteLedger(parameters, columns)) {
            RouteJudge judge = new RouteJudge(survey, ledger, console);
            judge.judge(routes);
            output.deliver(RoutesReport.of(survey, ledger, judge.bad()), console);
            return judge.bad() > 0
                    ? ExitStatus.REFUSED
                    : ledger.met() == ledger.count() ? ExitStatus.MET : ExitStatus.UNMET;
        }
    }
}
