package binspan.planner.report;

import java.util.List;
import java.util.Locale;

/** Scenario paths in words: {@code both.detectors.jitterFwhmPs} is "jitter FWHM, both sides' detectors". */
public final class ParameterWords {
    private static final List<String> UNITS = List.of(
            "DbPerKm",
            "PerKmNm",
            "PerNmKm",
            "PerNmDb",
            "PerSqrtKm",
            "PerKmK",
            "PsPerNm",
            "PerSecond",
            "MilliK",
            "PerKm",
            "PerK",
            "Ps2",
            "Km",
            "Db",
            "Nm",
            "Ns",
            "Ps",
            "GHz",
            "MHz",
            "THz",
            "Bps",
            "Dbm",
            "Rad",
            "K",
            "S");
    private static final List<String> CAPITALS = List.of("fwhm", "rms", "pmd", "chsh", "qber", "car");

    private ParameterWords() {}

    /**
     * A short name for axes and tables: "jitter FWHM, both sides' detectors".
     *
     * @param path scenario path
     */
    public static String name(String path) {
        int last = path.lastIndexOf('.');
        String field = path.substring(last + 1);
        String words = spaced(withoutUnit(field));
        if (path.equals("link.lengthKm")) {
            return "fibre length of the link";
        }
        if (last < 0) {
            return words;
        }
        String where = where(path.substring(0, last));
        return where.isEmpty() ? words : words + where;
    }

    /** The same with a capital letter, for axis titles. */
    public static String title(String path) {
        String name = name(path);
        return Character.toUpperCase(name.charAt(0)) + name.substring(1);
    }

    private static String where(String parents) {
        String[] parts = parents.split("\\.", 2);
        String side = switch (parts[0]) {
            case "alice" -> "alice";
            case "bob" -> "bob";
            case "both" -> "both sides";
            default -> "";
        };
        String rest = side.isEmpty() ? "" : parts.length > 1 ? element(parts[1]) : "";
        String pump = parents.equals("source.pump") && side.isEmpty() ? ", pump" : "";
        String band = parents.startsWith("source.") && !parents.equals("source.pump") ? ", " + parts[1] : "";
        if (side.isEmpty()) {
            return pump + band;
        }
        return ", " + (rest.isEmpty() ? side : side + (side.endsWith("s") ? "' " : "'s ") + rest);
    }

    private static String element(String rest) {
        if (rest.startsWith("path.")) {
            return rest.substring("path.".length());
        }
        return rest.replace("path[", "element [")
                .replace("detectors[0]", "port 1")
                .replace("detectors[1]", "port 2")
                .replace(".", " ");
    }

    private static String withoutUnit(String field) {
        for (String unit : UNITS) {
            if (field.endsWith(unit) && field.length() > unit.length()) {
                String bare = field.substring(0, field.length() - unit.length());
                return bare.endsWith("Ps") ? bare.substring(0, bare.length() - 2) : bare;
            }
        }
        return field;
    }

    /** Camel case in separate words. */
    private static String spaced(String name) {
        StringBuilder words = new StringBuilder();
        for (int i = 0; i < name.length(); i++) {
            char c = name.charAt(i);
            if (Character.isUpperCase(c) && i > 0) {
                words.append(' ');
            }
            words.append(Character.toLowerCase(c));
        }
        String text = words.toString();
        for (String word : CAPITALS) {
            text = text.replaceAll("\\b" + word + "\\b", word.equals("rms") ? "rms" : word.toUpperCase(Locale.ROOT));
        }
        return text.replace("schmidt", "Schmidt").replace("raman", "Raman").replace("port1", "port 1");
    }
}
