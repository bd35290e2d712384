package binspan.planner.cli;

import binspan.planner.report.MissWords;
import binspan.planner.table.RouteLedger;
import binspan.planner.table.RouteReader;
import binspan.planner.table.TableException;
import binspan.prediction.RequirementMargins;
import binspan.study.Execution;
import binspan.study.comparison.Route;
import binspan.study.comparison.RouteSurvey;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Streams a table of routes through a survey into a ledger; bad rows are reported and the others go on. */
final class RouteJudge {
    private static final int BATCH = 512;
    private static final int MOST_REPORTED = 20;

    private final RouteSurvey survey;
    private final RouteLedger ledger;
    private final Console console;
    private final RequirementMargins margins;
    private final List<Route> batch = new ArrayList<>();
    private final List<Long> lines = new ArrayList<>();
    private int bad;

    RouteJudge(RouteSurvey survey, RouteLedger ledger, Console console) {
        this.survey = survey;
        this.ledger = ledger;
        this.console = console;
        this.margins = RequirementMargins.of(survey.template().require());
    }

    /** Number of bad rows. */
    int bad() {
        return bad;
    }

    /**
     * Judges all rows of a table.
     *
     * @throws TableException if it cannot be read, or breaks off
     */
    void judge(String file) throws TableException, IOException {
        try (RouteReader reader = RouteReader.of(file, survey.template())) {
            long size = Math.max(1L, Files.size(Path.of(file)));
            ProgressBar.during(console, execution -> {
                rows(reader, size, execution);
                return null;
            });
            reader.checkWhole();
        } catch (UncheckedIOException e) {
            throw e.getCause();
        }
        if (bad > MOST_REPORTED) {
            console.err().println("... and " + (bad - MOST_REPORTED) + " more bad rows");
        }
    }

    private void rows(RouteReader reader, long size, Execution execution) {
        double reached = 0.0;
        while (reader.hasNext()) {
            RouteReader.Row row = reader.next();
            if (row.problem() != null) {
                refuse(row.problem());
            } else {
                batch.add(row.route());
                lines.add(row.line());
            }
            if (batch.size() == BATCH) {
                double share = Math.min(1.0, (double) reader.position() / size);
                flush(execution.part(reached, share));
                reached = share;
            }
        }
        flush(execution.part(reached, 1.0));
    }

    private void refuse(String problem) {
        bad++;
        if (bad <= MOST_REPORTED) {
            console.err().println(problem);
        }
    }

    private void flush(Execution execution) {
        List<RouteSurvey.Verdict> verdicts = survey.judge(batch, execution);
        try {
            for (int i = 0; i < verdicts.size(); i++) {
                ledger.add(verdicts.get(i), lines.get(i), reason(verdicts.get(i)));
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        batch.clear();
        lines.clear();
    }

    private String reason(RouteSurvey.Verdict verdict) {
        if (verdict.refusal() != null) {
            return verdict.refusal();
        }
        return verdict.meets() ? "" : MissWords.reason(margins, verdict.prediction());
    }
}
