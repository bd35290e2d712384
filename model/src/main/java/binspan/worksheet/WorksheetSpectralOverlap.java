package binspan.worksheet;

import binspan.optics.Imbalances;
import binspan.optics.PairSpectrum;
import binspan.units.Scale;

/** Section 5: visibility lost to imbalances that differ and to dispersion inside the analyzers. */
final class WorksheetSpectralOverlap {
    private static final double PS_SQUARED = Scale.PICO * Scale.PICO;

    private final WorksheetPage page;
    private final PairSpectrum spectrum;
    private final double da;
    private final double db;
    private final double ka;
    private final double kb;

    private WorksheetSpectralOverlap(WorksheetPage page) {
        Imbalances imbalances = page.prediction().imbalances();
        this.page = page;
        this.spectrum = page.prediction().spectrum();
        this.da = imbalances.alice() - imbalances.pump();
        this.db = imbalances.bob() - imbalances.pump();
        this.ka = page.scenario().alice().analyzer().pathDispersionPs2() * PS_SQUARED;
        this.kb = page.scenario().bob().analyzer().pathDispersionPs2() * PS_SQUARED;
    }

    static void write(WorksheetPage page) {
        WorksheetSpectralOverlap overlap = new WorksheetSpectralOverlap(page);
        overlap.mismatches();
        overlap.factor();
    }

    private void mismatches() {
        String pump = page.has("T_P") ? "{T_P}" : "{T}";
        page.line("d_A", "alice: imbalance against the pump's", "{T_A} - " + pump, da, "s");
        page.line("d_B", "bob: imbalance against the pump's", "{T_B} - " + pump, db, "s");
        page.input(
                "k_A",
                "alice: dispersion of the long path minus the short one",
                ka,
                "s^2",
                "alice.analyzer.pathDispersionPs2");
        page.input(
                "k_B",
                "bob: dispersion of the long path minus the short one",
                kb,
                "s^2",
                "bob.analyzer.pathDispersionPs2");
    }

    private void factor() {
        if (da == 0.0 && db == 0.0 && ka == 0.0 && kb == 0.0) {
            factor("1");
        } else if (spectrum.continuous() && spectrum.gaussian()) {
            continuous();
        } else if (spectrum.gaussian()) {
            gaussian();
        } else {
            factor("modulus of the mean of exp(i (W_A x {d_A} + W_B x {d_B}"
                    + " + (W_A^2 x {k_A} + W_B^2 x {k_B})/2)), by quadrature");
        }
    }

    private void factor(String formula) {
        String meaning = "what mismatches and the analyzers' dispersion leave";
        page.line("g_spec", meaning, formula, page.prediction().coherence().spectral(), "");
    }

    private void continuous() {
        double chirp = (ka + kb) * spectrum.varianceA();
        page.line("chirp", "dispersion of the analyzers against the spectrum", "({k_A} + {k_B}) {Sigma_AA}", chirp, "");
        factor("(1 + {chirp}^2)^(-1/4) exp(-({d_A} - {d_B})^2 {Sigma_AA}/(2 (1 + {chirp}^2)))");
    }

    /** M = L - i k: the determinant of M and the quadratic form d' M^-1 d, real and imaginary parts apart. */
    private void gaussian() {
        double a = 1.0 / spectrum.alice().variance();
        double b = 1.0 / spectrum.bob().variance();
        double p = spectrum.inversePump();
        double determinant = a * b + p * (a + b);
        page.line("det_L", "determinant of L", "1/({v_A} {v_B}) + {L_AB} (1/{v_A} + 1/{v_B})", determinant, "s^4");
        page.line(
                "M_re",
                "real part of the determinant of M = L - i k",
                "{det_L} - {k_A} {k_B}",
                determinant - ka * kb,
                "s^4");
        page.line(
                "M_im", "its imaginary part", "-({L_AA} {k_B} + {L_BB} {k_A})", -((a + p) * kb + (b + p) * ka), "s^4");
        double real = da * da * b + db * db * a + p * (da - db) * (da - db);
        String form = "{d_A}^2/{v_B} + {d_B}^2/{v_A} + {L_AB} ({d_A} - {d_B})^2";
        page.line("Q_re", "d' adj(M) d, real part", form, real, "s^4");
        page.line(
                "Q_im",
                "its imaginary part",
                "-({d_A}^2 {k_B} + {d_B}^2 {k_A})",
                -(da * da * kb + db * db * ka),
                "s^4");
        String square = "({M_re}^2 + {M_im}^2)";
        factor("sqrt({det_L}/sqrt" + square + ") exp(-({Q_re} {M_re} + {Q_im} {M_im})/(2 " + square + "))");
    }
}
