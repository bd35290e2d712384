package binspan.planner.table;

import binspan.planner.io.Printable;
import binspan.scenario.Choice;
import binspan.scenario.FibreClass;
import binspan.scenario.Nearest;
import binspan.scenario.Range;
import binspan.scenario.Scenario;
import binspan.study.comparison.Route;
import binspan.study.tuning.SourcePosition;
import java.io.BufferedReader;
import java.io.Closeable;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.commons.csv.CSVException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.apache.commons.csv.DuplicateHeaderMode;

/**
 * Reads a table of candidate routes row by row: CSV with a header; columns {@code name}, for each arm {@code alice.lengthKm} or {@code
 * alice.measuredLossDb} or both, {@code fibre} or {@code alice.fibre}.
 */
public final class RouteReader implements Closeable, Iterator<RouteReader.Row> {
    private static final String NAME = "name";
    private static final String FIBRE = "fibre";
    private static final List<String> KNOWN = List.of(
            NAME,
            "alice.lengthKm",
            "alice.measuredLossDb",
            "bob.lengthKm",
            "bob.measuredLossDb",
            FIBRE,
            "alice.fibre",
            "bob.fibre");
    private static final int LONGEST_NAME = 200;
    private static final Range LENGTHS = Range.of(0.0, 10_000.0);
    private static final Range LOSSES = Range.of(0.0, 300.0);
    private static final char BYTE_ORDER_MARK = '\ufeff';

    private final String file;
    private final CSVParser parser;
    private final Iterator<CSVRecord> records;
    private final boolean aliceHasFibre;
    private final boolean bobHasFibre;
    private long position;
    private long rows;
    private String broken;

    /**
     * A row of the table.
     *
     * @param line its line in the file
     * @param route the route, null if the row is bad
     * @param problem what is wrong with the row, with file and line; null if it is good
     */
    public record Row(long line, Route route, String problem) {}

    private RouteReader(String file, CSVParser parser, Scenario template) {
        this.file = file;
        this.parser = parser;
        this.records = parser.iterator();
        this.aliceHasFibre = SourcePosition.fibreKm(template.alice()) > 0.0;
        this.bobHasFibre = SourcePosition.fibreKm(template.bob()) > 0.0;
    }

    /**
     * Opens a table.
     *
     * @param file its name
     * @param template the scenario that the routes go through
     * @throws TableException if it cannot be read, or if columns are missing, unknown or found twice
     */
    public static RouteReader of(String file, Scenario template) throws TableException {
        try {
            if (Files.isDirectory(Path.of(file))) {
                throw new TableException(file + ": found a directory; allowed a table");
            }
            return checked(new RouteReader(file, parser(file), template));
        } catch (NoSuchFileException e) {
            throw new TableException(file + ": no such file");
        } catch (InvalidPathException e) {
            throw new TableException(file + ": not a file name on this system");
        } catch (UncheckedIOException e) {
            throw new TableException(file + ":1: " + broken(e.getCause()));
        } catch (IOException e) {
            throw new TableException(file + ":1: " + broken(e));
        }
    }

    private static CSVParser parser(String file) throws IOException {
        BufferedReader text = Files.newBufferedReader(Path.of(file), StandardCharsets.UTF_8);
        text.mark(1);
        if (text.read() != BYTE_ORDER_MARK) {
            text.reset();
        }
        return CSVFormat.RFC4180
                .builder()
                .setHeader()
                .setSkipHeaderRecord(true)
                .setIgnoreEmptyLines(true)
                .setTrim(true)
                .setAllowMissingColumnNames(true)
                .setDuplicateHeaderMode(DuplicateHeaderMode.ALLOW_ALL)
                .get()
                .parse(text);
    }

    private static RouteReader checked(RouteReader reader) throws TableException, IOException {
        try {
            reader.checkHeader();
            return reader;
        } catch (TableException e) {
            reader.close();
            throw e;
        }
    }

    private void checkHeader() throws TableException {
        List<String> header = parser.getHeaderNames();
        if (header.isEmpty()) {
            throw new TableException(file + ": found an empty table; allowed a header and a row for each route");
        }
        for (int i = 0; i < header.size(); i++) {
            checkColumn(header.get(i), header.subList(0, i));
        }
        if (!header.contains(NAME)) {
            throw wrongHeader("missing column " + NAME);
        }
        arm(header, "alice", aliceHasFibre);
        arm(header, "bob", bobHasFibre);
    }

    private void checkColumn(String column, List<String> before) throws TableException {
        if (column.isEmpty()) {
            throw wrongHeader("column " + (before.size() + 1) + " has no name");
        }
        if (!KNOWN.contains(column)) {
            List<String> near = Nearest.to(column, KNOWN);
            throw wrongHeader("unknown column \"" + column + "\"; "
                    + (near.isEmpty()
                            ? "allowed " + String.join(", ", KNOWN)
                            : "did you mean " + String.join(" or ", near) + "?"));
        }
        if (before.contains(column)) {
            throw wrongHeader("found column " + column + " twice; allowed once");
        }
    }

