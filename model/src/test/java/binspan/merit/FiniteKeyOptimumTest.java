package binspan.merit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.SplittableRandom;
import java.util.function.Function;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** The finite key at the best split of its failure probability against a plain search of all splits, over the whole range of blocks. */
final class FiniteKeyOptimumTest {
    private static final int BLOCKS = 2000;
    private static final double RELATIVE = 1e-6;
    private static final double BITS = 1e-3;
    private static final double STEP = 1e-4;

    @Test
    void anyBlockHasTheKeyOfThePlainSearch() {
        assertAll(blocks(random -> block(random, 0.5 * random.nextDouble(), 0.5 * random.nextDouble())));
    }

    @Test
    void blocksOfGoodLinksHaveTheKeyOfThePlainSearch() {
        List<FiniteKeyBlock> blocks = blocks(random -> block(random, upTo(0.1, random), upTo(0.1, random)));
        assertThat(blocks)
                .filteredOn(block -> FiniteKeyBound.LIM_2021.bits(block) > 1.0)
                .hasSizeGreaterThan(BLOCKS / 4);
        assertAll(blocks);
    }

    /** Here the key as a function of the deviation can have two peaks, or none but at the widest. */
    @Test
    void tinyBlocksHaveTheKeyOfThePlainSearch() {
        assertAll(blocks(random -> new FiniteKeyBlock(
                between(50.0, 5000.0, random),
                between(1.0, 1e4, random),
                0.0,
                0.3 * random.nextDouble(),
                1.0,
                between(1e-3, 0.1, random),
                0.1)));
    }

    /** Here the peak is low and narrow, next to the deviation that leaves no key. */
    @Test
    void narrowPeaksAreFound() {
        assertAll(List.of(
                new FiniteKeyBlock(41809.71286, 19.8514825, 0.0, 0.0, 1.0, 0.02208629, 0.1),
                new FiniteKeyBlock(15217.574966, 15.533003, 8.4e-8, 0.0, 1.0, 0.06661206, 0.1),
                new FiniteKeyBlock(2585629.36, 299.6540655, 0.0, 0.35217472, 1.0, 0.0043467971, 0.1)));
    }

    @Test
    void cornersHaveTheKeyOfThePlainSearch() {
        assertAll(Stream.of(50.0, 400.0, 1e6, 1e12)
                .flatMap(n -> Stream.of(1.0, 3.0, 40.0, 1e4, 1e12).flatMap(k -> corners(n, k)))
                .toList());
    }

    private static Stream<FiniteKeyBlock> corners(double n, double k) {
        return Stream.of(0.0, 1e-9, 0.03, 0.3, 0.499, 0.5, 0.7)
                .flatMap(phaseError -> Stream.of(0.0, 0.03, 0.5)
                        .flatMap(bitError -> Stream.of(1e-30, 1e-3, 0.1)
                                .map(secrecy ->
                                        new FiniteKeyBlock(n, k, bitError, phaseError, 1.16, secrecy, secrecy))));
    }

    @Test
    void growthIsTheSlopeOfTheKey() {
        none(blocks(random -> block(random, upTo(0.1, random), upTo(0.1, random))), block -> {
            for (FiniteKeyBound bound : FiniteKeyBound.values()) {
                GrowingKey key = bound.key(BlockTerms.of(block));
                double slope =
                        (key.times(1.0 + STEP).bits() - key.times(1.0 - STEP).bits()) / (2.0 * STEP);
                if (key.bits() > 1.0 && Math.abs(key.growth() - slope) > 1e-4 * slope) {
                    return bound + " grows by " + slope + ", not by " + key.growth();
                }
            }
            return "";
        });
    }

    /** The search from the best split of a shorter or longer uptime ends where that from the least deviation does. */
    @Test
    void keyFollowedToAnotherUptimeIsThatOfTheUptime() {
        none(blocks(random -> block(random, upTo(0.1, random), upTo(0.1, random))), block -> {
            LimKey key = LimKey.of(BlockTerms.of(block));
            StringBuilder wrong = new StringBuilder();
            for (double factor : new double[] {1e-3, 0.1, 0.5, 2.0, 100.0}) {
                wrong.append(different(key.times(factor).bits(), FiniteKeyBound.LIM_2021.bits(block.times(factor))));
            }
            return wrong.toString();
        });
    }

