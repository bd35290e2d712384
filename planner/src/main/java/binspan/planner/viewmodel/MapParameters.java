package binspan.planner.viewmodel;

import binspan.scenario.Arm;
import binspan.scenario.Content;
import binspan.scenario.Field;
import binspan.scenario.FieldParameter;
import binspan.scenario.LinkLength;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** The parameters that can be the axes of a map of a scenario: the usual ones first, then all others of the registry. */
final class MapParameters {
    /** What one looks at first, in this order; what a scenario does not have is left out. */
    private static final List<String> USUAL = List.of(
            "source.meanPairsPerCycle",
            "source.pairRatePerSecond",
            "timing.windowWidthPs",
            "imbalanceNs",
            LinkLength.PATH,
            "both.repairMarginDb",
            "source.pump.mismatchPs",
            "both.analyzer.mismatchPs",
            "both.analyzer.phaseNoiseRmsRad",
            "both.clockJitterRmsPs",
            "both.detectors.jitterFwhmPs",
            "both.detectors.efficiency",
            "both.detectors.darkCountsPerSecond",
            "source.signal.bandwidthFwhmGHz",
            "source.idler.bandwidthFwhmGHz",
            "timing.cableTemperatureStepK");

    private static final Set<String> NO_PROPERTIES = Set.of("require", "spread", "provenance");

    private final Scenario scenario;
    private final Set<String> paths = new LinkedHashSet<>(USUAL);

    private MapParameters(Scenario scenario) {
        this.scenario = scenario;
    }

    /** Their paths. */
    static List<String> of(Scenario scenario) {
        MapParameters found = new MapParameters(scenario);
        found.section(ScenarioSections.SCENARIO, "");
        return found.paths.stream().filter(path -> usable(scenario, path)).toList();
    }

    /** The first usual parameter of a scenario that is not another one. */
    static Parameter first(Scenario scenario, String other) {
        return find(
                scenario,
                USUAL.stream()
                        .filter(path -> !path.equals(other) && usable(scenario, path))
                        .findFirst()
                        .orElseThrow());
    }

    /**
     * A parameter that can be an axis.
     *
     * @throws IllegalArgumentException if the path leads to none, with the reason
     */
    static Parameter find(Scenario scenario, String path) {
        Parameter parameter = ParameterPaths.find(scenario, path);
        parameter.over(scenario);
        if (parameter instanceof FieldParameter field && field.field().kind() == Field.Kind.COUNT) {
            throw new IllegalArgumentException(
                    path + ": found a whole number; allowed a parameter that changes steadily");
        }
        if (parameter instanceof LinkLength && !(parameter.value(scenario).orElse(0.0) > 0.0)) {
            parameter.with(scenario, 1.0);
        }
        return parameter;
    }

    private static boolean usable(Scenario scenario, String path) {
        try {
            find(scenario, path);
            return true;
        } catch (IllegalArgumentException e) {
            return false;
        }
    }

    private void section(Section section, String prefix) {
        for (Field field : section.fields()) {
            String path = prefix + field.name();
            switch (field.kind()) {
                case NUMBER -> number(path);
                case SECTION -> inside(field, path);
                case LIST -> list(field, path);
                default -> {
                    // nothing that changes steadily
                }
            }
        }
    }

    private void inside(Field field, String path) {
        if (!NO_PROPERTIES.contains(path)) {
            field.content().section("").ifPresent(section -> section(section, path + "."));
        }
    }

    /** A number of a site is offered for both sites first. */
    private void number(String path) {
        if (path.startsWith("alice.") && !path.startsWith("alice.path")) {
            paths.add("both" + path.substring("alice".length()));
        }
        paths.add(path);
    }

    private void list(Field field, String path) {
        if (field.content().section("").isPresent()) {
            section(field.content().section("").orElseThrow(), path + ".");
        } else {
            Arm arm = path.startsWith(Site.ALICE.path()) ? scenario.alice() : scenario.bob();
            for (int i = 0; i < arm.path().size(); i++) {
                element(field.content(), arm.path().get(i), path, i);
            }
        }
    }

    private void element(Content content, PathElement element, String path, int index) {
        String place = element.label()
                .filter(label -> !label.isEmpty())
                .map(label -> "." + label)
                .orElse("[" + index + "]");
        List<Section> sections = new ArrayList<>(content.byType().values());
        sections.removeIf(section -> !section.type().isInstance(element));
        sections.forEach(section -> section(section, path + place + "."));
    }
}
