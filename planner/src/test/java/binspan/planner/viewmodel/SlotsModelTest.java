package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.optics.TimeBins;
import binspan.optics.Window;
import binspan.planner.document.Change;
import binspan.planner.document.RefusedEditException;
import binspan.planner.document.ScenarioDocument;
import binspan.planner.io.Preset;
import binspan.planner.report.Figure;
import binspan.planner.viewmodel.SlotPlot.Kind;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What the page of the slots shows against the prediction, whose counting knows no bins. */
class SlotsModelTest {
    private static final String KESTREL = "kestrel-dam-to-millbrook";
    private static final String STONEBRIDGE = "stonebridge-to-lower-weir";
    private static final String EAGLE = "eagle-tarn-to-saltmarsh";
    /** Sums of bins against integrals over a window that the bins need not fill; the central bins do. */
    private static final double AGREEMENT = 1e-6;

    private static SlotsModel of(Design design) {
        return new SlotsModel(design, Background.NONE);
    }

    private static Design design(String link, Change... changes) {
        try {
            return new Design(Designs.shipped(link).with(List.of(changes)));
        } catch (RefusedEditException e) {
            throw new IllegalStateException(e.problems().toString(), e);
        }
    }

    private static LinkPrediction predicted(Design design) {
        return LinkPredictor.predict(design.scenario());
    }