    private void arm(List<String> header, String arm, boolean needed) throws TableException {
        if (needed && !header.contains(arm + ".lengthKm") && !header.contains(arm + ".measuredLossDb")) {
            throw wrongHeader("missing column " + arm + ".lengthKm or " + arm + ".measuredLossDb");
        }
    }

    private TableException wrongHeader(String reason) {
        return new TableException(file + ":" + Math.max(1, parser.getCurrentLineNumber()) + ": " + reason);
    }

    /** How far the reading has come, in characters. */
    public long position() {
        return position;
    }

    /** Whether another row follows; not behind a place where the table is no CSV, see {@link #checkWhole}. */
    @Override
    public boolean hasNext() {
        long start = parser.getCurrentLineNumber() + 1;
        try {
            return broken == null && records.hasNext();
        } catch (UncheckedIOException e) {
            broken = file + ":" + start + ": " + broken(e.getCause());
            return false;
        }
    }

    /**
     * Says whether the rows were read to the end of the table, and whether there were any.
     *
     * @throws TableException if the table breaks off, or has no row below its header
     */
    public void checkWhole() throws TableException {
        if (broken != null) {
            throw new TableException(broken);
        }
        if (rows == 0) {
            throw new TableException(file + ": found no routes below the header; allowed a row for each");
        }
    }

    private static String broken(IOException reason) {
        if (reason instanceof CharacterCodingException) {
            return "not UTF-8 text";
        }
        return reason instanceof CSVException ? "a quoted cell is not closed as it should be" : "not readable";
    }

    @Override
    public Row next() {
        long line = parser.getCurrentLineNumber() + 1;
        CSVRecord cells = records.next();
        rows++;
        position = cells.getCharacterPosition();
        long at = Math.max(2, Math.min(line, parser.getCurrentLineNumber()));
        try {
            return new Row(at, route(cells), null);
        } catch (IllegalArgumentException e) {
            return new Row(at, null, Printable.line(file + ":" + at + ": " + e.getMessage()));
        }
    }

    private Route route(CSVRecord cells) {
        int expected = parser.getHeaderNames().size();
        if (cells.size() != expected) {
            throw new IllegalArgumentException("found " + cells.size() + " cells; allowed " + expected);
        }
        String name = text(cells, NAME).orElseThrow(() -> new IllegalArgumentException("name: found an empty cell"));
        if (name.length() > LONGEST_NAME) {
            throw new IllegalArgumentException(
                    "name: found " + name.length() + " characters; allowed at most " + LONGEST_NAME);
        }
        return new Route(name, arm(cells, "alice", aliceHasFibre), arm(cells, "bob", bobHasFibre));
    }

    private Route.ArmRoute arm(CSVRecord cells, String arm, boolean needed) {
        OptionalDouble length = number(cells, arm + ".lengthKm", LENGTHS, "km");
        OptionalDouble loss = number(cells, arm + ".measuredLossDb", LOSSES, "dB");
        if (needed && length.isEmpty() && loss.isEmpty()) {
            throw new IllegalArgumentException(arm + ": neither a length nor a measured loss");
        }
        Optional<FibreClass> fibre = fibre(cells, arm + "." + FIBRE).or(() -> fibre(cells, FIBRE));
        return new Route.ArmRoute(length, loss, fibre);
    }

    private Optional<String> text(CSVRecord cells, String column) {
        boolean there =
                parser.getHeaderNames().contains(column) && !cells.get(column).isBlank();
        return there ? Optional.of(cells.get(column)) : Optional.empty();
    }

    private OptionalDouble number(CSVRecord cells, String column, Range range, String unit) {
        Optional<String> text = text(cells, column);
        if (text.isEmpty()) {
            return OptionalDouble.empty();
        }
        double value;
        try {
            value = text.get().matches("[-+.0-9eE]+") ? Double.parseDouble(text.get()) : Double.NaN;
        } catch (NumberFormatException e) {
            value = Double.NaN;
        }
        if (!range.contains(value)) {
            throw new IllegalArgumentException(column + ": found \"" + text.get() + "\"; allowed " + range.text(unit));
        }
        return OptionalDouble.of(value);
    }

    private Optional<FibreClass> fibre(CSVRecord cells, String column) {
        Optional<String> text = text(cells, column);
        if (text.isEmpty()) {
            return Optional.empty();
        }
        Optional<FibreClass> found = Arrays.stream(FibreClass.values())
                .filter(each -> each.text().equals(text.get()))
                .findFirst();
        if (found.isEmpty()) {
            List<String> near = new ArrayList<>(Nearest.to(text.get(), Choice.texts(FibreClass.class)));
            throw new IllegalArgumentException(column + ": unknown fibre class \"" + text.get() + "\"; "
                    + (near.isEmpty()
                            ? "binspan list fibres shows them"
                            : "did you mean " + String.join(" or ", near) + "?"));
        }
        return found;
    }

    @Override
    public void close() throws IOException {
        parser.close();
    }
}
