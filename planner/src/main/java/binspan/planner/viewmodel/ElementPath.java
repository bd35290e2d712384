package binspan.planner.viewmodel;

import binspan.scenario.Arm;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Paths into the elements of an arm, which the file numbers and people call by their labels. */
final class ElementPath {
    private static final Pattern NUMBERED = Pattern.compile("(alice|bob)\\.path\\[(\\d+)](.*)");

    private ElementPath() {}

    /** The path with the label of its element in place of the number, where it has one. */
    static String labelled(Scenario scenario, String path) {
        Matcher parts = NUMBERED.matcher(path);
        if (!parts.matches()) {
            return path;
        }
        return element(scenario, parts)
                .flatMap(PathElement::label)
                .map(label -> parts.group(1) + ".path." + label + parts.group(3))
                .orElse(path);
    }

    /** The path under which another version of a scenario has the same element, absent if it has none. */
    static Optional<String> in(Scenario other, Scenario scenario, String path) {
        Matcher parts = NUMBERED.matcher(path);
        if (!parts.matches()) {
            return Optional.of(path);
        }
        PathElement element = element(scenario, parts).orElseThrow();
        List<PathElement> elements = arm(other, parts).path();
        for (int i = 0; i < elements.size(); i++) {
            boolean same = element.label().isPresent()
                    ? elements.get(i).label().equals(element.label())
                    : i == Integer.parseInt(parts.group(2));
            if (same && elements.get(i).getClass() == element.getClass()) {
                return Optional.of(parts.group(1) + ".path[" + i + "]" + parts.group(3));
            }
        }
        return Optional.empty();
    }

    private static Optional<PathElement> element(Scenario scenario, Matcher parts) {
        List<PathElement> elements = arm(scenario, parts).path();
        int index = Integer.parseInt(parts.group(2));
        return index < elements.size() ? Optional.of(elements.get(index)) : Optional.empty();
    }

    private static Arm arm(Scenario scenario, Matcher parts) {
        return parts.group(1).equals("alice") ? scenario.alice() : scenario.bob();
    }
}
