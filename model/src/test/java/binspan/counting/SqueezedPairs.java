package binspan.counting;

import java.util.HashMap;
import java.util.Map;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;

/**
 * Two coherent two-mode squeezed vacua, one for each time bin, in the basis of photon numbers: sum of sqrt(p(n) p(m)) |n, m> |n, m> over the pairs n
 * born early and m born late, p(n) = mu^n/(1 + mu)^(n+1).
 *
 * <p>A detector sees the mode d = (x early + y late)/sqrt(eta) with probability eta = x^2 + y^2 and stays silent with the mean of (1 - eta)^(d'd).
 * That operator keeps the number of photons, so that each total number is a matrix of its own.
 */
final class SqueezedPairs {
    private static final double NEGLIGIBLE = 1e-19;

    private final double ratioEarly;
    private final double ratioLate;
    private final int mostPairs;
    private final Map<Seen, double[][][]> known = new HashMap<>();

    /**
     * A state.
     *
     * @param early mean pairs born early
     * @param late mean pairs born late
     */
    SqueezedPairs(double early, double late) {
        this.ratioEarly = early / (1.0 + early);
        this.ratioLate = late / (1.0 + late);
        this.mostPairs = (int) Math.ceil(Math.log(NEGLIGIBLE) / Math.log(Math.max(ratioEarly, ratioLate)));
    }

    /** Amplitudes with which a detector sees the early and the late photons of its side. */
    record Seen(double early, double late) {
        static final Seen NOTHING = new Seen(0.0, 0.0);

        double probability() {
            return early * early + late * late;
        }
    }

    /** Probability that neither detector clicks, at a phase between the two ways of a pair. */
    double silent(Seen a, Seen b, double phase) {
        double[][][] ofAlice = known.computeIfAbsent(a, this::silence);
        double[][][] ofBob = known.computeIfAbsent(b, this::silence);
        double sum = 0.0;
        for (int total = 0; total <= mostPairs; total++) {
            double[][] alice = ofAlice[total];
            double[][] bob = ofBob[total];
            for (int n = 0; n <= total; n++) {
                for (int m = 0; m <= total; m++) {
                    sum += amplitude(n, total)
                            * amplitude(m, total)
                            * alice[n][m]
                            * bob[n][m]
                            * Math.cos(phase * (n - m));
                }
            }
        }
        return sum;
    }

    /** Probability that both click, each also by noise with the given mean. */
    double both(Seen a, Seen b, double phase, double noiseA, double noiseB) {
        double quietA = Math.exp(-noiseA);
        double quietB = Math.exp(-noiseB);
        return 1.0
                - quietA * silent(a, Seen.NOTHING, phase)
                - quietB * silent(Seen.NOTHING, b, phase)
                + quietA * quietB * silent(a, b, phase);
    }

    private double amplitude(int early, int total) {
        return Math.sqrt((1.0 - ratioEarly)
                * Math.pow(ratioEarly, early)
                * (1.0 - ratioLate)
                * Math.pow(ratioLate, total - early));
    }

    private double[][][] silence(Seen seen) {
        double[][][] silence = new double[mostPairs + 1][][];
        for (int total = 0; total <= mostPairs; total++) {
            silence[total] = silence(seen, total);
        }
        return silence;
    }

    /** (1 - eta)^(d'd) among the states of one side with a total number of photons, by the number born early. */
    private static double[][] silence(Seen seen, int total) {
        double eta = seen.probability();
        double[][] number = new double[total + 1][total + 1];
        for (int n = 0; n <= total; n++) {
            number[n][n] = eta == 0.0
                    ? 0.0
                    : (seen.early() * seen.early() * n + seen.late() * seen.late() * (total - n)) / eta;
            if (n < total && eta > 0.0) {
                number[n][n + 1] = seen.early() * seen.late() / eta * Math.sqrt((n + 1.0) * (total - n));
                number[n + 1][n] = number[n][n + 1];
            }
        }
        EigenDecomposition modes = new EigenDecomposition(new Array2DRowRealMatrix(number));
        double[][] silence = new double[total + 1][total + 1];
        for (int k = 0; k <= total; k++) {
            double weight = Math.pow(1.0 - eta, Math.rint(modes.getRealEigenvalue(k)));
            double[] vector = modes.getEigenvector(k).toArray();
            for (int n = 0; n <= total; n++) {
                for (int m = 0; m <= total; m++) {
                    silence[n][m] += weight * vector[n] * vector[m];
                }
            }
        }
        return silence;
    }
}
