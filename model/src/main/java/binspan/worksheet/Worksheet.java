package binspan.worksheet;

import binspan.prediction.LinkCheck;
import java.util.List;

/**
 * The calculation of a check as an engineer would follow it by hand: every intermediate in the order of the physics,
 * with formula, the numbers put in, value, unit and source. Every number put in stands as a line of its own above.
 *
 * @param lines lines in order
 */
public record Worksheet(List<WorksheetLine> lines) {
    public Worksheet {
        lines = List.copyOf(lines);
    }

    /** The worksheet of a check. */
    public static Worksheet of(LinkCheck check) {
        WorksheetPage page = new WorksheetPage(check);
        WorksheetSpectrum.write(page);
        WorksheetPath.write(page);
        WorksheetStrayLight.write(page);
        WorksheetArrival.write(page);
        WorksheetCaptures.write(page);
        WorksheetAnalyzer.write(page);
        WorksheetCoherence.write(page);
        WorksheetDetectors.write(page);
        WorksheetCounts.write(page);
        WorksheetVisibility.write(page);
        WorksheetBell.write(page);
        WorksheetKey.write(page);
        WorksheetFiniteKey.write(page);
        WorksheetSource.write(page);
        return new Worksheet(page.lines());
    }

    /**
     * The line of a symbol.
     *
     * @throws IllegalArgumentException if the worksheet has none
     */
    public WorksheetLine line(String symbol) {
        for (WorksheetLine line : lines) {
            if (line.symbol().equals(symbol)) {
                return line;
            }
        }
        throw new IllegalArgumentException("no line " + symbol);
    }
}
