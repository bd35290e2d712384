package binspan.planner.picture;

import binspan.planner.plot.RequirementLine;
import binspan.planner.report.RequiredFigure;
import binspan.planner.report.RequirementWords;
import binspan.prediction.Requirement;
import binspan.scenario.Requirements;
import binspan.study.FigureColumn;
import java.util.Optional;

/** Requirements as lines over the figures that they are held against. */
final class RequirementLines {
    private RequirementLines() {}

    /** The line of a figure, if the scenario requires something of it. */
    static Optional<RequirementLine> of(FigureColumn column, Requirements require) {
        return RequiredFigure.of(require).stream()
                .filter(required -> required.figure().equals(column.field().name()))
                .findFirst()
                .map(required -> of(required.requirement(), required.required(), required.limit()));
    }

    /**
     * A line in the words of the verdict.
     *
     * @param requirement which
     * @param required required figure, in the requirement's unit
     * @param limit the same in the unit of the axis
     */
    static RequirementLine of(Requirement requirement, double required, double limit) {
        return RequirementLine.of(RequirementWords.required(requirement, required), limit, requirement.atLeast());
    }
}
