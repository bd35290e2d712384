package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** How scenario paths address one number, several, or none. */
final class ParameterPathsTest {
    private static final Scenario PAIR = SampleScenarios.build(SampleScenarios.pulsePair());
    private static final Scenario EVERYTHING = SampleScenarios.build(SampleScenarios.everything());

    @Test
    void pathWithoutPortMovesAllPortsOfTheSite() {
        Scenario changed = SampleScenarios.with(PAIR, "alice.detectors.efficiency", 0.61);

        assertThat(changed.alice().detectors()).extracting(Detector::efficiency).containsExactly(0.61, 0.61);
        assertThat(changed.bob()).isEqualTo(PAIR.bob());
    }

    @Test
    void pathWithPortMovesThatPort() {
        Scenario changed = SampleScenarios.with(PAIR, "alice.detectors[1].efficiency", 0.61);

        assertThat(changed.alice().detectors()).extracting(Detector::efficiency).containsExactly(0.80, 0.61);
    }

    @Test
    void bothMovesTheTwoSitesTogether() {
        Scenario changed = SampleScenarios.with(PAIR, "both.detectors.efficiency", 0.61);
        Scenario clocks = SampleScenarios.with(PAIR, "both.clockJitterRmsPs", 25.0);

        assertThat(List.of(changed.alice(), changed.bob()))
                .allSatisfy(arm -> assertThat(arm.detectors())
                        .extracting(Detector::efficiency)
                        .containsOnly(0.61));
        assertThat(List.of(clocks.alice(), clocks.bob()))
                .extracting(Arm::clockJitterRmsPs)
                .containsOnly(25.0);
    }

    @ParameterizedTest
    @CsvSource({"alice.path.lake cable.lengthKm", "alice.path[1].lengthKm"})
    void pathElementIsFoundByLabelOrPosition(String path) {
        Scenario changed = SampleScenarios.with(EVERYTHING, path, 14.0);

        assertThat(changed.alice().path().get(1))
                .isInstanceOfSatisfying(
                        FibreSpan.class, span -> assertThat(span.lengthKm()).isEqualTo(14.0));
        assertThat(changed.alice().path().get(0))
                .isEqualTo(EVERYTHING.alice().path().get(0));
        assertThat(changed.bob()).isEqualTo(EVERYTHING.bob());
    }

    @Test
    void bothFindsTheElementOfOneLabelInEachArm() {
        Scenario changed = SampleScenarios.with(PAIR, "both.path.cable.lengthKm", 12.0);

        assertThat(new LinkLength().value(changed)).hasValue(24.0);
    }

    @Test
    void classicalChannelIsAddressedInsideItsFibre() {
        Scenario changed =
                SampleScenarios.with(EVERYTHING, "alice.path.valley duct.classicalChannels[0].launchDbm", 0.0);
        Scenario all = SampleScenarios.with(EVERYTHING, "alice.path[0].classicalChannels.launchDbm", 0.0);

        assertThat(changed).isEqualTo(all).isNotEqualTo(EVERYTHING);
    }

    @Test
    void elementsWithoutLabelAreOfferedByPosition() {
        Values values = SampleScenarios.without(SampleScenarios.pulsePair(), "bob.path[0].label");
        Scenario scenario = SampleScenarios.build(values);

        assertThatIllegalArgumentException()
                .isThrownBy(() -> ParameterPaths.find(scenario, "bob.path.cable.lengthKm"))
                .withMessage(
                        "unknown path \"bob.path.cable.lengthKm\"; name one element of path by its label or as [0]");
        assertThat(ParameterPaths.find(scenario, "bob.path[0].lengthKm").value(scenario))
                .hasValue(30.0);
    }

    /** Labels may hold dots; the longest that fits is meant. */
    @Test
    void labelInsideAnotherLabelDoesNotHideIt() {
        Values values = SampleScenarios.everything();
        SampleScenarios.part(values, "alice.path[0]").put("label", "duct");
        SampleScenarios.part(values, "alice.path[1]").put("label", "duct.north");
        values.put("provenance", Map.of());
        Scenario scenario = SampleScenarios.build(values);

        assertThat(ParameterPaths.find(scenario, "alice.path.duct.lengthKm").value(scenario))
                .hasValue(18.0);
        assertThat(ParameterPaths.find(scenario, "alice.path.duct.north.lengthKm")
                        .value(scenario))
                .hasValue(12.0);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "alice.detectors.eficiency | unknown path \"alice.detectors.eficiency\": detector has no \"eficiency\"; did you mean efficiency?",
                "timing.windowWidth | unknown path \"timing.windowWidth\": timing has no \"windowWidth\"; did you mean windowWidthPs?",
                "alise.tagBinPs | unknown path \"alise.tagBinPs\": scenario has no \"alise\"; did you mean alice?",
                "timing.colour | unknown path \"timing.colour\": timing has no \"colour\"; timing has windowWidthPs, cableTemperatureStepK",
                "name.first | unknown path \"name.first\"; name has no parts",
                "alice.detectors[2].efficiency | path \"alice.detectors[2].efficiency\" leads nowhere: detectors has elements [0] to [1]",
                "alice.detectors[x].efficiency | path \"alice.detectors[x].efficiency\" leads nowhere: detectors has elements [0] to [1]",
                "alice.detectors[0.efficiency | path \"alice.detectors[0.efficiency\" leads nowhere: detectors has elements [0] to [1]",
                "alice.detectors[0]-efficiency | unknown path \"alice.detectors[0]-efficiency\"; a dot must stand before \"-efficiency\"",
                "alice[0].tagBinPs | unknown path \"alice[0].tagBinPs\"; a dot must stand before \"[0].tagBinPs\"",
                "alice.path.lengthKm | unknown path \"alice.path.lengthKm\"; name one element of path by its label or as [0]; labels: valley duct, lake cable, patch panel, receive filter, grating",
                "alice.detectors[0].gate.widthNs | path \"alice.detectors[0].gate.widthNs\" leads nowhere: this scenario has no gate there",
                "alice.path[1].classicalChannels.launchDbm | path \"alice.path[1].classicalChannels.launchDbm\" leads nowhere: classicalChannels is empty",
                "alice.path[1].classicalChannels[0].launchDbm | path \"alice.path[1].classicalChannels[0].launchDbm\" leads nowhere: classicalChannels is empty",
                "source.pump.mode | path \"source.pump.mode\" leads to a word; needs a number's path",
                "alice.analyzer | path \"alice.analyzer\" leads to an object; needs a number's path",
                "alice.detectors | path \"alice.detectors\" leads to a list of objects; needs a number's path",
                "alice.path.grating | path \"alice.path.grating\" leads to a list of objects; needs a number's path",
                "spread | path \"spread\" leads to an object of paths; needs a number's path",
            })
    void pathThatLeadsToNoNumberIsRefusedWithWhatIsKnown(String path, String message) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ParameterPaths.find(EVERYTHING, path))
                .withMessage(message);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                ".",
                "both",
                "both.",
                "both.source.schmidtNumber",
                "link",
                "link.length",
                "alice.",
                "alice..tagBinPs",
                "alice.detectors[]",
                "spread.both"
            })
    void brokenPathIsRefusedByName(String path) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ParameterPaths.find(EVERYTHING, path))
                .withMessageContaining("path \"");
    }
}
