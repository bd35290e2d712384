package binspan.scenario;

import binspan.scenario.DispersionLaw.BrokenLine;
import binspan.scenario.DispersionLaw.Line;
import binspan.scenario.DispersionLaw.Middle;
import binspan.scenario.DispersionLaw.ThreeTerm;
import java.util.List;
import java.util.Optional;

/**
 * Fibre classes by ITU-T Recommendation.
 *
 * <p>The planning values are what a deployed cable of the class usually has (common practice); G.655.D, G.655.E and
 * G.653.B dispersions are the middle of the Recommendation's bounding lines. Lines and limits are from memory: compare
 * with the Recommendation before quoting them. The lines reproduce the published 1550 nm ranges of G.655.D (2.80 to
 * 6.20 ps/(nm km)) and G.655.E (6.06 to 9.31).
 */
@SuppressWarnings("ImmutableEnumChecker") // the fields are records of numbers, which never change
public enum FibreClass implements Choice {
    G652A("G.652.A", "conventional single-mode, edition of 2009", deployed(), standard()),
    G652B("G.652.B", "conventional single-mode, no low water peak", deployed(), standard()),
    G652C("G.652.C", "low water peak, edition of 2009", deployed(), standard()),
    G652D("G.652.D", "standard single-mode with low water peak", deployed(), standard()),
    G653A("G.653.A", "dispersion-shifted", shifted(), new Line(1550, 0, 0.075)),
    G653B(
            "G.653.B",
            "dispersion-shifted, bounded over 1460-1625 nm",
            shifted(),
            new Middle(Bounds.G653B_LOW, Bounds.G653B_HIGH)),
    G654A("G.654.A", "cut-off shifted", cutoffShifted(0.19), new Line(1550, 18.5, 0.06)),
    G654B("G.654.B", "cut-off shifted, large area", cutoffShifted(0.19), new Line(1550, 20.0, 0.06)),
    G654C("G.654.C", "cut-off shifted, low PMD", cutoffShifted(0.18), new Line(1550, 18.5, 0.06)),
    G654D("G.654.D", "cut-off shifted, submarine", cutoffShifted(0.17), new Line(1550, 20.5, 0.06)),
    G654E("G.654.E", "cut-off shifted, terrestrial", cutoffShifted(0.18), new Line(1550, 20.0, 0.06)),
    G655C("G.655.C", "non-zero dispersion-shifted", shifted(), new Line(1550, 4.4, 0.06)),
    G655D(
            "G.655.D",
            "non-zero dispersion-shifted, bounded",
            shifted(),
            new Middle(Bounds.G655D_LOW, Bounds.G655D_HIGH)),
    G655E(
            "G.655.E",
            "non-zero dispersion-shifted, larger dispersion",
            shifted(),
            new Middle(Bounds.G655E_LOW, Bounds.G655E_HIGH)),
    G657A1("G.657.A1", "bend-insensitive access fibre", deployed(), standard()),
    G657A2("G.657.A2", "bend-insensitive access fibre, tighter bends", deployed(), standard()),
    G657B2("G.657.B2", "bend-insensitive fibre for buildings", new AttenuationTable(0.38, 0.25, 0.28), standard()),
    G657B3("G.657.B3", "bend-insensitive indoor fibre", new AttenuationTable(0.38, 0.25, 0.28), standard());

    /**
     * Temperature coefficient of the delay of solid-core fibre, ps/(km K): Slavik et al., Sci. Rep. 5, 15447 (2015).
     */
    public static final double DELAY_PS_PER_KM_K = 39.0;

    /** PMD of deployed cable, ps/sqrt(km), common practice. */
    public static final double PMD_PS_PER_SQRT_KM = 0.1;

    private final String text;
    private final String meaning;
    private final AttenuationTable attenuation;
    private final DispersionLaw dispersion;

    FibreClass(String text, String meaning, AttenuationTable attenuation, DispersionLaw dispersion) {
        this.text = text;
        this.meaning = meaning;
        this.attenuation = attenuation;
        this.dispersion = dispersion;
    }

    @Override
    public String text() {
        return text;
    }

    /** What the class is, in a few words. */
    public String meaning() {
        return meaning;
    }

    /** Attenuation to plan with, splices and connectors apart (common practice). */
    public AttenuationTable attenuation() {
        return attenuation;
    }

    /** Dispersion to plan with. */
    public DispersionLaw dispersion() {
        return dispersion;
    }

    /** Limits of the Recommendation (memory), bounding lines of the dispersion apart. */
    public List<FibreLimit> limits() {
        return FibreLimits.of(this);
    }

    /** Bounding lines of the dispersion over 1460-1625 nm where the Recommendation draws them (memory). */
    public Optional<Middle> dispersionBounds() {
        return dispersion instanceof Middle middle ? Optional.of(middle) : Optional.empty();
    }

    private static AttenuationTable deployed() {
        return new AttenuationTable(0.35, 0.22, 0.24);
    }

    private static AttenuationTable shifted() {
        return new AttenuationTable(0.38, 0.22, 0.25);
    }

    private static AttenuationTable cutoffShifted(double at1550) {
        return new AttenuationTable(0.33, at1550, at1550 + 0.02);
    }

    private static DispersionLaw standard() {
        return new ThreeTerm(1312.0, 0.090);
    }

    /** Bounding lines, apart so that the constants above can use them. */
    private static final class Bounds {
        static final BrokenLine G655D_LOW =
                broken(1550, new Line(1460, -4.20, 7.00 / 90), new Line(1550, 2.80, 2.97 / 75));
        static final BrokenLine G655D_HIGH =
                broken(1550, new Line(1460, 3.29, 2.91 / 90), new Line(1550, 6.20, 5.06 / 75));
        static final BrokenLine G655E_LOW =
                broken(1550, new Line(1460, 0.64, 5.42 / 90), new Line(1550, 6.06, 3.30 / 75));
        static final BrokenLine G655E_HIGH =
                broken(1550, new Line(1460, 4.66, 4.65 / 90), new Line(1550, 9.31, 4.12 / 75));
        static final BrokenLine G653B_LOW = broken(1525, new Line(1525, -3.5, 0.085), new Line(1600, 0, 3.5 / 75));
        static final BrokenLine G653B_HIGH = broken(1575, new Line(1500, 0, 3.5 / 75), new Line(1575, 3.5, 0.085));

        private static BrokenLine broken(double breakNm, Line below, Line above) {
            return new BrokenLine(breakNm, below, above);
        }
    }
}
