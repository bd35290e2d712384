package binspan.planner.plot;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntPredicate;
import java.util.stream.DoubleStream;
import org.jfree.chart.LegendItem;
import org.jfree.chart.annotations.XYTextAnnotation;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.PlotOrientation;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.Range;
import org.jfree.data.xy.XYIntervalSeries;

/** Puts ranked bars into panels that share their labels. */
final class RankedBarsChart {
    /** Share of a panel's width that words above it may take, for they may stand at its edge. */
    private static final double LABEL_SHARE = 0.7;

    private static final int LABEL_MARGIN = 40;
    private static final int MOST_LABEL_WIDTH = 460;
    private static final int LETTER_WIDTH = 8;
    private static final int PANEL_WIDTH = 420;
    private static final int FRAME_HEIGHT = 100;
    private static final int ROW_HEIGHT = 24;
    private static final int LEAST_HEIGHT = 320;
    static final double LEAST_WIDTH = 240.0;
    private static final double LEAST_PANEL_WIDTH = 118.0;
    private static final double TIGHT_ROW = 19.0;
    private static final double TIGHT_FRAME = 78.0;
    private static final double LINE_HEIGHT = 18.0;
    private static final double MOST_LABEL_SHARE = 0.36;
    private static final double HALF_BAR = 0.36;
    private static final double MARGIN = 0.04;
    private static final double TEXT_MARGIN = 0.06;
    private static final double LETTER_MARGIN = 0.03;
    private static final double TEXT_GAP = 0.008;

    private final RankedBars bars;
    private final PlotTheme theme;
    private final Room room;

    RankedBarsChart(RankedBars bars, PlotTheme theme, Room room) {
        this.theme = theme;
        this.room = room;
        this.bars = bars;
    }

    /** The height that the rows, one line of words above and three below the axis take. */
    static double leastHeight(RankedBars bars) {
        boolean limits =
                bars.panels().stream().anyMatch(panel -> panel.requirement().isPresent());
        return TIGHT_FRAME
                + TIGHT_ROW * Math.max(2, bars.labels().size())
                + (limits ? LINE_HEIGHT : 0.0)
                + (bars.title().isEmpty() ? 0.0 : LINE_HEIGHT + LINE_HEIGHT / 2.0);
    }

    PanelChart build() {
        CombinedDomainXYPlot combined = new CombinedDomainXYPlot(BarRows.labels(labels(), theme));
        combined.setOrientation(PlotOrientation.HORIZONTAL);
        combined.setInsets(RectangleInsets.ZERO_INSETS);
        combined.setGap(20.0);
        shown().forEach(panel -> combined.add(subplot(panel), 1));
        int height =
                Math.max(LEAST_HEIGHT, FRAME_HEIGHT + ROW_HEIGHT * bars.labels().size());
        return new PanelChart(
                PlotStyle.chart(bars.title(), combined, theme, room),
                legend(),
                room.wide(width()),
                room.high(height),
                bars.panels().size() - shown().size());
    }

    /** The panels that have room. */
    private List<BarPanel> shown() {
        int most = new Room(room.width() - labelWidth(), room.height()).columns(LEAST_PANEL_WIDTH);
        return bars.panels().subList(0, Math.min(most, bars.panels().size()));
    }

    private List<String> labels() {
        return room.given()
                ? bars.labels().stream()
                        .map(label -> Words.shortened(label, PlotStyle.TICK, labelWidth()))
                        .toList()
                : bars.labels();
    }

    private double labelWidth() {
        double longest = bars.labels().stream()
                .mapToDouble(label -> Words.length(label, PlotStyle.TICK))
                .max()
                .orElse(0.0);
        return Math.min(longest, MOST_LABEL_SHARE * room.width());
    }

    private double panelWidth() {
        return (room.width() - labelWidth()) / shown().size() - LETTER_WIDTH;
    }

    private int width() {
        int letters = bars.labels().stream().mapToInt(String::length).max().orElse(0);
        int labels = Math.min(MOST_LABEL_WIDTH, LABEL_MARGIN + LETTER_WIDTH * letters);
        return labels + PANEL_WIDTH * bars.panels().size();
    }

    private XYPlot subplot(BarPanel panel) {
        Range range = range(panel);
        ScaledAxis across = new ScaledAxis(panel.value(), range, theme);
        if (room.given()) {
            across.wrapped(panelWidth());
        }
        XYPlot plot = PlotStyle.plot(null, across, theme);
        plot.setOrientation(PlotOrientation.HORIZONTAL);
        plot.setDomainGridlinesVisible(false);
        plot.setRangeZeroBaselineVisible(!panel.value().logarithmic());
        plot.setRangeZeroBaselinePaint(theme.ink().soft());
        plot.setRangeZeroBaselineStroke(PlotStyle.HAIRLINE);
        plot.setRangeAxisLocation(AxisLocation.BOTTOM_OR_LEFT);
        plot.setRenderer(PatternPainter.renderer(new PatternPainter(theme.fill().bar(), met(panel), theme)));
        XYIntervalSeries series = series(panel, range);
        plot.setDataset(BarRows.dataset(series));
        texts(plot, panel, range);
        if (series.isEmpty() && panel.bars().stream().allMatch(bar -> bar.text().isEmpty())) {
            PlotStyle.sayEmpty(plot, theme);
        }
        panel.requirement()
                .ifPresent(requirement -> new Limits(theme)
                        .labelled(plot, panel.value(), told(requirement), range, AxisLocation.TOP_OR_RIGHT));
        return plot;
    }

