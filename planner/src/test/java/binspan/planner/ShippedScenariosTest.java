package binspan.planner;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.prediction.Caution;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RequirementOutcome;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The scenarios that come with the program: each is read, gives the verdict that its comments promise, and would not surprise the trade. */
final class ShippedScenariosTest {
    private static final Path FOLDER = Path.of("..", "scenarios");
    private static final String FAILING = "harrow-ridge-overhead-line";

    /**
     * Where the figures of a scenario must fall: what a person of the trade expects of a link of its kind (common practice, no source).
     *
     * @param visibilityFrom lowest raw visibility
     * @param visibilityTo highest raw visibility
     * @param keyFrom lowest asymptotic key, bit/s
     * @param keyTo highest asymptotic key, bit/s
     */
    private record Expected(double visibilityFrom, double visibilityTo, double keyFrom, double keyTo) {}

    private static final Map<String, Expected> EXPECTED = new TreeMap<>(Map.of(
            "kestrel-dam-to-millbrook",
            new Expected(0.88, 0.95, 1000.0, 4000.0),
            "stonebridge-to-lower-weir",
            new Expected(0.97, 0.98, 75.0, 220.0),
            "eagle-tarn-to-saltmarsh",
            new Expected(0.88, 0.97, 0.03, 1.0),
            "orchard-lane-access",
            new Expected(0.88, 0.95, 20.0, 60.0),
            "fernhill-shared-trunk",
            new Expected(0.88, 0.95, 800.0, 4000.0),
            FAILING,
            new Expected(0.5, 0.85, 0.0, 0.0)));

    static Stream<String> names() {
        return EXPECTED.keySet().stream();
    }

    static Stream<String> namesOfTheMet() {
        return names().filter(name -> !name.equals(FAILING));
    }

    @Test
    void everyShippedScenarioIsLookedAt() throws IOException {
        try (Stream<Path> files = Files.list(FOLDER)) {
            assertThat(files.map(file -> file.getFileName().toString())
                            .filter(name -> name.endsWith(".json") && !name.endsWith(".schema.json"))
                            .map(name -> name.substring(0, name.length() - ".json".length())))
                    .containsExactlyInAnyOrderElementsOf(EXPECTED.keySet());
        }
    }

    @ParameterizedTest
    @MethodSource("names")
    void meetsItsRequirementsOrFailsThemAsIntended(String name) throws InvalidScenarioException {
        LinkCheck check = LinkCheck.of(read(name));
        assertThat(check.outcomes()).hasSizeGreaterThanOrEqualTo(5);
        assertThat(check.met()).isEqualTo(!name.equals(FAILING));
    }

    @ParameterizedTest
    @MethodSource("names")
    void nothingInItIsUnusual(String name) throws InvalidScenarioException {
        assertThat(codes(LinkCheck.of(read(name))))
                .doesNotContain(
                        "unusual-value",
                        "visibility-too-good",
                        "first-key-too-soon",
                        "slots-overlap",
                        "cycle-too-short",
                        "energy-not-conserved",
                        "field-without-effect",
                        "pump-coherence-not-stated",
                        "detector-wavelength");
    }

    @ParameterizedTest
    @MethodSource("names")
    void figuresFallWhereTheTradeExpectsThem(String name) throws InvalidScenarioException {
        Expected expected = EXPECTED.get(name);
        LinkPrediction prediction = LinkPredictor.predict(read(name));
        assertThat(prediction.fringe().raw()).isBetween(expected.visibilityFrom(), expected.visibilityTo());
        assertThat(prediction.key().asymptoticPerSecond()).isBetween(expected.keyFrom(), expected.keyTo());
    }

    /** Room for what a plan does not know, and somewhere not much of it. */
    @ParameterizedTest
    @MethodSource("namesOfTheMet")
    void marginsAreBelievable(String name) throws InvalidScenarioException {
        assertThat(LinkCheck.of(read(name)).outcomes().stream()
                        .mapToDouble(ShippedScenariosTest::relativeMargin)
                        .min()
                        .orElseThrow())
                .isBetween(0.01, 0.10);
        assertThat(LinkCheck.of(read(name)).headroom()).isNotEmpty();
    }

    @ParameterizedTest
    @MethodSource("namesOfTheMet")
    void saysWhereNumbersComeFromAndHowTheySpread(String name) throws InvalidScenarioException {
        assertThat(read(name).provenance()).hasSizeGreaterThanOrEqualTo(4);
        assertThat(read(name).spread()).hasSizeGreaterThanOrEqualTo(4);
    }

