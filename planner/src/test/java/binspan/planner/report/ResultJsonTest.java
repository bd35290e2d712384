package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.report.JsonTree.Node;
import binspan.prediction.LinkCheck;
import binspan.scenario.Values;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The published form of a result: names, their order, and what is absent where it does not apply. */
final class ResultJsonTest {
    private static final String ARM =
            "lossDb fibreLossDb dispersionPsPerNm arrivalRmsPs delayErrorPs singlesPerSecond liveFraction"
                    + " backgroundPerSecond"
                    + " coincidencesPerSingle partnerPassProbability unheraldedG2 heraldedG2";

    /** Every name of the published form in its order. */
    private static final List<String> NAMES = names(
            "formatVersion",
            "version",
            "scenario",
            "source: cyclesPerSecond schmidtNumber apparentMeanPairs",
            "alice: " + ARM,
            "bob: " + ARM,
            "coincidence: fringeMaxPerSecond fringeMinPerSecond accidentalPerSecond allPortsPerSecond sidePerSecond car"
                    + " correlationRmsPs",
            "visibility: raw net sigma countsPerPoint budget",
            "bell: chsh sigma secondsToThreeSigma secondsToFiveSigma",
            "qber: phase time",
            "key: siftedPhaseBps siftedTimeBps asymptoticBps finiteBits finiteBps secondsToFirstKey"
                    + " repeaterlessBoundBps",
            "stability",
            "headroom",
            "requirements",
            "cautions");

    private static final List<String> PULSED_ONLY = names(
            "source: cyclesPerSecond schmidtNumber apparentMeanPairs",
            "alice: arrivalRmsPs unheraldedG2 heraldedG2",
            "bob: arrivalRmsPs unheraldedG2 heraldedG2");

    /** Names as dotted paths, groups opened out. */
    private static List<String> names(String... groups) {
        return Stream.of(groups).flatMap(ResultJsonTest::opened).toList();
    }

    private static Stream<String> opened(String group) {
        int colon = group.indexOf(':');
        return colon < 0
                ? Stream.of(group)
                : Stream.of(group.substring(colon + 2).split(" ", -1))
                        .map(name -> group.substring(0, colon) + "." + name);
    }

    private static List<String> without(List<String> names, List<String> left) {
        return names.stream().filter(name -> !left.contains(name)).toList();
    }

    private static Node tree(Values stated) {
        return JsonTree.of(ResultJson.text(ReportScenarios.check(stated)));
    }

    @Test
    void pulsePairHasEveryNameInThePublishedOrder() {
        assertThat(tree(ReportScenarios.good()).names())
                .isEqualTo(without(NAMES, List.of("coincidence.correlationRmsPs")));
    }

    @Test
    void continuousPumpHasNoPulsedFigures() {
        List<String> absent = Stream.concat(PULSED_ONLY.stream(), Stream.of("qber.time", "key.siftedTimeBps"))
                .toList();
        assertThat(tree(ReportScenarios.continuous()).names()).isEqualTo(without(NAMES, absent));
    }

    @Test
    void pulseTrainHasNoTimeBasis() {
        List<String> absent = List.of("coincidence.correlationRmsPs", "qber.time", "key.siftedTimeBps");
        assertThat(tree(ReportScenarios.pulseTrain()).names()).isEqualTo(without(NAMES, absent));
    }

    @Test
    void onePortWithAContinuousPumpHasNoKey() {
        List<String> names = tree(ReportScenarios.onePort()).names();
        assertThat(names)
                .contains("key.siftedPhaseBps", "key.repeaterlessBoundBps")
                .doesNotContain("key.asymptoticBps", "key.finiteBits", "key.finiteBps", "key.secondsToFirstKey");
    }

    @Test
    void valuesOfPortsAreLists() {
        Node both = tree(ReportScenarios.good());
        assertThat(both.at("alice", "singlesPerSecond").items()).hasSize(2);
        assertThat(both.at("bob", "liveFraction").items()).hasSize(2);
        assertThat(tree(ReportScenarios.onePort())
                        .at("alice", "singlesPerSecond")
                        .items())
                .hasSize(1);
    }

