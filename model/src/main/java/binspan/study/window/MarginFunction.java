package binspan.study.window;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RequirementMargins;
import binspan.prediction.SlotFit;
import binspan.scenario.Field;
import binspan.scenario.FieldParameter;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.PointEvaluator;
import binspan.study.Variation;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * The margins of all stated requirements, and of the fit of the slots if they fit as written, over some axes, for one thread. Places are shares of the way along each axis, in its own linear or logarithmic
 * scale: 0 is its first value, 1 its last.
 */
public final class MarginFunction {
    private static final String REQUIREMENTS = "require.";

    private final List<Axis> axes;
    private final int[] order;
    private final PointEvaluator evaluator;
    private final RequirementMargins margins;
    private final double[] values;

    public MarginFunction(Scenario scenario, List<Axis> axes) {
        this.axes = axes;
        this.order = IntStream.range(0, axes.size())
                .boxed()
                .sorted(Comparator.comparingInt(i -> -effort(scenario, axes.get(i))))
                .mapToInt(Integer::intValue)
                .toArray();
        RequirementMargins stated = RequirementMargins.of(scenario.require());
        boolean fits = SlotFit.room(scenario) >= 0.0;
        this.evaluator = new PointEvaluator(
                scenario,
                Arrays.stream(order).mapToObj(i -> axes.get(i).parameter()).toList(),
                fits ? stated.withSlots() : stated);
        this.margins = evaluator.margins();
        this.values = new double[axes.size()];
    }

    /**
     * Refuses what has no margins to look at.
     *
     * @throws IllegalArgumentException if nothing is required, or if parameters cannot be varied without steps here or not together
     */
    public static void check(Scenario scenario, List<Axis> axes) {
        if (RequirementMargins.of(scenario.require()).requirements().isEmpty()) {
            throw new IllegalArgumentException(
                    "the scenario states no requirement; state at least one in its section \"require\"");
        }
        axes.forEach(MarginFunction::check);
        Variation.check(scenario, axes);
    }

    private static void check(Axis axis) {
        String path = axis.parameter().path();
        if (path.startsWith(REQUIREMENTS)) {
            throw new IllegalArgumentException(path + ": is a requirement; vary a property of the link");
        }
        if (axis.parameter() instanceof FieldParameter parameter
                && parameter.field().kind() == Field.Kind.COUNT) {
            throw new IllegalArgumentException(path + ": takes whole numbers only; vary a parameter that has no steps");
        }
    }

    /** How much of a prediction must be made anew when a parameter changes: 0 to 3. */
    private static int effort(Scenario scenario, Axis axis) {
        LinkPredictor predictor = new LinkPredictor();
        LinkPrediction from = predictor.of(axis.parameter().with(scenario, axis.from()));
        return predictor.of(axis.parameter().with(scenario, axis.to())).renewedSince(from);
    }

    /** The positions of the axes, the one whose change is the most laborious first: what is quick should change most often. */
    public int[] order() {
        return order.clone();
    }

    /** Number of requirements. */
    public int requirements() {
        return margins.requirements().size();
    }

    /** The requirements and their required figures. */
    public RequirementMargins margins() {
        return margins;
    }

    /** The value of an axis at a share of its way; the ends are met exactly. */
    public static double value(Axis axis, double share) {
        return share >= 1.0 ? axis.to() : axis.at(Math.max(0.0, share));
    }

    /** All margins. */
    public double[] at(double... shares) {
        return margins.of(predicted(shares));
    }

    /** The margin of one requirement. */
    public double one(int requirement, double... shares) {
        return margins.margin(requirement, predicted(shares));
    }

    /** The least margin. */
    public double least(double... shares) {
        return margins.least(predicted(shares));
    }

    /** The requirement with the least margin. */
    public int tightest(double... shares) {
        return margins.tightest(predicted(shares));
    }

    /** The prediction. */
    LinkPrediction predicted(double... shares) {
        for (int i = 0; i < values.length; i++) {
            values[i] = value(axes.get(order[i]), shares[order[i]]);
        }
        return evaluator.at(values);
    }

    /** Everything there is to say of a place. */
    public PointVerdict verdict(double... shares) {
        LinkPrediction prediction = predicted(shares);
        List<RequirementMargin> each = new ArrayList<>();
        for (int i = 0; i < requirements(); i++) {
            each.add(new RequirementMargin(
                    margins.requirements().get(i),
                    margins.required(i),
                    margins.predicted(i, prediction),
                    margins.margin(i, prediction)));
        }
        List<Double> point = new ArrayList<>();
        for (int i = 0; i < axes.size(); i++) {
            point.add(value(axes.get(i), shares[i]));
        }
        return new PointVerdict(point, each);
    }
}
