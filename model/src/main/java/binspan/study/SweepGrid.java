package binspan.study;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.Parameter;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * The grid of a sweep and the order in which it is walked: the parameter that leaves most of the work as it is changes quickest, whatever its place in
 * the table.
 */
final class SweepGrid {
    private final Sweep sweep;
    private final int[] order;
    private final double[][] values;
    private final int inner;
    private final int lines;

    SweepGrid(Sweep sweep) {
        this.sweep = sweep;
        this.order = byEffort();
        this.values = new double[order.length][];
        for (int i = 0; i < order.length; i++) {
            values[i] = sweep.axes().get(order[i]).values();
        }
        this.inner = values[order.length - 1].length;
        this.lines = sweep.points() / inner;
    }

    /** Positions of the axes, the most laborious first. */
    private int[] byEffort() {
        List<Integer> positions = new ArrayList<>();
        for (int i = 0; i < sweep.axes().size(); i++) {
            positions.add(i);
        }
        positions.sort(Comparator.comparingInt(i -> -effort(sweep.axes().get(i))));
        return positions.stream().mapToInt(Integer::intValue).toArray();
    }

    private int effort(Axis axis) {
        LinkPredictor predictor = new LinkPredictor();
        LinkPrediction from = predictor.of(axis.parameter().with(sweep.scenario(), axis.from()));
        LinkPrediction to = predictor.of(axis.parameter().with(sweep.scenario(), axis.to()));
        return to.renewedSince(from);
    }

    StudyTable run(Execution execution, int portion) {
        List<String> paths =
                sweep.axes().stream().map(axis -> axis.parameter().path()).toList();
        StudyTable table = new StudyTable(paths, sweep.columns(), sweep.points(), places());
        Workers.run(lines, Math.max(1, portion / inner), execution, () -> new Walk(table));
        return table;
    }

    /** For each row of the table, counted with the last axis quickest, its place along the walk. */
    private int[] places() {
        int count = order.length;
        int[] strides = new int[count];
        int stride = 1;
        for (int i = count - 1; i >= 0; i--) {
            strides[order[i]] = stride;
            stride *= values[i].length;
        }
        int[] places = new int[sweep.points()];
        for (int row = 0; row < places.length; row++) {
            int rest = row;
            for (int i = count - 1; i >= 0; i--) {
                int steps = sweep.axes().get(i).steps();
                places[row] += rest % steps * strides[i];
                rest /= steps;
            }
        }
        return places;
    }

    /** One thread's walk along lines of the quickest axis. */
    private final class Walk implements Workers.Work {
        private final StudyTable table;
        private final PointEvaluator evaluator;
        private final FigureReader reader;
        private final double[] point = new double[order.length];

        Walk(StudyTable table) {
            this.table = table;
            this.reader = new FigureReader(sweep.columns());
            List<Parameter> ordered = new ArrayList<>();
            for (int position : order) {
                ordered.add(sweep.axes().get(position).parameter());
            }
            this.evaluator = new PointEvaluator(sweep.scenario(), ordered);
        }

        @Override
        public void on(int first, int end) {
            for (int line = first; line < end; line++) {
                along(line);
            }
        }

        private void along(int line) {
            int rest = line;
            for (int i = order.length - 2; i >= 0; i--) {
                point[i] = values[i][rest % values[i].length];
                rest /= values[i].length;
            }
            for (int step = 0; step < inner; step++) {
                point[order.length - 1] = values[order.length - 1][step];
                fill(line * inner + step);
            }
        }

        private void fill(int place) {
            LinkPrediction prediction = evaluator.at(point);
            int start = table.start(place);
            for (int i = 0; i < order.length; i++) {
                table.numbers()[start + order[i]] = point[i];
            }
            reader.read(prediction, table.numbers(), start + order.length);
            table.meets(place, evaluator.margins().met(prediction));
        }
    }
}
