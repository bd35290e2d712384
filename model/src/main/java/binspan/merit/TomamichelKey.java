package binspan.merit;

/**
 * Key length by the bound of Tomamichel, Lim, Gisin and Renner (2012), see {@link FiniteKeyBound#TOMAMICHEL_2012}.
 *
 * @param terms the block
 * @param bits key length, not rounded; 0 or less means no key
 * @param growth its derivative with respect to the logarithm of the uptime: n(1 - h(Q + mu)) - leak - n h'(Q + mu) d mu/d ln t
 */
record TomamichelKey(BlockTerms terms, double bits, double growth) implements GrowingKey {
    private static final double LN_2 = Math.log(2.0);
    private static final double LN_4 = 2.0 * LN_2;

    static TomamichelKey of(BlockTerms terms) {
        double n = terms.keyBits();
        double k = terms.testBits();
        double deviation = Math.sqrt((n + k) / (n * k) * (k + 1.0) / k * (LN_4 - terms.lnSecrecy()));
        double narrowing = -deviation * (1.0 - 0.5 * k / (k + 1.0));
        double error = Math.min(0.5, terms.phaseError() + deviation);
        double kept = n * (1.0 - SecretKey.binaryEntropy(error) - terms.leakedPerBit());
        double security = 1.0 - (2.0 * terms.lnSecrecy() + terms.lnCorrectness()) / LN_2;
        double steepness = Math.log((1.0 - error) / error) / LN_2;
        return new TomamichelKey(terms, kept - security, kept - n * steepness * narrowing);
    }

    @Override
    public TomamichelKey times(double factor) {
        return of(terms.times(factor));
    }
}
