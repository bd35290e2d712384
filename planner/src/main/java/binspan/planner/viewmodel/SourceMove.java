package binspan.planner.viewmodel;

import binspan.scenario.Scenario;
import binspan.study.tuning.SourcePosition;

/** Moves the source along the fibre; one movement of the hand is one change. */
public final class SourceMove {
    /** Share of the fibre that each arm keeps, so that the source can be moved back. */
    private static final double LEAST = 0.01;

    private static final double STEP = 0.01;

    private final Design design;
    private Scenario before;

    SourceMove(Design design) {
        this.design = design;
    }

    /** Why the source cannot be moved; empty when it can. */
    public String refusal() {
        Scenario scenario = design.scenario();
        boolean both = SourcePosition.fibreKm(scenario.alice()) > 0.0 && SourcePosition.fibreKm(scenario.bob()) > 0.0;
        return both ? "" : Words.of("link.refusal.source");
    }

    /** Where it stands: "alice 31.4 km | bob 28.2 km". */
    public String text() {
        Scenario scenario = design.scenario();
        return Words.of(
                "link.source.place",
                LinkWords.kilometres(SourcePosition.fibreKm(scenario.alice())),
                LinkWords.kilometres(SourcePosition.fibreKm(scenario.bob())));
    }

    /** Whether a movement is going on. */
    public boolean moving() {
        return before != null;
    }

    /** Begins a movement. */
    public void begin() {
        before = refusal().isEmpty() ? design.scenario() : null;
    }

    /**
     * Goes on with a movement.
     *
     * @param km how far from where it began, towards bob
     */
    public void to(double km) {
        if (moving()) {
            double whole = SourcePosition.fibreKm(before.alice()) + SourcePosition.fibreKm(before.bob());
            move(before, SourcePosition.of(before) + km / whole, before);
        }
    }

    /** Ends a movement. */
    public void end() {
        before = null;
        design.settle();
    }

    /** Takes a movement back. */
    public void cancel() {
        if (moving()) {
            Scenario start = before;
            design.change(Words.of("link.change.source"), start, now -> start);
            end();
        }
    }

    /**
     * Moves the source by hundredths of the fibre, a change of its own.
     *
     * @param steps hundredths towards bob, negative towards alice
     */
    public void step(int steps) {
        String refusal = refusal();
        if (refusal.isEmpty()) {
            Scenario now = design.scenario();
            move(now, SourcePosition.of(now) + steps * STEP, null);
        } else {
            design.notice(refusal);
        }
    }

    private void move(Scenario from, double share, Object drag) {
        double inside = Math.max(LEAST, Math.min(1.0 - LEAST, share));
        design.change(Words.of("link.change.source"), drag, now -> SourcePosition.moved(from, inside));
    }
}
