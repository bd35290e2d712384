package binspan.planner.cli;

import binspan.planner.io.WrittenNumber;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import binspan.scenario.SpreadShape;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import picocli.CommandLine.Option;

/** The option {@code --spread PATH=normal:SD|uniform:HALF|triangular:HALF}, given once for each parameter. */
final class SpreadOptions {
    private static final String NAME = "--spread";
    private static final double PERCENT = 100.0;
    private static final List<String> SHAPES =
            Arrays.stream(SpreadShape.values()).map(SpreadShape::text).toList();

    @Option(
            names = NAME,
            paramLabel = "PATH=SHAPE:WIDTH[%]",
            description = "How far a parameter may be off when the link is built: normal with its standard deviation,"
                    + " uniform or triangular with its half width, in the parameter's unit or in per cent of the"
                    + " planned value. Once for each parameter.")
    private List<String> texts = new ArrayList<>();

    /**
     * The spreads by scenario path, in the order given; empty where the option was not given.
     *
     * @param scenario scenario that the paths lead into
     * @throws UsageException if a path, a shape or a width is wrong, if a parameter takes whole numbers only or has no planned value, or if a path is
     *     named twice
     */
    Map<String, Spread> spreads(Scenario scenario) throws UsageException {
        Map<String, Spread> spreads = new LinkedHashMap<>();
        for (String text : texts) {
            PathOption option = PathOption.of(scenario, NAME, text).steady();
            Spread spread = spread(option);
            checkPlanned(option, spread, scenario);
            if (spreads.put(option.parameter().path(), spread) != null) {
                throw option.refused("found twice; allowed once");
            }
        }
        return spreads;
    }

    private static Spread spread(PathOption option) throws UsageException {
        String[] parts = option.rest().split(":", -1);
        if (parts.length != 2) {
            throw option.refused("allowed PATH=normal:SD, PATH=uniform:HALF or PATH=triangular:HALF");
        }
        if (!SHAPES.contains(parts[0])) {
            throw option.refused(
                    UsageException.unknown("shape", parts[0], SHAPES).getMessage());
        }
        boolean relative = parts[1].endsWith("%");
        String number = relative ? parts[1].substring(0, parts[1].length() - 1) : parts[1];
        double width = UsageException.unless(option.name(), () -> WrittenNumber.of(number.stripTrailing()));
        if (!(width > 0.0)) {
            throw option.refused("found a width of " + parts[1] + "; allowed above 0");
        }
        return spread(parts[0], relative ? width / PERCENT : width, relative);
    }

    private static Spread spread(String shape, double width, boolean relative) {
        return new Spread(
                only(SpreadShape.NORMAL, shape, width),
                only(SpreadShape.UNIFORM, shape, width),
                only(SpreadShape.TRIANGULAR, shape, width),
                relative);
    }

    private static OptionalDouble only(SpreadShape shape, String found, double width) {
        return shape.text().equals(found) ? OptionalDouble.of(width) : OptionalDouble.empty();
    }

    private static void checkPlanned(PathOption option, Spread spread, Scenario scenario) throws UsageException {
        Parameter parameter = option.parameter();
        OptionalDouble planned = parameter.value(scenario);
        if (planned.isEmpty()) {
            throw option.refused("has no planned value in this scenario to spread about");
        }
        if (spread.relative() && planned.getAsDouble() == 0.0) {
            String unit = parameter.unit().isEmpty() ? "as a number" : "in " + parameter.unit();
            throw option.refused("is planned at 0, of which per cents are nothing; give the width " + unit);
        }
    }
}
