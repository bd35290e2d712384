package binspan.planner.picture;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.plot.Curves;
import binspan.planner.plot.HeatMap;
import binspan.planner.plot.Interval;
import binspan.planner.plot.PanelGroup;
import binspan.planner.plot.Picture;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import binspan.study.Sweep;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The pictures of a sweep, and the axes and stretches that several pictures share. */
final class SweepPictureTest {
    private static final Scenario DAM = DrawnPicture.shipped("kestrel-dam-to-millbrook");
    private static final String WINDOW = "timing.windowWidthPs";

    @TempDir
    private Path directory;

    private static StudyTable table(Axis... axes) {
        return new Sweep(DAM, List.of(axes), FigureColumns.all(DAM)).run(Execution.SINGLE);
    }

    @Test
    void curvesShadeTheSolvedWindowNotTheGrid() throws Exception {
        Axis axis = DrawnPicture.axis(DAM, WINDOW, 50.0, 1000.0, 6);
        Picture picture = SweepPicture.of(DAM, List.of(axis), table(axis), List.of());
        assertThat(DrawnPicture.texts(picture, directory))
                .contains("Sweep", "Window width (ps)", "Secret key rate (bit/s)", "required \u2265 0.88", "as written")
                .contains("all requirements met");
        Interval met = ((Curves) picture.content()).met().get(0);
        assertThat(met.lower()).isBetween(243.0, 244.0);
    }

    @Test
    void mapOfFiguresThatWereAskedFor() throws Exception {
        Axis x = DrawnPicture.axis(DAM, WINDOW, 100.0, 900.0, 9);
        Axis y = DrawnPicture.axis(DAM, "link.lengthKm", 20.0, 120.0, 9);
        Picture picture = SweepPicture.of(
                DAM, List.of(x, y), table(x, y), FigureColumns.named(DAM, List.of("bell.chsh", "coincidence.car")));
        assertThat(DrawnPicture.texts(picture, directory))
                .contains("Window width (ps)", "Fibre length of the link (km)", "CHSH S", "Coincidences/accidentals")
                .contains("not all requirements met", "most room", "as written");
        assertThat(((PanelGroup) picture.content()).panels()).hasSize(2);
        assertThat(DrawnPicture.inked(picture, directory)).isBetween(0.1, 0.95);
    }

    /** There is nothing between whole numbers to solve: the region is that of the rows. */
    @Test
    void mapOverWholeNumbersIsVeiledAsItsRowsSay() throws Exception {
        Axis x = DrawnPicture.axis(DAM, "acquisition.fringePoints", 4.0, 8.0, 5);
        Axis y = DrawnPicture.axis(DAM, WINDOW, 100.0, 500.0, 5);
        StudyTable table = table(x, y);
        Picture picture =
                SweepPicture.of(DAM, List.of(x, y), table, FigureColumns.named(DAM, List.of("visibility.sigma")));
        assertThat(DrawnPicture.texts(picture, directory))
                .contains("Fringe points", "Window width (ps)", "Error of the visibility", "not all requirements met");
        double[][] margin =
                ((HeatMap) picture.content()).overlays().margin().orElseThrow().values();
        for (int i = 0; i < 5; i++) {
            for (int j = 0; j < 5; j++) {
                assertThat(margin[j][i] >= 0.0).isEqualTo(table.meets(5 * i + j));
            }
        }
    }

    @Test
    void stretchesOfRowsEndHalfWayToTheirNeighbours() {
        Axis axis = DrawnPicture.axis(DAM, "source.meanPairsPerCycle", 0.01, 0.07, 7);
        StudyTable table = table(axis);
        assertThat(Arrays.copyOf(metRows(table), 7)).containsExactly(false, false, true, true, true, false, false);
        assertThat(MetRows.of(table)).hasSize(1).first().satisfies(interval -> {
            assertThat(interval.lower()).isBetween(0.02499, 0.02501);
            assertThat(interval.upper()).isBetween(0.05499, 0.05501);
        });
        Axis wholly = DrawnPicture.axis(DAM, WINDOW, 300.0, 900.0, 3);
        assertThat(MetRows.of(table(wholly))).containsExactly(new Interval(300.0, 900.0));
    }

    private static boolean[] metRows(StudyTable table) {
        boolean[] met = new boolean[table.rows()];
        for (int row = 0; row < met.length; row++) {
            met[row] = table.meets(row);
        }
        return met;
    }

    @Test
    void figuresOverDecadesHaveALogarithmicAxisOfAtMostSix() {
        Axis axis = DrawnPicture.axis(DAM, "link.lengthKm", 0.0, 190.0, 39);
        StudyTable table = table(axis);
        binspan.planner.plot.Axis key = FigureAxes.of(table, table.indexOf("key.asymptoticBps"));
        assertThat(key.title()).isEqualTo("Secret key rate (bit/s)");
        assertThat(key.logarithmic()).isTrue();
        binspan.planner.plot.Axis time = FigureAxes.of(table, table.indexOf("key.secondsToFirstKey"));
        assertThat(time.logarithmic()).isTrue();
        assertThat(time.highest() / time.lowest()).isLessThan(3e6);
        binspan.planner.plot.Axis visibility = FigureAxes.of(table, table.indexOf("visibility.raw"));
        assertThat(visibility.logarithmic()).isFalse();
        assertThat(visibility.title()).isEqualTo("Raw visibility");
        assertThat(FigureAxes.of(new Axis(axis.parameter(), 1.0, 100.0, 3, true)))
                .isEqualTo(new binspan.planner.plot.Axis("Fibre length of the link", "km", true, 1.0, 100.0));
    }
}
