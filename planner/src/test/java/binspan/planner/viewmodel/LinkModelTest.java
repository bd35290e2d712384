package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkPart.Element;
import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.FibreSpan;
import binspan.scenario.Scenario;
import binspan.study.tuning.SourcePosition;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.FieldSource;

/** The drawn link: what stands in it, what its losses add up to, what its commands do to the document. */
final class LinkModelTest {
    private static final String KESTREL = "kestrel-dam-to-millbrook";

    @Test
    void rowGoesFromAlicesClockOverTheSourceToBobsClock() {
        List<LinkItem> items = new LinkBench(KESTREL).model().items();
        assertThat(items)
                .extracting(LinkItem::kind)
                .containsExactly(
                        Kind.CLOCK,
                        Kind.PORT,
                        Kind.PORT,
                        Kind.ANALYZER,
                        Kind.REPAIR,
                        Kind.LOSS,
                        Kind.FIBRE,
                        Kind.LOSS,
                        Kind.COUPLING,
                        Kind.BAND,
                        Kind.SOURCE,
                        Kind.BAND,
                        Kind.COUPLING,
                        Kind.LOSS,
                        Kind.FIBRE,
                        Kind.LOSS,
                        Kind.REPAIR,
                        Kind.ANALYZER,
                        Kind.PORT,
                        Kind.PORT,
                        Kind.CLOCK);
        assertThat(items.get(5).name()).isEqualTo("dam patch panel");
        assertThat(items.get(6).part()).isEqualTo(new Element(Site.ALICE, 1));
        assertThat(items.get(15).part()).isEqualTo(new Element(Site.BOB, 2));
        assertThat(items.get(1).part()).isEqualTo(new LinkPart.Port(Site.ALICE, 0));
        assertThat(items.get(19).part()).isEqualTo(new LinkPart.Port(Site.BOB, 1));
    }

    /** The numbers are those of the file; 7.1 dB follow on 2.8 dB of coupling and 0.4 dB of patch panel. */
    @Test
    void itemSaysWhatTheFileSays() {
        LinkItem duct = new LinkBench(KESTREL).model().items().get(6);
        assertThat(duct.name()).isEqualTo("upper duct");
        assertThat(duct.detail()).isEqualTo("G.652.D 30.2 km");
        assertThat(duct.lossDb()).isEqualTo(7.1);
        assertThat(duct.runningDb()).isCloseTo(10.3, within(1e-9));
        assertThat(duct.description())
                .isEqualTo("alice, upper duct: fibre span, G.652.D 30.2 km, loss 7.1 dB, 10.3 dB from the source on");
    }

    /** Against the predictor, which adds the path up for itself. */
    @ParameterizedTest
    @FieldSource("binspan.planner.viewmodel.LinkBench#SHIPPED")
    void lossesAddUpToThePredictedLossOfTheArm(String name) {
        LinkBench bench = new LinkBench(name);
        LinkPrediction prediction = LinkPredictor.predict(bench.design().scenario());
        assertThat(sum(bench, Site.ALICE)).isCloseTo(prediction.pathA().lossDb(), within(1e-9));
        assertThat(sum(bench, Site.BOB)).isCloseTo(prediction.pathB().lossDb(), within(1e-9));
        assertThat(bench.model().items().get(0).runningDb())
                .isCloseTo(prediction.pathA().lossDb(), within(1e-9));
    }

    private static double sum(LinkBench bench, Site site) {
        return bench.model().items().stream()
                .filter(item -> item.site().equals(Optional.of(site)))
                .mapToDouble(LinkItem::lossDb)
                .sum();
    }

    /** With just the room's loss more the predictor still meets all, with a little more it does not. */
    @Test
    void roomIsWhereTheFirstRequirementFails() {
        LinkBench bench = new LinkBench(KESTREL);
        LinkRoom room = bench.model().roomProperty().get().orElseThrow();
        assertThat(bench.model().roomIsPresent()).isTrue();
        assertThat(room.stated()).isTrue();
        assertThat(room.unmet()).isEmpty();
        assertThat(room.at(Site.ALICE).orElseThrow().extraDb()).isBetween(0.1, 10.0);
    }

