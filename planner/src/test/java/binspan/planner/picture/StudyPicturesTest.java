package binspan.planner.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.plot.BarPanel;
import binspan.planner.plot.BoxOutline;
import binspan.planner.plot.Curves;
import binspan.planner.plot.HeatMap;
import binspan.planner.plot.Interval;
import binspan.planner.plot.Mark;
import binspan.planner.plot.PanelGroup;
import binspan.planner.plot.Picture;
import binspan.planner.plot.PointMark;
import binspan.planner.plot.RangeBars;
import binspan.planner.plot.RankedBars;
import binspan.planner.table.RouteLedger;
import binspan.planner.table.RouteReader;
import binspan.prediction.LinkPredictor;
import binspan.prediction.RequirementMargins;
import binspan.scenario.FibreClass;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.Execution;
import binspan.study.FigureColumns;
import binspan.study.box.ToleranceBox;
import binspan.study.comparison.Comparison;
import binspan.study.comparison.LinkOptions;
import binspan.study.comparison.Route;
import binspan.study.comparison.RouteSurvey;
import binspan.study.region.OperatingRegion;
import binspan.study.tuning.Objective;
import binspan.study.tuning.Reach;
import binspan.study.tuning.Tuning;
import binspan.study.window.OperatingIntervals;
import binspan.study.window.OperatingWindow;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What each study draws: the words that must stand in its picture, and whether what is shaded or marked is what the study found. */
final class StudyPicturesTest {
    private static final String WINDOW = "timing.windowWidthPs";
    private static final String PAIRS = "source.meanPairsPerCycle";
    private static final Scenario DAM = DrawnPicture.shipped("kestrel-dam-to-millbrook");
    private static final Scenario RIDGE = DrawnPicture.shipped("harrow-ridge-overhead-line");

    @TempDir
    private Path directory;

    private List<String> drawn(Picture picture) throws Exception {
        assertThat(DrawnPicture.inked(picture, directory)).isBetween(0.02, 0.9);
        List<String> texts = DrawnPicture.texts(picture, directory);
        assertThat(texts)
                .isNotEmpty()
                .noneMatch(text -> text.contains("NaN") || text.contains("null") || text.contains("Infinity"));
        return texts;
    }

    private static boolean met(Scenario scenario, String path, double value) {
        Scenario at = ParameterPaths.find(scenario, path).with(scenario, value);
        return RequirementMargins.of(scenario.require()).met(LinkPredictor.predict(at));
    }

    @Test
    void windowShowsEveryRequiredFigureAndShadesWhereAllHold() throws Exception {
        Axis axis = DrawnPicture.axis(DAM, WINDOW, 50.0, 1000.0, 201);
        OperatingIntervals found = new OperatingWindow(DAM, axis).run(Execution.SINGLE);
        Picture picture = WindowPicture.of(DAM, found);
        assertThat(drawn(picture))
                .contains("Operating windows", "Kestrel Dam to Millbrook; everything else as written")
                .contains("Window width (ps)", "Raw visibility", "CHSH S", "Phase-basis error rate")
                .contains("Time-basis error rate", "Secret key rate (bit/s)", "Time to the first key (s)")
                .contains("required \u2265 0.88", "required \u2264 5 %", "required \u2265 1.00 kbit/s")
                .contains("as written", "all requirements met", "failing side of a requirement");
        Curves curves = (Curves) picture.content();
        assertThat(curves.panels()).hasSize(6);
        assertThat(curves.marks()).containsExactly(new Mark("as written", 400.0));
        Interval shaded = curves.met().get(0);
        assertThat(curves.met()).hasSize(1);
        assertThat(met(DAM, WINDOW, shaded.lower() * 1.00001)).isTrue();
        assertThat(met(DAM, WINDOW, shaded.lower() * 0.99999)).isFalse();
        assertThat(shaded.upper()).isEqualTo(1000.0);
    }

    @Test
    void plannedValueOutsideTheAxisIsNotMarked() {
        Axis axis = DrawnPicture.axis(DAM, WINDOW, 500.0, 1000.0, 51);
        Curves curves = (Curves) WindowPicture.of(DAM, new OperatingWindow(DAM, axis).run(Execution.SINGLE))
                .content();
        assertThat(curves.marks()).isEmpty();
    }

