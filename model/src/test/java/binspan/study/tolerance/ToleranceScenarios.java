package binspan.study.tolerance;

import binspan.scenario.SampleScenarios;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import binspan.scenario.SpreadShape;
import binspan.scenario.Values;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import java.util.List;
import java.util.Map;

/** Links with requirements and spreads for the tests of tolerance studies. */
final class ToleranceScenarios {
    private ToleranceScenarios() {}

    /** The sample pulse-pair link with one requirement. */
    static Scenario requiring(String name, double value) {
        return SampleScenarios.build(SampleScenarios.pulsePair().put("require", new Values().put(name, value)));
    }

    /** The sample pulse-pair link with two requirements that some builds of {@link #several} miss. */
    static Scenario demanding() {
        return SampleScenarios.build(SampleScenarios.pulsePair()
                .put("require", new Values().put("rawVisibilityAtLeast", 0.90).put("keyRateAtLeastBps", 2500.0)));
    }

    /** Spreads of five parameters in all three shapes. */
    static List<ParameterSpread> several(Scenario scenario) {
        return List.of(
                relative(scenario, "source.meanPairsPerCycle", SpreadShape.NORMAL, 0.15),
                relative(scenario, "alice.detectors.efficiency", SpreadShape.NORMAL, 0.05),
                absolute(scenario, "bob.repairMarginDb", SpreadShape.UNIFORM, 1.0),
                absolute(scenario, "alice.path.cable.lengthKm", SpreadShape.TRIANGULAR, 6.0),
                absolute(scenario, "alice.analyzer.polarizationOverlap", SpreadShape.TRIANGULAR, 0.05));
    }

    /** A spread in the parameter's unit. */
    static ParameterSpread absolute(Scenario scenario, String path, SpreadShape shape, double width) {
        return spread(scenario, path, Spread.of(shape, width, false));
    }

    /** A spread as a share of the planned value. */
    static ParameterSpread relative(Scenario scenario, String path, SpreadShape shape, double width) {
        return spread(scenario, path, Spread.of(shape, width, true));
    }

    static ParameterSpread spread(Scenario scenario, String path, Spread spread) {
        return ParameterSpread.of(scenario, Map.of(path, spread)).stream()
                .filter(each -> each.parameter().path().equals(path))
                .findFirst()
                .orElseThrow();
    }

    /** Figures by their names. */
    static List<FigureColumn> figures(Scenario scenario, String... names) {
        return FigureColumns.named(scenario, List.of(names));
    }
}
