package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.units.ReferenceTable;
import binspan.units.ReferenceTable.Row;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The three ways to give a centre, at the channels of ITU-T G.694.1. */
final class BandTest {
    private static final OptionalDouble NONE = OptionalDouble.empty();

    @ParameterizedTest(name = "{0}")
    @MethodSource("hundredGigahertzGrid")
    void centreIsTheSameHoweverItIsGiven(Row row) {
        double hertz = row.number("frequencyTHz") * 1e12;
        double nm = row.number("wavelengthNm");

        for (Band band : new Band[] {
            band(OptionalDouble.of(nm), NONE, NONE),
            band(NONE, OptionalDouble.of(row.number("frequencyTHz")), NONE),
            band(NONE, NONE, OptionalDouble.of(31.0 + row.number("n")))
        }) {
            assertThat(band.centreNm()).isCloseTo(nm, within(row.tolerance(nm)));
            assertThat(band.centreHz()).isCloseTo(hertz, within(hertz * row.tolerance(nm) / nm));
        }
    }

    private static Band band(OptionalDouble wavelengthNm, OptionalDouble frequencyTHz, OptionalDouble channel) {
        return new Band(wavelengthNm, frequencyTHz, channel, 75.0, PassbandShape.GAUSSIAN, 0.0, 0.0);
    }

    static Stream<Row> hundredGigahertzGrid() {
        return ReferenceTable.rows("frequency-grid.csv").filter(row -> row.number("spacingGHz") == 100.0);
    }
}
