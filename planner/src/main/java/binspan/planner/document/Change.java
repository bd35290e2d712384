package binspan.planner.document;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** One change of a scenario document. Paths name list elements by their position, as in {@code alice.path[2].lengthKm}. */
public sealed interface Change {
    /**
     * States a value, in place of the present one or as a new field; missing objects around it are made, and fields that
     * it excludes are removed.
     *
     * @param path scenario path
     * @param value number, text, flag, or a tree of maps and lists of them
     */
    record Put(String path, Object value) implements Change {}

    /**
     * Removes a field, so that its default stands; one that is not stated stays as it is.
     *
     * @param path scenario path
     */
    record Remove(String path) implements Change {}

    /**
     * Adds an element to a list; a list that is missing is made.
     *
     * @param listPath scenario path of the list
     * @param index its position afterwards
     * @param element its fields
     */
    record Insert(String listPath, int index, Map<String, Object> element) implements Change {
        /** Keeps a copy of the fields in their order. */
        public Insert {
            element = Collections.unmodifiableMap(new LinkedHashMap<>(element));
        }
    }

    /**
     * Deletes an element of a list.
     *
     * @param listPath scenario path of the list
     * @param index its position
     */
    record Delete(String listPath, int index) implements Change {}

    /**
     * Moves an element within its list.
     *
     * @param listPath scenario path of the list
     * @param from its position before
     * @param to its position afterwards
     */
    record Move(String listPath, int from, int to) implements Change {}
}
