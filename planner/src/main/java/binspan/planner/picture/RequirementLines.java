package binspan.planner.picture;

import binspan.planner.plot.RequirementLine;
import binspan.planner.report.RequiredFigure;
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
                .map(required -> required.requirement().atLeast()
                        ? RequirementLine.atLeast(required.limit(), column.unit())
                        : RequirementLine.atMost(required.limit(), column.unit()));
    }
}
