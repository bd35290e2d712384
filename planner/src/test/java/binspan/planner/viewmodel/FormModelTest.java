package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.document.Change;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.Content;
import binspan.scenario.Detector;
import binspan.scenario.Field;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class FormModelTest {
    private static final String KESTREL = "kestrel-dam-to-millbrook";
    private static final LinkPart PORT = new LinkPart.Port(Site.ALICE, 0);
    private static final LinkPart DUCT = new LinkPart.Element(Site.ALICE, 1);
    private static final String EFFICIENCY = "alice.detectors[0].efficiency";

    private static void collect(Section section, String parent, Set<String> paths) {
        for (Field field : section.fields()) {
            String path = parent.isEmpty() ? field.name() : parent + "." + field.name();
            Content content = field.content();
            if (field.kind() == Field.Kind.ENTRIES) {
                continue;
            }
            if (content.byType().isEmpty()) {
                paths.add(eitherArm(path));
            } else {
                content.byType()
                        .forEach((type, inner) -> collect(inner, type.isEmpty() ? path : path + "." + type, paths));
            }
        }
    }

    private static String kind(EditedForm form, FieldModel field) {
        String path = field.path();
        if (form.form().partProperty().get() instanceof LinkPart.Element element) {
            String name = form.form().name(element);
            String type = name.substring(name.lastIndexOf('(') + 1, name.length() - 1);
            path = path.replaceFirst("path\\[\\d+]", "path." + type);
        }
        return eitherArm(path.replaceAll("\\[\\d+]", ""));
    }

    /** The elements of both arms are of the same types; no shipped scenario has all of them in each. */
    private static String eitherArm(String path) {
        return path.replaceFirst("^bob\\.path", "alice.path");
    }

    /** The registry itself says what there is; the list of the file format names the same fields. */
    @Test
    void everyFieldOfTheRegistryIsInTheFormOfSomePart() {
        Set<String> wanted = new TreeSet<>();
        collect(ScenarioSections.SCENARIO, "", wanted);
        Set<String> found = new TreeSet<>();
        for (String name : EditedForm.SHIPPED) {
            EditedForm form = new EditedForm(name);
            for (LinkPart part : form.form().parts()) {
                form.select(part);
                form.fields().forEach(field -> found.add(kind(form, field)));
            }
        }
        assertThat(wanted).hasSizeGreaterThan(120);
        wanted.removeAll(found);
        assertThat(wanted).isEmpty();
    }

    /** What a file with the same value gets from the reader, its place apart. */
    private static String refusal(String text, String path) {
        try {
            ScenarioReader.parse(text, "link.json");
            throw new AssertionError("the reader takes it");
        } catch (InvalidScenarioException e) {
            String line = e.lines().get(0);
            return line.substring(line.indexOf(path) + path.length() + 2);
        }
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "0.82|1.2",
                "0.82|-0.5",
                "0.82|0",
                "0.82|1e400",
                "0.82|NaN",
                "0.82|-Infinity",
                "0.82|true",
                "0.82|null",
                "\"snspd\"|\"snspt\"",
                "\"snspd\"|\"cold\"",
                "\"snspd\"|\"SNSPD\""
            })
    void refusesInTheWordsOfTheCommandLine(String stated, String bad) {
        boolean word = stated.startsWith("\"");
        String path = word ? "alice.detectors[0].class" : EFFICIENCY;
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        String before = form.text();
        form.field(path).textProperty().set(bad.replace("\"", ""));
        assertThat(form.field(path).errorProperty().get())
                .isEqualTo(refusal(before.replaceFirst(stated, bad), path))
                .isNotEmpty();
        assertThat(form.text()).isEqualTo(before);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "source.pump.repetitionRateMHz|\"repetitionRateMHz\": 80,",
                "source.pump.pairEmissionFwhmPs|\"pairEmissionFwhmPs\": 40,",
                "source.meanPairsPerCycle|\"meanPairsPerCycle\": 0.04,"
            })
    void anEmptyFieldThatIsNeededSaysWhatTheReaderSays(String path, String stated) {
        EditedForm form = new EditedForm(KESTREL).select(new LinkPart.Source());
        String before = form.text();
        form.field(path).textProperty().set(" ");
        assertThat(form.field(path).errorProperty().get()).isEqualTo(refusal(before.replace(stated, ""), path));
        assertThat(form.text()).isEqualTo(before);
    }

    @Test
    void aRequiredFieldCannotBeEmptied() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        String path = "alice.path[1].lengthKm";
        form.field(path).textProperty().set("");
        assertThat(form.field(path).errorProperty().get())
                .isEqualTo(refusal(form.text().replace("\"lengthKm\": 30.2,", ""), path));
    }

    @Test
    void aRefusalFromTheWholeScenarioStandsAtTheField() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        String before = form.text();
        form.field("alice.path[1].label").textProperty().set("dam patch panel");
        String expected =
                refusal(before.replace("\"label\": \"upper duct\"", "\"label\": \"dam patch panel\""), "label");
        assertThat(form.field("alice.path[1].label").errorProperty().get()).contains(expected);
    }

    @Test
    void typingIsFollowedStepByStepAndUndoneAtOnce() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        String before = form.text();
        FieldModel field = form.field(EFFICIENCY);
        for (String typed : new String[] {"0.", "0.7", "0.75"}) {
            field.textProperty().set(typed);
        }
        assertThat(field.errorProperty().get()).isEmpty();
        assertThat(form.design().scenario().alice().detectors().get(0).efficiency())
                .isEqualTo(0.75);
        assertThat(field.changedProperty().get()).isTrue();
        field.settle();
        assertThat(form.text()).isEqualTo(before.replaceFirst("0.82", "0.75"));
        form.design().undo();
        assertThat(form.text()).isEqualTo(before);
        assertThat(field.textProperty().get()).isEqualTo("0.82");
        assertThat(field.changedProperty().get()).isFalse();
    }

    @Test
    void twoTypingsAreTwoSteps() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        FieldModel field = form.field(EFFICIENCY);
        field.textProperty().set("0.7");
        field.settle();
        field.textProperty().set("0.6");
        field.settle();
        form.design().undo();
        assertThat(form.design().scenario().alice().detectors().get(0).efficiency())
                .isEqualTo(0.7);
    }

    @Test
    void escapeTakesBackWhatWasTyped() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        String before = form.text();
        FieldModel field = form.field(EFFICIENCY);
        field.textProperty().set("0.7");
        field.textProperty().set("7");
        assertThat(field.errorProperty().get()).isNotEmpty();
        field.takeBack();
        assertThat(form.text()).isEqualTo(before);
        assertThat(field.textProperty().get()).isEqualTo("0.82");
        assertThat(field.errorProperty().get()).isEmpty();
    }

    @Test
    void whatIsNotAllowedStaysInTheFieldWhileOtherFieldsChange() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        FieldModel field = form.field(EFFICIENCY);
        field.textProperty().set("2");
        field.settle();
        form.field("alice.detectors[0].deadTimeNs").textProperty().set("50");
        assertThat(field.textProperty().get()).isEqualTo("2");
        assertThat(field.errorProperty().get()).startsWith("found 2;");
    }

    @Test
    void anEmptiedFieldLeavesItToTheClass() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        FieldModel field = form.field(EFFICIENCY);
        field.textProperty().set("");
        field.settle();
        assertThat(field.statedProperty().get()).isFalse();
        assertThat(field.promptProperty().get()).isEqualTo("0.8");
        assertThat(field.defaultProperty().get()).isEqualTo("of the detector class: 0.8");
        assertThat(form.design().scenario().alice().detectors().get(0).efficiency())
                .isEqualTo(0.8);
    }

    /** 0.22 dB/km at 1550 nm and 0.35 at 1310 nm of the class, on a straight line between: 0.2221 at 1546.12 nm. */
    @Test
    void theDefaultOfTheFibreClassIsSaidWithItsNumber() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        assertThat(form.field("alice.path[1].attenuationDbPerKm")
                        .defaultProperty()
                        .get())
                .isEqualTo("of the fibre class: 0.222 dB/km");
    }

    /** Exact definition of the speed of light: 299 792.458 GHz nm. */
    @Test
    void aWavelengthBecomesAFrequencyAndAChannel() {
        EditedForm form = new EditedForm(KESTREL).select(new LinkPart.Bands());
        AlternativesModel centre = form.alternatives("source.signal.wavelengthNm");
        assertThat(centre.shownProperty().get()).isZero();
        centre.choose(1);
        double frequency =
                form.field("source.signal.frequencyTHz").valueProperty().get();
        assertThat(frequency).isCloseTo(299_792.458 / 1546.12, within(1e-5));
        assertThat(form.text()).doesNotContain("1546.12");
        centre.choose(2);
        assertThat(form.field("source.signal.channel").valueProperty().get())
                .isCloseTo((frequency - 190.0) * 10.0, within(1e-4));
        form.design().undo();
        assertThat(centre.shownProperty().get()).isEqualTo(1);
    }

    /** Coherence time of a Lorentzian line: 1 / (pi width). */
    @Test
    void aLineWidthBecomesACoherenceTime() {
        EditedForm form = new EditedForm("stonebridge-to-lower-weir").select(new LinkPart.Source());
        form.alternatives("source.pump.linewidthMHz").choose(0);
        assertThat(form.field("source.pump.coherenceTimeNs").valueProperty().get())
                .isCloseTo(1e3 / (Math.PI * 0.5), within(1e-4));
    }

    /** As many dark clicks in a gate of 1 ns as fall into it: 90 /s times 1 ns. */
    @Test
    void aFreeRunningDetectorIsGatedAndBack() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        AlternativesModel dark = form.alternatives("alice.detectors[0].gate");
        dark.choose(1);
        assertThat(dark.errorProperty().get()).isEmpty();
        assertThat(form.field("alice.detectors[0].gate.darkProbability")
                        .textProperty()
                        .get())
                .isEqualTo("9e-8");
        dark.choose(0);
        assertThat(form.field("alice.detectors[0].darkCountsPerSecond")
                        .textProperty()
                        .get())
                .isEqualTo("90");
    }

    @Test
    void aContinuousPumpRefusesAGateInTheReadersWords() {
        EditedForm form = new EditedForm("stonebridge-to-lower-weir").select(PORT);
        AlternativesModel dark = form.alternatives("alice.detectors[0].gate");
        dark.choose(1);
        assertThat(dark.errorProperty().get())
                .isEqualTo("alice.detectors[0].gate: "
                        + refusal(
                                form.text()
                                        .replaceFirst(
                                                "\"darkCountsPerSecond\": 100",
                                                "\"gate\": {\"darkProbability\": 1e-7}"),
                                "gate"));
        assertThat(dark.shownProperty().get()).isZero();
    }

    @Test
    void aFormWithoutAnEqualWaitsForItsValue() {
        EditedForm form = new EditedForm(KESTREL).select(new LinkPart.Source());
        form.field("source.schmidtNumber").textProperty().set("4");
        form.field("source.schmidtNumber").settle();
        AlternativesModel modes = form.alternatives("source.schmidtNumber");
        modes.choose(1);
        assertThat(form.design().scenario().source().schmidtNumber()).hasValue(4.0);
        form.field("source.unheraldedG2").textProperty().set("1.2");
        assertThat(form.design().scenario().source().schmidtNumber()).isEmpty();
        assertThat(form.design().scenario().source().unheraldedG2()).hasValue(1.2);
    }

    @Test
    void aSliderMovesTheValueAndIsOneStep() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        String before = form.text();
        FieldModel length = form.field("alice.path[1].lengthKm");
        SliderScale scale = length.sliderProperty().get();
        assertThat(scale.logarithmic()).isTrue();
        assertThat(scale.position(30.2)).isCloseTo(0.5, within(1e-9));
        length.slide(0.6);
        length.slide(0.75);
        length.settle();
        assertThat(length.valueProperty().get()).isCloseTo(30.2 * Math.sqrt(4.0), within(0.5));
        assertThat(length.sliderProperty().get()).isEqualTo(scale);
        form.design().undo();
        assertThat(form.text()).isEqualTo(before);
    }

    /** The middle of a stretch of equal factors is the geometric mean of its ends. */
    @Test
    void theSliderComesBackToTheValueAfterAFarOne() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        FieldModel length = form.field("alice.path[1].lengthKm");
        length.textProperty().set("900");
        length.settle();
        assertThat(length.sliderProperty().get().covers(900.0)).isTrue();
        form.design().undo();
        SliderScale scale = length.sliderProperty().get();
        assertThat(Math.sqrt(scale.lowest() * scale.highest())).isCloseTo(30.2, within(1e-6));
        assertThat(scale.highest() / scale.lowest()).isCloseTo(16.0, within(1e-6));
        length.slide(1.0);
        assertThat(length.sliderProperty().get()).as("while it is moved").isEqualTo(scale);
        length.settle();
        assertThat(length.sliderProperty().get().highest()).isGreaterThan(scale.highest());
    }

    @Test
    void everySliderCoversItsValue() {
        int sliders = 0;
        for (String name : EditedForm.SHIPPED) {
            EditedForm form = new EditedForm(name);
            for (LinkPart part : form.form().parts()) {
                for (FieldModel field : form.select(part).fields()) {
                    SliderScale scale = field.sliderProperty().get();
                    if (scale != null) {
                        sliders++;
                        double value = field.valueProperty().get();
                        assertThat(scale.covers(value)).as(field.path()).isTrue();
                        assertThat(scale.value(scale.position(value)))
                                .as(field.path())
                                .isCloseTo(value, within(0.01 * (scale.highest() - scale.lowest())));
                    }
                }
            }
        }
        assertThat(sliders).isGreaterThan(200);
    }

    @Test
    void aRefusedEntryGoesWhenItsValueIsUndoneOrChangedElsewhere() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        FieldModel length = form.field("alice.path[1].lengthKm");
        length.textProperty().set("35");
        length.textProperty().set("35x");
        length.settle();
        assertThat(length.textProperty().get()).isEqualTo("35x");
        form.form().undo();
        assertThat(length.textProperty().get()).isEqualTo("30.2");
        assertThat(length.errorProperty().get()).isEmpty();
        length.textProperty().set("x");
        form.design().edit("elsewhere", List.of(new Change.Put("alice.path[1].lengthKm", 12.0)));
        assertThat(length.textProperty().get()).isEqualTo("12");
        assertThat(length.errorProperty().get()).isEmpty();
        length.textProperty().set("y");
        form.design().undo();
        assertThat(length.textProperty().get()).isEqualTo("30.2");
    }

    @Test
    void aRefusedEntryIsToldWithItsPlace() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        assertThat(form.form().refused()).isEmpty();
        FieldModel length = form.field("alice.path[1].lengthKm");
        length.textProperty().set("9000");
        assertThat(form.form().refused())
                .contains(new FormModel.RefusedEntry(
                        "alice: upper duct (fibre)",
                        "alice.path.upper duct.lengthKm",
                        "9000",
                        length.errorProperty().get()));
        length.takeBack();
        assertThat(form.form().refused()).isEmpty();
    }

    /** The worksheet computes the loss from these fields only where no measured loss stands. */
    @Test
    void aMeasuredLossStopsWhatItReplacesWithoutMovingTheRows() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        FieldModel splices = form.field("alice.path[1].splices");
        FieldModel measured = form.field("alice.path[1].measuredLossDb");
        assertThat(splices.withoutEffect()).isEqualTo("measured loss stands");
        assertThat(form.field("alice.path[1].dispersionPsPerNmKm").withoutEffect())
                .isEmpty();
        assertThat(form.field("alice.path[1].lengthKm").remark()).contains("stays as it is");
        measured.textProperty().set("");
        assertThat(form.field("alice.path[1].splices")).isSameAs(splices);
        assertThat(splices.withoutEffect()).isEmpty();
        assertThat(form.field("alice.path[1].lengthKm").remark()).isEmpty();
        measured.textProperty().set("6");
        assertThat(splices.withoutEffect()).isNotEmpty();
    }

    @Test
    void anotherPumpBringsItsFields() {
        EditedForm form = new EditedForm(KESTREL).select(new LinkPart.Source());
        FieldModel mode = form.field("source.pump.mode");
        mode.textProperty().set("continuous");
        assertThat(mode.errorProperty().get()).isEmpty();
        assertThat(form.field("source.pairRatePerSecond").valueProperty().get()).isCloseTo(0.04 * 80e6, within(1.0));
        assertThat(form.fields()).noneMatch(field -> field.path().equals("source.pump.repetitionRateMHz"));
    }

    @Test
    void aFieldWithoutEffectStandsLastWithItsReasonAndCanBeTakenAway() {
        String text = EditedForm.text(KESTREL).replace("\"mode\": \"pulse-pair\",", "\"mode\": \"pulse-train\",");
        EditedForm form = EditedForm.over(text).select(new LinkPart.Source());
        FieldModel rate = form.field("source.pump.repetitionRateMHz");
        assertThat(rate.withoutEffect()).isEqualTo("has no effect with a pulse-train pump");
        assertThat(form.fields().indexOf(rate))
                .isGreaterThan(form.fields().indexOf(form.field("source.partnerPassProbability")));
        rate.textProperty().set("");
        assertThat(form.text()).doesNotContain("repetitionRateMHz");
    }

    @Test
    void provenanceIsSaidUnderThePathOfBothArmsWhereTheFileHasIt() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        FieldModel field = form.field(EFFICIENCY);
        assertThat(field.provenanceProperty().get()).isEqualTo("acceptance test, channel by channel");
        field.source("measured anew");
        assertThat(form.design().scenario().provenance()).containsEntry("both.detectors.efficiency", "measured anew");
        FieldModel dead = form.field("alice.detectors[0].deadTimeNs");
        dead.source("data sheet");
        assertThat(form.design().scenario().provenance()).containsEntry("alice.detectors[0].deadTimeNs", "data sheet");
        dead.source("");
        assertThat(form.design().scenario().provenance()).doesNotContainKey("alice.detectors[0].deadTimeNs");
    }

    @Test
    void classicalLightIsAddedAndRemoved() {
        EditedForm form = new EditedForm("fernhill-shared-trunk").select(DUCT);
        AddRow add = (AddRow) form.form().rows().get(form.form().rows().size() - 1);
        add.add();
        assertThat(form.field("alice.path[1].classicalChannels[2].launchDbm")
                        .valueProperty()
                        .get())
                .isZero();
        GroupRow third = form.form().rows().stream()
                .filter(row -> row instanceof GroupRow group && group.title().equals("classical channel 3"))
                .map(GroupRow.class::cast)
                .findFirst()
                .orElseThrow();
        third.remove();
        assertThat(form.text()).isEqualTo(EditedForm.text("fernhill-shared-trunk"));
    }

    @Test
    void classicalLightWithoutAFilterBehindItIsRefusedInTheReadersWords() {
        EditedForm form = new EditedForm(KESTREL).select(DUCT);
        AddRow add = (AddRow) form.form().rows().get(form.form().rows().size() - 1);
        add.add();
        assertThat(add.errorProperty().get()).contains("found classical light and no filter after this fibre");
        assertThat(form.text()).isEqualTo(EditedForm.text(KESTREL));
    }

    @Test
    void theTableOfAClassSaysWhatIsInForce() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        ClassRow row = classRow(form);
        ClassTable table = row.tableProperty().get().orElseThrow();
        assertThat(table.lines().get(0)).isEqualTo(new ClassTable.Line("efficiency", "0.8", "0.82"));
        assertThat(table.lines().get(4).replaced()).isFalse();
        assertThat(table.sources().get(0)).contains("arXiv:1710.06740");
        assertThat(row.operatingPoints()).isEmpty();
    }

    /** Published: 10 % with 600 dark counts per second (Lunghi et al., arXiv:1204.4594). */
    @Test
    void anOperatingPointIsStatedAsAWhole() {
        EditedForm form = new EditedForm("orchard-lane-access").select(PORT);
        ClassRow row = classRow(form);
        row.operate(row.operatingPoints().indexOf("10 %, 20 us"));
        assertThat(form.design().scenario().alice().detectors().get(0).efficiency())
                .isEqualTo(0.10);
        assertThat(form.design().scenario().alice().detectors().get(0).darkCountsPerSecond())
                .isEqualTo(600.0);
        form.design().undo();
        assertThat(form.text()).isEqualTo(EditedForm.text("orchard-lane-access"));
    }

    @Test
    void theRowsStayWhileValuesChange() {
        EditedForm form = new EditedForm(KESTREL).select(PORT);
        FieldModel field = form.field(EFFICIENCY);
        field.textProperty().set("0.5");
        assertThat(form.field(EFFICIENCY)).isSameAs(field);
        form.select(new LinkPart.Plan());
        assertThat(form.form().titleProperty().get()).isEqualTo("plan of the link");
    }

    /** A side keeps one detector at least; the second one is like the first until somebody says otherwise. */
    @ParameterizedTest
    @ValueSource(strings = {"kestrel-dam-to-millbrook", "orchard-lane-access"})
    void detectorsAreRemovedAndAdded(String link) {
        EditedForm form = new EditedForm(link);
        Detector first = form.design().scenario().bob().detectors().get(0);
        form.form().select(new LinkPart.Port(Site.BOB, 1));
        GroupRow heading = (GroupRow) form.form().rows().get(0);
        assertThat(heading.removable()).isTrue();
        heading.remove();
        assertThat(form.design().scenario().bob().detectors()).containsExactly(first);
        form.form().select(new LinkPart.Port(Site.BOB, 0));
        assertThat(form.form().rows()).noneMatch(row -> row instanceof GroupRow group && group.removable());
        AddRow add = (AddRow) form.form().rows().stream()
                .filter(AddRow.class::isInstance)
                .findFirst()
                .orElseThrow();
        add.add();
        assertThat(add.errorProperty().get()).isEmpty();
        assertThat(form.design().scenario().bob().detectors()).containsExactly(first, first);
    }

    private static ClassRow classRow(EditedForm form) {
        return (ClassRow) form.form().rows().stream()
                .filter(ClassRow.class::isInstance)
                .findFirst()
                .orElseThrow();
    }
}
