package binspan.scenario;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** What the fields of a scenario ask of one another: alternatives, fields that a pump mode needs, unique labels. */
final class ScenarioRules {
    private static final List<String> ARMS = List.of("alice", "bob");

    private final Values stated;
    private final List<Problem> problems;

    private ScenarioRules(Values stated, List<Problem> problems) {
        this.stated = stated;
        this.problems = problems;
    }

    static void check(Values stated, List<Problem> problems) {
        ScenarioRules rules = new ScenarioRules(stated, problems);
        rules.pump();
        rules.source();
        rules.photons();
        ARMS.forEach(rules::arm);
        PathCheck.check(stated, problems);
    }

    private Object mode() {
        return stated.section("source").section("pump").get("mode");
    }

    private void pump() {
        Values pump = stated.section("source").section("pump");
        String path = "source.pump";
        if (mode() == PumpMode.PULSE_PAIR) {
            needed(pump, path, "repetitionRateMHz", "pulse-pair");
        }
        if (mode() instanceof PumpMode mode && mode != PumpMode.CONTINUOUS) {
            needed(pump, path, "pairEmissionFwhmPs", mode.text());
        }
    }

    private void source() {
        Values source = stated.section("source");
        if (mode() instanceof PumpMode mode) {
            List.of("signal", "idler").forEach(name -> excluded(source.section(name), "source." + name, mode));
            String needed = mode == PumpMode.CONTINUOUS ? "pairRatePerSecond" : "meanPairsPerCycle";
            needed(source, "source", needed, mode.text());
            excluded(source, "source", mode);
        }
    }

    private void photons() {
        Object alice = stated.section("alice").get("photon");
        Object bob = stated.section("bob").get("photon");
        if (alice != null && alice == bob) {
            problem(
                    "bob.photon",
                    "found " + ((Photon) bob).text() + ", which alice has; allowed the other photon of the pair");
        }
    }

    private void arm(String name) {
        Values arm = stated.section(name);
        List<Values> path = arm.list("path");
        Set<String> labels = new HashSet<>();
        for (int i = 0; i < path.size(); i++) {
            Values element = path.get(i);
            String at = name + ".path[" + i + "]";
            element.text("label")
                    .filter(label -> !labels.add(label))
                    .ifPresent(label -> problem(
                            at + ".label",
                            "found \"" + label + "\" a second time; allowed a label that no other element has"));
            element(element, at, path.subList(i + 1, path.size()));
        }
        List<Values> detectors = arm.list("detectors");
        for (int i = 0; i < detectors.size(); i++) {
            detector(detectors.get(i), name + ".detectors[" + i + "]");
        }
    }

    private void element(Values element, String path, List<Values> after) {
        boolean lossStated = element.has("lossDb") || element.has("figureOfMeritPsPerNmDb");
        if (element.type().equals("compensator") && !lossStated) {
            problem(path, "missing one of lossDb, figureOfMeritPsPerNmDb");
        }
        boolean filtered = after.stream().anyMatch(next -> next.type().equals("filter"));
        if (!element.list("classicalChannels").isEmpty() && !filtered) {
            problem(
                    path + ".classicalChannels",
                    "found classical light and no filter after this fibre; needs a filter element between here and the analyzer");
        }
    }

    private void detector(Values detector, String path) {
        boolean gated = detector.has("gate")
                || (detector.get("class") instanceof DetectorClass known
                        && known.gate().isPresent()
                        && !detector.has("darkCountsPerSecond"));
        if (gated && mode() == PumpMode.CONTINUOUS) {
            problem(
                    detector.has("gate") ? path + ".gate" : path + ".class",
                    "found gating with a continuous pump, which has no slots to gate; needs a free-running detector");
        }
    }

    private void needed(Values object, String path, String field, String mode) {
        if (!object.has(field)) {
            problem(path + "." + field, "missing; a " + mode + " pump needs it");
        }
    }

    private void excluded(Values object, String path, PumpMode mode) {
        for (String field : object.asMap().keySet()) {
            PumpFields.insteadOf(field, mode)
                    .ifPresent(other ->
                            problem(path + "." + field, "does not go with a " + mode.text() + " pump; give " + other));
        }
    }

    private void problem(String path, String message) {
        problems.add(new Problem(path, message));
    }
}
