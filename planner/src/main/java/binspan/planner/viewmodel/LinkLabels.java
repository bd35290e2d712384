package binspan.planner.viewmodel;

import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkLayout.Column;
import java.util.ArrayList;
import java.util.List;

/**
 * Where the words over the drawn link stand: in a column that is wide enough name and detail above one another; in a run of narrow
 * ones a name alone, in two rows by turns. Neighbours in a row share the space between them as their lengths ask; none
 * reaches over another.
 *
 * @param places one for each column
 */
public record LinkLabels(List<Place> places) {
    private static final double WIDE_EM = 4.6;
    private static final double MOSTLY = 0.75;
    private static final double SURE_EM = 2.3;
    private static final double LETTER_EM = 0.53;
    private static final double MARGIN_EM = 0.7;

    /** Copies the list. */
    public LinkLabels {
        places = List.copyOf(places);
    }

    /**
     * A place for words.
     *
     * @param row 0 for the upper row, 1 for the lower; 0 also where both are used
     * @param both whether name and detail are shown, else one text alone
     * @param text the upper or only text
     * @param x left edge, px
     * @param width width, px
     */
    public record Place(int row, boolean both, String text, double x, double width) {
        /** Right edge, px. */
        double right() {
            return x + width;
        }

        private boolean in(int wanted) {
            return both || row == wanted;
        }
    }

    /**
     * Places words over a layout.
     *
     * @param items what is drawn
     * @param layout where
     * @param em size of ordinary text, px
     */
    public static LinkLabels of(List<LinkItem> items, LinkLayout layout, double em) {
        List<Place> wishes = wishes(items, layout, em);
        List<Place> places = new ArrayList<>();
        for (int i = 0; i < wishes.size(); i++) {
            places.add(placed(wishes, i, layout, em));
        }
        return new LinkLabels(places);
    }

    /** Each text in its full length over the middle of its column. */
    private static List<Place> wishes(List<LinkItem> items, LinkLayout layout, double em) {
        List<Place> wishes = new ArrayList<>();
        int run = 0;
        for (Column column : layout.columns()) {
            LinkItem item = items.get(column.items().get(0));
            double need = em * length(item.name().length(), item.detail().length());
            boolean wide = column.width() >= Math.max(WIDE_EM * em, MOSTLY * need);
            run = wide ? 0 : run + 1;
            String text = !wide && item.kind() == Kind.PORT ? item.detail() : item.name();
            double width = wide ? need : em * length(text.length(), 0);
            int row = wide ? 0 : (run + 1) % 2;
            wishes.add(new Place(row, wide, text, column.centre() - width / 2.0, width));
        }
        return wishes;
    }

    private static double length(int letters, int others) {
        return Math.max(letters, others) * LETTER_EM + MARGIN_EM;
    }

    private static Place placed(List<Place> wishes, int i, LinkLayout layout, double em) {
        Place wish = wishes.get(i);
        double left = 0.0;
        double right = layout.width();
        for (int row = 0; row < 2; row++) {
            if (wish.in(row)) {
                double middle = layout.columns().get(i).centre();
                left = Math.max(left, middle - reach(wishes, layout, i, new Way(-1, row, em)));
                right = Math.min(right, middle + reach(wishes, layout, i, new Way(1, row, em)));
            }
        }
        double width = Math.min(wish.width(), right - left);
        double x = Math.max(left, Math.min(wish.x(), right - width));
        return new Place(wish.row(), wish.both(), wish.text(), x, width);
    }

    /** To the next one in a row: step -1 to the left, 1 to the right. */
    private record Way(int step, int row, double em) {}

    /** How far a text may reach towards its next neighbour in a row. */
    private static double reach(List<Place> wishes, LinkLayout layout, int i, Way way) {
        double here = layout.columns().get(i).centre();
        for (int j = i + way.step(); j >= 0 && j < wishes.size(); j += way.step()) {
            if (wishes.get(j).in(way.row())) {
                double gap = Math.abs(layout.columns().get(j).centre() - here);
                return shared(
                        gap,
                        claim(wishes.get(i), layout.columns().get(i), way.em()),
                        claim(wishes.get(j), layout.columns().get(j), way.em()));
            }
        }
        return way.step() < 0 ? here : layout.width() - here;
    }

    /** What a text asks for on one side of its middle: all of it, and what it gets first. */
    private record Claim(double whole, double sure, boolean wide) {}

    private static Claim claim(Place wish, Column column, double em) {
        double whole = wish.width() / 2.0;
        double sure = wish.both() ? column.width() / 2.0 : SURE_EM * em;
        return new Claim(whole, Math.min(whole, sure), wish.both());
    }

    /** The part of a gap that goes to the first of two: in proportion to what they ask for, but what is sure first. */
    private static double shared(double gap, Claim mine, Claim other) {
        double least = mine.sure();
        double rest = other.sure();
        if (least + rest > gap) {
            if (mine.wide() == other.wide()) {
                return gap * least / (least + rest);
            }
            return mine.wide() ? least : gap - rest;
        }
        double share = gap * mine.whole() / (mine.whole() + other.whole());
        return Math.max(least, Math.min(share, gap - rest));
    }
}
