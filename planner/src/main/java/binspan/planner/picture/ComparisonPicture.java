package binspan.planner.picture;

import binspan.planner.plot.Axis;
import binspan.planner.plot.Bar;
import binspan.planner.plot.BarPanel;
import binspan.planner.plot.Picture;
import binspan.planner.plot.RankedBars;
import binspan.planner.plot.RequirementLine;
import binspan.planner.report.FigureText;
import binspan.planner.report.ReachSummary;
import binspan.prediction.Requirement;
import binspan.study.comparison.Comparison;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;

/** Links side by side: key rate, visibility and reach of each, in the order of their rank. */
public final class ComparisonPicture {
    private static final double DECADE = 10.0;

    private ComparisonPicture() {}

    /** The picture of a comparison. */
    public static Picture of(String title, List<Comparison.Entry> entries) {
        List<String> labels = entries.stream().map(ComparisonPicture::label).toList();
        List<BarPanel> panels = new ArrayList<>();
        panels.add(panel(
                entries,
                "Secret key rate",
                "bit/s",
                Requirement.KEY_RATE,
                e -> e.prediction().key().asymptoticPerSecond(),
                rate -> FigureText.of(rate, "bit/s")));
        panels.add(panel(
                entries,
                "Raw visibility",
                "",
                Requirement.RAW_VISIBILITY,
                e -> e.prediction().fringe().raw(),
                visibility -> FigureText.of(visibility, "")));
        if (entries.stream().anyMatch(entry -> entry.tightest() != null)) {
            panels.add(panel(
                    entries,
                    "Reach of all requirements",
                    "km",
                    null,
                    e -> e.reachKm().orElse(Double.NaN),
                    km -> ReachSummary.km(OptionalDouble.of(km))));
        }
        boolean tuned = entries.stream().anyMatch(entry -> !entry.free().isEmpty());
        String settings = tuned ? "each tuned for itself" : "settings as written";
        return new Picture(title, settings + "; the best stands on top", new RankedBars("", labels, panels));
    }

    private static String label(Comparison.Entry entry) {
        String setting = entry.setting().meaning();
        return entry.option().name() + (setting.isEmpty() ? "" : " (" + setting + ")");
    }

    private static BarPanel panel(
            List<Comparison.Entry> entries,
            String name,
            String unit,
            Requirement requirement,
            ToDoubleFunction<Comparison.Entry> reading,
            DoubleFunction<String> words) {
        double[] values = entries.stream().mapToDouble(reading).toArray();
        List<Bar> bars = new ArrayList<>();
        for (int i = 0; i < values.length; i++) {
            String text = Double.isFinite(values[i]) ? words.apply(values[i]) : "none";
            bars.add(new Bar(
                    Double.isFinite(values[i]) ? values[i] : Double.NaN,
                    entries.get(i).meets(),
                    text));
        }
        return new BarPanel(axis(name, unit, values), bars, line(entries, requirement));
    }

    private static Axis axis(String name, String unit, double... values) {
        double least = Double.POSITIVE_INFINITY;
        double largest = 0.0;
        for (double value : values) {
            least = value > 0.0 ? Math.min(least, value) : least;
            largest = value > 0.0 ? Math.max(largest, value) : largest;
        }
        return unit.equals("bit/s") && largest > DECADE * least
                ? Axis.logarithmic(name, unit)
                : Axis.linear(name, unit);
    }

    /** The requirement, where all links state the same. */
    private static Optional<RequirementLine> line(List<Comparison.Entry> entries, Requirement requirement) {
        if (requirement == null) {
            return Optional.empty();
        }
        List<OptionalDouble> required = entries.stream()
                .map(entry -> requirement.required(entry.prediction().scenario().require()))
                .distinct()
                .toList();
        return required.size() == 1 && required.get(0).isPresent()
                ? Optional.of(RequirementLines.of(
                        requirement,
                        required.get(0).getAsDouble(),
                        required.get(0).getAsDouble()))
                : Optional.empty();
    }
}
