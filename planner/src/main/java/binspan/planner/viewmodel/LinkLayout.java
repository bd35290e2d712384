package binspan.planner.viewmodel;

import binspan.planner.viewmodel.LinkItem.Kind;
import java.util.ArrayList;
import java.util.List;

/**
 * Where the drawn link stands: columns from left to right, the fibre to scale. Components are drawn as wide as they can
 * while the fibre keeps its share of the room; what is left goes to the fibre. Where even the least widths do not fit,
 * the drawing is wider than the room.
 *
 * @param columns the columns, side by side without gaps
 * @param width width of all, px
 * @param pxPerKm scale of the fibre, 0 without fibre
 * @param bar length of the scale bar, a round number of kilometres; 0 without fibre to scale
 */
public record LinkLayout(List<Column> columns, double width, double pxPerKm, double bar) {
    private static final double FIBRE_SHARE = 0.3;
    private static final double LONGEST_BAR_EM = 12.0;

    /** Copies the list. */
    public LinkLayout {
        columns = List.copyOf(columns);
    }

    /**
     * A column.
     *
     * @param items indices of the things in it, from top to bottom: one, or a site's ports
     * @param kind what they are
     * @param x left edge, px
     * @param width its width, px
     * @param toScale whether it is fibre as long as the scale says
     */
    public record Column(List<Integer> items, Kind kind, double x, double width, boolean toScale) {
        /** Copies the list. */
        public Column {
            items = List.copyOf(items);
        }

        /** Its middle, px. */
        public double centre() {
            return x + width / 2.0;
        }

        /** Its right edge, px. */
        public double right() {
            return x + width;
        }
    }

    /**
     * Lays a link out.
     *
     * @param items what is drawn, from left to right
     * @param room width to fill, px
     * @param em size of ordinary text, px
     */
    public static LinkLayout of(List<LinkItem> items, double room, double em) {
        List<List<Integer>> groups = groups(items);
        double[] km = new double[groups.size()];
        Kind[] kinds = new Kind[groups.size()];
        for (int i = 0; i < km.length; i++) {
            LinkItem first = items.get(groups.get(i).get(0));
            kinds[i] = first.kind();
            km[i] = first.lengthKm();
        }
        double[] widths = ColumnWidths.components(kinds, room, FIBRE_SHARE, em);
        double taken = sum(widths);
        FibreScale scale = FibreScale.of(kinds, km, Math.max(room - taken, 0.0), ColumnWidths.least(Kind.FIBRE) * em);
        List<Column> columns = new ArrayList<>();
        double x = 0.0;
        for (int i = 0; i < km.length; i++) {
            boolean fibre = kinds[i] == Kind.FIBRE;
            double width = fibre ? scale.width(km[i]) : widths[i];
            columns.add(new Column(groups.get(i), kinds[i], x, width, fibre && scale.toScale(km[i])));
            x += width;
        }
        return new LinkLayout(columns, x, scale.pxPerKm(), scale.bar(LONGEST_BAR_EM * em));
    }

    /** The column of a thing. */
    public Column of(int item) {
        return columns.stream()
                .filter(column -> column.items().contains(item))
                .findFirst()
                .orElseThrow();
    }

    /** A site's ports stand above one another, everything else has a column of its own. */
    private static List<List<Integer>> groups(List<LinkItem> items) {
        List<List<Integer>> groups = new ArrayList<>();
        for (int i = 0; i < items.size(); i++) {
            boolean port = items.get(i).kind() == Kind.PORT;
            if (port && i > 0 && items.get(i - 1).kind() == Kind.PORT) {
                groups.get(groups.size() - 1).add(i);
            } else {
                groups.add(new ArrayList<>(List.of(i)));
            }
        }
        return groups;
    }

    private static double sum(double[] widths) {
        double sum = 0.0;
        for (double width : widths) {
            sum += width;
        }
        return sum;
    }
}
