package binspan.study.tolerance;

import binspan.scenario.Parameter;
import binspan.scenario.Spread;
import binspan.scenario.SpreadShape;
import org.apache.commons.statistics.distribution.ContinuousDistribution;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.apache.commons.statistics.distribution.TriangularDistribution;
import org.apache.commons.statistics.distribution.UniformContinuousDistribution;

/** The distribution of one parameter about its own planned value, cut off at the ends of its range and scaled up inside. */
final class PlacedSpread {
    private final Parameter parameter;
    private final double planned;
    private final double width;
    private final ContinuousDistribution standard;
    private final double below;
    private final double above;

    PlacedSpread(Parameter parameter, Spread spread, double planned) {
        this.parameter = parameter;
        this.planned = planned;
        this.width = spread.width() * (spread.relative() ? Math.abs(planned) : 1.0);
        this.standard = standard(spread.shape());
        this.below = standard.cumulativeProbability((parameter.range().lowest() - planned) / width);
        this.above = standard.survivalProbability((parameter.range().highest() - planned) / width);
    }

    private static ContinuousDistribution standard(SpreadShape shape) {
        return switch (shape) {
            case NORMAL -> NormalDistribution.of(0.0, 1.0);
            case UNIFORM -> UniformContinuousDistribution.of(-1.0, 1.0);
            case TRIANGULAR -> TriangularDistribution.of(-1.0, 0.0, 1.0);
        };
    }

    Parameter parameter() {
        return parameter;
    }

    double planned() {
        return planned;
    }

    double width() {
        return width;
    }

    double cutShare() {
        return below + above;
    }

    /**
     * The value below which a share of the builds lies.
     *
     * @param share above 0 and below 1
     */
    double at(double share) {
        double probability = Math.min(below + share * (1.0 - below - above), Math.nextDown(1.0));
        double value = planned + width * standard.inverseCumulativeProbability(probability);
        return Math.max(parameter.range().lowest(), Math.min(parameter.range().highest(), value));
    }
}
