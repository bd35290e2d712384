package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkLayout.Column;
import binspan.planner.viewmodel.LossProfile.LossNumber;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Places of the drawn link over random links: what holds for every one of them. */
final class LinkLayoutTest {
    private static final double EM = 12.0;
    private static final double DUST = 1e-6;
    private static final int MOST_THAT_FIT = 8;

    /** A link of random elements, alice's first. */
    record Drawn(List<LinkItem> items, double room, int mostInAnArm) {}

    static List<Drawn> links() {
        return IntStream.range(0, 120).mapToObj(LinkLayoutTest::link).toList();
    }

    private static Drawn link(int number) {
        SplittableRandom random = new SplittableRandom(4711L + number);
        int alice = random.nextInt(13);
        int bob = random.nextInt(13);
        List<LinkItem> items = new ArrayList<>(arm(Site.ALICE, alice, random));
        Collections.reverse(items);
        items.add(item(new LinkPart.Source(), Optional.empty(), Kind.SOURCE, 0.0, 0.0));
        items.addAll(arm(Site.BOB, bob, random));
        return new Drawn(items, random.nextBoolean() ? 914.0 : 684.0, Math.max(alice, bob));
    }

    private static List<LinkItem> arm(Site site, int elements, SplittableRandom random) {
        Optional<Site> here = Optional.of(site);
        List<LinkItem> items = new ArrayList<>();
        items.add(item(new LinkPart.Bands(), here, Kind.BAND, 0.0, 0.0));
        items.add(item(new LinkPart.Coupling(site), here, Kind.COUPLING, 2.5, 0.0));
        for (int i = 0; i < elements; i++) {
            Kind kind = LinkCommands.ADDABLE.get(random.nextInt(4));
            double km = kind == Kind.FIBRE ? Math.round(1000.0 * Math.exp(random.nextDouble() * 6.0)) / 1000.0 : 0.0;
            double loss = kind == Kind.FIBRE ? 0.2 * km : random.nextDouble() * 4.0;
            items.add(item(new LinkPart.Element(site, i), here, kind, loss, km));
        }
        items.add(item(new LinkPart.Repair(site), here, Kind.REPAIR, 1.0, 0.0));
        items.add(item(new LinkPart.Analyzer(site), here, Kind.ANALYZER, 1.3, 0.0));
        items.add(item(new LinkPart.Port(site, 0), here, Kind.PORT, 0.0, 0.0));
        items.add(item(new LinkPart.Port(site, 1), here, Kind.PORT, 0.0, 0.0));
        items.add(item(new LinkPart.Clock(site), here, Kind.CLOCK, 0.0, 0.0));
        return running(items);
    }

    private static LinkItem item(LinkPart part, Optional<Site> site, Kind kind, double loss, double km) {
        return new LinkItem(part, site, kind, "some name here", "detail", loss, 0.0, km, "");
    }

    private static List<LinkItem> running(List<LinkItem> items) {
        double sum = 0.0;
        List<LinkItem> with = new ArrayList<>();
        for (LinkItem i : items) {
            sum += i.lossDb();
            with.add(new LinkItem(
                    i.part(), i.site(), i.kind(), i.name(), i.detail(), i.lossDb(), sum, i.lengthKm(), ""));
        }
        return with;
    }

    private static LinkLayout layout(Drawn drawn) {
        return LinkLayout.of(drawn.items(), drawn.room(), EM);
    }

    @ParameterizedTest
    @MethodSource("links")
    void columnsStandSideBySideAndHoldEverythingOnce(Drawn drawn) {
        LinkLayout layout = layout(drawn);
        double x = 0.0;
        List<Integer> held = new ArrayList<>();
        for (Column column : layout.columns()) {
            assertThat(column.x()).isCloseTo(x, within(DUST));
            assertThat(column.width()).isGreaterThanOrEqualTo(ColumnWidths.least(column.kind()) * EM - DUST);
            x = column.right();
            held.addAll(column.items());
        }
        assertThat(layout.width()).isCloseTo(x, within(DUST));
        assertThat(held)
                .isEqualTo(IntStream.range(0, drawn.items().size()).boxed().toList());
    }

    @ParameterizedTest
    @MethodSource("links")
    void fillsTheRoomUnlessTheLeastWidthsAreMore(Drawn drawn) {
        LinkLayout layout = layout(drawn);
        double least = layout.columns().stream()
                .mapToDouble(column -> ColumnWidths.least(column.kind()) * EM)
                .sum();
        boolean fibre = drawn.items().stream().anyMatch(item -> item.lengthKm() > 0.0);
        if (least <= drawn.room() && fibre) {
            assertThat(layout.width()).isCloseTo(drawn.room(), within(DUST));
        }
        assertThat(layout.width()).isGreaterThanOrEqualTo(Math.min(least, drawn.room()) - DUST);
    }

