package binspan.planner.viewmodel;

import binspan.scenario.Parameter;
import binspan.scenario.Range;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.region.OperatingRegion;
import java.util.Map;

/** The range of an axis of the map when nobody says otherwise: that of the studies, or one after the unit where nothing is planned. */
final class MapRanges {
    private static final double BARE = 1.0;
    private static final double FIRST_SHARE = 0.01;

    /** How far a quantity is usually looked at, by its unit (common practice). */
    private static final Map<String, Double> REACH = Map.ofEntries(
            Map.entry("ps", 100.0),
            Map.entry("ns", 100.0),
            Map.entry("ps^2", 2000.0),
            Map.entry("ps/nm", 2000.0),
            Map.entry("ps/(nm km)", 20.0),
            Map.entry("ps/(km K)", 50.0),
            Map.entry("ps/sqrt(km)", 0.5),
            Map.entry("ps/(nm dB)", 1000.0),
            Map.entry("km", 100.0),
            Map.entry("nm", 2000.0),
            Map.entry("dB", 10.0),
            Map.entry("dB/km", 0.5),
            Map.entry("dBm", 10.0),
            Map.entry("rad", 0.5),
            Map.entry("K", 1.0),
            Map.entry("mK", 50.0),
            Map.entry("1/K", 1e-4),
            Map.entry("GHz", 200.0),
            Map.entry("MHz", 20.0),
            Map.entry("THz", 250.0),
            Map.entry("1/s", 1e4));

    private MapRanges() {}

    /** The axis of a parameter over its usual range. */
    static Axis of(Scenario scenario, Parameter parameter) {
        if (parameter.value(scenario).orElse(0.0) == 0.0) {
            return unplanned(parameter);
        }
        Axis axis = DefaultAxes.of(scenario, parameter);
        return new Axis(parameter, axis.from(), axis.to(), OperatingRegion.USUAL_STEPS, axis.logarithmic());
    }

    private static Axis unplanned(Parameter parameter) {
        Range range = parameter.range();
        double reach = REACH.getOrDefault(parameter.unit(), BARE);
        boolean logarithmic = range.lowest() > 0.0 || range.lowestOpen();
        double wanted = logarithmic ? FIRST_SHARE * reach : -reach;
        double from = inside(range, Math.max(range.lowest(), wanted), reach);
        double to = inside(range, Math.min(range.highest(), reach), from);
        if (from < to) {
            return new Axis(parameter, from, to, OperatingRegion.USUAL_STEPS, logarithmic);
        }
        double decade = Math.min(range.highest(), 10.0 * range.lowest());
        return new Axis(parameter, range.lowest(), decade, OperatingRegion.USUAL_STEPS, true);
    }

    private static double inside(Range range, double end, double other) {
        return range.contains(end) ? end : end + FIRST_SHARE * (other - end);
    }
}
