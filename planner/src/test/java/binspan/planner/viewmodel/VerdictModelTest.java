package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.report.DriftWords;
import binspan.planner.report.Figure;
import binspan.planner.report.RequirementWords;
import binspan.planner.report.TextStyle;
import binspan.planner.report.Verdict;
import binspan.prediction.Headroom;
import binspan.prediction.LinkCheck;
import binspan.prediction.Requirement;
import binspan.prediction.StabilityLimit;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

final class VerdictModelTest {
    private static final String WINDOW = "timing.windowWidthPs";

    private static void window(Design design, double widthPs) {
        design.change("window width", null, scenario -> VerdictLinks.with(scenario, WINDOW, widthPs));
    }

    private static VerdictModel of(Design design) {
        return new VerdictModel(design, Background.NONE);
    }

    private static FigureRow figure(VerdictSheet sheet, String name) {
        return sheet.figures().stream()
                .flatMap(group -> group.rows().stream())
                .filter(row -> row.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void sheetIsThatOfTheCheck() {
        Scenario scenario = VerdictLinks.withAll();
        VerdictSheet sheet = of(Designs.of(scenario)).sheetProperty().get();
        LinkCheck check = LinkCheck.of(scenario);
        assertThat(sheet.requirements()).isEqualTo(RequirementRow.of(check, check));
        assertThat(sheet.cautions()).isEqualTo(check.cautions());
        assertThat(sheet.headline()).isEqualTo("DOES NOT MEET 1 of 8 requirements");
        assertThat(sheet.met()).isFalse();
        assertThat(sheet.changes()).isEmpty();
    }

    @Test
    void windowAndCommandLineSayTheSame() {
        Scenario scenario = VerdictLinks.meeting();
        VerdictModel model = of(Designs.of(scenario));
        String page = Verdict.text(LinkCheck.of(scenario), TextStyle.PLAIN_UNICODE);
        assertThat(page).contains(model.sheetProperty().get().headline());
        model.sheetProperty()
                .get()
                .requirements()
                .forEach(row -> assertThat(page).contains(row.required(), row.predicted(), inPerCent(row.margin())));
        model.fullProperty()
                .get()
                .rows()
                .forEach(row ->
                        assertThat(page).contains(row.name(), row.planned(), row.limit(), row.room(), row.fails()));
        model.sheetProperty()
                .get()
                .budget()
                .steps()
                .forEach(step -> assertThat(page).contains(step.cause(), step.factor(), step.loss()));
    }

    /** The command line has the column of per cent above its margins. */
    private static String inPerCent(String margin) {
        return margin.replace(" pt", " %");
    }

    @Test
    void limitsSayOnWhichSideTheyLie() {
        LinkCheck check = LinkCheck.of(VerdictLinks.meeting());
        VerdictRoom room = of(Designs.of(VerdictLinks.meeting())).fullProperty().get();
        List<String> pairs = room.rows().stream()
                .filter(row -> row.path().equals("source.meanPairsPerCycle"))
                .map(VerdictRoom.Row::side)
                .toList();
        assertThat(pairs).containsExactlyInAnyOrder("down to", "up to");
        for (VerdictRoom.Row row : room.rows()) {
            assertThat(row.room()).startsWith(row.side().equals("up to") ? "+" : "-");
            assertThat(row.sidedLimit()).isEqualTo(row.side() + " " + row.limit());
        }
        assertThat(room.rows()).hasSameSizeAs(check.headroom());
    }

    @Test
    void budgetStepsDownFromOneToTheRawVisibility() {
        Scenario scenario = VerdictLinks.meeting();
        Budget budget = of(Designs.of(scenario)).sheetProperty().get().budget();
        double raw = LinkCheck.of(scenario).prediction().fringe().raw();
        double reached = 1.0;
        for (Budget.Step step : budget.steps()) {
            assertThat(step.from()).isEqualTo(reached);
            reached = step.to();
        }
        assertThat(reached).isCloseTo(raw, within(1e-12));
        assertThat(budget.floor()).isLessThan(raw);
        assertThat(budget.share(1.0)).isEqualTo(1.0);
        assertThat(budget.share(budget.floor())).isZero();
        assertThat(budget.share(0.0)).isZero();
    }

    @Test
    void figuresAreThoseOfTheCheck() {
        Scenario scenario = VerdictLinks.meeting();
        VerdictSheet sheet = of(Designs.of(scenario)).sheetProperty().get();
        LinkCheck check = LinkCheck.of(scenario);
        double singles = check.prediction().counts().loadsA().stream()
                .mapToDouble(load -> load.recordedPerSecond())
                .sum();
        assertThat(figure(sheet, "singles, alice").value()).isEqualTo(Figure.counts(singles));
        assertThat(figure(sheet, "time to S > 2 by 5 sigma").value())
                .isEqualTo(Figure.duration(check.prediction().bell().secondsTo(5.0)
                        / check.prediction().uptimeShare()));
        assertThat(figure(sheet, "secret, endless run").value())
                .isEqualTo(Figure.bits(check.prediction().key().asymptoticPerSecond()));
        assertThat(figure(sheet, "CHSH S").value()).startsWith("2.6").contains("\u00b1");
    }

    @Test
    void errorRatesAreShownOnce() {
        List<FigureGroup> required =
                of(Designs.of(VerdictLinks.withAll())).sheetProperty().get().figures();
        List<FigureGroup> unjudged =
                of(Designs.of(VerdictLinks.unjudged())).sheetProperty().get().figures();
        assertThat(required).hasSize(4);
        assertThat(unjudged).hasSize(5);
        assertThat(unjudged.get(4).rows()).hasSize(2);
    }

    @Test
    void changesAreAgainstTheSavedLink() {
        Scenario saved = VerdictLinks.withAll();
        Design design = Designs.of(saved);
        VerdictModel model = of(design);
        window(design, 300.0);
        LinkCheck before = LinkCheck.of(saved);
        LinkCheck now = LinkCheck.of(design.scenario());
        double difference =
                now.prediction().fringe().raw() - before.prediction().fringe().raw();
        ChangeMark change = model.sheetProperty().get().requirements().get(0).change();
        assertThat(change.text()).isEqualTo(RequirementWords.margin(Requirement.RAW_VISIBILITY, difference));
        assertThat(change.effect()).isEqualTo(difference > 0.0 ? ChangeMark.Effect.BETTER : ChangeMark.Effect.WORSE);
        assertThat(figure(model.sheetProperty().get(), "accidentals").change().effect())
                .isEqualTo(ChangeMark.Effect.BETTER);
        assertThat(figure(model.sheetProperty().get(), "secret, endless run")
                        .change()
                        .effect())
                .isEqualTo(ChangeMark.Effect.WORSE);
        assertThat(model.sheetProperty().get().changes())
                .containsExactly(new ScenarioChange("window width", "400 ps", "300 ps"));
        window(design, 400.0);
        assertThat(model.sheetProperty().get().figuresChanged()).isFalse();
        assertThat(model.sheetProperty().get().changes()).isEmpty();
    }

    @Test
    void singlesChangeForNeitherBetterNorWorse() {
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = of(design);
        design.change("pairs", null, s -> VerdictLinks.with(s, "source.meanPairsPerCycle", 0.02));
        ChangeMark change = figure(model.sheetProperty().get(), "singles, bob").change();
        assertThat(change.effect()).isEqualTo(ChangeMark.Effect.OTHER);
        assertThat(change.spoken()).startsWith("changed since saved: -");
    }

    @Test
    void figureThatWasNotThereIsToldSo() {
        Design design = Designs.of(VerdictLinks.failing());
        VerdictModel model = of(design);
        design.change("step", null, s -> VerdictLinks.with(s, "timing.cableTemperatureStepK", 0.05));
        ChangeMark change =
                figure(model.sheetProperty().get(), "time to the first key").change();
        assertThat(change).isEqualTo(new ChangeMark("was never", ChangeMark.Effect.BETTER));
        assertThat(change.direction()).isZero();
    }

    @Test
    void roomIsThatOfTheCheckTightestFirst() {
        Scenario scenario = VerdictLinks.meeting();
        VerdictRoom room = of(Designs.of(scenario)).fullProperty().get();
        LinkCheck check = LinkCheck.of(scenario);
        assertThat(room.rows().stream().map(VerdictRoom.Row::path).toList())
                .containsExactlyInAnyOrderElementsOf(
                        check.headroom().stream().map(Headroom::path).toList());
        double tightest = check.headroom().stream()
                .mapToDouble(each -> DriftWords.relativeRoom(each.path(), each.value(), each.limit()))
                .min()
                .orElseThrow();
        Headroom first = check.headroom().stream()
                .filter(each -> DriftWords.relativeRoom(each.path(), each.value(), each.limit()) == tightest)
                .findFirst()
                .orElseThrow();
        assertThat(room.tightest().orElseThrow().path()).isEqualTo(first.path());
        assertThat(room.limits().stream().map(VerdictRoom.Limit::quantity).toList())
                .isEqualTo(
                        check.stability().stream().map(StabilityLimit::quantity).toList());
    }

    @Test
    void emptyStatesAreWords() {
        VerdictModel failing = of(Designs.of(VerdictLinks.failing()));
        assertThat(failing.fullProperty().get().none()).isEqualTo("None: no stated requirement is met.");
        assertThat(failing.fullProperty().get().tightest()).isEmpty();
        VerdictModel unjudged = of(Designs.of(VerdictLinks.unjudged()));
        assertThat(unjudged.sheetProperty().get().headline()).startsWith("No requirement is stated");
        assertThat(unjudged.sheetProperty().get().judged()).isFalse();
        assertThat(unjudged.fullProperty().get().none()).startsWith("State a requirement");
    }

    @Test
    void onePieceOfQuickWorkAtATime() {
        HeldBackground held = new HeldBackground();
        Design design = Designs.of(VerdictLinks.meeting());
        new VerdictModel(design, held.background());
        for (double width : new double[] {390.0, 380.0, 370.0}) {
            window(design, width);
            assertThat(held.started()).isEqualTo(1);
        }
        held.doWork();
        window(design, 360.0);
        assertThat(held.started()).isZero();
        held.showResult();
        assertThat(held.started()).isEqualTo(2);
    }

    @Test
    void sheetIsShownOnTheWayOfADragAndMarkedOld() {
        HeldBackground held = new HeldBackground();
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = new VerdictModel(design, held.background());
        Scenario first = design.scenario();
        assertThat(model.sheetProperty().get()).isNull();
        assertThat(model.sheetStaleProperty().get()).isTrue();
        window(design, 390.0);
        window(design, 380.0);
        held.doWork();
        held.showResult();
        assertThat(model.sheetProperty().get().scenario()).isEqualTo(first);
        assertThat(model.sheetStaleProperty().get()).isTrue();
        held.finish();
        assertThat(model.sheetProperty().get().scenario()).isEqualTo(design.scenario());
        assertThat(model.sheetStaleProperty().get()).isFalse();
        assertThat(model.fullStaleProperty().get()).isFalse();
    }

    @Test
    void roomOfAnOlderStateIsMarkedOld() {
        HeldBackground held = new HeldBackground();
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = new VerdictModel(design, held.background());
        held.finish();
        assertThat(model.fullStaleProperty().get()).isFalse();
        window(design, 350.0);
        assertThat(model.fullStaleProperty().get()).isTrue();
        held.doWork();
        held.showResult();
        assertThat(model.sheetStaleProperty().get()).isFalse();
        assertThat(model.fullStaleProperty().get()).isTrue();
        held.finish();
        assertThat(model.fullStaleProperty().get()).isFalse();
        assertThat(model.fullProperty().get().scenario()).isEqualTo(design.scenario());
    }

    @Test
    void undoneChangeIsNotOld() {
        HeldBackground held = new HeldBackground();
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = new VerdictModel(design, held.background());
        held.finish();
        window(design, 350.0);
        window(design, 400.0);
        assertThat(model.sheetStaleProperty().get()).isFalse();
        held.finish();
        assertThat(model.sheetProperty().get().scenario()).isEqualTo(design.scenario());
        assertThat(model.fullProperty().get().scenario()).isEqualTo(design.scenario());
    }

    /** Whatever the order in which changes, work and results come: nothing older follows something newer, and the newest is shown in the end. */
    @Test
    void newestWinsInAnyOrder() {
        for (int seed = 0; seed < 6; seed++) {
            HeldBackground held = new HeldBackground();
            Design design = Designs.of(VerdictLinks.unjudged());
            VerdictModel model = new VerdictModel(design, held.background());
            List<Double> sheets = new ArrayList<>();
            List<Double> rooms = new ArrayList<>();
            model.sheetProperty().addListener((source, before, sheet) -> sheets.add(width(sheet.scenario())));
            model.fullProperty().addListener((source, before, room) -> rooms.add(width(room.scenario())));
            Random random = new Random(seed);
            double width = 400.0;
            for (int i = 0; i < 60; i++) {
                switch (random.nextInt(3)) {
                    case 0 -> window(design, ++width);
                    case 1 -> held.doWork();
                    default -> held.showResult();
                }
            }
            held.finish();
            assertThat(sheets).isSorted().endsWith(width);
            assertThat(rooms).isSorted().endsWith(width);
            assertThat(model.sheetStaleProperty().get()).isFalse();
            assertThat(model.fullStaleProperty().get()).isFalse();
        }
    }

    private static double width(Scenario scenario) {
        return scenario.timing().windowWidthPs();
    }

    @Test
    void textHoldsAllOfThePage() {
        Design design = Designs.of(VerdictLinks.meeting());
        VerdictModel model = of(design);
        window(design, 350.0);
        VerdictSheet sheet = model.sheetProperty().get();
        VerdictRoom room = model.fullProperty().get();
        String text = VerdictText.of(sheet, room);
        room.rows()
                .forEach(row -> assertThat(text)
                        .contains(String.join(
                                "\t", row.name(), row.planned(), row.sidedLimit(), row.room(), row.fails())));
        sheet.cautions().forEach(caution -> assertThat(text).contains(caution.text(), "[" + caution.code() + "]"));
        assertThat(text).contains("window width: 400 ps \u2192 350 ps");
        assertThat(VerdictText.of(sheet, null)).doesNotContain("Headroom");
    }
}
