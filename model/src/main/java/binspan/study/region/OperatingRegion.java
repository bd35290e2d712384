package binspan.study.region;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.window.MarginFunction;
import java.util.List;
import java.util.concurrent.CancellationException;

/**
 * The region of two parameters in which all requirements hold.
 *
 * @param scenario the link as written, with at least one requirement
 * @param horizontal first parameter; its steps are the columns of the map
 * @param vertical second parameter; its steps are the rows
 */
public record OperatingRegion(Scenario scenario, Axis horizontal, Axis vertical) {
    /** Steps of an axis where nothing else is asked for. */
    public static final int USUAL_STEPS = 129;

    /** Most points of a map. */
    public static final long MOST_POINTS = 4_000_000L;

    /**
     * Checks the description.
     *
     * @throws IllegalArgumentException if nothing is required, if the map has too many points or if the parameters cannot be varied here or not together
     */
    public OperatingRegion {
        MarginFunction.check(scenario, List.of(horizontal, vertical));
        long points = (long) horizontal.steps() * vertical.steps();
        if (points > MOST_POINTS) {
            throw new IllegalArgumentException(
                    "found " + points + " points of the map; allowed " + MOST_POINTS + ": take fewer steps");
        }
    }

    /**
     * Computes the map. The margins are known at the crossings of its lines; on every line the places at which a margin passes zero are solved, also
     * those that come in pairs between two crossings. Islands and holes smaller than a cell are searched for at each peak and hollow of the margins, and
     * drawn with additional lines. What leaves no trace in the samples stays unseen; more steps make the map finer.
     *
     * @throws CancellationException if it shall stop
     */
    public RegionMap run(Execution execution) {
        return new RegionSearch(this, execution).result();
    }

    /**
     * Computes the margins at the points of the map and nothing else: quick enough to follow a hand that moves a parameter. They equal those of {@link
     * #run} at every point.
     *
     * @throws CancellationException if it shall stop
     */
    public MarginGrid survey(Execution execution) {
        RegionGrid grid = RegionGrid.of(this, RegionGrid.shares(horizontal), RegionGrid.shares(vertical), execution);
        return new MarginGrid(this, function().margins(), grid);
    }

    /** The margins over the map, for one thread. */
    MarginFunction function() {
        return new MarginFunction(scenario, List.of(horizontal, vertical));
    }
}
