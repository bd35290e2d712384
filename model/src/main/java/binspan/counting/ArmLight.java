package binspan.counting;

import binspan.optics.AnalyzerPaths;
import binspan.optics.OpticalPath;
import binspan.scenario.Arm;
import java.util.List;

/** Light of one arm at its detectors. */
public final class ArmLight {
    private final Reception reception;
    private final double photons;

    private ArmLight(Reception reception, double photons) {
        this.reception = reception;
        this.photons = photons;
    }

    /** What an arm does to a photon, however many come. */
    private static final class Reception {
        private final Arm arm;
        private final AnalyzerPaths paths;
        private final double strayPhotonsPerSecond;
        private final double[] detection;
        private final double[] shorts;
        private final double[] longs;
        private final boolean alike;

        Reception(Arm arm, OpticalPath path) {
            this.arm = arm;
            this.paths = AnalyzerPaths.of(arm.analyzer());
            this.strayPhotonsPerSecond = path.strayPhotonsPerSecond();
            int ports = arm.detectors().size();
            this.detection = new double[ports];
            this.shorts = new double[ports];
            this.longs = new double[ports];
            for (int port = 0; port < ports; port++) {
                detection[port] = arm.detectors().get(port).efficiency() * path.transmittance();
                shorts[port] = detection[port] * paths.shortTo(port);
                longs[port] = detection[port] * paths.longTo(port);
            }
            this.alike = ports == 2
                    && shorts[0] == shorts[1]
                    && longs[0] == longs[1]
                    && arm.detectors().get(0).equals(arm.detectors().get(1));
        }
    }

    /**
     * Light of an arm.
     *
     * @param arm the arm
     * @param path its path with the analyzer's excess loss
     * @param photons photons of the source inside the arm's filters, before any loss, per cycle; continuous: per second
     */
    public static ArmLight of(Arm arm, OpticalPath path, double photons) {
        return new ArmLight(new Reception(arm, path), photons);
    }

    /** The same arm with another number of photons. */
    public ArmLight carrying(double otherPhotons) {
        return new ArmLight(reception, otherPhotons);
    }

    /** The arm. */
    public Arm arm() {
        return reception.arm;
    }

    /** Shares of the analyzer's paths. */
    public AnalyzerPaths paths() {
        return reception.paths;
    }

    /** Photons of the source inside the arm's filters, before any loss, per cycle; continuous: per second. */
    public double photons() {
        return photons;
    }

    /** Number of detected ports. */
    public int ports() {
        return reception.detection.length;
    }

    /** Whether there are two ports which meet the same light with equal detectors. */
    public boolean portsAlike() {
        return reception.alike;
    }

    /** Probability that a photon of the arm is detected if it takes a path with share 1 into the port. */
    public double detection(int port) {
        return reception.detection[port];
    }

    /** Share of the arm's photons that the port detects through its short path. */
    public double shortTo(int port) {
        return reception.shorts[port];
    }

    /** Share of the arm's photons that the port detects through its long path. */
    public double longTo(int port) {
        return reception.longs[port];
    }

    /** Share of the arm's photons that the port detects at all. */
    public double into(int port) {
        return shortTo(port) + longTo(port);
    }

    /**
     * Loads of all ports.
     *
     * @param cyclesPerSecond cycles, 1/s; 1 for a continuous pump
     * @param slotsPerSecond slots, 1/s; infinite for a continuous pump
     */
    public List<DetectorLoad> loads(double cyclesPerSecond, double slotsPerSecond) {
        DetectorLoad first = load(0, cyclesPerSecond, slotsPerSecond);
        if (ports() == 1) {
            return List.of(first);
        }
        return List.of(first, portsAlike() ? first : load(1, cyclesPerSecond, slotsPerSecond));
    }

    private DetectorLoad load(int port, double cyclesPerSecond, double slotsPerSecond) {
        double stray = reception.strayPhotonsPerSecond
                * paths().into(port)
                * arm().detectors().get(port).efficiency();
        return DetectorLoad.of(
                arm().detectors().get(port), photons * cyclesPerSecond * into(port), stray, slotsPerSecond);
    }
}
