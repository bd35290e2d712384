package binspan.planner.io;

import binspan.planner.io.Node.ListNode;
import binspan.planner.io.Node.Member;
import binspan.planner.io.Node.ObjectNode;

/** Finds where in a file a scenario path leads. */
final class Locator {
    private Locator() {}

    /**
     * Where the field of a path stands: its name, or the start of the nearest object or list around it that exists.
     *
     * @param root whole file
     * @param path scenario path with list positions in brackets
     */
    static Place place(Node root, String path) {
        return place(root, path, root.place());
    }

    private static Place place(Node node, String rest, Place reached) {
        if (rest.isEmpty()) {
            return reached;
        }
        if (node instanceof ObjectNode object) {
            Member member = longestMatch(object, rest);
            return member == null
                    ? object.place()
                    : place(member.value(), tail(rest, member.name().length()), member.place());
        }
        int end = rest.indexOf(']');
        if (node instanceof ListNode list && rest.charAt(0) == '[' && end > 0) {
            Node item = list.items().get(Integer.parseInt(rest.substring(1, end)));
            return place(item, tail(rest, end + 1), item.place());
        }
        return reached;
    }

    /** The path behind a step, without the dot that joins them. */
    private static String tail(String path, int length) {
        return path.startsWith(".", length) ? path.substring(length + 1) : path.substring(length);
    }

    /** Names may hold dots themselves: the longest that the path begins with is meant. */
    private static Member longestMatch(ObjectNode object, String path) {
        Member best = null;
        for (Member member : object.members()) {
            boolean longer =
                    best == null || member.name().length() > best.name().length();
            if (longer && begins(path, member.name())) {
                best = member;
            }
        }
        return best;
    }

    private static boolean begins(String path, String name) {
        int length = name.length();
        return path.startsWith(name)
                && (path.length() == length || path.charAt(length) == '.' || path.charAt(length) == '[');
    }
}
