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

    /** The share of the pairs whose photon clicks inside alice's window and in each of bob's bins, both about each photon's own mean arrival. */
    double[] binned(PortTiming a, PortTiming b, Window windowA, TimeBins binsB) {
        if (boxed != null) {
            return boxed.binned(a, b, windowA, binsB);
        }
        double sigmaA = Math.sqrt(arrival.pairA() + a.variance());
        double sigmaB = Math.sqrt(arrival.pairB() + b.variance());
        double correlation = arrival.pairCovariance() / (sigmaA * sigmaB);
        if (a.capture(windowA.from(), windowA.to(), sigmaA) == 0.0) {
            return new double[binsB.count()];
        }
        if (a.tailed() || b.tailed()) {
            return tailed(a, b, windowA, binsB, new Factors(sigmaA, sigmaB, correlation));
        }
        double fromA = windowA.from() / sigmaA;
        double toA = windowA.to() / sigmaA;
        return BinnedCaptures.each(
                binsB,
                sigmaB,
                b,
                (from, to) -> BivariateNormal.rectangle(fromA, toA, from / sigmaB, to / sigmaB, correlation));
    }

    /** Two correlated arrivals as a common factor and what each has of its own. */
    private record Factors(double sigmaA, double sigmaB, double correlation) {
        double shared() {
            return Math.min(STRONGEST_WITH_TAILS, Math.abs(correlation));
        }

        /** Step of the trapezoidal rule over the common factor. */
        double step() {
            double r = shared();
            return 0.75 / Math.sqrt(1.0 + 2.0 * r / (1.0 - r));
        }
    }

    /** The same rule as for one window, bob's photons laid down at their mean arrivals for each value of the common factor. */
    private static double[] tailed(PortTiming a, PortTiming b, Window windowA, TimeBins binsB, Factors factors) {
        double common = Math.sqrt(factors.shared());
        double own = Math.sqrt(1.0 - factors.shared());
        double reach = REACH * common * factors.sigmaB();
        ArrivalDeposit deposit = new ArrivalDeposit(b, own * factors.sigmaB(), binsB, -reach, reach);
        double step = factors.step();
        for (int i = (int) (-REACH / step); i * step <= REACH; i++) {
            double z = i * step;
            double shiftA = common * factors.sigmaA() * z;
            double captured = a.capture(windowA.from() - shiftA, windowA.to() - shiftA, own * factors.sigmaA());
            double shiftB = Math.signum(factors.correlation()) * common * factors.sigmaB() * z;
            deposit.put(shiftB, captured * Math.exp(-z * z / 2.0) * step / SQRT_TWO_PI);
        }
        return deposit.binned();
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
