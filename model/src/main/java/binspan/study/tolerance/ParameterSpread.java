package binspan.study.tolerance;

import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/**
 * A parameter that comes out differently in every build.
 *
 * @param parameter which
 * @param spread how it is distributed about its planned value; cut off at the ends of the parameter's range
 */
public record ParameterSpread(Parameter parameter, Spread spread) {
    /**
     * Checks the shape and its width.
     *
     * @throws IllegalArgumentException if there is not exactly one shape, or its width is not above 0
     */
    public ParameterSpread {
        long shapes = Stream.of(spread.normal(), spread.uniform(), spread.triangular())
                .filter(width -> width.isPresent())
                .count();
        if (shapes != 1) {
            throw new IllegalArgumentException(
                    parameter.path() + ": found " + shapes + " shapes; allowed one of normal, uniform, triangular");
        }
        if (!(spread.width() > 0.0) || spread.width() == Double.POSITIVE_INFINITY) {
            throw new IllegalArgumentException(
                    parameter.path() + ": found a spread of " + spread.width() + "; allowed above 0");
        }
    }

    /**
     * The spreads that a scenario states and some more, in this order.
     *
     * @param scenario the link
     * @param more further spreads by scenario path; one of a path that the scenario states takes its place
     * @throws IllegalArgumentException if a path leads to no number, with the nearest names, or a spread is malformed
     */
    public static List<ParameterSpread> of(Scenario scenario, Map<String, Spread> more) {
        Map<String, Spread> all = new LinkedHashMap<>(scenario.spread());
        all.putAll(more);
        return all.entrySet().stream()
                .map(each -> new ParameterSpread(ParameterPaths.find(scenario, each.getKey()), each.getValue()))
                .toList();
    }
}
