package binspan.planner.cli;

import binspan.scenario.Field;
import binspan.scenario.FieldParameter;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;

/**
 * An option that speaks of a parameter of the scenario: {@code --vary PATH=REST}.
 *
 * @param name the option as it was written, for messages
 * @param parameter the parameter of the path
 * @param rest what follows the equals sign, empty if there is none
 */
record PathOption(String name, Parameter parameter, String rest) {
    /**
     * Reads the value of an option.
     *
     * @param scenario scenario that the path leads into
     * @param option name of the option
     * @param text its value
     * @throws UsageException if the path leads to nothing that can be varied, with the nearest paths
     */
    static PathOption of(Scenario scenario, String option, String text) throws UsageException {
        String name = option + " \"" + text + "\"";
        int sign = text.lastIndexOf('=');
        String path = sign < 0 ? text : text.substring(0, sign);
        Parameter parameter = UsageException.unless(name, () -> ParameterPaths.find(scenario, path));
        try {
            parameter.over(scenario);
        } catch (IllegalArgumentException e) {
            throw refused(name, path, e);
        }
        return new PathOption(name, parameter, sign < 0 ? "" : text.substring(sign + 1));
    }

    /** Whether the parameter takes whole numbers only. */
    boolean whole() {
        return parameter instanceof FieldParameter field && field.field().kind() == Field.Kind.COUNT;
    }

    /** Refuses a parameter that moves in whole steps, for studies that look between them. */
    PathOption steady() throws UsageException {
        if (whole()) {
            throw refused("found a whole number; allowed a parameter that changes steadily");
        }
        return this;
    }

    /** A refusal of this option. */
    UsageException refused(String reason) {
        return UsageException.of(name + ": " + reason);
    }

    /** The same for a reason that begins with the path, which the option says already. */
    UsageException refused(IllegalArgumentException reason) {
        return refused(name, parameter.path(), reason);
    }

    private static UsageException refused(String name, String path, IllegalArgumentException reason) {
        String start = path + ": ";
        String words = reason.getMessage();
        return UsageException.of(name + ": " + (words.startsWith(start) ? words.substring(start.length()) : words));
    }
}
