package binspan.planner.document;

import binspan.planner.document.DocumentPath.Step;
import binspan.planner.document.TextSurgery.Piece;
import binspan.planner.io.JsonText;
import binspan.scenario.Field;
import binspan.scenario.Section;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntUnaryOperator;

/** Writes changes into the text of a document, one after the other. Whether the result is a valid scenario is for others to say. */
final class ChangeWriter {
    private String text;

    private ChangeWriter(String text) {
        this.text = text;
    }

    /**
     * The text with some changes made.
     *
     * @throws RefusedEditException if a path leads nowhere
     */
    static String written(String text, List<Change> changes) throws RefusedEditException {
        ChangeWriter writer = new ChangeWriter(text);
        for (Change change : changes) {
            writer.write(change);
        }
        return writer.text;
    }

    private void write(Change change) throws RefusedEditException {
        if (change instanceof Change.Put put) {
            put(put);
        } else if (change instanceof Change.Remove remove) {
            remove(remove);
        } else if (change instanceof Change.Insert insert) {
            insert(insert);
        } else if (change instanceof Change.Delete delete) {
            delete(delete);
        } else if (change instanceof Change.Move move) {
            move(move);
        }
    }

    private void put(Change.Put put) throws RefusedEditException {
        DocumentText before = new DocumentText(text);
        DocumentPath path = DocumentPath.of(put.path(), before.root());
        removeExcluded(path);
        DocumentText document = new DocumentText(text);
        try {
            text = put(document, path, put);
        } catch (IllegalArgumentException e) {
            throw new RefusedEditException(put.path(), e.getMessage());
        }
        followLabels(before);
    }

    private static String put(DocumentText document, DocumentPath path, Change.Put put) throws RefusedEditException {
        ScannedText scanned = document.scanned();
        TextSurgery surgery = new TextSurgery(scanned);
        Written written = new Written(scanned.lineBreak(0));
        TextPart present = path.in(document.root());
        if (present != null) {
            return surgery.replaced(present, written.value(put.value(), scanned.indentation(present.start())));
        }
        int known = path.size() - 1;
        while (path.before(known).in(document.root()) == null) {
            known--;
        }
        TextPart object = path.before(known).in(document.root());
        if (!document.isObject(object) || !path.steps().stream().skip(known).allMatch(Step::named)) {
            throw nowhere(put.path());
        }
        Object value = wrapped(document, path, known, put.value());
        String indentation = memberIndentation(scanned, object);
        boolean entries = document.field(path.before(known + 1))
                .filter(field -> field.kind() == Field.Kind.ENTRIES)
                .isPresent();
        String name = path.step(known).name();
        String core = entries && value instanceof Map<?, ?>
                ? JsonText.of(name) + ": " + written.lines(value, indentation)
                : written.member(name, value, indentation);
        return surgery.with(object, object.slots().size(), Piece.of(core));
    }

    private static String memberIndentation(ScannedText scanned, TextPart object) {
        return object.slots().isEmpty()
                ? scanned.indentation(object.start()) + "  "
                : scanned.indentation(
                        object.slots().get(object.slots().size() - 1).start());
    }

    /** A value inside the objects that are missing around it, with what these must state besides. */
    private static Object wrapped(DocumentText document, DocumentPath path, int known, Object value) {
        Object wrapped = value;
        for (int i = path.size() - 1; i > known; i--) {
            Map<String, Object> object = i == known + 1 ? implied(document, path.before(i)) : new LinkedHashMap<>();
            object.put(path.step(i).name(), wrapped);
            wrapped = object;
        }
        return wrapped;
    }

    /** What stands for an object that is left out, such as the gate of a detector class. */
    private static Map<String, Object> implied(DocumentText document, DocumentPath path) {
        DocumentPath parent = path.before(path.size() - 1);
        Section section = document.section(parent).orElse(null);
        Field field = document.field(path).orElse(null);
        if (section != null && field != null && field.kind() == Field.Kind.SECTION) {
            Map<String, Object> stated = document.stated(section, parent.in(document.root()));
            if (field.byDefault().given(stated) instanceof Record element) {
                return StatedFields.of(field.content(), element);
            }
        }
        return new LinkedHashMap<>();
    }

    /** Removes what a field, or an object around it, excludes. */
    private void removeExcluded(DocumentPath path) {
        for (int i = 1; i <= path.size(); i++) {
            DocumentPath part = path.before(i);
            if (part.last().named()) {
                Section section =
                        new DocumentText(text).section(part.before(i - 1)).orElse(null);
                if (section != null) {
                    removeOthers(section, part);
                }
            }
        }
    }

