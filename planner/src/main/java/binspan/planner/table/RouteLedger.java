package binspan.planner.table;

import binspan.prediction.FiniteKeyOutlook;
import binspan.scenario.Parameter;
import binspan.study.FigureColumn;
import binspan.study.comparison.RouteSurvey;
import java.io.BufferedOutputStream;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.Closeable;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.RandomAccessFile;
import java.nio.ByteBuffer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * The verdicts on many routes, kept in a temporary file so that their number does not matter; in memory stand three numbers for each. They come out
 * ranked by the least margin, where it is the same by the key.
 */
public final class RouteLedger implements Closeable {
    private static final int FIRST_CAPACITY = 1024;

    /** Least margins that differ by less are taken as equal; then the higher key counts. */
    private static final double SAME_MARGIN = 1e-3;

    private final List<Parameter> parameters;
    private final List<FigureColumn> columns;
    private final Path file;
    private final OutputStream out;
    private double[] margins = new double[FIRST_CAPACITY];
    private long[] places = new long[FIRST_CAPACITY];
    private double[] keys = new double[FIRST_CAPACITY];
    private int count;
    private int met;
    private long end;

    /**
     * A route as it was judged.
     *
     * @param name name of the route
     * @param line its line in the table of routes
     * @param meets whether all requirements hold
     * @param leastMargin least margin; NaN where it cannot be judged or nothing is required
     * @param tightest the requirement with the least margin, empty where none is stated
     * @param reason why it fails, empty if it does not
     * @param settings values of the parameters that are kept, in the units of their paths; NaN where it cannot be judged
     * @param figures figures of merit; empty where it cannot be judged
     */
    public record Entry(
            String name,
            long line,
            boolean meets,
            double leastMargin,
            String tightest,
            String reason,
            List<Double> settings,
            List<Double> figures) {}

    /**
     * An empty ledger.
     *
     * @param parameters parameters whose values to keep: the tuned ones
     * @param columns figures of merit to keep
     */
    public RouteLedger(List<Parameter> parameters, List<FigureColumn> columns) throws IOException {
        this.parameters = List.copyOf(parameters);
        this.columns = List.copyOf(columns);
        this.file = Files.createTempFile("binspan-routes", ".tmp");
        file.toFile().deleteOnExit();
        this.out = new BufferedOutputStream(Files.newOutputStream(file));
    }

    /** Parameters whose values are kept. */
    public List<Parameter> parameters() {
        return parameters;
    }

    /** Figures of merit that are kept. */
    public List<FigureColumn> columns() {
        return columns;
    }

    /** Number of routes. */
    public int count() {
        return count;
    }

    /** Number of routes that meet all requirements. */
    public int met() {
        return met;
    }

    /**
     * Adds a verdict.
     *
     * @param verdict the verdict
     * @param line line of the route in its table
     * @param reason why it fails, empty if it does not
     */
    public void add(RouteSurvey.Verdict verdict, long line, String reason) throws IOException {
        if (count == margins.length) {
            margins = Arrays.copyOf(margins, 2 * count);
            places = Arrays.copyOf(places, 2 * count);
            keys = Arrays.copyOf(keys, 2 * count);
        }
        boolean judged = verdict.refusal() == null;
        margins[count] = judged ? verdict.leastMargin() : Double.NEGATIVE_INFINITY;
        keys[count] = judged && !Double.isNaN(verdict.leastMargin())
                ? Math.max(0.0, verdict.prediction().key().asymptoticPerSecond())
                : 0.0;
        places[count] = end;
        count++;
        met += verdict.meets() ? 1 : 0;
        byte[] bytes = bytes(verdict, line, reason);
        out.write(ByteBuffer.allocate(Integer.BYTES).putInt(bytes.length).array());
        out.write(bytes);
        end += Integer.BYTES + bytes.length;
    }

    private byte[] bytes(RouteSurvey.Verdict verdict, long line, String reason) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        DataOutputStream data = new DataOutputStream(bytes);
        data.writeUTF(verdict.route().name());
        data.writeLong(line);
        data.writeBoolean(verdict.meets());
        data.writeDouble(verdict.leastMargin());
        data.writeUTF(verdict.tightest() == null ? "" : verdict.tightest().fieldName());
        data.writeUTF(reason);
        boolean judged = verdict.refusal() == null;
        for (Parameter parameter : parameters) {
            data.writeDouble(
                    judged ? parameter.value(verdict.prediction().scenario()).orElse(Double.NaN) : Double.NaN);
        }
        data.writeBoolean(judged);
        if (judged) {
            FiniteKeyOutlook finite = FiniteKeyOutlook.of(verdict.prediction());
            for (FigureColumn column : columns) {
                data.writeDouble(column.of(verdict.prediction(), finite));
            }
        }
        return bytes.toByteArray();
    }

    /** Takes a ranked route. */
    @FunctionalInterface
    public interface Taker {
        /** Takes the route of a rank, 1 for the best; false ends the reading. */
        boolean take(int rank, Entry entry) throws IOException;
    }

    /** Hands out all routes, the best first. */
    public void ranked(Taker taker) throws IOException {
        out.flush();
        Integer[] order = new Integer[count];
        Arrays.setAll(order, i -> i);
        Arrays.sort(
                order,
                Comparator.comparing((Integer i) -> margins[i] < 0.0)
                        .thenComparingDouble(i -> -Math.rint(margins[i] / SAME_MARGIN))
                        .thenComparingDouble(i -> -keys[i]));
        try (RandomAccessFile in = new RandomAccessFile(file.toFile(), "r")) {
            for (int i = 0; i < count; i++) {
                in.seek(places[order[i]]);
                if (!taker.take(i + 1, read(in))) {
                    return;
                }
            }
        }
    }

    private Entry read(RandomAccessFile file) throws IOException {
        byte[] bytes = new byte[file.readInt()];
        file.readFully(bytes);
        DataInputStream in = new DataInputStream(new ByteArrayInputStream(bytes));
        String name = in.readUTF();
        long line = in.readLong();
        boolean meets = in.readBoolean();
        double margin = in.readDouble();
        String tightest = in.readUTF();
        String reason = in.readUTF();
        List<Double> settings = numbers(in, parameters.size());
        List<Double> figures = numbers(in, in.readBoolean() ? columns.size() : 0);
        return new Entry(name, line, meets, margin, tightest, reason, settings, figures);
    }

    private static List<Double> numbers(DataInputStream in, int count) throws IOException {
        List<Double> numbers = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            numbers.add(in.readDouble());
        }
        return numbers;
    }

    @Override
    public void close() throws IOException {
        out.close();
        Files.deleteIfExists(file);
    }
}
