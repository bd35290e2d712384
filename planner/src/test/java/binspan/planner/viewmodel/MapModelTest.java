package binspan.planner.viewmodel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.plot.Point;
import binspan.planner.viewmodel.MapModel.BoxChoice;
import binspan.prediction.LinkPredictor;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Requirements;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.PointEvaluator;
import binspan.study.box.BoxSide;
import binspan.study.region.MapPoint;
import binspan.study.region.OperatingRegion;
import binspan.study.region.RegionMap;
import binspan.study.window.RequirementMargin;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The map against predictions of single points by the model library, and what it computes when. */
final class MapModelTest {
    private static final String PAIRS = "source.meanPairsPerCycle";
    private static final String WINDOW = "timing.windowWidthPs";
    private static final String LENGTH = "link.lengthKm";
    private static final String JITTER = "both.clockJitterRmsPs";

    private final HeldWork work = new HeldWork();
    private Design design;
    private MapModel model;

    @BeforeEach
    void open() {
        design = Designs.of(scenario("kestrel-dam-to-millbrook.json"));
        model = new MapModel(design, work.background(), 0);
    }

    private static Scenario scenario(String file) {
        try {
            return ScenarioReader.read("../scenarios/" + file);
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
    }

    private double value(String path) {
        return ParameterPaths.find(design.scenario(), path)
                .value(design.scenario())
                .orElseThrow();
    }

    private void set(String path, double value) {
        assertTrue(design.change(path, null, s -> ParameterPaths.find(s, path).with(s, value)));
    }

    @Test
    void beginsWithBrightnessAndWindow() {
        assertEquals(PAIRS, model.horizontal().path());
        assertEquals(WINDOW, model.vertical().path());
        assertEquals(new MapPoint(0.04, 400.0), model.handle().place().orElseThrow());
    }

    @Test
    void nothingIsComputedWhileNobodyLooksAndTheNewestAfterwards() {
        work.finish();
        model.watchedProperty().set(false);
        set("alice.repairMarginDb", 1.5);
        set("alice.repairMarginDb", 2.0);
        assertEquals(0, work.waiting());
        assertNull(model.regionProperty().get(), "the exact map is no longer that of the design");
        model.watchedProperty().set(true);
        work.finish();
        MapModel fresh = new MapModel(design, Background.NONE, 0);
        assertEquals(fresh.shapeProperty().get(), model.shapeProperty().get());
    }

    @Test
    void mapThatStillHoldsIsNotComputedAgainWhenSomebodyLooks() {
        work.finish();
        RegionMap known = model.regionProperty().get();
        model.watchedProperty().set(false);
        set(WINDOW, 350.0);
        model.watchedProperty().set(true);
        assertSame(known, model.regionProperty().get());
        assertEquals(1, work.waiting(), "the read-out of the present point alone");
        work.finish();
        assertEquals(350.0, model.reader().readingProperty().get().y());
    }

    @Test
    void exactLinesArePlacesWithoutRoomAndTurnTheirHoldingSideToTheLeft() {
        work.finish();
        assertTrue(model.shapeProperty().get().exact());
        assertEquals(7, model.shapeProperty().get().contours().size());
        model.shapeProperty().get().contours().stream()
                .filter(each -> each.requirement() != Requirement.SLOTS)
                .forEach(each -> each.lines().forEach(line -> holdsLeft(each, line, 1e-6, 1e-3)));
    }

    @Test
    void quickLinesTurnTheirHoldingSideToTheLeftToo() {
        while (model.shapeProperty().get() == null) {
            work.take().run();
        }
        assertFalse(model.shapeProperty().get().exact());
        assertTrue(model.shapeProperty().get().anywhere());
        model.shapeProperty().get().contours().stream()
                .filter(each -> each.requirement() != Requirement.SLOTS)
                .forEach(each -> each.lines().forEach(line -> holdsLeft(each, line, 0.05, 0.5 / MapModel.QUICK_STEPS)));
    }

    /** Checks middles of pieces of a line, as far aside as pieces may cut a bend, with predictions of their own. */
    private void holdsLeft(MapContour contour, List<Point> line, double room, double aside) {
        for (int i = 1; i < line.size(); i += 1 + line.size() / 7) {
            Point from = line.get(i - 1);
            Point to = line.get(i);
            double length = Math.hypot(to.x() - from.x(), to.y() - from.y());
            assertEquals(0.0, margin(contour.requirement(), to.x(), to.y()), room);
            double x = (from.x() + to.x()) / 2.0;
            double y = (from.y() + to.y()) / 2.0;
            double right = aside * (to.y() - from.y()) / length;
            double up = aside * (to.x() - from.x()) / length;
            assertTrue(margin(contour.requirement(), x - right, y + up) > 0.0, contour.requirement() + " left");
            assertTrue(margin(contour.requirement(), x + right, y - up) < 0.0, contour.requirement() + " right");
        }
    }

    private double margin(Requirement requirement, double x, double y) {
        Axis across = model.horizontal().axis();
        Axis up = model.vertical().axis();
        PointEvaluator evaluator = new PointEvaluator(design.scenario(), List.of(across.parameter(), up.parameter()));
        RequirementMargins margins = evaluator.margins();
        return margins.margin(
                margins.requirements().indexOf(requirement), evaluator.at(extended(across, x), extended(up, y)));
    }

    private static double extended(Axis axis, double share) {
        return axis.from() * Math.pow(axis.to() / axis.from(), share);
    }

    @Test
    void drawsABoxInTheRegion() {
        work.finish();
        List<BoxSide> sides = model.boxProperty().get().sides();
        PointEvaluator evaluator = new PointEvaluator(
                design.scenario(),
                List.of(
                        model.horizontal().axis().parameter(),
                        model.vertical().axis().parameter()));
        for (double x :
                new double[] {sides.get(0).from().value(), sides.get(0).to().value()}) {
            for (double y :
                    new double[] {sides.get(1).from().value(), sides.get(1).to().value()}) {
                assertTrue(evaluator.leastMargin(x, y) >= 0.0);
            }
        }
    }

    /** On these logarithmic axes the middle of a side is the geometric mean of its ends. */
    @ParameterizedTest
    @EnumSource(names = {"SHARE", "TOLERANCE"})
    void recommendsTheMiddleOfTheBoxThatIsDrawn(BoxChoice choice) {
        model.boxChoiceProperty().set(choice);
        work.finish();
        RegionMap map = model.regionProperty().get();
        List<BoxSide> sides = model.boxProperty().get().sides();
        MapRecommendation there = model.recommendedProperty().get();
        assertEquals(MapRecommendation.Kind.BOX_MIDDLE, there.kind());
        assertEquals(geometricMean(sides.get(0)), there.x(), 1e-9 * there.x());
        assertEquals(geometricMean(sides.get(1)), there.y(), 1e-9 * there.y());
        assertTrue(there.point().met());
        model.goToRecommended();
        Axis across = model.horizontal().axis();
        Axis up = model.vertical().axis();
        assertEquals(across.share(there.x()), across.share(value(PAIRS)), 1e-3, "but for digits nobody sees");
        assertEquals(up.share(there.y()), up.share(value(WINDOW)), 1e-3);
        assertSame(map, model.regionProperty().get());
    }

    private static double geometricMean(BoxSide side) {
        return Math.sqrt(side.from().value() * side.to().value());
    }

    @Test
    void recommendsThePointOfTheStudyWithoutABox() {
        model.boxChoiceProperty().set(BoxChoice.NONE);
        work.finish();
        MapRecommendation best = new MapRecommendation(
                MapRecommendation.Kind.LEAST_MARGIN,
                model.regionProperty().get().best());
        assertEquals(best, model.recommendedProperty().get());
        model.boxChoiceProperty().set(BoxChoice.SHARE);
        assertNull(model.recommendedProperty().get(), "while the box is being searched");
        work.finish();
        assertEquals(
                MapRecommendation.Kind.BOX_MIDDLE,
                model.recommendedProperty().get().kind());
    }

    /** The best point of this link lies outside of its largest box. */
    @Test
    void recommendedPointLiesInTheBox() {
        design.begin(Designs.shipped("orchard-lane-access"));
        work.finish();
        MapRecommendation there = model.recommendedProperty().get();
        List<BoxSide> sides = model.boxProperty().get().sides();
        assertEquals(0.5, shareOf(sides.get(0), there.x()), 1e-6);
        assertEquals(0.5, shareOf(sides.get(1), there.y()), 1e-6);
    }

    /** How far along a side a value lies, on a logarithmic axis. */
    private static double shareOf(BoxSide side, double value) {
        return Math.log(value / side.from().value())
                / Math.log(side.to().value() / side.from().value());
    }

    @Test
    void choosesTheBox() {
        work.finish();
        model.boxChoiceProperty().set(BoxChoice.NONE);
        assertNull(model.boxProperty().get());
        model.boxChoiceProperty().set(BoxChoice.TOLERANCE);
        work.finish();
        BoxSide first = model.boxProperty().get().sides().get(0);
        BoxSide second = model.boxProperty().get().sides().get(1);
        assertEquals(first.tolerance(), second.tolerance(), 1e-9);
    }

    @ParameterizedTest
    @ValueSource(strings = {WINDOW, LENGTH, JITTER})
    void movingTheHandleComputesNothingAnew(String vertical) {
        assertTrue(model.chooseVertical(vertical));
        work.finish();
        RegionMap map = model.regionProperty().get();
        MapShape shape = model.shapeProperty().get();
        assertNotNull(map);
        for (int i = 0; i < 30; i++) {
            model.handle()
                    .dragTo(
                            model.horizontal().axis().at(0.4 + 0.011 * i),
                            model.vertical().axis().at(0.7 - 0.017 * i));
            assertFalse(model.computingBinding().get());
        }
        model.handle().settle();
        work.finish();
        assertSame(map, model.regionProperty().get());
        assertSame(shape, model.shapeProperty().get());
    }

    @Test
    void anyOtherChangeIsANewQuestion() {
        work.finish();
        set("timing.cableTemperatureStepK", 0.06);
        assertNull(model.regionProperty().get());
        assertNull(model.boxProperty().get());
        assertTrue(model.computingBinding().get());
        work.finish();
        assertTrue(model.shapeProperty().get().exact());
        assertNotNull(model.regionProperty().get());
    }

    @Test
    void dropsTheExactMapOfAnOlderDesign() {
        List<RegionMap> shown = new ArrayList<>();
        model.regionProperty().addListener((source, before, after) -> {
            if (after != null) {
                shown.add(after);
            }
        });
        set(JITTER, 13.0);
        set(JITTER, 60.0);
        work.finish();
        assertEquals(1, shown.size());
        RegionMap map = new OperatingRegion(
                        design.scenario(),
                        model.horizontal().axis(),
                        model.vertical().axis())
                .run(Execution.SINGLE);
        assertEquals(map.best().leastMargin(), shown.get(0).best().leastMargin(), 1e-9);
    }

    @Test
    void theHandleStaysOnItsAxes() {
        model.handle().dragTo(1e9, -5.0);
        assertEquals(model.horizontal().axis().to(), value(PAIRS));
        assertEquals(model.vertical().axis().from(), value(WINDOW));
        model.handle().step(1, 0, true);
        assertEquals(model.horizontal().axis().to(), value(PAIRS));
    }

    @Test
    void aLinkDraggedToTheEndLeavesTheAxisAsItIs() {
        model.chooseVertical(LENGTH);
        Axis before = model.vertical().axis();
        for (double length = 10.0; length < before.to() + 100.0; length += 37.0) {
            model.handle().dragTo(0.04, length);
        }
        assertEquals(before.to(), value(LENGTH), 1e-6);
        assertSame(before, model.vertical().axis());
    }

    @Test
    void aMovementIsUndoneAtOnce() {
        for (int i = 1; i <= 5; i++) {
            model.handle().dragTo(0.04 + 0.001 * i, 400.0 + 10.0 * i);
        }
        model.handle().settle();
        model.handle().dragTo(0.06, 600.0);
        model.handle().settle();
        design.undo();
        assertEquals(new MapPoint(0.045, 450.0), model.handle().place().orElseThrow());
        design.undo();
        assertEquals(new MapPoint(0.04, 400.0), model.handle().place().orElseThrow());
    }

    @Test
    void keysMoveByShares() {
        Axis up = model.vertical().axis();
        double before = up.share(value(WINDOW));
        model.handle().step(0, 1, false);
        assertEquals(before + 0.01, up.share(value(WINDOW)), 1e-3);
        model.handle().step(0, -1, true);
        assertEquals(before - 0.04, up.share(value(WINDOW)), 1e-3);
        assertEquals(0.04, value(PAIRS));
    }

    @Test
    void aLinkOfNoLengthIsNeverMade() {
        model.chooseVertical(LENGTH);
        assertTrue(model.vertical().logarithmic(false));
        assertTrue(model.vertical().from("0"));
        model.handle().dragTo(0.04, 0.0);
        assertTrue(value(LENGTH) > 0.0);
        model.handle().dragTo(0.04, 20.0);
        assertEquals(20.0, value(LENGTH), 1e-9);
    }

    @Test
    void refusesAxesInWords() {
        assertFalse(model.vertical().from("wide"));
        assertEquals(
                "found \"wide\"; allowed a number such as 0.02 or 2e-2",
                model.vertical().errorProperty().get());
        assertFalse(model.vertical().from("5000"));
        assertEquals(
                WINDOW + ": found 5000 to 2000; allowed a range that rises",
                model.vertical().errorProperty().get());
        assertFalse(model.vertical().to("1e9"));
        assertFalse(model.vertical().from("0"));
        assertTrue(model.vertical().from("100 ps"));
        assertEquals("", model.vertical().errorProperty().get());
        assertEquals(100.0, model.vertical().axis().from());
        model.resetAxes();
        assertEquals(20.0, model.vertical().axis().from());
    }

    @Test
    void refusesPathsInWords() {
        assertFalse(model.chooseHorizontal("timing.windowWidth"));
        assertTrue(model.horizontal().errorProperty().get().contains("windowWidthPs"));
        assertFalse(model.chooseHorizontal("acquisition.fringePoints"));
        assertTrue(model.horizontal().errorProperty().get().contains("found a whole number"));
        assertEquals(PAIRS, model.horizontal().path());
    }

    @Test
    void theSameParameterTwiceExchangesTheAxes() {
        assertTrue(model.chooseHorizontal(WINDOW));
        assertEquals(WINDOW, model.horizontal().path());
        assertEquals(PAIRS, model.vertical().path());
        work.finish();
        assertNotNull(model.regionProperty().get());
    }

    @Test
    void parametersThatMoveEachOtherAreRefusedUntilOneIsChanged() {
        model.chooseHorizontal(LENGTH);
        model.chooseVertical("alice.path.upper duct.lengthKm");
        assertTrue(model.messageProperty().get().contains("vary one of them"));
        work.finish();
        assertNull(model.shapeProperty().get());
        assertFalse(model.computingBinding().get());
        model.chooseVertical(WINDOW);
        work.finish();
        assertEquals("", model.messageProperty().get());
        assertNotNull(model.regionProperty().get());
    }

    @Test
    void fallsBackWhereTheParameterIsGone() {
        design.begin(Designs.shipped("stonebridge-to-lower-weir"));
        assertEquals("source.pairRatePerSecond", model.horizontal().path());
        assertTrue(model.horizontal().errorProperty().get().contains("mean pairs per cycle"));
        work.finish();
        assertNotNull(model.regionProperty().get());
    }

    @Test
    void saysThatNothingIsRequired() {
        OptionalDouble none = OptionalDouble.empty();
        Scenario s = design.scenario();
        Requirements nothing = new Requirements(none, none, none, none, none, none, none, none);
        assertTrue(design.change(
                "requirements",
                null,
                before -> new Scenario(
                        s.formatVersion(),
                        s.name(),
                        s.imbalanceNs(),
                        s.source(),
                        s.alice(),
                        s.bob(),
                        s.timing(),
                        s.protocol(),
                        s.acquisition(),
                        nothing,
                        s.spread(),
                        s.provenance())));
        work.finish();
        assertTrue(model.messageProperty().get().startsWith("the scenario states no requirement"));
        assertNull(model.shapeProperty().get());
        model.handle().dragTo(0.05, 500.0);
        assertEquals(500.0, value(WINDOW));
    }

    @Test
    void saysWhereItComesNearestIfNothingHolds() {
        set("require.rawVisibilityAtLeast", 0.9999);
        work.finish();
        assertNull(model.recommendedProperty().get());
        assertNull(model.boxProperty().get());
        assertTrue(model.messageProperty().get().startsWith("nowhere in these ranges do all requirements hold"));
        assertTrue(model.messageProperty().get().contains("required at least 0.9999"));
    }

    @Test
    void readsWhatThePredictionSays() {
        work.finish();
        model.reader().pick(0.05, 300.0);
        work.finish();
        Scenario there = ParameterPaths.find(design.scenario(), WINDOW)
                .with(ParameterPaths.find(design.scenario(), PAIRS).with(design.scenario(), 0.05), 300.0);
        RequirementMargin visibility =
                model.reader().readingProperty().get().verdict().requirements().get(0);
        assertEquals(new LinkPredictor().of(there).fringe().raw(), visibility.predicted(), 1e-12);
        model.reader().moveToPicked();
        assertEquals(300.0, value(WINDOW));
        model.reader().hover(0.02, 500.0);
        work.finish();
        assertEquals(
                MapReading.Kind.UNDER_POINTER,
                model.reader().readingProperty().get().kind());
        model.reader().leave();
        model.reader().unpick();
        work.finish();
        assertEquals(
                MapReading.Kind.PRESENT, model.reader().readingProperty().get().kind());
        assertEquals(300.0, model.reader().readingProperty().get().y());
    }

    @Test
    void theUsualRangeFollowsADesignThatLeavesItAndAnOwnOneStays() {
        set(WINDOW, 5000.0);
        assertTrue(model.vertical().contains(5000.0));
        model.vertical().from("100");
        model.vertical().to("200");
        set(WINDOW, 400.0);
        assertEquals(200.0, model.vertical().axis().to());
        assertFalse(model.handle().onMap());
        assertEquals(200.0, model.handle().shown().orElseThrow().y());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "kestrel-dam-to-millbrook.json",
                "stonebridge-to-lower-weir.json",
                "orchard-lane-access.json",
                "fernhill-shared-trunk.json",
                "eagle-tarn-to-saltmarsh.json"
            })
    void everyOfferedParameterHasAMap(String file) {
        Scenario scenario = scenario(file);
        List<String> offered = MapParameters.of(scenario);
        assertTrue(offered.size() > 60, offered.size() + " parameters");
        for (String path : offered) {
            Axis axis = MapRanges.of(scenario, MapParameters.find(scenario, path));
            Axis other = MapRanges.of(scenario, MapParameters.find(scenario, path.equals(WINDOW) ? LENGTH : WINDOW));
            MapShape shape =
                    MapShape.of(MapQuestion.of(scenario, axis, other).region(3).survey(Execution.SINGLE));
            assertFalse(shape.contours().isEmpty(), path);
        }
    }
}
