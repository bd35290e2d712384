package binspan.worksheet;

import binspan.optics.PairSpectrum;
import binspan.scenario.Pump;
import binspan.units.GaussianWidth;
import binspan.units.OpticalFrequency;
import binspan.units.Scale;

/** Section 1: filters, pump pulse, joint spectrum, modes. */
final class WorksheetSpectrum {
    private final WorksheetPage page;
    private final PairSpectrum spectrum;

    private WorksheetSpectrum(WorksheetPage page) {
        this.page = page;
        this.spectrum = page.prediction().spectrum();
    }

    static void write(WorksheetPage page) {
        page.section("1 Spectrum of the pair");
        page.sides().forEach(side -> WorksheetFilters.write(page, side));
        WorksheetSpectrum sheet = new WorksheetSpectrum(page);
        sheet.pumpPulse();
        sheet.inverse();
        sheet.covariance();
        WorksheetModes.write(page);
        WorksheetPartners.write(page);
    }

    private void pumpPulse() {
        Pump pump = page.scenario().source().pump();
        if (spectrum.continuous()) {
            return;
        }
        double fwhm = pump.pairEmissionFwhmPs().orElseThrow() * Scale.PICO;
        page.input(
                "t_FWHM", "pulse in which pairs are born, intensity FWHM", fwhm, "s", "source.pump.pairEmissionFwhmPs");
        page.line("t_p", "its rms", "{t_FWHM}/2.354820", GaussianWidth.rms(fwhm), "s");
        page.line(
                "s_P",
                "rms bandwidth of the pump pulse, transform limited",
                "1/(2 {t_p})",
                spectrum.pumpRms(),
                "rad/s");
    }

    /** The inverse covariance, which also sets the arrival times of a pulsed source. */
    private void inverse() {
        if (spectrum.continuous()) {
            return;
        }
        page.line(
                "L_AA",
                "inverse covariance of the detunings, alice",
                "1/{v_A} + 1/{s_P}^2",
                spectrum.inverseA(),
                "s^2");
        page.line("L_BB", "the same, bob", "1/{v_B} + 1/{s_P}^2", spectrum.inverseB(), "s^2");
        page.line("L_AB", "the same, off the diagonal", "1/{s_P}^2", spectrum.inversePump(), "s^2");
    }

    private void covariance() {
        covariance(
                "Sigma_AA",
                "variance of alice's detuning in a pair that passes all filters",
                alice(),
                spectrum.varianceA());
        covariance("Sigma_BB", "the same, bob", bob(), spectrum.varianceB());
        covariance("Sigma_AB", "covariance of the two", both(), spectrum.covariance());
    }

    private void covariance(String symbol, String meaning, String formula, double value) {
        page.line(symbol, meaning, formula, value, "(rad/s)^2");
    }

    private String alice() {
        if (spectrum.continuous()) {
            return WorksheetPartners.mirrored(spectrum);
        }
        return spectrum.gaussian()
                ? "{v_A} ({v_B} + {s_P}^2)/({v_A} + {v_B} + {s_P}^2)"
                : "mean of W_A^2 over exp(-(W_A + W_B)^2/(2 {s_P}^2)) inside the filters, by quadrature";
    }

    private String bob() {
        if (spectrum.continuous()) {
            return "{Sigma_AA}";
        }
        return spectrum.gaussian()
                ? "{v_B} ({v_A} + {s_P}^2)/({v_A} + {v_B} + {s_P}^2)"
                : "mean of W_B^2 over the same, by quadrature";
    }

    private String both() {
        if (spectrum.continuous()) {
            return "-{Sigma_AA}";
        }
        return spectrum.gaussian()
                ? "-{v_A} {v_B}/({v_A} + {v_B} + {s_P}^2)"
                : "mean of W_A W_B over the same, by quadrature";
    }

    /** How far the band centres miss the pump's energy, where its wavelength is stated. */
    static void energy(WorksheetPage page) {
        double wavelength = page.scenario().source().pump().wavelengthNm().orElseThrow();
        double pumpHz = OpticalFrequency.ofWavelengthNm(wavelength);
        double missed = page.scenario().source().signal().centreHz()
                + page.scenario().source().idler().centreHz()
                - pumpHz;
        page.input(
                "lambda_P",
                "vacuum wavelength of the light that pumps the pairs",
                wavelength,
                "nm",
                "source.pump.wavelengthNm");
        page.line("nu_P", "its frequency", "c/{lambda_P}", pumpHz, "Hz");
        page.line("m", "energy that the band centres miss", "{nu_A} + {nu_B} - {nu_P}", missed, "Hz");
    }
}
