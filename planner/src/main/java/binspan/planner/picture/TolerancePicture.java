package binspan.planner.picture;

import binspan.planner.plot.Axis;
import binspan.planner.plot.Bar;
import binspan.planner.plot.BarPanel;
import binspan.planner.plot.Bin;
import binspan.planner.plot.Histogram;
import binspan.planner.plot.Mark;
import binspan.planner.plot.Panel;
import binspan.planner.plot.PanelGroup;
import binspan.planner.plot.Picture;
import binspan.planner.plot.RankedBars;
import binspan.planner.plot.RequirementLine;
import binspan.planner.report.FigureWords;
import binspan.planner.report.ParameterWords;
import binspan.planner.report.RequirementText;
import binspan.study.FigureColumn;
import binspan.study.StudyTable;
import binspan.study.tolerance.FailureDriver;
import binspan.study.tolerance.FigureStatistics;
import binspan.study.tolerance.ToleranceResult;
import binspan.units.Digits;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** A tolerance study: how the required figures scatter, and what drives failures. */
public final class TolerancePicture {
    private static final int BINS = 40;
    private static final int MOST_HISTOGRAMS = 6;
    private static final int MOST_DRIVERS = 20;
    private static final int COLUMNS = 2;
    private static final double PERCENT = 100.0;
    private static final double FAR = 4.0;

    private TolerancePicture() {}

    /** The picture of a result. */
    public static Picture of(ToleranceResult result) {
        List<Panel> panels = new ArrayList<>();
        for (FigureStatistics figure : shown(result)) {
            panels.add(histogram(result, figure));
        }
        List<Panel> parts = new ArrayList<>();
        if (!panels.isEmpty()) {
            parts.add(new PanelGroup("", COLUMNS, panels));
        }
        if (!result.requirements().isEmpty()) {
            parts.add(drivers(result));
        }
        String share = result.requirements().isEmpty()
                ? result.study().samples() + " builds"
                : Digits.significant(PERCENT * result.all().share(), 4) + " % of "
                        + result.study().samples() + " builds meet all requirements";
        return new Picture("Tolerance", result.study().scenario().name() + "; " + share, new PanelGroup("", 1, parts));
    }

    private static List<FigureStatistics> shown(ToleranceResult result) {
        Set<String> names = new LinkedHashSet<>();
        result.requirements()
                .forEach(each -> names.add(
                        new binspan.planner.report.RequiredFigure(each.requirement(), each.required()).figure()));
        names.addAll(List.of("visibility.raw", "key.asymptoticBps"));
        List<FigureStatistics> shown = new ArrayList<>();
        for (String name : names) {
            result.figures().stream()
                    .filter(figure -> figure.column().name().equals(name))
                    .filter(figure -> Double.isFinite(figure.mean()))
                    .findFirst()
                    .ifPresent(shown::add);
        }
        if (shown.isEmpty()) {
            result.figures().stream()
                    .filter(figure -> Double.isFinite(figure.mean()))
                    .forEach(shown::add);
        }
        return shown.subList(0, Math.min(MOST_HISTOGRAMS, shown.size()));
    }

    private static Histogram histogram(ToleranceResult result, FigureStatistics figure) {
        StudyTable table = result.table();
        FigureColumn column = figure.column();
        double[] values = Arrays.stream(table.figuresOf(table.indexOf(column.name())))
                .filter(Double::isFinite)
                .toArray();
        List<Mark> quantiles = new ArrayList<>();
        quantiles.add(new Mark("5 %", figure.quantiles().get(1)));
        quantiles.add(new Mark("median", figure.quantiles().get(3)));
        quantiles.add(new Mark("95 %", figure.quantiles().get(5)));
        quantiles.removeIf(mark -> !Double.isFinite(mark.value()));
        Optional<RequirementLine> line =
                RequirementLines.of(column, result.study().scenario().require());
        boolean far = line.isPresent() && far(line.get().value(), values);
        return new Histogram(
                far ? line.get().label() + ", far outside" : "",
                Axis.linear(FigureWords.title(column), column.unit()),
                bins(values),
                far ? Optional.empty() : line,
                quantiles);
    }

    /** Whether a requirement lies so far from all values that the picture would show nothing else. */
    private static boolean far(double required, double... values) {
        double least = Arrays.stream(values).min().orElse(required);
        double largest = Arrays.stream(values).max().orElse(required);
        double outside = Math.max(least - required, required - largest);
        return outside > FAR * (largest - least);
    }

    /** Equal bins between the outermost values. */
    static List<Bin> bins(double... values) {
        if (values.length == 0) {
            return List.of();
        }
        double least = Arrays.stream(values).min().orElseThrow();
        double largest = Arrays.stream(values).max().orElseThrow();
        double width = largest > least ? (largest - least) / BINS : Math.max(1e-12, Math.abs(least) * 1e-3);
        double[] counts = new double[BINS];
        for (double value : values) {
            int bin = (int) Math.min(BINS - 1.0, Math.max(0.0, Math.floor((value - least) / width)));
            counts[bin]++;
        }
        List<Bin> bins = new ArrayList<>();
        for (int i = 0; i < BINS; i++) {
            bins.add(new Bin(least + i * width, least + (i + 1) * width, counts[i]));
        }
        return bins;
    }

    private static RankedBars drivers(ToleranceResult result) {
        boolean failing = result.someFail();
        List<FailureDriver> drivers = result.drivers()
                .subList(0, Math.min(MOST_DRIVERS, result.drivers().size()));
        String judged = result.weakest()
                .map(weakest -> "the margin of the " + RequirementText.name(weakest))
                .orElse("the least margin");
        List<String> labels = drivers.stream()
                .map(driver -> ParameterWords.name(driver.path()))
                .toList();
        List<Bar> indices = new ArrayList<>();
        List<Bar> correlations = new ArrayList<>();
        for (FailureDriver driver : drivers) {
            double index = PERCENT * Math.max(0.0, (failing ? driver.failure() : driver.margin()).share());
            indices.add(bar(index, Digits.decimals(Double.isNaN(index) ? 0.0 : index, 0) + " %"));
            correlations.add(bar(
                    Math.abs(result.correlation(driver)),
                    Double.isNaN(result.correlation(driver))
                            ? "none"
                            : Digits.decimals(result.correlation(driver), 2)));
        }
        String what =
                failing ? "Variance of failing, explained alone" : "Variance of the least margin, explained alone";
        return new RankedBars(
                failing ? "What drives failures" : "What moves the least margin",
                labels,
                List.of(
                        new BarPanel(Axis.linear(what, "%"), indices, Optional.empty()),
                        new BarPanel(
                                Axis.linear("Rank correlation with " + judged + ", modulus", "")
                                        .within(0.0, 1.0),
                                correlations,
                                Optional.empty())));
    }

    private static Bar bar(double value, String text) {
        return new Bar(Double.isFinite(value) ? value : Double.NaN, true, text);
    }
}
