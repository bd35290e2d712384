package binspan.planner.document;

import java.util.List;

/**
 * A value in a JSON text.
 *
 * @param start offset of its first character
 * @param end offset behind its last
 * @param slots members of an object or items of a list, in their order; none for anything else
 */
record TextPart(int start, int end, List<Slot> slots) {
    /**
     * A member of an object or an item of a list.
     *
     * @param name name of a member, empty for an item
     * @param start offset where it begins
     * @param nameEnd offset behind its name in quotes, the start for an item
     * @param value its value
     * @param comma offset of the comma behind it, -1 for the last
     */
    record Slot(String name, int start, int nameEnd, TextPart value, int comma) {
        int end() {
            return value.end();
        }
    }

    /** Position of a member, -1 if there is none of that name. */
    int position(String name) {
        for (int i = 0; i < slots.size(); i++) {
            if (slots.get(i).name().equals(name)) {
                return i;
            }
        }
        return -1;
    }

    /** The value of a member, or null. */
    TextPart member(String name) {
        int position = position(name);
        return position < 0 ? null : slots.get(position).value();
    }
}
