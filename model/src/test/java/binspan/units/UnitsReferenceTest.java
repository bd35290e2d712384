package binspan.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.units.ReferenceTable.Row;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Conversions against published grids and against numbers computed apart from this program. */
final class UnitsReferenceTest {

    @ParameterizedTest(name = "{0}")
    @MethodSource("grid")
    void channelGrid(Row row) {
        double hertz = OpticalFrequency.gridHz(row.number("n"), row.number("spacingGHz") * 1e9);

        assertThat(hertz).isCloseTo(row.number("frequencyTHz") * 1e12, within(0.05));
        if (row.has("wavelengthNm")) {
            double expected = row.number("wavelengthNm");
            assertThat(OpticalFrequency.toWavelengthNm(hertz)).isCloseTo(expected, within(row.tolerance(expected)));
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("conversions")
    void conversion(Row row) {
        double given = row.number("given");
        double found = switch (row.text("quantity")) {
            case "transmittance" -> Decibels.transmittance(given);
            case "fwhm" -> GaussianWidth.fwhm(given);
            case "width" -> OpticalFrequency.widthNm(given * 1e9, row.number("alsoGiven"));
            case "idler-frequency" -> idlerHz(row) / 1e12;
            case "idler-wavelength" -> OpticalFrequency.toWavelengthNm(idlerHz(row));
            default -> throw new IllegalStateException(row.text("quantity"));
        };

        assertThat(found).isCloseTo(row.number("expected"), within(row.tolerance(row.number("expected"))));
    }

    /** SI Brochure, 9th edition (2019): both constants are exact. */
    @Test
    void constantsAreThoseOfTheInternationalSystem() {
        assertThat(PhysicalConstants.SPEED_OF_LIGHT).isEqualTo(299_792_458.0);
        assertThat(PhysicalConstants.PLANCK).isEqualTo(6.62607015e-34);
    }

    private static double idlerHz(Row row) {
        return OpticalFrequency.ofWavelengthNm(row.number("given")) - row.number("alsoGiven") * 1e12;
    }

    static Stream<Row> grid() {
        return ReferenceTable.rows("frequency-grid.csv");
    }

    static Stream<Row> conversions() {
        return ReferenceTable.rows("units.csv");
    }
}
