package binspan.worksheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.ToDoubleFunction;

/** Recomputes lines of a worksheet from the numbers that they put in and counts how many it has recomputed. */
final class WorksheetChecks {
    static final double FWHM_PER_RMS = 2.354820045030949;
    static final double LIGHT = 299_792_458.0;

    private static final double ACCURACY = 1e-8;

    private final Worksheet sheet;
    private int recomputed;

    WorksheetChecks(Worksheet sheet) {
        this.sheet = sheet;
    }

    /** Asserts that a line has the value that its own numbers give. */
    void line(String symbol, ToDoubleFunction<WorksheetLine> formula) {
        WorksheetLine line = sheet.line(symbol);
        double expected = formula.applyAsDouble(line);
        assertThat(line.value())
                .as("%s = %s = %s", symbol, line.formula(), line.numbers())
                .isCloseTo(expected, within(ACCURACY * Math.abs(expected)));
        recomputed++;
    }

    int recomputed() {
        return recomputed;
    }

    static double square(double x) {
        return x * x;
    }

    static double entropy(double x) {
        return -(x * Math.log(x) + (1.0 - x) * Math.log(1.0 - x)) / Math.log(2.0);
    }

    /** Share of a Gaussian of the given rms inside a window, late by x. */
    static double captured(double window, double late, double rms) {
        double scale = Math.sqrt(2.0) * rms;
        return (erf((window / 2.0 - late) / scale) + erf((window / 2.0 + late) / scale)) / 2.0;
    }

    private static double erf(double x) {
        return org.apache.commons.math3.special.Erf.erf(x);
    }
}
