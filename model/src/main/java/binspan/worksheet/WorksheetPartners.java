package binspan.worksheet;

import binspan.optics.PairSpectrum;
import binspan.optics.Passband;
import binspan.scenario.Band;
import binspan.scenario.Source;
import java.util.OptionalDouble;

/** Section 1: probability that a photon's partner passes its filters, and the photons of each arm that follow. */
final class WorksheetPartners {
    private final WorksheetPage page;
    private final PairSpectrum spectrum;
    private final Source source;

    private WorksheetPartners(WorksheetPage page) {
        this.page = page;
        this.spectrum = page.prediction().spectrum();
        this.source = page.scenario().source();
    }

    static void write(WorksheetPage page) {
        WorksheetPartners partners = new WorksheetPartners(page);
        partners.pass();
        partners.photons();
    }

    /** Variance of light that passes both arms' filters, the partner's mirrored onto it. */
    static String mirrored(PairSpectrum spectrum) {
        if (spectrum.gaussian()) {
            return "1/(1/{v_A} + 1/{v_B})";
        }
        boolean flat = spectrum.alice().flat() && spectrum.bob().flat();
        return flat ? "min({a_A}, {a_B})^2/3" : "variance of light that passes both filters, one mirrored";
    }

    private void pass() {
        OptionalDouble measured = source.partnerPassProbability();
        String toBob = "probability that bob's photon passes his filters when alice's does";
        String toAlice = "probability that alice's photon passes hers when bob's does";
        if (measured.isPresent()) {
            page.input("h_BA", toBob, spectrum.bobPassesGivenAlice(), "", "source.partnerPassProbability");
            page.input("h_AB", toAlice, spectrum.alicePassesGivenBob(), "", "source.partnerPassProbability");
            return;
        }
        String detuned = detuning();
        areas();
        page.line("h_BA", toBob, detuned + bobPasses(), spectrum.bobPassesGivenAlice(), "");
        page.line(
                "h_AB",
                toAlice,
                (alicePasses().contains("{h_BA}") ? "" : detuned) + alicePasses(),
                spectrum.alicePassesGivenBob(),
                "");
    }

    private String detuning() {
        if (source.pump().wavelengthNm().isEmpty()) {
            return "";
        }
        WorksheetSpectrum.energy(page);
        double missed = source.signal().centreHz() + source.idler().centreHz() - page.value("nu_P");
        double m = 2.0 * Math.PI * missed;
        double variance =
                spectrum.alice().variance() + spectrum.bob().variance() + spectrum.pumpRms() * spectrum.pumpRms();
        page.line(
                "D_m",
                "share of the pairs that this leaves",
                "exp(-(2 pi {m})^2/(2 ({v_A} + {v_B}" + pump() + ")))",
                Math.exp(-m * m / (2.0 * variance)),
                "");
        return "{D_m} x ";
    }

    private String pump() {
        return spectrum.continuous() ? "" : " + {s_P}^2";
    }

    /** Areas under the filters, where the closed forms of equal shapes do not hold. */
    private void areas() {
        if (spectrum.gaussian() || flat()) {
            edges();
            return;
        }
        Passband both = spectrum.mirrored();
        area("F_A", "area under alice's filters", spectrum.alice().area());
        area("F_B", "area under bob's filters", spectrum.bob().area());
        if (spectrum.continuous()) {
            area("F_AB", "area under both, one mirrored", both.area());
        }
    }

    private void area(String symbol, String meaning, double value) {
        page.line(symbol, meaning, "integral of the transmission over the detuning", value, "rad/s");
    }

    private void edges() {
        if (flat() && !spectrum.continuous()) {
            double a = spectrum.alice().halfWidth();
            double b = spectrum.bob().halfWidth();
            page.line(
                    "y_1",
                    "sum of the edges in rms of the pump",
                    "({a_A} + {a_B})/{s_P}",
                    (a + b) / spectrum.pumpRms(),
                    "");
            page.line(
                    "y_2",
                    "difference of the edges in rms of the pump",
                    "({a_A} - {a_B})/{s_P}",
                    (a - b) / spectrum.pumpRms(),
                    "");
        }
    }

    private boolean flat() {
        return spectrum.alice().flat() && spectrum.bob().flat();
    }

    private String bobPasses() {
        if (spectrum.gaussian()) {
            return "sqrt({v_B}/({v_A} + {v_B}" + pump() + "))";
        }
        if (flat()) {
            return spectrum.continuous() ? "min({a_A}, {a_B})/{a_A}" : edged("a_A");
        }
        return spectrum.continuous() ? "{F_AB}/{F_A}" : "share of alice's partners inside bob's filters, by quadrature";
    }

    private String alicePasses() {
        if (spectrum.gaussian()) {
            return "sqrt({v_A}/({v_A} + {v_B}" + pump() + "))";
        }
        if (flat()) {
            return spectrum.continuous() ? "min({a_A}, {a_B})/{a_B}" : edged("a_B");
        }
        return spectrum.continuous() ? "{F_AB}/{F_B}" : "{h_BA} {F_A}/{F_B}";
    }

    /** I(y) = y Phi(y) + phi(y); I(y) + I(-y) is even, so that the sign of the difference does not matter. */
    private static String edged(String own) {
        return "{s_P}/(2 {" + own + "}) [I({y_1}) + I(-{y_1}) - I({y_2}) - I(-{y_2})], I(y) = y Phi(y) + phi(y)";
    }

    private void photons() {
        String meaning = " inside all filters, before any loss";
        if (page.scenario().pulsed()) {
            double mean = source.meanPairsPerCycle().orElseThrow();
            page.input("mu", "pairs per cycle" + meaning, mean, "", "source.meanPairsPerCycle");
        } else {
            double rate = source.pairRatePerSecond().orElseThrow();
            page.input("R", "pairs per second" + meaning, rate, "1/s", "source.pairRatePerSecond");
        }
        for (WorksheetSide side : page.sides()) {
            photons(side);
        }
    }

    private void photons(WorksheetSide side) {
        boolean pulsed = page.scenario().pulsed();
        Band band = side.band();
        String unit = pulsed ? "" : "1/s";
        String per = pulsed ? "Cycle" : "Second";
        double lonely = pulsed ? band.uncorrelatedPhotonsPerCycle() : band.uncorrelatedPhotonsPerSecond();
        String path = side.bandPath() + ".uncorrelatedPhotonsPer" + per;
        page.input(side.of("u"), side.name() + ": photons that never had a partner", lonely, unit, path);
        String formula = (pulsed ? "{mu}" : "{R}") + (side.isAlice() ? "/{h_BA} + " : "/{h_AB} + ") + side.in("u");
        String meaning = "photons of " + side.name() + "'s arm per " + (pulsed ? "cycle" : "second");
        page.line(side.of("N"), meaning, formula, side.light().photons(), unit);
    }
}
