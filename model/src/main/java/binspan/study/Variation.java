package binspan.study;

import binspan.scenario.Field;
import binspan.scenario.FieldParameter;
import binspan.scenario.LinkLength;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.DoubleFunction;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/**
 * A scenario with some of its parameters free; values are applied in the order of the parameters.
 *
 * <p>One object serves one thread: it keeps the scenario of the last values, so that only the parts behind the first changed value are made anew. It is
 * quickest where the last parameter changes most often.
 */
public final class Variation {
    private final Scenario base;
    private final List<Parameter> parameters;
    private final Scenario[] stages;
    private final double[] known;
    private final DoubleFunction<Scenario>[] over;

    /**
     * Frees parameters of a scenario.
     *
     * @throws IllegalArgumentException if a parameter cannot be varied in this scenario
     */
    @SuppressWarnings({"unchecked", "rawtypes"}) // an array of functions cannot be made otherwise
    public Variation(Scenario base, List<Parameter> parameters) {
        this.base = base;
        this.parameters = List.copyOf(parameters);
        this.stages = new Scenario[parameters.size()];
        this.known = new double[parameters.size()];
        this.over = new DoubleFunction[parameters.size()];
    }

    /** The scenario as written. */
    public Scenario base() {
        return base;
    }

    /** The free parameters. */
    public List<Parameter> parameters() {
        return parameters;
    }

    /**
     * The scenario at values of the parameters.
     *
     * @param values one for each parameter, in its unit
     * @throws IllegalArgumentException if a value is out of range
     */
    public Scenario at(double... values) {
        int first = 0;
        while (first < values.length && stages[first] != null && known[first] == values[first]) {
            first++;
        }
        for (int i = first; i < values.length; i++) {
            if (i > first || over[i] == null) {
                over[i] = parameters.get(i).over(i == 0 ? base : stages[i - 1]);
            }
            stages[i] = over[i].apply(values[i]);
            known[i] = values[i];
        }
        return values.length == 0 ? base : stages[values.length - 1];
    }

    /** The values as the scenario states them, NaN where it leaves one to be computed. */
    public double[] planned() {
        return parameters.stream()
                .mapToDouble(parameter -> parameter.value(base).orElse(Double.NaN))
                .toArray();
    }

    /**
     * Refuses parameters that cannot be varied here, or not together.
     *
     * @param scenario the scenario
     * @param parameters the parameters
     * @param values an allowed value of each
     * @throws IllegalArgumentException if one is named twice, cannot be varied in this scenario, or is moved by a later one
     */
    public static void check(Scenario scenario, List<Parameter> parameters, double... values) {
        Set<String> seen = new HashSet<>();
        for (Parameter parameter : parameters) {
            if (!seen.add(parameter.path())) {
                throw new IllegalArgumentException(parameter.path() + ": found twice; allowed once");
            }
        }
        Scenario varied = new Variation(scenario, parameters).at(values);
        for (int i = 0; i < values.length; i++) {
            if (!stands(parameters.get(i), values[i], varied)) {
                throw new IllegalArgumentException(parameters.get(i).path() + ": moved by "
                        + movers(scenario, parameters, values, i) + " as well; vary one of them");
            }
        }
    }

    /**
     * The same for axes, tried at two points in which no two of them stand at the same share of their ways.
     *
     * @throws IllegalArgumentException likewise
     */
    public static void check(Scenario scenario, List<Axis> axes) {
        List<Parameter> parameters = axes.stream().map(Axis::parameter).toList();
        check(scenario, parameters, places(axes, 0));
        check(scenario, parameters, places(axes, axes.size()));
    }

    private static double[] places(List<Axis> axes, int shift) {
        double[] places = new double[axes.size()];
        for (int i = 0; i < places.length; i++) {
            Axis axis = axes.get(i);
            boolean whole = axis.parameter() instanceof FieldParameter field
                    && field.field().kind() == Field.Kind.COUNT;
            places[i] = whole ? axis.from() : axis.at((i + 1.0 + shift) / (2.0 * places.length + 1.0));
        }
        return places;
    }

    /** Whether a parameter is at a value, everywhere in a scenario that it moves. */
    private static boolean stands(Parameter parameter, double value, Scenario varied) {
        double found = parameter.value(varied).orElse(Double.NaN);
        boolean first = Math.abs(found - value) <= 1e-9 * Math.abs(value);
        return first
                && (parameter instanceof LinkLength
                        || parameter.with(varied, value).equals(varied));
    }

    private static String movers(Scenario scenario, List<Parameter> parameters, double[] values, int moved) {
        Parameter parameter = parameters.get(moved);
        Scenario alone = parameter.with(scenario, values[moved]);
        return IntStream.range(moved + 1, values.length)
                .filter(i -> !stands(parameter, values[moved], parameters.get(i).with(alone, values[i])))
                .mapToObj(i -> parameters.get(i).path())
                .collect(Collectors.joining(" or "));
    }
}
