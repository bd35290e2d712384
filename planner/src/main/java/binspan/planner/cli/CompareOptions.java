package binspan.planner.cli;

import binspan.scenario.Choice;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import binspan.scenario.Scenario;
import binspan.study.comparison.LinkOption;
import binspan.study.comparison.LinkOptions;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import picocli.CommandLine.Option;

/** What a comparison exchanges: detectors, fibres, an element, or whole scenarios. */
final class CompareOptions {
    private static final String DETECTORS = "--detectors";
    private static final String FIBRES = "--fibres";
    private static final String WITHOUT = "--without";

    @Option(
            names = DETECTORS,
            split = ",",
            paramLabel = "CLASS[/CLASS]",
            description = "Detector classes at every port; with a stroke those of alice and of bob.")
    private List<String> detectors = List.of();

    @Option(names = FIBRES, split = ",", paramLabel = "CLASS", description = "Fibre classes of all spans.")
    private List<String> fibres = List.of();

    @Option(
            names = WITHOUT,
            paramLabel = "LABEL",
            description = "Path element to leave out, by its label; may be given several times.")
    private List<String> without = List.of();

    /**
     * The links to compare.
     *
     * @param files names of the scenario files
     * @param scenarios what they hold
     * @throws UsageException if it is not clear what to exchange, or not possible
     */
    List<LinkOption> links(List<String> files, List<Scenario> scenarios) throws UsageException {
        int kinds = (detectors.isEmpty() ? 0 : 1) + (fibres.isEmpty() ? 0 : 1) + (without.isEmpty() ? 0 : 1);
        if (scenarios.size() > 1 && kinds > 0) {
            throw UsageException.of("found several scenario files with " + String.join(" and ", given())
                    + "; allowed either several files, or one file and one of these options");
        }
        if (scenarios.size() == 1 && kinds != 1) {
            throw UsageException.of(
                    kinds == 0
                            ? "nothing to compare with; give --detectors, --fibres, --without or a second scenario file"
                            : "found " + String.join(" and ", given()) + "; allowed one of them");
        }
        return scenarios.size() > 1 ? whole(files, scenarios) : exchanged(scenarios.get(0));
    }

    private List<String> given() {
        List<String> given = new ArrayList<>();
        if (!detectors.isEmpty()) {
            given.add(DETECTORS);
        }
        if (!fibres.isEmpty()) {
            given.add(FIBRES);
        }
        if (!without.isEmpty()) {
            given.add(WITHOUT);
        }
        return given;
    }

    private static List<LinkOption> whole(List<String> files, List<Scenario> scenarios) {
        List<LinkOption> links = new ArrayList<>();
        for (int i = 0; i < scenarios.size(); i++) {
            String name = scenarios.get(i).name();
            boolean unique = scenarios.stream()
                            .filter(other -> other.name().equals(name))
                            .count()
                    == 1;
            links.add(LinkOption.of(unique ? name : files.get(i), scenarios.get(i)));
        }
        return links;
    }

    private List<LinkOption> exchanged(Scenario scenario) throws UsageException {
        List<LinkOption> links = new ArrayList<>();
        for (String text : detectors) {
            String[] sides = text.split("/", -1);
            if (sides.length > 2) {
                throw UsageException.of(DETECTORS + " " + text + ": found " + sides.length
                        + " classes; allowed one, or alice's and bob's");
            }
            DetectorClass alice = named("detector class", sides[0], DetectorClass.class);
            DetectorClass bob = named("detector class", sides[sides.length - 1], DetectorClass.class);
            links.add(UsageException.unless(DETECTORS, () -> LinkOptions.detectors(scenario, alice, bob)));
        }
        for (String text : fibres) {
            links.add(LinkOptions.fibre(scenario, named("fibre class", text, FibreClass.class)));
        }
        if (!without.isEmpty()) {
            links.add(LinkOption.of("as written", scenario));
        }
        for (String label : without) {
            links.add(UsageException.unless(WITHOUT, () -> LinkOptions.without(scenario, label)));
        }
        return links;
    }

    private static <E extends Enum<E> & Choice> E named(String kind, String word, Class<E> type) throws UsageException {
        return Arrays.stream(type.getEnumConstants())
                .filter(each -> each.text().equals(word))
                .findFirst()
                .orElseThrow(() -> UsageException.unknown(kind, word, Choice.texts(type)));
    }
}
