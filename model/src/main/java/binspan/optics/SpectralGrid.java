package binspan.optics;

/**
 * Quadrature points of the joint spectrum of a pair where a flat-top filter makes it other than Gaussian: detunings of both photons and
 * probabilities that sum to 1.
 *
 * <p>Pulsed, the density exp(-(W_A+W_B)^2/(2 s_P^2)) f_A(W_A) f_B(W_B) is integrated over the sum u = W_A + W_B within six rms of the pump, cut by
 * bob's filter, and over W_A in three panels so that the edges of the flat top are resolved. Continuous, u = 0.
 */
final class SpectralGrid {
    private static final double REACH = 6.5;

    /** Detuning of alice's photon, rad/s. */
    final double[] alice;

    /** Detuning of bob's photon, rad/s. */
    final double[] bob;

    /** Probability of each point. */
    final double[] probability;

    /** Integral of the density before it was normalised, (rad/s)^2; continuous: rad/s. */
    final double mass;

    private int filled;

    private SpectralGrid(Passband a, Passband b, double pumpRms, int ofAlice, int ofSum) {
        double reachA = reach(a, b, pumpRms);
        double[] edges = panels(reachA, pumpRms, ofAlice);
        GaussLegendre rule = GaussLegendre.sixteen();
        int inner = pumpRms > 0 ? rule.nodes.length * ofSum : 1;
        int size = (edges.length - 1) * rule.nodes.length * inner;
        alice = new double[size];
        bob = new double[size];
        probability = new double[size];
        for (int panel = 0; panel + 1 < edges.length; panel++) {
            double half = (edges[panel + 1] - edges[panel]) / 2.0;
            double middle = (edges[panel + 1] + edges[panel]) / 2.0;
            for (int i = 0; i < rule.nodes.length; i++) {
                double wa = middle + half * rule.nodes[i];
                fill(wa, half * rule.weights[i] * a.at(wa), b, pumpRms, ofSum);
            }
        }
        double sum = 0.0;
        for (double p : probability) {
            sum += p;
        }
        mass = sum;
        for (int i = 0; i < size; i++) {
            probability[i] /= sum;
        }
    }

    /**
     * Makes the grid.
     *
     * @param a filters of alice's arm
     * @param b filters of bob's arm
     * @param pumpRms rms bandwidth of the pump pulse, rad/s; 0 for a continuous pump
     * @param refinement 1 for smooth integrands, more panels for ones that oscillate
     */
    static SpectralGrid of(Passband a, Passband b, double pumpRms, int refinement) {
        return of(a, b, pumpRms, refinement, 2 * refinement);
    }

    /**
     * Makes the grid with different refinements of its two directions.
     *
     * @param a filters of alice's arm
     * @param b filters of bob's arm
     * @param pumpRms rms bandwidth of the pump pulse, rad/s; 0 for a continuous pump
     * @param ofAlice refinement over the detuning of alice's photon
     * @param ofSum refinement over the sum of both detunings
     */
    static SpectralGrid of(Passband a, Passband b, double pumpRms, int ofAlice, int ofSum) {
        return new SpectralGrid(a, b, pumpRms, ofAlice, ofSum);
    }

    /** Width of the widest unrefined panel over alice's detuning, rad/s. */
    static double widestPanel(Passband a, Passband b, double pumpRms) {
        double[] edges = panels(reach(a, b, pumpRms), pumpRms, 1);
        return Math.max(edges[1] - edges[0], edges[2] - edges[1]);
    }

    /** Largest detuning of alice's photon, rad/s. */
    double farthestAlice() {
        return farthest(alice);
    }

    /** Largest detuning of bob's photon, rad/s. */
    double farthestBob() {
        return farthest(bob);
    }

    private static double farthest(double[] detunings) {
        double farthest = 0.0;
        for (double detuning : detunings) {
            farthest = Math.max(farthest, Math.abs(detuning));
        }
        return farthest;
    }

    private void fill(double wa, double weight, Passband b, double pumpRms, int refinement) {
        if (pumpRms == 0.0) {
            put(wa, -wa, weight * b.at(wa));
            return;
        }
        double reachB = Math.min(b.halfWidth(), REACH * b.gaussianRms());
        double low = Math.max(-REACH * pumpRms, wa - reachB);
        double high = Math.max(low, Math.min(REACH * pumpRms, wa + reachB));
        GaussLegendre rule = GaussLegendre.sixteen();
        double half = (high - low) / (2.0 * refinement);
        for (int panel = 0; panel < refinement; panel++) {
            double middle = low + (2 * panel + 1) * half;
            for (int i = 0; i < rule.nodes.length; i++) {
                double u = middle + half * rule.nodes[i];
                double x = u / pumpRms;
                put(wa, u - wa, weight * half * rule.weights[i] * Math.exp(-x * x / 2.0) * b.at(u - wa));
            }
        }
    }

    private void put(double wa, double wb, double weight) {
        alice[filled] = wa;
        bob[filled] = wb;
        probability[filled++] = weight;
    }

    private static double reach(Passband a, Passband b, double pumpRms) {
        double own = Math.min(a.halfWidth(), REACH * a.gaussianRms());
        double partner = Math.min(b.halfWidth(), REACH * b.gaussianRms());
        return Math.min(own, partner + REACH * pumpRms);
    }

    private static double[] panels(double reach, double pumpRms, int refinement) {
        double edge = Math.min(reach / 2.0, Math.max(2.0 * REACH * pumpRms, reach / 8.0));
        double[] coarse = {-reach, -reach + edge, reach - edge, reach};
        double[] fine = new double[3 * refinement + 1];
        for (int i = 0; i < fine.length; i++) {
            int panel = Math.min(i / refinement, 2);
            double share = (i - panel * refinement) / (double) refinement;
            fine[i] = coarse[panel] + share * (coarse[panel + 1] - coarse[panel]);
        }
        return fine;
    }
}
