package binspan.planner.document;

import binspan.planner.document.Change.Delete;
import binspan.planner.document.Change.Insert;
import binspan.planner.document.Change.Move;
import binspan.planner.document.Change.Put;
import binspan.planner.document.Change.Remove;
import binspan.scenario.Arm;
import binspan.scenario.Scenario;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;

/** Edits that a hand could make, the same for the same seed. */
final class RandomEdits {
    private static final List<String> NUMBERS = List.of(
            "imbalanceNs",
            "timing.windowWidthPs",
            "acquisition.secondsPerPoint",
            "protocol.errorCorrectionEfficiency",
            "require.carAtLeast",
            "require.chshAtLeast",
            "alice.clockJitterRmsPs",
            "bob.tagBinPs",
            "alice.analyzer.pathDispersionPs2",
            "bob.analyzer.mismatchPs",
            "alice.detectors[0].efficiency",
            "bob.detectors[0].deadTimeNs",
            "source.signal.bandwidthFwhmGHz",
            "source.idler.wavelengthNm",
            "source.schmidtNumber",
            "source.unheraldedG2");

    private final Random random;

    RandomEdits(long seed) {
        random = new Random(seed);
    }

    Change next(Scenario scenario) {
        boolean first = random.nextBoolean();
        String list = (first ? "alice" : "bob") + ".path";
        Arm arm = first ? scenario.alice() : scenario.bob();
        int size = arm.path().size();
        return switch (random.nextInt(9)) {
            case 0 -> new Insert(list, random.nextInt(size + 1), panel());
            case 1 -> new Delete(list, random.nextInt(size + 1));
            case 2, 3 -> new Move(list, random.nextInt(size + 1), random.nextInt(size + 1));
            case 4 -> new Put(list + "[" + random.nextInt(size + 1) + "].label", "label " + random.nextInt(20));
            case 5 -> new Remove(NUMBERS.get(random.nextInt(NUMBERS.size())));
            case 6 ->
                new Put(
                        "provenance." + list + "[" + random.nextInt(size + 1) + "].lossDb",
                        "note " + random.nextInt(9));
            case 7 -> new Remove("provenance." + list + "[" + random.nextInt(size + 1) + "].lossDb");
            default -> new Put(NUMBERS.get(random.nextInt(NUMBERS.size())), 1.0 + random.nextInt(1000) / 1000.0);
        };
    }

    private Map<String, Object> panel() {
        Map<String, Object> panel = new LinkedHashMap<>();
        panel.put("type", "loss");
        if (random.nextBoolean()) {
            panel.put("label", "label " + random.nextInt(20));
        }
        panel.put("lossDb", random.nextInt(100) / 10.0);
        return panel;
    }
}
