package binspan.planner.plot;

import java.util.ArrayList;
import java.util.List;
import org.jfree.data.Range;

/**
 * Where the ticks of an axis stand and what they say: steps of 1, 2 or 5 on a linear axis and, where three fit, on a
 * logarithmic one of less than a decade; 1, 2, 5 up to two decades; powers of ten beyond.
 */
public final class Ticks {
    private static final double DECADE = 1.0;
    private static final double FEW_DECADES = 2.0;
    private static final double SLACK = 1e-9;
    private static final double LARGEST_PLAIN = 1e6;
    private static final double SMALLEST_PLAIN = 1e-3;
    private static final int DIGITS = 6;
    private static final int SUBDIVISIONS = 9;
    private static final int MOST_TICKS = 200;
    private static final int FEWEST_LABELS = 3;
    private static final double FEW_PER_DECADE = 3.0;

    private final Axis axis;
    private final Range positions;
    private final double shortestStep;
    private final List<Tick> ticks = new ArrayList<>();

    private Ticks(Axis axis, Range positions, int most) {
        this.axis = axis;
        this.positions = positions;
        this.shortestStep = positions.getLength() / Math.max(1, most);
    }

    /**
     * One tick.
     *
     * @param position where
     * @param label its words; empty for a minor tick
     */
    public record Tick(double position, String label) {}

    /**
     * A tick of an axis that is drawn elsewhere.
     *
     * @param value where, in the unit of the axis
     * @param share the same as a share of the way along the axis, 0 to 1
     * @param label its words; empty for a minor tick
     */
    public record Placed(double value, double share, String label) {}

    /**
     * The ticks of an axis that is drawn elsewhere.
     *
     * @param from value at its beginning; above 0 where it is logarithmic
     * @param to value at its end, above that at its beginning
     * @param logarithmic whether equal ratios are equally far apart
     * @param most how many labels it has at most, at least 1
     * @throws IllegalArgumentException if the ends are not in order, not finite or not positive on a logarithmic axis, or if there
     *     shall be no label
     */
    public static List<Placed> of(double from, double to, boolean logarithmic, int most) {
        if (!(from < to)) {
            throw new IllegalArgumentException("found an axis from " + from + " to " + to);
        }
        if (most < 1) {
            throw new IllegalArgumentException("found " + most + " labels; allowed at least 1");
        }
        Axis axis = new Axis("", "", logarithmic, from, to);
        Range positions = new Range(axis.position(from), axis.position(to));
        List<Tick> ticks = of(axis, positions, most);
        for (int fewer = most - 1; fewer > 0 && labels(ticks) > most; fewer--) {
            ticks = of(axis, positions, fewer);
        }
        for (int more = most + 1; labels(ticks) == 0; more++) {
            ticks = of(axis, positions, more);
        }
        int keep = (labels(ticks) + most - 1) / most;
        List<Placed> placed = new ArrayList<>();
        int labelled = 0;
        for (Tick tick : ticks) {
            boolean shown = !tick.label().isEmpty() && labelled++ % keep == 0;
            double share = (tick.position() - positions.getLowerBound()) / positions.getLength();
            placed.add(new Placed(
                    axis.value(tick.position()), Math.max(0.0, Math.min(1.0, share)), shown ? tick.label() : ""));
        }
        return placed;
    }

    private static int labels(List<Tick> ticks) {
        return (int) ticks.stream().filter(tick -> !tick.label().isEmpty()).count();
    }

    /** The ticks between two positions, so that at most so many labels would fill the axis. */
    public static List<Tick> of(Axis axis, Range positions, int most) {
        Ticks made = new Ticks(axis, positions, most);
        if (!axis.logarithmic()) {
            made.linear(positions.getLowerBound(), positions.getUpperBound(), niceStep(made.shortestStep));
        } else if (positions.getLength() < DECADE) {
            made.withinDecade();
        } else if (positions.getLength() <= FEW_DECADES && most >= FEW_PER_DECADE * positions.getLength()) {
            made.decades(1, true);
        } else {
            made.decades((int) Math.ceil(made.shortestStep - SLACK), false);
        }
        return made.ticks;
    }

    /** The smallest of 1, 2, 5 times a power of ten that is not below a number. */
    public static double niceStep(double least) {
        double power = Math.pow(10.0, Math.floor(Math.log10(least) + SLACK));
        double share = least / power;
        return power * (share <= 1.0 + SLACK ? 1.0 : share <= 2.0 + SLACK ? 2.0 : share <= 5.0 + SLACK ? 5.0 : 10.0);
    }

    private void linear(double from, double to, double step) {
        long first = (long) Math.ceil(from / step - SLACK);
        long last = Math.min(first + MOST_TICKS, (long) Math.floor(to / step + SLACK));
        double largest = Math.max(Math.abs(from), Math.abs(to));
        for (long i = first; i <= last; i++) {
            ticks.add(new Tick(axis.position(i * step), plain(i * step, step, largest)));
        }
    }

    private static String plain(double value, double step, double largest) {
        boolean plain = value == 0.0 || (largest < LARGEST_PLAIN && largest >= SMALLEST_PLAIN);
        int places = (int) Math.max(0.0, -Math.floor(Math.log10(step) + SLACK));
        return plain ? NumberText.decimals(value, value == 0.0 ? 0 : places) : NumberText.shortest(value, DIGITS);
    }

    /** Even steps of the value; at the upper end, where they are closest, as far apart as wanted. */
    private void withinDecade() {
        double upper = axis.value(positions.getUpperBound());
        double share = 1.0 - Math.pow(10.0, -shortestStep);
        linear(axis.value(positions.getLowerBound()), upper, niceStep(upper * share));
        if (ticks.size() < FEWEST_LABELS) {
            ticks.clear();
            decades(1, true);
        }
    }

    private void decades(int every, boolean between) {
        int first = (int) Math.floor(positions.getLowerBound() - SLACK);
        int last = (int) Math.ceil(positions.getUpperBound() + SLACK);
        for (int exponent = first; exponent <= last; exponent++) {
            boolean labelled = Math.floorMod(exponent, every) == 0;
            add(exponent, labelled ? between ? small(1, exponent) : NumberText.powerOfTen(exponent) : "");
            for (int i = 2; every == 1 && i <= SUBDIVISIONS; i++) {
                add(exponent + Math.log10(i), between && (i == 2 || i == 5) ? small(i, exponent) : "");
            }
        }
    }

    private static String small(int figure, int exponent) {
        return NumberText.shortest(Double.parseDouble(figure + "e" + exponent), DIGITS);
    }

    private void add(double position, String label) {
        double slack = SLACK * positions.getLength();
        if (position >= positions.getLowerBound() - slack && position <= positions.getUpperBound() + slack) {
            ticks.add(new Tick(position, label));
        }
    }
}
