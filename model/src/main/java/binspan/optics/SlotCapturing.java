package binspan.optics;

import java.util.List;

/** Computes the captures of a pulsed source. */
public final class SlotCapturing {
    private static final int THREE_SLOTS = 2;
    private static final int MOST_SLOTS = 40;
    private static final int NEIGHBOURS = 2;
    private static final double FAR = 9.0;
    private static final double TAIL_TIMES = 30.0;

    private final CaptureInputs in;
    private final JointCapture pairs;
    private final SlotCaptures before;
    private final int reach;

    private SlotCapturing(CaptureInputs in, SlotCaptures before) {
        this.in = in;
        this.pairs = before != null && in.sameLight(before.inputs())
                ? before.light()
                : new JointCapture(in.spectrum(), in.betaA(), in.betaB());
        this.before = before != null && in.sameWindow(before.inputs()) ? before : null;
        this.reach = in.endless() ? endlessReach() : THREE_SLOTS;
    }

    /** Captured shares of all slots. */
    public static SlotCaptures of(CaptureInputs in) {
        return of(in, null);
    }

    /**
     * Captured shares of all slots, with what stays the same taken from others.
     *
     * @param in what they depend on
     * @param before captured shares of similar inputs, or null
     */
    public static SlotCaptures of(CaptureInputs in, SlotCaptures before) {
        SlotCapturing capturing = new SlotCapturing(in, before);
        return new SlotCaptures(
                in,
                capturing.pairs,
                capturing.reach,
                capturing.singles(true),
                capturing.singles(false),
                capturing.joint());
    }

    /** Slots within nine rms of the window, never more than {@value #MOST_SLOTS}: farther spread is cautioned about elsewhere. */
    private int endlessReach() {
        double widest = 0.0;
        for (int port = 0; port < in.portsA().size(); port++) {
            widest = Math.max(
                    widest, extent(true, in.portsA().get(port), pairs.arrival().singlesA()) + Math.abs(in.lateA()));
        }
        for (int port = 0; port < in.portsB().size(); port++) {
            widest = Math.max(
                    widest, extent(false, in.portsB().get(port), pairs.arrival().singlesB()) + Math.abs(in.lateB()));
        }
        double slots = (widest + in.windowWidth() / 2.0) / in.separation();
        return (int) Math.max(1.0, Math.min(MOST_SLOTS, Math.ceil(slots)));
    }

    /**
     * How far from the slot centre clicks can come: nine rms of Gaussian light, or the box that dispersion makes of a flat top and nine rms of its blur;
     * and thirty time constants of a tail.
     */
    private double extent(boolean alice, PortTiming port, double lightVariance) {
        Passband filters = alice ? in.spectrum().alice() : in.spectrum().bob();
        double tail = port.tailed() ? TAIL_TIMES * port.tailTime() : 0.0;
        double gaussian = FAR * Math.sqrt(lightVariance + port.variance());
        if (filters.gaussian()) {
            return gaussian + tail;
        }
        double nearField = (1.0 / filters.variance() + in.spectrum().inversePump()) / 4.0;
        double box = Math.abs(alice ? in.betaA() : in.betaB()) * filters.halfWidth();
        return Math.min(gaussian, box + FAR * Math.sqrt(nearField + port.variance())) + tail;
    }

    private double[][] singles(boolean alice) {
        List<PortTiming> ports = alice ? in.portsA() : in.portsB();
        double[][] captures = new double[ports.size()][];
        for (int port = 0; port < captures.length; port++) {
            captures[port] = port > 0 && ports.get(port).same(ports.get(0))
                    ? captures[0]
                    : singles(alice, port, ports.get(port));
        }
        return captures;
    }

    private double[] singles(boolean alice, int index, PortTiming port) {
        ArrivalTime arrival = pairs.arrival();
        double variance = alice ? arrival.singlesA() : arrival.singlesB();
        double extent = extent(alice, port, variance);
        double[] captures = new double[2 * reach + 1];
        for (int offset = -reach; offset <= reach; offset++) {
            if (offset == 0 && before != null) {
                captures[reach] = alice ? before.alice(index, 0) : before.bob(index, 0);
                continue;
            }
            Window window = window(alice, offset);
            if (reaches(window, extent)) {
                captures[offset + reach] = single(alice, port, window, Math.sqrt(variance + port.variance()));
            }
        }
        return captures;
    }

    private double single(boolean alice, PortTiming port, Window window, double sigma) {
        PairSpectrum spectrum = in.spectrum();
        Passband filters = alice ? spectrum.alice() : spectrum.bob();
        return filters.gaussian()
                ? port.capture(window.from(), window.to(), sigma)
                : BoxedCapture.singles(filters, spectrum.inversePump(), alice ? in.betaA() : in.betaB(), port, window);
    }

    private PairCaptures[] joint() {
        int portsB = in.portsB().size();
        PairCaptures[] joint = new PairCaptures[in.portsA().size() * portsB];
        for (int i = 0; i < joint.length; i++) {
            int a = i / portsB;
            int b = i % portsB;
            int likeA = in.portsA().get(a).same(in.portsA().get(0)) ? 0 : a;
            int likeB = in.portsB().get(b).same(in.portsB().get(0)) ? 0 : b;
            joint[i] = likeA < a || likeB < b ? joint[likeA * portsB + likeB] : joint(a, b);
        }
        return joint;
    }

    private PairCaptures joint(int portA, int portB) {
        PortTiming a = in.portsA().get(portA);
        PortTiming b = in.portsB().get(portB);
        double extentA = extent(true, a, pairs.arrival().pairA());
        double extentB = extent(false, b, pairs.arrival().pairB());
        int side = 2 * reach + 1;
        double[] captures = new double[side * side];
        for (int i = -reach; i <= reach; i++) {
            Window windowA = window(true, i);
            if (!reaches(windowA, extentA)) {
                continue;
            }
            for (int k = lowest(i); k <= highest(i); k++) {
                Window windowB = window(false, k);
                if (reaches(windowB, extentB)) {
                    captures[(i + reach) * side + k + reach] = i == 0 && k == 0 && before != null
                            ? before.pairs(portA, portB).at(0, 0)
                            : pairs.of(a, b, windowA, windowB);
                }
            }
        }
        return new PairCaptures(reach, captures);
    }

    /** In an endless train only photons born within a few slots of one another can be partners. */
    private int lowest(int offset) {
        return in.endless() ? Math.max(-reach, offset - NEIGHBOURS) : -reach;
    }

    private int highest(int offset) {
        return in.endless() ? Math.min(reach, offset + NEIGHBOURS) : reach;
    }

    private Window window(boolean alice, int offset) {
        return Window.of(in.windowWidth(), (alice ? in.lateA() : in.lateB()) + offset * in.separation());
    }

    private static boolean reaches(Window window, double extent) {
        return window.from() < extent && window.to() > -extent;
    }
}
