package binspan.planner.viewmodel;

import binspan.scenario.Field;
import binspan.scenario.Range;
import binspan.units.Digits;
import java.util.Map;
import java.util.Optional;

/**
 * The stretch of values that a slider covers: what one tries by hand around a value. All that is allowed can still be
 * typed.
 *
 * @param lowest value at the left end
 * @param highest value at the right end
 * @param logarithmic whether equal ways are equal factors
 * @param whole whether only whole numbers are meant
 */
public record SliderScale(double lowest, double highest, boolean logarithmic, boolean whole) {
    private static final double FACTOR = 4.0;
    private static final double FAR = 0.3;
    private static final double TOO_WIDE = 4.0;
    private static final double SMALL_SHARE = 0.05;
    private static final double BAND_SHARE = 0.02;
    private static final int DIGITS = 3;
    private static final int BAND_DIGITS = 6;
    private static final Map<String, Double> USUAL =
            Map.of("ps", 100.0, "dB", 5.0, "rad", 0.5, "K", 1.0, "mK", 20.0, "MHz", 20.0, "1/s", 1000.0, "dBm", 10.0);

    /**
     * The scale around a value.
     *
     * @param field what the number is
     * @param value its present value
     * @return absent for what is no number or has no room to move
     */
    static Optional<SliderScale> around(Field field, double value) {
        Range range = field.range();
        boolean whole = field.kind() == Field.Kind.COUNT;
        if (!(range.lowest() < range.highest()) || !Double.isFinite(value)) {
            return Optional.empty();
        }
        if (isCarrier(field)) {
            double width = BAND_SHARE * value;
            return Optional.of(
                    new SliderScale(inside(range, value - width), inside(range, value + width), false, false));
        }
        if (range.lowest() < 0.0) {
            double reach = Math.max(2.0 * Math.abs(value), usual(field));
            return Optional.of(new SliderScale(inside(range, -reach), inside(range, reach), false, whole));
        }
        return Optional.of(value == 0.0 ? fromNothing(field, range, whole) : positive(range, value, whole));
    }

    private static boolean isCarrier(Field field) {
        return field.name().equals("wavelengthNm") || field.name().equals("frequencyTHz");
    }

    private static double usual(Field field) {
        return USUAL.getOrDefault(field.unit(), 1.0);
    }

    private static SliderScale fromNothing(Field field, Range range, boolean whole) {
        return new SliderScale(range.lowest(), inside(range, usual(field)), false, whole);
    }

    private static SliderScale positive(Range range, double value, boolean whole) {
        boolean share = range.highest() <= 1.0 && value >= SMALL_SHARE * range.highest();
        if (share) {
            return new SliderScale(range.lowest(), range.highest(), false, whole);
        }
        double low = whole ? Math.floor(value / FACTOR) : value / FACTOR;
        double high = whole ? Math.ceil(value * FACTOR) : value * FACTOR;
        double lowest = inside(range, low);
        return new SliderScale(lowest, inside(range, high), lowest > 0.0, whole);
    }

    private static double inside(Range range, double end) {
        return Math.max(range.lowest(), Math.min(range.highest(), end));
    }

    /** Whether a value lies on the scale. */
    public boolean covers(double value) {
        return value >= lowest && value <= highest;
    }

    /** Whether a value can go on being moved on this scale although another one would be chosen for it. */
    boolean serves(double value, SliderScale fresh) {
        boolean near = Math.abs(position(value) - fresh.position(value)) <= FAR;
        return covers(value) && near && highest - lowest <= TOO_WIDE * (fresh.highest - fresh.lowest);
    }

    /** Where a value stands, 0 at the left end to 1 at the right. */
    public double position(double value) {
        double held = Math.max(lowest, Math.min(highest, value));
        return logarithmic
                ? Math.log(held / lowest) / Math.log(highest / lowest)
                : (held - lowest) / (highest - lowest);
    }

    /** The value at a position, rounded to what a hand can mean, never beyond the ends. */
    public double value(double position) {
        double share = Math.max(0.0, Math.min(1.0, position));
        double exact = logarithmic ? lowest * Math.pow(highest / lowest, share) : lowest + share * (highest - lowest);
        double rounded = whole ? Math.rint(exact) : rounded(exact);
        return Math.max(lowest, Math.min(highest, rounded));
    }

    /** Three digits; as many as show a step of a hundredth where the scale is a narrow band far from 0. */
    private double rounded(double exact) {
        boolean narrow = highest - lowest < SMALL_SHARE * Math.abs(highest);
        double step = logarithmic || narrow ? 0.0 : Math.pow(10.0, Math.floor(Math.log10((highest - lowest) / 200.0)));
        double digits = Double.parseDouble(Digits.shortest(exact, narrow ? BAND_DIGITS : DIGITS));
        return step > 0.0 ? Double.parseDouble(Digits.shortest(Math.rint(exact / step) * step, BAND_DIGITS)) : digits;
    }
}
