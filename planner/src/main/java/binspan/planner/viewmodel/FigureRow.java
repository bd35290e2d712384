package binspan.planner.viewmodel;

/**
 * A figure of merit.
 *
 * @param name its name
 * @param value its value with unit
 * @param change against the saved link
 */
public record FigureRow(String name, String value, ChangeMark change) {
    /** The row for somebody who hears it. */
    public String spoken() {
        return name + " " + value + (change.spoken().isEmpty() ? "" : ", " + change.spoken());
    }
}