    private void removeOthers(Section section, DocumentPath path) {
        for (Section.Alternatives group : section.alternatives()) {
            if (group.fields().contains(path.last().name())) {
                for (String other : group.fields()) {
                    if (!other.equals(path.last().name())) {
                        remove(path.beside(other));
                    }
                }
            }
        }
    }

    private void remove(Change.Remove remove) throws RefusedEditException {
        DocumentText before = new DocumentText(text);
        DocumentPath path = DocumentPath.of(remove.path(), before.root());
        if (!path.last().named()) {
            throw nowhere(remove.path());
        }
        remove(path);
        followLabels(before);
    }

    private void remove(DocumentPath path) {
        DocumentText document = new DocumentText(text);
        TextPart object = path.before(path.size() - 1).in(document.root());
        int position = object == null ? -1 : path.last().position(object);
        if (position >= 0) {
            text = new TextSurgery(document.scanned()).without(object, position);
        }
    }

    private void insert(Change.Insert insert) throws RefusedEditException {
        DocumentText document = new DocumentText(text);
        DocumentPath path = DocumentPath.of(insert.listPath(), document.root());
        TextPart list = path.in(document.root());
        if (list == null && insert.index() == 0) {
            put(new Change.Put(insert.listPath(), List.of(insert.element())));
            return;
        }
        checkList(document, list, insert.listPath());
        checkPosition(insert.listPath(), insert.index(), list.slots().size());
        Written written = new Written(document.scanned().lineBreak(list.start()));
        try {
            String core = written.value(insert.element(), memberIndentation(document.scanned(), list));
            text = new TextSurgery(document.scanned()).with(list, insert.index(), Piece.of(core));
        } catch (IllegalArgumentException e) {
            throw new RefusedEditException(insert.listPath(), e.getMessage());
        }
        follow(document, path, i -> i < insert.index() ? i : i + 1);
    }

    private void delete(Change.Delete delete) throws RefusedEditException {
        DocumentText document = new DocumentText(text);
        DocumentPath path = DocumentPath.of(delete.listPath(), document.root());
        TextPart list = path.in(document.root());
        checkList(document, list, delete.listPath());
        int index = delete.index();
        checkPosition(delete.listPath(), index, list.slots().size() - 1);
        text = new TextSurgery(document.scanned()).without(list, index);
        follow(document, path, i -> i == index ? EntryKeys.DELETED : i < index ? i : i - 1);
    }

    private void move(Change.Move move) throws RefusedEditException {
        DocumentText document = new DocumentText(text);
        DocumentPath path = DocumentPath.of(move.listPath(), document.root());
        TextPart list = path.in(document.root());
        checkList(document, list, move.listPath());
        checkPosition(move.listPath(), move.from(), list.slots().size() - 1);
        checkPosition(move.listPath(), move.to(), list.slots().size() - 1);
        if (move.from() == move.to()) {
            return;
        }
        TextSurgery surgery = new TextSurgery(document.scanned());
        Piece piece = surgery.piece(list.slots().get(move.from()));
        ScannedText without = TextScanner.scan(surgery.without(list, move.from()));
        text = new TextSurgery(without).with(path.in(without.root()), move.to(), piece);
        follow(document, path, i -> moved(i, move.from(), move.to()));
    }

    private static int moved(int position, int from, int to) {
        if (position == from) {
            return to;
        }
        int removed = position < from ? position : position - 1;
        return removed < to ? removed : removed + 1;
    }

    private static void checkList(DocumentText document, TextPart list, String path) throws RefusedEditException {
        if (list == null || !document.isList(list)) {
            throw nowhere(path);
        }
    }

    private static void checkPosition(String path, int index, int highest) throws RefusedEditException {
        if (index < 0 || index > highest) {
            throw new RefusedEditException(
                    path, "found position " + index + "; allowed " + (highest < 0 ? "none" : "0 to " + highest));
        }
    }

    private static RefusedEditException nowhere(String path) {
        return new RefusedEditException(path, "leads nowhere");
    }

    private void follow(DocumentText before, DocumentPath list, IntUnaryOperator moved) throws RefusedEditException {
        EntryKeys.ofEdit(before, list, moved).ifPresent(this::rename);
    }

    private void followLabels(DocumentText before) throws RefusedEditException {
        for (EntryKeys keys : EntryKeys.ofLabels(before, new DocumentText(text))) {
            rename(keys);
        }
    }

    private void rename(EntryKeys keys) {
        text = keys.follow(text);
    }
}
