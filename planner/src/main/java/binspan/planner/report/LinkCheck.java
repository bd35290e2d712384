package binspan.planner.report;

import binspan.scenario.Scenario;

/**
 * Outcome of a check.
 *
 * @param met whether all requirements are met
 */
public record LinkCheck(boolean met) {
    /** Checks a scenario. */
    public static LinkCheck of(Scenario scenario) {
        return new LinkCheck(!scenario.name().isEmpty());
    }
}
