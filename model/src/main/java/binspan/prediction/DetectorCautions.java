package binspan.prediction;

import binspan.counting.DetectorLoad;
import binspan.scenario.Arm;
import binspan.scenario.Detector;
import binspan.scenario.DetectorClass;
import binspan.scenario.Gate;
import binspan.units.Scale;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;

/** Where detectors strain the model; ports with the same trouble share one caution. */
final class DetectorCautions {
    private static final double MOSTLY_READY = 0.9;
    private static final double FEW_PER_WINDOW = 0.05;
    private static final double ALIKE = 0.1;

    private final LinkPrediction p;
    private final List<Port> ports = new ArrayList<>();

    private DetectorCautions(LinkPrediction p) {
        this.p = p;
        addPorts("alice", p.scenario().alice(), p.counts().loadsA());
        addPorts("bob", p.scenario().bob(), p.counts().loadsB());
    }

    /** One detector with its load and the wavelength that it sees. */
    private record Port(String name, Detector detector, DetectorLoad load, double wavelengthNm) {
        boolean outsideClass() {
            return detector.detectorClass()
                    .map(known -> wavelengthNm < known.shortestNm() || wavelengthNm > known.longestNm())
                    .orElse(false);
        }
    }

    static void add(LinkPrediction p, Cautions cautions) {
        DetectorCautions detectors = new DetectorCautions(p);
        detectors.load(cautions);
        detectors.gates(cautions);
        detectors.wavelengths(cautions);
        unequal("alice", p.scenario().alice(), cautions);
        unequal("bob", p.scenario().bob(), cautions);
    }

    private void addPorts(String side, Arm arm, List<DetectorLoad> loads) {
        for (int port = 0; port < loads.size(); port++) {
            String name = side + " port " + (port + 1);
            ports.add(new Port(
                    name,
                    arm.detectors().get(port),
                    loads.get(port),
                    p.scenario().bandOf(arm).centreNm()));
        }
    }

    private void load(Cautions cautions) {
        List<Port> busy = with(port -> port.load().liveFraction() < MOSTLY_READY);
        cautions.when(
                !busy.isEmpty(),
                "dead-time",
                "%s: ready %.0f %% of the time only; the dead-time model is a mean-rate one.",
                names(busy),
                100.0 * least(busy, port -> port.load().liveFraction()));
        List<Port> crowded = with(port -> port.load().recordedPerSecond() * p.windowWidth() > FEW_PER_WINDOW);
        cautions.when(
                !crowded.isEmpty(),
                "singles-crowd-window",
                "%s: %.2f singles per window on average; accidentals are no longer a small correction.",
                names(crowded),
                -least(crowded, port -> -port.load().recordedPerSecond()) * p.windowWidth());
        List<Port> blind = with(port -> port.load().deadTime() > p.imbalances().common());
        cautions.when(
                !blind.isEmpty(),
                "dead-time-blinds-slots",
                "%s: the dead time is longer than the slot separation, so a click blinds the slots that follow it.",
                names(blind));
    }

    private void gates(Cautions cautions) {
        List<Port> missing = with(port -> port.load().gateShare() < 1.0);
        cautions.when(
                !missing.isEmpty(),
                "gates-miss-slots",
                "%s: gates reach %.0f %% of the slots (one gate for each slot is three per cycle of a pulse pair); the"
                        + " other cycles are lost.",
                names(missing),
                100.0 * least(missing, port -> port.load().gateShare()));
        List<Port> narrow = with(port ->
                port.detector().gate().map(Gate::widthNs).orElse(Double.MAX_VALUE) * Scale.NANO < p.windowWidth());
        cautions.when(
                !narrow.isEmpty(),
                "gate-narrower-than-window",
                "%s: the gate is narrower than the window; photons outside it are counted all the same.",
                names(narrow));
    }

    private void wavelengths(Cautions cautions) {
        for (Port port : with(Port::outsideClass)) {
            DetectorClass known = port.detector().detectorClass().orElseThrow();
            cautions.when(
                    true,
                    "detector-wavelength",
                    "%s: a detector of class %s works from %.0f to %.0f nm, the photon has %.1f nm.",
                    port.name(),
                    known.text(),
                    known.shortestNm(),
                    known.longestNm(),
                    port.wavelengthNm());
        }
    }

    private static void unequal(String side, Arm arm, Cautions cautions) {
        if (arm.detectors().size() < 2) {
            return;
        }
        double first = arm.detectors().get(0).efficiency();
        double second = arm.detectors().get(1).efficiency();
        cautions.when(
                Math.abs(first - second) > ALIKE * Math.max(first, second),
                "ports-differ",
                "%s: the efficiencies of the two ports differ by more than 10 %%, so that the bits are biased; S and key are overstated where both sides'"
                        + " ports differ.",
                side);
    }

    private List<Port> with(Predicate<Port> trouble) {
        return ports.stream().filter(trouble).toList();
    }

    private String names(List<Port> some) {
        return some.size() == ports.size()
                ? "all ports"
                : String.join(", ", some.stream().map(Port::name).toList());
    }

    private static double least(List<Port> some, ToDoubleFunction<Port> figure) {
        return some.stream().mapToDouble(figure).min().orElse(Double.NaN);
    }
}
