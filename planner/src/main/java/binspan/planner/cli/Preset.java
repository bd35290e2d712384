package binspan.planner.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Starter scenarios. */
enum Preset {
    PULSE_PAIR("pulse-pair", "two pump pulses per cycle, nanowire detectors, 2 x 30 km"),
    CONTINUOUS("continuous", "continuous pump, nanowire detectors, 2 x 25 km"),
    PULSE_TRAIN("pulse-train", "endless pump pulses at 1 GHz, nanowire detectors, 2 x 50 km"),
    AVALANCHE("avalanche", "two pump pulses per cycle, gated avalanche diodes, 2 x 10 km"),
    COEXISTENCE("coexistence", "continuous pump, telemetry light in the same fibres, 2 x 15 km");

    private final String text;
    private final String summary;

    Preset(String text, String summary) {
        this.text = text;
        this.summary = summary;
    }

    /** Its name on the command line. */
    String text() {
        return text;
    }

    /** What it is, in a few words. */
    String summary() {
        return summary;
    }

    /** The scenario with its comments. */
    String scenario() {
        try (InputStream in = Preset.class.getResourceAsStream("/binspan/planner/presets/" + text + ".json")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new IllegalStateException("preset " + text, e);
        }
    }

    /** All names. */
    static List<String> names() {
        List<String> names = new ArrayList<>();
        for (Preset preset : values()) {
            names.add(preset.text);
        }
        return names;
    }

    /**
     * The preset of a name.
     *
     * @throws UsageException if there is none
     */
    static Preset named(String name) throws UsageException {
        for (Preset preset : values()) {
            if (preset.text.equals(name)) {
                return preset;
            }
        }
        throw UsageException.unknown("preset", name, names());
    }
}
