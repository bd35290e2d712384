package binspan.planner.document;

import binspan.planner.document.TextPart.Slot;
import binspan.planner.document.TextSurgery.Piece;
import binspan.planner.io.JsonText;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.IntUnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * How the keys of spreads and provenance follow an edit of one list: those by position are counted anew, those by label
 * take the new label, those of a deleted element go. A key of both arms becomes one of each where only one arm changes.
 */
final class EntryKeys {
    static final int DELETED = -1;

    private static final List<String> ENTRIES = List.of("spread", "provenance");
    private static final List<String> ARMS = List.of("alice", "bob");
    private static final String BOTH = "both.";
    private static final String CHANNELS = "classicalChannels";
    private static final Pattern POSITION = Pattern.compile("\\[([0-9]{1,6})\\](.*)", Pattern.DOTALL);

    private final String list;
    private final List<String> labels;
    private final Elements elements;

    /** What becomes of the elements that keys name. */
    @FunctionalInterface
    private interface Elements {
        /**
         * The rest of a key behind the name of the list.
         *
         * @param element position that the key names, -1 if it names all
         * @param named how it names the element: the position in brackets, or a dot and the label
         * @param rest what follows
         * @return the new rest, null if the entry goes
         */
        String renamed(int element, String named, String rest);
    }

    private EntryKeys(String list, List<String> labels, Elements elements) {
        this.list = list;
        this.labels = labels;
        this.elements = elements;
    }

    /** The keys after elements of a list have moved. */
    static Optional<EntryKeys> ofEdit(DocumentText before, DocumentPath path, IntUnaryOperator moved) {
        TextPart part = path.in(before.root());
        int size = part.slots().size();
        if (path.size() == 2) {
            List<String> labels = before.labels(part);
            return Optional.of(
                    new EntryKeys(name(path), labels, (k, named, rest) -> moved(k, named, rest, size, moved)));
        }
        if (path.size() != 4 || !path.last().name().equals(CHANNELS)) {
            return Optional.empty();
        }
        DocumentPath elements = path.before(2);
        int element = path.step(2).item();
        String inside = "." + CHANNELS;
        EntryKeys channels = new EntryKeys("", List.of(), (k, named, rest) -> moved(k, named, rest, size, moved));
        return Optional.of(new EntryKeys(
                name(elements),
                before.labels(elements.in(before.root())),
                (k, named, rest) -> k == element && (rest + ".").matches("\\.classicalChannels[.\\[](?s:.*)")
                        ? prefixed(named + inside, channels.behindList(rest.substring(inside.length())))
                        : named + rest));
    }

    private static String moved(int element, String named, String rest, int size, IntUnaryOperator moved) {
        if (element < 0 || element >= size) {
            boolean emptied = size == 1 && moved.applyAsInt(0) == DELETED && !rest.isEmpty();
            return emptied ? null : named + rest;
        }
        int now = moved.applyAsInt(element);
        if (now == DELETED) {
            return null;
        }
        return named.startsWith("[") ? "[" + now + "]" + rest : named + rest;
    }

    /** The keys after labels have changed, one for each changed label. */
    static List<EntryKeys> ofLabels(DocumentText before, DocumentText after) {
        List<EntryKeys> changed = new ArrayList<>();
        for (String arm : ARMS) {
            List<String> old = labels(before, arm);
            List<String> now = labels(after, arm);
            for (int i = 0; i < old.size() && old.size() == now.size(); i++) {
                if (!old.get(i).isEmpty() && !old.get(i).equals(now.get(i))) {
                    changed.add(relabelled(arm, old, i, now.get(i)));
                }
            }
        }
        return changed;
    }

    private static EntryKeys relabelled(String arm, List<String> old, int element, String label) {
        String now = label.isEmpty() ? "[" + element + "]" : "." + label;
        return new EntryKeys(
                arm + ".path", old, (k, named, rest) -> (k == element && named.startsWith(".") ? now : named) + rest);
    }

    private static List<String> labels(DocumentText document, String arm) {
        TextPart site = document.root().member(arm);
        TextPart path = site == null ? null : site.member("path");
        return path == null ? List.of() : document.labels(path);
    }

