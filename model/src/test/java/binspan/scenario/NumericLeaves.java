package binspan.scenario;

import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Finds all numbers of a scenario by looking at its records, without the registry, so that the registry can be compared
 * with them.
 */
final class NumericLeaves {
    private final Map<String, OptionalDouble> found = new LinkedHashMap<>();

    private NumericLeaves() {}

    /** Values by the path that formats.md would give them, list elements by position. */
    static Map<String, OptionalDouble> of(Scenario scenario) {
        NumericLeaves leaves = new NumericLeaves();
        leaves.visit(scenario, "");
        return leaves.found;
    }

    private void visit(Record node, String prefix) {
        for (RecordComponent component : node.getClass().getRecordComponents()) {
            take(prefix + component.getName(), read(node, component));
        }
    }

    private void take(String path, Object value) {
        if (value instanceof Number number) {
            found.put(path, OptionalDouble.of(number.doubleValue()));
        } else if (value instanceof OptionalDouble optional) {
            found.put(path, optional);
        } else if (value instanceof Record child) {
            visit(child, path + ".");
        } else if (value instanceof Optional<?> optional && optional.isPresent()) {
            take(path, optional.get());
        } else if (value instanceof List<?> list) {
            List<Object> items = new ArrayList<>(list);
            for (int i = 0; i < items.size(); i++) {
                take(path + "[" + i + "]", items.get(i));
            }
        }
    }

    private static Object read(Record node, RecordComponent component) {
        try {
            return component.getAccessor().invoke(node);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException(component.getName(), e);
        }
    }
}
