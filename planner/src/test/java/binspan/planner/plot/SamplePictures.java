package binspan.planner.plot;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;

/** One picture of each kind with invented numbers. */
final class SamplePictures {
    static final Axis WINDOW = Axis.logarithmic("Window width", "ps");
    static final Axis PAIRS = Axis.logarithmic("Mean pairs per bin", "");

    private SamplePictures() {}

    static Map<String, Picture> all() {
        Map<String, Picture> all = new LinkedHashMap<>();
        all.put("curves", page(curves()));
        all.put("map", page(new PanelGroup("", 2, List.of(map("short arm"), map("long arm")))));
        all.put("bars", page(bars(List.of("as written", "wider window", "cooler detector"))));
        all.put("histograms", page(new PanelGroup("", 2, List.of(histogram(), bars(List.of("a", "b", "c"))))));
        all.put("ranges", page(ranges()));
        return all;
    }

    static Picture page(Panel panel) {
        return new Picture("Kestrel Dam to Millbrook", "42 km of fibre; all else as written", panel);
    }

    static Series series(String name, DoubleUnaryOperator function) {
        double[] x = IntStream.range(0, 60)
                .mapToDouble(i -> 50.0 * Math.pow(40.0, i / 59.0))
                .toArray();
        return new Series(
                name,
                DoubleStream.of(x)
                        .mapToObj(w -> new Point(w, function.applyAsDouble(w)))
                        .toList());
    }

    static Curves curves() {
        CurvePanel visibility = new CurvePanel(
                Axis.linear("Visibility", ""),
                List.of(
                        series("deployed fibre", w -> 0.96 - w * 5e-5),
                        series("patch cord", w -> w > 300.0 && w < 400.0 ? Double.NaN : 0.97 - w * 3e-5)),
                Optional.of(RequirementLine.of("0.88", 0.88, true)));
        CurvePanel key = new CurvePanel(
                Axis.logarithmic("Key rate", "bit/s"),
                List.of(series("deployed fibre", w -> w < 70.0 ? 0.0 : w / 10.0)),
                Optional.of(RequirementLine.of("20\u2009bit/s", 20.0, true)));
        return new Curves(
                "",
                WINDOW,
                List.of(visibility, key),
                List.of(new Interval(200.0, 1600.0)),
                List.of(new Mark("as written", 500.0), new Mark("tuned", 520.0)));
    }

    static HeatMap map(String title) {
        double[] pairs = {0.001, 0.003, 0.01, 0.03, 0.1};
        double[] windows = {50.0, 200.0, 500.0, 2000.0};
        Lattice key = Lattices.of(pairs, windows, (p, w) -> p > 0.05 ? 0.0 : 1000.0 * p * Math.sqrt(w));
        Lattice margin = Lattices.of(pairs, windows, (p, w) -> Math.log(20.0 / (p * w)));
        Overlays overlays = Overlays.NONE
                .withMargin(margin)
                .withContours(List.of(
                        new Contour("visibility 0.88", ContourLines.of(PAIRS, WINDOW, margin, 0.0)),
                        new Contour("key rate 100 bit/s", ContourLines.of(PAIRS, WINDOW, key, 100.0))))
                .withPoints(List.of(
                        new PointMark("as planned", new Point(0.01, 500.0)),
                        new PointMark("recommended", new Point(0.012, 600.0))))
                .withBoxes(List.of(
                        new BoxOutline("tolerance box", new Interval(0.008, 0.02), new Interval(300.0, 700.0))));
        return new HeatMap(
                title, PAIRS, WINDOW, new HeatLayer(Axis.logarithmic("Key rate", "bit/s"), key, "no key"), overlays);
    }

    static RankedBars bars(List<String> labels) {
        BarPanel key = new BarPanel(
                Axis.logarithmic("Key rate", "bit/s"),
                List.of(new Bar(120.0, true, "120"), new Bar(45.0, false, "45"), new Bar(Double.NaN, false, "no key")),
                Optional.of(RequirementLine.of("100\u2009bit/s", 100.0, true)));
        BarPanel change = new BarPanel(
                Axis.linear("Change of visibility", ""),
                List.of(new Bar(0.01, true, ""), new Bar(-0.02, false, ""), new Bar(0.0, true, "")),
                Optional.empty());
        return new RankedBars("", labels, List.of(key, change));
    }

    static Histogram histogram() {
        List<Bin> bins = new ArrayList<>();
        for (int i = 0; i < 20; i++) {
            bins.add(new Bin(
                    0.86 + 0.005 * i, 0.865 + 0.005 * i, Math.rint(200.0 * Math.exp(-(i - 9.5) * (i - 9.5) / 20.0))));
        }
        return new Histogram(
                "Spread of the visibility",
                Axis.linear("Visibility", ""),
                bins,
                Optional.of(RequirementLine.of("0.88", 0.88, true)),
                List.of(new Mark("5 % of trials lie below", 0.885), new Mark("median", 0.91)));
    }

    static RangeBars ranges() {
        return new RangeBars(
                "",
                List.of(
                        new RangeBar(WINDOW.within(50.0, 2000.0), new Interval(410.0, 950.0), 500.0),
                        new RangeBar(
                                Axis.linear("Detuning", "GHz").within(-50.0, 50.0), new Interval(-12.5, 50.0), 0.0)));
    }
}
