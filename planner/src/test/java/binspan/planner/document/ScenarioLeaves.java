package binspan.planner.document;

import binspan.scenario.Field;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** All numeric parameters of a scenario: each field by itself, both arms together, all elements of a list, the link's length. */
final class ScenarioLeaves {
    private final Scenario scenario;
    private final List<Parameter> parameters = new ArrayList<>();

    private ScenarioLeaves(Scenario scenario) {
        this.scenario = scenario;
    }

    static List<Parameter> of(Scenario scenario) {
        ScenarioLeaves leaves = new ScenarioLeaves(scenario);
        leaves.section(ScenarioSections.SCENARIO, scenario, "");
        leaves.parameters.add(ParameterPaths.find(scenario, "link.lengthKm"));
        return leaves.parameters;
    }

    private void section(Section section, Record element, String prefix) {
        for (int i = 0; i < section.fields().size(); i++) {
            Field field = section.fields().get(i);
            Object component = section.component(element, i);
            Object present = component instanceof Optional<?> optional ? optional.orElse(null) : component;
            String path = prefix + field.name();
            if (field.kind().numeric()) {
                add(path);
            } else if (field.kind() == Field.Kind.SECTION && present != null) {
                section(field.content().sectionOf((Record) present), (Record) present, path + ".");
            } else if (present instanceof List<?> items) {
                for (int k = 0; k < items.size(); k++) {
                    Record item = (Record) items.get(k);
                    section(field.content().sectionOf(item), item, path + "[" + k + "].");
                }
            }
        }
    }

    private void add(String path) {
        parameters.add(ParameterPaths.find(scenario, path));
        if (path.startsWith("alice.") && !path.contains(".path[")) {
            String rest = path.substring("alice.".length()).replaceAll("detectors\\[\\d\\]", "detectors");
            parameters.add(ParameterPaths.find(scenario, "both." + rest));
        }
    }
}
