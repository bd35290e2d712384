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
    /** A spread of one shape. */
    public static Spread of(SpreadShape shape, double width, boolean relative) {
        return new Spread(
                onlyIf(shape == SpreadShape.NORMAL, width),
                onlyIf(shape == SpreadShape.UNIFORM, width),
                onlyIf(shape == SpreadShape.TRIANGULAR, width),
                relative);
    }

    private static OptionalDouble onlyIf(boolean present, double width) {
        return present ? OptionalDouble.of(width) : OptionalDouble.empty();
    }

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
