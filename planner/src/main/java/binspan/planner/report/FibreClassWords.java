package binspan.planner.report;

import binspan.scenario.DispersionLaw;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreLimit;
import binspan.scenario.Range;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** What the catalogue of fibre classes says about its numbers: limits, and where they and the planning values come from. */
public final class FibreClassWords {
    /** Where the planning values come from. */
    public static final String PLANNED =
            "Planning values of deployed cable, splices and connectors apart (common practice).";

    /** What becomes of them where the file states its own. */
    public static final String REPLACED = "Values of your own in the scenario replace those of the class.";

    /** Where the limits come from. */
    public static final String LIMITS = "Limits of ITU-T Recommendations G.652 to G.657, from memory: compare with the"
            + " Recommendation before quoting them.";

    /** Where the temperature coefficient of the delay comes from. */
    public static final String DELAY =
            "Delay against temperature: solid-core fibre, Slavik et al., Sci. Rep. 5, 15447 (2015).";

    private static final double DISPERSION_NM = 1550.0;

    private FibreClassWords() {}

    /** The limits of a class, one text each: "attenuation at most 0.4 dB/km over 1310-1625 nm". */
    public static List<String> limits(FibreClass fibre) {
        List<String> limits = new ArrayList<>();
        for (FibreLimit limit : fibre.limits()) {
            limits.add(limit.quantity().text() + " " + allowed(limit) + band(limit));
        }
        fibre.dispersionBounds().ifPresent(bounds -> limits.add(between(bounds)));
        return List.copyOf(limits);
    }

    private static String allowed(FibreLimit limit) {
        String unit = limit.quantity().unit();
        Range range = limit.allowed();
        return range.lowest() == 0.0 ? "at most " + Range.plain(range.highest()) + " " + unit : range.text(unit);
    }

    private static String between(DispersionLaw.Middle bounds) {
        double lowest = bounds.lowest().at(DISPERSION_NM);
        double highest = bounds.highest().at(DISPERSION_NM);
        return String.format(
                Locale.ROOT, "dispersion %.2f to %.2f ps/(nm km) at 1550 nm (bounding lines)", lowest, highest);
    }

    private static String band(FibreLimit limit) {
        if (!Double.isFinite(limit.toNm())) {
            return "";
        }
        String from = Range.plain(limit.fromNm());
        return limit.fromNm() == limit.toNm()
                ? " at " + from + " nm"
                : " over " + from + "-" + Range.plain(limit.toNm()) + " nm";
    }
}
