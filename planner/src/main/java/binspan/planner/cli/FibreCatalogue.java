package binspan.planner.cli;

import binspan.planner.report.FibreClassWords;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreLimit;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** The fibre classes as a listing. */
final class FibreCatalogue {
    private static final double DISPERSION_NM = 1550.0;
    private static final String HEAD = """

                     dB/km at          ps/(nm km)
            class    1310  1550  1625  at 1550
            """;

    private FibreCatalogue() {}

    /** The listing for a terminal. */
    static String text() {
        StringBuilder text = new StringBuilder(
                        Paragraph.of(FibreClassWords.PLANNED + " " + FibreClassWords.REPLACED, 0))
                .append(HEAD);
        for (FibreClass fibre : FibreClass.values()) {
            text.append(planned(fibre));
        }
        text.append('\n').append(Paragraph.of(FibreClassWords.LIMITS, 0)).append('\n');
        for (FibreClass fibre : FibreClass.values()) {
            text.append(fibre.text())
                    .append('\n')
                    .append(Paragraph.of(String.join("; ", FibreClassWords.limits(fibre)), 4));
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