    private static SlotPlot plot(SlotsModel model, String id) {
        return model.plotsProperty().get().stream()
                .filter(plot -> plot.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    private static double inWindow(SlotPlot plot, Window window, Kind... kinds) {
        Set<Kind> wanted = Set.of(kinds);
        TimeBins bins = plot.bins();
        return plot.layers().stream()
                .filter(layer -> wanted.contains(layer.kind()))
                .mapToDouble(layer -> IntStream.range(0, bins.count())
                        .filter(bin -> bins.middle(bin) > window.from() && bins.middle(bin) < window.to())
                        .mapToDouble(bin -> layer.perSecond()[bin])
                        .sum())
                .sum();
    }

    private static Window central(SlotPlot plot) {
        return plot.windows().get(plot.central());
    }

    private static void agrees(Design design) {
        SlotPlot pair = plot(of(design), "pair");
        LinkPrediction prediction = predicted(design);
        double max = prediction.fringe().maxPerSecond();
        assertThat(inWindow(pair, central(pair), Kind.values())).isCloseTo(max, within(AGREEMENT * max));
        assertThat(inWindow(pair, central(pair), Kind.NOISE, Kind.LIGHT, Kind.WORST))
                .isCloseTo(prediction.fringe().minPerSecond(), within(AGREEMENT * max));
        assertThat(inWindow(pair, central(pair), Kind.NOISE))
                .isCloseTo(prediction.fringe().accidentalPerSecond(), within(AGREEMENT * max));
        assertThat(pair.note())
                .isEqualTo(Words.of(
                        "slots.note.pair",
                        Figure.counts(max),
                        Figure.counts(prediction.fringe().minPerSecond()),
                        Figure.counts(prediction.fringe().accidentalPerSecond())));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                KESTREL,
                STONEBRIDGE,
                EAGLE,
                "orchard-lane-access",
                "fernhill-shared-trunk",
                "harrow-ridge-overhead-line"
            })
    void fringeAndAccidentalsInTheWindowAreThePredictedOnes(String link) {
        agrees(design(link));
    }

    @Test
    void theyAreSoWithGates() {
        Design design = new Design(LinkFile.starter(Preset.AVALANCHE));
        assertThat(design.scenario().alice().detectors().get(0).gate()).isPresent();
        agrees(design);
    }

    @ParameterizedTest
    @ValueSource(strings = {KESTREL, STONEBRIDGE, EAGLE})
    void theyAreSoWithOnePortPerArm(String link) {
        agrees(design(link, new Change.Delete("alice.detectors", 1), new Change.Delete("bob.detectors", 1)));
    }

    @ParameterizedTest
    @ValueSource(doubles = {4.0, 30.0, 900.0})
    void theyAreSoInNarrowAndWideWindows(double widthPs) {
        agrees(design(KESTREL, new Change.Put("timing.windowWidthPs", widthPs)));
        agrees(design(STONEBRIDGE, new Change.Put("timing.windowWidthPs", widthPs)));
    }

    @Test
    void withoutAnyNoiseOnlyLightMeetsLight() {
        List<Change> quiet = new ArrayList<>();
        for (String arm : List.of("alice", "bob")) {
            for (int port = 0; port < 2; port++) {
                quiet.add(new Change.Put(arm + ".detectors[" + port + "].darkCountsPerSecond", 0.0));
            }
        }
        Design design = design(KESTREL, quiet.toArray(Change[]::new));
        agrees(design);
        for (Site site : Site.values()) {
            SlotPlot side = plot(of(design), site.path());
            assertThat(layer(side, Kind.NOISE)).containsOnly(0.0);
            assertThat(DoubleStream.of(layer(side, Kind.LIGHT)).sum()).isPositive();
        }
    }

    private static double[] layer(SlotPlot plot, Kind kind) {
        return plot.layers().stream()
                .filter(layer -> layer.kind() == kind)
                .findFirst()
                .orElseThrow()
                .perSecond();
    }

    @Test
    void allPortsTogetherAreTheSumOfTheirFringes() {
        for (String link : List.of(KESTREL, STONEBRIDGE, EAGLE)) {
            Design design = design(link);
            SlotsModel model = of(design);
            model.allPortsProperty().set(true);
            SlotPlot pair = plot(model, "pair");
            LinkPrediction prediction = predicted(design);
            double best = prediction.counts().central().sum(1.0);
            double worst = prediction.counts().central().sum(-1.0);
            assertThat(inWindow(pair, central(pair), Kind.NOISE, Kind.LIGHT, Kind.WORST))
                    .isCloseTo(worst, within(AGREEMENT * best));
            assertThat(pair.title()).isNotEqualTo(plot(of(design), "pair").title());
        }
    }

    @Test
    void peaksOfPulsesStandOneImbalanceApartAndPairsInterfereInTheMiddle() {
        Design design = design(KESTREL);
        SlotsModel model = of(design);
        double apart = model.separation();
        assertThat(apart).isCloseTo(design.scenario().imbalanceNs() * 1e-9, within(1e-20));
        for (Site site : Site.values()) {
            List<SlotPlot.NamedPeak> peaks = plot(model, site.path()).peaks();
            assertThat(peaks).hasSize(3);
            assertThat(peaks.get(1).time()).isCloseTo(0.0, within(0.05 * apart));
            assertThat(peaks.get(2).time() - peaks.get(1).time()).isCloseTo(apart, within(1e-3 * apart));
            assertThat(peaks.get(1).time() - peaks.get(0).time()).isCloseTo(apart, within(1e-3 * apart));
        }
    }

    /** The highest bins lie where the peaks are said to be. */
    @ParameterizedTest
    @ValueSource(strings = {KESTREL, STONEBRIDGE})
    void barsAreHighestWhereAPeakIsNamed(String link) {
        for (SlotPlot plot : of(design(link)).plotsProperty().get()) {
            TimeBins bins = plot.bins();
            int highest = IntStream.range(0, bins.count())
                    .boxed()
                    .max((a, b) -> Double.compare(sum(plot, a), sum(plot, b)))
                    .orElseThrow();
            assertThat(plot.highest()).isEqualTo(sum(plot, highest));
            double nearest = plot.peaks().stream()
                    .mapToDouble(peak -> Math.abs(peak.time() - bins.middle(highest)))
                    .min()
                    .orElseThrow();
            assertThat(nearest).as(plot.id()).isLessThanOrEqualTo(2.0 * bins.width());
        }
    }

    private static double sum(SlotPlot plot, int bin) {
        return plot.layers().stream()
                .mapToDouble(layer -> layer.perSecond()[bin])
                .sum();
    }

    @Test
    void continuousPumpShowsPairsAloneAndATrainBothSides() {
        assertThat(of(design(STONEBRIDGE)).plotsProperty().get())
                .extracting(SlotPlot::id)
                .containsExactly("pair");
        assertThat(of(design(EAGLE)).plotsProperty().get())
                .extracting(SlotPlot::id)
                .containsExactly("alice", "bob", "pair");
    }

    @Test
    void draggingTheWindowIsOneChangeAndStaysInItsRange() {
        Design design = design(KESTREL);
        SlotsModel model = of(design);
        Scenario before = design.scenario();
        model.window(300e-12, this);
        model.window(250e-12, this);
        assertThat(design.scenario().timing().windowWidthPs()).isCloseTo(250.0, within(1e-9));
        assertThat(central(plot(model, "pair")).to()
                        - central(plot(model, "pair")).from())
                .isCloseTo(250e-12, within(1e-18));
        model.window(-5.0, this);
        assertThat(design.scenario().timing().windowWidthPs()).isPositive();
        model.settle();
        assertThat(design.undoTextProperty().get()).isEqualTo("window width");
        design.undo();
        assertThat(design.scenario()).isEqualTo(before);
    }

    @Test
    void separationIsTheCommonImbalance() {
        Design design = design(KESTREL);
        SlotsModel model = of(design);
        model.separation(1.5e-9, null);
        assertThat(design.scenario().imbalanceNs()).isCloseTo(1.5, within(1e-12));
        assertThat(model.separation()).isCloseTo(1.5e-9, within(1e-20));
        List<SlotPlot.NamedPeak> peaks = plot(model, "alice").peaks();
        assertThat(peaks.get(2).time() - peaks.get(1).time()).isCloseTo(1.5e-9, within(1e-12));
    }

    @Test
    void nothingIsComputedWhileNobodyLooksAndTheNewestAfterwards() {
        HeldBackground held = new HeldBackground();
        Design design = design(KESTREL);
        SlotsModel model = new SlotsModel(design, held.background());
        held.finish();
        List<SlotPlot> first = model.plotsProperty().get();
        model.watchedProperty().set(false);
        model.window(200e-12, null);
        model.allPortsProperty().set(true);
        assertThat(held.started()).isZero();
        assertThat(model.plotsProperty().get()).isSameAs(first);
        model.watchedProperty().set(true);
        assertThat(model.runningProperty().get()).isTrue();
        held.finish();
        assertThat(central(plot(model, "pair")).to()).isCloseTo(100e-12, within(1e-18));
        assertThat(plot(model, "pair").title()).isEqualTo(Words.of("slots.title.pair.all"));
    }

    @Test
    void documentsOfOtherLinksAreFollowed() {
        ScenarioDocument other = Designs.shipped(STONEBRIDGE);
        Design design = design(KESTREL);
        SlotsModel model = of(design);
        design.begin(other);
        assertThat(model.plotsProperty().get()).hasSize(1);
        assertThat(plot(model, "pair").timeAxis()).isEqualTo("slots.axis.difference");
    }
}
