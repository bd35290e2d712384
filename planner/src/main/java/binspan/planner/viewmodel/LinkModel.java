package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.Optional;
import java.util.function.BiPredicate;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

/** The link as a drawing: what stands in it, what is selected, how much room its losses leave, what can be done. */
public final class LinkModel {
    private final Design design;
    private final LatestTask room;
    private final SourceMove source;
    private final LinkCommands commands;
    private final ReadOnlyObjectWrapper<List<LinkItem>> items = new ReadOnlyObjectWrapper<>(this, "items", List.of());
    private final ReadOnlyIntegerWrapper selected = new ReadOnlyIntegerWrapper(this, "selected", -1);
    private final ReadOnlyObjectWrapper<Optional<LinkRoom>> left =
            new ReadOnlyObjectWrapper<>(this, "room", Optional.empty());

    /**
     * Follows a design.
     *
     * @param design the design
     * @param background where the room for loss is computed
     * @param edit changes the document: what in words, the changes; says whether it was done
     */
    public LinkModel(Design design, Background background, BiPredicate<String, List<Change>> edit) {
        this.design = design;
        this.room = LatestTask.quick(background);
        this.source = new SourceMove(design);
        this.commands = new LinkCommands(design, source, edit);
        design.scenarioProperty().addListener((property, before, now) -> follow(now));
        design.selectionProperty().addListener((property, before, now) -> find());
        follow(design.scenario());
    }

    /** What is drawn, from left to right. */
    public ReadOnlyObjectProperty<List<LinkItem>> itemsProperty() {
        return items.getReadOnlyProperty();
    }

    /** What is drawn, from left to right. */
    public List<LinkItem> items() {
        return items.get();
    }

    /** Index of the selected thing; -1 when something else is selected. */
    public ReadOnlyIntegerProperty selectedProperty() {
        return selected.getReadOnlyProperty();
    }

    /** Room for more loss, of the present link or of the one before; empty until it is known. */
    public ReadOnlyObjectProperty<Optional<LinkRoom>> roomProperty() {
        return left.getReadOnlyProperty();
    }

    /** Whether the room shown is that of the present link. */
    @SuppressWarnings("ReferenceEquality") // the design changes by giving another scenario
    public boolean roomIsPresent() {
        return left.get()
                .filter(known -> known.scenario().equals(design.scenario()))
                .isPresent();
    }

    /** Moves the source. */
    public SourceMove source() {
        return source;
    }

    /** What can be done. */
    public LinkCommands commands() {
        return commands;
    }

    /** Selects a thing. */
    public void select(int index) {
        selected.set(index);
        design.selectionProperty().set(items().get(index).part());
    }

    /**
     * Selects the thing next to the selected one, the source when nothing is.
     *
     * @param step 1 for the one on its right, -1 for the one on its left
     */
    public void selectNeighbour(int step) {
        int now = selected.get();
        int next = now < 0 ? source(items()) : now + step;
        select(Math.max(0, Math.min(items().size() - 1, next)));
    }

    private static int source(List<LinkItem> items) {
        for (int i = 0; i < items.size(); i++) {
            if (items.get(i).kind() == LinkItem.Kind.SOURCE) {
                return i;
            }
        }
        throw new IllegalStateException();
    }

    private void follow(Scenario scenario) {
        items.set(LinkItems.of(scenario));
        find();
        room.run(progress -> LinkRoom.of(scenario), now -> left.set(Optional.of(now)));
    }

    private void find() {
        LinkPart part = design.selectionProperty().get();
        int now = selected.get();
        if (now >= items().size() || now < 0 || !items().get(now).part().equals(part)) {
            selected.set(items().stream().map(LinkItem::part).toList().indexOf(part));
        }
        commands.refresh();
    }
}
