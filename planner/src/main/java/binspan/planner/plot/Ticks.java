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
    static double niceStep(double least) {
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
