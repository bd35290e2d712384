package binspan.planner.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.plot.Bin;
import binspan.planner.plot.Histogram;
import binspan.planner.plot.PanelGroup;
import binspan.planner.plot.Picture;
import binspan.planner.plot.RankedBars;
import binspan.scenario.Scenario;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.tolerance.ParameterSpread;
import binspan.study.tolerance.Tolerance;
import binspan.study.tolerance.ToleranceResult;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The picture of a tolerance study: histograms of all builds with their requirements, and what drives failures. */
final class TolerancePictureTest {
    private static final Scenario LANE = DrawnPicture.shipped("orchard-lane-access");

    @TempDir
    private Path directory;

    private static ToleranceResult result(List<FigureColumn> columns) {
        return new Tolerance(LANE, ParameterSpread.of(LANE, Map.of()), 256, 1L, columns).run(Execution.SINGLE);
    }

    @Test
    void histogramsHoldAllBuildsAndTheRequirements() throws Exception {
        ToleranceResult result = result(FigureColumns.all(LANE));
        Picture picture = TolerancePicture.of(result);
        double inked = DrawnPicture.inked(picture, directory);
        assertThat(inked).isBetween(0.02, 0.9);
        String share = binspan.units.Digits.significant(100.0 * result.all().met() / 256.0, 4);
        assertThat(DrawnPicture.texts(picture, directory))
                .contains("Tolerance", LANE.name() + "; " + share + " % of 256 builds meet all requirements")
                .contains("Raw visibility", "Secret key rate (bit/s)", "Time to the first key (s)", "Count")
                .contains("required \u2265 30 bit/s", "5 %", "median", "95 %", "failing side of a requirement")
                .contains("What drives failures", "efficiency, both sides' detectors", "mean pairs per cycle")
                .contains("Variance of failing, explained alone (%)");
        PanelGroup all = (PanelGroup) picture.content();
        PanelGroup histograms = (PanelGroup) all.panels().get(0);
        assertThat(histograms.panels()).hasSize(6);
        for (var panel : histograms.panels()) {
            Histogram histogram = (Histogram) panel;
            assertThat(histogram.bins().stream().mapToDouble(Bin::count).sum()).isEqualTo(256.0);
            assertThat(histogram.quantiles()).hasSize(3);
        }
        RankedBars drivers = (RankedBars) all.panels().get(1);
        assertThat(drivers.labels()).hasSize(5).startsWith("efficiency, both sides' detectors");
    }

    @Test
    void figuresThatWereAskedForAreDrawnWhereNothingElseIs() throws Exception {
        Picture picture = TolerancePicture.of(result(FigureColumns.named(LANE, List.of("alice.singlesPerSecond"))));
        assertThat(DrawnPicture.texts(picture, directory)).contains("Singles, alice port 1 (1/s)", "Count");
    }

    @Test
    void binsAreEqualAndLoseNothing() {
        List<Bin> bins = TolerancePicture.bins(1.0, 1.5, 2.0, 3.0, 3.0);
        assertThat(bins.get(0).lower()).isEqualTo(1.0);
        assertThat(bins.get(bins.size() - 1).upper()).isCloseTo(3.0, within(1e-12));
        assertThat(bins.stream().mapToDouble(Bin::count).sum()).isEqualTo(5.0);
        assertThat(bins.get(bins.size() - 1).count()).isEqualTo(2.0);
        assertThat(bins)
                .allSatisfy(bin -> assertThat(bin.upper() - bin.lower()).isCloseTo(2.0 / bins.size(), within(1e-12)));
        assertThat(TolerancePicture.bins(7.0, 7.0).stream()
                        .mapToDouble(Bin::count)
                        .sum())
                .isEqualTo(2.0);
        assertThat(TolerancePicture.bins()).isEmpty();
    }
}
