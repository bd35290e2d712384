package binspan.planner.viewmodel;

import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkLayout.Column;
import java.util.ArrayList;
import java.util.List;

/**
 * Where the words over the drawn link stand: in a wide column name and detail above one another; in a run of narrow
 * ones a name alone, in two rows by turns. Neighbours in a row share the space between them as their lengths ask; none
 * reaches over another.
 *
 * @param places one for each column
 */
public record LinkLabels(List<Place> places) {
    private static final double WIDE_EM = 4.6;
    private static final double LETTER_EM = 0.49;
    private static final double MARGIN_EM = 0.6;

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
            places.add(placed(wishes, i, layout));
        }
        return new LinkLabels(places);
    }

    /** Each text in its full length over the middle of its column. */
    private static List<Place> wishes(List<LinkItem> items, LinkLayout layout, double em) {
        List<Place> wishes = new ArrayList<>();
        int run = 0;
        for (Column column : layout.columns()) {
            LinkItem item = items.get(column.items().get(0));
            boolean wide = column.width() >= WIDE_EM * em;
            run = wide ? 0 : run + 1;
            String text = !wide && item.kind() == Kind.PORT ? item.detail() : item.name();
            int letters = Math.max(text.length(), wide ? item.detail().length() : 0);
            double width = (letters * LETTER_EM + MARGIN_EM) * em;
            int row = wide ? 0 : (run + 1) % 2;
            wishes.add(new Place(row, wide, text, column.centre() - width / 2.0, width));
        }
        return wishes;
    }

    private static Place placed(List<Place> wishes, int i, LinkLayout layout) {
        Place wish = wishes.get(i);
        double left = 0.0;
        double right = layout.width();
        for (int row = 0; row < 2; row++) {
            if (wish.in(row)) {
                left = Math.max(left, border(wishes, layout, i, -1, row));
                right = Math.min(right, border(wishes, layout, i, 1, row));
            }
        }
        double width = Math.min(wish.width(), right - left);
        double x = Math.max(left, Math.min(wish.x(), right - width));
        return new Place(wish.row(), wish.both(), wish.text(), x, width);
    }

    /** How far a text may reach towards its next neighbour in a row: the space is shared by their lengths. */
    private static double border(List<Place> wishes, LinkLayout layout, int i, int step, int row) {
        for (int j = i + step; j >= 0 && j < wishes.size(); j += step) {
            if (wishes.get(j).in(row)) {
                double here = layout.columns().get(i).centre();
                double there = layout.columns().get(j).centre();
                double mine = wishes.get(i).width();
                return here + (there - here) * mine / (mine + wishes.get(j).width());
            }
        }
        return step < 0 ? 0.0 : layout.width();
    }
}
