package binspan.study.region;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Deque;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Joins stretches that share their ends into lines: open ones from their beginnings, then closed ones. */
final class StretchChain {
    private final Map<Spot, Deque<Stretch>> byStart = new LinkedHashMap<>();
    private final Set<Spot> ends = new HashSet<>();

    private StretchChain(Collection<Stretch> stretches) {
        for (Stretch stretch : stretches) {
            byStart.computeIfAbsent(stretch.from(), start -> new ArrayDeque<>()).add(stretch);
            ends.add(stretch.to());
        }
    }

    /** The lines, each as its corners in order; a closed one repeats its first corner. */
    static List<List<Spot>> join(Collection<Stretch> stretches) {
        StretchChain chain = new StretchChain(stretches);
        List<List<Spot>> lines = new ArrayList<>();
        List<Spot> starts = List.copyOf(chain.byStart.keySet());
        starts.stream().filter(start -> !chain.ends.contains(start)).forEach(start -> chain.follow(start, lines));
        starts.forEach(start -> chain.follow(start, lines));
        return lines;
    }

    private void follow(Spot start, List<List<Spot>> lines) {
        while (byStart.containsKey(start)) {
            List<Spot> line = new ArrayList<>(List.of(start));
            Spot here = start;
            do {
                here = next(here);
                line.add(here);
            } while (byStart.containsKey(here) && !here.equals(start));
            lines.add(line);
        }
    }

    private Spot next(Spot here) {
        Deque<Stretch> leaving = byStart.get(here);
        Stretch stretch = leaving.removeFirst();
        if (leaving.isEmpty()) {
            byStart.remove(here);
        }
        return stretch.to();
    }
}
