package binspan.worksheet;

import binspan.optics.AnalyzerPaths;
import binspan.scenario.Analyzer;
import binspan.units.Decibels;

/** Section 4: how each analyzer shares the light out to its paths and ports. */
final class WorksheetAnalyzer {
    private final WorksheetPage page;
    private final WorksheetSide side;

    private WorksheetAnalyzer(WorksheetPage page, WorksheetSide side) {
        this.page = page;
        this.side = side;
    }

    static void write(WorksheetPage page) {
        page.section("4 Analyzer");
        for (WorksheetSide side : page.sides()) {
            WorksheetAnalyzer analyzer = new WorksheetAnalyzer(page, side);
            analyzer.inputs(side.arm().analyzer());
            analyzer.shares(side.light().paths());
        }
    }

    private void inputs(Analyzer analyzer) {
        input("i", "share of the light into the short path", analyzer.inputShortFraction(), "", "inputShortFraction");
        input(
                "o",
                "share of the short path's light into port 1",
                analyzer.outputShortToPort1(),
                "",
                "outputShortToPort1");
        input("xl", "loss that the long path has on top", analyzer.longPathExtraLossDb(), "dB", "longPathExtraLossDb");
        double extra = Decibels.transmittance(analyzer.longPathExtraLossDb());
        share("e", "the same as transmittance", "10^(-" + side.in("xl") + "/10)", extra);
    }

    private void shares(AnalyzerPaths paths) {
        String i = side.in("i");
        String o = side.in("o");
        String e = side.in("e");
        share("s1", "short path into port 1", i + " x " + o, paths.short1());
        share("s2", "short path into port 2", i + " (1 - " + o + ")", paths.short2());
        share("l1", "long path into port 1", "(1 - " + i + ") (1 - " + o + ") " + e, paths.long1());
        share("l2", "long path into port 2", "(1 - " + i + ") x " + o + " x " + e, paths.long2());
    }

    private void input(String symbol, String meaning, double value, String unit, String field) {
        page.input(side.of(symbol), side.name() + ": " + meaning, value, unit, side.name() + ".analyzer." + field);
    }

    private void share(String symbol, String meaning, String formula, double value) {
        page.line(side.of(symbol), side.name() + ": " + meaning, formula, value, "");
    }
}
