package binspan.study.tolerance;

import java.util.List;

/**
 * How much one parameter's spread has to do with failures.
 *
 * @param path scenario path of the parameter
 * @param correlation rank correlation of Spearman with the least margin, -1 to 1; below 0 where more of the parameter takes margin away, NaN where the
 *     margin does not vary
 * @param correlations the same with the margin of each requirement, in their order
 * @param margin first-order index of the least margin
 * @param failure first-order index of meeting all requirements or not; NaN where all builds do or none does
 */
public record FailureDriver(
        String path, double correlation, List<Double> correlations, FirstOrderIndex margin, FirstOrderIndex failure) {}
