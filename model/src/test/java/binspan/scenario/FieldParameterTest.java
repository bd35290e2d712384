package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import binspan.scenario.Field.Kind;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Reading and varying single numbers of a scenario. */
final class FieldParameterTest {
    private static final String GATED_DARK = "bob.detectors[0].darkCountsPerSecond";

    /** What the pulse pair of the sample does not read. */
    private static final Set<String> REFUSED = Set.of(
            GATED_DARK,
            "source.pairRatePerSecond",
            "source.signal.uncorrelatedPhotonsPerSecond",
            "source.idler.uncorrelatedPhotonsPerSecond");

    private static final Scenario SCENARIO = SampleScenarios.build(SampleScenarios.everything());
    private static final Map<String, OptionalDouble> NUMBERS = NumericLeaves.of(SCENARIO);

    @ParameterizedTest
    @MethodSource("paths")
    void everyNumberOfTheScenarioIsReadByItsPath(String path) {
        assertThat(ParameterPaths.find(SCENARIO, path).value(SCENARIO)).isEqualTo(NUMBERS.get(path));
    }

    /**
     * The sample holds one of everything, so that each numeric field of the registry, spreads apart, must be among its
     * paths.
     */
    @Test
    void everyNumericFieldOfTheRegistryIsReached() {
        Set<Field> reached = new HashSet<>();
        NUMBERS.keySet().forEach(path -> reached.add(((FieldParameter) ParameterPaths.find(SCENARIO, path)).field()));

        assertThat(RegistryTest.numericFields()
                        .filter(entry -> !entry.section().type().equals(Spread.class))
                        .filter(entry -> !reached.contains(entry.field())))
                .isEmpty();
    }

    @ParameterizedTest
    @MethodSource("settings")
    void whatIsSetIsReadBackAndNothingElseMoves(String path, double value) {
        Parameter parameter = ParameterPaths.find(SCENARIO, path);
        Scenario changed = parameter.with(SCENARIO, value);

        assertThat(parameter.value(changed)).hasValue(value);
        Map<String, OptionalDouble> after = NumericLeaves.of(changed);
        assertThat(after.keySet()).isEqualTo(NUMBERS.keySet());
        Set<String> excluded = excluded(path);
        NUMBERS.forEach((other, before) -> {
            if (!other.equals(path)) {
                assertThat(after.get(other))
                        .as(other)
                        .isEqualTo(excluded.contains(other) ? OptionalDouble.empty() : before);
            }
        });
        assertThat(SampleScenarios.build(SampleScenarios.everything()))
                .as("the original")
                .isEqualTo(SCENARIO);
    }

    @ParameterizedTest
    @MethodSource("outside")
    void valueOutsideItsRangeIsRefusedWithTheRange(String path, double value) {
        Parameter parameter = ParameterPaths.find(SCENARIO, path);

        assertThatIllegalArgumentException()
                .isThrownBy(() -> parameter.with(SCENARIO, value))
                .withMessageStartingWith(path + ": found " + Range.plain(value) + "; allowed ")
                .withMessageEndingWith(parameter.range().text(parameter.unit()));
    }

