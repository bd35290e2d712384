package binspan.planner.viewmodel;

import binspan.planner.viewmodel.LinkItem.Kind;

/** How wide components are drawn. */
final class ColumnWidths {
    private ColumnWidths() {}

    /** Least width, em. */
    static double least(Kind kind) {
        return switch (kind) {
            case CLOCK, REPAIR, COUPLING -> 2.0;
            case LOSS, FILTER, COMPENSATOR, BAND -> 2.2;
            case PORT -> 2.6;
            case FIBRE -> 2.9;
            case ANALYZER -> 3.4;
            case SOURCE -> 4.6;
        };
    }

    /** Width at which its words are at ease, em. */
    private static double easy(Kind kind) {
        return switch (kind) {
            case CLOCK, BAND, REPAIR, COUPLING -> 4.2;
            case FIBRE -> 2.9;
            case LOSS -> 5.0;
            case FILTER, COMPENSATOR, ANALYZER, PORT -> 5.4;
            case SOURCE -> 6.6;
        };
    }

    /**
     * Widths of all columns that are not fibre, 0 for those that are: between the least and the easy width as the room
     * allows, equally far on the way; without fibre they fill the room.
     *
     * @param kinds the columns
     * @param room width of the drawing, px
     * @param fibreShare share of it that the fibre gets before components get more than their least width
     * @param em size of ordinary text, px
     */
    static double[] components(Kind[] kinds, double room, double fibreShare, double em) {
        double least = 0.0;
        double easy = 0.0;
        int fibres = 0;
        for (Kind kind : kinds) {
            if (kind == Kind.FIBRE) {
                fibres++;
            } else {
                least += least(kind) * em;
                easy += easy(kind) * em;
            }
        }
        double fibre = fibres == 0 ? 0.0 : Math.max(fibreShare * room, fibres * least(Kind.FIBRE) * em);
        double way = Math.max(0.0, (room - fibre - least) / (easy - least));
        return widths(kinds, fibres == 0 ? way : Math.min(1.0, way), em);
    }

    private static double[] widths(Kind[] kinds, double way, double em) {
        double[] widths = new double[kinds.length];
        for (int i = 0; i < kinds.length; i++) {
            double least = least(kinds[i]);
            widths[i] = kinds[i] == Kind.FIBRE ? 0.0 : (least + way * (easy(kinds[i]) - least)) * em;
        }
        return widths;
    }
}
