package binspan.optics;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** Nodes and weights of a Gauss-Legendre rule on [-1, 1], from the mathematics library and read into arrays once. */
final class GaussLegendre {
    /** Rule of 12 nodes, for short smooth panels. */
    static final GaussLegendre TWELVE = new GaussLegendre(12);

    /** Rule of 16 nodes. */
    static final GaussLegendre SIXTEEN = new GaussLegendre(16);

    final double[] nodes;
    final double[] weights;

    private GaussLegendre(int count) {
        GaussIntegrator rule = new GaussIntegratorFactory().legendre(count);
        nodes = new double[count];
        weights = new double[count];
        for (int i = 0; i < count; i++) {
            nodes[i] = rule.getPoint(i);
            weights[i] = rule.getWeight(i);
        }
    }
}
