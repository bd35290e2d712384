package binspan.planner.cli;

import binspan.scenario.DispersionLaw;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreLimit;
import binspan.scenario.Range;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** The fibre classes as a listing. */
final class FibreCatalogue {
    private static final double DISPERSION_NM = 1550.0;
    private static final String PLANNED =
            "Planning values of deployed cable, splices and connectors apart (common practice)."
                    + " Values of your own in the scenario replace those of the class.";
    private static final String HEAD = """

                     dB/km at          ps/(nm km)
            class    1310  1550  1625  at 1550
            """;
    private static final String LIMITS = "Limits of ITU-T Recommendations G.652 to G.657, from memory: compare with the"
            + " Recommendation before quoting them.";

    private FibreCatalogue() {}

    /** The listing for a terminal. */
    static String text() {
        StringBuilder text = new StringBuilder(Paragraph.of(PLANNED, 0)).append(HEAD);
        for (FibreClass fibre : FibreClass.values()) {
            text.append(planned(fibre));
        }
        text.append('\n').append(Paragraph.of(LIMITS, 0)).append('\n');
        for (FibreClass fibre : FibreClass.values()) {
            text.append(fibre.text()).append('\n').append(Paragraph.of(limits(fibre), 4));
        }
        return text.toString();
    }

    private static String planned(FibreClass fibre) {
        return String.format(
                Locale.ROOT,
                "%-8s %4.2f  %4.2f  %4.2f  %5.2f  %s\n",
                fibre.text(),
                fibre.attenuation().at1310(),
                fibre.attenuation().at1550(),
                fibre.attenuation().at1625(),
                fibre.dispersion().at(DISPERSION_NM),
                fibre.meaning());
    }

    private static String limits(FibreClass fibre) {
        List<String> limits = new ArrayList<>();
        for (FibreLimit limit : fibre.limits()) {
            limits.add(limit.quantity().text() + " " + allowed(limit) + band(limit));
        }
        fibre.dispersionBounds().ifPresent(bounds -> limits.add(between(bounds)));
        return String.join("; ", limits);
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
        if (!bounded(limit)) {
            return "";
        }
        String from = Range.plain(limit.fromNm());
        return limit.fromNm() == limit.toNm()
                ? " at " + from + " nm"
                : " over " + from + "-" + Range.plain(limit.toNm()) + " nm";
    }

    private static boolean bounded(FibreLimit limit) {
        return Double.isFinite(limit.toNm());
    }

    /** The listing as rows of named values; what a class does not have is absent. */
    static List<Map<String, Object>> rows() {
        List<Map<String, Object>> rows = new ArrayList<>();
        for (FibreClass fibre : FibreClass.values()) {
            Map<String, Object> row = new LinkedHashMap<>();
            row.put("class", fibre.text());
            row.put("meaning", fibre.meaning());
            row.put("attenuationDbPerKmAt1310", fibre.attenuation().at1310());
            row.put("attenuationDbPerKmAt1550", fibre.attenuation().at1550());
            row.put("attenuationDbPerKmAt1625", fibre.attenuation().at1625());
            row.put("dispersionPsPerNmKmAt1550", fibre.dispersion().at(DISPERSION_NM));
            row.put("limits", limitRows(fibre));
            rows.add(row);
        }
        return rows;
    }

    private static List<Map<String, Object>> limitRows(FibreClass fibre) {
        List<Map<String, Object>> rows = new ArrayList<>();
        for (FibreLimit limit : fibre.limits()) {
            Map<String, Object> row = new LinkedHashMap<>();
            row.put("quantity", limit.quantity().text());
            row.put("unit", limit.quantity().unit());
            row.put("lowest", limit.allowed().lowest());
            row.put("highest", limit.allowed().highest());
            if (bounded(limit)) {
                row.put("fromNm", limit.fromNm());
                row.put("toNm", limit.toNm());
            }
            rows.add(row);
        }
        return rows;
    }
}
