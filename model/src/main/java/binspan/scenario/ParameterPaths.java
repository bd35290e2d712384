package binspan.scenario;

import binspan.scenario.PathParser.Address;
import java.util.List;

/**
 * Resolves scenario paths such as {@code alice.detectors.efficiency}, {@code both.clockJitterRmsPs} or
 * {@code link.lengthKm}.
 */
public final class ParameterPaths {
    private static final String BOTH = "both.";

    private ParameterPaths() {}

    /**
     * The parameter of a path.
     *
     * @param scenario scenario whose path elements and detectors the path may name
     * @param path scenario path
     * @throws IllegalArgumentException if the path leads to no number, with the nearest names
     */
    public static Parameter find(Scenario scenario, String path) {
        if (path.equals(LinkLength.PATH)) {
            return new LinkLength();
        }
        List<Address> addresses = expand(path).stream()
                .map(each -> PathParser.parse(scenario, each, path))
                .toList();
        if (!addresses.get(0).field().kind().numeric()) {
            throw new IllegalArgumentException("path \"" + path + "\" leads to "
                    + addresses.get(0).field().kind().words() + "; needs a number's path");
        }
        return new FieldParameter(path, addresses);
    }

    /** The paths that a path stands for: two of them for one that starts with {@code both.}. */
    static List<String> expand(String path) {
        if (!path.startsWith(BOTH)) {
            return List.of(path);
        }
        String rest = path.substring(BOTH.length());
        return List.of("alice." + rest, "bob." + rest);
    }
}
