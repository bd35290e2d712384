package binspan.planner.report;

import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import binspan.study.StudyTable;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;

/** What the points of a sweep tell about requirements: where they are met, where each is met best, where most room is left. */
final class SweepFindings {
    /**
     * A run of neighbouring points.
     *
     * @param first first row
     * @param last last row
     */
    record Run(int first, int last) {}

    private final StudyTable table;
    private final List<RequiredFigure> required;
    private final Map<Requirement, Integer> columns = new EnumMap<>(Requirement.class);

    SweepFindings(StudyTable table, List<RequiredFigure> required) {
        this.table = table;
        this.required = required;
        for (Requirement requirement : Requirement.stateable()) {
            columns.put(requirement, table.indexOf(RequiredFigure.figure(requirement)));
        }
    }

    /** The runs of rows that meet all requirements, for a sweep of one parameter. */
    List<Run> met() {
        List<Run> runs = new ArrayList<>();
        int first = -1;
        for (int row = 0; row <= table.rows(); row++) {
            boolean meets = row < table.rows() && table.meets(row);
            if (meets && first < 0) {
                first = row;
            } else if (!meets && first >= 0) {
                runs.add(new Run(first, row - 1));
                first = -1;
            }
        }
        return runs;
    }

    /** A required figure in a row, in the requirement's unit; NaN where the link has none. */
    double value(RequiredFigure figure, int row) {
        int column = columns.get(figure.requirement());
        return column < 0 ? Double.NaN : figure.inUnit(table.figure(column, row));
    }

    /** The first row with the best value of a required figure, if there is any. */
    OptionalInt best(RequiredFigure figure) {
        int best = -1;
        for (int row = 0; row < table.rows(); row++) {
            double value = value(figure, row);
            if (Double.isFinite(value) && (best < 0 || better(figure, value, value(figure, best)))) {
                best = row;
            }
        }
        return best < 0 ? OptionalInt.empty() : OptionalInt.of(best);
    }

    private static boolean better(RequiredFigure figure, double value, double than) {
        return figure.requirement().atLeast() ? value > than : value < than;
    }

    /** Whether a required figure is the same in all rows, rounding left out. */
    boolean steady(RequiredFigure figure) {
        double first = value(figure, 0);
        for (int row = 1; row < table.rows(); row++) {
            double value = value(figure, row);
            if (!(Math.abs(value - first) <= 1e-9 * Math.abs(first))) {
                return false;
            }
        }
        return true;
    }

    /** The row whose least margin is largest, of those that meet all requirements if there are any; of equal ones that with most room in all. */
    int roomiest() {
        boolean someMeet = table.met() > 0;
        int best = -1;
        double most = Double.NEGATIVE_INFINITY;
        for (int row = 0; row < table.rows(); row++) {
            double least = margin(tightest(row), row);
            boolean counts = !someMeet || table.meets(row);
            if (counts && (least > most || (least == most && room(row) > room(best)))) {
                best = row;
                most = least;
            }
        }
        return best;
    }

    private double room(int row) {
        double sum = 0.0;
        for (RequiredFigure figure : required) {
            sum += margin(figure, row);
        }
        return sum;
    }

    /** The requirement with the least margin in a row. */
    RequiredFigure tightest(int row) {
        RequiredFigure tightest = required.get(0);
        for (RequiredFigure figure : required) {
            if (margin(figure, row) < margin(tightest, row)) {
                tightest = figure;
            }
        }
        return tightest;
    }

    /** Room as the logarithm of the ratio of figure and requirement, positive where it is met, within the same bounds as the model's margins. */
    private double margin(RequiredFigure figure, int row) {
        double value = value(figure, row);
        if (!Double.isFinite(value)) {
            return RequirementMargins.NO_FIGURE;
        }
        double ratio = figure.requirement().atLeast() ? value / figure.required() : figure.required() / value;
        double margin = Double.isNaN(ratio) ? 0.0 : Math.log(ratio);
        return Math.max(RequirementMargins.NO_FIGURE, Math.min(RequirementMargins.AMPLE, margin));
    }
}
