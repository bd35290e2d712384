package binspan.merit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.ReferenceCase;
import binspan.counting.FringeCounts;
import binspan.counting.LinkCounts;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** From visibility to S and errors, Bell tests that have been measured, and how many events they need. */
final class BellReferenceTest {
    private static final double NO_OFFSET = 0.0;

    static Stream<ReferenceCase> cases() {
        return ReferenceCase.of("bell.csv");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("cases")
    void agrees(ReferenceCase c) {
        if (c.isLike("fr-VtoS")) {
            visibility(c);
        } else if (c.isLike("chain-")) {
            chained(c);
        } else if (c.isLike("bell-sigma-")) {
            equalSplit(c);
        } else if (c.isLike("bell-N-")) {
            c.check("N_total", new BellTest(c.in("S"), 1.0).secondsTo(c.in("n_sigma")));
        } else {
            single(c);
        }
        c.finish();
    }

    private static void single(ReferenceCase c) {
        switch (c.id()) {
            case "chsh-threshold" -> thresholds(c);
            case "fr-staticphase-0.2" -> c.check("QBER", FringeCounts.phaseError(1.0, c.in("offset_rad")));
            case "bell-time" ->
                c.check("time_s", new BellTest(c.in("S"), c.in("coincidence_rate_cps")).secondsTo(c.in("n_sigma")));
            case "bell-DM2002" -> photographed(c);
            case "bell-hensen2015" -> loopholeFree(c);
            case "bell-lab16" -> laboratory(c);
            case "bell-published-set" -> published(c);
            case "bell-pvalue-hensen" -> pValue(c, (int) c.in("wins"));
            case "bell-pvalue-700" -> pValue(c, (int) Math.round(c.in("trials") * (0.5 + c.in("S") / 8.0)));
            default -> throw new IllegalStateException("no test for " + c.id());
        }
    }

    private static void visibility(ReferenceCase c) {
        double s = chsh(c.in("V"));
        c.check("S_max", s);
        c.check("QBER", FringeCounts.phaseError(c.in("V"), NO_OFFSET));
        c.check("violates_CHSH", s > 2.0);
    }

    private static double chsh(double visibility) {
        return BellTest.of(FringeCounts.of(visibility, 1.0), visibility, NO_OFFSET)
                .chsh();
    }

    /**
     * The classical bound is not part of the model; it is what two pulses of classical light with a random common phase show,
     * and is kept as a check of the reference table.
     */
    private static void thresholds(ReferenceCase c) {
        c.check("V_CHSH", new BrentSolver(1e-13).solve(100, v -> chsh(v) - 2.0, 0.5, 1.0));
        c.check("S_at_V1", chsh(1.0));
        double max = classicalProduct(0.0);
        double min = classicalProduct(Math.PI);
        c.check("V_classical_fields", (max - min) / (max + min));
    }

    /** Mean product of both sides' intensities over the common phase. */
    private static double classicalProduct(double phase) {
        int steps = 64;
        double sum = 0.0;
        for (int i = 0; i < steps; i++) {
            double common = 2.0 * Math.PI * i / steps;
            sum += (1.0 + Math.cos(phase + common)) * (1.0 + Math.cos(common)) / steps;
        }
        return sum;
    }

    /** A chain of 2 N correlations at a phase of pi/(2 N) reaches 2 N - 1, what half of the events kept allow a local model. */
    private static void chained(ReferenceCase c) {
        double n = c.in("settings_per_side_N");
        assertThat(c.in("terms")).isEqualTo(2.0 * n);
        double threshold = new BrentSolver(1e-12)
                .solve(100, v -> 2.0 * n * correlation(v, Math.PI / (2.0 * n)) - (2.0 * n - 1.0), 0.5, 2.0);
        c.check("V_threshold", threshold);
        c.check("violable", threshold < 1.0);
    }

    private static double correlation(double visibility, double phase) {
        LinkCounts counts = FringeCounts.of(visibility, 1.0);
        double cosine = Math.cos(phase);
        return counts.central().equalLessUnequal(cosine) / counts.central().sum(cosine);
    }

    /** Equal counts and equal moduli of E: the planned error, and that of sixteen counts made to be so. */
    private static void equalSplit(ReferenceCase c) {
        double each = c.in("N_total") / 4.0;
        double more = each * (1.0 + c.in("S") / 4.0) / 4.0;
        double fewer = each * (1.0 - c.in("S") / 4.0) / 4.0;
        CorrelationCounts plus = new CorrelationCounts(more, fewer, fewer, more);
        CorrelationCounts minus = new CorrelationCounts(fewer, more, more, fewer);
        BellCounts measured = new BellCounts(List.of(plus, plus, plus, minus), 3);

        double planned = BellTest.sigma(c.in("S"), each);

        c.check("sigma_S", planned);
        c.check("published", planned);
        assertThat(measured.chsh()).isCloseTo(c.in("S"), within(1e-12));
        assertThat(measured.sigma()).isCloseTo(planned, within(1e-12));
    }

    /** Polarizers at four angles on each side: an outcome "minus" is the count at the angle turned by 90 degrees. */
    private static void photographed(ReferenceCase c) {
        double[][] n = c.table("counts");
        BellCounts counts = new BellCounts(
                List.of(turned(n, 0, 0), turned(n, 0, 1), turned(n, 1, 0), turned(n, 1, 1)), (int) c.in("minus"));
        c.check("E", correlations(counts));
        c.check("S", counts.chsh());
        c.check("sigma_S", counts.sigma());
        c.check("n_sigma", (counts.chsh() - 2.0) / counts.sigma());
        c.check("published_S", counts.chsh());
        c.check("published_sigma", counts.sigma());
        c.check("total_counts", counts.total());
    }

    /** Rows go through the four angles of bob for each of the four of alice; two steps turn by 90 degrees. */
    private static CorrelationCounts turned(double[][] n, int alice, int bob) {
        return new CorrelationCounts(
                n[4 * alice + bob][0],
                n[4 * alice + bob + 2][0],
                n[4 * (alice + 2) + bob][0],
                n[4 * (alice + 2) + bob + 2][0]);
    }

    private static void loopholeFree(ReferenceCase c) {
        BellCounts counts = counts(c);
        c.check("E", correlations(counts));
        c.check("S", counts.chsh());
        c.check("sigma_S", counts.sigma());
        c.check("N", counts.total());
        c.check("published_S", counts.chsh());
        c.check("published_sigma", counts.sigma());
        assertThat(counts.wins()).isEqualTo(196.0);
        assertThat(counts.pValue()).isEqualTo(BellCounts.pValue(245, 196));
    }

    private static void laboratory(ReferenceCase c) {
        BellCounts counts = counts(c);
        c.check("E", correlations(counts));
        c.check("S", counts.chsh());
        c.check("sigma_S", counts.sigma());
    }

    private static BellCounts counts(ReferenceCase c) {
        List<CorrelationCounts> settings = Arrays.stream(c.table("counts"))
                .map(n -> new CorrelationCounts(n[0], n[1], n[2], n[3]))
                .toList();
        return new BellCounts(settings, (int) c.in("minus"));
    }

    private static double[] correlations(BellCounts counts) {
        return counts.settings().stream()
                .mapToDouble(CorrelationCounts::correlation)
                .toArray();
    }

    /** Published S with its error: a violation below the quantum limit whose number of events, inverted, gives the error back. */
    private static void published(ReferenceCase c) {
        for (String experiment : c.names()) {
            double[] printed = c.printed(experiment);
            BellTest test = new BellTest(printed[0], 1.0);
            double deviations = (printed[0] - 2.0) / printed[1];
            assertThat(printed[0]).as(experiment).isBetween(2.0, BellTest.TSIRELSON);
            assertThat(deviations).as(experiment).isGreaterThan(3.0);
            assertThat(test.sigma(test.secondsTo(deviations))).as(experiment).isCloseTo(printed[1], within(1e-12));
        }
    }

    private static void pValue(ReferenceCase c, int wins) {
        double found = BellCounts.pValue((int) c.in("trials"), wins);
        c.check("p_computed", found);
        c.check("p_published", found);
    }
}
