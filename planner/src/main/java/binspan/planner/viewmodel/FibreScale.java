package binspan.planner.viewmodel;

import binspan.planner.viewmodel.LinkItem.Kind;
import java.util.Arrays;

/**
 * The scale of the drawn fibre: as many pixels per kilometre as fill the room, spans that would be shorter than the
 * least width are drawn at it.
 *
 * @param pxPerKm the scale, 0 without fibre
 * @param leastPx least width of a span, px
 */
record FibreScale(double pxPerKm, double leastPx) {
    private static final double[] ROUND = {5.0, 2.0, 1.0};
    private static final double TEN = 10.0;

    /**
     * The scale for a room.
     *
     * @param kinds the columns
     * @param km their lengths, km
     * @param room what the fibre may fill, px
     * @param leastPx least width of a span, px
     */
    static FibreScale of(Kind[] kinds, double[] km, double room, double leastPx) {
        int spans = (int) Arrays.stream(kinds).filter(Kind.FIBRE::equals).count();
        double[] longestFirst =
                Arrays.stream(km).filter(length -> length > 0.0).sorted().toArray();
        double drawn = 0.0;
        double scale = 0.0;
        for (int i = longestFirst.length - 1; i >= 0; i--) {
            drawn += longestFirst[i];
            int scaled = longestFirst.length - i;
            double left = room - (spans - scaled) * leastPx;
            double next = left / drawn;
            if (next * longestFirst[i] < leastPx) {
                break;
            }
            scale = next;
        }
        double longest = longestFirst.length == 0 ? 0.0 : longestFirst[longestFirst.length - 1];
        return new FibreScale(scale > 0.0 || longest == 0.0 ? scale : leastPx / longest, leastPx);
    }

    /** Width of a span, px. */
    double width(double km) {
        return Math.max(leastPx, km * pxPerKm);
    }

    /** Whether a span is as wide as the scale says. */
    boolean toScale(double km) {
        return km > 0.0 && km * pxPerKm >= leastPx * (1.0 - 1e-9);
    }

    /** The longest round length that is drawn at most so wide, km; 0 without a scale. */
    double bar(double widestPx) {
        if (!(pxPerKm > 0.0)) {
            return 0.0;
        }
        double most = widestPx / pxPerKm;
        double power = Math.pow(TEN, Math.floor(Math.log10(most)));
        for (double round : ROUND) {
            if (round * power <= most) {
                return round * power;
            }
        }
        return power;
    }
}
