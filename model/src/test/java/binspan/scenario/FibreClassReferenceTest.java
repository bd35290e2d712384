package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.DispersionLaw.Middle;
import binspan.scenario.DispersionLaw.ThreeTerm;
import binspan.scenario.FibreLimit.Quantity;
import binspan.units.ReferenceTable;
import binspan.units.ReferenceTable.Row;
import java.util.Arrays;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.integration.SimpsonIntegrator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Fibre classes against the Recommendations whose names they bear. */
final class FibreClassReferenceTest {

    @ParameterizedTest(name = "{0}")
    @MethodSource("dispersions")
    void threeTermDispersion(Row row) {
        ThreeTerm law = new ThreeTerm(row.number("zeroNm"), row.number("slope"));
        double expected = row.number("dispersion");

        assertThat(law.at(row.number("wavelengthNm"))).isCloseTo(expected, within(row.tolerance(expected)));
    }

    /** The delay between two wavelengths is the area under the dispersion, its slope the derivative. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("integrals")
    void threeTermDelayAndSlope(Row row) {
        ThreeTerm law = new ThreeTerm(row.number("zeroNm"), row.number("zeroSlope"));
        double from = row.number("fromNm");
        double found = row.text("quantity").equals("delay")
                ? new SimpsonIntegrator().integrate(100_000, law::at, from, row.number("toNm"))
                : slope(law, from);

        assertThat(found).isCloseTo(row.number("expected"), within(row.tolerance(row.number("expected"))));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("bounds")
    void boundingLines(Row row) {
        FibreClass fibre = fibre(row);
        Middle bounds = fibre.dispersionBounds().orElseThrow();
        double nm = row.number("wavelengthNm");

        assertThat(bounds.lowest().at(nm)).isCloseTo(row.number("lowest"), within(row.tolerance(0.0)));
        assertThat(bounds.highest().at(nm)).isCloseTo(row.number("highest"), within(row.tolerance(0.0)));
        assertThat(fibre.dispersion().at(nm)).isBetween(row.number("lowest"), row.number("highest"));
    }

    /** Bounding lines are continuous, so that a small step of the wavelength is a small step of the limit. */
    @ParameterizedTest
    @EnumSource(
            value = FibreClass.class,
            names = {"G653B", "G655D", "G655E"})
    void boundingLinesMeetAtTheirBreak(FibreClass fibre) {
        Middle bounds = fibre.dispersionBounds().orElseThrow();
        for (double nm = 1460.0; nm < 1625.0; nm += 0.5) {
            assertThat(bounds.lowest().at(nm + 0.5) - bounds.lowest().at(nm)).isBetween(0.0, 0.06);
            assertThat(bounds.highest().at(nm + 0.5) - bounds.highest().at(nm)).isBetween(0.0, 0.06);
            assertThat(bounds.lowest().at(nm)).isLessThan(bounds.highest().at(nm));
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("limits")
    void limitIsThatOfTheRecommendation(Row row) {
        assertThat(fibre(row).limits())
                .filteredOn(limit -> isOf(limit, row))
                .singleElement()
                .satisfies(limit -> {
                    assertThat(limit.allowed().highest()).isEqualTo(row.number("highest"));
                    if (row.has("lowest")) {
                        assertThat(limit.allowed().lowest()).isEqualTo(row.number("lowest"));
                    } else {
                        assertThat(limit.allowed().lowest()).isZero();
                    }
                });
    }

    @Test
    void noLimitIsWithoutReference() {
        long inProgram = Arrays.stream(FibreClass.values())
                .mapToLong(fibre -> fibre.limits().size())
                .sum();

        assertThat(inProgram).isEqualTo(limits().count());
    }

    /** A limit is compared with the field of the file that it limits, so that both must have one unit. */
    @Test
    void unitsAreThoseOfTheFibreInTheFile() {
        assertThat(Quantity.ATTENUATION.unit()).isEqualTo(fibreField("attenuationDbPerKm"));
        assertThat(Quantity.DISPERSION.unit()).isEqualTo(fibreField("dispersionPsPerNmKm"));
        assertThat(Quantity.DISPERSION_VARIATION.unit()).isEqualTo(fibreField("dispersionPsPerNmKm"));
        assertThat(Quantity.PMD.unit()).isEqualTo(fibreField("pmdPsPerSqrtKm"));
        assertThat(Quantity.ZERO_WAVELENGTH.unit()).isEqualTo("nm");
        assertThat(Quantity.ZERO_SLOPE.unit())
                .isEqualTo(Quantity.DISPERSION_SLOPE.unit())
                .isEqualTo("ps/(nm^2 km)");
    }

    private static String fibreField(String name) {
        return PathSections.ELEMENTS
                .section("fibre")
                .flatMap(fibre -> fibre.field(name))
                .orElseThrow()
                .unit();
    }

    /** Checked against the table and not against the program's own limits. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("limits")
    void planningValueIsInsideTheLimit(Row row) {
        double lowest = row.has("lowest") ? row.number("lowest") : Double.NEGATIVE_INFINITY;

        assertThat(planned(row).boxed())
                .isNotEmpty()
                .allSatisfy(value -> assertThat(value).isBetween(lowest, row.number("highest")));
    }

    /**
     * Common practice: standard fibre has 16 to 18 ps/(nm km) at 1550 nm, typically 17, with a slope of 0.056 to 0.058.
     */
    @Test
    void standardFibreIsTypical() {
        DispersionLaw law = FibreClass.G652D.dispersion();

        assertThat(law.at(1550.0)).isCloseTo(17.0, within(0.5));
        assertThat(slope(law, 1550.0)).isBetween(0.0555, 0.0585);
        assertThat(FibreClass.G652D.attenuation().at(1310.0)).isBetween(0.32, 0.35);
        assertThat(FibreClass.G652D.attenuation().at(1550.0))
                .as("deployed, with splices")
                .isBetween(0.22, 0.30);
    }

    /** Slavik et al., Sci. Rep. 5, 15447 (2015): 39 ps/(km K); Proc. SPIE 11355, 1135507 (2020): 40. */
    @Test
    void delayOfStandardFibreDriftsAsPublished() {
        assertThat(FibreClass.DELAY_PS_PER_KM_K).isBetween(39.0, 40.0);
    }

    @Test
    void namesAreThoseOfTheRecommendationsAndDiffer() {
        assertThat(FibreClass.values())
                .extracting(FibreClass::text)
                .doesNotHaveDuplicates()
                .allMatch(text -> text.matches("G\\.65[2-7]\\.[A-E][1-3]?"));
        assertThat(FibreClass.values()).extracting(FibreClass::meaning).doesNotContain("");
    }

    private static DoubleStream planned(Row row) {
        FibreClass fibre = fibre(row);
        DispersionLaw law = fibre.dispersion();
        return switch (quantity(row)) {
            case ATTENUATION -> band(row).map(fibre.attenuation()::at);
            case DISPERSION -> band(row).map(law::at);
            case DISPERSION_VARIATION ->
                DoubleStream.of(band(row).map(law::at).max().orElseThrow()
                        - band(row).map(law::at).min().orElseThrow());
            case DISPERSION_SLOPE -> band(row).map(nm -> slope(law, nm));
            case ZERO_WAVELENGTH -> DoubleStream.of(zero(law));
            case ZERO_SLOPE -> DoubleStream.of(slope(law, zero(law)));
            case PMD -> DoubleStream.of(FibreClass.PMD_PS_PER_SQRT_KM);
        };
    }

    private static double zero(DispersionLaw law) {
        return new BrentSolver(1e-9).solve(1000, law::at, 1200.0, 1700.0);
    }

    private static double slope(DispersionLaw law, double nm) {
        double step = 0.01;
        return (law.at(nm + step) - law.at(nm - step)) / (2.0 * step);
    }

    private static DoubleStream band(Row row) {
        double from = row.number("fromNm");
        double width = row.number("toNm") - from;
        return DoubleStream.iterate(0.0, share -> share <= 1.0, share -> share + 0.0625)
                .map(share -> from + share * width);
    }

    private static boolean isOf(FibreLimit limit, Row row) {
        double from = row.has("fromNm") ? row.number("fromNm") : 0.0;
        double to = row.has("toNm") ? row.number("toNm") : Double.POSITIVE_INFINITY;
        return limit.quantity() == quantity(row)
                && limit.fromNm() == from
                && limit.toNm() == to
                && limit.holdsAt(from)
                && !limit.holdsAt(from - 1.0);
    }

    private static Quantity quantity(Row row) {
        return Arrays.stream(Quantity.values())
                .filter(each -> each.text().equals(row.text("quantity")))
                .findFirst()
                .orElseThrow();
    }

    private static FibreClass fibre(Row row) {
        return Arrays.stream(FibreClass.values())
                .filter(each -> each.text().equals(row.text("class")))
                .findFirst()
                .orElseThrow();
    }

    static Stream<Row> dispersions() {
        return ReferenceTable.rows("fibre-dispersion.csv");
    }

    static Stream<Row> integrals() {
        return ReferenceTable.rows("fibre-dispersion-integrals.csv");
    }

    static Stream<Row> bounds() {
        return ReferenceTable.rows("fibre-dispersion-bounds.csv");
    }

    static Stream<Row> limits() {
        return ReferenceTable.rows("fibre-limits.csv");
    }
}