    @Test
    void listsHaveTheirPublishedNames() {
        Node tree = tree(ReportScenarios.good());
        assertThat(tree.at("visibility", "budget").items())
                .hasSize(8)
                .allSatisfy(each -> assertThat(each.names()).containsExactly("cause", "factor"));
        assertThat(tree.at("stability").items())
                .isNotEmpty()
                .allSatisfy(each -> assertThat(each.names()).containsExactly("quantity", "unit", "limit"));
        assertThat(tree.at("headroom").items())
                .isNotEmpty()
                .allSatisfy(each ->
                        assertThat(each.names()).containsExactly("path", "unit", "value", "limit", "requirement"));
        assertThat(tree.at("requirements").items())
                .hasSize(8)
                .allSatisfy(each ->
                        assertThat(each.names()).containsExactly("name", "required", "predicted", "margin", "met"));
        assertThat(tree.at("cautions").items())
                .isNotEmpty()
                .allSatisfy(each -> assertThat(each.names()).containsExactly("code", "text"));
    }

    @Test
    void requirementWithoutAFigureHasNoPredictionAndNoMargin() {
        Values stated = ReportScenarios.onePort().put("require", new Values().put("keyRateAtLeastBps", 100.0));
        Node requirement = tree(stated).at("requirements").items().get(0);
        assertThat(requirement.names()).containsExactly("name", "required", "met");
        assertThat(requirement.at("met").value()).isEqualTo(false);
    }

    @Test
    void listsThatApplyToNothingAreEmpty() {
        Node tree = tree(ReportScenarios.continuous());
        assertThat(tree.at("requirements").items()).isEmpty();
        assertThat(tree.at("headroom").items()).isEmpty();
        assertThat(tree.at("stability").items()).isEmpty();
    }

    @Test
    void numbersReadBackExactly() {
        LinkCheck check = ReportScenarios.check(ReportScenarios.good());
        Node tree = JsonTree.of(ResultJson.text(check));
        assertThat(tree.at("visibility", "raw").value())
                .isEqualTo(check.prediction().fringe().raw());
        assertThat(tree.at("bell", "chsh").value())
                .isEqualTo(check.prediction().bell().chsh());
        assertThat(tree.at("key", "finiteBits").value())
                .isEqualTo(check.finite().bits());
        assertThat(tree.at("alice", "singlesPerSecond").items().get(1).value())
                .isEqualTo(check.prediction().counts().loadsA().get(1).recordedPerSecond());
        assertThat(tree.at("headroom").items().get(3).at("limit").value())
                .isEqualTo(check.headroom().get(3).limit());
        assertThat(tree.at("scenario").value()).isEqualTo("Kestrel Dam to Millbrook");
        assertThat(tree.at("formatVersion").value()).isEqualTo(1.0);
    }

    static Stream<Values> links() {
        Values dark = ReportScenarios.good();
        dark.section("alice").put("delayErrorPs", 1e5);
        Values still = ReportScenarios.good();
        still.section("alice").put("sourceCouplingLossDb", 200.0);
        return Stream.of(
                ReportScenarios.good(),
                ReportScenarios.failing(),
                ReportScenarios.continuous(),
                ReportScenarios.pulseTrain(),
                ReportScenarios.onePort(),
                dark,
                still);
    }

    @ParameterizedTest
    @MethodSource("links")
    void nothingIsNullOrNoNumber(Values stated) {
        String text = ResultJson.text(ReportScenarios.check(stated));
        assertThat(text).doesNotContain("null", "NaN", "Infinity");
        assertThat(JsonTree.of(text).names()).contains("visibility.raw", "cautions");
    }

    @Test
    void objectHasAnyCharacterAndNoLineEnd() {
        LinkCheck check = ReportScenarios.check(ReportScenarios.good().put("name", "B\u00e4renfels \u2192 Tal"));
        String text = ResultJson.text(check);
        assertThat(text).startsWith("{\n  \"formatVersion\": 1,\n").endsWith("}");
        assertThat(JsonTree.of(text).at("scenario").value()).isEqualTo("B\u00e4renfels \u2192 Tal");
    }
}
