package binspan.study.window;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import java.util.List;
import java.util.concurrent.CancellationException;

/**
 * Every interval of one parameter in which all requirements hold, its ends solved.
 *
 * @param scenario the link as written, with at least one requirement
 * @param axis the varied parameter and its range; its steps are the samples of the first scan if they are more than {@value #FEWEST_SAMPLES}
 */
public record OperatingWindow(Scenario scenario, Axis axis) {
    /** Fewest samples of the first scan. */
    public static final int FEWEST_SAMPLES = 4097;

    /**
     * Checks the description.
     *
     * @throws IllegalArgumentException if nothing is required or the parameter cannot be varied here
     */
    public OperatingWindow {
        MarginFunction.check(scenario, List.of(axis));
    }

    /**
     * Finds the windows. The range is scanned in the axis' own scale; then every turn of every requirement's margin on its way to zero is followed, so
     * that windows and gaps narrower than the samples are found too. Each end lies within 1e-9 of the exact one, relative, and still meets all
     * requirements. A feature that leaves no turn in the samples stays unseen; more steps of the axis make the scan finer.
     *
     * @throws CancellationException if it shall stop
     */
    public OperatingIntervals run(Execution execution) {
        return new WindowSearch(this, execution).result();
    }
}
