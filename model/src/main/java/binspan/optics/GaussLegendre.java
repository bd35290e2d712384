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

    /** Rule of 6 nodes; a table, since every prediction needs it and the library takes long to load. */
    static GaussLegendre six() {
        return Six.RULE;
    }

    /** Rule of 12 nodes, a table likewise. */
    static GaussLegendre twelve() {
        return Twelve.RULE;
    }

    /** Rule of 20 nodes, a table likewise. */
    static GaussLegendre twenty() {
        return Twenty.RULE;
    }

    /** Rule of 16 nodes from the mathematics library. */
    static GaussLegendre sixteen() {
        return Sixteen.RULE;
    }

    /** The whole rule from its nodes above 0 and their weights. */
    private static GaussLegendre mirrored(double[] positive, double[] weightsOfPositive) {
        int half = positive.length;
        double[] nodes = new double[2 * half];
        double[] weights = new double[2 * half];
        for (int i = 0; i < half; i++) {
            nodes[half + i] = positive[i];
            nodes[half - 1 - i] = -positive[i];
            weights[half + i] = weightsOfPositive[i];
            weights[half - 1 - i] = weightsOfPositive[i];
        }
        return new GaussLegendre(nodes, weights);
    }

    private static final class Six {
        static final GaussLegendre RULE = mirrored(
                new double[] {0.2386191860831969, 0.6612093864662645, 0.932469514203152},
                new double[] {0.46791393457269104, 0.3607615730481386, 0.17132449237917036});
    }

    private static final class Twelve {
        static final GaussLegendre RULE = mirrored(
                new double[] {
                    0.1252334085114689,
                    0.3678314989981802,
                    0.5873179542866175,
                    0.7699026741943047,
                    0.9041172563704748,
                    0.9815606342467192
                },
                new double[] {
                    0.2491470458134027,
                    0.2334925365383546,
                    0.20316742672306573,
                    0.16007832854334642,
                    0.10693932599531907,
                    0.04717533638651141
                });
    }

    private static final class Twenty {
        static final GaussLegendre RULE = mirrored(
                new double[] {
                    0.07652652113349734,
                    0.22778585114164507,
                    0.37370608871541955,
                    0.5108670019508271,
                    0.636053680726515,
                    0.7463319064601508,
                    0.8391169718222188,
                    0.912234428251326,
                    0.9639719272779138,
                    0.9931285991850949
                },
                new double[] {
                    0.15275338713072584,
                    0.14917298647260374,
                    0.14209610931838204,
                    0.13168863844917664,
                    0.11819453196151841,
                    0.10193011981724044,
                    0.08327674157670475,
                    0.06267204833410907,
                    0.04060142980038694,
                    0.017614007139152118
                });
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
