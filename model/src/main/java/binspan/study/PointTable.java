package binspan.study;

import binspan.prediction.LinkPrediction;
import binspan.scenario.Parameter;
import binspan.scenario.Scenario;
import java.util.List;

/** Some points of a study as a table. */
public final class PointTable {
    private PointTable() {}

    /**
     * The figures of merit at given points.
     *
     * @param scenario the link as written
     * @param axes varied parameters
     * @param columns figures of merit
     * @param points values of the parameters, one list for each row
     */
    public static StudyTable of(
            Scenario scenario, List<Axis> axes, List<FigureColumn> columns, List<List<Double>> points) {
        List<Parameter> parameters = axes.stream().map(Axis::parameter).toList();
        List<String> paths = parameters.stream().map(Parameter::path).toList();
        StudyTable table = new StudyTable(paths, columns, points.size());
        PointEvaluator evaluator = new PointEvaluator(scenario, parameters);
        FigureReader reader = new FigureReader(columns);
        for (int row = 0; row < points.size(); row++) {
            double[] values =
                    points.get(row).stream().mapToDouble(Double::doubleValue).toArray();
            LinkPrediction prediction = evaluator.at(values);
            int start = table.start(row);
            System.arraycopy(values, 0, table.numbers(), start, values.length);
            reader.read(prediction, table.numbers(), start + values.length);
            table.meets(row, evaluator.margins().met(prediction));
        }
        return table;
    }
}
