package binspan.merit;

/**
 * Key length by the bound of Lim, Xu, Pan and Ekert (2021) at the best split of its failure probability, see {@link FiniteKeyBound#LIM_2021}.
 *
 * <p>The best split is found by repeating {@link LimDeviation#better()} from the least deviation on. Deviations depend on a split through the square
 * root of a logarithm, so that the error of the split falls tenfold or more with each step; the key length, being stationary, has its square.
 * Where that falls out of the range of deviations, it is repeated with the tails settled before each step: the deviation then widens from the least
 * and cannot pass the best.
 *
 * @param terms the block
 * @param split the best split
 * @param bits key length, not rounded; 0 or less means no key, negative infinity if no deviation below 1/2 is safe
 * @param growth its derivative with respect to the logarithm of the uptime; NaN where no deviation leaves a key
 */
record LimKey(BlockTerms terms, LimSplit split, double bits, double growth) implements GrowingKey {
    private static final double TOLERANCE = 1e-5;
    private static final double NEGLIGIBLE = 1e-9;
    private static final double ANY = Double.POSITIVE_INFINITY;
    private static final int MOST_STEPS = 1000;

    static LimKey of(BlockTerms terms) {
        return from(LimSplit.LEAST_DEVIATION, terms);
    }

    @Override
    public LimKey times(double factor) {
        return from(split, terms.times(factor));
    }

    private static LimKey from(LimSplit start, BlockTerms terms) {
        if (!(terms.widestDeviation() > 0.0)) {
            return none(terms);
        }
        LimDeviation found = settled(terms, start, ANY);
        if (fallen(found)) {
            found = settled(terms, LimSplit.LEAST_DEVIATION, TOLERANCE);
        }
        if (!found.leavesKey()) {
            return fallen(found) ? widest(terms) : none(terms);
        }
        return orWidest(new LimKey(terms, found.split(), found.bits(), found.growth()));
    }

    /** The deviation at which the split stays, or the first that leaves no key because the split left too little to sampling. */
    private static LimDeviation settled(BlockTerms terms, LimSplit start, double tailTolerance) {
        LimDeviation deviation = new LimDeviation(terms, start);
        boolean settled = false;
        for (int i = 0; i < MOST_STEPS && !settled && !fallen(deviation); i++) {
            LimSplit next = deviation.better(tailTolerance);
            settled = next.near(deviation.split(), TOLERANCE);
            deviation = new LimDeviation(terms, next);
        }
        return deviation;
    }

    private static boolean fallen(LimDeviation deviation) {
        return !deviation.leavesKey() && !deviation.split().spendsAll();
    }

    private static LimKey none(BlockTerms terms) {
        return new LimKey(terms, LimSplit.LEAST_DEVIATION, Double.NEGATIVE_INFINITY, Double.NaN);
    }

    /** Where the best deviation leaves less than no key, the widest may be better. */
    private static LimKey orWidest(LimKey best) {
        if (best.bits() >= LimDeviation.bitsAtHalf(best.terms(), 0.0)) {
            return best;
        }
        LimKey widest = widest(best.terms());
        return widest.bits() > best.bits() ? widest : best;
    }

    /** With the widest deviation, which is best where the key would lengthen with the deviation all the way. */
    private static LimKey widest(BlockTerms terms) {
        LimSplit split = LimSplit.LEAST_DEVIATION;
        boolean settled = false;
        for (int i = 0; i < MOST_STEPS && !settled && split.spentOdds() > NEGLIGIBLE; i++) {
            LimSplit next = new LimDeviation(terms, split).towards(terms.widestDeviation());
            settled = next.near(split, TOLERANCE);
            split = next;
        }
        double bits = LimDeviation.bitsAtHalf(terms, split.lnLeft());
        return new LimKey(terms, LimSplit.LEAST_DEVIATION, bits, Double.NaN);
    }
}
