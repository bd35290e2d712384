package binspan.prediction.histogram;

import binspan.counting.ArmLight;
import binspan.counting.DetectorLoad;
import binspan.optics.BinnedCaptures;
import binspan.optics.CaptureInputs;
import binspan.optics.SlotCaptures;
import binspan.optics.TimeBins;
import binspan.prediction.LinkPrediction;
import binspan.scenario.Detector;
import binspan.units.Scale;

/** What arrives at one port of a pulsed link in the bins of a histogram, in events per cycle as counting has them: before dead time. */
final class PortArrivals {
    /** Slots beyond those of the window that the one and a half periods of a train can see. */
    private static final int SHOWN_SLOTS = 2;

    private final LinkPrediction prediction;
    private final SlotCaptures captures;
    private final boolean alice;
    private final int port;
    private final ArmLight arm;
    private final DetectorLoad load;

    PortArrivals(LinkPrediction prediction, boolean alice, int port) {
        this.prediction = prediction;
        this.captures = prediction.optics().captures();
        this.alice = alice;
        this.port = port;
        this.arm = alice ? prediction.counts().alice() : prediction.counts().bob();
        this.load = (alice ? prediction.counts().loadsA() : prediction.counts().loadsB()).get(port);
    }

    /** The port's load. */
    DetectorLoad load() {
        return load;
    }

    /** Detected photons of the source in each bin. */
    double[] photons(TimeBins bins) {
        CaptureInputs in = captures.inputs();
        double late = alice ? in.lateA() : in.lateB();
        int reach = in.endless() ? captures.reach() + SHOWN_SLOTS : 1;
        double[] photons = new double[bins.count()];
        for (int slot = -reach; slot <= reach; slot++) {
            double weight = arm.photons() * weight(slot);
            double[] shares =
                    BinnedCaptures.singles(captures, alice, port, bins.shifted(-late - slot * in.separation()));
            for (int i = 0; i < photons.length; i++) {
                photons[i] += weight * shares[i];
            }
        }
        return photons;
    }

    /** Detected photons of the source in the window of the central slot. */
    double photonsInWindow() {
        double photons = 0.0;
        int reach = captures.inputs().endless() ? captures.reach() : 1;
        for (int slot = -reach; slot <= reach; slot++) {
            photons += weight(slot) * (alice ? captures.alice(port, slot) : captures.bob(port, slot));
        }
        return arm.photons() * photons;
    }

    /** Share of the arm's photons that the port detects in a slot counted from the central one. */
    private double weight(int slot) {
        double s = arm.shortTo(port);
        double l = arm.longTo(port);
        if (captures.inputs().endless()) {
            return s + l;
        }
        double early = prediction.scenario().source().pump().earlyPairFraction();
        return switch (slot) {
            case -1 -> early * s;
            case 0 -> early * l + (1.0 - early) * s;
            default -> (1.0 - early) * l;
        };
    }

    /** Noise clicks in the window of a slot. */
    double noiseInWindow() {
        return load.noiseClicks(captures.inputs().windowWidth(), detector());
    }

    /** Time of each bin in which the detector is sensitive, s: all of it, or what lies inside a gate about a slot. */
    double[] open(TimeBins bins) {
        double[] open = new double[bins.count()];
        for (int i = 0; i < open.length; i++) {
            open[i] = detector().gate().isEmpty()
                    ? bins.width()
                    : Math.min(bins.width(), gated(bins.edge(i), bins.edge(i + 1)));
        }
        return open;
    }

    private double gated(double from, double to) {
        CaptureInputs in = captures.inputs();
        double half = detector().gate().orElseThrow().widthNs() * Scale.NANO / 2.0;
        int last = in.endless() ? captures.reach() + SHOWN_SLOTS : 1;
        double open = 0.0;
        for (int slot = -last; slot <= last; slot++) {
            double middle = slot * in.separation();
            open += Math.max(0.0, Math.min(to, middle + half) - Math.max(from, middle - half));
        }
        return open;
    }

    private Detector detector() {
        return arm.arm().detectors().get(port);
    }
}