    private static OperatingRegion region(Scenario scenario) {
        return new OperatingRegion(
                scenario,
                DrawnPicture.axis(scenario, PAIRS, 0.005, 0.15, 31),
                DrawnPicture.axis(scenario, WINDOW, 50.0, 1000.0, 31));
    }

    @Test
    void regionHasAContourForEachRequirementAndTwoPoints() throws Exception {
        Picture picture = RegionPicture.of(DAM, region(DAM).run(Execution.SINGLE));
        assertThat(drawn(picture))
                .contains("Operating region", "Mean pairs per cycle", "Window width (ps)", "Secret key rate (bit/s)")
                .contains(
                        "1  raw visibility \u2265 0.88", "2  CHSH S \u2265 2.5", "3  phase-basis error rate \u2264 5 %")
                .contains("4  time-basis error rate \u2264 5 %", "5  secret key rate \u2265 1.00 kbit/s")
                .contains("as written", "most room", "not all requirements met", "no key");
        HeatMap map = (HeatMap) picture.content();
        for (PointMark mark : map.overlays().points()) {
            Scenario at = ParameterPaths.find(DAM, PAIRS).with(DAM, mark.point().x());
            assertThat(met(at, WINDOW, mark.point().y())).as(mark.label()).isTrue();
        }
        assertMarginsAgree(map);
    }

    /** The unveiled part of the map is where the requirements hold. */
    private static void assertMarginsAgree(HeatMap map) {
        binspan.planner.plot.Lattice margin = map.overlays().margin().orElseThrow();
        for (int row = 0; row < margin.y().length; row += 3) {
            for (int column = 0; column < margin.x().length; column += 3) {
                Scenario at = ParameterPaths.find(DAM, PAIRS).with(DAM, margin.x()[column]);
                assertThat(margin.values()[row][column] >= 0.0).isEqualTo(met(at, WINDOW, margin.y()[row]));
            }
        }
    }

    @Test
    void boxOfTwoParametersIsOutlinedOnTheirMap() throws Exception {
        List<Axis> axes = List.of(
                DrawnPicture.axis(RIDGE, "timing.cableTemperatureStepK", 0.01, 0.3, 2),
                DrawnPicture.axis(RIDGE, WINDOW, 200.0, 1000.0, 2));
        var box = new ToleranceBox(RIDGE, axes, ToleranceBox.Sense.SHARE, false, 1L).run(Execution.SINGLE);
        Picture picture = BoxPicture.of(RIDGE, box);
        assertThat(drawn(picture))
                .contains("Tolerance box", "Harrow Ridge overhead line; all requirements hold everywhere inside")
                .contains("Cable temperature step (K)", "Window width (ps)", "tolerance box", "as written", "most room")
                .contains("not all requirements met");
        BoxOutline outline = ((HeatMap) picture.content()).overlays().boxes().get(0);
        assertThat(outline.x())
                .isEqualTo(new Interval(
                        box.sides().get(0).from().value(),
                        box.sides().get(0).to().value()));
        assertThat(outline.y().upper()).isEqualTo(box.sides().get(1).to().value());
    }

    @Test
    void boxOfThreeParametersHasABarForEach() throws Exception {
        List<Axis> axes = List.of(
                DrawnPicture.axis(DAM, PAIRS, 0.01, 0.1, 2),
                DrawnPicture.axis(DAM, WINDOW, 50.0, 1500.0, 2),
                DrawnPicture.axis(DAM, "both.clockJitterRmsPs", 1.0, 50.0, 2));
        var box = new ToleranceBox(DAM, axes, ToleranceBox.Sense.TOLERANCE, false, 1L).run(Execution.SINGLE);
        Picture picture = BoxPicture.of(DAM, box);
        assertThat(drawn(picture))
                .contains("Tolerance box", "Mean pairs per cycle", "Window width", "Clock jitter rms, both sides")
                .contains("50 ps", "1500 ps", "400 ps", "12 ps", "whole range", "allowed", "planned");
        RangeBars bars = (RangeBars) picture.content();
        assertThat(bars.bars()).extracting(bar -> bar.planned()).containsExactly(0.04, 400.0, 12.0);
    }

