package binspan.planner.io;

import java.util.List;

/** A value of a JSON file that knows where it stands. */
sealed interface Node {
    /** Where the value begins. */
    Place place();

    /** The value as a message names it. */
    String found();

    /**
     * One field of an object.
     *
     * @param name its name
     * @param place where the name begins
     * @param value its value
     */
    record Member(String name, Place place, Node value) {}

    /** An object, its fields in the order of the file, repeated ones included. */
    record ObjectNode(Place place, List<Member> members) implements Node {
        @Override
        public String found() {
            return "an object";
        }

        /** The first field of a name, or null. */
        Member member(String name) {
            for (Member member : members) {
                if (member.name().equals(name)) {
                    return member;
                }
            }
            return null;
        }
    }

    /** A list. */
    record ListNode(Place place, List<Node> items) implements Node {
        @Override
        public String found() {
            return "a list";
        }
    }

    /** A number with its spelling; not finite where the file says so or exceeds what a number can hold. */
    record NumberNode(Place place, String spelling, double value) implements Node {
        @Override
        public String found() {
            return Printable.shortened(spelling);
        }
    }

    /** A text. */
    record TextNode(Place place, String text) implements Node {
        @Override
        public String found() {
            return Printable.quoted(text);
        }
    }

    /** One of the words true, false and null. */
    record WordNode(Place place, String word) implements Node {
        @Override
        public String found() {
            return word;
        }
    }
}
