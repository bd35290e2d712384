package binspan.planner.report;

import static binspan.planner.report.TextPage.left;
import static binspan.planner.report.TextPage.right;

import binspan.study.tolerance.BuildShare;
import binspan.study.tolerance.FailureDriver;
import binspan.study.tolerance.FigureStatistics;
import binspan.study.tolerance.FirstOrderIndex;
import binspan.study.tolerance.ParameterSpread;
import binspan.study.tolerance.RequirementShare;
import binspan.study.tolerance.SpreadDistribution;
import binspan.study.tolerance.ToleranceResult;
import binspan.units.Digits;
import java.util.List;

/** A tolerance study for a person: the odds, what each requirement's are, how the figures scatter, what drives failures. */
public final class ToleranceSummary {
    private static final int NAME = 26;
    private static final int NUMBER = 13;
    private static final int REQUIRED = 16;
    private static final int PATH = 40;
    private static final double NOTICEABLE_CUT = 1e-3;
    private static final double PERCENT = 100.0;
    private static final int MEDIAN = 3;
    private static final int MOST_PLACES = 5;
    private static final List<String> SHOWN = List.of(
            "visibility.raw",
            "bell.chsh",
            "qber.phase",
            "qber.time",
            "key.asymptoticBps",
            "key.secondsToFirstKey",
            "coincidence.car");

    private final ToleranceResult result;
    private final TextPage page;

    private ToleranceSummary(ToleranceResult result, TextStyle style) {
        this.result = result;
        this.page = new TextPage(style);
    }

    /** The summary as a text that ends with a line break. */
    public static String text(ToleranceResult result, TextStyle style) {
        ToleranceSummary summary = new ToleranceSummary(result, style);
        summary.page.wrapped(style.clean(result.study().scenario().name()));
        summary.answer();
        summary.spreads();
        summary.requirements();
        summary.figures();
        summary.drivers();
        return summary.page.toString();
    }

    private void answer() {
        TextStyle style = page.style();
        if (result.requirements().isEmpty()) {
            page.line("No requirement is stated: only the scatter is told.");
            return;
        }
        String share = share(result.all()) + " of the builds meet all requirements (95 % confidence: "
                + share(result.all().lowest()) + " to " + share(result.all().highest()) + ")";
        boolean most = result.all().share() >= 0.5;
        page.wrapped((most ? style.met() : style.notMet()) + " " + share);
    }

    private static String share(BuildShare share) {
        return share(share.share());
    }

    /** A share close to 1 with as many nines as it deserves. */
    private static String share(double share) {
        if (share == 0.0 || share == 1.0) {
            return share == 0.0 ? "0 %" : "100 %";
        }
        double rest = Math.min(share, 1.0 - share) * PERCENT;
        int places = Math.max(1, Math.min(MOST_PLACES, 1 + (int) Math.ceil(-Math.log10(rest))));
        return Digits.decimals(share * PERCENT, places) + " %";
    }

    private void spreads() {
        page.gap();
        page.line(page.style().strong("Spread of " + result.study().samples() + " builds"));
        for (int i = 0; i < result.study().spreads().size(); i++) {
            ParameterSpread spread = result.study().spreads().get(i);
            SpreadDistribution distribution = result.distributions().get(i);
            String unit = spread.parameter().unit().equals("1/s")
                    ? "/s"
                    : spread.parameter().unit();
            String words = spread.spread().shape().text() + ", " + Figure.digits(distribution.planned(), 4, "") + " "
                    + page.style().plusMinus() + " " + Figure.digits(distribution.width(), 3, unit);
            String name = page.style().clean(spread.parameter().path());
            if (name.length() > PATH) {
                page.line("  " + name);
                name = "";
            }
            page.wrapped("  " + left(name, PATH) + " ", " ".repeat(PATH + 3), words);
            if (distribution.cutShare() > NOTICEABLE_CUT) {
                page.wrapped(
                        "    ",
                        "    ",
                        Figure.percent(distribution.cutShare())
                                + " of this spread lies where the parameter is not allowed and is cut off.");
            }
        }
    }

    private void requirements() {
        if (result.requirements().isEmpty()) {
            return;
        }
        page.gap();
        page.line(page.style()
                .strong(left("Requirement", NAME) + right("required", REQUIRED) + right("builds", NUMBER)
                        + "  95 % confidence"));
        for (RequirementShare each : result.requirements()) {
            TextStyle style = page.style();
            String sign = each.requirement().atLeast() ? style.atLeast() : style.atMost();
            page.line(left(RequirementWords.name(each.requirement()), NAME)
                    + right(sign + " " + RequirementWords.required(each.requirement(), each.required()), REQUIRED)
                    + right(share(each.share()), NUMBER) + "  "
                    + share(each.share().lowest()) + " to "
                    + share(each.share().highest()));
        }
    }

    private void figures() {
        page.gap();
        page.line(page.style()
                .strong(left("Figure", NAME) + right("5 %", NUMBER) + right("median", NUMBER) + right("95 %", NUMBER)));
        for (FigureStatistics figure : result.figures()) {
            boolean shown =
                    SHOWN.contains(figure.column().name()) || result.figures().size() <= SHOWN.size();
            if (shown) {
                page.line(left(FigureWords.name(figure.column()), NAME)
                        + right(quantile(figure, 1), NUMBER)
                        + right(quantile(figure, MEDIAN), NUMBER)
                        + right(quantile(figure, 5), NUMBER));
            }
        }
    }

    private static String quantile(FigureStatistics figure, int index) {
        return FigureText.of(figure.column(), figure.quantiles().get(index));
    }

    private void drivers() {
        if (result.requirements().isEmpty()) {
            return;
        }
        boolean failing = result.someFail();
        page.gap();
        page.line(page.style()
                .strong(left(failing ? "What drives failures" : "What moves the least margin", PATH)
                        + right("rank corr.", NUMBER)
                        + right(failing ? "of failure" : "of margin", NUMBER)));
        for (FailureDriver driver : result.drivers()) {
            FirstOrderIndex index = failing ? driver.failure() : driver.margin();
            String name = page.style().clean(driver.path());
            if (name.length() > PATH) {
                page.line(name);
                name = "";
            }
            page.line(left(name, PATH)
                    + right(correlation(result.correlation(driver)), NUMBER)
                    + right(index(index), NUMBER));
        }
        String judged = result.weakest()
                .map(weakest -> "the margin of the " + RequirementWords.name(weakest) + ", which fails most often")
                .orElse("the least margin");
        page.wrapped("rank corr.: Spearman's, of the parameter with " + judged + "; "
                + (failing ? "of failure" : "of margin")
                + ": share of the variance that the parameter explains by itself, with its error; the rest comes from"
                + " parameters acting together.");
    }

    private static String correlation(double correlation) {
        return Double.isNaN(correlation) ? "-" : (correlation > 0.0 ? "+" : "") + Digits.decimals(correlation, 2);
    }

    private String index(FirstOrderIndex index) {
        if (Double.isNaN(index.share())) {
            return "-";
        }
        return Digits.decimals(PERCENT * Math.max(0.0, index.share()), 0) + " "
                + page.style().plusMinus() + " "
                + Digits.decimals(Math.max(1.0, PERCENT * index.standardError()), 0) + " %";
    }
}
