package binspan.planner.document;

import binspan.planner.document.TextPart.Slot;
import binspan.scenario.Field;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A scenario path taken apart.
 *
 * @param steps names of members and positions in lists, from the root
 */
record DocumentPath(List<Step> steps) {
    private static final Pattern STEP = Pattern.compile("\\.?([^.\\[\\]]+)|\\[([0-9]{1,6})\\]");

    /**
     * One step into an object or a list.
     *
     * @param name name of a member, empty in a list
     * @param item position in a list, -1 in an object
     */
    record Step(String name, int item) {
        boolean named() {
            return item < 0;
        }

        /** Position of the slot in an object or list, -1 if it has none. */
        int position(TextPart part) {
            return named() ? part.position(name) : item < part.slots().size() ? item : -1;
        }
    }

    /**
     * Takes a path apart.
     *
     * @param path path with list positions in brackets; the keys of entries may hold anything
     * @param root whole document
     * @throws RefusedEditException if it is no path
     */
    static DocumentPath of(String path, TextPart root) throws RefusedEditException {
        for (Field field : ScenarioSections.SCENARIO.fields()) {
            if (field.kind() == Field.Kind.ENTRIES && path.startsWith(field.name() + ".")) {
                return entry(field, path.substring(field.name().length() + 1), root);
            }
        }
        List<Step> steps = new ArrayList<>();
        Matcher matcher = STEP.matcher(path);
        while (matcher.lookingAt()) {
            String item = matcher.group(2);
            steps.add(item == null ? name(matcher.group(1)) : new Step("", Integer.parseInt(item)));
            matcher.region(matcher.end(), path.length());
        }
        if (steps.isEmpty() || matcher.regionStart() < path.length() || path.startsWith(".")) {
            throw new RefusedEditException(path, "no path; allowed one such as alice.path[2].lengthKm");
        }
        return new DocumentPath(List.copyOf(steps));
    }

    private static Step name(String name) {
        return new Step(name, -1);
    }

    /** An entry, or a field of one that exists. */
    private static DocumentPath entry(Field field, String key, TextPart root) {
        TextPart entries = root.member(field.name());
        Section section = field.content().section("").orElse(null);
        if (section != null && entries != null && entries.member(key) == null) {
            for (Slot slot : entries.slots()) {
                String inside = key.startsWith(slot.name() + ".")
                        ? key.substring(slot.name().length() + 1)
                        : "";
                if (section.field(inside).isPresent()) {
                    return new DocumentPath(List.of(name(field.name()), name(slot.name()), name(inside)));
                }
            }
        }
        return new DocumentPath(List.of(name(field.name()), name(key)));
    }

    int size() {
        return steps.size();
    }

    Step step(int index) {
        return steps.get(index);
    }

    Step last() {
        return steps.get(size() - 1);
    }

    /** The way to the object or list that holds a step. */
    DocumentPath before(int step) {
        return new DocumentPath(steps.subList(0, step));
    }

    /** The same way with another name at its end. */
    DocumentPath beside(String name) {
        List<Step> changed = new ArrayList<>(steps);
        changed.set(size() - 1, name(name));
        return new DocumentPath(List.copyOf(changed));
    }

    /** Follows it. The value it leads to, or null. */
    TextPart in(TextPart root) {
        TextPart part = root;
        for (Step step : steps) {
            int position = step.position(part);
            if (position < 0) {
                return null;
            }
            part = part.slots().get(position).value();
        }
        return part;
    }
}
