package binspan.planner.picture;

import binspan.planner.plot.Axis;
import binspan.planner.plot.Bar;
import binspan.planner.plot.BarPanel;
import binspan.planner.plot.Picture;
import binspan.planner.plot.RankedBars;
import binspan.planner.report.FigureText;
import binspan.planner.report.FigureWords;
import binspan.planner.table.RouteLedger;
import binspan.study.FigureColumn;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The best of many routes: key rate, visibility and losses of each, in the order of their rank. */
public final class RoutesPicture {
    private static final int MOST = 30;
    private static final List<String> SHOWN =
            List.of("key.asymptoticBps", "visibility.raw", "alice.lossDb", "bob.lossDb");

    private RoutesPicture() {}

    /** The picture of ranked routes. */
    public static Picture of(String template, RouteLedger ledger) throws IOException {
        List<RouteLedger.Entry> best = new ArrayList<>();
        ledger.ranked((rank, entry) -> {
            best.add(entry);
            return rank < MOST;
        });
        List<String> labels = best.stream().map(RouteLedger.Entry::name).toList();
        List<BarPanel> panels = new ArrayList<>();
        for (int i = 0; i < ledger.columns().size(); i++) {
            FigureColumn column = ledger.columns().get(i);
            if (SHOWN.contains(column.name())) {
                panels.add(panel(column, i, best));
            }
        }
        panels.sort((a, b) -> Integer.compare(place(a), place(b)));
        String subtitle = ledger.count() > best.size()
                ? template + "; the best " + best.size() + " of " + ledger.count() + " routes, by least margin"
                : template + "; ranked by least margin";
        return new Picture("Candidate routes", subtitle, new RankedBars("", labels, panels));
    }

    private static int place(BarPanel panel) {
        return panel.value().unit().equals("dB") ? 2 : panel.value().unit().isEmpty() ? 1 : 0;
    }

    private static BarPanel panel(FigureColumn column, int index, List<RouteLedger.Entry> entries) {
        List<Bar> bars = new ArrayList<>();
        double[] values = new double[entries.size()];
        for (int i = 0; i < values.length; i++) {
            List<Double> figures = entries.get(i).figures();
            values[i] = figures.isEmpty() ? Double.NaN : figures.get(index);
            boolean none = column.field().name().startsWith("key.") && !(values[i] > 0.0);
            bars.add(new Bar(
                    none ? Double.NaN : values[i],
                    entries.get(i).meets(),
                    none ? "none" : FigureText.of(column, values[i])));
        }
        Axis axis = FigureAxes.of(column, values);
        return new BarPanel(
                new Axis(FigureWords.title(column), axis.unit(), axis.logarithmic(), axis.lowest(), axis.highest()),
                bars,
                Optional.empty());
    }
}
