package binspan.planner.viewmodel;

import binspan.planner.report.ParameterWords;
import binspan.scenario.Arm;
import binspan.scenario.Content;
import binspan.scenario.Field;
import binspan.scenario.LinkLength;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/** The parameters of a link that a study can vary, by their scenario paths in the order of the file. */
public final class ParameterChoices {
    private static final Set<String> LEFT_OUT = Set.of("formatVersion", "require", "spread", "provenance");
    private static final String ALICE = "alice.";

    private final Scenario scenario;
    private final List<String> paths = new ArrayList<>();

    private ParameterChoices(Scenario scenario) {
        this.scenario = scenario;
    }

    /** All paths with a planned value; what both sides have stands first as that of both, then for each. */
    public static List<String> of(Scenario scenario) {
        ParameterChoices choices = new ParameterChoices(scenario);
        choices.add(LinkLength.PATH);
        choices.section(ScenarioSections.SCENARIO, "");
        return List.copyOf(choices.paths);
    }

    /** A parameter in words with its unit; a path that leads nowhere stays as it is. */
    public static String words(Scenario scenario, String path) {
        try {
            String unit = ParameterPaths.find(scenario, path).unit();
            return ParameterWords.name(path) + (unit.isEmpty() ? "" : " (" + unit + ")");
        } catch (IllegalArgumentException e) {
            return path;
        }
    }

    private void section(Section section, String prefix) {
        for (Field field : section.fields()) {
            String path = prefix + field.name();
            if (!LEFT_OUT.contains(path)) {
                field(field, path);
            }
        }
    }

    private void field(Field field, String path) {
        switch (field.kind()) {
            case SECTION -> parts(field.content(), path + ".");
            case LIST -> list(field.content(), path);
            case NUMBER, COUNT, CHANNEL -> number(path);
            default -> {
                // words and flags cannot be varied
            }
        }
    }

    private void parts(Content content, String prefix) {
        content.byType().values().forEach(section -> section(section, prefix));
    }

    private void list(Content content, String path) {
        if (content.typed()) {
            elements(content, path, path.startsWith(ALICE) ? scenario.alice() : scenario.bob());
        } else {
            parts(content, path + ".");
        }
    }

    private void elements(Content content, String path, Arm arm) {
        for (int i = 0; i < arm.path().size(); i++) {
            PathElement element = arm.path().get(i);
            String label = element.label().orElse("");
            String prefix = path + (label.isEmpty() ? "[" + i + "]" : "." + label) + ".";
            content.byType().values().stream()
                    .filter(section -> section.type().isInstance(element))
                    .forEach(section -> section(section, prefix));
        }
    }

    private void number(String path) {
        if (path.startsWith(ALICE) && !path.startsWith(ALICE + "path")) {
            add("both." + path.substring(ALICE.length()));
        }
        add(path);
    }

    private void add(String path) {
        try {
            Parameter parameter = ParameterPaths.find(scenario, path);
            parameter.over(scenario);
            if (parameter.value(scenario).isPresent() && !paths.contains(path)) {
                paths.add(path);
            }
        } catch (IllegalArgumentException e) {
            // does not go with the rest of this link
        }
    }
}
