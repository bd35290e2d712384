package binspan.worksheet;

import binspan.optics.ArrivalTime;
import binspan.optics.SlotCaptures;

/** Section 3, pulsed sources: captured shares of the pairs of two ports, whose photons are correlated in time. */
final class WorksheetJointCaptures {
    private final WorksheetPage page;
    private final SlotCaptures captures;
    private final int a;
    private final int b;

    private WorksheetJointCaptures(WorksheetPage page, int a, int b) {
        this.page = page;
        this.captures = page.captures();
        this.a = a;
        this.b = b;
    }

    static void write(WorksheetPage page, int a, int b) {
        new WorksheetJointCaptures(page, a, b).pairs();
    }

    private void pairs() {
        WorksheetSide alice = page.sides().get(0);
        WorksheetSide bob = page.sides().get(1);
        if (WorksheetCaptures.like(alice, a) != a || WorksheetCaptures.like(bob, b) != b) {
            return;
        }
        spread(alice, bob);
        for (int i = -captures.reach(); i <= captures.reach(); i++) {
            for (int k = -captures.reach(); k <= captures.reach(); k++) {
                double captured = captures.pairs(a, b).at(i, k);
                if (captured > WorksheetCaptures.NOTHING || (i == 0 && k == 0)) {
                    String meaning = "captured pairs, alice's photon " + WorksheetCaptures.where(i) + ", bob's "
                            + WorksheetCaptures.where(k);
                    page.line(
                            WorksheetCaptures.pair(page, a, b, i, k),
                            meaning,
                            joint(WorksheetCaptures.late(alice, i), WorksheetCaptures.late(bob, k)),
                            captured,
                            "");
                }
            }
        }
    }

    private void spread(WorksheetSide alice, WorksheetSide bob) {
        ArrivalTime arrival = page.prediction().arrival();
        double varianceA = arrival.pairA() + alice.ports().get(a).variance();
        double varianceB = arrival.pairB() + bob.ports().get(b).variance();
        String ports = "ports (" + (a + 1) + "," + (b + 1) + "): ";
        String pair = "_" + (a + 1) + (b + 1);
        page.line(
                "ra" + pair,
                ports + "alice's photon of a pair, rms",
                "sqrt({St_AA} + " + alice.in("V", a) + ")",
                Math.sqrt(varianceA),
                "s");
        page.line(
                "rb" + pair,
                ports + "bob's photon of a pair, rms",
                "sqrt({St_BB} + " + bob.in("V", b) + ")",
                Math.sqrt(varianceB),
                "s");
        String formula = "{St_AB}/({ra" + pair + "} {rb" + pair + "})";
        double correlation = arrival.pairCovariance() / (Math.sqrt(varianceA) * Math.sqrt(varianceB));
        page.line("rho" + pair, ports + "correlation of the arrivals", formula, correlation, "");
    }

    private String joint(String lateA, String lateB) {
        String pair = "_" + (a + 1) + (b + 1);
        boolean plain = page.prediction().spectrum().gaussian();
        String shape = plain ? "joint normal" : "joint spectrum spread by both dispersions, of";
        return shape + " rms {ra" + pair + "} and {rb" + pair + "}, correlation {rho" + pair
                + "}, inside both windows of {w}, late by " + lateA + " and " + lateB + " (by quadrature)";
    }
}
