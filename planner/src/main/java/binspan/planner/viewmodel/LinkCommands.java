package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.document.ElementEdits;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkPart.Element;
import binspan.scenario.FibreSpan;
import binspan.scenario.PathElement;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.BiPredicate;

/** What can be done to the paths of both arms, starting from the selected part. The selection goes with the element. */
public final class LinkCommands {
    /** The kinds of elements that can be added, in the order of the menu. */
    public static final List<Kind> ADDABLE = List.of(Kind.FIBRE, Kind.LOSS, Kind.FILTER, Kind.COMPENSATOR);

    private final Design design;
    private final SourceMove source;
    private final BiPredicate<String, List<Change>> edit;
    private final LinkCommand add = new LinkCommand(this::addRefusal, () -> add(Kind.LOSS, true));
    private final LinkCommand remove = new LinkCommand(this::elementRefusal, this::removeSelected);
    private final LinkCommand split = new LinkCommand(this::splitRefusal, () -> splitAt(selectedKm() / 2.0));
    private final LinkCommand towardsAlice =
            new LinkCommand(() -> moveRefusal(Site.ALICE), () -> moveTowards(Site.ALICE));
    private final LinkCommand towardsBob = new LinkCommand(() -> moveRefusal(Site.BOB), () -> moveTowards(Site.BOB));

    LinkCommands(Design design, SourceMove source, BiPredicate<String, List<Change>> edit) {
        this.design = design;
        this.source = source;
        this.edit = edit;
    }

    void refresh() {
        List.of(add, remove, split, towardsAlice, towardsBob).forEach(LinkCommand::refresh);
    }

    /** Whether something can be added at the selected part. */
    public LinkCommand add() {
        return add;
    }

    /** Removes the selected element. */
    public LinkCommand remove() {
        return remove;
    }

    /** Splits the selected span in the middle. */
    public LinkCommand split() {
        return split;
    }

    /** Moves the selected element one place, or the source one step, towards a site. */
    public LinkCommand towards(Site site) {
        return site == Site.ALICE ? towardsAlice : towardsBob;
    }

    /**
     * Adds an element next to the selected part and selects it; at a part outside the path, at that end of it.
     *
     * @param kind what to add
     * @param outside whether behind the selected element, seen from the source
     */
    public void add(Kind kind, boolean outside) {
        place(outside)
                .ifPresent(place -> done(
                        Words.of("link.change.add", LinkWords.kind(kind)),
                        ElementEdits.add(design.scenario(), place.site().path(), type(kind), place.index()),
                        place));
    }

    /** Whether before and behind the selected part are two places. */
    public boolean addsOnBothSides() {
        return selected().isPresent();
    }

    /**
     * Moves an element within its arm and selects it.
     *
     * @param from the element
     * @param to its place afterwards
     */
    public void move(Element from, int to) {
        if (to != from.index()) {
            done(
                    Words.of("link.change.move", name(from)),
                    ElementEdits.move(from.site().path(), from.index(), to),
                    new Element(from.site(), to));
        }
    }

    /** Length of the selected span, km; 0 when no span is selected. */
    public double selectedKm() {
        return selected()
                .map(this::element)
                .map(element -> element instanceof FibreSpan span ? span.lengthKm() : 0.0)
                .orElse(0.0);
    }

    /**
     * Splits the selected span.
     *
     * @param km where, from its end at the source
     * @return why not; empty when it was done
     */
    public String splitAt(double km) {
        Element span = selected().orElseThrow();
        if (!(km > 0.0 && km < selectedKm())) {
            return Words.of("link.refusal.splitPlace", LinkWords.kilometres(selectedKm()));
        }
        done(
                Words.of("link.change.split", name(span)),
                ElementEdits.split(design.scenario(), span.site().path(), span.index(), km),
                span);
        return "";
    }

    /** The type of an element in the scenario file. */
    private static String type(Kind kind) {
        return kind.name().toLowerCase(Locale.ROOT);
    }

    private void removeSelected() {
        Element gone = selected().orElseThrow();
        int left = gone.site().arm(design.scenario()).path().size() - 1;
        LinkPart next = left == 0
                ? new LinkPart.Coupling(gone.site())
                : new Element(gone.site(), Math.min(gone.index(), left - 1));
        done(
                Words.of("link.change.remove", name(gone)),
                ElementEdits.remove(gone.site().path(), gone.index()),
                next);
    }

    private void moveTowards(Site site) {
        if (design.selectionProperty().get() instanceof LinkPart.Source) {
            source.step(site == Site.BOB ? 1 : -1);
        } else {
            Element moved = selected().orElseThrow();
            move(moved, moved.index() + (moved.site() == site ? 1 : -1));
        }
    }

    private void done(String what, List<Change> changes, LinkPart next) {
        if (edit.test(what, changes)) {
            design.selectionProperty().set(next);
        }
    }

    private Optional<Element> selected() {
        return design.selectionProperty().get() instanceof Element element
                        && element.index()
                                < element.site().arm(design.scenario()).path().size()
                ? Optional.of(element)
                : Optional.empty();
    }

    private PathElement element(Element element) {
        return element.site().arm(design.scenario()).path().get(element.index());
    }

    private String name(Element element) {
        return element(element).label().orElseGet(() -> Words.of("link.element", element.index() + 1));
    }

    /** The place of a new element. */
    private Optional<Element> place(boolean outside) {
        LinkPart part = design.selectionProperty().get();
        if (part instanceof Element element) {
            return Optional.of(new Element(element.site(), element.index() + (outside ? 1 : 0)));
        }
        if (part instanceof LinkPart.Coupling coupling) {
            return Optional.of(new Element(coupling.site(), 0));
        }
        return outerSite(part)
                .map(site ->
                        new Element(site, site.arm(design.scenario()).path().size()));
    }

    private static Optional<Site> outerSite(LinkPart part) {
        if (part instanceof LinkPart.Repair repair) {
            return Optional.of(repair.site());
        }
        if (part instanceof LinkPart.Analyzer analyzer) {
            return Optional.of(analyzer.site());
        }
        if (part instanceof LinkPart.Clock clock) {
            return Optional.of(clock.site());
        }
        return part instanceof LinkPart.Port port ? Optional.of(port.site()) : Optional.empty();
    }

    private String addRefusal() {
        return place(true).isPresent() ? "" : Words.of("link.refusal.add");
    }

    private String elementRefusal() {
        return selected().isPresent() ? "" : Words.of("link.refusal.element");
    }

    private String splitRefusal() {
        return selectedKm() > 0.0 ? "" : Words.of("link.refusal.split");
    }

    private String moveRefusal(Site site) {
        if (design.selectionProperty().get() instanceof LinkPart.Source) {
            return source.refusal();
        }
        if (selected().isEmpty()) {
            return Words.of("link.refusal.move");
        }
        Element element = selected().orElseThrow();
        int last = element.site().arm(design.scenario()).path().size() - 1;
        if (element.site() == site) {
            return element.index() < last ? "" : Words.of("link.refusal.last");
        }
        return element.index() > 0 ? "" : Words.of("link.refusal.first");
    }
}
