package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.units.ReferenceTable;
import binspan.units.ReferenceTable.Row;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Detector classes against measured detectors: a class to plan with must not be better than the best published one of
 * its kind, and must be what a person of the trade takes for plausible.
 */
final class DetectorClassReferenceTest {
    private static final List<Row> PUBLISHED =
            ReferenceTable.rows("detectors-published.csv").toList();

    /**
     * A kind whose rows count for another class as well: the filter in front of a nanowire changes its darkness only.
     */
    private static final String NANOWIRE = "snspd";

    @ParameterizedTest
    @EnumSource(DetectorClass.class)
    void efficiencyIsNotAboveTheBestPublished(DetectorClass known) {
        assertThat(known.typical().efficiency())
                .isBetween(0.01, column(known, "efficiency").max().orElseThrow());
    }

    @ParameterizedTest
    @EnumSource(DetectorClass.class)
    void jitterIsNotBelowTheBestPublished(DetectorClass known) {
        OptionalDouble best = column(known, "jitterFwhmPs").min();

        best.ifPresentOrElse(
                ps -> assertThat(known.typical().jitterFwhmPs()).isGreaterThanOrEqualTo(ps),
                () -> assertThat(known).as("no published jitter at hand").isEqualTo(DetectorClass.INGAAS_FREE_RUNNING));
    }

    /** Darkness rises with efficiency in one device, so that their ratio is what can be compared between devices. */
    @ParameterizedTest
    @EnumSource(DetectorClass.class)
    void darknessForItsEfficiencyIsNotBelowTheBestPublished(DetectorClass known) {
        boolean gated = known.gate().isPresent();
        String dark = gated ? "darkPerGate" : "darkPerSecond";
        double best = rows(known)
                .filter(row -> row.has(dark))
                .mapToDouble(row -> row.number(dark) / (row.has("efficiency") ? row.number("efficiency") : 1.0))
                .min()
                .orElseThrow();
        double planned = gated
                ? known.gate().orElseThrow().darkProbability()
                : known.typical().darkCountsPerSecond();

        assertThat(planned / known.typical().efficiency()).isGreaterThanOrEqualTo(best);
    }

    @ParameterizedTest
    @EnumSource(
            value = DetectorClass.class,
            names = {"SNSPD", "SNSPD_COLD_FILTER", "INGAAS_FREE_RUNNING"})
    void deadTimeIsNotBelowTheBestPublished(DetectorClass known) {
        assertThat(known.typical().deadTimeNs())
                .isGreaterThanOrEqualTo(column(known, "deadTimeNs").min().orElseThrow());
    }

    @ParameterizedTest
    @EnumSource(
            value = DetectorClass.class,
            names = {"INGAAS_GATED", "INGAAS_FREE_RUNNING"})
    void afterpulsesAreNotBelowTheBestPublished(DetectorClass known) {
        assertThat(known.typical().afterpulseProbability())
                .isGreaterThanOrEqualTo(column(known, "afterpulse").min().orElseThrow());
    }

    /** Publications on nanowires report no afterpulses; the reset is electrical. */
    @Test
    void nanowiresHaveNoAfterpulses() {
        assertThat(DetectorClass.SNSPD.typical().afterpulseProbability()).isZero();
        assertThat(DetectorClass.SNSPD_COLD_FILTER.typical().afterpulseProbability())
                .isZero();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("planningRanges")
    void planningValueIsSane(Row row) {
        DetectorClass known =
                DetectorClass.valueOf(row.text("class").toUpperCase(Locale.ROOT).replace('-', '_'));

        assertThat(planned(known, row.text("quantity"))).isBetween(row.number("lowest"), row.number("highest"));
    }

    @Test
    void everyClassIsHeldAgainstPublishedRowsAndRanges() {
        Set<DetectorClass> published = EnumSet.noneOf(DetectorClass.class);
        Arrays.stream(DetectorClass.values())
                .filter(known -> rows(known).findAny().isPresent())
                .forEach(published::add);

        assertThat(published).containsExactly(DetectorClass.values());
        assertThat(planningRanges().map(row -> row.text("class")).distinct())
                .containsExactlyInAnyOrderElementsOf(Choice.texts(DetectorClass.class));
    }

    /**
     * All but the silicon diode are meant for the telecommunication bands and must cover the C band, 1530 to 1565 nm.
     */
    @ParameterizedTest
    @EnumSource(DetectorClass.class)
    void wavelengthsOfUseCoverTheBandOfTheClass(DetectorClass known) {
        boolean silicon = known == DetectorClass.SILICON_APD;

        // indium phosphide and gallium arsenide absorb below about 0.9 um: textbook; a nanowire is limited by its
        // coupling only
        assertThat(known.shortestNm()).isBetween(silicon ? 350.0 : 500.0, silicon ? 600.0 : 1530.0);
        // the band gap of silicon, 1.12 eV, ends its use near 1100 nm: textbook
        assertThat(known.longestNm()).isBetween(silicon ? 850.0 : 1565.0, silicon ? 1107.0 : 2000.0);
    }

    @ParameterizedTest
    @EnumSource(DetectorClass.class)
    void classSaysWhatItIsAndWhereItsNumbersComeFrom(DetectorClass known) {
        assertThat(known.meaning()).isNotBlank();
        assertThat(known.provenance()).contains(":");
        assertThat(known.cryogenic()).isEqualTo(known.meaning().contains("nanowire"));
    }

    private static double planned(DetectorClass known, String quantity) {
        DetectorClass.Typical typical = known.typical();
        return switch (quantity) {
            case "efficiency" -> typical.efficiency();
            case "dark" -> typical.darkCountsPerSecond();
            case "darkPerGateNs" ->
                known.gate()
                        .map(gate -> gate.darkProbability() / gate.widthNs())
                        .orElseThrow();
            case "jitter" -> typical.jitterFwhmPs();
            case "deadTime" -> typical.deadTimeNs();
            case "afterpulse" -> typical.afterpulseProbability();
            default -> throw new IllegalStateException(quantity);
        };
    }

    private static DoubleStream column(DetectorClass known, String column) {
        return rows(known).filter(row -> row.has(column)).mapToDouble(row -> row.number(column));
    }

    private static Stream<Row> rows(DetectorClass known) {
        boolean filtered = known == DetectorClass.SNSPD_COLD_FILTER;
        return PUBLISHED.stream()
                .filter(row -> row.text("class").equals(known.text())
                        || (filtered && row.text("class").equals(NANOWIRE)));
    }

    static Stream<Row> planningRanges() {
        return ReferenceTable.rows("detectors-planning.csv");
    }
}
