package binspan.prediction;

import binspan.scenario.Choice;
import binspan.scenario.Field;
import binspan.scenario.Range;
import binspan.scenario.Section;
import binspan.scenario.Values;
import java.util.List;
import java.util.SplittableRandom;

/**
 * One object of a scenario file whose fields are drawn at random.
 *
 * <p>A number comes from the everyday range given with it; with the probability {@code wildness} it comes from all that the registry allows instead,
 * spread over the orders of magnitude, with zeros and the ends of the range themselves.
 */
final class RandomObject {
    private static final double ORDERS_OF_MAGNITUDE = 14.0;
    private static final double EXACT_END = 0.15;
    private static final double WIDE = 5.0;

    private final Section section;
    private final Values values;
    private final SplittableRandom random;
    private final double wildness;

    RandomObject(Section section, String type, SplittableRandom random, double wildness) {
        this.section = section;
        this.values = new Values(type);
        this.random = random;
        this.wildness = wildness;
    }

    Values values() {
        return values;
    }

    /** An object in one of the fields of this one. */
    RandomObject child(String name) {
        return item(name, "");
    }

    /** An object of a type in one of the fields of this one, not yet put there. */
    RandomObject item(String name, String type) {
        return new RandomObject(field(name).content().section(type).orElseThrow(), type, random, wildness);
    }

    RandomObject put(String name, Object value) {
        values.put(name, value);
        return this;
    }

    /** Draws a number from an everyday range. */
    RandomObject number(String name, double low, double high) {
        boolean wild = chance(wildness);
        return put(name, wild ? anywhere(field(name).range()) : between(low, high));
    }

    /** Draws a number with a probability, and leaves the field out otherwise. */
    RandomObject perhaps(double probability, String name, double low, double high) {
        return chance(probability) ? number(name, low, high) : this;
    }

    /** Draws a whole number. */
    RandomObject count(String name, int low, int high) {
        return put(name, (double) random.nextInt(low, high + 1));
    }

    /** Draws one of the words that a field allows. */
    RandomObject word(String name) {
        return put(name, pick(field(name).choices()));
    }

    Choice pick(List<? extends Choice> words) {
        return words.get(random.nextInt(words.size()));
    }

    boolean chance(double probability) {
        return random.nextDouble() < probability;
    }

    int whole(int low, int high) {
        return random.nextInt(low, high + 1);
    }

    double between(double low, double high) {
        boolean wide = low > 0.0 && high > WIDE * low;
        return wide ? low * Math.pow(high / low, random.nextDouble()) : low + (high - low) * random.nextDouble();
    }

    private Field field(String name) {
        return section.field(name).orElseThrow();
    }

    private double anywhere(Range range) {
        double value = chance(EXACT_END) ? end(range) : inside(range);
        return range.contains(value) ? value : anywhere(range);
    }

    private double end(Range range) {
        return switch (random.nextInt(3)) {
            case 0 -> range.lowest();
            case 1 -> range.highest();
            default -> 0.0;
        };
    }

    private double inside(Range range) {
        if (range.lowest() > 0.0) {
            return between(range.lowest(), range.highest());
        }
        double magnitude = range.highest() * Math.pow(10.0, -ORDERS_OF_MAGNITUDE * random.nextDouble());
        return range.lowest() < 0.0 && random.nextBoolean() ? magnitude * range.lowest() / range.highest() : magnitude;
    }
}
