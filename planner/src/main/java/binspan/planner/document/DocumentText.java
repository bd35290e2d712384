package binspan.planner.document;

import binspan.planner.document.DocumentPath.Step;
import binspan.planner.document.TextPart.Slot;
import binspan.scenario.Content;
import binspan.scenario.Field;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The text of a document with what the registry says about its objects. */
final class DocumentText {
    private final ScannedText scanned;

    DocumentText(String text) {
        scanned = TextScanner.scan(text);
    }

    ScannedText scanned() {
        return scanned;
    }

    TextPart root() {
        return scanned.root();
    }

    boolean isObject(TextPart part) {
        return scanned.text().charAt(part.start()) == '{';
    }

    boolean isList(TextPart part) {
        return scanned.text().charAt(part.start()) == '[';
    }

    /** The text that a member holds, empty if it is missing or something else. */
    String text(TextPart object, String name) {
        TextPart value = object.member(name);
        boolean quoted = value != null && scanned.text().charAt(value.start()) == '"';
        return quoted ? TextScanner.unquoted(scanned.of(value)) : "";
    }

    /** The labels of the elements of a list, empty for those without. */
    List<String> labels(TextPart list) {
        List<String> labels = new ArrayList<>();
        for (Slot slot : list.slots()) {
            labels.add(text(slot.value(), "label"));
        }
        return labels;
    }

    /** The registry's entry for the last step of a path, absent for names that it does not know. */
    Optional<Field> field(DocumentPath path) {
        return path.last().named()
                ? section(path.before(path.size() - 1))
                        .flatMap(section -> section.field(path.last().name()))
                : Optional.empty();
    }

    /** The section of the object at a path, existing or not. */
    Optional<Section> section(DocumentPath path) {
        Section section = ScenarioSections.SCENARIO;
        TextPart part = root();
        Content content = null;
        for (Step step : path.steps()) {
            part = part == null || step.position(part) < 0
                    ? null
                    : part.slots().get(step.position(part)).value();
            if (section != null) {
                Field field = section.field(step.name()).orElse(null);
                if (field == null) {
                    return Optional.empty();
                }
                content = field.content();
                section =
                        field.kind() == Field.Kind.SECTION ? content.section("").orElse(null) : null;
            } else if (content != null && part != null) {
                section = content.section(content.typed() ? text(part, Content.TYPE) : "")
                        .orElse(null);
            }
        }
        return Optional.ofNullable(section);
    }

    /**
     * What an object states, as far as defaults depend on it.
     *
     * @param section its section
     * @param object the object
     */
    Map<String, Object> stated(Section section, TextPart object) {
        Map<String, Object> stated = new HashMap<>();
        for (Slot slot : object.slots()) {
            Field field = section.field(slot.name()).orElse(null);
            if (field != null && field.kind() == Field.Kind.CHOICE) {
                String word = text(object, slot.name());
                field.choices().stream()
                        .filter(choice -> choice.text().equals(word))
                        .forEach(choice -> stated.put(slot.name(), choice));
            } else {
                stated.put(slot.name(), scanned.of(slot.value()));
            }
        }
        return stated;
    }
}
