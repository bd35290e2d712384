package binspan.scenario;

import java.util.Arrays;
import java.util.List;

/** A value that the scenario file names by a fixed word. */
public interface Choice {
    /** The word in the scenario file. */
    String text();

    /** The words of an enumeration in their order. */
    static <E extends Enum<E> & Choice> List<String> texts(Class<E> type) {
        return Arrays.stream(type.getEnumConstants()).map(Choice::text).toList();
    }
}
