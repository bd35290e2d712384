package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The single values behind a path that moves several together. */
final class FieldPlacesTest {
    private static final Scenario SCENARIO = SampleScenarios.build(SampleScenarios.everything());

    @ParameterizedTest
    @CsvSource({
        "both.detectors.efficiency,"
                + "alice.detectors[0].efficiency;alice.detectors[1].efficiency;bob.detectors[0].efficiency",
        "both.analyzer.mismatchPs, alice.analyzer.mismatchPs;bob.analyzer.mismatchPs",
        "alice.detectors[1].efficiency, alice.detectors[1].efficiency",
        "bob.detectors.gate.darkProbability, bob.detectors[0].gate.darkProbability",
        "alice.path.valley duct.classicalChannels.launchDbm, alice.path[0].classicalChannels[0].launchDbm",
        "source.pump.wavelengthNm, source.pump.wavelengthNm"
    })
    void eachValueHasAPathOfItsOwn(String path, String places) {
        List<Parameter> found = ((FieldParameter) ParameterPaths.find(SCENARIO, path)).places(SCENARIO);

        assertThat(found).extracting(Parameter::path).containsExactly(places.split(";"));
        for (Parameter place : found) {
            assertThat(place.value(SCENARIO))
                    .isEqualTo(ParameterPaths.find(SCENARIO, place.path()).value(SCENARIO));
        }
    }

    /** One of three efficiencies is changed alone; what is set is read back by its own path. */
    @ParameterizedTest
    @CsvSource({"0", "1", "2"})
    void aPlaceMovesItsOwnValueOnly(int place) {
        List<Parameter> places =
                ((FieldParameter) ParameterPaths.find(SCENARIO, "both.detectors.efficiency")).places(SCENARIO);
        Scenario changed = places.get(place).with(SCENARIO, 0.123);

        for (int i = 0; i < places.size(); i++) {
            assertThat(places.get(i).value(changed).orElseThrow())
                    .isEqualTo(
                            i == place ? 0.123 : places.get(i).value(SCENARIO).orElseThrow());
        }
    }
}