    @Test
    void tuningShowsEachFreeParameterThroughTheBestPoint() throws Exception {
        Tuning tuning = Tuning.of(DAM, DefaultAxes.tuned(DAM), Objective.KEY);
        Tuning.Outcome outcome = tuning.run(Execution.SINGLE);
        Picture picture = TunePicture.of(tuning, outcome);
        assertThat(drawn(picture))
                .contains("Best settings for the secret key rate", "Mean pairs per cycle", "Window width (ps)")
                .contains("Secret key rate (bit/s)", "Raw visibility", "best", "as written", "all requirements met")
                .contains("required \u2265 1.00 kbit/s", "required \u2265 0.88");
        List<Curves> panels = ((PanelGroup) picture.content())
                .panels().stream().map(Curves.class::cast).toList();
        for (int i = 0; i < 2; i++) {
            Curves curves = panels.get(i);
            double best = outcome.values().get(i);
            assertThat(curves.marks()).contains(new Mark("best", best));
            double step = Math.pow(curves.x().highest() / curves.x().lowest(), 1.0 / 160.0);
            assertThat(curves.met())
                    .anyMatch(interval -> interval.lower() <= best * step && interval.upper() >= best / step);
        }
    }

    @Test
    void tuningOfALinkWithoutKeyShowsSInstead() throws Exception {
        Scenario bell = onePort();
        Tuning tuning =
                Tuning.of(bell, List.of(DefaultAxes.of(bell, ParameterPaths.find(bell, WINDOW))), Objective.CHSH);
        assertThat(drawn(TunePicture.of(tuning, tuning.run(Execution.SINGLE))))
                .contains("Best settings for the CHSH S", "CHSH S", "Raw visibility")
                .doesNotContain("Secret key rate (bit/s)");
    }

    /** The continuous link with one detector a side. */
    private Scenario onePort() throws Exception {
        String text = Files.readString(Path.of("..", "scenarios", "stonebridge-to-lower-weir.json"));
        String one = text.replaceAll("\\},\\s+\\{ \"class\": [^}]+\\}", "}")
                .replaceFirst("(?s)\"require\": \\{.*?}", "\"require\": { \"chshAtLeast\": 2.5 }");
        return binspan.planner.io.ScenarioReader.parse(one, "one port");
    }

    @Test
    void reachShowsBothCurvesTheBoundAndThePlannedLength() throws Exception {
        Scenario trunk = DrawnPicture.shipped("fernhill-shared-trunk");
        List<Axis> free = List.of(DefaultAxes.of(trunk, ParameterPaths.find(trunk, WINDOW)));
        Reach reach = new Reach(trunk, free, Objective.KEY, FigureColumns.all(trunk));
        Reach.Outcome outcome = reach.run(Execution.SINGLE);
        Picture picture = ReachPicture.of(reach, outcome);
        assertThat(drawn(picture))
                .contains("Reach of the link", "Fernhill shared trunk", "Fibre length of the link (km)")
                .contains("Secret key rate (bit/s)", "Raw visibility", "CHSH S", "Time to the first key (s)")
                .contains("settings as written", "re-tuned at every length", "repeaterless bound", "as planned")
                .contains("all requirements met", "required \u2265 800 bit/s");
        Curves curves = (Curves) picture.content();
        assertThat(curves.marks()).containsExactly(new Mark("as planned", 40.0));
        assertThat(curves.met().get(0).upper())
                .isEqualTo(outcome.all().retunedKm().orElseThrow());
        assertThat(curves.x().highest()).isGreaterThan(curves.met().get(0).upper());
    }

    @Test
    void reachAsWrittenHasNoOtherCurve() throws Exception {
        Reach reach = new Reach(DAM, List.of(), Objective.KEY, FigureColumns.all(DAM));
        assertThat(drawn(ReachPicture.of(reach, reach.run(Execution.SINGLE))))
                .contains("settings as written", "repeaterless bound")
                .doesNotContain("re-tuned at every length");
    }