    /** A gate that one of two ports has is no parameter of both. */
    @Test
    void fieldThatSomeElementsLackIsRefused() {
        Values stated = SampleScenarios.pulsePair();
        Values gated = new Values().put("class", DetectorClass.INGAAS_GATED);
        gated.put("gate", new Values().put("widthNs", 1.0).put("darkProbability", 3e-5));
        List<?> free = stated.section("alice").list("detectors");
        stated.section("alice").put("detectors", new ArrayList<>(List.of(gated, free.get(0))));
        Scenario scenario = SampleScenarios.build(stated);
        Parameter width = ParameterPaths.find(scenario, "alice.detectors.gate.widthNs");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> width.over(scenario))
                .withMessage("alice.detectors.gate.widthNs: not every element of the list has it; name one as [0]");
    }

    @Test
    void countTakesWholeNumbersOnly() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> SampleScenarios.with(SCENARIO, "acquisition.fringePoints", 16.5))
                .withMessage("acquisition.fringePoints: found 16.5; allowed a whole number, 3 to 100000");
    }

    /** Stating one of several alternatives clears the others, whichever stood there. */
    @ParameterizedTest
    @CsvSource({
        "source.pump.coherenceTimeNs, source.pump.linewidthMHz, 250, 0.3",
        "source.schmidtNumber, source.unheraldedG2, 4, 1.2",
        "source.signal.wavelengthNm, source.signal.channel, 1551, 39",
        "source.signal.wavelengthNm, source.signal.frequencyTHz, 1551, 193.9",
        "source.idler.frequencyTHz, source.idler.channel, 193.4, 29.5",
        "alice.path.grating.share, alice.path.grating.dispersionPsPerNm, 0.95, -500",
    })
    void alternativesTakeTurns(String first, String second, double a, double b) {
        Scenario one = SampleScenarios.with(SCENARIO, first, a);
        Scenario two = SampleScenarios.with(one, second, b);
        Scenario back = SampleScenarios.with(two, first, a);

        assertThat(value(one, second)).isEmpty();
        assertThat(value(two, first)).isEmpty();
        assertThat(value(two, second)).hasValue(b);
        assertThat(back).isEqualTo(one);
    }

    @Test
    void clearedAlternativeLeavesTheCentreOfTheBandToTheOther() {
        Scenario moved = SampleScenarios.with(SCENARIO, "source.signal.channel", 31);

        // ITU-T G.694.1: the anchor of the grid is 193.1 THz
        assertThat(moved.source().signal().centreHz()).isEqualTo(193.1e12);
    }

    @Test
    void darkCountsOfAGatedDetectorAreRefusedInFavourOfItsGate() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> SampleScenarios.with(SCENARIO, GATED_DARK, 100.0))
                .withMessage(GATED_DARK
                        + ": does not go with the gate found here; vary bob.detectors[0].gate.darkProbability");
    }

    /** Alice's detectors are free-running, bob's is gated: one of them is enough to refuse. */
    @Test
    void darkCountsOfBothSitesAreRefusedIfOneIsGated() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> SampleScenarios.with(SCENARIO, "both.detectors.darkCountsPerSecond", 100.0))
                .withMessageEndingWith("vary both.detectors.gate.darkProbability");
        assertThat(value(
                        SampleScenarios.with(SCENARIO, "alice.detectors.darkCountsPerSecond", 7.0),
                        "alice.detectors[1].darkCountsPerSecond"))
                .hasValue(7.0);
    }

    @ParameterizedTest
    @CsvSource({
        "source.pairRatePerSecond, source.meanPairsPerCycle",
        "source.signal.uncorrelatedPhotonsPerSecond, source.signal.uncorrelatedPhotonsPerCycle"
    })
    void numberThatThePumpModeDoesNotReadIsRefusedInFavourOfItsCounterpart(String perSecond, String perCycle) {
        Scenario continuous = SampleScenarios.build(SampleScenarios.continuous());
        Scenario train = SampleScenarios.build(SampleScenarios.pulseTrain());

        assertThatIllegalArgumentException()
                .isThrownBy(() -> SampleScenarios.with(train, perSecond, 1e3))
                .withMessage(perSecond + ": does not go with a pulse-train pump; vary " + perCycle);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> SampleScenarios.with(continuous, perCycle, 0.1))
                .withMessage(perCycle + ": does not go with a continuous pump; vary " + perSecond);
        assertThat(value(SampleScenarios.with(continuous, perSecond, 1e3), perSecond))
                .hasValue(1e3);
        assertThat(value(SampleScenarios.with(train, perCycle, 0.1), perCycle)).hasValue(0.1);
    }

    @Test
    void gateOfTheClassRefusesDarkCountsLikeAStatedOne() {
        Values values = SampleScenarios.pulsePair();
        SampleScenarios.part(values, "alice.detectors[1]").put("class", DetectorClass.INGAAS_GATED);
        Scenario scenario = SampleScenarios.build(values);

        assertThatIllegalArgumentException()
                .isThrownBy(() -> SampleScenarios.with(scenario, "alice.detectors.darkCountsPerSecond", 100.0))
                .withMessageContaining("gate.darkProbability");
        assertThat(value(
                        SampleScenarios.with(scenario, "alice.detectors[0].darkCountsPerSecond", 5.0),
                        "alice.detectors[0].darkCountsPerSecond"))
                .hasValue(5.0);
    }

    @ParameterizedTest
    @ValueSource(strings = {"timing.windowWidthPs", "alice.detectors.efficiency", "link.lengthKm"})
    void parameterKnowsItsOwnWords(String path) {
        Parameter parameter = ParameterPaths.find(SCENARIO, path);

        assertThat(parameter.path()).isEqualTo(path);
        assertThat(parameter.meaning()).isNotBlank();
        assertThat(parameter.range().contains(parameter.value(SCENARIO).orElseThrow()))
                .isTrue();
    }

    private static OptionalDouble value(Scenario scenario, String path) {
        return ParameterPaths.find(scenario, path).value(scenario);
    }

    /** The paths of the fields that may not stand beside a field. */
    private static Set<String> excluded(String path) {
        String object = path.substring(0, path.lastIndexOf('.') + 1);
        String name = path.substring(object.length());
        List<List<String>> groups = List.of(
                List.of("coherenceTimeNs", "linewidthMHz"),
                List.of("schmidtNumber", "unheraldedG2"),
                List.of("wavelengthNm", "frequencyTHz", "channel"),
                List.of("dispersionPsPerNm", "share"));
        Set<String> excluded = new HashSet<>();
        groups.stream()
                .filter(group -> group.contains(name))
                .forEach(group -> group.forEach(each -> excluded.add(object + each)));
        return excluded;
    }

    static Stream<String> paths() {
        return NUMBERS.keySet().stream();
    }

    /** Three numbers of its range for every path, a seed of its own for each. */
    static Stream<Arguments> settings() {
        return paths().filter(path -> !REFUSED.contains(path)).flatMap(path -> {
            FieldParameter parameter = (FieldParameter) ParameterPaths.find(SCENARIO, path);
            SplittableRandom random = new SplittableRandom(path.hashCode());
            return Stream.generate(() -> inside(parameter, random)).limit(3).map(value -> Arguments.of(path, value));
        });
    }

    private static double inside(FieldParameter parameter, SplittableRandom random) {
        Range range = parameter.range();
        double value = range.lowest() + (range.highest() - range.lowest()) * random.nextDouble(0.001, 1.0);
        return parameter.field().kind() == Kind.COUNT ? Math.rint(value) : value;
    }

    static Stream<Arguments> outside() {
        return paths().flatMap(path -> {
            Range range = ParameterPaths.find(SCENARIO, path).range();
            double low = range.lowestOpen() ? range.lowest() : Math.nextDown(range.lowest());
            double high = range.highestOpen() ? range.highest() : Math.nextUp(range.highest());
            return Stream.of(low, high, Double.NaN).map(value -> Arguments.of(path, value));
        });
    }
}
