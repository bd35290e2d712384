package binspan.optics;

/**
 * Quadrature over one photon's detuning behind its filters, for captures after dispersion: as fine as the window's blurred edges demand, and no wider
 * than the window can see. A photon of detuning W is late by beta W.
 */
final class DetuningNodes {
    private static final double REACH = 6.5;
    private static final double BLURRED_EDGES = 8.0;
    private static final double TAIL_TIMES = 45.0;
    private static final double SIGMAS_PER_PANEL = 6.0;
    private static final double WIDTHS_PER_PANEL = 3.0;
    private static final int MOST_PANELS = 1024;

    /** Detunings in rising order, rad/s. */
    final double[] detuning;

    /** Transmission times quadrature weight of each, rad/s; where the window sees all of them they sum to the area of the passband. */
    final double[] weight;

    private DetuningNodes(int count) {
        this.detuning = new double[count];
        this.weight = new double[count];
    }

    /**
     * What sees a photon.
     *
     * @param window window about the arrival of a photon that is not late, s
     * @param sigma rms of its blur, s
     * @param tailAfter time constant of a tail that makes clicks later, s; 0 for none
     * @param tailBefore time constant of one that makes them earlier, s; 0 for none
     */
    record View(Window window, double sigma, double tailAfter, double tailBefore) {
        /** Earliest arrival that may still click inside the window. */
        double earliest() {
            return window.from() - BLURRED_EDGES * sigma - TAIL_TIMES * tailAfter;
        }

        /** Latest such arrival. */
        double latest() {
            return window.to() + BLURRED_EDGES * sigma + TAIL_TIMES * tailBefore;
        }
    }

    /**
     * The nodes of a passband.
     *
     * @param filters filters of the photon
     * @param beta group-delay dispersion, s^2
     * @param view what sees it
     */
    static DetuningNodes of(Passband filters, double beta, View view) {
        double reach = Math.min(filters.halfWidth(), REACH * filters.gaussianRms());
        double slope = Math.abs(beta);
        double low = -reach;
        double high = reach;
        if (slope > 0.0) {
            double first = beta > 0.0 ? view.earliest() : -view.latest();
            double last = beta > 0.0 ? view.latest() : -view.earliest();
            low = Math.max(low, first / slope);
            high = Math.min(high, last / slope);
        }
        if (!(high > low)) {
            return new DetuningNodes(0);
        }
        double finest = Math.min(WIDTHS_PER_PANEL * filters.gaussianRms(), SIGMAS_PER_PANEL * view.sigma() / slope);
        int panels = (int) Math.max(1.0, Math.min(MOST_PANELS, Math.ceil((high - low) / finest)));
        return filled(filters, low, high, panels);
    }

    private static DetuningNodes filled(Passband filters, double low, double high, int panels) {
        GaussLegendre rule = GaussLegendre.sixteen();
        int count = rule.nodes.length;
        DetuningNodes nodes = new DetuningNodes(panels * count);
        double half = (high - low) / (2.0 * panels);
        for (int panel = 0; panel < panels; panel++) {
            double middle = low + (2 * panel + 1) * half;
            for (int i = 0; i < count; i++) {
                double detuning = middle + half * rule.nodes[i];
                nodes.detuning[panel * count + i] = detuning;
                nodes.weight[panel * count + i] = half * rule.weights[i] * filters.at(detuning);
            }
        }
        return nodes;
    }

    /** Number of nodes; 0 where the window sees none of the light. */
    int count() {
        return detuning.length;
    }
}
