package binspan.study.box;

import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.Workers;
import binspan.study.window.BoundedClimb;
import binspan.study.window.MarginFunction;
import binspan.study.window.OperatingWindow;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/** Where the searches for a box begin: feasible points of a Sobol scan with much room and far from one another, and the roomiest point of all. */
final class BoxStarts {
    private static final int SCAN = 8192;
    private static final int PORTION = 128;
    private static final int CLIMBS = 4;
    private static final int GENERATIONS = 250;
    private static final int MOST = 32;
    private static final double APART = 0.12;

    private final ToleranceBox question;
    private final Execution execution;
    private final double[][] points;
    private final double[] margins = new double[SCAN];

    BoxStarts(ToleranceBox question, Execution execution) {
        this.question = question;
        this.execution = execution;
        this.points = ShiftedSobol.shifted(SCAN, question.axes().size(), question.seed());
    }

    /** The feasible points, the roomiest first; if there is none, the point that comes nearest. */
    List<double[]> points() {
        if (question.centred()) {
            return List.of(question.plannedShares());
        }
        Workers.run(SCAN, PORTION, execution, () -> {
            MarginFunction function = question.function();
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    margins[i] = function.least(points[i]);
                }
            };
        });
        List<double[]> order = IntStream.range(0, SCAN)
                .boxed()
                .sorted(Comparator.comparingDouble(i -> -margins[i]))
                .map(i -> points[i])
                .toList();
        int feasible =
                (int) Arrays.stream(margins).filter(margin -> margin >= 0.0).count();
        List<double[]> first = new ArrayList<>(windows());
        first.addAll(feasible < MOST ? climbed(order) : List.of());
        return spread(first, order.subList(0, feasible));
    }

    /** Of a single parameter the best points of its operating windows, however narrow. */
    private List<double[]> windows() {
        if (question.axes().size() > 1) {
            return List.of();
        }
        Axis axis = question.axes().get(0);
        return new OperatingWindow(question.scenario(), axis)
                .run(execution.silent()).windows().stream()
                        .map(window ->
                                new double[] {axis.share(window.best().values().get(0))})
                        .toList();
    }

    /** The tops that the roomiest points lead to, the highest first. */
    private List<double[]> climbed(List<double[]> order) {
        List<double[]> from = spread(List.of(), order).subList(0, CLIMBS);
        double[][] tops = new double[CLIMBS][];
        int axes = question.axes().size();
        double[] ones = new double[axes];
        Arrays.fill(ones, 1.0);
        Workers.run(CLIMBS, 1, execution.silent(), () -> {
            MarginFunction function = question.function();
            return (first, end) -> {
                for (int i = first; i < end; i++) {
                    tops[i] = new BoundedClimb(place -> least(function, place), new double[axes], ones)
                            .from(from.get(i), GENERATIONS, 0.0);
                }
            };
        });
        MarginFunction function = question.function();
        return Arrays.stream(tops)
                .sorted(Comparator.comparingDouble(top -> -function.least(top)))
                .toList();
    }

    private double least(MarginFunction function, double[] place) {
        execution.stopIfCancelled();
        return function.least(place);
    }

    /** Points far from one another, in their order. */
    private static List<double[]> spread(List<double[]> first, List<double[]> order) {
        List<double[]> chosen = new ArrayList<>(first);
        for (double[] point : order) {
            if (chosen.size() < MOST && chosen.stream().allMatch(other -> distance(point, other) > APART)) {
                chosen.add(point);
            }
        }
        return chosen;
    }

    private static double distance(double[] first, double[] second) {
        double distance = 0.0;
        for (int j = 0; j < first.length; j++) {
            distance = Math.max(distance, Math.abs(first[j] - second[j]));
        }
        return distance;
    }
}
