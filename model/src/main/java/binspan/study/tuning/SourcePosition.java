package binspan.study.tuning;

import binspan.scenario.Arm;
import binspan.scenario.Edits;
import binspan.scenario.FibreSpan;
import binspan.scenario.Range;
import binspan.scenario.Scenario;

/** Where along its fibre a link has the source. */
public final class SourcePosition {
    private SourcePosition() {}

    /**
     * The link with the source moved: the same fibre in all, alice's arm with the given share of it.
     *
     * @param scenario the link
     * @param share alice's share of the fibre: 0 with the source at alice, 0.5 in the middle, 1 at bob
     * @throws IllegalArgumentException if the share is not between 0 and 1, or if an arm without fibre would need some
     */
    public static Scenario moved(Scenario scenario, double share) {
        if (!Range.of(0.0, 1.0).contains(share)) {
            throw new IllegalArgumentException(
                    "source position: found " + Range.plain(share) + "; allowed 0 (at alice) to 1 (at bob)");
        }
        double alice = fibreKm(scenario.alice());
        double bob = fibreKm(scenario.bob());
        double whole = alice + bob;
        return Edits.withArms(
                scenario,
                scaled(scenario.alice(), "alice", alice, share * whole),
                scaled(scenario.bob(), "bob", bob, (1.0 - share) * whole));
    }

    /** Alice's share of the fibre, NaN where the link has none. */
    public static double of(Scenario scenario) {
        double alice = fibreKm(scenario.alice());
        return alice / (alice + fibreKm(scenario.bob()));
    }

    /** Length of an arm's fibre, km. */
    public static double fibreKm(Arm arm) {
        return arm.path().stream()
                .mapToDouble(element -> element instanceof FibreSpan span ? span.lengthKm() : 0.0)
                .sum();
    }

    /** An arm at another length of its fibre. */
    public static Arm scaled(Arm arm, String name, double presentKm, double wantedKm) {
        if (presentKm == wantedKm) {
            return arm;
        }
        if (!(presentKm > 0.0)) {
            throw new IllegalArgumentException(name + ": has no fibre to stretch");
        }
        double factor = wantedKm / presentKm;
        return Edits.path(arm, element -> element instanceof FibreSpan span ? span.scaled(factor) : element);
    }
}
