package binspan.worksheet;

import binspan.optics.DifferenceCapture;
import binspan.optics.PairSpectrum;
import binspan.optics.Window;

/**
 * Section 7: captured shares of the peaks of t_A - t_B, by how late a peak lies against the window in imbalances of the
 * analyzers.
 */
final class WorksheetPeaks {
    private final WorksheetPage page;
    private final int a;
    private final int b;
    private final String at;

    private WorksheetPeaks(WorksheetPage page, int a, int b) {
        this.page = page;
        this.a = a;
        this.b = b;
        this.at = WorksheetCounts.pair(a, b);
    }

    static void write(WorksheetPage page, int a, int b) {
        WorksheetPeaks peaks = new WorksheetPeaks(page, a, b);
        peaks.spread();
        double ta = page.prediction().imbalances().alice();
        double tb = page.prediction().imbalances().bob();
        peaks.capture("0", "of the peak in its own window", "", 0.0);
        peaks.capture("A", "of a peak later by alice's imbalance", " + {T_A}", ta);
        peaks.capture("-A", "of a peak earlier by alice's imbalance", " - {T_A}", -ta);
        peaks.capture("B", "of a peak later by bob's imbalance", " + {T_B}", tb);
        peaks.capture("-B", "of a peak earlier by bob's imbalance", " - {T_B}", -tb);
        peaks.capture("A+B", "of a peak later by both imbalances", " + {T_A} + {T_B}", ta + tb);
        peaks.capture("-A-B", "of a peak earlier by both imbalances", " - {T_A} - {T_B}", -ta - tb);
    }

    private void spread() {
        if (page.prediction().spectrum().mirrored().gaussian()) {
            double rms = Math.sqrt(page.value("St") + page.value("V_A" + (a + 1)) + page.value("V_B" + (b + 1)));
            String formula = "sqrt({St} + {V_A" + (a + 1) + "} + {V_B" + (b + 1) + "})";
            page.line("rms" + at, WorksheetCounts.ports(a, b) + "rms of t_A - t_B", formula, rms, "s");
        } else if (page.prediction().spectrum().mirrored().flat()) {
            box(page.prediction().spectrum());
        }
    }

    private void box(PairSpectrum spectrum) {
        double width = 2.0 * spectrum.mirrored().halfWidth() * Math.abs(page.value("beta"));
        double near = (1.0 / spectrum.alice().variance() + 1.0 / spectrum.bob().variance()) / 4.0;
        double blur = Math.sqrt(near + page.value("V_A" + (a + 1)) + page.value("V_B" + (b + 1)));
        String ports = WorksheetCounts.ports(a, b);
        page.line(
                "X" + at,
                ports + "box into which dispersion spreads the spectrum",
                "2 min({a_A}, {a_B}) |{beta}|",
                width,
                "s");
        String formula = "sqrt((1/{v_A} + 1/{v_B})/4 + {V_A" + (a + 1) + "} + {V_B" + (b + 1) + "})";
        page.line("blur" + at, ports + "blur of that box by near field and detectors, rms", formula, blur, "s");
    }

    private void capture(String peak, String meaning, String later, double value) {
        double late = page.sides().get(0).late() - page.sides().get(1).late();
        Window window = Window.of(page.prediction().windowWidth(), late + value);
        double captured = DifferenceCapture.of(
                page.prediction().spectrum(),
                page.value("beta"),
                page.prediction().portsA().get(a),
                page.prediction().portsB().get(b),
                window);
        String words = WorksheetCounts.ports(a, b) + "captured share " + meaning;
        page.line("C" + at + "(" + peak + ")", words, formula("{late_A} - {late_B}" + later), captured, "");
    }

    private String formula(String late) {
        boolean tailed = page.prediction().portsA().get(a).tailed()
                || page.prediction().portsB().get(b).tailed();
        boolean gaussian = page.prediction().spectrum().mirrored().gaussian();
        if (gaussian && !tailed) {
            return WorksheetCaptures.erf("{w}", late, "{rms" + at + "}");
        }
        if (page.prediction().spectrum().mirrored().flat() && !tailed) {
            return WorksheetBox.capture(page, "X" + at, "blur" + at, late);
        }
        String shape = gaussian
                ? "Gaussian of rms {rms" + at + "}"
                : "spectrum spread by {beta}, blurred by near field and detectors";
        String tails = tailed ? ", with the detectors' tails," : "";
        return "share of the " + shape + tails + " inside -{w}/2 to {w}/2, late by " + late;
    }
}
