package binspan.prediction;

import binspan.counting.DetectorLoad;
import binspan.scenario.Arm;
import binspan.scenario.Detector;
import binspan.scenario.Gate;
import binspan.units.Scale;
import java.util.List;

/** Where detectors strain the model. */
final class DetectorCautions {
    private static final double MOSTLY_READY = 0.9;
    private static final double FEW_PER_WINDOW = 0.05;
    private static final double ALIKE = 0.1;

    private DetectorCautions() {}

    static void add(LinkPrediction p, Cautions cautions) {
        side(p, "alice", p.scenario().alice(), p.counts().loadsA(), cautions);
        side(p, "bob", p.scenario().bob(), p.counts().loadsB(), cautions);
    }

    private static void side(LinkPrediction p, String name, Arm arm, List<DetectorLoad> loads, Cautions cautions) {
        double wavelength = p.scenario().bandOf(arm).centreNm();
        for (int port = 0; port < loads.size(); port++) {
            String at = name + " port " + (port + 1);
            Detector detector = arm.detectors().get(port);
            load(p, at, loads.get(port), cautions);
            gate(p, at, detector, loads.get(port), cautions);
            detector.detectorClass()
                    .ifPresent(known -> cautions.when(
                            wavelength < known.shortestNm() || wavelength > known.longestNm(),
                            "detector-wavelength",
                            "%s: a detector of class %s works from %.0f to %.0f nm, the photon has %.1f nm.",
                            at,
                            known.text(),
                            known.shortestNm(),
                            known.longestNm(),
                            wavelength));
        }
        ports(name, arm, cautions);
    }

    private static void load(LinkPrediction p, String at, DetectorLoad load, Cautions cautions) {
        cautions.when(
                load.liveFraction() < MOSTLY_READY,
                "dead-time",
                "%s: the detector is ready %.0f %% of the time only; the dead-time model is a mean-rate one.",
                at,
                100.0 * load.liveFraction());
        cautions.when(
                load.recordedPerSecond() * p.windowWidth() > FEW_PER_WINDOW,
                "singles-crowd-window",
                "%s: %.2f singles per window on average; accidentals are no longer a small correction.",
                at,
                load.recordedPerSecond() * p.windowWidth());
        cautions.when(
                load.deadTime() > p.imbalances().common(),
                "dead-time-blinds-slots",
                "%s: the dead time is longer than the slot separation, so a click blinds the later slots of its cycle.",
                at);
    }

    private static void gate(LinkPrediction p, String at, Detector detector, DetectorLoad load, Cautions cautions) {
        if (detector.gate().isEmpty()) {
            return;
        }
        Gate gate = detector.gate().get();
        cautions.when(
                load.gateShare() < 1.0,
                "gates-miss-slots",
                "%s: gates reach %.0f %% of the slots (one gate for each slot is three per cycle of a pulse pair); the other cycles are lost.",
                at,
                100.0 * load.gateShare());
        cautions.when(
                gate.widthNs() * Scale.NANO < p.windowWidth(),
                "gate-narrower-than-window",
                "%s: the gate (%.2f ns) is narrower than the window; photons outside it are counted all the same.",
                at,
                gate.widthNs());
    }

    private static void ports(String name, Arm arm, Cautions cautions) {
        if (arm.detectors().size() < 2) {
            return;
        }
        double first = arm.detectors().get(0).efficiency();
        double second = arm.detectors().get(1).efficiency();
        cautions.when(
                Math.abs(first - second) > ALIKE * Math.max(first, second),
                "ports-differ",
                "%s: the efficiencies of the two ports differ by more than 10 %%, so that the bits are biased.",
                name);
    }
}
