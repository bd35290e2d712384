package binspan.planner.viewmodel;

import binspan.planner.report.Figure;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.prediction.ArmBudget;
import binspan.prediction.ArmBudget.Entry;
import binspan.scenario.Arm;
import binspan.scenario.Band;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/** A link as a row of drawn things, from alice's clock over the source to bob's clock. */
final class LinkItems {
    private final Scenario scenario;
    private final Site site;
    private final Arm arm;
    private final List<LinkItem> items = new ArrayList<>();

    private LinkItems(Scenario scenario, Site site) {
        this.scenario = scenario;
        this.site = site;
        this.arm = site.arm(scenario);
    }

    /** The whole row. */
    static List<LinkItem> of(Scenario scenario) {
        List<LinkItem> row = new ArrayList<>(new LinkItems(scenario, Site.ALICE).outwards());
        Collections.reverse(row);
        row.add(source(scenario));
        row.addAll(new LinkItems(scenario, Site.BOB).outwards());
        return List.copyOf(row);
    }

    private static LinkItem source(Scenario scenario) {
        String name = LinkWords.source(scenario.source());
        String detail = LinkWords.brightness(scenario.source());
        String described = Words.of("link.described.source", name, detail);
        return new LinkItem(
                new LinkPart.Source(), Optional.empty(), Kind.SOURCE, name, detail, 0.0, 0.0, 0.0, described);
    }

    private List<LinkItem> outwards() {
        band();
        ArmBudget budget = ArmBudget.of(scenario, site == Site.ALICE);
        budget.entries().forEach(this::entry);
        ports(budget.lossDb());
        String jitter = Figure.stated(arm.clockJitterRmsPs(), "ps rms");
        plain(new LinkPart.Clock(site), Kind.CLOCK, jitter, budget.lossDb());
        return items;
    }

    private void band() {
        Band band = scenario.bandOf(arm);
        String name = arm.photon().text();
        String width = Figure.stated(band.bandwidthFwhmGHz(), "GHz");
        String described = Words.of("link.described.band", site.path(), name, LinkWords.centre(band), width);
        items.add(new LinkItem(
                new LinkPart.Bands(), Optional.of(site), Kind.BAND, name, width, 0.0, 0.0, 0.0, described));
    }

    private void entry(Entry entry) {
        switch (entry.kind()) {
            case COUPLING -> lossy(new LinkPart.Coupling(site), Kind.COUPLING, "", entry);
            case REPAIR_MARGIN -> lossy(new LinkPart.Repair(site), Kind.REPAIR, "", entry);
            case ANALYZER_EXCESS ->
                lossy(new LinkPart.Analyzer(site), Kind.ANALYZER, Figure.stated(scenario.imbalanceNs(), "ns"), entry);
            default -> element(entry);
        }
    }

    private void element(Entry entry) {
        String detail = LinkWords.detail(arm.path().get(entry.element()), entry.dispersionPsPerNm());
        lossy(
                new LinkPart.Element(site, entry.element()),
                Kind.valueOf(entry.kind().name()),
                detail,
                entry);
    }

    private void lossy(LinkPart part, Kind kind, String detail, Entry entry) {
        String name = entry.label().isEmpty() ? LinkWords.kind(kind) : entry.label();
        String described =
                LinkWords.described(site, kind, name, detail, LinkWords.losses(entry.lossDb(), entry.runningLossDb()));
        items.add(new LinkItem(
                part,
                Optional.of(site),
                kind,
                name,
                detail,
                entry.lossDb(),
                entry.runningLossDb(),
                entry.lengthKm(),
                described));
    }

    private void ports(double runningDb) {
        int count = arm.detectors().size();
        for (int i = 0; i < count; i++) {
            int port = site == Site.BOB ? i : count - 1 - i;
            String name = Words.of("link.port", port + 1);
            String detail = LinkWords.detector(arm.detectors().get(port));
            String described = LinkWords.described(site, Kind.PORT, name, detail, "");
            items.add(new LinkItem(
                    new LinkPart.Port(site, port),
                    Optional.of(site),
                    Kind.PORT,
                    name,
                    detail,
                    0.0,
                    runningDb,
                    0.0,
                    described));
        }
    }

    private void plain(LinkPart part, Kind kind, String detail, double runningDb) {
        String name = LinkWords.kind(kind);
        String described = LinkWords.described(site, kind, name, detail, "");
        items.add(new LinkItem(part, Optional.of(site), kind, name, detail, 0.0, runningDb, 0.0, described));
    }
}