    private static String name(DocumentPath list) {
        return list.step(0).name() + "." + list.step(1).name();
    }

    private static String prefixed(String prefix, String rest) {
        return rest == null ? null : prefix + rest;
    }

    /** The text with its keys changed. */
    String follow(String text) {
        String changed = text;
        for (String entries : ENTRIES) {
            changed = follow(changed, entries);
        }
        return changed;
    }

    private String follow(String text, String entries) {
        ScannedText scanned = TextScanner.scan(text);
        TextPart part = scanned.root().member(entries);
        if (part == null) {
            return text;
        }
        List<List<String>> keys = keys(part);
        TextSplices names = new TextSplices();
        for (int i = 0; i < keys.size(); i++) {
            Slot slot = part.slots().get(i);
            if (!keys.get(i).isEmpty() && !keys.get(i).get(0).equals(slot.name())) {
                names.replace(
                        slot.start(), slot.nameEnd(), JsonText.of(keys.get(i).get(0)));
            }
        }
        String changed = names.applied(text);
        for (int i = keys.size() - 1; i >= 0; i--) {
            String value = scanned.of(part.slots().get(i).value());
            changed = counted(changed, entries, i, keys.get(i), value);
        }
        return changed;
    }

    /** What the keys become; no key comes twice, one that stays goes first. */
    private List<List<String>> keys(TextPart entries) {
        List<List<String>> keys = new ArrayList<>();
        Set<String> taken = new HashSet<>();
        for (Slot slot : entries.slots()) {
            keys.add(renamed(slot.name()));
            if (keys.get(keys.size() - 1).contains(slot.name())) {
                taken.add(slot.name());
            }
        }
        for (int i = 0; i < keys.size(); i++) {
            String before = entries.slots().get(i).name();
            keys.get(i).removeIf(key -> !key.equals(before) && !taken.add(key));
        }
        return keys;
    }

    /** The text without an entry that has no key left, or with one more for each further key. */
    private static String counted(String text, String entries, int position, List<String> keys, String value) {
        ScannedText scanned = TextScanner.scan(text);
        TextSurgery surgery = new TextSurgery(scanned);
        if (keys.isEmpty()) {
            return surgery.without(scanned.root().member(entries), position);
        }
        if (keys.size() == 1) {
            return text;
        }
        Piece second = Piece.of(JsonText.of(keys.get(1)) + ": " + value);
        return surgery.with(scanned.root().member(entries), position + 1, second);
    }

    /** What a key becomes: itself, another, one for each arm, or none. */
    private List<String> renamed(String key) {
        List<String> keys = new ArrayList<>();
        if (!key.startsWith(BOTH)) {
            add(single(key), keys);
            return keys;
        }
        String rest = key.substring(BOTH.length());
        List<String> arms = new ArrayList<>();
        for (String arm : ARMS) {
            arms.add(arm + "." + rest);
            add(single(arm + "." + rest), keys);
        }
        return keys.equals(arms) ? new ArrayList<>(List.of(key)) : keys;
    }

    private static void add(String key, List<String> keys) {
        if (key != null) {
            keys.add(key);
        }
    }

    /** What the key of one arm becomes, null if it goes. */
    private String single(String key) {
        return key.startsWith(list + ".") || key.startsWith(list + "[")
                ? prefixed(list, behindList(key.substring(list.length())))
                : key;
    }

    private String behindList(String behind) {
        Matcher position = POSITION.matcher(behind);
        if (position.matches()) {
            String digits = position.group(1);
            return elements.renamed(Integer.parseInt(digits), "[" + digits + "]", position.group(2));
        }
        int found = -1;
        for (int i = 0; i < labels.size(); i++) {
            String label = labels.get(i);
            boolean named = !label.isEmpty() && (behind + ".").startsWith("." + label + ".");
            if (named && (found < 0 || label.length() > labels.get(found).length())) {
                found = i;
            }
        }
        String named = found < 0 ? "" : "." + labels.get(found);
        return elements.renamed(found, named, behind.substring(named.length()));
    }
}