    @ParameterizedTest
    @MethodSource("links")
    void eightElementsInEachArmFit(Drawn drawn) {
        if (drawn.mostInAnArm() <= MOST_THAT_FIT && drawn.room() > 900.0) {
            assertThat(layout(drawn).width()).isLessThanOrEqualTo(drawn.room() + DUST);
        }
    }

    @ParameterizedTest
    @MethodSource("links")
    void fibreIsToScaleOrAtItsLeastWidth(Drawn drawn) {
        LinkLayout layout = layout(drawn);
        for (Column column : layout.columns()) {
            double km = drawn.items().get(column.items().get(0)).lengthKm();
            if (column.kind() == Kind.FIBRE && column.toScale()) {
                assertThat(column.width()).isCloseTo(km * layout.pxPerKm(), within(DUST));
            } else if (column.kind() == Kind.FIBRE) {
                assertThat(column.width()).isCloseTo(ColumnWidths.least(Kind.FIBRE) * EM, within(DUST));
                assertThat(km * layout.pxPerKm()).isLessThan(column.width());
            }
        }
    }

    @ParameterizedTest
    @MethodSource("links")
    void scaleBarIsRoundAndOfUsefulLength(Drawn drawn) {
        LinkLayout layout = layout(drawn);
        if (layout.pxPerKm() > 0.0) {
            double bar = layout.bar() * layout.pxPerKm();
            assertThat(bar).isBetween(12.0 * EM / 2.5 - DUST, 12.0 * EM + DUST);
            double mantissa = layout.bar() / Math.pow(10.0, Math.floor(Math.log10(layout.bar()) + 1e-9));
            assertThat(Math.round(mantissa * 1e6) / 1e6).isIn(1.0, 2.0, 5.0);
        } else {
            assertThat(layout.bar()).isZero();
        }
    }

    @ParameterizedTest
    @MethodSource("links")
    void wordsReachOverNoOthers(Drawn drawn) {
        LinkLayout layout = layout(drawn);
        List<LinkLabels.Place> places = LinkLabels.of(drawn.items(), layout, EM).places();
        for (int row = 0; row < 2; row++) {
            double end = -DUST;
            for (LinkLabels.Place place : places) {
                if (place.both() || place.row() == row) {
                    assertThat(place.x()).isGreaterThanOrEqualTo(end - DUST);
                    assertThat(place.width()).isGreaterThan(EM);
                    end = place.right();
                }
            }
            assertThat(end).isLessThanOrEqualTo(layout.width() + DUST);
        }
    }

    @ParameterizedTest
    @MethodSource("links")
    void profileFallsFromTheSourceOutwardsToTheTotal(Drawn drawn) {
        LinkLayout layout = layout(drawn);
        for (Site site : Site.values()) {
            LossProfile profile = LossProfile.of(site, drawn.items(), layout, EM);
            double out = site == Site.ALICE ? -1.0 : 1.0;
            double total = drawn.items().stream()
                    .filter(item -> item.site().equals(Optional.of(site)))
                    .mapToDouble(LinkItem::lossDb)
                    .sum();
            assertThat(profile.totalDb()).isCloseTo(total, within(DUST));
            for (int i = 1; i < profile.line().size(); i++) {
                assertThat(profile.line().get(i).x() * out)
                        .isGreaterThanOrEqualTo(profile.line().get(i - 1).x() * out - DUST);
                assertThat(profile.line().get(i).db())
                        .isGreaterThanOrEqualTo(profile.line().get(i - 1).db() - DUST);
            }
            assertThat((profile.rimX() - profile.endX()) * out).isPositive();
        }
    }

    @ParameterizedTest
    @MethodSource("links")
    void numbersAtTheProfileDoNotOverlap(Drawn drawn) {
        for (Site site : Site.values()) {
            double out = site == Site.ALICE ? -1.0 : 1.0;
            List<LossNumber> numbers = LossProfile.of(site, drawn.items(), layout(drawn), EM).numbers().stream()
                    .sorted(Comparator.comparingDouble(number -> number.x() * out))
                    .toList();
            assertThat(numbers).isNotEmpty();
            for (int i = 1; i < numbers.size(); i++) {
                double end = numbers.get(i - 1).x() * out + numbers.get(i - 1).width();
                assertThat(numbers.get(i).x() * out).isGreaterThanOrEqualTo(end - DUST);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("links")
    void elementFallsWhereItIsWhenItIsNotMoved(Drawn drawn) {
        LinkLayout layout = layout(drawn);
        for (int i = 0; i < drawn.items().size(); i++) {
            if (drawn.items().get(i).part() instanceof LinkPart.Element element) {
                LinkDrop here =
                        LinkDrop.of(drawn.items(), layout, element, layout.of(i).centre());
                assertThat(here.index()).isEqualTo(element.index());
                double source = layout.columns().stream()
                        .filter(column -> column.kind() == Kind.SOURCE)
                        .findFirst()
                        .orElseThrow()
                        .centre();
                assertThat(LinkDrop.of(drawn.items(), layout, element, source).index())
                        .isZero();
            }
        }
    }
}
