package binspan.planner.viewmodel;

import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;

/**
 * Where a number comes from, as the file says it.
 *
 * @param key scenario path under which it says so, maybe one that stands for both arms or ports
 * @param text what it says, empty for nothing
 */
record Origin(String key, String text) {
    /** The provenance of a place; where the file has none, the path under which it would be written. */
    static Origin of(Scenario scenario, String path) {
        String labelled = ElementPath.labelled(scenario, path);
        List<String> keys = new ArrayList<>(List.of(labelled, path));
        for (String key : List.of(labelled, path)) {
            String each = key.replaceAll("(detectors|classicalChannels)\\[\\d+]", "$1");
            keys.add(each);
            keys.add(key.replaceFirst("^(alice|bob)\\.", "both."));
            keys.add(each.replaceFirst("^(alice|bob)\\.", "both."));
        }
        return keys.stream()
                .filter(scenario.provenance()::containsKey)
                .findFirst()
                .map(key -> new Origin(key, scenario.provenance().get(key)))
                .orElse(new Origin(labelled, ""));
    }
}
