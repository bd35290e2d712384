package binspan.scenario;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * Plausible links for tests: what a scenario file would state, free to be edited, and the scenario it makes.
 *
 * <p>All of them have two arms of 30 km standard fibre and nanowire detectors at both ports; numbers are those of
 * common practice. Every call makes new {@link Values}, so that a test may change its own without disturbing another's.
 */
public final class SampleScenarios {
    private SampleScenarios() {}

    /** Pulse pair at 80 MHz made by an interferometer, bins 2 ns apart. */
    public static Values pulsePair() {
        Values pump = new Values()
                .put("mode", PumpMode.PULSE_PAIR)
                .put("repetitionRateMHz", 80.0)
                .put("pairEmissionFwhmPs", 40.0);
        return link("pulse pair", 2.0, source(pump).put("meanPairsPerCycle", 0.03), 400.0);
    }

    /** Continuous pump with 4 million pairs per second, interferometers of 2 ns. */
    public static Values continuous() {
        Values pump = new Values().put("mode", PumpMode.CONTINUOUS).put("coherenceTimeNs", 300.0);
        return link("continuous", 2.0, source(pump).put("pairRatePerSecond", 4e6), 400.0);
    }

    /** Pulse train of 1.25 GHz. */
    public static Values pulseTrain() {
        Values pump = new Values()
                .put("mode", PumpMode.PULSE_TRAIN)
                .put("pairEmissionFwhmPs", 40.0)
                .put("coherenceTimeNs", 300.0);
        return link("pulse train", 0.8, source(pump).put("meanPairsPerCycle", 0.01), 300.0);
    }

    /**
     * The pulse pair with at least one of everything that a file can hold: all kinds of path elements, classical light,
     * a gate beside free-running detectors, requirements, spreads and notes of provenance.
     */
    public static Values everything() {
        Values values = pulsePair().put("name", "everything");
        part(values, "source").put("schmidtNumber", 3.2).put("partnerPassProbability", 0.8);
        part(values, "source.pump")
                .put("wavelengthNm", 774.86)
                .put("preparation", Preparation.MODULATOR)
                .put("linewidthMHz", 0.5);
        part(values, "alice").put("path", elements());
        part(values, "alice.detectors[0]").put("class", DetectorClass.SNSPD_COLD_FILTER);
        part(values, "bob").put("detectors", new ArrayList<>(List.of(gated())));
        values.put("require", new Values().put("rawVisibilityAtLeast", 0.85).put("firstKeyWithinHours", 24.0));
        values.put("protocol", new Values().put("errorCorrectionEfficiency", 1.2));
        values.put("acquisition", new Values().put("fringePoints", 20.0));
        values.put(
                "spread",
                Map.of(
                        "both.detectors.efficiency",
                        new Values().put("normal", 0.05).put("relative", true)));
        values.put("provenance", Map.of("alice.path.valley duct.measuredLossDb", "reflectometer, both directions"));
        return values;
    }

    /**
     * The scenario of a file that states this.
     *
     * @throws IllegalArgumentException with all problems, if there are any
     */
    public static Scenario build(Values stated) {
        ScenarioBuilder.Outcome outcome = ScenarioBuilder.build(stated);
        return outcome.scenario()
                .orElseThrow(
                        () -> new IllegalArgumentException(outcome.problems().toString()));
    }

    /**
     * An object inside of what a file states, to be edited in place; an object that is not stated yet is added.
     *
     * @param path steps such as {@code alice.detectors[0]} or {@code bob.analyzer}
     */
    public static Values part(Values root, String path) {
        Values part = root;
        for (String step : path.split("\\.", -1)) {
            part = step.endsWith("]") ? item(part, step) : child(part, step);
        }
        return part;
    }

    /**
     * The same statements without one of them.
     *
     * @param path of the field to leave out, such as {@code alice.path[0].lengthKm}
     * @throws IllegalArgumentException if nothing is stated there
     */
    public static Values without(Values root, String path) {
        int dot = path.lastIndexOf('.');
        if (!(dot < 0 ? root : part(root, path.substring(0, dot))).has(path.substring(dot + 1))) {
            throw new IllegalArgumentException("nothing stated at " + path);
        }
        return copy(root, "", path);
    }

