package binspan.worksheet;

import binspan.optics.CaptureInputs;
import binspan.optics.SlotCaptures;
import binspan.optics.SlotCapturing;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A worksheet while it is written. Formulas name the numbers that they need in braces, {@code 2 pi {B_A1}/2.354820};
 * each must stand on a line above, whose value and unit are then put in.
 */
final class WorksheetPage {
    private final LinkCheck check;
    private final WorksheetOrigin origin;
    private final List<WorksheetLine> lines = new ArrayList<>();
    private final Map<String, WorksheetLine> bySymbol = new HashMap<>();
    private SlotCaptures captures;
    private String section = "";
    private String source = WorksheetLine.MODEL;
    private String inputSource = WorksheetOrigin.SCENARIO;

    WorksheetPage(LinkCheck check) {
        this.check = check;
        this.origin = new WorksheetOrigin(check.prediction().scenario());
    }

    LinkCheck check() {
        return check;
    }

    LinkPrediction prediction() {
        return check.prediction();
    }

    Scenario scenario() {
        return check.prediction().scenario();
    }

    /** Whether the source is a pulse train. */
    boolean endless() {
        return scenario().source().pump().mode() == PumpMode.PULSE_TRAIN;
    }

    /**
     * The captured shares that a pulsed prediction counts with; computed anew from its inputs, which give the same
     * ones.
     */
    SlotCaptures captures() {
        if (captures == null) {
            captures = SlotCapturing.of(captureInputs());
        }
        return captures;
    }

    private CaptureInputs captureInputs() {
        LinkPrediction p = prediction();
        return new CaptureInputs(
                p.spectrum(),
                p.pathA().groupDelayDispersion(),
                p.pathB().groupDelayDispersion(),
                p.portsA(),
                p.portsB(),
                p.windowWidth(),
                p.imbalances().common(),
                LinkPrediction.late(p.scenario().alice(), p.pathA()),
                LinkPrediction.late(p.scenario().bob(), p.pathB()),
                endless());
    }

    /** Both arms. */
    List<WorksheetSide> sides() {
        return List.of(WorksheetSide.alice(prediction()), WorksheetSide.bob(prediction()));
    }

    List<WorksheetLine> lines() {
        return lines;
    }

    /** Whether a line of this symbol stands above. */
    boolean has(String symbol) {
        return bySymbol.containsKey(symbol);
    }

    /** The value on the line of a symbol. */
    double value(String symbol) {
        return bySymbol.get(symbol).value();
    }

    /** Starts a section. */
    void section(String title) {
        section = title;
    }

    /** Names the publication of the next line's formula. */
    WorksheetPage cited(String publication) {
        source = publication;
        return this;
    }

    /** Names the source of the next input, where the scenario has no note on it. */
    WorksheetPage otherwise(String origin) {
        inputSource = origin;
        return this;
    }

    /** States an input of the scenario; its source is the scenario's own note, if it has one for the path. */
    void input(String symbol, String meaning, double value, String unit, String path) {
        String from = origin.of(path, inputSource);
        add(new WorksheetLine(section, symbol, meaning, "", "", value, unit, from, List.of()));
        inputSource = WorksheetOrigin.SCENARIO;
    }

    /** States a calculated value. */
    void line(String symbol, String meaning, String formula, double value, String unit) {
        WorksheetFormula parsed = WorksheetFormula.of(formula, bySymbol);
        add(new WorksheetLine(
                section, symbol, meaning, parsed.symbols(), parsed.numbers(), value, unit, source, parsed.terms()));
        source = WorksheetLine.MODEL;
    }

    private void add(WorksheetLine line) {
        if (bySymbol.put(line.symbol(), line) != null) {
            throw new IllegalStateException("worksheet states " + line.symbol() + " twice");
        }
        lines.add(line);
    }
}
