package binspan.planner.viewmodel;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Requirements;
import binspan.scenario.Scenario;
import java.util.OptionalDouble;

/** Links whose verdicts the tests read. */
public final class VerdictLinks {
    private VerdictLinks() {}

    /** A shipped link that meets its requirements. */
    public static Scenario meeting() {
        return shipped("kestrel-dam-to-millbrook");
    }

    /** A shipped link that fails. */
    public static Scenario failing() {
        return shipped("harrow-ridge-overhead-line");
    }

    /** A link of which nothing is required. */
    public static Scenario unjudged() {
        OptionalDouble none = OptionalDouble.empty();
        return requiring(meeting(), new Requirements(none, none, none, none, none, none, none, none));
    }

    /** A link with one of every requirement. */
    public static Scenario withAll() {
        return requiring(
                meeting(),
                new Requirements(
                        OptionalDouble.of(0.85),
                        OptionalDouble.of(2.4),
                        OptionalDouble.of(0.08),
                        OptionalDouble.of(0.02),
                        OptionalDouble.of(500.0),
                        OptionalDouble.of(10.0),
                        OptionalDouble.of(1.0),
                        OptionalDouble.of(0.5)));
    }

    /** A shipped scenario. */
    public static Scenario shipped(String name) {
        try {
            return ScenarioReader.read("../scenarios/" + name + ".json");
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
    }

    /** The same link with another number. */
    public static Scenario with(Scenario scenario, String path, double value) {
        return ParameterPaths.find(scenario, path).with(scenario, value);
    }

    private static Scenario requiring(Scenario s, Requirements require) {
        return new Scenario(
                s.formatVersion(),
                s.name(),
                s.imbalanceNs(),
                s.source(),
                s.alice(),
                s.bob(),
                s.timing(),
                s.protocol(),
                s.acquisition(),
                require,
                s.spread(),
                s.provenance());
    }
}
