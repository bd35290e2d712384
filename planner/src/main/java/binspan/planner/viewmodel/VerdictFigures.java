package binspan.planner.viewmodel;

import binspan.counting.LinkCounts;
import binspan.planner.report.Figure;
import binspan.planner.report.FigureText;
import binspan.planner.report.FigureWords;
import binspan.planner.report.TextStyle;
import binspan.planner.report.VerdictBudget;
import binspan.planner.report.VerdictKey;
import binspan.planner.report.VerdictRates;
import binspan.planner.viewmodel.ChangeMark.Aim;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.prediction.ResultField;
import binspan.prediction.ResultFields;
import binspan.study.FigureColumn;
import binspan.units.Digits;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

/** The figures of merit beside the requirements, each with its change. */
final class VerdictFigures {
    private static final Map<String, ResultField> FIELDS =
            ResultFields.ALL.stream().collect(Collectors.toMap(ResultField::name, Function.identity()));

    private final LinkCheck now;
    private final LinkCheck saved;

    private VerdictFigures(LinkCheck now, LinkCheck saved) {
        this.now = now;
        this.saved = saved;
    }

    static List<FigureGroup> of(LinkCheck now, LinkCheck saved) {
        VerdictFigures figures = new VerdictFigures(now, saved);
        List<FigureGroup> groups = new ArrayList<>();
        groups.add(figures.visibility());
        groups.add(figures.bell());
        groups.add(figures.key());
        groups.add(figures.rates());
        FigureGroup errors = figures.errors();
        if (!errors.rows().isEmpty()) {
            groups.add(errors);
        }
        return List.copyOf(groups);
    }

    private FigureGroup visibility() {
        LinkPrediction p = now.prediction();
        String raw = withError(p.fringe().raw(), p.visibilitySigma());
        return new FigureGroup(
                VerdictBudget.TITLE,
                List.of(
                        row(VerdictBudget.RAW, raw, column("visibility.raw"), Aim.HIGH),
                        row(VerdictBudget.NET, Figure.bare(p.fringe().net()), column("visibility.net"), Aim.HIGH)));
    }

    private FigureGroup bell() {
        LinkPrediction p = now.prediction();
        FigureColumn chsh = column("bell.chsh");
        String s = withError(p.bell().chsh(), p.bell().sigma(p.uptime()));
        return new FigureGroup(
                VerdictRates.BELL,
                List.of(
                        row(FigureWords.name(chsh), s, chsh, Aim.HIGH),
                        row(column("bell.secondsToFiveSigma"), Aim.LOW)));
    }

    private FigureGroup key() {
        FigureColumn bits = column("key.finiteBits");
        FigureColumn endless = column("key.asymptoticBps");
        FigureColumn first = column("key.secondsToFirstKey");
        double found = value(bits, now);
        String amount = found > 0.0 ? Digits.prefixed(found, "bit", 3) : FigureText.of(bits, Double.NaN);
        return new FigureGroup(
                VerdictKey.TITLE,
                List.of(
                        row(VerdictKey.ENDLESS, FigureText.of(endless, value(endless, now)), endless, Aim.HIGH),
                        row(VerdictKey.run(now.prediction().scenario()), amount, bits, Aim.HIGH),
                        row(VerdictKey.FIRST, FigureText.of(first, value(first, now)), first, Aim.LOW)));
    }

    private FigureGroup rates() {
        return new FigureGroup(
                Words.of("verdict.rates"),
                List.of(
                        row(column("coincidence.allPortsPerSecond"), Aim.HIGH),
                        row(column("coincidence.accidentalPerSecond"), Aim.LOW),
                        row(column("coincidence.car"), Aim.HIGH),
                        row(singles("alice", p -> LinkCounts.recorded(p.counts().loadsA())), Aim.NEITHER),
                        row(singles("bob", p -> LinkCounts.recorded(p.counts().loadsB())), Aim.NEITHER)));
    }

    private FigureGroup errors() {
        List<FigureRow> rows = new ArrayList<>();
        if (!required(Requirement.PHASE_QBER)) {
            rows.add(row(column("qber.phase"), Aim.LOW));
        }
        if (!required(Requirement.TIME_QBER) && now.prediction().counts().hasTimeBasis()) {
            rows.add(row(column("qber.time"), Aim.LOW));
        }
        return new FigureGroup(VerdictRates.ERRORS, rows);
    }

    /** A figure with its error, which says by its size where there are too few counts to measure the figure. */
    private static String withError(double value, double error) {
        return error >= Figure.USELESS && Double.isFinite(error)
                ? Figure.bare(value) + " \u00b1 " + Digits.significant(error, 1)
                : Figure.withError(value, error, TextStyle.PLAIN_UNICODE);
    }

    private boolean required(Requirement requirement) {
        return now.outcomes().stream().anyMatch(outcome -> outcome.requirement() == requirement);
    }

    /** The singles of all ports of an arm together. */
    private static FigureColumn singles(String arm, Function<LinkPrediction, Double> sum) {
        ResultField ofPort = FIELDS.get(arm + ".singlesPerSecond");
        return new FigureColumn(
                new ResultField(ofPort.name(), ofPort.unit(), false, ofPort.stage(), (p, finite, port) -> sum.apply(p)),
                0);
    }

    private static FigureColumn column(String name) {
        return new FigureColumn(FIELDS.get(name), 0);
    }

    private static double value(FigureColumn column, LinkCheck check) {
        return column.of(check.prediction(), check.finite());
    }

    private FigureRow row(FigureColumn column, Aim aim) {
        return row(FigureWords.name(column), FigureText.of(column, value(column, now)), column, aim);
    }

    private FigureRow row(String name, String value, FigureColumn column, Aim aim) {
        ChangeMark change = ChangeMark.of(
                value(column, saved),
                value(column, now),
                aim,
                difference -> FigureText.difference(column, difference),
                before -> FigureText.of(column, before));
        return new FigureRow(name, value, change);
    }
}
