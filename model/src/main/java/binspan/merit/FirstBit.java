package binspan.merit;

/**
 * The uptime at which the key of a link reaches its first bit: Newton's method for the key length per key bit, which is nearly linear in
 * uptime^(-1/2) as the deviations are, inside a bracket that is halved where a step would leave it. A key that has reached a bit grows on, so that
 * there is one such uptime for each bound.
 *
 * @param perSecond what one second of uptime collects
 */
record FirstBit(BlockTerms perSecond) {
    private static final double LN_2 = Math.log(2.0);
    private static final double TOLERANCE = 1e-7;
    private static final double CLEAR_OF_HALF = 0.45;
    private static final double STRIDE = 4.0;
    private static final int MOST_NEWTON_STEPS = 40;
    private static final int MOST_STEPS = 100;

    /** Seconds of uptime until the longer of both bounds has a bit; infinite if it never has. */
    double uptime() {
        if (!(perSecond.endlessFraction() > 0.0 && perSecond.keyBits() > 0.0 && perSecond.testBits() > 0.0)) {
            return Double.POSITIVE_INFINITY;
        }
        double guess = Math.max(guess(), perSecond.factorToEnough());
        if (!(guess < Double.POSITIVE_INFINITY)) {
            return Double.POSITIVE_INFINITY;
        }
        double sharp = search(LimKey.of(perSecond.times(guess)), guess, Double.POSITIVE_INFINITY);
        TomamichelKey other = TomamichelKey.of(perSecond.times(sharp));
        return other.bits() >= 1.0 ? search(other, sharp, sharp) : sharp;
    }

    /** The uptime at which the key of one bound has its first bit, by the latest uptime if that is known to be enough. */
    private double search(GrowingKey start, double uptime, double latest) {
        GrowingKey key = start;
        double now = uptime;
        double from = perSecond.factorToEnough();
        double to = latest;
        for (int i = 0; i < MOST_STEPS; i++) {
            from = key.bits() >= 1.0 ? from : now;
            to = key.bits() >= 1.0 ? now : to;
            double next = i < MOST_NEWTON_STEPS ? newton(key, now) : Double.NaN;
            if (!(near(next, now) || (next > from && next < to))) {
                next = to < Double.POSITIVE_INFINITY ? Math.sqrt(from * to) : from * STRIDE;
            }
            if (near(next, now)) {
                return next;
            }
            key = key.times(next / now);
            now = next;
        }
        return to;
    }

    /** A step in uptime^(-1/2) for the key length beyond a bit, per key bit. */
    private static double newton(GrowingKey key, double uptime) {
        double excess = key.bits() - 1.0;
        double factor = 1.0 + excess / (2.0 * (key.growth() - excess));
        return factor > 0.0 ? uptime / (factor * factor) : Double.NaN;
    }

    private static boolean near(double a, double b) {
        return Math.abs(a - b) <= TOLERANCE * b;
    }

    /**
     * An uptime near that of the first bit: deviations of both tails of Lim et al. at the whole failure probability as narrow as the phase error that
     * the leak leaves room for, and the failure probabilities paid.
     */
    private double guess() {
        double n = perSecond.keyBits();
        double k = perSecond.testBits();
        double error = affordableError();
        double tails = Math.sqrt(n / ((n + k) * k)) + Math.sqrt((n + k) * error * (1.0 - error)) / n;
        double widest = error - perSecond.phaseError();
        double sampling = (LN_2 - perSecond.lnSecrecy()) * tails * tails / (widest * widest);
        double paid = -(2.0 * perSecond.lnSecrecy() + perSecond.lnCorrectness()) / LN_2;
        return sampling + paid / (n * perSecond.endlessFraction());
    }

    /** A little less than the phase error that error correction leaves room for, h(e) = 1 - f h(e_bit); the start is h(e) = (4 e (1 - e))^(3/4). */
    private double affordableError() {
        double entropy = 1.0 - perSecond.leakedPerBit();
        double product = entropy * Math.cbrt(entropy);
        double start = Math.min(CLEAR_OF_HALF, 0.5 * product / (1.0 + Math.sqrt(1.0 - product)));
        return Math.max(affordable(entropy, start), affordable(entropy, perSecond.phaseError()));
    }

    /** A step of Newton's method, which never passes the root as the entropy is concave. */
    private static double affordable(double entropy, double error) {
        return error + (entropy - SecretKey.binaryEntropy(error)) * LN_2 / Math.log((1.0 - error) / error);
    }
}
