package binspan.planner.viewmodel;

import java.lang.reflect.RecordComponent;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/** Whether two descriptions are the same but for the last digits of their numbers, which scaling there and back leaves. */
final class Alike {
    private static final double ROUNDING = 1e-9;

    private Alike() {}

    /** Compares records, lists, optional values and numbers part by part, everything else as a whole. */
    static boolean are(Object one, Object other) {
        if (one == other) {
            return true;
        }
        if (one instanceof Double a && other instanceof Double b) {
            return near(a, b);
        }
        if (one instanceof OptionalDouble a && other instanceof OptionalDouble b) {
            return near(a.orElse(Double.NaN), b.orElse(Double.NaN));
        }
        if (one instanceof Optional<?> a && other instanceof Optional<?> b) {
            return are(a.orElse(null), b.orElse(null));
        }
        if (one instanceof List<?> a && other instanceof List<?> b) {
            return a.size() == b.size() && IntStream.range(0, a.size()).allMatch(i -> are(a.get(i), b.get(i)));
        }
        if (one instanceof Record a && other instanceof Record b && a.getClass() == b.getClass()) {
            return Stream.of(a.getClass().getRecordComponents()).allMatch(part -> are(value(part, a), value(part, b)));
        }
        return Objects.equals(one, other);
    }

    private static boolean near(double one, double other) {
        return Double.compare(one, other) == 0
                || Math.abs(one - other) <= ROUNDING * Math.max(Math.abs(one), Math.abs(other));
    }

    private static Object value(RecordComponent part, Record record) {
        try {
            return part.getAccessor().invoke(record);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException(part.getName(), e);
        }
    }
}