    @Test
    void firstBitOfThePlainSearchComesAtTheTimeFound() {
        List<FiniteKeyBlock> links = blocks(random -> link(random));
        assertThat(links)
                .filteredOn(link -> Double.isFinite(new FiniteKey(link).secondsToFirstBit()))
                .hasSizeGreaterThan(BLOCKS / 2);
        none(links, FiniteKeyOptimumTest::wrongTime);
    }

    private static String wrongTime(FiniteKeyBlock link) {
        FiniteKey key = new FiniteKey(link);
        double seconds = key.secondsToFirstBit();
        if (!Double.isFinite(seconds)) {
            double fraction = SecretKey.secretFraction(link.bitError(), link.phaseError(), link.efficiency());
            return fraction > 0.0 ? "never a key" : "";
        }
        for (double share : new double[] {1.0 - RELATIVE, 0.9, 0.5, 0.1, 0.01}) {
            if (plain(link.times(seconds * share)) >= 1.0 || key.marginPerKeyBit(seconds * share) >= 0.0) {
                return "a key by " + share + " of " + seconds;
            }
        }
        double later = seconds * (1.0 + RELATIVE);
        return plain(link.times(later)) >= 1.0 && key.marginPerKeyBit(later) >= 0.0 ? "" : "no key by " + seconds;
    }

    /** Fewer than 50 bits or one test bit count as no key. */
    private static double plain(FiniteKeyBlock block) {
        return block.keyBits() < 50.0 || block.testBits() < 1.0
                ? Double.NEGATIVE_INFINITY
                : PlainFiniteKey.longest(block);
    }

    private static void assertAll(List<FiniteKeyBlock> blocks) {
        none(blocks, block -> {
            String wrong = different(FiniteKeyBound.LIM_2021.bits(block), PlainFiniteKey.lim(block));
            return wrong + different(FiniteKeyBound.TOMAMICHEL_2012.bits(block), PlainFiniteKey.tomamichel(block));
        });
    }

    private static String different(double found, double searched) {
        boolean same = found == searched || Math.abs(found - searched) <= Math.max(BITS, RELATIVE * Math.abs(searched));
        return same ? "" : found + " instead of " + searched + " bits ";
    }

    /** Asserts that nothing is wrong with any block, on all processors. */
    private static void none(List<FiniteKeyBlock> blocks, Function<FiniteKeyBlock, String> complaint) {
        assertThat(blocks.parallelStream()
                        .map(block -> block + ": " + complaint.apply(block))
                        .filter(text -> !text.endsWith(": "))
                        .toList())
                .as("complaints")
                .isEmpty();
    }

    private static List<FiniteKeyBlock> blocks(Function<SplittableRandom, FiniteKeyBlock> draw) {
        SplittableRandom random = new SplittableRandom(17L);
        return IntStream.range(0, BLOCKS).mapToObj(i -> draw.apply(random)).toList();
    }

    private static FiniteKeyBlock block(SplittableRandom random, double bitError, double phaseError) {
        return new FiniteKeyBlock(
                between(50.0, 1e12, random),
                between(1.0, 1e12, random),
                bitError,
                phaseError,
                1.0 + random.nextDouble(),
                between(1e-30, 1e-3, random),
                between(1e-30, 1e-3, random));
    }

    /** What a link collects in a second. */
    private static FiniteKeyBlock link(SplittableRandom random) {
        double keyBits = between(1e-3, 1e8, random);
        return new FiniteKeyBlock(
                keyBits,
                keyBits * between(1e-3, 1e3, random),
                upTo(0.1, random),
                upTo(0.1, random),
                1.0 + 0.5 * random.nextDouble(),
                between(1e-30, 0.1, random),
                between(1e-30, 0.1, random));
    }

    /** An error rate of any order of magnitude, one in ten being 0. */
    private static double upTo(double largest, SplittableRandom random) {
        return random.nextInt(10) == 0 ? 0.0 : between(1e-7, largest, random);
    }

    private static double between(double least, double most, SplittableRandom random) {
        return least * Math.pow(most / least, random.nextDouble());
    }
}
