package binspan.worksheet;

import binspan.optics.Imbalances;
import binspan.optics.TwoPhotonCoherence;
import binspan.scenario.Analyzer;
import binspan.scenario.Lineshape;
import binspan.scenario.Pump;
import binspan.units.Scale;

/** Section 5: what is left of the two-photon interference, cause by cause. */
final class WorksheetCoherence {
    private final WorksheetPage page;
    private final Pump pump;
    private final Imbalances imbalances;
    private final TwoPhotonCoherence coherence;

    private WorksheetCoherence(WorksheetPage page) {
        this.page = page;
        this.pump = page.scenario().source().pump();
        this.imbalances = page.prediction().imbalances();
        this.coherence = page.prediction().coherence();
    }

    static void write(WorksheetPage page) {
        page.section("5 Coherence");
        WorksheetCoherence sheet = new WorksheetCoherence(page);
        sheet.delays();
        sheet.pumpCoherence();
        WorksheetSpectralOverlap.write(page);
        WorksheetPhase.write(page);
        sheet.rest();
    }

    private void delays() {
        for (WorksheetSide side : page.sides()) {
            double mismatch = side.arm().analyzer().mismatchPs() * Scale.PICO;
            double delay = side.isAlice() ? imbalances.alice() : imbalances.bob();
            page.input(
                    side.of("mis"),
                    side.name() + ": mismatch of the analyzer",
                    mismatch,
                    "s",
                    side.name() + ".analyzer.mismatchPs");
            page.line(side.of("T"), side.name() + ": imbalance of the analyzer", "{T} + " + side.in("mis"), delay, "s");
        }
        if (page.scenario().pulsed() && !page.endless()) {
            page.input(
                    "mis_P",
                    "mismatch of the pump pulses",
                    pump.mismatchPs() * Scale.PICO,
                    "s",
                    "source.pump.mismatchPs");
            page.line("T_P", "distance of the pump pulses", "{T} + {mis_P}", imbalances.pump(), "s");
        }
    }

    private void pumpCoherence() {
        if (pump.madeByInterferometer()) {
            page.line("g_pump", "pump coherence, one pulse split by an interferometer", "1", coherence.pump(), "");
            return;
        }
        coherenceTime();
        double delay = imbalances.emissions(pump);
        String formula = !page.scenario().pulsed() ? "({T_A} + {T_B})/2" : page.endless() ? "{T}" : "{T_P}";
        page.line("T_e", "delay between the emissions that interfere", formula, delay, "s");
        boolean lorentzian = pump.lineshape() == Lineshape.LORENTZIAN;
        page.line(
                "g_pump",
                "pump coherence, " + pump.lineshape().text() + " line",
                lorentzian ? "exp(-{T_e}/{t_c})" : "exp(-({T_e}/{t_c})^2)",
                coherence.pump(),
                "");
    }

    private void coherenceTime() {
        double time = TwoPhotonCoherence.coherenceTime(pump);
        String meaning = "coherence time of the pump, 1/e of |g1|";
        if (pump.coherenceTimeNs().isPresent()) {
            page.input("t_c", meaning, time, "s", "source.pump.coherenceTimeNs");
        } else if (pump.linewidthMHz().isPresent()) {
            page.input(
                    "lw",
                    "line width of the pump, FWHM",
                    pump.linewidthMHz().getAsDouble() * Scale.MEGA,
                    "Hz",
                    "source.pump.linewidthMHz");
            page.line(
                    "t_c",
                    meaning,
                    pump.lineshape() == Lineshape.LORENTZIAN ? "1/(pi {lw})" : "2 sqrt(ln 2)/(pi {lw})",
                    time,
                    "s");
        } else {
            page.otherwise("not stated: taken as perfectly coherent")
                    .input("t_c", meaning, time, "s", "source.pump.coherenceTimeNs");
        }
    }

    private void rest() {
        for (WorksheetSide side : page.sides()) {
            Analyzer analyzer = side.arm().analyzer();
            String at = side.name() + ".analyzer.";
            page.input(
                    side.of("pol"),
                    side.name() + ": overlap of the two paths' polarizations",
                    analyzer.polarizationOverlap(),
                    "",
                    at + "polarizationOverlap");
            page.input(
                    side.of("set"),
                    side.name() + ": static error of the phase setting",
                    analyzer.phaseSettingErrorRad(),
                    "rad",
                    at + "phaseSettingErrorRad");
        }
        page.line("g_pol", "what polarization leaves", "{pol_A} {pol_B}", coherence.polarization(), "");
        page.line("delta", "static phase error", "{set_A} + {set_B}", coherence.phaseOffset(), "rad");
        page.line("gamma", "two-photon coherence", "{g_pump} {g_spec} {g_phase} {g_pol}", coherence.gamma(), "");
    }
}
