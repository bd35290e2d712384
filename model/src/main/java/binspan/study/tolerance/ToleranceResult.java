package binspan.study.tolerance;

import binspan.prediction.Requirement;
import binspan.study.StudyTable;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** What a tolerance study found. */
public final class ToleranceResult {
    private static final double RARE = 0.05;

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
        this.drivers = ranked(drivers);
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

    /**
     * What drives failures, the strongest first: by the failures' first-order index; by the correlation with the weakest requirement where fewer than one
     * build in twenty fails or holds; by the index of the least margin where none fails.
     */
    public List<FailureDriver> drivers() {
        return drivers;
    }

    /** The requirement that fails most often; absent where none does. */
    public Optional<Requirement> weakest() {
        return weakestIndex() < 0
                ? Optional.empty()
                : Optional.of(requirements.get(weakestIndex()).requirement());
    }

    private int weakestIndex() {
        int weakest = -1;
        for (int i = 0; i < requirements.size(); i++) {
            BuildShare share = requirements.get(i).share();
            boolean fails = share.met() < share.builds();
            if (fails
                    && (weakest < 0
                            || share.met() < requirements.get(weakest).share().met())) {
                weakest = i;
            }
        }
        return weakest;
    }

    /** Rank correlation of a parameter with the margin of the weakest requirement; with the least margin where none fails. */
    public double correlation(FailureDriver driver) {
        int weakest = weakestIndex();
        return weakest < 0 ? driver.correlation() : driver.correlations().get(weakest);
    }

    /** The same where failures are too rare or too common to tell much by themselves: the strongest correlation first. */
    private List<FailureDriver> ranked(List<FailureDriver> found) {
        double share = all.share();
        boolean telling = weakestIndex() < 0 || (share > RARE && share < 1.0 - RARE);
        return telling
                ? List.copyOf(found)
                : found.stream()
                        .sorted(Comparator.comparingDouble((FailureDriver driver) -> {
                            double size = Math.abs(correlation(driver));
                            return Double.isNaN(size) ? 1.0 : -size;
                        }))
                        .toList();
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
