package binspan.study.comparison;

import binspan.scenario.Arm;
import binspan.scenario.DetectorClass;
import binspan.scenario.Edits;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.Nearest;
import binspan.scenario.OperatingPoint;
import binspan.scenario.PathElement;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/** Makes the links of a comparison out of one scenario. */
public final class LinkOptions {
    private LinkOptions() {}

    /**
     * The link with other detectors at every detected port. An avalanche class comes with all its operating points, the same for both ports of a side.
     *
     * @param scenario the link
     * @param alice class of alice's detectors
     * @param bob class of bob's
     * @throws IllegalArgumentException if a gated class meets a continuous pump, which has no slots to gate
     */
    public static LinkOption detectors(Scenario scenario, DetectorClass alice, DetectorClass bob) {
        boolean gated = alice.gate().isPresent() || bob.gate().isPresent();
        if (gated && scenario.source().pump().mode() == PumpMode.CONTINUOUS) {
            throw new IllegalArgumentException((alice.gate().isPresent() ? alice : bob).text()
                    + ": gated, but a continuous pump has no slots to gate; choose a free-running class");
        }
        List<LinkOption.Setting> settings = new ArrayList<>();
        for (OperatingPoint a : alice.operatingPoints()) {
            for (OperatingPoint b : bob.operatingPoints()) {
                if (alice != bob || a.equals(b)) {
                    Scenario with = Edits.withArms(
                            scenario,
                            Edits.detectors(scenario.alice(), each -> a.detector(alice)),
                            Edits.detectors(scenario.bob(), each -> b.detector(bob)));
                    settings.add(new LinkOption.Setting(meaning(alice, a, bob, b), with));
                }
            }
        }
        String name = alice == bob ? alice.text() : alice.text() + "/" + bob.text();
        return new LinkOption(name, List.copyOf(settings));
    }

    private static String meaning(DetectorClass alice, OperatingPoint a, DetectorClass bob, OperatingPoint b) {
        boolean chooseA = alice.operatingPoints().size() > 1;
        boolean chooseB = bob.operatingPoints().size() > 1;
        if (alice == bob) {
            return chooseA ? a.meaning() : "";
        }
        List<String> words = new ArrayList<>();
        if (chooseA) {
            words.add("alice " + a.meaning());
        }
        if (chooseB) {
            words.add("bob " + b.meaning());
        }
        return String.join("; ", words);
    }

    /** The link with all spans of another fibre class, at that class's attenuation and dispersion; measured losses are dropped. */
    public static LinkOption fibre(Scenario scenario, FibreClass fibre) {
        return LinkOption.of(fibre.text(), Edits.arms(scenario, arm -> Edits.path(arm, e -> of(e, fibre))));
    }

    /** A span of another class; other elements as they are. */
    static PathElement of(PathElement element, FibreClass fibre) {
        if (!(element instanceof FibreSpan span)) {
            return element;
        }
        return new FibreSpan(
                span.label(),
                fibre,
                span.lengthKm(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                span.pmdPsPerSqrtKm(),
                OptionalDouble.empty(),
                span.connectors(),
                span.connectorLossDb(),
                span.splices(),
                span.spliceLossDb(),
                span.delayPsPerKmK(),
                span.classicalChannels());
    }

    /**
     * The link without an element of its path.
     *
     * @throws IllegalArgumentException if no element has the label, with the nearest; or if it is the last filter behind classical light
     */
    public static LinkOption without(Scenario scenario, String label) {
        if (Stream.of(scenario.alice(), scenario.bob()).noneMatch(arm -> has(arm, label))) {
            List<String> labels = Stream.of(scenario.alice(), scenario.bob())
                    .flatMap(arm -> arm.path().stream())
                    .flatMap(element -> element.label().stream())
                    .toList();
            List<String> near = Nearest.to(label, labels);
            throw new IllegalArgumentException("no path element is labelled \"" + label + "\""
                    + (near.isEmpty()
                            ? "; labels: " + String.join(", ", labels)
                            : "; did you mean \"" + String.join("\" or \"", near) + "\"?"));
        }
        return LinkOption.of("without " + label, Edits.arms(scenario, arm -> without(arm, label)));
    }

    private static boolean has(Arm arm, String label) {
        return arm.path().stream()
                .anyMatch(each -> each.label().filter(label::equals).isPresent());
    }

    private static Arm without(Arm arm, String label) {
        List<PathElement> rest = arm.path().stream()
                .filter(each -> each.label().filter(label::equals).isEmpty())
                .toList();
        for (int i = 0; i < rest.size(); i++) {
            boolean classical = rest.get(i) instanceof FibreSpan span
                    && !span.classicalChannels().isEmpty();
            if (classical && rest.subList(i, rest.size()).stream().noneMatch(FilterElement.class::isInstance)) {
                throw new IllegalArgumentException("\"" + label
                        + "\" is the last filter behind classical light; without it the link cannot be judged");
            }
        }
        return Edits.withPath(arm, rest);
    }
}
