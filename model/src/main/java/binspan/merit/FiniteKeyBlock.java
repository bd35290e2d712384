package binspan.merit;

/**
 * What a finite key is made from.
 *
 * @param keyBits n, sifted bits kept for the key
 * @param testBits k, disclosed bits of the other basis
 * @param bitError error rate of the key bits
 * @param phaseError error rate of the test bits as the phase error of the key
 * @param efficiency error-correction efficiency f
 * @param secrecy failure probability of secrecy
 * @param correctness failure probability of correctness
 */
public record FiniteKeyBlock(
        double keyBits,
        double testBits,
        double bitError,
        double phaseError,
        double efficiency,
        double secrecy,
        double correctness) {

    /** The same block, collected for a time longer by a factor. */
    FiniteKeyBlock times(double factor) {
        return new FiniteKeyBlock(
                keyBits * factor, testBits * factor, bitError, phaseError, efficiency, secrecy, correctness);
    }

    /** Bits disclosed by error correction, f h(e) n. */
    double leaked() {
        return leakedPerBit() * keyBits;
    }

    /** The same per key bit. */
    double leakedPerBit() {
        return efficiency * SecretKey.binaryEntropy(bitError);
    }
}
