package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class AttenuationTableTest {
    private final AttenuationTable table = new AttenuationTable(0.35, 0.23, 0.26);

    /** The three knots, the middles between them, and the level ends. */
    @ParameterizedTest
    @CsvSource({
        "1310, 0.35",
        "1430, 0.29",
        "1550, 0.23",
        "1587.5, 0.245",
        "1625, 0.26",
        "850, 0.35",
        "1309, 0.35",
        "1650, 0.26"
    })
    void straightBetweenTheKnotsAndLevelOutside(double wavelengthNm, double attenuation) {
        assertThat(table.at(wavelengthNm)).isCloseTo(attenuation, within(1e-12));
    }
}
