package binspan.merit;

/**
 * A finite block with its logarithms and its leak taken once, so that the bounds can look at many sizes of the same link cheaply.
 *
 * @param keyBits n, sifted bits kept for the key
 * @param testBits k, disclosed bits of the other basis
 * @param phaseError d, error rate of the test bits as the phase error of the key
 * @param leakedPerBit f h(e), bits disclosed by error correction per key bit
 * @param lnSecrecy natural logarithm of the failure probability of secrecy
 * @param lnCorrectness the same of correctness
 */
record BlockTerms(
        double keyBits,
        double testBits,
        double phaseError,
        double leakedPerBit,
        double lnSecrecy,
        double lnCorrectness) {

    private static final double FEWEST_KEY_BITS = 50.0;
    private static final double FEWEST_TEST_BITS = 1.0;

    static BlockTerms of(FiniteKeyBlock block) {
        return new BlockTerms(
                block.keyBits(),
                block.testBits(),
                block.phaseError(),
                block.leakedPerBit(),
                Math.log(block.secrecy()),
                Math.log(block.correctness()));
    }

    /** The same link after an uptime longer by a factor. */
    BlockTerms times(double factor) {
        return new BlockTerms(keyBits * factor, testBits * factor, phaseError, leakedPerBit, lnSecrecy, lnCorrectness);
    }

    /** Deviation at which the phase error reaches 1/2 and no key is left. */
    double widestDeviation() {
        return 0.5 - phaseError;
    }

    /** Secret bits per key bit of an endless block, 1 - h(d) - f h(e); negative above the threshold. */
    double endlessFraction() {
        return 1.0 - SecretKey.binaryEntropy(phaseError) - leakedPerBit;
    }

    /** Whether there are bits enough to look for a key. */
    boolean enough() {
        return keyBits >= FEWEST_KEY_BITS && testBits >= FEWEST_TEST_BITS;
    }

    /** How much longer the uptime would have to be for bits just enough. */
    double factorToEnough() {
        return Math.max(FEWEST_KEY_BITS / keyBits, FEWEST_TEST_BITS / testBits);
    }
}
