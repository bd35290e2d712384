package binspan.study;

import binspan.prediction.FiniteKeyOutlook;
import binspan.prediction.LinkPrediction;
import binspan.prediction.ResultField;

/**
 * One figure of merit as a column of a table.
 *
 * @param field the figure
 * @param port detected port, 0 for port 1 and where there is only one value
 */
public record FigureColumn(ResultField field, int port) {
    /** Its published name, with the port where it has one: {@code alice.singlesPerSecond[0]}. */
    public String name() {
        return field.perPort() ? field.name() + "[" + port + "]" : field.name();
    }

    /** Its unit, empty for a bare number. */
    public String unit() {
        return field.unit();
    }

    /** The figure; NaN or infinite where it does not apply. */
    public double of(LinkPrediction prediction, FiniteKeyOutlook finite) {
        return field.reading().at(prediction, finite, port);
    }
}
