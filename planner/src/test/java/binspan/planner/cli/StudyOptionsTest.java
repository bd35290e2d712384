package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.Preset;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import binspan.scenario.SpreadShape;
import binspan.study.Axis;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import picocli.CommandLine;

/** The options that name parameters, as every study reads them. */
final class StudyOptionsTest {
    private static final List<Integer> STEPS = List.of(201, 101, 21, 11);
    private static final Scenario SCENARIO = scenario(Preset.PULSE_PAIR.scenario());

    private static Scenario scenario(String text) {
        try {
            return ScenarioReader.parse(text, "preset");
        } catch (InvalidScenarioException e) {
            throw new IllegalArgumentException(e);
        }
    }

    private static <T> T options(T options, String name, String... texts) {
        List<String> words = new ArrayList<>();
        for (String text : texts) {
            words.add(name);
            words.add(text);
        }
        return CommandLine.populateCommand(options, words.toArray(String[]::new));
    }

    private static List<Axis> vary(String... texts) throws UsageException {
        return options(new VaryOptions(), "--vary", texts).grid(SCENARIO, STEPS);
    }

    private static Axis free(String text) throws UsageException {
        return options(new FreeOptions(), "--free", text).axes(SCENARIO, 6).get(0);
    }

    private static Map<String, Spread> spreads(String... texts) throws UsageException {
        return options(new SpreadOptions(), "--spread", texts).spreads(SCENARIO);
    }

    @ParameterizedTest
    @CsvSource({
        "timing.windowWidthPs=100:500, timing.windowWidthPs, 100, 500, 201, false",
        "timing.windowWidthPs=1e2:.5e3:11, timing.windowWidthPs, 100, 500, 11, false",
        "timing.windowWidthPs=100:500:log, timing.windowWidthPs, 100, 500, 201, true",
        "timing.windowWidthPs=100.:500:log:5, timing.windowWidthPs, 100, 500, 5, true",
        "timing.windowWidthPs=100:+500:5:log, timing.windowWidthPs, 100, 500, 5, true",
        "timing.windowWidthPs=100:500:lin:5, timing.windowWidthPs, 100, 500, 5, false",
        "alice.delayErrorPs=-100:1E+2, alice.delayErrorPs, -100, 100, 201, false",
        "alice.path.penstock duct.lengthKm=1:50, alice.path.penstock duct.lengthKm, 1, 50, 201, false",
        "both.detectors[0].efficiency=0.1:0.9:2, both.detectors[0].efficiency, 0.1, 0.9, 2, false",
        "link.lengthKm=0:200, link.lengthKm, 0, 200, 201, false",
        "acquisition.fringePoints=3:20, acquisition.fringePoints, 3, 20, 18, false",
        "acquisition.fringePoints=4:1004, acquisition.fringePoints, 4, 1004, 201, false",
        "acquisition.fringePoints=4:304, acquisition.fringePoints, 4, 304, 151, false",
        "acquisition.fringePoints=4:1001, acquisition.fringePoints, 4, 1001, 998, false",
        "acquisition.fringePoints=4:10:4, acquisition.fringePoints, 4, 10, 4, false"
    })
    void variedParameterIsRead(String text, String path, double from, double to, int steps, boolean logarithmic)
            throws UsageException {
        Axis axis = vary(text).get(0);
        assertThat(axis.parameter().path()).isEqualTo(path);
        assertThat(axis)
                .extracting(Axis::from, Axis::to, Axis::steps, Axis::logarithmic)
                .containsExactly(from, to, steps, logarithmic);
    }

    @Test
    void stepsWhereNoneAreStatedFollowTheNumberOfParameters() throws UsageException {
        String[] texts = {"timing.windowWidthPs=1:2", "imbalanceNs=1:2", "link.lengthKm=1:2:5", "alice.delayErrorPs=1:2"
        };
        assertThat(vary(texts[0], texts[1])).extracting(Axis::steps).containsExactly(101, 101);
        assertThat(vary(texts[0], texts[1], texts[2])).extracting(Axis::steps).containsExactly(21, 21, 5);
        assertThat(vary(texts)).extracting(Axis::steps).containsExactly(11, 11, 5, 11);
        assertThat(vary(texts))
                .extracting(axis -> axis.parameter().path())
                .containsExactly("timing.windowWidthPs", "imbalanceNs", "link.lengthKm", "alice.delayErrorPs");
    }

    @Test
    void wholeNumbersAreRefusedWhereAStudyLooksBetweenThem() {
        String text = "acquisition.fringePoints=3:20";
        String reason = "found a whole number; allowed a parameter that changes steadily";
        assertThatThrownBy(() -> options(new VaryOptions(), "--vary", text).steady(SCENARIO, 2))
                .isInstanceOf(UsageException.class)
                .hasMessage("--vary \"" + text + "\": " + reason);
        assertThatThrownBy(() -> free("acquisition.fringePoints")).hasMessageEndingWith(reason);
        assertThatThrownBy(() -> spreads("acquisition.fringePoints=normal:1")).hasMessageEndingWith(reason);
    }

