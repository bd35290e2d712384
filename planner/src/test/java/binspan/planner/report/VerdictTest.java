package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.DetectorClass;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

final class VerdictTest {
    private static String plain(Values stated) {
        return Verdict.text(ReportScenarios.check(stated), TextStyle.PLAIN);
    }

    private static Values asking(String requirement, double value) {
        return ReportScenarios.good().put("require", new Values().put(requirement, value));
    }

    static Stream<Values> links() {
        return Stream.of(
                ReportScenarios.good(),
                ReportScenarios.failing(),
                ReportScenarios.continuous(),
                ReportScenarios.pulseTrain(),
                ReportScenarios.onePort());
    }

    @ParameterizedTest
    @MethodSource("links")
    void plainTextIsAsciiOfAtMostEightyColumns(Values stated) {
        String text = plain(stated);
        assertThat(text).isASCII().doesNotContain("\u001b").endsWith("\n");
        assertThat(text.lines())
                .allSatisfy(
                        line -> assertThat(line).hasSizeLessThanOrEqualTo(80).doesNotEndWith(" "));
        assertThat(text).doesNotContain("NaN", "undefined", "infinite");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "imbalanceNs",
                "source.meanPairsPerCycle",
                "source.signal.bandwidthFwhmGHz",
                "source.pump.repetitionRateMHz",
                "source.pump.earlyPairFraction",
                "alice.sourceCouplingLossDb",
                "link.lengthKm",
                "alice.path[0].dispersionPsPerNmKm",
                "both.detectors.darkCountsPerSecond",
                "bob.detectors.deadTimeNs",
                "alice.delayErrorPs",
                "timing.windowWidthPs",
                "timing.cableTemperatureStepK",
                "acquisition.durationS",
                "acquisition.secondsPerPoint"
            })
    void extremeLinksStillFit(String path) {
        Scenario good = ReportScenarios.scenario(ReportScenarios.good());
        Parameter parameter = ParameterPaths.find(good, path);
        double[] values = {
            parameter.range().lowest(),
            parameter.range().highest(),
            parameter.range().highest() / 1e3
        };
        for (double value : values) {
            if (parameter.range().contains(value)) {
                String text =
                        Verdict.text(binspan.prediction.LinkCheck.of(parameter.with(good, value)), TextStyle.PLAIN);
                assertThat(text).doesNotContain("NaN", "undefined", "infinite");
                assertThat(text.lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
            }
        }
    }

    @Test
    void colourRepeatsWhatWordsAndSignsSay() {
        String coloured = Verdict.text(ReportScenarios.check(ReportScenarios.failing()), new TextStyle(true, false));
        assertThat(coloured).contains("\u001b[1;31m! NOT MET\u001b[0m", "\u001b[32m+ met\u001b[0m");
        assertThat(coloured.replaceAll("\u001b\\[[0-9;]*m", "")).isEqualTo(plain(ReportScenarios.failing()));
    }

    @Test
    void utf8TextSaysTheSame() {
        String rich = Verdict.text(ReportScenarios.check(ReportScenarios.good()), new TextStyle(false, true));
        assertThat(rich).contains("\u2713 MEETS all 8 requirements", "\u2265 0.85", "\u2588", "\u00b1");
        assertThat(rich.lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
        assertThat(rich.lines().count())
                .isEqualTo(plain(ReportScenarios.good()).lines().count());
    }

    @Test
    void headlineSaysWhetherTheLinkMeetsWhatIsAsked() {
        assertThat(plain(ReportScenarios.good()).lines().toList().subList(0, 2))
                .containsExactly("Kestrel Dam to Millbrook", "+ MEETS all 8 requirements");
        assertThat(plain(ReportScenarios.failing()).lines().toList().get(1))
                .isEqualTo("! DOES NOT MEET 4 of 8 requirements");
        assertThat(plain(asking("chshAtLeast", 2.0)).lines().toList().get(1)).isEqualTo("+ MEETS its requirement");
        assertThat(plain(asking("chshAtLeast", 2.82)).lines().toList().get(1))
                .isEqualTo("! DOES NOT MEET its requirement");
    }

    @Test
    void linkWithoutRequirementsIsSaidToHaveNone() {
        String text = plain(ReportScenarios.continuous());
        assertThat(text.lines().toList().get(1))
                .isEqualTo("No requirement is stated: these are predictions without a verdict.");
        assertThat(text)
                .contains("State a requirement to see how far each quantity may drift")
                .doesNotContain("Requirement ", "Stability", "Why not");
    }

    @Test
    void eachRequirementHasALine() {
        List<String> lines = plain(ReportScenarios.failing()).lines().toList();
        assertThat(lines).contains("raw visibility                   >= 0.9        0.878       -0.022  ! NOT MET");
        assertThat(lines.stream().filter(line -> line.endsWith(" met") || line.endsWith(" NOT MET")))
                .hasSize(8);
    }

    @Test
    void missedRequirementIsToldApartFromARoundedOne() {
        double raw = ReportScenarios.check(ReportScenarios.good())
                .prediction()
                .fringe()
                .raw();
        double demand = Math.ceil(raw * 1000.0 + 0.4) / 1000.0;
        Values stated = asking("rawVisibilityAtLeast", demand);
        stated.section("alice").section("analyzer").put("phaseNoiseRmsRad", phaseNoiseFor(raw, demand));
        String line = plain(stated)
                .lines()
                .filter(each -> each.startsWith("raw visibility  "))
                .findFirst()
                .orElseThrow();
        String predicted = line.trim().split(" +", -1)[4];
        assertThat(Double.parseDouble(predicted)).isNotEqualTo(demand);
    }

    /** Phase noise that puts the visibility 2e-5 below the demand. */
    private static double phaseNoiseFor(double raw, double demand) {
        double wanted = (demand - 2e-5) / raw;
        return Math.sqrt(Math.max(0.0, 0.05 * 0.05 - 2.0 * Math.log(wanted)));
    }

    @Test
    void failingLinkIsToldWhyInPlainSentences() {
        String text = plain(ReportScenarios.failing()).replace("\n    ", " ");
        assertThat(text)
                .contains("The raw visibility falls short of 0.9 by 0.022 (2.39 % of it)")
                .contains("The error rate of the time basis exceeds 8 % by")
                .contains("Dark counts and background cost most:")
                .contains("The secret key rate falls short of 100 bit/s by")
                .contains("The time to the first key exceeds 24 h by 51.3 days. The errors leave");
        assertThat(plain(ReportScenarios.good())).doesNotContain("Why not");
    }

    @Test
    void budgetStepsDownFromOne() {
        List<String> bars = plain(ReportScenarios.failing())
                .lines()
                .filter(line -> line.contains("##"))
                .toList();
        assertThat(bars).hasSize(8).first().asString().endsWith("#".repeat(36));
        int longest = 36;
        for (String bar : bars) {
            int after = (int) bar.chars().filter(c -> c == '#').count();
            int lost = (int) bar.substring(bar.indexOf('#'))
                    .chars()
                    .filter(c -> c == '-')
                    .count();
            assertThat(after + lost).isEqualTo(longest);
            longest = after;
        }
        assertThat(longest).isLessThan(20);
    }

    @Test
    void headroomIsSortedByWhatFailsFirst() {
        List<String> lines = plain(ReportScenarios.good()).lines().toList();
        int title = lines.indexOf("Headroom, one quantity at a time, the tightest first");
        assertThat(lines.get(title + 3)).startsWith("> cable temperature step").contains("0 K");
        assertThat(lines.get(title + 4)).isEqualTo("      timing.cableTemperatureStepK -> secret key rate");
        assertThat(lines.stream().filter(line -> line.startsWith("> "))).hasSize(1);
    }

    @Test
    void linkThatMeetsNothingHasNoHeadroom() {
        assertThat(plain(asking("chshAtLeast", 2.82))).contains("Headroom\n  None: no stated requirement is met.");
    }

    @Test
    void keyIsSaidToBeImpossibleWithOnePort() {
        assertThat(plain(ReportScenarios.onePort()))
                .contains("No key: with a continuous pump the bits are the ports")
                .doesNotContain("endless run");
    }

    @Test
    void phaseBitsAreSaidToBeTestBitsWithoutBothPorts() {
        Values stated = ReportScenarios.good();
        stated.section("alice").put("detectors", List.of(new Values().put("class", DetectorClass.SNSPD)));
        assertThat(plain(stated)).contains("test bits only, no key");
    }

    @Test
    void safetyStandsUnderEveryVerdict() {
        assertThat(plain(ReportScenarios.good()))
                .contains(
                        "Do not look into fibre ends",
                        "treat every fibre as live",
                        "Local rules",
                        "licensed practice",
                        "cooled with helium")
                .endsWith("All figures are an estimate, not a security proof.\n");
        assertThat(plain(ReportScenarios.failing()))
                .contains("Do not look into fibre ends")
                .doesNotContain("helium");
    }

    @Test
    void nameFromTheFileCannotSteerTheTerminal() {
        assertThat(plain(ReportScenarios.good().put("name", "evil \u001b[2J name")))
                .startsWith("evil ?[2J name\n")
                .doesNotContain("\u001b");
    }
}
