package binspan.prediction;

import binspan.optics.FibreOptics;
import binspan.optics.OpticalPaths;
import binspan.optics.PathInputs;
import binspan.scenario.Compensator;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;

/**
 * The loss and the dispersion of an arm element by element, in the order in which the light meets them: source coupling, path elements, repair margin,
 * excess loss of the analyzer. The splitting inside the analyzer is not counted. The sums are those of {@link binspan.optics.OpticalPath}.
 *
 * @param entries the elements; coupling, repair margin and analyzer are always there, also without loss
 */
public record ArmBudget(List<Entry> entries) {
    /** Copies the list. */
    public ArmBudget {
        entries = List.copyOf(entries);
    }

    /** What an entry is. */
    public enum Kind {
        /** Loss from inside the source's passband to the first element. */
        COUPLING,
        /** A fibre span with its connectors and splices. */
        FIBRE,
        /** A component that only loses light. */
        LOSS,
        /** A filter. */
        FILTER,
        /** A dispersion compensator. */
        COMPENSATOR,
        /** Loss set aside for later splices. */
        REPAIR_MARGIN,
        /** Excess loss of both paths of the analyzer. */
        ANALYZER_EXCESS
    }

    /**
     * One element.
     *
     * @param kind what it is
     * @param element index of the path element, from 0; -1 for what is not in the path
     * @param label its label; empty without one
     * @param lossDb its loss, dB
     * @param runningLossDb loss up to behind it, dB
     * @param lengthKm its length, km; 0 for everything but fibre
     * @param dispersionPsPerNm its dispersion, ps/nm
     * @param runningDispersionPsPerNm dispersion up to behind it, ps/nm
     */
    public record Entry(
            Kind kind,
            int element,
            String label,
            double lossDb,
            double runningLossDb,
            double lengthKm,
            double dispersionPsPerNm,
            double runningDispersionPsPerNm) {}

    /**
     * The budget of an arm.
     *
     * @param prediction the predicted link
     * @param alice whether alice's arm is meant, else bob's
     */
    public static ArmBudget of(LinkPrediction prediction, boolean alice) {
        return of(prediction.scenario(), alice);
    }

    /**
     * The budget of an arm of a link that is not predicted yet.
     *
     * @param scenario the link
     * @param alice whether alice's arm is meant, else bob's
     */
    public static ArmBudget of(Scenario scenario, boolean alice) {
        PathInputs in = PathInputs.of(scenario, alice ? scenario.alice() : scenario.bob());
        Adding adding = new Adding(in.wavelengthNm(), fibreDispersion(in));
        adding.put(Kind.COUPLING, in.couplingLossDb());
        for (int i = 0; i < in.elements().size(); i++) {
            adding.put(i, in.elements().get(i));
        }
        adding.put(Kind.REPAIR_MARGIN, in.repairMarginDb());
        adding.put(Kind.ANALYZER_EXCESS, in.excessLossDb());
        return new ArmBudget(adding.entries);
    }

    private static double fibreDispersion(PathInputs in) {
        return in.elements().stream()
                .mapToDouble(element -> element instanceof FibreSpan span
                        ? FibreOptics.dispersionPsPerNm(span, in.wavelengthNm())
                        : 0.0)
                .sum();
    }

    /** Loss of the whole arm, dB. */
    public double lossDb() {
        return entries.get(entries.size() - 1).runningLossDb();
    }

    /** Dispersion of the whole arm, ps/nm. */
    public double dispersionPsPerNm() {
        return entries.get(entries.size() - 1).runningDispersionPsPerNm();
    }

    /** Length of all fibre, km. */
    public double lengthKm() {
        return entries.stream().mapToDouble(Entry::lengthKm).sum();
    }

    /** The entries so far with their sums. */
    private static final class Adding {
        private final List<Entry> entries = new ArrayList<>();
        private final double wavelengthNm;
        private final double fibreDispersion;
        private double loss;
        private double dispersion;

        Adding(double wavelengthNm, double fibreDispersion) {
            this.wavelengthNm = wavelengthNm;
            this.fibreDispersion = fibreDispersion;
        }

        void put(Kind kind, double lossDb) {
            loss += lossDb;
            entries.add(new Entry(kind, -1, "", lossDb, loss, 0.0, 0.0, dispersion));
        }

        void put(int index, PathElement element) {
            FibreSpan span = element instanceof FibreSpan fibre ? fibre : null;
            double lossDb = span == null
                    ? OpticalPaths.componentLossDb(element, fibreDispersion)
                    : FibreOptics.lossDb(span, wavelengthNm);
            double added = span == null
                    ? OpticalPaths.compensatedPsPerNm(element, fibreDispersion)
                    : FibreOptics.dispersionPsPerNm(span, wavelengthNm);
            loss += lossDb;
            dispersion += added;
            double length = span == null ? 0.0 : span.lengthKm();
            String label = element.label().orElse("");
            entries.add(new Entry(kind(element), index, label, lossDb, loss, length, added, dispersion));
        }

        private static Kind kind(PathElement element) {
            if (element instanceof FibreSpan) {
                return Kind.FIBRE;
            }
            if (element instanceof FilterElement) {
                return Kind.FILTER;
            }
            return element instanceof Compensator ? Kind.COMPENSATOR : Kind.LOSS;
        }
    }
}