    /** Planned in the preset: 0.02 pairs, 300 ps in an imbalance of 2 ns, an efficiency of 0.8. */
    @ParameterizedTest
    @CsvSource({
        "source.meanPairsPerCycle, 0.001, 0.4, true",
        "timing.windowWidthPs, 15, 2000, true",
        "both.detectors.efficiency, 0.04, 1, true",
        "source.pump.earlyPairFraction, 0.025, 1, true",
        "timing.windowWidthPs=100:500, 100, 500, false",
        "timing.windowWidthPs=100:1000, 100, 1000, true",
        "timing.windowWidthPs=100:1000:lin, 100, 1000, false",
        "timing.windowWidthPs=100:500:log, 100, 500, true",
        "alice.delayErrorPs=-50:50, -50, 50, false"
    })
    void freeParameterHasARange(String text, double from, double to, boolean logarithmic) throws UsageException {
        Axis axis = free(text);
        assertThat(axis.from()).isCloseTo(from, within(1e-12 * Math.abs(from)));
        assertThat(axis.to()).isCloseTo(to, within(1e-12 * Math.abs(to)));
        assertThat(axis.logarithmic()).isEqualTo(logarithmic);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "alice.delayErrorPs | no planned value to search around; state the range as =FROM:TO",
                "source.schmidtNumber | no planned value to search around; state the range as =FROM:TO",
                "timing.windowWidthPs= | found no range; allowed PATH=FROM:TO, then :STEPS and :log if wanted",
                "timing.windowWidthPs=1:9:5 | found 5 steps; allowed FROM:TO alone",
                "timing.windowWidthPs=9:1 | found 9 to 1; allowed a range that rises",
                "timing.windwWidthPs | unknown path \"timing.windwWidthPs\": timing has no \"windwWidthPs\";"
                        + " did you mean windowWidthPs?"
            })
    void freeParameterWithoutARangeIsRefused(String text, String reason) {
        assertThatThrownBy(() -> free(text))
                .isInstanceOf(UsageException.class)
                .hasMessage("--free \"" + text + "\": " + reason);
    }

    @Test
    void negativePlannedValueIsSearchedFromItsDoubleToNothing() throws UsageException {
        Scenario late = scenario(Preset.PULSE_PAIR
                .scenario()
                .replace("\"clockJitterRmsPs\": 10", "\"delayErrorPs\": -5, \"clockJitterRmsPs\": 10"));
        Axis axis = options(new FreeOptions(), "--free", "alice.delayErrorPs")
                .axes(late, 1)
                .get(0);
        assertThat(axis.from()).isEqualTo(-10.0);
        assertThat(axis.to()).isEqualTo(0.0);
        assertThat(axis.logarithmic()).isFalse();
    }

    @Test
    void tooManyFreeParametersAreRefused() {
        FreeOptions two = options(new FreeOptions(), "--free", "timing.windowWidthPs", "imbalanceNs");
        assertThatThrownBy(() -> two.axes(SCENARIO, 1))
                .hasMessage("--free \"imbalanceNs\": found 2 free parameters; allowed 1 to 1");
        assertThat(two.given()).isTrue();
        assertThat(options(new FreeOptions(), "--free").given()).isFalse();
    }

    @ParameterizedTest
    @CsvSource({
        "timing.windowWidthPs=normal:5, NORMAL, 5, false",
        "timing.windowWidthPs=uniform:1e-3, UNIFORM, 0.001, false",
        "timing.windowWidthPs=triangular:5%, TRIANGULAR, 0.05, true",
        "timing.windowWidthPs=normal:12.5 %, NORMAL, 0.125, true",
        "alice.delayErrorPs=normal:20, NORMAL, 20, false"
    })
    void spreadIsRead(String text, SpreadShape shape, double width, boolean relative) throws UsageException {
        Spread spread = spreads(text).get(text.substring(0, text.indexOf('=')));
        assertThat(spread.shape()).isEqualTo(shape);
        assertThat(spread.width()).isEqualTo(width);
        assertThat(spread.relative()).isEqualTo(relative);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "timing.windowWidthPs=noraml:5 | unknown shape noraml; allowed normal ' ' uniform ' ' triangular;"
                        + " did you mean normal?",
                "timing.windowWidthPs=normal | allowed PATH=normal:SD, PATH=uniform:HALF or PATH=triangular:HALF",
                "timing.windowWidthPs | allowed PATH=normal:SD, PATH=uniform:HALF or PATH=triangular:HALF",
                "timing.windowWidthPs=normal:x | found \"x\"; allowed a number such as 0.02 or 2e-2",
                "timing.windowWidthPs=normal:5ps | found \"5ps\"; allowed a number such as 0.02 or 2e-2",
                "timing.windowWidthPs=normal:0 | found a width of 0; allowed above 0",
                "timing.windowWidthPs=uniform:-2% | found a width of -2%; allowed above 0",
                "alice.delayErrorPs=normal:5% | is planned at 0, of which per cents are nothing; give the width in ps",
                "source.schmidtNumber=normal:1 | has no planned value in this scenario to spread about"
            })
    void wrongSpreadIsRefused(String text, String reason) {
        assertThatThrownBy(() -> spreads(text))
                .isInstanceOf(UsageException.class)
                .hasMessage("--spread \"" + text + "\": " + reason.replace("' '", "|"));
    }

    @Test
    void spreadsKeepTheirOrderAndAreNamedOnce() throws UsageException {
        assertThat(spreads("timing.windowWidthPs=normal:5", "imbalanceNs=normal:1%")
                        .keySet())
                .containsExactly("timing.windowWidthPs", "imbalanceNs");
        assertThat(spreads()).isEmpty();
        assertThatThrownBy(() -> spreads("imbalanceNs=normal:1%", "imbalanceNs=uniform:1%"))
                .hasMessageEndingWith("found twice; allowed once");
    }
}
