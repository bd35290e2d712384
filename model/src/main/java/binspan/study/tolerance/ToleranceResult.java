package binspan.study.tolerance;

import binspan.study.StudyTable;
import java.util.List;

/** What a tolerance study found. */
public final class ToleranceResult {
    private final ToleranceBuilds builds;
    private final BuildShare all;
    private final List<RequirementShare> requirements;
    private final List<FigureStatistics> figures;
    private final List<FailureDriver> drivers;

    ToleranceResult(
            ToleranceBuilds builds,
            List<RequirementShare> requirements,
            List<FigureStatistics> figures,
            List<FailureDriver> drivers) {
        this.builds = builds;
        this.all = BuildShare.of(builds.table().met(), builds.table().rows());
        this.requirements = List.copyOf(requirements);
        this.figures = List.copyOf(figures);
        this.drivers = List.copyOf(drivers);
    }

    /** The study that was run. */
    public Tolerance study() {
        return builds.study();
    }

    /** The distributions of the spread parameters in the order of the study, with the shares that their ranges cut off. */
    public List<SpreadDistribution> distributions() {
        return builds.distributions();
    }

    /** All builds: spread values, figures, whether they meet all requirements. */
    public StudyTable table() {
        return builds.table();
    }

    /** The share of builds that meet all requirements; 1 where nothing is required. */
    public BuildShare all() {
        return all;
    }

    /** The share of builds that meet each stated requirement. */
    public List<RequirementShare> requirements() {
        return requirements;
    }

    /** The scatter of each tabulated figure. */
    public List<FigureStatistics> figures() {
        return figures;
    }

    /** What drives failures, the strongest first: by the failures' first-order index if {@link #someFail()}, otherwise by the least margin's. */
    public List<FailureDriver> drivers() {
        return drivers;
    }

    /** Whether some builds fail and some do not. */
    public boolean someFail() {
        return all.met() > 0 && all.met() < all.builds();
    }

    /** The least margin of every build, on the scale of {@link binspan.prediction.RequirementMargins}; a copy. */
    public double[] leastMargins() {
        return builds.least().clone();
    }

    /** The margin of one of the stated requirements in every build, on the same scale; a copy. */
    public double[] margins(int requirement) {
        return builds.marginsOf(requirement).clone();
    }

    /** The predicted figure of one of the stated requirements in every build, in its unit; NaN or infinite where there is none; a copy. */
    public double[] predicted(int requirement) {
        return builds.predictedOf(requirement).clone();
    }
}
