package binspan.study;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RequirementMargins;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import java.util.List;

/** Evaluates a scenario at values of its free parameters, for one thread; what does not change between two points is kept. */
public final class PointEvaluator {
    private final Variation variation;
    private final LinkPredictor predictor = new LinkPredictor();
    private final RequirementMargins margins;

    /** Frees parameters of a scenario. */
    public PointEvaluator(Scenario base, List<Parameter> parameters) {
        this(base, parameters, RequirementMargins.of(base.require()));
    }

    /** Frees parameters of a scenario. */
    public PointEvaluator(Scenario base, List<Parameter> parameters, RequirementMargins margins) {
        this.variation = new Variation(base, parameters);
        this.margins = margins;
    }

    /** The scenario as written. */
    public Scenario base() {
        return variation.base();
    }

    /** The prediction at values of the parameters. */
    public LinkPrediction at(double... values) {
        return predictor.of(variation.at(values));
    }

    /** The prediction of another scenario, with what it shares kept as well. */
    public LinkPrediction predicted(Scenario scenario) {
        return predictor.of(scenario);
    }

    /** The scenario at values of the parameters. */
    public Scenario scenario(double... values) {
        return variation.at(values);
    }

    /** The requirements and their margins. */
    public RequirementMargins margins() {
        return margins;
    }

    /** The least margin of all requirements at values of the parameters. */
    public double leastMargin(double... values) {
        return margins.least(at(values));
    }
}
