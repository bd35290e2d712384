package binspan.planner.viewmodel;

import binspan.scenario.Arm;
import binspan.scenario.Scenario;

/** The two ends of the link. */
public enum Site {
    ALICE("alice"),
    BOB("bob");

    private final String path;

    Site(String path) {
        this.path = path;
    }

    /** Its scenario path. */
    public String path() {
        return path;
    }

    /** Its arm in a scenario. */
    public Arm arm(Scenario scenario) {
        return this == ALICE ? scenario.alice() : scenario.bob();
    }
}
