package binspan.prediction.histogram;

import java.util.List;

/**
 * Clicks of one side.
 *
 * @param all all ports added
 * @param ports each port, in their order
 */
public record SideHistogram(ClickHistogram all, List<ClickHistogram> ports) {
    /** Copies the list. */
    public SideHistogram {
        ports = List.copyOf(ports);
    }
}
