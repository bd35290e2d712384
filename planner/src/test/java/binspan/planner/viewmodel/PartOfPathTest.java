package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.prediction.Headroom;
import binspan.prediction.LinkCheck;
import binspan.scenario.Edits;
import binspan.scenario.LossElement;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

final class PartOfPathTest {
    private static final Scenario LINK = VerdictLinks.meeting();

    private static LinkPart find(String path) {
        return PartOfPath.find(LINK, path);
    }

    @Test
    void sourceAndPlan() {
        assertThat(find("source.meanPairsPerCycle")).isEqualTo(new LinkPart.Source());
        assertThat(find("source.pump.mismatchPs")).isEqualTo(new LinkPart.Source());
        assertThat(find("source.idler.bandwidthFwhmGHz")).isEqualTo(new LinkPart.Bands());
        assertThat(find("imbalanceNs")).isEqualTo(new LinkPart.Plan());
        assertThat(find("timing.windowWidthPs")).isEqualTo(new LinkPart.Plan());
        assertThat(find("require.chshAtLeast")).isEqualTo(new LinkPart.Promise());
    }

    @Test
    void partsOfASite() {
        assertThat(find("alice.sourceCouplingLossDb")).isEqualTo(new LinkPart.Coupling(Site.ALICE));
        assertThat(find("bob.repairMarginDb")).isEqualTo(new LinkPart.Repair(Site.BOB));
        assertThat(find("bob.analyzer.temperatureRmsMilliK")).isEqualTo(new LinkPart.Analyzer(Site.BOB));
        assertThat(find("alice.delayErrorPs")).isEqualTo(new LinkPart.Clock(Site.ALICE));
        assertThat(find("bob.detectors[1].jitterFwhmPs")).isEqualTo(new LinkPart.Port(Site.BOB, 1));
        assertThat(find("bob.detectors.darkCountsPerSecond")).isEqualTo(new LinkPart.Port(Site.BOB, 0));
        assertThat(find("both.clockJitterRmsPs")).isEqualTo(new LinkPart.Clock(Site.ALICE));
    }

    @Test
    void elementsByPlaceAndByLabel() {
        List<PathElement> path = new ArrayList<>();
        path.add(new LossElement(Optional.of("panel"), 0.5));
        path.add(new LossElement(Optional.of("panel.east"), 0.5));
        path.add(new LossElement(Optional.empty(), 0.5));
        Scenario link = Edits.withArms(LINK, Edits.withPath(LINK.alice(), path), LINK.bob());
        assertThat(PartOfPath.find(link, "alice.path.panel.lossDb")).isEqualTo(new LinkPart.Element(Site.ALICE, 0));
        assertThat(PartOfPath.find(link, "alice.path.panel.east.lossDb"))
                .isEqualTo(new LinkPart.Element(Site.ALICE, 1));
        assertThat(PartOfPath.find(link, "alice.path[2].lossDb")).isEqualTo(new LinkPart.Element(Site.ALICE, 2));
        assertThat(PartOfPath.find(link, "alice.path[9].lossDb")).isEqualTo(new LinkPart.Plan());
    }

    @Test
    void lengthOfTheLinkIsTheFirstFibre() {
        LinkPart part = find("link.lengthKm");
        assertThat(part).isInstanceOf(LinkPart.Element.class);
        List<PathElement> empty = List.of();
        Scenario bare = Edits.arms(LINK, arm -> Edits.withPath(arm, empty));
        assertThat(PartOfPath.find(bare, "link.lengthKm")).isEqualTo(new LinkPart.Plan());
    }

    @Test
    void everyHeadroomOfALinkHasAPartOfItsOwn() {
        for (Headroom each : LinkCheck.of(LINK).headroom()) {
            boolean timing = each.path().startsWith("timing.");
            assertThat(find(each.path()).equals(new LinkPart.Plan()))
                    .as(each.path())
                    .isEqualTo(timing);
        }
    }
}
