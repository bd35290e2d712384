package binspan.worksheet;

import binspan.scenario.Compensator;

/** Section 2: one dispersion compensator. */
final class WorksheetCompensator {
    private final WorksheetPage page;
    private final WorksheetSide side;
    private final int index;
    private final Compensator part;

    private WorksheetCompensator(WorksheetPage page, WorksheetSide side, int index) {
        this.page = page;
        this.side = side;
        this.index = index;
        this.part = (Compensator) side.arm().path().get(index);
    }

    /** States the compensator at a position of an arm's path. */
    static void write(WorksheetPage page, WorksheetSide side, int index) {
        WorksheetCompensator compensator = new WorksheetCompensator(page, side, index);
        compensator.dispersion();
        compensator.loss();
    }

    private void dispersion() {
        if (part.share().isPresent()) {
            double share = part.share().getAsDouble();
            input("cs", "share of the fibre's dispersion that it takes away", share, "", "share");
            double value = -share * side.path().fibreDispersionPsPerNm();
            line("DL", "dispersion", "-" + in("cs") + " x " + side.in("D_fib"), value, "ps/nm");
        } else {
            input("DL", "dispersion", part.dispersionPsPerNm().orElse(0.0), "ps/nm", "dispersionPsPerNm");
        }
    }

    private void loss() {
        if (part.figureOfMeritPsPerNmDb().isEmpty()) {
            input("loss", "loss", part.lossDb(), "dB", "lossDb");
            return;
        }
        double merit = part.figureOfMeritPsPerNmDb().getAsDouble();
        input("l0", "loss that does not depend on its dispersion", part.lossDb(), "dB", "lossDb");
        input("fom", "dispersion per loss", merit, "ps/(nm dB)", "figureOfMeritPsPerNmDb");
        double value = part.lossDb() + Math.abs(page.value(side.of("DL", index))) / merit;
        line("loss", "loss", in("l0") + " + |" + in("DL") + "|/" + in("fom"), value, "dB");
    }

    private void input(String symbol, String meaning, double value, String unit, String field) {
        page.input(
                side.of(symbol, index), name() + meaning, value, unit, side.name() + ".path[" + index + "]." + field);
    }

    private void line(String symbol, String meaning, String formula, double value, String unit) {
        page.line(side.of(symbol, index), name() + meaning, formula, value, unit);
    }

    private String name() {
        return side.name() + ", " + part.label().orElse("compensator") + ": ";
    }

    private String in(String symbol) {
        return side.in(symbol, index);
    }
}
