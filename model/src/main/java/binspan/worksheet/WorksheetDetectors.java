package binspan.worksheet;

import binspan.counting.ArmLight;
import binspan.counting.DetectorLoad;
import binspan.scenario.Detector;
import binspan.scenario.Gate;
import binspan.units.Scale;

/** Section 6: what each detector records in all, how much of the time it is ready, and its noise in a window. */
final class WorksheetDetectors {
    private final WorksheetPage page;
    private final WorksheetPort port;
    private final Detector detector;
    private final DetectorLoad load;

    private WorksheetDetectors(WorksheetPort port) {
        this.page = port.page();
        this.port = port;
        this.detector = port.detector();
        this.load = port.side().loads().get(port.port());
    }

    static void write(WorksheetPage page) {
        page.section("6 Detectors");
        if (page.scenario().pulsed()) {
            cycles(page);
        }
        for (WorksheetSide side : page.sides()) {
            for (int i = 0; i < side.loads().size(); i++) {
                WorksheetDetectors sheet = new WorksheetDetectors(new WorksheetPort(page, side, i));
                sheet.gates();
                sheet.light();
                sheet.noiseSources();
                sheet.recorded();
                sheet.noise();
            }
        }
    }

    private static void cycles(WorksheetPage page) {
        double cycles = page.prediction().cyclesPerSecond();
        if (page.endless()) {
            page.line("f", "pulses per second", "1/{T}", cycles, "1/s");
        } else {
            page.input("f", "pump cycles per second", cycles, "1/s", "source.pump.repetitionRateMHz");
        }
    }

    private boolean gated() {
        return detector.gate().isPresent();
    }

    private void gates() {
        if (!gated()) {
            return;
        }
        Gate gate = detector.gate().get();
        double slots = (page.endless() ? 1.0 : 3.0) * page.prediction().cyclesPerSecond();
        double width = gate.widthNs() * Scale.NANO;
        double rate = gate.rateMHz().isPresent() ? gate.rateMHz().getAsDouble() * Scale.MEGA : slots;
        String perCycle = page.endless() ? "{f}" : "3 {f}";
        port.input("wg", "sensitive width of a gate", width, "s", "gate.widthNs");
        port.input("pd", "dark click probability of a gate", gate.darkProbability(), "", "gate.darkProbability");
        if (gate.rateMHz().isPresent()) {
            port.input("fg", "gates per second", rate, "1/s", "gate.rateMHz");
        } else {
            port.line("fg", "gates per second, one for each slot", perCycle, rate, "1/s");
        }
        String open = "min(1, " + in("fg") + " " + in("wg") + ")";
        port.line("du", "share of the time with an open gate", open, Math.min(1.0, rate * width), "");
        String gates = "min(1, " + in("fg") + "/(" + perCycle + "))";
        port.line("gs", "share of the slots with a gate", gates, load.gateShare(), "");
    }

    private void light() {
        ArmLight light = port.side().light();
        String detected = in("eff") + " " + port.side().in("eta") + " ";
        port.input("eff", "detection efficiency", detector.efficiency(), "", "efficiency");
        port.line(
                "sh",
                "share of the arm's photons detected by the short path",
                detected + path("s"),
                light.shortTo(port.port()),
                "");
        port.line("lo", "the same by the long path", detected + path("l"), light.longTo(port.port()), "");
        String cycles = page.scenario().pulsed() ? " {f}" : "";
        String gates = gated() ? " " + in("gs") : "";
        String photons = port.side().in("N") + cycles + " (" + in("sh") + " + " + in("lo") + ")" + gates;
        port.line("ph", "detected photons of the source, dead time apart", photons, load.photonsPerSecond(), "1/s");
    }

    /** Share of an analyzer path into this port. */
    private String path(String way) {
        return "{" + way + (port.port() + 1) + "_" + port.side().letter() + "}";
    }

    private void noiseSources() {
        port.input(
                "bg",
                "counts by stray light",
                detector.backgroundCountsPerSecond(),
                "1/s",
                "backgroundCountsPerSecond");
        String shares = "(" + path("s") + " + " + path("l") + ")";
        String background = in("bg") + " + " + port.side().in("stray") + " " + shares + " " + in("eff");
        if (gated()) {
            port.line("dk", "dark counts", in("pd") + "/" + in("wg") + " x " + in("du"), load.darkPerSecond(), "1/s");
            background = "(" + background + ") " + in("du");
        } else {
            port.input("dk", "dark counts", load.darkPerSecond(), "1/s", "darkCountsPerSecond");
        }
        port.line("back", "stray and classical light", background, load.backgroundPerSecond(), "1/s");
    }

    private void recorded() {
        double raw = load.photonsPerSecond() + load.darkPerSecond() + load.backgroundPerSecond();
        String clicks = in("raw") + " (1 + " + in("pa") + ")";
        port.input("pa", "afterpulses per click", detector.afterpulseProbability(), "", "afterpulseProbability");
        port.input("td", "dead time", load.deadTime(), "s", "deadTimeNs");
        port.line(
                "raw",
                "clicks of light and noise, dead time apart",
                in("ph") + " + " + in("dk") + " + " + in("back"),
                raw,
                "1/s");
        port.line(
                "live",
                "share of the time in which it is ready",
                "1/(1 + " + clicks + " " + in("td") + ")",
                load.liveFraction(),
                "");
        port.line("S", "recorded singles", clicks + " " + in("live"), load.recordedPerSecond(), "1/s");
    }

    private void noise() {
        String sum = in("dk") + " + " + in("back") + " + " + in("pa") + " " + in("raw") + " " + in("live");
        String density = gated() ? "(" + sum + ")/" + in("du") : sum;
        port.line(
                "nd",
                "noise clicks per second of open gate, afterpulses included",
                density,
                load.noiseDensity(),
                "1/s");
        if (page.scenario().pulsed()) {
            String open = gated() ? "min({w}, " + in("wg") + ")" : "{w}";
            double clicks = load.noiseClicks(page.prediction().windowWidth(), detector);
            port.line("d", "noise clicks in a window", in("nd") + " " + open, clicks, "");
        }
    }

    private String in(String symbol) {
        return port.in(symbol);
    }
}
