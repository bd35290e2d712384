package binspan.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

final class RequireTest {

    @ParameterizedTest
    @ValueSource(doubles = {-1.0, 0.25, 2.0})
    void withinReturnsWhatLiesInside(double value) {
        assertThat(Require.within("share", value, -1.0, 2.0)).isEqualTo(value);
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1.0000001, 2.0000001, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void withinRefusesTheRest(double value) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.within("share", value, -1.0, 2.0))
                .withMessage("share must be -1.0 to 2.0, found " + value);
    }

    @Test
    void positiveAcceptsInfinity() {
        assertThat(Require.positive("modes", Double.POSITIVE_INFINITY)).isInfinite();
        assertThat(Require.positive("modes", Double.MIN_VALUE)).isPositive();
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -0.0, -1.0, Double.NaN, Double.NEGATIVE_INFINITY})
    void positiveRefusesTheRest(double value) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Require.positive("modes", value))
                .withMessage("modes must be above 0, found " + value);
    }
}
