package binspan.scenario;

import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;

/** The fibre length of the whole link; varying it scales all fibre of both arms in proportion. */
public record LinkLength() implements Parameter {
    /** Path of this parameter. */
    public static final String PATH = "link.lengthKm";

    @Override
    public String path() {
        return PATH;
    }

    @Override
    public String unit() {
        return "km";
    }

    @Override
    public Range range() {
        return Range.of(0, 10_000);
    }

    @Override
    public String meaning() {
        return "fibre length of both arms together, scaled in proportion";
    }

    @Override
    public OptionalDouble value(Scenario scenario) {
        return OptionalDouble.of(Stream.of(scenario.alice(), scenario.bob())
                .flatMap(arm -> arm.path().stream())
                .mapToDouble(element -> element instanceof FibreSpan span ? span.lengthKm() : 0.0)
                .sum());
    }

    @Override
    public Scenario with(Scenario scenario, double lengthKm) {
        double present = value(scenario).orElse(0.0);
        if (!(present > 0.0) || !range().contains(lengthKm)) {
            throw new IllegalArgumentException(
                    present > 0.0
                            ? PATH + ": found " + Range.plain(lengthKm) + "; allowed " + range().text(unit())
                            : PATH + ": the link has no fibre to scale");
        }
        double factor = lengthKm / present;
        UnaryOperator<PathElement> scale = element -> element instanceof FibreSpan span ? span.scaled(factor) : element;
        return Edits.arms(scenario, arm -> Edits.path(arm, scale));
    }
}
