package binspan.planner.viewmodel;

import binspan.planner.viewmodel.LinkLayout.Column;
import binspan.planner.viewmodel.LinkPart.Element;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * Where an element that is dragged would fall: between the others of its arm.
 *
 * @param index its place afterwards, from the source on
 * @param x where a mark for it stands, px
 */
public record LinkDrop(int index, double x) {
    /**
     * The place for an element.
     *
     * @param items what is drawn
     * @param layout where
     * @param dragged the element
     * @param x where the hand is, px
     */
    public static LinkDrop of(List<LinkItem> items, LinkLayout layout, Element dragged, double x) {
        boolean left = dragged.site() == Site.ALICE;
        double outward = left ? -1.0 : 1.0;
        List<Column> others = others(items, layout, dragged);
        if (others.isEmpty()) {
            return new LinkDrop(dragged.index(), x);
        }
        int inner = (int) others.stream()
                .filter(column -> column.centre() * outward < x * outward)
                .count();
        boolean last = inner == others.size();
        Column beside = others.get(last ? inner - 1 : inner);
        return new LinkDrop(inner, last == left ? beside.x() : beside.right());
    }

    /** The other elements of its arm, from the source outwards. */
    private static List<Column> others(List<LinkItem> items, LinkLayout layout, Element dragged) {
        List<Column> others = new ArrayList<>();
        for (int i = 0; i < items.size(); i++) {
            if (items.get(i).part() instanceof Element element
                    && element.site() == dragged.site()
                    && element.index() != dragged.index()) {
                others.add(layout.of(i));
            }
        }
        if (dragged.site() == Site.ALICE) {
            Collections.reverse(others);
        }
        return others;
    }
}
