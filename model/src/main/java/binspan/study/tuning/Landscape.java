package binspan.study.tuning;

import binspan.prediction.LinkPrediction;
import binspan.prediction.SlotFit;
import binspan.study.Axis;
import binspan.study.PointEvaluator;
import java.util.List;

/**
 * What a search for best settings sees, for one thread: points of the unit cube, each side one axis in its own scale.
 *
 * <p>The score is the objective's merit less a penalty in proportion to the violation of the tightest requirement. Beyond a certain weight such a penalty
 * is exact: the best score is that of the best point which meets everything (Zangwill, Management Science 13, 344 (1967), from memory).
 */
final class Landscape {
    private final PointEvaluator evaluator;
    private final List<Axis> axes;
    private final Objective objective;
    private final double weight;
    private final double allowedRoom;
    private final double[] values;
    private Candidate best;
    private int evaluations;

    /** A point that was looked at. */
    static final class Candidate {
        private final double[] point;
        private final double merit;
        private final double least;

        Candidate(double[] point, double merit, double least) {
            this.point = point;
            this.merit = merit;
            this.least = least;
        }

        /** Its place in the unit cube. */
        double[] point() {
            return point.clone();
        }

        /** Whether it meets all requirements inside the limits of the model. */
        boolean feasible() {
            return least >= 0.0;
        }

        /** Better: meeting before failing, then the higher merit; among failing ones the one that fails by less. */
        boolean betterThan(Candidate other) {
            if (other == null) {
                return true;
            }
            if (feasible() != other.feasible()) {
                return feasible();
            }
            return feasible() ? merit > other.merit : least > other.least;
        }
    }

    Landscape(PointEvaluator evaluator, List<Axis> axes, Objective objective, double weight) {
        this.evaluator = evaluator;
        this.axes = axes;
        this.objective = objective;
        this.weight = weight;
        this.allowedRoom = Math.min(0.0, SlotFit.room(evaluator.base()));
        this.values = new double[axes.size()];
    }

    /** The score at a point of the unit cube; the best point of all is kept. */
    double score(double[] point) {
        evaluations++;
        for (int i = 0; i < values.length; i++) {
            values[i] = axes.get(i).at(Math.max(0.0, Math.min(1.0, point[i])));
        }
        LinkPrediction prediction = evaluator.at(values);
        double room = SlotFit.room(prediction.scenario()) - allowedRoom;
        double least = Math.min(room, evaluator.margins().least(prediction));
        double merit = objective.merit(prediction, evaluator.margins());
        Candidate candidate = new Candidate(point, merit, least);
        if (candidate.betterThan(best)) {
            best = new Candidate(point.clone(), merit, least);
        }
        return merit + weight * Math.min(0.0, least);
    }

    /** The best point looked at so far, null at first. */
    Candidate best() {
        return best;
    }

    /** How many points were looked at. */
    int evaluations() {
        return evaluations;
    }
}