    /** The scenario with the parameter of a path at another value. */
    public static Scenario with(Scenario scenario, String path, double value) {
        return ParameterPaths.find(scenario, path).with(scenario, value);
    }

    private static Values link(String name, double imbalanceNs, Values source, double windowWidthPs) {
        return new Values()
                .put("formatVersion", 1.0)
                .put("name", name)
                .put("imbalanceNs", imbalanceNs)
                .put("source", source)
                .put("alice", arm())
                .put("bob", arm())
                .put("timing", new Values().put("windowWidthPs", windowWidthPs));
    }

    /** Signal and idler on both sides of 193.45 THz: a filter of the 50 GHz grid for each. */
    private static Values source(Values pump) {
        return new Values()
                .put("pump", pump)
                .put("signal", new Values().put("wavelengthNm", 1546.12).put("bandwidthFwhmGHz", 35.0))
                .put("idler", new Values().put("channel", 30.0).put("bandwidthFwhmGHz", 35.0));
    }

    private static Values arm() {
        Values fibre = new Values("fibre")
                .put("label", "cable")
                .put("fibre", FibreClass.G652D)
                .put("lengthKm", 30.0)
                .put("connectors", 2.0);
        Values detector = new Values().put("class", DetectorClass.SNSPD);
        return new Values()
                .put("path", new ArrayList<>(List.of(fibre)))
                .put("analyzer", new Values().put("excessLossDb", 1.5))
                .put("detectors", new ArrayList<>(List.of(detector, detector.copy())));
    }

    private static List<Values> elements() {
        Values channel = new Values()
                .put("launchDbm", -3.0)
                .put("wavelengthNm", 1310.0)
                .put("attenuationDbPerKm", 0.33)
                .put("ramanCoefficientPerKmNm", 1e-10);
        Values duct = new Values("fibre")
                .put("label", "valley duct")
                .put("fibre", FibreClass.G652D)
                .put("lengthKm", 18.0)
                .put("measuredLossDb", 4.9)
                .put("classicalChannels", List.of(channel));
        Values cable = new Values("fibre")
                .put("label", "lake cable")
                .put("fibre", FibreClass.G655D)
                .put("lengthKm", 12.0)
                .put("attenuationDbPerKm", 0.24)
                .put("dispersionPsPerNmKm", 4.1)
                .put("connectors", 2.0)
                .put("splices", 6.0);
        Values panel = new Values("loss").put("label", "patch panel").put("lossDb", 0.5);
        Values filter = new Values("filter").put("label", "receive filter").put("bandwidthFwhmGHz", 75.0);
        Values compensator = new Values("compensator")
                .put("label", "grating")
                .put("share", 0.9)
                .put("lossDb", 3.5);
        return new ArrayList<>(List.of(duct, cable, panel, filter, compensator));
    }

    private static Values gated() {
        Values gate = new Values().put("widthNs", 1.0).put("darkProbability", 3e-5);
        return new Values().put("class", DetectorClass.INGAAS_GATED).put("gate", gate);
    }

    private static Values copy(Values object, String prefix, String omitted) {
        Values copy = new Values(object.type());
        object.asMap().forEach((name, value) -> {
            if (!(prefix + name).equals(omitted)) {
                copy.put(name, copy(value, prefix + name, omitted));
            }
        });
        return copy;
    }

    private static Object copy(Object value, String path, String omitted) {
        if (value instanceof Values object) {
            return copy(object, path + ".", omitted);
        }
        if (!(value instanceof List<?> items)) {
            return value;
        }
        List<Object> copies = new ArrayList<>();
        for (int i = 0; i < items.size(); i++) {
            copies.add(copy(items.get(i), path + "[" + i + "]", omitted));
        }
        return copies;
    }

    private static Values item(Values parent, String step) {
        int bracket = step.indexOf('[');
        int index = Integer.parseInt(step.substring(bracket + 1, step.length() - 1));
        return parent.list(step.substring(0, bracket)).get(index);
    }

    private static Values child(Values parent, String name) {
        if (!parent.has(name)) {
            parent.put(name, new Values());
        }
        return parent.section(name);
    }
}