    @Test
    void partOfTheDesignAndPlaceInTheDrawingGoTogether() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.design().selectionProperty().set(new Element(Site.BOB, 1));
        assertThat(bench.model().selectedProperty().get()).isEqualTo(14);
        bench.model().selectNeighbour(-1);
        assertThat(bench.design().selectionProperty().get()).isEqualTo(new Element(Site.BOB, 0));
        bench.design().selectionProperty().set(new LinkPart.Promise());
        assertThat(bench.model().selectedProperty().get()).isEqualTo(-1);
        bench.model().selectNeighbour(1);
        assertThat(bench.design().selectionProperty().get()).isEqualTo(new LinkPart.Source());
    }

    /** The bands are one part that stands at both sides of the source: the way along the row goes through both. */
    @Test
    void wayAlongTheRowPassesEverything() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.model().select(0);
        for (int i = 1; i < bench.model().items().size(); i++) {
            bench.model().selectNeighbour(1);
            assertThat(bench.model().selectedProperty().get()).isEqualTo(i);
        }
        bench.model().selectNeighbour(1);
        assertThat(bench.design().selectionProperty().get()).isEqualTo(new LinkPart.Clock(Site.BOB));
    }

    @Test
    void addedElementStandsNextToTheSelectedOneAndIsSelected() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.design().selectionProperty().set(new Element(Site.ALICE, 1));
        bench.model().commands().add(Kind.FILTER, true);
        assertThat(bench.labels(Site.ALICE))
                .containsExactly("Fernhill patch panel", "upper duct", "filter", "dam patch panel");
        assertThat(bench.design().selectionProperty().get()).isEqualTo(new Element(Site.ALICE, 2));
        bench.model().commands().add(Kind.COMPENSATOR, false);
        assertThat(bench.labels(Site.ALICE).get(2)).isEqualTo("compensator");
        assertThat(bench.done()).containsExactly("added filter", "added compensator");
    }

    @Test
    void addedElementStandsAtTheEndOfThePathThatIsSelected() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.design().selectionProperty().set(new LinkPart.Coupling(Site.BOB));
        bench.model().commands().add(Kind.LOSS, true);
        assertThat(bench.labels(Site.BOB)).hasSize(4).startsWith("patch panel");
        bench.design().selectionProperty().set(new LinkPart.Port(Site.BOB, 1));
        bench.model().commands().add(Kind.FIBRE, false);
        assertThat(bench.labels(Site.BOB)).hasSize(5).endsWith("fibre");
        bench.design().selectionProperty().set(new LinkPart.Source());
        assertThat(bench.model().commands().add().enabledProperty().get()).isFalse();
        assertThat(bench.model().commands().add().refusalProperty().get()).startsWith("Select a part of an arm");
    }

    @Test
    void removingSelectsTheNeighbourAndAtLastTheCoupling() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.design().selectionProperty().set(new Element(Site.ALICE, 2));
        LinkCommand remove = bench.model().commands().remove();
        remove.run();
        assertThat(bench.design().selectionProperty().get()).isEqualTo(new Element(Site.ALICE, 1));
        remove.run();
        remove.run();
        assertThat(bench.labels(Site.ALICE)).isEmpty();
        assertThat(bench.design().selectionProperty().get()).isEqualTo(new LinkPart.Coupling(Site.ALICE));
        assertThat(remove.enabledProperty().get()).isFalse();
    }

    @Test
    void elementMovesWithTheSelectionUntilTheEndOfItsPath() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.design().selectionProperty().set(new Element(Site.ALICE, 0));
        LinkCommands commands = bench.model().commands();
        assertThat(commands.towards(Site.BOB).refusalProperty().get()).contains("first element");
        commands.towards(Site.ALICE).run();
        commands.towards(Site.ALICE).run();
        assertThat(bench.labels(Site.ALICE)).containsExactly("upper duct", "dam patch panel", "Fernhill patch panel");
        assertThat(bench.design().selectionProperty().get()).isEqualTo(new Element(Site.ALICE, 2));
        assertThat(commands.towards(Site.ALICE).refusalProperty().get()).contains("last element");
    }

    @Test
    void splitSpanKeepsLengthAndLoss() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.design().selectionProperty().set(new Element(Site.ALICE, 1));
        double before = sum(bench, Site.ALICE);
        assertThat(bench.model().commands().splitAt(40.0)).contains("30.2 km");
        assertThat(bench.model().commands().splitAt(Double.NaN)).isNotEmpty();
        assertThat(bench.done()).isEmpty();
        assertThat(bench.model().commands().splitAt(10.0)).isEmpty();
        FibreSpan first = (FibreSpan) bench.design().scenario().alice().path().get(1);
        assertThat(first.lengthKm()).isEqualTo(10.0);
        assertThat(SourcePosition.fibreKm(bench.design().scenario().alice())).isCloseTo(30.2, within(1e-9));
        assertThat(sum(bench, Site.ALICE)).isCloseTo(before, within(1e-9));
        bench.design().selectionProperty().set(new Element(Site.ALICE, 0));
        assertThat(bench.model().commands().split().enabledProperty().get()).isFalse();
    }

    @Test
    void sourceStepsAlongTheFibreByAHundredth() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.design().selectionProperty().set(new LinkPart.Source());
        double before = SourcePosition.of(bench.design().scenario());
        bench.model().commands().towards(Site.BOB).run();
        assertThat(SourcePosition.of(bench.design().scenario())).isCloseTo(before + 0.01, within(1e-9));
    }

    /** The length of the fibre, 59.6 km, stays; the text is that of the new place. */
    @Test
    void draggedSourceFollowsTheHandAndCanBeTakenBack() {
        LinkBench bench = new LinkBench(KESTREL);
        Scenario before = bench.design().scenario();
        SourceMove move = bench.model().source();
        move.begin();
        move.to(4.0);
        move.to(1.2);
        assertThat(move.text()).isEqualTo("alice 31.4 km | bob 28.2 km");
        move.cancel();
        assertThat(bench.design().scenario()).isEqualTo(before);
        assertThat(move.moving()).isFalse();
    }

    @Test
    void draggedSourceLeavesEachArmSomeFibre() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.model().source().begin();
        bench.model().source().to(1000.0);
        bench.model().source().end();
        assertThat(SourcePosition.fibreKm(bench.design().scenario().bob())).isCloseTo(0.596, within(1e-9));
    }

    @Test
    void sourceWithoutFibreInBothArmsStays() {
        LinkBench bench = new LinkBench(KESTREL);
        bench.design().selectionProperty().set(new Element(Site.ALICE, 1));
        bench.model().commands().remove().run();
        bench.design().selectionProperty().set(new LinkPart.Source());
        assertThat(bench.model().commands().towards(Site.BOB).refusalProperty().get())
                .startsWith("The source moves along the fibre");
        Scenario before = bench.design().scenario();
        bench.model().source().begin();
        bench.model().source().to(3.0);
        assertThat(bench.design().scenario()).isSameAs(before);
    }
}
