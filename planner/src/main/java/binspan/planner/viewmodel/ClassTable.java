package binspan.planner.viewmodel;

import binspan.planner.report.DetectorClassWords;
import binspan.planner.report.FibreClassWords;
import binspan.planner.report.Figure;
import binspan.planner.report.ParameterWords;
import binspan.scenario.Arm;
import binspan.scenario.Detector;
import binspan.scenario.DetectorClass;
import binspan.scenario.DetectorClass.Typical;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreSpan;
import binspan.scenario.Gate;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What a catalogue class brings into the scenario, beside what is in force.
 *
 * @param meaning what the class is
 * @param lines its values
 * @param limits limits of its Recommendation, one text each
 * @param sources where the numbers come from, one text each
 */
public record ClassTable(String meaning, List<Line> lines, List<String> limits, List<String> sources) {

    /**
     * One value of a class.
     *
     * @param quantity what it is
     * @param ofClass the class's value with its unit
     * @param stated the file's value in its place, empty where that of the class is in force
     */
    public record Line(String quantity, String ofClass, String stated) {
        /** Whether the file's own value is in force. */
        public boolean replaced() {
            return !stated.isEmpty();
        }
    }

    /** The table of an object of the file, absent where it names no class. */
    static Optional<ClassTable> of(Scenario scenario, String object, Values stated) {
        Object found = PlannedValue.at(scenario, object).orElse(null);
        if (found instanceof Detector detector) {
            return detector.detectorClass().map(known -> detector(known, detector, stated));
        }
        return found instanceof FibreSpan span ? Optional.of(fibre(scenario, object, span, stated)) : Optional.empty();
    }

    private static ClassTable detector(DetectorClass known, Detector detector, Values stated) {
        Typical typical = known.typical();
        Rows rows = new Rows(stated);
        rows.add("efficiency", typical.efficiency(), "");
        rows.lines.add(dark(known, detector, stated));
        rows.add("jitterFwhmPs", typical.jitterFwhmPs(), "ps");
        rows.add("deadTimeNs", typical.deadTimeNs(), "ns");
        rows.add("afterpulseProbability", typical.afterpulseProbability(), "");
        return new ClassTable(
                known.meaning(),
                List.copyOf(rows.lines),
                List.of(Words.of(
                        "form.class.wavelengths", Figure.bare(known.shortestNm()), Figure.bare(known.longestNm()))),
                List.of(known.provenance(), DetectorClassWords.PLANNED));
    }

    private static Line dark(DetectorClass known, Detector detector, Values stated) {
        boolean replaced = stated.has("gate") || stated.has("darkCountsPerSecond");
        return new Line(
                Words.of("form.class.dark"),
                dark(known.gate(), known.typical().darkCountsPerSecond()),
                replaced ? dark(detector.gate(), detector.darkCountsPerSecond()) : "");
    }

    private static String dark(Optional<Gate> gate, double perSecond) {
        return gate.map(each -> Words.of("form.class.gated", Figure.stated(each.darkProbability(), "")))
                .orElse(Figure.stated(perSecond, "/s"));
    }

    private static ClassTable fibre(Scenario scenario, String object, FibreSpan span, Values stated) {
        Arm arm = object.startsWith("alice") ? scenario.alice() : scenario.bob();
        double nm = scenario.bandOf(arm).centreNm();
        FibreClass fibre = span.fibre();
        Rows rows = new Rows(stated);
        rows.lines.add(attenuation(span, fibre.attenuation().at(nm)));
        rows.add("dispersionPsPerNmKm", fibre.dispersion().at(nm), "ps/(nm km)");
        rows.add("pmdPsPerSqrtKm", FibreClass.PMD_PS_PER_SQRT_KM, "ps/sqrt(km)");
        rows.add("delayPsPerKmK", FibreClass.DELAY_PS_PER_KM_K, "ps/(km K)");
        return new ClassTable(
                fibre.meaning(),
                List.copyOf(rows.lines),
                FibreClassWords.limits(fibre),
                List.of(FibreClassWords.PLANNED, FibreClassWords.DELAY, FibreClassWords.LIMITS));
    }

    /** A measured loss replaces the attenuation too. */
    private static Line attenuation(FibreSpan span, double ofClass) {
        String unit = "dB/km";
        String stated = span.attenuationDbPerKm().isPresent()
                ? Figure.stated(span.attenuationDbPerKm().getAsDouble(), unit)
                : "";
        if (span.measuredLossDb().isPresent()) {
            stated = Words.of(
                    "form.class.measured", Figure.stated(span.measuredLossDb().getAsDouble(), "dB"));
        }
        return new Line(ParameterWords.name("attenuationDbPerKm"), Figure.in(ofClass, unit), stated);
    }

    /** Collects the lines of plain fields. */
    private static final class Rows {
        private final List<Line> lines = new ArrayList<>();
        private final Values stated;

        Rows(Values stated) {
            this.stated = stated;
        }

        void add(String field, double ofClass, String unit) {
            String own = stated.get(field) instanceof Double number ? Figure.stated(number, unit) : "";
            lines.add(new Line(
                    ParameterWords.name(field), Figure.stated(Double.parseDouble(Figure.bare(ofClass)), unit), own));
        }
    }
}
