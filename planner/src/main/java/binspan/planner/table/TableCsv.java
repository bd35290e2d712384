package binspan.planner.table;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import tools.jackson.core.io.NumberOutput;

/**
 * Writes tables as CSV by RFC 4180: UTF-8, one header row, lines that end in CR LF, '.' decimal, numbers as the shortest text that reads back. A cell
 * stays empty where a figure does not apply.
 */
public final class TableCsv implements RowWriter {
    private static final double LARGEST_PLAIN = 1e7;
    private static final byte[] LINE_END = {'\r', '\n'};

    private final OutputStream out;
    private final int width;
    private final byte[] digits = new byte[NumberOutput.MAX_DOUBLE_BYTES];
    private int cells;

    private TableCsv(OutputStream out, int width) {
        this.out = out;
        this.width = width;
    }

    /**
     * Writes a table.
     *
     * @param table header and rows
     * @param out where to, buffered; left open
     */
    public static void write(Table table, OutputStream out) throws IOException {
        List<String> header = table.header();
        TableCsv csv = new TableCsv(out, header.size());
        for (String name : header) {
            csv.text(name);
        }
        csv.endRow();
        table.rows().to(csv);
    }

    @Override
    public void number(double value) throws IOException {
        separate();
        if (Double.isFinite(value)) {
            boolean whole = value == Math.rint(value) && Math.abs(value) < LARGEST_PLAIN;
            int length = whole
                    ? NumberOutput.outputLong((long) value, digits, 0)
                    : NumberOutput.outputDouble(value, digits, 0);
            out.write(digits, 0, length);
        }
    }

    @Override
    public void text(String value) throws IOException {
        separate();
        String cell = quoted(value) ? '"' + value.replace("\"", "\"\"") + '"' : value;
        out.write(cell.getBytes(StandardCharsets.UTF_8));
    }

    /** Blanks at the ends are quoted too, since some readers drop them. */
    private static boolean quoted(String value) {
        for (int i = 0; i < value.length(); i++) {
            if (",\"\r\n".indexOf(value.charAt(i)) >= 0) {
                return true;
            }
        }
        return value.startsWith(" ") || value.endsWith(" ");
    }

    @Override
    public void flag(boolean value) throws IOException {
        text(value ? "true" : "false");
    }

    @Override
    public void endRow() throws IOException {
        if (cells != width) {
            throw new IllegalStateException("found a row of " + cells + " cells; allowed " + width);
        }
        out.write(LINE_END);
        cells = 0;
    }

    private void separate() throws IOException {
        if (cells > 0) {
            out.write(',');
        }
        cells++;
    }
}
