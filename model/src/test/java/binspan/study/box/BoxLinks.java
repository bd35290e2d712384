package binspan.study.box;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.window.WindowLinks;

/** The sample pulse pair over some parameters, for the tests of boxes. */
public final class BoxLinks {
    public static final Scenario PAIR = WindowLinks.pulsePair();
    public static final Axis PAIRS = WindowLinks.axis(PAIR, "source.meanPairsPerCycle", 1e-4, 1.0, true);
    public static final Axis WIDTH = WindowLinks.axis(PAIR, "timing.windowWidthPs", 10.0, 5000.0, true);
    public static final Axis LENGTH = WindowLinks.axis(PAIR, "link.lengthKm", 1.0, 200.0, false);
    public static final Axis IMBALANCE = WindowLinks.axis(PAIR, "imbalanceNs", 0.1, 4.0, false);
    public static final Axis EFFICIENCY = WindowLinks.axis(PAIR, "both.detectors.efficiency", 0.1, 1.0, false);
    public static final Axis JITTER = WindowLinks.axis(PAIR, "both.detectors.jitterFwhmPs", 10.0, 500.0, false);
    static final Axis PHASE = WindowLinks.axis(PAIR, "alice.analyzer.phaseSettingErrorRad", -3.0, 3.0, false);

    private BoxLinks() {}

    /** Runs a search on all processors. */
    static OperatingBox run(ToleranceBox question) {
        return question.run(Execution.parallel(Progress.NONE));
    }

    /** The values at relative coordinates of a box: 0 is the lower end of a side, 1 the upper one. */
    static double[] inside(OperatingBox box, double[] relative) {
        double[] values = new double[relative.length];
        for (int j = 0; j < values.length; j++) {
            double from = box.sides().get(j).from().value();
            double to = box.sides().get(j).to().value();
            values[j] = relative[j] == 1.0 ? to : from + relative[j] * (to - from);
        }
        return values;
    }
}
