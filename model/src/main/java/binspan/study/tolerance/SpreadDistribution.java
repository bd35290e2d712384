package binspan.study.tolerance;

import binspan.scenario.Field;
import binspan.scenario.FieldParameter;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import java.util.List;

/**
 * The distribution of a spread parameter over the builds of a scenario: about the planned value, cut off at the ends of the parameter's range and scaled up
 * inside.
 *
 * <p>A parameter that stands for several values moves them together. Where they are planned differently, each deviates from its own planned value by the
 * same multiple of its width (where a range cuts off a part: to the same quantile).
 */
public final class SpreadDistribution {
    private static final double MOST_CUT = 0.5;

    private final Parameter parameter;
    private final List<PlacedSpread> places;

    private SpreadDistribution(Parameter parameter, List<PlacedSpread> places) {
        this.parameter = parameter;
        this.places = places;
    }

    /**
     * The distribution of a spread in a scenario.
     *
     * @throws IllegalArgumentException if the parameter cannot be varied there, is a whole number or a requirement, has no planned value, has a planned
     *     value of 0 and a relative spread, or if most of the spread lies outside the allowed range
     */
    static SpreadDistribution of(Scenario scenario, ParameterSpread spread) {
        Parameter parameter = spread.parameter();
        requirePart(parameter);
        parameter.over(scenario);
        PlacedSpread first = placed(scenario, parameter, spread);
        if (parameter instanceof FieldParameter field
                && !parameter.with(scenario, first.planned()).equals(scenario)) {
            return new SpreadDistribution(
                    parameter,
                    field.places(scenario).stream()
                            .map(place -> placed(scenario, place, spread))
                            .toList());
        }
        return new SpreadDistribution(parameter, List.of(first));
    }

    private static void requirePart(Parameter parameter) {
        if (parameter.path().startsWith("require.")) {
            throw refused(parameter, "a requirement is the same for every build; only the link can spread");
        }
        if (parameter instanceof FieldParameter field && field.field().kind() == Field.Kind.COUNT) {
            throw refused(parameter, "a whole number cannot spread");
        }
    }

    private static PlacedSpread placed(Scenario scenario, Parameter parameter, ParameterSpread spread) {
        double planned = parameter
                .value(scenario)
                .orElseThrow(
                        () -> refused(parameter, "left to be computed here; state the value that it spreads about"));
        if (spread.spread().relative() && planned == 0.0) {
            throw refused(parameter, "planned at 0, of which a relative spread is nothing; state an absolute one");
        }
        PlacedSpread placed = new PlacedSpread(parameter, spread.spread(), planned);
        if (placed.cutShare() > MOST_CUT) {
            throw refused(
                    parameter, "most of its spread lies where the parameter is not allowed; state a narrower one");
        }
        return placed;
    }

    private static IllegalArgumentException refused(Parameter parameter, String reason) {
        return new IllegalArgumentException(parameter.path() + ": " + reason);
    }

    /** What spreads. */
    public Parameter parameter() {
        return parameter;
    }

    /** The planned value, in the parameter's unit; the first of several that differ. */
    public double planned() {
        return places.get(0).planned();
    }

    /** Standard deviation (normal) or half width of the whole shape, in the parameter's unit; the first of several that differ. */
    public double width() {
        return places.get(0).width();
    }

    /** Share of the shape that lies outside of the parameter's range and is cut off, 0 to below 1; the largest of several. */
    public double cutShare() {
        return places.stream().mapToDouble(PlacedSpread::cutShare).max().orElseThrow();
    }

    /** The parameters that it moves, one after the other. */
    List<PlacedSpread> places() {
        return places;
    }
}
