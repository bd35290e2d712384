package binspan.worksheet;

import binspan.optics.PairSpectrum;
import binspan.scenario.Source;

/**
 * Section 1: Schmidt number of the pair and modes of each arm; all infinite with a continuous pump, whose clicks are
 * Poissonian.
 */
final class WorksheetModes {
    private static final String MODES = "Christ et al., New J. Phys. 13, 033027 (2011), from memory";

    private final WorksheetPage page;
    private final PairSpectrum spectrum;
    private final Source source;

    private WorksheetModes(WorksheetPage page) {
        this.page = page;
        this.spectrum = page.prediction().spectrum();
        this.source = page.scenario().source();
    }

    static void write(WorksheetPage page) {
        if (page.scenario().pulsed()) {
            WorksheetModes modes = new WorksheetModes(page);
            modes.arms();
            modes.pair();
        }
    }

    private void arms() {
        boolean measured = source.unheraldedG2().isPresent();
        if (measured) {
            double g2 = source.unheraldedG2().getAsDouble();
            double modes = 1.0 / (g2 - 1.0);
            double variance = spectrum.alice().variance() / (modes * modes - 1.0);
            page.input("g2_m", "unheralded g2(0) of one bin in alice's arm, measured", g2, "", "source.unheraldedG2");
            page.cited(MODES).line("K_m", "modes that it implies", "1/({g2_m} - 1)", modes, "");
            page.line("p", "pump variance that would give as many", "{v_A}/({K_m}^2 - 1)", variance, "(rad/s)^2");
        }
        String p = measured ? "{p}" : "{s_P}^2";
        page.line(
                "K_A",
                "modes of alice's arm behind her own filters, one bin",
                "sqrt(1 + {v_A}/" + p + ")",
                spectrum.armSchmidtA(),
                "");
        page.line("K_B", "the same, bob", "sqrt(1 + {v_B}/" + p + ")", spectrum.armSchmidtB(), "");
    }

    private void pair() {
        String meaning = "Schmidt number of the pair behind all filters, one bin";
        if (source.schmidtNumber().isPresent()) {
            page.input("K", meaning, spectrum.schmidtNumber(), "", "source.schmidtNumber");
        } else if (source.unheraldedG2().isPresent()) {
            page.line(
                    "K", meaning, "1/sqrt(1/{K_A}^2 + 1/{K_B}^2 - 1/({K_A}^2 {K_B}^2))", spectrum.schmidtNumber(), "");
        } else {
            double r = spectrum.covariance() / Math.sqrt(spectrum.varianceA() * spectrum.varianceB());
            page.line("r", "correlation of the detunings", "{Sigma_AB}/sqrt({Sigma_AA} {Sigma_BB})", r, "");
            page.line("K", meaning, "1/sqrt(1 - {r}^2)", spectrum.schmidtNumber(), "");
        }
    }
}
