package binspan.planner.cli;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.OutputFileException;
import binspan.planner.picture.RoutesPicture;
import binspan.planner.report.RoutesSummary;
import binspan.planner.table.RouteLedger;
import binspan.planner.table.StudyRows;
import binspan.planner.table.Table;
import binspan.planner.table.TableException;
import binspan.planner.table.TableJson;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.comparison.RouteSurvey;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
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
            output.deliver(report(template, ledger, judge.bad()), console);
            return judge.bad() > 0
                    ? ExitStatus.REFUSED
                    : ledger.met() == ledger.count() ? ExitStatus.MET : ExitStatus.UNMET;
        }
    }

    private StudyReport report(Scenario template, RouteLedger ledger, int bad) {
        Map<String, Object> description = TableJson.head(template.name(), "routes");
        description.put("tuned", tune);
        description.put("routes", ledger.count());
        description.put("routesMet", ledger.met());
        description.put("badRows", bad);
        return new StudyReport(
                description,
                table(ledger),
                style -> unchecked(() -> RoutesSummary.text(template, ledger, bad, style)),
                Optional.of(() -> unchecked(() -> RoutesPicture.of(template.name(), ledger))));
    }

    /** Work on the ledger's file. */
    @FunctionalInterface
    private interface FromFile<T> {
        T get() throws IOException;
    }

    private static <T> T unchecked(FromFile<T> work) {
        try {
            return work.get();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Table table(RouteLedger ledger) {
        List<String> header = new ArrayList<>();
        ledger.parameters().forEach(parameter -> header.add(parameter.path()));
        ledger.columns().forEach(column -> header.add(column.name()));
        header.addAll(List.of("rank", "name", "line", "leastMargin", "tightest", "reason", StudyRows.MEETS));
        return new Table(
                header,
                writer -> ledger.ranked((rank, entry) -> {
                    for (double setting : entry.settings()) {
                        writer.number(setting);
                    }
                    for (int i = 0; i < ledger.columns().size(); i++) {
                        writer.number(
                                entry.figures().isEmpty()
                                        ? Double.NaN
                                        : entry.figures().get(i));
                    }
                    writer.number(rank);
                    writer.text(entry.name());
                    writer.number((double) entry.line());
                    writer.number(entry.leastMargin());
                    writer.text(entry.tightest());
                    writer.text(entry.reason());
                    writer.flag(entry.meets());
                    writer.endRow();
                    return true;
                }));
    }
}
