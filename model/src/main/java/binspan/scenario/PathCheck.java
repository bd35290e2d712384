package binspan.scenario;

import java.util.List;
import java.util.Map;

/** Checks that the paths named in {@code spread} and {@code provenance} lead to a field. */
final class PathCheck {
    private PathCheck() {}

    static void check(Values stated, List<Problem> problems) {
        for (String section : List.of("spread", "provenance")) {
            if (stated.get(section) instanceof Map<?, ?> entries) {
                entries.keySet().forEach(path -> check(stated, section, (String) path, problems));
            }
        }
    }

    private static void check(Values stated, String section, String path, List<Problem> problems) {
        try {
            boolean numeric = ParameterPaths.expand(path).stream()
                    .allMatch(each -> each.equals(LinkLength.PATH)
                            || PathParser.parse(stated, each, path)
                                    .field()
                                    .kind()
                                    .numeric());
            if (section.equals("spread") && !numeric) {
                problems.add(new Problem(
                        section + "." + path, "found a path to something without a number; allowed a number's path"));
            }
        } catch (IllegalArgumentException e) {
            problems.add(new Problem(section + "." + path, e.getMessage()));
        }
    }
}
