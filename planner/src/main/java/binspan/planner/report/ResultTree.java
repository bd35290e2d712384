package binspan.planner.report;

import binspan.merit.VisibilityBudget;
import binspan.prediction.Caution;
import binspan.prediction.Headroom;
import binspan.prediction.LinkCheck;
import binspan.prediction.RequirementOutcome;
import binspan.prediction.ResultField;
import binspan.prediction.ResultFields;
import binspan.prediction.StabilityLimit;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The result of a check as a tree: the registry's figures, their dotted names as nested objects, then the lists. */
final class ResultTree {
    private static final int FORMAT_VERSION = 1;

    private final LinkCheck check;
    private final Map<String, Object> root = new LinkedHashMap<>();
    private final Map<String, Map<String, Object>> groups = new HashMap<>();

    private ResultTree(LinkCheck check) {
        this.check = check;
    }

    /** The tree of a result; figures that do not apply are left out, and objects that would be empty with them. */
    static Map<String, Object> of(LinkCheck check) {
        ResultTree tree = new ResultTree(check);
        tree.root.put("formatVersion", FORMAT_VERSION);
        tree.root.put("version", Version.text());
        tree.root.put("scenario", check.prediction().scenario().name());
        for (ResultField field : ResultFields.ALL) {
            tree.figure(field);
        }
        tree.budget();
        tree.stability();
        tree.headroom();
        tree.requirements();
        tree.cautions();
        return tree.root;
    }

    private void figure(ResultField field) {
        List<Object> values = new ArrayList<>();
        for (int port = 0; port < field.count(check.prediction()); port++) {
            double value = field.of(check, port);
            if (!Double.isFinite(value)) {
                return;
            }
            values.add(value);
        }
        int dot = field.name().indexOf('.');
        String group = field.name().substring(0, dot);
        group(group).put(field.name().substring(dot + 1), field.perPort() ? values : values.get(0));
    }

    private Map<String, Object> group(String name) {
        return groups.computeIfAbsent(name, group -> {
            Map<String, Object> figures = new LinkedHashMap<>();
            root.put(group, figures);
            return figures;
        });
    }

    private void budget() {
        List<Object> causes = new ArrayList<>();
        for (VisibilityBudget.Entry entry : check.prediction().budget().entries()) {
            Map<String, Object> cause = new LinkedHashMap<>();
            cause.put("cause", entry.cause().text());
            number(cause, "factor", entry.factor());
            causes.add(cause);
        }
        group("visibility").put("budget", causes);
    }

    private void stability() {
        List<Object> limits = new ArrayList<>();
        for (StabilityLimit each : check.stability()) {
            Map<String, Object> limit = new LinkedHashMap<>();
            limit.put("quantity", each.quantity());
            limit.put("unit", each.unit());
            limit.put("limit", each.limit());
            limits.add(limit);
        }
        root.put("stability", limits);
    }

    private void headroom() {
        List<Object> entries = new ArrayList<>();
        for (Headroom each : check.headroom()) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("path", each.path());
            entry.put("unit", each.unit());
            entry.put("value", each.value());
            entry.put("limit", each.limit());
            entry.put("requirement", each.requirement().fieldName());
            entries.add(entry);
        }
        root.put("headroom", entries);
    }

    private void requirements() {
        List<Object> outcomes = new ArrayList<>();
        for (RequirementOutcome each : check.outcomes()) {
            Map<String, Object> outcome = new LinkedHashMap<>();
            outcome.put("name", each.requirement().fieldName());
            outcome.put("required", each.required());
            number(outcome, "predicted", each.predicted().orElse(Double.NaN));
            number(outcome, "margin", each.margin().orElse(Double.NaN));
            outcome.put("met", each.met());
            outcomes.add(outcome);
        }
        root.put("requirements", outcomes);
    }

    private void cautions() {
        List<Object> cautions = new ArrayList<>();
        for (Caution each : check.cautions()) {
            Map<String, Object> caution = new LinkedHashMap<>();
            caution.put("code", each.code());
            caution.put("text", each.text());
            cautions.add(caution);
        }
        root.put("cautions", cautions);
    }

    private static void number(Map<String, Object> object, String name, double value) {
        if (Double.isFinite(value)) {
            object.put(name, value);
        }
    }
}
