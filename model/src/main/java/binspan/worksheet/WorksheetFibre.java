package binspan.worksheet;

import binspan.optics.FibreOptics;
import binspan.scenario.DispersionLaw;
import binspan.scenario.FibreSpan;
import binspan.units.Scale;

/** Section 2: one span of fibre. */
final class WorksheetFibre {
    private static final String PER_KM = "ps/(nm km)";
    private static final String LAW = "three-term law of ITU-T G.650.1, from memory";

    private final WorksheetPage page;
    private final WorksheetSide side;
    private final int index;
    private final FibreSpan span;
    private final String at;
    private final String name;

    private WorksheetFibre(WorksheetPage page, WorksheetSide side, int index, FibreSpan span) {
        this.page = page;
        this.side = side;
        this.index = index;
        this.span = span;
        this.at = side.name() + ".path[" + index + "].";
        this.name = side.name() + ", " + span.label().orElse("fibre " + (index + 1)) + ": ";
    }

    static void write(WorksheetPage page, WorksheetSide side, int index, FibreSpan span) {
        WorksheetFibre fibre = new WorksheetFibre(page, side, index, span);
        fibre.input("L", "length, " + span.fibre().text(), span.lengthKm(), "km", "lengthKm");
        fibre.loss();
        fibre.dispersion();
        fibre.spread();
        fibre.delay();
    }

    private void loss() {
        if (span.measuredLossDb().isPresent()) {
            input(
                    "loss",
                    "loss of the whole span, measured",
                    span.measuredLossDb().getAsDouble(),
                    "dB",
                    "measuredLossDb");
            return;
        }
        if (span.attenuationDbPerKm().isEmpty()) {
            page.otherwise(ofClass() + "; straight lines between 1310, 1550 and 1625 nm");
        }
        double attenuation = FibreOptics.attenuationDbPerKm(span, side.band().centreNm());
        input("alpha", "attenuation", attenuation, "dB/km", "attenuationDbPerKm");
        input("n_c", "connectors", span.connectors(), "", "connectors");
        input("l_c", "loss of each connector", span.connectorLossDb(), "dB", "connectorLossDb");
        input("n_s", "splices", span.splices(), "", "splices");
        input("l_s", "loss of each splice", span.spliceLossDb(), "dB", "spliceLossDb");
        String joints = in("n_c") + " x " + in("l_c") + " + " + in("n_s") + " x " + in("l_s");
        double loss = FibreOptics.lossDb(span, side.band().centreNm());
        line("loss", "loss of the span", in("alpha") + " " + in("L") + " + " + joints, loss, "dB");
    }

    private void dispersion() {
        if (span.dispersionPsPerNmKm().isPresent()) {
            input("D", "dispersion", span.dispersionPsPerNmKm().getAsDouble(), "ps/(nm km)", "dispersionPsPerNmKm");
        } else {
            lawful(span.fibre().dispersion());
        }
        line(
                "DL",
                "dispersion of the span",
                in("D") + " " + in("L"),
                FibreOptics.dispersionPsPerNm(span, side.band().centreNm()),
                "ps/nm");
    }

    private void lawful(DispersionLaw law) {
        if (law instanceof DispersionLaw.ThreeTerm term) {
            constant("l0", "zero-dispersion wavelength", term.zeroNm(), "nm");
            constant("S0", "dispersion slope there", term.slope(), "ps/(nm^2 km)");
            String lambda = side.in("lambda");
            page.cited(LAW);
            lawful(law, in("S0") + "/4 x (" + lambda + " - " + in("l0") + "^4/" + lambda + "^3)");
        } else if (law instanceof DispersionLaw.Line straight) {
            constant("l0", "reference wavelength", straight.referenceNm(), "nm");
            constant("D0", "dispersion there", straight.dispersion(), PER_KM);
            constant("S0", "dispersion slope", straight.slope(), "ps/(nm^2 km)");
            lawful(law, in("D0") + " + " + in("S0") + " x (" + side.in("lambda") + " - " + in("l0") + ")");
        } else if (law instanceof DispersionLaw.Middle middle) {
            constant(
                    "Dlow",
                    "lower bounding line there",
                    middle.lowest().at(side.band().centreNm()),
                    PER_KM);
            constant(
                    "Dhigh",
                    "upper bounding line there",
                    middle.highest().at(side.band().centreNm()),
                    PER_KM);
            lawful(law, "(" + in("Dlow") + " + " + in("Dhigh") + ")/2");
        } else {
            constant("D", "dispersion", law.at(side.band().centreNm()), PER_KM);
        }
    }

    private void lawful(DispersionLaw law, String formula) {
        line("D", "dispersion", formula, law.at(side.band().centreNm()), PER_KM);
    }

    private void spread() {
        input("pmd", "polarization mode dispersion", span.pmdPsPerSqrtKm(), "ps/sqrt(km)", "pmdPsPerSqrtKm");
        String formula = "1/2 " + in("pmd") + " sqrt(" + in("L") + ") sqrt(3 pi/8)";
        double rms = Math.sqrt(FibreOptics.pmdVariancePs2(span)) * Scale.PICO;
        line("tau", "rms spread by polarization mode dispersion", formula, rms, "s");
    }

    private void delay() {
        if (page.has("dT")) {
            double delay = span.delayPsPerKmK() * span.lengthKm() * page.value("dT") * Scale.PICO;
            input("kap", "temperature coefficient of the delay", span.delayPsPerKmK(), "ps/(km K)", "delayPsPerKmK");
            line("dt", "delay change at the temperature step", in("kap") + " " + in("L") + " {dT}", delay, "s");
        }
    }

    private void input(String symbol, String meaning, double value, String unit, String field) {
        page.input(side.of(symbol, index), name + meaning, value, unit, at + field);
    }

    private void constant(String symbol, String meaning, double value, String unit) {
        page.otherwise(ofClass());
        input(symbol, meaning, value, unit, "dispersionPsPerNmKm");
    }

    private void line(String symbol, String meaning, String formula, double value, String unit) {
        page.line(side.of(symbol, index), name + meaning, formula, value, unit);
    }

    private String in(String symbol) {
        return side.in(symbol, index);
    }

    private String ofClass() {
        return "of the class " + span.fibre().text() + ", common practice";
    }
}