    @Test
    void comparisonShowsKeyVisibilityAndReachOfEach() throws Exception {
        var options = List.of(LinkOptions.fibre(RIDGE, FibreClass.G652D), LinkOptions.fibre(DAM, FibreClass.G654E));
        List<Comparison.Entry> entries =
                new Comparison(options, scenario -> List.of(), Objective.KEY).run(Execution.SINGLE);
        Picture picture = ComparisonPicture.of("Two links", entries);
        assertThat(drawn(picture))
                .contains("Two links", "settings as written; the best stands on top", "G.652.D", "G.654.E")
                .contains("Secret key rate (bit/s)", "Raw visibility", "Reach of all requirements (km)")
                .contains("required \u2265 1.00 kbit/s", "required \u2265 0.88")
                .contains("meets the requirements", "does not meet them");
        RankedBars bars = (RankedBars) picture.content();
        assertThat(bars.labels()).containsExactly("G.654.E", "G.652.D");
        assertThat(bars.panels().get(0).bars()).extracting(bar -> bar.met()).containsExactly(true, false);
        assertThat(bars.panels().get(2).bars().get(0).value())
                .isEqualTo(entries.get(0).reachKm().orElseThrow());
    }

    @Test
    void tunedComparisonSaysSo() throws Exception {
        var options = List.of(LinkOptions.fibre(DAM, FibreClass.G652D));
        List<Axis> free = List.of(DefaultAxes.of(DAM, ParameterPaths.find(DAM, WINDOW)));
        List<Comparison.Entry> entries = new Comparison(options, scenario -> free, Objective.KEY).run(Execution.SINGLE);
        assertThat(ComparisonPicture.of("Dam", entries).subtitle())
                .isEqualTo("each tuned for itself; the best stands on top");
    }

    @Test
    void routesStandInTheOrderOfTheirRank() throws Exception {
        try (RouteLedger ledger = ledger("near,20,20\nfar,120,120\nplanned,30.2,29.4\n")) {
            Picture picture = RoutesPicture.of("Dam", ledger);
            assertThat(drawn(picture))
                    .contains("Candidate routes", "Dam; ranked by least margin", "planned", "near", "far", "none")
                    .contains("Secret key rate (bit/s)", "Raw visibility", "Loss, alice (dB)", "Loss, bob (dB)")
                    .contains("meets the requirements", "does not meet them");
            RankedBars bars = (RankedBars) picture.content();
            assertThat(bars.labels()).containsExactly("planned", "near", "far");
            BarPanel loss = bars.panels().get(2);
            assertThat(loss.bars().get(0).value())
                    .isCloseTo(LinkPredictor.predict(DAM).pathA().lossDb(), within(1e-9));
        }
    }

    @Test
    void ofManyRoutesTheBestAreShown() throws Exception {
        StringBuilder rows = new StringBuilder();
        for (int i = 0; i < 35; i++) {
            rows.append("route ").append(i).append(',').append(10 + i).append(",20\n");
        }
        try (RouteLedger ledger = ledger(rows.toString())) {
            Picture picture = RoutesPicture.of("Dam", ledger);
            assertThat(drawn(picture)).contains("Dam; the best 30 of 35 routes, by least margin");
            assertThat(((RankedBars) picture.content()).labels()).hasSize(30);
        }
    }

    private RouteLedger ledger(String rows) throws Exception {
        Path table = Files.writeString(directory.resolve("routes.csv"), "name,alice.lengthKm,bob.lengthKm\n" + rows);
        RouteLedger ledger = new RouteLedger(List.of(), FigureColumns.all(DAM));
        List<Route> routes = new ArrayList<>();
        try (RouteReader reader = RouteReader.of(table.toString(), DAM)) {
            while (reader.hasNext()) {
                routes.add(reader.next().route());
            }
        }
        for (RouteSurvey.Verdict verdict : new RouteSurvey(DAM, false).judge(routes, Execution.SINGLE)) {
            ledger.add(verdict, 1L, "");
        }
        return ledger;
    }
}
