package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The length of the whole link, which scales all of its fibre. */
final class LinkLengthTest {
    /** Alice 18 km and 12 km, bob 30 km. */
    private static final Scenario SCENARIO = SampleScenarios.build(SampleScenarios.everything());

    private static final Parameter LENGTH = ParameterPaths.find(SCENARIO, LinkLength.PATH);

    @Test
    void lengthIsThatOfAllFibreOfBothArms() {
        assertThat(LENGTH.value(SCENARIO)).hasValue(60.0);
        assertThat(LENGTH.unit()).isEqualTo("km");
    }

    @Test
    void halfTheLengthHasHalfOfAllThatGrowsWithIt() {
        Scenario half = LENGTH.with(SCENARIO, 30.0);
        FibreSpan duct = (FibreSpan) half.alice().path().get(0);
        FibreSpan cable = (FibreSpan) half.alice().path().get(1);

        assertThat(duct.lengthKm()).isEqualTo(9.0);
        assertThat(duct.measuredLossDb()).hasValue(2.45);
        assertThat(cable.lengthKm()).isEqualTo(6.0);
        assertThat(cable.connectors()).isEqualTo(1.0);
        assertThat(cable.splices()).isEqualTo(3.0);
        assertThat(cable.measuredLossDb()).isEqualTo(OptionalDouble.empty());
        assertThat(((FibreSpan) half.bob().path().get(0)).lengthKm()).isEqualTo(15.0);
    }

    /** Per kilometre and per piece nothing changes, and neither does anything that is no fibre. */
    @Test
    void densitiesAndPartsStay() {
        Scenario half = LENGTH.with(SCENARIO, 30.0);
        FibreSpan before = (FibreSpan) SCENARIO.alice().path().get(1);
        FibreSpan after = (FibreSpan) half.alice().path().get(1);

        assertThat(after.scaled(2.0)).isEqualTo(before);
        assertThat(after.attenuationDbPerKm()).isEqualTo(before.attenuationDbPerKm());
        assertThat(after.connectorLossDb()).isEqualTo(before.connectorLossDb());
        assertThat(half.alice().path().subList(2, 5))
                .isEqualTo(SCENARIO.alice().path().subList(2, 5));
        assertThat(List.of(
                        half.source(),
                        half.timing(),
                        half.require(),
                        half.alice().detectors()))
                .isEqualTo(List.of(
                        SCENARIO.source(),
                        SCENARIO.timing(),
                        SCENARIO.require(),
                        SCENARIO.alice().detectors()));
    }

    @ParameterizedTest
    @MethodSource("lengths")
    void lengthThatIsSetIsReadBackInUnchangedProportion(double lengthKm) {
        Scenario scaled = LENGTH.with(SCENARIO, lengthKm);

        assertThat(LENGTH.value(scaled).orElseThrow()).isCloseTo(lengthKm, within(1e-9));
        assertThat(((FibreSpan) scaled.bob().path().get(0)).lengthKm()).isCloseTo(lengthKm / 2.0, within(1e-9));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1.0, 10_001.0, Double.NaN, Double.POSITIVE_INFINITY})
    void lengthOutsideItsRangeIsRefused(double lengthKm) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> LENGTH.with(SCENARIO, lengthKm))
                .withMessage("link.lengthKm: found " + Range.plain(lengthKm) + "; allowed 0 to 10000 km");
    }

    @Test
    void linkWithoutFibreCannotBeScaled() {
        Values values = SampleScenarios.pulsePair();
        SampleScenarios.part(values, "alice").put("path", List.of());
        SampleScenarios.part(values, "bob").put("path", List.of());
        Scenario bench = SampleScenarios.build(values);

        assertThat(LENGTH.value(bench)).hasValue(0.0);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> LENGTH.with(bench, 10.0))
                .withMessage("link.lengthKm: the link has no fibre to scale");
    }

    static DoubleStream lengths() {
        return new SplittableRandom(31).doubles(20, 0.0, 2_000.0);
    }
}
