package binspan.optics;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** Nodes and weights of Gauss-Legendre rules on [-1, 1]. */
final class GaussLegendre {
    final double[] nodes;
    final double[] weights;

    private GaussLegendre(double[] nodes, double[] weights) {
        this.nodes = nodes;
        this.weights = weights;
    }

    /** Rule of 12 nodes, for short smooth panels; a table, since every prediction needs it and the library takes long to load. */
    static GaussLegendre twelve() {
        return Twelve.RULE;
    }

    /** Rule of 16 nodes from the mathematics library. */
    static GaussLegendre sixteen() {
        return Sixteen.RULE;
    }

    private static final class Twelve {
        private static final double[] POSITIVE = {
            0.1252334085114689,
            0.3678314989981802,
            0.5873179542866175,
            0.7699026741943047,
            0.9041172563704748,
            0.9815606342467192
        };
        private static final double[] WEIGHTS = {
            0.2491470458134027,
            0.2334925365383546,
            0.20316742672306573,
            0.16007832854334642,
            0.10693932599531907,
            0.04717533638651141
        };

        static final GaussLegendre RULE = mirrored();

        private static GaussLegendre mirrored() {
            int half = POSITIVE.length;
            double[] nodes = new double[2 * half];
            double[] weights = new double[2 * half];
            for (int i = 0; i < half; i++) {
                nodes[half + i] = POSITIVE[i];
                nodes[half - 1 - i] = -POSITIVE[i];
                weights[half + i] = WEIGHTS[i];
                weights[half - 1 - i] = WEIGHTS[i];
            }
            return new GaussLegendre(nodes, weights);
        }
    }

    private static final class Sixteen {
        private static final int COUNT = 16;

        static final GaussLegendre RULE = library();

        private static GaussLegendre library() {
            GaussIntegrator rule = new GaussIntegratorFactory().legendre(COUNT);
            double[] nodes = new double[COUNT];
            double[] weights = new double[COUNT];
            for (int i = 0; i < COUNT; i++) {
                nodes[i] = rule.getPoint(i);
                weights[i] = rule.getWeight(i);
            }
            return new GaussLegendre(nodes, weights);
        }
    }
}
