package binspan.planner.document;

import binspan.planner.document.Change.Delete;
import binspan.planner.document.Change.Insert;
import binspan.planner.document.Change.Move;
import binspan.scenario.Arm;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreSpan;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Edits of the path of an arm: elements added, removed, moved and split. */
public final class ElementEdits {
    private static final double NEW_FIBRE_KM = 10.0;
    private static final double NEW_LOSS_DB = 0.5;
    private static final double NEW_COMPENSATOR_LOSS_DB = 3.0;

    private ElementEdits() {}

    /**
     * Adds an element of usual values with a label of its own: 10 km of standard fibre, a patch panel of 0.5 dB, a filter
     * as wide as the photon's band, a compensator of all of the arm's fibre dispersion.
     *
     * @param scenario the scenario of the document
     * @param arm alice or bob
     * @param type fibre, loss, filter or compensator
     * @param index position of the new element
     * @throws IllegalArgumentException if there is no such arm or type
     */
    public static List<Change> add(Scenario scenario, String arm, String type, int index) {
        return List.of(new Insert(list(arm), index, template(scenario, arm(scenario, arm), type)));
    }

    /** Removes the element at a position of an arm's path. */
    public static List<Change> remove(String arm, int index) {
        return List.of(new Delete(list(arm), index));
    }

    /** Moves an element of an arm's path to another position. */
    public static List<Change> move(String arm, int from, int to) {
        return List.of(new Move(list(arm), from, to));
    }

    /**
     * Cuts a fibre span in two. Length, connectors, splices and a measured loss are shared in proportion; classical
     * channels run on through the second span with the power that the first leaves them, those against the photons the
     * other way round. The second span gets a label of its own; the first keeps its label, spreads and provenance.
     *
     * @param scenario the scenario of the document
     * @param arm alice or bob
     * @param index position of the span
     * @param atKm distance of the cut from the source's end of the span, inside it
     * @throws IllegalArgumentException if there is no fibre at the position or the cut is not inside it
     */
    public static List<Change> split(Scenario scenario, String arm, int index, double atKm) {
        Arm site = arm(scenario, arm);
        boolean exists = index >= 0 && index < site.path().size();
        if (!exists || !(site.path().get(index) instanceof FibreSpan span)) {
            throw new IllegalArgumentException(list(arm) + "[" + index + "]: found no fibre; allowed a fibre to split");
        }
        String label = uniqueLabel(site, span.label().orElse("fibre"));
        return new FibreSplit(list(arm), index, span, atKm).changes(label);
    }

    private static Map<String, Object> template(Scenario scenario, Arm arm, String type) {
        Map<String, Object> element = new LinkedHashMap<>();
        element.put("type", type);
        element.put("label", uniqueLabel(arm, type.equals("loss") ? "patch panel" : type));
        switch (type) {
            case "fibre" -> {
                element.put("fibre", FibreClass.G652D.text());
                element.put("lengthKm", NEW_FIBRE_KM);
                element.put("connectors", 2);
            }
            case "loss" -> element.put("lossDb", NEW_LOSS_DB);
            case "filter" -> {
                element.put("bandwidthFwhmGHz", scenario.bandOf(arm).bandwidthFwhmGHz());
                element.put("passband", scenario.bandOf(arm).passband().text());
            }
            case "compensator" -> {
                boolean fibre = arm.path().stream().anyMatch(FibreSpan.class::isInstance);
                element.put(fibre ? "share" : "dispersionPsPerNm", fibre ? 1.0 : 0.0);
                element.put("lossDb", NEW_COMPENSATOR_LOSS_DB);
            }
            default ->
                throw new IllegalArgumentException(
                        "found \"" + type + "\"; allowed fibre | loss | filter | compensator");
        }
        return element;
    }

    /** The wish itself, or with the first number behind it that makes it unique in the arm. */
    private static String uniqueLabel(Arm arm, String wish) {
        Set<String> taken = new HashSet<>();
        for (PathElement element : arm.path()) {
            taken.add(element.label().orElse(""));
        }
        String label = wish;
        for (int i = 2; taken.contains(label); i++) {
            label = wish + " " + i;
        }
        return label;
    }

    private static String list(String arm) {
        return arm + ".path";
    }

    private static Arm arm(Scenario scenario, String arm) {
        return switch (arm) {
            case "alice" -> scenario.alice();
            case "bob" -> scenario.bob();
            default -> throw new IllegalArgumentException("found arm \"" + arm + "\"; allowed alice | bob");
        };
    }
}
