package binspan.scenario;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Finds the field that a scenario path names, in a scenario or in what a file states. */
final class PathParser {
    /**
     * One step from an object into one of its fields; {@code item} is the position in a list, {@link #ALL} or
     * {@link #SINGLE}.
     */
    record Step(Section section, Field field, int item) {}

    /** The way from the root to a field. */
    record Address(List<Step> steps) {
        Field field() {
            return steps.get(steps.size() - 1).field();
        }

        /** The way as a path, elements of lists by their index. */
        String path() {
            return steps.stream()
                    .map(step -> step.field().name() + (step.item() < 0 ? "" : "[" + step.item() + "]"))
                    .collect(Collectors.joining("."));
        }
    }

    static final int SINGLE = -1;
    static final int ALL = -2;

    private final List<Step> steps = new ArrayList<>();
    private final String path;

    private PathParser(String path) {
        this.path = path;
    }

    /**
     * Parses a path that starts at the root.
     *
     * @throws IllegalArgumentException with the nearest known names, if it leads nowhere
     */
    static Address parse(Object root, String path) {
        return parse(root, path, path);
    }

    /**
     * Parses a path that starts at the root and stands for a longer one.
     *
     * @param root scenario or what a file states
     * @param path path to follow
     * @param written path as the user wrote it, for messages
     * @throws IllegalArgumentException with the nearest known names, if it leads nowhere
     */
    static Address parse(Object root, String path, String written) {
        PathParser parser = new PathParser(written);
        parser.descend(ScenarioSections.SCENARIO, root, path);
        return new Address(List.copyOf(parser.steps));
    }

    private void descend(Section section, Object node, String rest) {
        String name = rest.split("[.\\[]", 2)[0];
        Field field = section.field(name).orElseThrow(() -> unknown(name, section));
        String tail = rest.substring(name.length());
        switch (field.kind()) {
            case LIST -> intoList(section, field, items(section, field, node), tail);
            case SECTION -> intoSection(section, field, child(section, field, node), tail);
            default -> leaf(section, field, tail);
        }
    }

    private void leaf(Section section, Field field, String tail) {
        if (!tail.isEmpty()) {
            throw new IllegalArgumentException("unknown path \"" + path + "\"; " + field.name() + " has no parts");
        }
        steps.add(new Step(section, field, SINGLE));
    }

    private void intoSection(Section section, Field field, Object child, String tail) {
        steps.add(new Step(section, field, SINGLE));
        if (tail.isEmpty()) {
            return;
        }
        if (child == null) {
            throw new IllegalArgumentException(
                    "path \"" + path + "\" leads nowhere: this scenario has no " + field.name() + " there");
        }
        descend(sectionOf(field, child), child, afterDot(tail));
    }

    private void intoList(Section section, Field field, List<?> items, String tail) {
        if (tail.isEmpty()) {
            steps.add(new Step(section, field, ALL));
            return;
        }
        if (items.isEmpty()) {
            throw new IllegalArgumentException("path \"" + path + "\" leads nowhere: " + field.name() + " is empty");
        }
        int item = tail.startsWith("[") ? index(field, items, tail) : labelled(items, tail);
        String after = item < 0
                ? tail
                : tail.startsWith("[")
                        ? tail.substring(tail.indexOf(']') + 1)
                        : tail.substring(1 + label(items, item).length());
        steps.add(new Step(section, field, item));
        if (after.isEmpty()) {
            return;
        }
        if (item == ALL && field.content().typed()) {
            throw new IllegalArgumentException("unknown path \"" + path + "\"; name one element of " + field.name()
                    + " by its label or as [0]" + nearestLabel(items));
        }
        Object node = items.get(Math.max(item, 0));
        descend(sectionOf(field, node), node, afterDot(after));
    }

    private String afterDot(String tail) {
        if (!tail.startsWith(".")) {
            throw new IllegalArgumentException(
                    "unknown path \"" + path + "\"; a dot must stand before \"" + tail + "\"");
        }
        return tail.substring(1);
    }

    private int index(Field field, List<?> items, String tail) {
        String digits = tail.substring(1, Math.max(1, tail.indexOf(']')));
        int item = digits.matches("\\d{1,6}") ? Integer.parseInt(digits) : -1;
        if (item < 0 || item >= items.size()) {
            throw new IllegalArgumentException("path \"" + path + "\" leads nowhere: " + field.name()
                    + " has elements [0] to [" + (items.size() - 1) + "]");
        }
        return item;
    }

    /** The element whose label the path names next; of several, as labels may hold dots, the longest. */
    private static int labelled(List<?> items, String tail) {
        int found = ALL;
        int longest = 0;
        for (int i = 0; i < items.size(); i++) {
            String label = label(items, i);
            if (label.length() > longest && (tail.equals("." + label) || tail.startsWith("." + label + "."))) {
                found = i;
                longest = label.length();
            }
        }
        return found;
    }

    private static String label(List<?> items, int item) {
        Object element = items.get(item);
        Optional<String> label = element instanceof Values values
                ? values.text("label")
                : element instanceof PathElement known ? known.label() : Optional.empty();
        return label.orElse("");
    }

    private static String nearestLabel(List<?> items) {
        List<String> labels = Stream.iterate(0, i -> i < items.size(), i -> i + 1)
                .map(i -> label(items, i))
                .filter(l -> !l.isEmpty())
                .toList();
        return labels.isEmpty() ? "" : "; labels: " + String.join(", ", labels);
    }

    private static Section sectionOf(Field field, Object node) {
        return node instanceof Values values
                ? field.content()
                        .section(values.type())
                        .orElseThrow(() -> new IllegalArgumentException("unknown type \"" + values.type() + "\""))
                : field.content().sectionOf((Record) node);
    }

    private static Object child(Section section, Field field, Object node) {
        if (node instanceof Values values) {
            return values.section(field.name());
        }
        Object component = section.component((Record) node, section.indexOf(field.name()));
        return component instanceof Optional<?> optional ? optional.orElse(null) : component;
    }

    private static List<?> items(Section section, Field field, Object node) {
        return node instanceof Values values
                ? values.list(field.name())
                : (List<?>) section.component((Record) node, section.indexOf(field.name()));
    }

    private IllegalArgumentException unknown(String name, Section section) {
        List<String> known = section.fields().stream().map(Field::name).toList();
        List<String> near = Nearest.to(name, known);
        String hint = near.isEmpty()
                ? "; " + section.name() + " has " + String.join(", ", known)
                : "; did you mean " + String.join(" or ", near) + "?";
        return new IllegalArgumentException(
                "unknown path \"" + path + "\": " + section.name() + " has no \"" + name + "\"" + hint);
    }
}
