package binspan.counting;

import binspan.IdealLink;
import binspan.merit.ErrorRates;
import binspan.merit.SiftedRates;
import binspan.optics.OpticalPaths;
import binspan.optics.PathInputs;
import binspan.scenario.Arm;
import binspan.scenario.Scenario;
import java.util.List;

/** Counts of a link with a continuous pump and four port pairs whose fringe has a given visibility and no accidentals. */
public final class FringeCounts {
    private FringeCounts() {}

    /**
     * Counts of a fringe.
     *
     * @param visibility visibility of the pairs
     * @param perSecond coincidences of all port pairs, 1/s
     */
    public static LinkCounts of(double visibility, double perSecond) {
        return of(visibility, perSecond, 0.0);
    }

    /**
     * Counts of a fringe on a floor.
     *
     * @param contrast contrast of the pairs alone
     * @param perSecond coincidences of all port pairs, accidentals not counted, 1/s
     * @param accidentalPerSecond accidentals of all port pairs, 1/s
     */
    public static LinkCounts of(double contrast, double perSecond, double accidentalPerSecond) {
        Scenario link = IdealLink.build(IdealLink.continuous());
        ArmLight alice = light(link, link.alice());
        ArmLight bob = light(link, link.bob());
        PortPair[] pairs = new PortPair[4];
        for (int a = 0; a < 2; a++) {
            for (int b = 0; b < 2; b++) {
                double amplitude = (a == b ? contrast : -contrast) * perSecond / 4.0;
                pairs[2 * a + b] = new ContinuousPortPair(perSecond / 4.0, amplitude, accidentalPerSecond / 4.0);
            }
        }
        return new LinkCounts(
                alice,
                bob,
                alice.loads(1.0, Double.POSITIVE_INFINITY),
                bob.loads(1.0, Double.POSITIVE_INFINITY),
                new PortPairs(pairs, 2),
                List.of(),
                0.0,
                perSecond + accidentalPerSecond,
                contrast,
                pairs[0]);
    }

    /**
     * Error rate of the phase basis at a fringe.
     *
     * @param visibility visibility of the pairs
     * @param offset static phase error, rad
     */
    public static double phaseError(double visibility, double offset) {
        LinkCounts counts = of(visibility, 1.0);
        return ErrorRates.of(counts, SiftedRates.of(counts, offset), visibility, offset)
                .phase();
    }

    private static ArmLight light(Scenario link, Arm arm) {
        return ArmLight.of(arm, OpticalPaths.of(PathInputs.of(link, arm)), 1.0);
    }
}
