package binspan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.units.ReferenceTable;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/**
 * One row of a reference table that names its inputs and expected values: {@code name=value; name=value}, several numbers of
 * one name apart by blanks, rows of numbers apart by slashes.
 *
 * <p>The tolerance is {@code rel 1e-6}, {@code abs 0.01}, {@code exact} (twelve digits) or one of these for each name;
 * {@code printed} allows nothing. A test checks every expected value and then calls {@link #finish}, so that none is
 * passed over.
 */
public final class ReferenceCase {
    private static final double EXACT = 1e-12;

    private final ReferenceTable.Row row;
    private final Map<String, String> inputs;
    private final Map<String, String> expected;
    private final Set<String> checked = new LinkedHashSet<>();

    private ReferenceCase(ReferenceTable.Row row) {
        this.row = row;
        this.inputs = pairs(row.text("inputs"));
        this.expected = pairs(row.text("expected"));
    }

    /** The rows of a table. */
    public static Stream<ReferenceCase> of(String file) {
        return ReferenceTable.rows(file).map(ReferenceCase::new);
    }

    /** Name of the row. */
    public String id() {
        return row.text("id");
    }

    /** Whether the name of the row starts so. */
    public boolean isLike(String prefix) {
        return id().startsWith(prefix);
    }

    /** An input. */
    public double in(String name) {
        return Double.parseDouble(inputs.get(name));
    }

    /** Rows of numbers of an input. */
    public double[][] table(String name) {
        return Arrays.stream(inputs.get(name).split("/", -1))
                .map(ReferenceCase::numbers)
                .toArray(double[][]::new);
    }

    /** An expected value. */
    public double expected(String name) {
        return Double.parseDouble(expected.get(name));
    }

    /** Names of all expected values. */
    public Set<String> names() {
        return expected.keySet();
    }

    /** Several expected values of one name, as printed. */
    public double[] printed(String name) {
        checked.add(name);
        return numbers(expected.get(name));
    }

    /** Holds a result against the expected value of the name. */
    public void check(String name, double found) {
        check(name, new double[] {found});
    }

    /** Holds results against the expected values of the name. */
    public void check(String name, double... found) {
        double[] wanted = printed(name);
        assertThat(found).as("%s, %s", id(), name).hasSameSizeAs(wanted);
        for (int i = 0; i < wanted.length; i++) {
            assertThat(found[i])
                    .as("%s, %s (%s)", id(), name, row.text("source"))
                    .isCloseTo(wanted[i], within(tolerance(name, wanted[i])));
        }
    }

    /** Holds a statement against the expected one of the name. */
    public void check(String name, boolean found) {
        checked.add(name);
        assertThat(found)
                .as("%s, %s (%s)", id(), name, row.text("source"))
                .isEqualTo(Boolean.parseBoolean(expected.get(name)));
    }

    /** Fails if an expected value has not been looked at. */
    public void finish() {
        assertThat(checked).as("%s: values checked", id()).containsExactlyInAnyOrderElementsOf(expected.keySet());
    }

    @Override
    public String toString() {
        return id();
    }

    private double tolerance(String name, double wanted) {
        for (String part : row.text("tolerance").split("; ", -1)) {
            int colon = part.indexOf(": ");
            if (colon < 0 || part.substring(0, colon).equals(name)) {
                return size(part.substring(colon < 0 ? 0 : colon + 2), wanted);
            }
        }
        throw new IllegalStateException(id() + ": no tolerance for " + name);
    }

    private static double size(String text, double wanted) {
        String[] words = text.split(" ", -1);
        return switch (words[0]) {
            case "rel" -> Double.parseDouble(words[1]) * Math.abs(wanted);
            case "abs" -> Double.parseDouble(words[1]);
            case "exact" -> EXACT * Math.abs(wanted);
            case "printed" -> 0.0;
            default -> throw new IllegalStateException(text);
        };
    }

    private static Map<String, String> pairs(String text) {
        Map<String, String> pairs = new LinkedHashMap<>();
        for (String part : text.split(";", -1)) {
            int equal = part.indexOf('=');
            if (equal > 0) {
                pairs.put(
                        part.substring(0, equal).strip(),
                        part.substring(equal + 1).strip());
            }
        }
        return pairs;
    }

    private static double[] numbers(String text) {
        return Arrays.stream(text.strip().split(" +", -1))
                .mapToDouble(Double::parseDouble)
                .toArray();
    }
}
