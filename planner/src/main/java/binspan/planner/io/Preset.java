package binspan.planner.io;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Starter scenarios. */
public enum Preset {
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
    public String text() {
        return text;
    }

    /** What it is, in a few words. */
    public String summary() {
        return summary;
    }

    /** The scenario with its comments. */
    public String scenario() {
        try (InputStream in = Preset.class.getResourceAsStream("/binspan/planner/presets/" + text + ".json")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new IllegalStateException("preset " + text, e);
        }
    }

    /** All names. */
    public static List<String> names() {
        List<String> names = new ArrayList<>();
        for (Preset preset : values()) {
            names.add(preset.text);
        }
        return names;
    }

    /** The preset of a name, if there is one. */
    public static Optional<Preset> find(String name) {
        return Arrays.stream(values()).filter(each -> each.text.equals(name)).findFirst();
    }
}
