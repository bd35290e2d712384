package binspan.worksheet;

import binspan.optics.ArrivalTime;
import binspan.optics.PortTiming;
import binspan.prediction.LinkPrediction;
import binspan.scenario.Arm;
import binspan.units.GaussianWidth;
import binspan.units.Scale;

/** Section 3: spread of the arrival times by light, detectors and clocks. */
final class WorksheetArrival {
    private final WorksheetPage page;

    private WorksheetArrival(WorksheetPage page) {
        this.page = page;
    }

    static void write(WorksheetPage page) {
        page.section("3 Arrival time");
        double separation = page.prediction().imbalances().common();
        page.input(
                "T", "common delay of the interferometers and distance of the slots", separation, "s", "imbalanceNs");
        WorksheetArrival arrival = new WorksheetArrival(page);
        if (page.scenario().pulsed()) {
            arrival.pulsedLight();
        } else {
            arrival.continuousLight();
        }
        for (WorksheetSide side : page.sides()) {
            arrival.site(side);
            for (int port = 0; port < side.ports().size(); port++) {
                arrival.port(new WorksheetPort(page, side, port));
            }
        }
        page.input("w", "full width of the window", page.prediction().windowWidth(), "s", "timing.windowWidthPs");
        arrival.difference();
    }

    private void pulsedLight() {
        ArrivalTime arrival = page.prediction().arrival();
        variance(
                "St_AA",
                "variance of the arrival by the light, alice's photon of a pair",
                "{L_AA}/4 + {beta_A}^2 {Sigma_AA}",
                arrival.pairA());
        variance("St_BB", "the same, bob's photon of a pair", "{L_BB}/4 + {beta_B}^2 {Sigma_BB}", arrival.pairB());
        variance("St_AB", "covariance of the two", "{L_AB}/4 + {beta_A} {beta_B} {Sigma_AB}", arrival.pairCovariance());
        variance(
                "S1_A",
                "variance of alice's singles, whose spectrum is wider",
                "{L_AA}/4 + {beta_A}^2 {v_A}",
                arrival.singlesA());
        variance("S1_B", "variance of bob's singles", "{L_BB}/4 + {beta_B}^2 {v_B}", arrival.singlesB());
    }

    private void continuousLight() {
        LinkPrediction p = page.prediction();
        double beta = p.pathA().groupDelayDispersion() + p.pathB().groupDelayDispersion();
        page.cited("Franson, Phys. Rev. A 45, 3126 (1992)");
        variance("beta", "dispersion that counts: opposite signs cancel", "{beta_A} + {beta_B}", beta);
        double light = ArrivalTime.differenceVariance(p.spectrum(), beta);
        variance("St", "variance of t_A - t_B by the light", "(1/{v_A} + 1/{v_B})/4 + {beta}^2 {Sigma_AA}", light);
    }

    private void variance(String symbol, String meaning, String formula, double value) {
        page.line(symbol, meaning, formula, value, "s^2");
    }

    private void site(WorksheetSide side) {
        Arm arm = side.arm();
        String name = side.name();
        page.input(
                side.of("clk"),
                name + ": jitter of the site clock, rms",
                arm.clockJitterRmsPs() * Scale.PICO,
                "s",
                name + ".clockJitterRmsPs");
        page.input(
                side.of("tag"),
                name + ": bin width of the time tagger",
                arm.tagBinPs() * Scale.PICO,
                "s",
                name + ".tagBinPs");
    }

    private void port(WorksheetPort port) {
        WorksheetSide side = port.side();
        PortTiming timing = side.ports().get(port.port());
        double fwhm = port.detector().jitterFwhmPs() * Scale.PICO;
        port.input("jit", "detector jitter, FWHM", fwhm, "s", "jitterFwhmPs");
        port.line("j", "the same, rms", port.in("jit") + "/2.354820", GaussianWidth.rms(fwhm), "s");
        String sum =
                port.in("j") + "^2 + " + side.in("clk") + "^2 + " + side.in("tag") + "^2/12 + " + side.in("tau") + "^2";
        port.line("V", "variance by detector, clock, tagger and fibre", sum, timing.variance(), "s^2");
        if (timing.tailed()) {
            port.input("pt", "share of clicks in an exponential tail", timing.tailFraction(), "", "jitterTailFraction");
            port.input("tt", "time constant of the tail", timing.tailTime(), "s", "jitterTailPs");
        }
        if (page.scenario().pulsed()) {
            ArrivalTime arrival = page.prediction().arrival();
            double light = side.isAlice() ? arrival.singlesA() : arrival.singlesB();
            String both = "sqrt(" + side.in("S1") + " + " + port.in("V") + ")";
            port.line("rms", "arrival of the singles, rms", both, Math.sqrt(light + timing.variance()), "s");
        }
    }

    private void difference() {
        if (!page.scenario().pulsed()) {
            double rms = page.prediction().correlationRms();
            page.line("rms", "rms of t_A - t_B, ports (1,1)", "sqrt({St} + {V_A1} + {V_B1})", rms, "s");
        }
    }
}
