package binspan.planner.viewmodel;

import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.function.BiPredicate;
import java.util.stream.IntStream;

/** Where a part is found again when others were added, removed or moved: elements and detectors go by more than their number. */
final class PartKept {
    private PartKept() {}

    /**
     * The same part of a changed scenario.
     *
     * @param part part of the scenario before
     * @return the same element or detector, its neighbour where it has gone
     */
    static LinkPart part(LinkPart part, Scenario before, Scenario now) {
        if (part instanceof LinkPart.Element element) {
            return element(
                    element,
                    element.site().arm(before).path(),
                    element.site().arm(now).path());
        }
        if (part instanceof LinkPart.Port port) {
            int kept = index(
                    port.port(),
                    port.site().arm(before).detectors(),
                    port.site().arm(now).detectors(),
                    Object::equals);
            return kept < 0 ? new LinkPart.Analyzer(port.site()) : new LinkPart.Port(port.site(), kept);
        }
        return part;
    }

    private static LinkPart element(LinkPart.Element element, List<PathElement> before, List<PathElement> now) {
        int kept = index(element.index(), before, now, PartKept::sameLabel);
        return kept < 0 ? new LinkPart.Coupling(element.site()) : new LinkPart.Element(element.site(), kept);
    }

    private static boolean sameLabel(PathElement one, PathElement other) {
        return one.label().isPresent() && one.label().equals(other.label()) && one.getClass() == other.getClass();
    }

    /** The place of an entry in a changed list, of its neighbour if it has gone, -1 if none is left. */
    private static <T> int index(int at, List<T> before, List<T> now, BiPredicate<T, T> alike) {
        if (at >= before.size() || changedInPlace(at, before, now)) {
            return Math.min(at, now.size() - 1);
        }
        T wanted = before.get(at);
        int same = nearest(at, now, wanted, Object::equals);
        int found = same >= 0 ? same : nearest(at, now, wanted, alike);
        return found >= 0 ? found : Math.min(at, now.size() - 1);
    }

    /** Whether nothing else in the list has changed. */
    private static <T> boolean changedInPlace(int at, List<T> before, List<T> now) {
        return before.size() == now.size()
                && IntStream.range(0, now.size())
                        .allMatch(i -> i == at || before.get(i).equals(now.get(i)));
    }

    private static <T> int nearest(int at, List<T> now, T wanted, BiPredicate<T, T> alike) {
        int nearest = -1;
        for (int i = 0; i < now.size(); i++) {
            boolean nearer = nearest < 0 || Math.abs(i - at) < Math.abs(nearest - at);
            if (nearer && alike.test(wanted, now.get(i))) {
                nearest = i;
            }
        }
        return nearest;
    }
}
