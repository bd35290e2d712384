package binspan.worksheet;

import binspan.scenario.Detector;

/**
 * One output port as the worksheet writes about it.
 *
 * @param page worksheet
 * @param side arm
 * @param port port, 0 for port 1
 */
record WorksheetPort(WorksheetPage page, WorksheetSide side, int port) {
    Detector detector() {
        return side.arm().detectors().get(port);
    }

    /** States an input of the detector; values of a catalogue class name that class. */
    void input(String symbol, String meaning, double value, String unit, String field) {
        String path = side.name() + ".detectors[" + port + "]." + field;
        page.otherwise(WorksheetClassValue.source(detector(), field))
                .input(side.of(symbol, port), name() + meaning, value, unit, path);
    }

    /** States a calculated value. */
    void line(String symbol, String meaning, String formula, double value, String unit) {
        page.line(side.of(symbol, port), name() + meaning, formula, value, unit);
    }

    /** A symbol of this port inside a formula. */
    String in(String symbol) {
        return side.in(symbol, port);
    }

    private String name() {
        return side.name() + " port " + (port + 1) + ": ";
    }
}