    @ParameterizedTest
    @MethodSource("names")
    void startsWithItsStory(String name) throws IOException {
        List<String> lines = Files.readAllLines(file(name));
        assertThat(lines.stream().takeWhile(line -> line.startsWith("//"))).hasSizeGreaterThanOrEqualTo(8);
        assertThat(lines).allMatch(line -> line.length() <= 160);
    }

    @Test
    void visibilityOfTheDamLinkRisesSlightlyWithLengthAndItsKeyFalls() throws InvalidScenarioException {
        Scenario scenario = read("kestrel-dam-to-millbrook");
        LinkPrediction planned = LinkPredictor.predict(scenario);
        LinkPrediction longer = LinkPredictor.predict(with(scenario, "link.lengthKm", 62.0));
        assertThat(longer.fringe().raw())
                .isBetween(planned.fringe().raw(), planned.fringe().raw() + 0.002);
        assertThat(longer.key().asymptoticPerSecond()).isLessThan(planned.key().asymptoticPerSecond());
    }

    @Test
    void oneCompensatorServesBothArmsOfTheContinuousLink() throws InvalidScenarioException {
        Scenario scenario = read("stonebridge-to-lower-weir");
        LinkPrediction planned = LinkPredictor.predict(scenario);
        LinkPrediction ownArmOnly =
                LinkPredictor.predict(with(scenario, "alice.path.grating.dispersionPsPerNm", -850.0));
        assertThat(ownArmOnly.key().asymptoticPerSecond())
                .isLessThan(0.6 * planned.key().asymptoticPerSecond());
        assertThat(Math.abs(planned.pathA().dispersionPsPerNm())).isGreaterThan(500.0);
        assertThat(planned.pathA().dispersionPsPerNm() + planned.pathB().dispersionPsPerNm())
                .isBetween(-100.0, 100.0);
    }

    @Test
    void darkCountsAreNotWhatLimitsTheLongLink() throws InvalidScenarioException {
        Scenario scenario = read("eagle-tarn-to-saltmarsh");
        double planned = LinkPredictor.predict(scenario).key().asymptoticPerSecond();
        Scenario noisier = with(scenario, "both.detectors.darkCountsPerSecond", 100.0);
        assertThat(LinkPredictor.predict(noisier).key().asymptoticPerSecond()).isBetween(0.985 * planned, planned);
    }

    @Test
    void doublingTheSourceOfTheAccessLinkGainsNothing() throws InvalidScenarioException {
        Scenario scenario = read("orchard-lane-access");
        double planned = LinkPredictor.predict(scenario).key().asymptoticPerSecond();
        LinkCheck brighter = LinkCheck.of(with(scenario, "source.meanPairsPerCycle", 0.04));
        assertThat(brighter.prediction().key().asymptoticPerSecond()).isBetween(planned, 1.06 * planned);
        assertThat(brighter.met()).isFalse();
    }

    @Test
    void telemetryAtFullPowerWouldDrownThePhotons() throws InvalidScenarioException {
        Scenario scenario = read("fernhill-shared-trunk");
        LinkPrediction planned = LinkPredictor.predict(scenario);
        assertThat(planned.counts().loadsA().get(0).backgroundPerSecond())
                .isGreaterThan(planned.counts().loadsA().get(0).photonsPerSecond());
        Scenario full = with(scenario, "alice.path.relay trunk east.classicalChannels.launchDbm", 0.0);
        full = with(full, "bob.path.relay trunk west.classicalChannels.launchDbm", 0.0);
        assertThat(LinkCheck.of(full).outcomes())
                .filteredOn(outcome -> !outcome.met())
                .hasSizeGreaterThan(3);
    }

    @Test
    void overheadLineFailsBecauseOfItsTemperatureStepAlone() throws InvalidScenarioException {
        Scenario scenario = read(FAILING);
        assertThat(codes(LinkCheck.of(scenario))).contains("windows-missed");
        LinkCheck realigned = LinkCheck.of(with(scenario, "timing.cableTemperatureStepK", 0.05));
        assertThat(realigned.met()).isTrue();
        assertThat(codes(realigned)).doesNotContain("windows-missed");
    }

    /** Margin as a share of the required figure. */
    private static double relativeMargin(RequirementOutcome outcome) {
        return outcome.margin().orElseThrow() / outcome.required();
    }

    private static List<String> codes(LinkCheck check) {
        return check.cautions().stream().map(Caution::code).toList();
    }

    private static Scenario with(Scenario scenario, String path, double value) {
        return ParameterPaths.find(scenario, path).with(scenario, value);
    }

    private static Scenario read(String name) throws InvalidScenarioException {
        return ScenarioReader.read(file(name).toString());
    }

    private static Path file(String name) {
        return FOLDER.resolve(name + ".json");
    }
}
