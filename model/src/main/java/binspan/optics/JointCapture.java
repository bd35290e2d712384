package binspan.optics;

/**
 * Probability that both photons of a pulsed pair are captured, each in its own window. The two arrivals are correlated through the joint spectrum, so
 * this is not the product of the two captures.
 */
final class JointCapture {
    private static final double REACH = 8.5;
    private static final double STRONGEST_WITH_TAILS = 1.0 - 1e-5;
    private static final double SQRT_TWO_PI = Math.sqrt(2.0 * Math.PI);

    private final ArrivalTime arrival;
    private final BoxedCapture boxed;

    JointCapture(PairSpectrum spectrum, double betaA, double betaB) {
        this.arrival = ArrivalTime.of(spectrum, betaA, betaB);
        this.boxed = spectrum.gaussian() ? null : new BoxedCapture(spectrum, betaA, betaB);
    }

    /** Spread of the light. */
    ArrivalTime arrival() {
        return arrival;
    }

    /** The captured share of the pairs, the windows about each photon's own mean arrival. */
    double of(PortTiming a, PortTiming b, Window windowA, Window windowB) {
        if (boxed != null) {
            return boxed.of(a, b, windowA, windowB);
        }
        double sigmaA = Math.sqrt(arrival.pairA() + a.variance());
        double sigmaB = Math.sqrt(arrival.pairB() + b.variance());
        double correlation = arrival.pairCovariance() / (sigmaA * sigmaB);
        if (a.tailed() || b.tailed()) {
            return tailed(a, b, windowA, windowB, sigmaA, sigmaB, correlation);
        }
        return BivariateNormal.rectangle(
                windowA.from() / sigmaA,
                windowA.to() / sigmaA,
                windowB.from() / sigmaB,
                windowB.to() / sigmaB,
                correlation);
    }

    /**
     * One common factor: t_X = g_X z + e_X with z standard normal and e_X independent, tails included; the trapezoidal rule over z converges
     * exponentially, its step set by the smoothing that e_X gives.
     */
    private static double tailed(
            PortTiming a,
            PortTiming b,
            Window windowA,
            Window windowB,
            double sigmaA,
            double sigmaB,
            double correlation) {
        double r = Math.min(STRONGEST_WITH_TAILS, Math.abs(correlation));
        double common = Math.sqrt(r);
        double own = Math.sqrt(1.0 - r);
        double step = 0.75 / Math.sqrt(1.0 + 2.0 * r / (1.0 - r));
        double sum = 0.0;
        for (int i = (int) (-REACH / step); i * step <= REACH; i++) {
            double z = i * step;
            double shiftA = common * sigmaA * z;
            double shiftB = Math.signum(correlation) * common * sigmaB * z;
            sum += Math.exp(-z * z / 2.0)
                    * a.capture(windowA.from() - shiftA, windowA.to() - shiftA, own * sigmaA)
                    * b.capture(windowB.from() - shiftB, windowB.to() - shiftB, own * sigmaB);
        }
        return sum * step / SQRT_TWO_PI;
    }
}