    private RequirementLine told(RequirementLine requirement) {
        return Words.length(requirement.label(), PlotStyle.TICK) < LABEL_SHARE * panelWidth()
                ? requirement
                : requirement.brief();
    }

    /** Which of the bars that are drawn is filled. */
    private static IntPredicate met(BarPanel panel) {
        List<Bar> drawn = panel.bars().stream()
                .filter(bar -> !Double.isNaN(panel.value().position(bar.value())))
                .toList();
        return i -> drawn.get(i).met();
    }

    private Range range(BarPanel panel) {
        DoubleStream limit = panel.requirement().stream().mapToDouble(RequirementLine::value);
        DoubleStream values = DoubleStream.concat(panel.bars().stream().mapToDouble(Bar::value), limit);
        boolean zero = !panel.value().logarithmic();
        Range all =
                Positions.of(panel.value(), zero ? DoubleStream.concat(values, DoubleStream.of(0.0)) : values, MARGIN);
        int letters =
                panel.bars().stream().mapToInt(bar -> bar.text().length()).max().orElse(0);
        if (letters == 0 || !Double.isNaN(panel.value().highest())) {
            return all;
        }
        boolean negative = zero && panel.bars().stream().anyMatch(bar -> bar.value() < 0.0);
        boolean positive = !zero || panel.bars().stream().anyMatch(bar -> !(bar.value() < 0.0));
        double more = textShare(panel, letters) * all.getLength();
        return new Range(all.getLowerBound() - (negative ? more : 0.0), all.getUpperBound() + (positive ? more : 0.0));
    }

    /** Room for the words at the ends of the bars, as a share of what the bars span. */
    private double textShare(BarPanel panel, int letters) {
        if (!room.given()) {
            return TEXT_MARGIN + LETTER_MARGIN * letters;
        }
        double longest = LETTER_WIDTH
                + panel.bars().stream()
                        .mapToDouble(bar -> Words.length(bar.text(), PlotStyle.TICK))
                        .max()
                        .orElse(0.0);
        return longest / Math.max(LETTER_WIDTH, panelWidth() - longest);
    }

    private static double foot(BarPanel panel, Range range) {
        return panel.value().logarithmic()
                ? range.getLowerBound()
                : Math.max(range.getLowerBound(), Math.min(range.getUpperBound(), 0.0));
    }

    private static XYIntervalSeries series(BarPanel panel, Range range) {
        XYIntervalSeries series = BarRows.series();
        double foot = foot(panel, range);
        for (int row = 0; row < panel.bars().size(); row++) {
            double end = panel.value().position(panel.bars().get(row).value());
            if (!Double.isNaN(end)) {
                BarRows.add(series, row, HALF_BAR, new Interval(Math.min(foot, end), Math.max(foot, end)));
            }
        }
        return series;
    }

    private void texts(XYPlot plot, BarPanel panel, Range range) {
        double foot = foot(panel, range);
        double gap = TEXT_GAP * range.getLength();
        for (int row = 0; row < panel.bars().size(); row++) {
            Bar bar = panel.bars().get(row);
            double end = panel.value().position(bar.value());
            boolean left = end < foot;
            if (!bar.text().isEmpty()) {
                double from = Double.isNaN(end) ? foot : end;
                XYTextAnnotation text = new XYTextAnnotation(bar.text(), row, left ? from - gap : from + gap);
                text.setFont(PlotStyle.TICK);
                text.setPaint(theme.ink().text());
                text.setBackgroundPaint(theme.halo());
                text.setTextAnchor(left ? TextAnchor.CENTER_RIGHT : TextAnchor.CENTER_LEFT);
                plot.addAnnotation(text);
            }
        }
    }

    private List<LegendItem> legend() {
        List<LegendItem> items = new ArrayList<>();
        boolean fails = bars.panels().stream()
                .flatMap(panel -> panel.bars().stream())
                .anyMatch(bar -> !bar.met() && !Double.isNaN(bar.value()));
        boolean limits =
                bars.panels().stream().anyMatch(panel -> panel.requirement().isPresent());
        if (fails || limits) {
            items.add(new LegendEntries(theme)
                    .filled("meets the requirements", theme.fill().bar()));
            items.add(new LegendEntries(theme)
                    .hatched("does not meet them", false, theme.ink().text()));
        }
        if (limits) {
            items.add(new Limits(theme).failingEntry());
        }
        return items;
    }
}
