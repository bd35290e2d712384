package binspan.planner.io;

import binspan.planner.io.Node.ListNode;
import binspan.planner.io.Node.Member;
import binspan.planner.io.Node.ObjectNode;
import binspan.planner.io.Node.TextNode;
import binspan.planner.io.ScalarReader.Reading;
import binspan.scenario.Content;
import binspan.scenario.Field;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Walks the tree of a file against the parameter registry and collects what it states. A value that is not allowed is
 * one finding; something that keeps it from being missed stands in its place.
 */
final class ScenarioWalk {
    /** Names the schema of the file for editors; means nothing here. */
    private static final String SCHEMA = "$schema";

    private static final String NO_TYPE = "?";

    private final Findings findings;

    ScenarioWalk(Findings findings) {
        this.findings = findings;
    }

    /** What a whole file states. */
    Values scenario(ObjectNode root) {
        return section(ScenarioSections.SCENARIO, root, "", new Values());
    }

    private Values section(Section section, ObjectNode object, String path, Values values) {
        Map<String, Place> earlier = new HashMap<>();
        for (Member member : object.members()) {
            String at = path.isEmpty() ? member.name() : path + "." + member.name();
            if (!isRepeated(member, earlier, at) && !isMark(member, values, path)) {
                member(section, object, member, at, values);
            }
        }
        return values;
    }

    /** Whether a field stands a second time, which is reported here; the first one counts. */
    private boolean isRepeated(Member member, Map<String, Place> earlier, String path) {
        Place first = earlier.putIfAbsent(member.name(), member.place());
        if (first != null) {
            String message = "found a second time, first at " + first + "; allowed once";
            findings.add(new Finding(member.place(), path, message));
        }
        return first != null;
    }

    /** Whether a member only says what the object or the file is. */
    private boolean isMark(Member member, Values values, String path) {
        if (member.name().equals(SCHEMA) && path.isEmpty()) {
            Reading reading = ScalarReader.text(member.value(), "a text");
            report(reading, member.value(), SCHEMA);
            return true;
        }
        return member.name().equals(Content.TYPE) && !values.type().isEmpty();
    }

    private void member(Section section, ObjectNode object, Member member, String path, Values values) {
        Field field = section.field(member.name()).orElse(null);
        if (field == null) {
            field = meant(section, object, member, path);
        }
        if (field != null) {
            Object value = value(field, member.value(), path);
            if (value != null) {
                values.put(field.name(), value);
            }
        }
    }

    /** Reports an unknown field; the one that it most likely means, unless the object has that one too. */
    private Field meant(Section section, ObjectNode object, Member member, String path) {
        List<String> known = new ArrayList<>();
        for (Field field : section.fields()) {
            known.add(field.name());
        }
        String near = ScalarReader.nearest(member.name(), known);
        String hint = near == null ? "; allowed " + String.join(", ", known) : "; did you mean " + near + "?";
        findings.add(member.place(), path, "unknown field" + hint);
        if (near == null || object.member(near) != null) {
            return null;
        }
        findings.settle(path.substring(0, path.length() - member.name().length()) + near);
        return section.field(near).orElseThrow();
    }

    private Object value(Field field, Node node, String path) {
        return switch (field.kind()) {
            case SECTION -> object(field.content(), node, path);
            case LIST -> list(field, node, path);
            case ENTRIES -> entries(field, node, path);
            default -> report(ScalarReader.read(field, node), node, path);
        };
    }

    private Object report(Reading reading, Node node, String path) {
        if (reading.error() != null) {
            findings.add(node.place(), path, reading.error());
        }
        return reading.value();
    }

    private void mistyped(Node node, String path, String allowed) {
        findings.add(node.place(), path, "found " + node.found() + "; allowed " + allowed);
        findings.incomplete();
    }

    /** Reads an object; one that cannot be read gives an empty object, whose gaps are no further errors. */
    private Values object(Content content, Node node, String path) {
        if (!(node instanceof ObjectNode object)) {
            mistyped(node, path, "an object");
            return new Values(anyType(content));
        }
        String type = content.typed() ? type(content, object, path) : "";
        Optional<Section> section = content.section(type);
        return section.isPresent()
                ? section(section.get(), object, path, new Values(type))
                : new Values(anyType(content));
    }

    private static String anyType(Content content) {
        return content.byType().keySet().iterator().next();
    }

    /** The type of an object, or the one most likely meant, or a text that is no type. */
    private String type(Content content, ObjectNode object, String path) {
        List<String> known = List.copyOf(content.byType().keySet());
        Member member = object.member(Content.TYPE);
        if (member == null) {
            findings.add(
                    object.place(), path + "." + Content.TYPE, "missing; needs one of " + String.join(" | ", known));
            return unreadable(path);
        }
        if (member.value() instanceof TextNode text
                && content.section(text.text()).isPresent()) {
            return text.text();
        }
        return unknownType(member, known, path);
    }

    private String unknownType(Member member, List<String> known, String path) {
        String near = member.value() instanceof TextNode text ? ScalarReader.nearest(text.text(), known) : null;
        String hint = near == null ? "" : "; did you mean \"" + near + "\"?";
        mistyped(member.value(), path + "." + Content.TYPE, String.join(" | ", known) + hint);
        return near == null ? unreadable(path) : near;
    }

    private String unreadable(String path) {
        findings.settle(path);
        findings.incomplete();
        return NO_TYPE;
    }

    private List<Values> list(Field field, Node node, String path) {
        if (!(node instanceof ListNode list)) {
            mistyped(node, path, field.allowed());
            return List.of();
        }
        int size = list.items().size();
        if (!field.range().contains(size)) {
            String message = "found a list of " + size + "; allowed " + field.allowed();
            findings.add(new Finding(node.place(), path, message));
            findings.incomplete();
        }
        List<Values> items = new ArrayList<>();
        for (int i = 0; i < Math.min(size, field.range().highest()); i++) {
            items.add(object(field.content(), list.items().get(i), path + "[" + i + "]"));
        }
        return items;
    }

    private Map<String, Object> entries(Field field, Node node, String path) {
        if (!(node instanceof ObjectNode object)) {
            findings.add(
                    node.place(),
                    path,
                    "found " + node.found() + "; allowed " + field.kind().words());
            return Map.of();
        }
        Map<String, Object> entries = new LinkedHashMap<>();
        Map<String, Place> earlier = new HashMap<>();
        for (Member member : object.members()) {
            String at = path + "." + member.name();
            Object value = isRepeated(member, earlier, at) ? null : entry(field.content(), member.value(), at);
            if (value != null) {
                entries.put(member.name(), value);
            }
        }
        return entries;
    }

    private Object entry(Content content, Node node, String path) {
        return content.byType().isEmpty()
                ? report(ScalarReader.text(node, "a text"), node, path)
                : object(content, node, path);
    }
}
