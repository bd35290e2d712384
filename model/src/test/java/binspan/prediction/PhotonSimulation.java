package binspan.prediction;

import java.util.SplittableRandom;

/**
 * Photon by photon: pairs are born with any detuning, pass their filters or not, take a path and a port, are lost or blurred, and click in a window or
 * beside it. Nothing here comes from the model; what a photon does is drawn from the textbook distribution of each step.
 *
 * <p>Detunings and times of a pair are drawn from the Wigner function of a Gaussian pulse and Gaussian filters, which is a probability density: sum of
 * the detunings and time of birth from the pump pulse, and for each photon a blur of 1/(2 s) by its filter of rms s. Paths are chosen as by particles:
 * there is no interference, so that rates are those averaged over the phase.
 */
final class PhotonSimulation {
    static final double PICO = 1e-12;

    /**
     * One arm.
     *
     * @param filterRms rms of its Gaussian filters, rad/s
     * @param beta group-delay dispersion, s^2
     * @param shorts probability that a photon behind its filters clicks at port 1 or 2 after the short path
     * @param longs the same after the long path
     * @param jitterRms jitter, s
     * @param tailFraction share of clicks with an exponential tail
     * @param tailTime its time constant, s
     * @param late how late photons come against the windows, s
     * @param darkPerSecond dark counts of each port, 1/s
     */
    record Side(
            double filterRms,
            double beta,
            Ports shorts,
            Ports longs,
            double jitterRms,
            double tailFraction,
            double tailTime,
            double late,
            double darkPerSecond) {}

    /** A probability for each port. */
    record Ports(double first, double second) {
        double at(int port) {
            return port == 0 ? first : second;
        }
    }

    /** A click: where and when, the time against the moment at which an undisturbed photon of the same path would come. */
    static final class Click {
        int port;
        boolean longPath;
        double time;
    }

    private final SplittableRandom random;
    private final double pumpRms;
    private final double widest;

    /**
     * A source.
     *
     * @param seed seed of the random numbers
     * @param pumpRms rms bandwidth of the pump pulse, rad/s; 0 for a continuous pump
     * @param widest alice's detuning lies within plus and minus this, rad/s: far beyond all filters; 0 puts every photon in the middle of its filters
     */
    PhotonSimulation(long seed, double pumpRms, double widest) {
        this.random = new SplittableRandom(seed);
        this.pumpRms = pumpRms;
        this.widest = widest;
    }

    /** Draws a pair: null or a click on each side, into the first two places; the other two are clicks to be filled. */
    void pair(Side alice, Side bob, Click[] clicks) {
        double ofAlice = widest * (2.0 * random.nextDouble() - 1.0);
        double ofBob = (widest > 0.0 ? pumpRms * random.nextGaussian() : 0.0) - ofAlice;
        double born = pumpRms > 0.0 ? random.nextGaussian() / (2.0 * pumpRms) : 0.0;
        clicks[0] = photon(alice, ofAlice, born, clicks[2]);
        clicks[1] = photon(bob, ofBob, born, clicks[3]);
    }

    private Click photon(Side side, double detuning, double born, Click click) {
        double x = detuning / side.filterRms();
        if (random.nextDouble() >= Math.exp(-x * x / 2.0)) {
            return null;
        }
        double u = random.nextDouble();
        for (int path = 0; path < 4; path++) {
            u -= (path < 2 ? side.shorts() : side.longs()).at(path % 2);
            if (u < 0.0) {
                click.port = path % 2;
                click.longPath = path >= 2;
                click.time = side.late() + born + side.beta() * detuning + blur(side);
                return click;
            }
        }
        return null;
    }

    private double blur(Side side) {
        double near = random.nextGaussian() / (2.0 * side.filterRms());
        double tail = side.tailFraction() > 0.0 && random.nextDouble() < side.tailFraction()
                ? -side.tailTime() * Math.log1p(-random.nextDouble())
                : 0.0;
        return near + side.jitterRms() * random.nextGaussian() + tail;
    }

    /** A number of independent events. */
    int poisson(double mean) {
        double left = Math.exp(-mean);
        double product = random.nextDouble();
        int n = 0;
        while (product > left) {
            product *= random.nextDouble();
            n++;
        }
        return n;
    }

    /** A number of pairs in one thermal mode. */
    int thermal(double mean) {
        return (int) (Math.log1p(-random.nextDouble()) / Math.log(mean / (1.0 + mean)));
    }

    /** Uniform in [0, 1). */
    double uniform() {
        return random.nextDouble();
    }

    /** Waiting time of a Poisson process. */
    double wait(double rate) {
        return -Math.log1p(-random.nextDouble()) / rate;
    }
}
