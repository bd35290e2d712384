package binspan.planner.export;

import binspan.planner.report.RequiredFigure;
import binspan.study.Axis;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Parts of a study's JSON description that several studies share. */
final class StudyDescription {
    private StudyDescription() {}

    /** Varied parameters: {@code path, unit, from, to, steps, logarithmic}. */
    static List<Map<String, Object>> axes(List<Axis> axes) {
        List<Map<String, Object>> list = new ArrayList<>();
        for (Axis axis : axes) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("path", axis.parameter().path());
            if (!axis.parameter().unit().isEmpty()) {
                entry.put("unit", axis.parameter().unit());
            }
            entry.put("from", axis.from());
            entry.put("to", axis.to());
            entry.put("steps", axis.steps());
            entry.put("logarithmic", axis.logarithmic());
            list.add(entry);
        }
        return list;
    }

    /** Stated requirements: {@code name, required, figure, limit}, the limit in the unit of the figure. */
    static List<Map<String, Object>> requirements(List<RequiredFigure> required) {
        List<Map<String, Object>> list = new ArrayList<>();
        for (RequiredFigure each : required) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("name", each.requirement().fieldName());
            entry.put("required", each.required());
            entry.put("figure", each.figure());
            entry.put("limit", each.limit());
            list.add(entry);
        }
        return list;
    }

    /** Ranges of free parameters: {@code path, unit, from, to, logarithmic}. */
    static List<Map<String, Object>> ranges(List<Axis> free) {
        List<Map<String, Object>> list = axes(free);
        list.forEach(entry -> entry.remove("steps"));
        return list;
    }

    /** Values of parameters by their paths. */
    static Map<String, Object> values(List<Axis> free, List<Double> values) {
        Map<String, Object> entries = new LinkedHashMap<>();
        for (int i = 0; i < free.size(); i++) {
            entries.put(free.get(i).parameter().path(), values.get(i));
        }
        return entries;
    }

    /** The same description without numbers that do not apply. */
    static Map<String, Object> finite(Map<String, Object> description) {
        description.values().removeIf(value -> value instanceof Double number && !Double.isFinite(number));
        return description;
    }
}
