package binspan.study;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.ResultField;
import binspan.prediction.ResultFields;
import binspan.scenario.Nearest;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** The figures of merit that a study tabulates. */
public final class FigureColumns {
    private FigureColumns() {}

    /** All figures that apply to a scenario, in the order of a check's result. */
    public static List<FigureColumn> all(Scenario scenario) {
        LinkPrediction prediction = LinkPredictor.predict(scenario);
        FiniteKeyOutlook finite = FiniteKeyOutlook.of(prediction);
        List<FigureColumn> columns = new ArrayList<>();
        for (ResultField field : ResultFields.ALL) {
            for (int port = 0; port < field.count(prediction); port++) {
                FigureColumn column = new FigureColumn(field, port);
                if (!Double.isNaN(column.of(prediction, finite))) {
                    columns.add(column);
                }
            }
        }
        return List.copyOf(columns);
    }

    /**
     * The figures of some names; a name such as {@code key} stands for all of its group, one such as {@code alice.singlesPerSecond} for all ports.
     *
     * @throws IllegalArgumentException if a name is unknown or its figure does not apply to the scenario, with the nearest names
     */
    public static List<FigureColumn> named(Scenario scenario, List<String> names) {
        List<FigureColumn> all = all(scenario);
        Set<FigureColumn> chosen = new LinkedHashSet<>();
        for (String name : names) {
            List<FigureColumn> found =
                    all.stream().filter(column -> answers(column, name)).toList();
            if (found.isEmpty()) {
                throw new IllegalArgumentException(unknown(name, all));
            }
            chosen.addAll(found);
        }
        return List.copyOf(chosen);
    }

    private static boolean answers(FigureColumn column, String name) {
        return column.name().equals(name)
                || column.field().name().equals(name)
                || column.name().startsWith(name + ".");
    }

    private static String unknown(String name, List<FigureColumn> all) {
        boolean known = ResultFields.ALL.stream().anyMatch(field -> field.name().equals(name));
        if (known) {
            return "figure of merit " + name + " does not apply to this link";
        }
        List<String> near = near(name, all);
        return "unknown figure of merit " + name
                + (near.isEmpty()
                        ? "; allowed groups " + String.join(", ", groups(all)) + " and single figures such as "
                                + all.get(0).name()
                        : "; did you mean " + String.join(" or ", near) + "?");
    }

    /** Names that are nearly the same, or whose last part is. */
    private static List<String> near(String name, List<FigureColumn> all) {
        List<String> names =
                all.stream().map(column -> column.field().name()).distinct().toList();
        List<String> near = Nearest.to(name, names);
        return near.isEmpty()
                ? names.stream().filter(each -> each.endsWith("." + name)).toList()
                : near;
    }

    private static List<String> groups(List<FigureColumn> all) {
        return all.stream()
                .map(column -> column.name().substring(0, column.name().indexOf('.')))
                .distinct()
                .toList();
    }
}
