package binspan.scenario;

import java.util.OptionalDouble;

/**
 * Spread of one parameter about its planned value: exactly one shape with its width.
 *
 * @param normal standard deviation of a normal distribution
 * @param uniform half width of a uniform distribution
 * @param triangular half width of the base of a symmetric triangular distribution
 * @param relative whether the width is a share of the planned value instead of the parameter's unit
 */
public record Spread(OptionalDouble normal, OptionalDouble uniform, OptionalDouble triangular, boolean relative) {
    /** Which distribution it is. */
    public SpreadShape shape() {
        if (normal.isPresent()) {
            return SpreadShape.NORMAL;
        }
        return uniform.isPresent() ? SpreadShape.UNIFORM : SpreadShape.TRIANGULAR;
    }

    /** Its width: standard deviation or half width. */
    public double width() {
        return switch (shape()) {
            case NORMAL -> normal.orElseThrow();
            case UNIFORM -> uniform.orElseThrow();
            case TRIANGULAR -> triangular.orElseThrow();
        };
    }
}
