package binspan.optics;

import binspan.scenario.Compensator;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.LossElement;
import binspan.scenario.PathElement;
import binspan.units.Decibels;
import binspan.units.PhysicalConstants;
import binspan.units.Scale;
import java.util.List;

/** Adds up an arm's path. */
public final class OpticalPaths {
    private OpticalPaths() {}

    /** The path of an arm. */
    public static OpticalPath of(PathInputs in) {
        List<PathElement> elements = in.elements();
        double fibreLossDb = 0.0;
        double fibreDispersion = 0.0;
        double pmdVariance = 0.0;
        double thermalPs = 0.0;
        for (int i = 0; i < elements.size(); i++) {
            if (elements.get(i) instanceof FibreSpan span) {
                fibreLossDb += FibreOptics.lossDb(span, in.wavelengthNm());
                fibreDispersion += FibreOptics.dispersionPsPerNm(span, in.wavelengthNm());
                pmdVariance += FibreOptics.pmdVariancePs2(span);
                thermalPs += span.delayPsPerKmK() * span.lengthKm() * in.temperatureStepK();
            }
        }
        double lossDb = in.couplingLossDb() + fibreLossDb + in.repairMarginDb() + in.excessLossDb();
        double dispersion = fibreDispersion;
        for (int i = 0; i < elements.size(); i++) {
            lossDb += componentLossDb(elements.get(i), fibreDispersion);
            dispersion += compensatedPsPerNm(elements.get(i), fibreDispersion);
        }
        return new OpticalPath(
                lossDb,
                fibreLossDb,
                fibreDispersion,
                dispersion,
                groupDelayDispersion(dispersion, in.wavelengthNm()),
                Math.sqrt(pmdVariance) * Scale.PICO,
                thermalPs * Scale.PICO,
                Decibels.transmittance(lossDb),
                StrayLight.photonsPerSecond(in, fibreDispersion));
    }

    /**
     * Group-delay dispersion of a length of fibre, beta = -lambda^2/(2 pi c) D L.
     *
     * @param dispersionPsPerNm dispersion D L, ps/nm
     * @param wavelengthNm vacuum wavelength, nm
     * @return s^2
     */
    public static double groupDelayDispersion(double dispersionPsPerNm, double wavelengthNm) {
        double lambda = wavelengthNm * Scale.NANO;
        double perMetre = dispersionPsPerNm * Scale.PICO / Scale.NANO;
        return -lambda * lambda / (2.0 * Math.PI * PhysicalConstants.SPEED_OF_LIGHT) * perMetre;
    }

    /**
     * Loss of an element that is not fibre, dB; 0 for fibre.
     *
     * @param element the element
     * @param fibreDispersion dispersion of all the arm's fibre, on which a compensator's loss may depend, ps/nm
     */
    public static double componentLossDb(PathElement element, double fibreDispersion) {
        if (element instanceof LossElement loss) {
            return loss.lossDb();
        }
        if (element instanceof FilterElement filter) {
            return filter.lossDb();
        }
        return element instanceof Compensator compensator ? compensatorLossDb(compensator, fibreDispersion) : 0.0;
    }

    private static double compensatorLossDb(Compensator compensator, double fibreDispersion) {
        if (compensator.figureOfMeritPsPerNmDb().isEmpty()) {
            return compensator.lossDb();
        }
        double dispersion = Math.abs(compensatedPsPerNm(compensator, fibreDispersion));
        return compensator.lossDb()
                + dispersion / compensator.figureOfMeritPsPerNmDb().getAsDouble();
    }

    /**
     * Dispersion that an element adds to the fibre's, ps/nm; 0 for everything but a compensator.
     *
     * @param element the element
     * @param fibreDispersion dispersion of all the arm's fibre, of which a compensator may take a share, ps/nm
     */
    public static double compensatedPsPerNm(PathElement element, double fibreDispersion) {
        if (!(element instanceof Compensator compensator)) {
            return 0.0;
        }
        return compensator.share().isPresent()
                ? -compensator.share().getAsDouble() * fibreDispersion
                : compensator.dispersionPsPerNm().orElse(0.0);
    }
}
