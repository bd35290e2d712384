package binspan.study.window;

import java.util.Comparator;
import java.util.List;

/**
 * All requirements at one point of a study.
 *
 * @param values the varied parameters there, in their units and in the order of the axes
 * @param requirements every stated requirement, at least one
 */
public record PointVerdict(List<Double> values, List<RequirementMargin> requirements) {
    /** Copies the lists. */
    public PointVerdict {
        values = List.copyOf(values);
        requirements = List.copyOf(requirements);
    }

    /** The requirement with the least margin: the one that is missed most, or met most narrowly. */
    public RequirementMargin tightest() {
        return requirements.stream()
                .min(Comparator.comparingDouble(RequirementMargin::margin))
                .orElseThrow();
    }

    /** The least margin. */
    public double leastMargin() {
        return tightest().margin();
    }

    /** Whether all requirements are met. */
    public boolean met() {
        return leastMargin() >= 0.0;
    }

    /** The requirements that are missed, the one missed least first. */
    public List<RequirementMargin> violated() {
        return requirements.stream()
                .filter(each -> !each.met())
                .sorted(Comparator.comparingDouble(RequirementMargin::margin).reversed())
                .toList();
    }
}
