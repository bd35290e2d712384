package binspan.worksheet;

import binspan.optics.Imbalances;
import binspan.optics.PhaseVariance;
import binspan.scenario.Analyzer;
import binspan.scenario.Pump;
import binspan.units.Scale;

/** Section 5: variance of the two-photon phase, cause by cause. */
final class WorksheetPhase {
    private final WorksheetPage page;
    private final Pump pump;
    private final Imbalances imbalances;
    private final PhaseVariance variance;

    private WorksheetPhase(WorksheetPage page) {
        this.page = page;
        this.pump = page.scenario().source().pump();
        this.imbalances = page.prediction().imbalances();
        this.variance = PhaseVariance.of(page.scenario(), imbalances);
    }

    static void write(WorksheetPage page) {
        WorksheetPhase phase = new WorksheetPhase(page);
        phase.analyzer(page.sides().get(0), phase.variance.analyzerA(), phase.variance.temperatureA());
        phase.analyzer(page.sides().get(1), phase.variance.analyzerB(), phase.variance.temperatureB());
        String sum = "{vp_A} + {vp_B} + {vt_A} + {vt_B}" + phase.pumpInterferometer() + phase.drift();
        page.line("var", "variance of the two-photon phase", sum, phase.variance.total(), "rad^2");
        double left = page.prediction().coherence().phase();
        page.line("g_phase", "what phase noise leaves", "exp(-{var}/2)", left, "");
    }

    private void analyzer(WorksheetSide side, double noise, double temperature) {
        Analyzer analyzer = side.arm().analyzer();
        String at = side.name() + ".analyzer.";
        String of = side.name() + ": ";
        double imbalance = side.isAlice() ? imbalances.alice() : imbalances.bob();
        double perKelvin = PhaseVariance.radPerKelvin(analyzer, side.band().centreHz(), imbalance);
        double rms = analyzer.temperatureRmsMilliK() * Scale.MILLI;
        page.input(
                side.of("ph"),
                of + "phase noise of the analyzer, rms",
                analyzer.phaseNoiseRmsRad(),
                "rad",
                at + "phaseNoiseRmsRad");
        page.line(side.of("vp"), of + "its variance", side.in("ph") + "^2", noise, "rad^2");
        page.input(
                side.of("kT"),
                of + "relative change of the imbalance with temperature",
                analyzer.relativeDelayPerK(),
                "1/K",
                at + "relativeDelayPerK");
        String slope = "2 pi " + side.in("nu") + " " + side.in("T") + " " + side.in("kT");
        page.line(side.of("rK"), of + "phase against temperature", slope, perKelvin, "rad/K");
        page.input(side.of("dTr"), of + "temperature of the analyzer, rms", rms, "K", at + "temperatureRmsMilliK");
        page.line(
                side.of("vt"),
                of + "phase variance by temperature",
                "(" + side.in("rK") + " " + side.in("dTr") + ")^2",
                temperature,
                "rad^2");
    }

    private String pumpInterferometer() {
        if (!pump.madeByInterferometer()) {
            return "";
        }
        page.input(
                "ph_P",
                "phase noise of the pump interferometer, rms",
                pump.phaseNoiseRmsRad(),
                "rad",
                "source.pump.phaseNoiseRmsRad");
        page.line("vp_P", "its variance", "{ph_P}^2", variance.pumpInterferometer(), "rad^2");
        return " + {vp_P}";
    }

    private String drift() {
        double drift = pump.frequencyDriftRmsMHz() * Scale.MEGA;
        String effective = pump.madeByInterferometer() ? "({T_A} + {T_B})/2 - {T_P}" : "({T_A} + {T_B})/2";
        page.input("dr", "drift of the pump light, rms", drift, "Hz", "source.pump.frequencyDriftRmsMHz");
        page.line("T_eff", "delay over which it turns the phase", effective, imbalances.effective(pump), "s");
        page.line("v_dr", "phase variance by drift", "(2 pi {dr} {T_eff})^2", variance.pumpDrift(), "rad^2");
        return " + {v_dr}";
    }
}
