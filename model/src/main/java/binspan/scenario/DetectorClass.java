package binspan.scenario;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Generic classes of single-photon detectors.
 *
 * <p>Planning values are nowhere better than the best published detector of the class, those named with it; where
 * publications disagree or are silent the value is marked common practice. They are starting points: put the data
 * sheet's numbers into the scenario.
 */
@SuppressWarnings("ImmutableEnumChecker") // the planning values are a record of numbers, which never change
public enum DetectorClass implements Choice {
    SNSPD(
            "snspd",
            "superconducting nanowire, cooled below 3 K",
            new Typical(0.80, 100.0, 60.0, 40.0, 0.0),
            600.0,
            1700.0,
            "efficiency 80-98 % and no afterpulses: Reddy et al., Optica 7, 1649 (2020), arXiv:1710.06740; reset 40 ns: Marsili et al.,"
                    + " Nat. Photonics 7, 210 (2013); dark < 130 /s: arXiv:1611.02726; 60 ps with electronics: common practice"),
    SNSPD_COLD_FILTER(
            "snspd-cold-filter",
            "superconducting nanowire behind a cooled band-pass filter",
            new Typical(0.70, 10.0, 50.0, 40.0, 0.0),
            1500.0,
            1620.0,
            "dark counts down to 0.01 /s: Shibata et al., arXiv:1408.0562; 10 /s in the field, 70 % with the filter's loss, 50 ps: common practice"),
    INGAAS_GATED(
            "ingaas-gated",
            "InGaAs/InP avalanche diode, gated",
            new Typical(0.20, 0.0, 150.0, 10_000.0, 0.03),
            900.0,
            1650.0,
            "21.4 %, 2.1e-5 per gate, 7 % afterpulses at 1 GHz (Chin. Phys. B, bias-dependent jitter); 24.3 %, 9.4e-5 per gate at 238 K;"
                    + " jitter 93-240 ps: arXiv:2106.05599; hold-off 10 us, 3 %, 150 ps: common practice"),
    INGAAS_FREE_RUNNING(
            "ingaas-free-running",
            "InGaAs/InP avalanche diode, free-running",
            new Typical(0.15, 2000.0, 150.0, 20_000.0, 0.022),
            900.0,
            1650.0,
            "10 %, 600 /s: Lunghi et al., arXiv:1204.4594; 20 us, 2.2 % afterpulses: Korzh et al., arXiv:1312.2636; 15 %, 2 kHz, 150 ps:"
                    + " common practice"),
    SILICON_APD(
            "silicon-apd",
            "silicon avalanche diode, thick junction",
            new Typical(0.60, 100.0, 400.0, 45.0, 0.01),
            400.0,
            1000.0,
            "65 % at 650 nm, 400 ps, 25 /s: Hadfield, Nat. Photonics 3, 696 (2009), table 1 (memory); 60 %, 100 /s, 45 ns, 1 %: common practice"),
    PHOTOMULTIPLIER(
            "photomultiplier",
            "photomultiplier with infrared photocathode",
            new Typical(0.02, 200_000.0, 300.0, 10.0, 0.0),
            950.0,
            1700.0,
            "2 % at 1550 nm, 300 ps, 2e5 /s: Hadfield, Nat. Photonics 3, 696 (2009), table 1 (memory); 10 ns: common practice"),
    UP_CONVERSION(
            "up-conversion",
            "conversion to the visible in a nonlinear waveguide, then a silicon avalanche diode",
            new Typical(0.30, 1000.0, 300.0, 45.0, 0.01),
            1520.0,
            1580.0,
            "about 30 %: Shentu et al., Opt. Express 21, 13986 (2013); 37 %, 1e3 /s: Pelc et al., Opt. Express 19, 21445 (2011);"
                    + " jitter, dead time and afterpulses those of the silicon diode: common practice");

    /**
     * Planning values of a class.
     *
     * @param efficiency detection efficiency
     * @param darkCountsPerSecond dark counts of a free-running detector, 1/s
     * @param jitterFwhmPs jitter, ps FWHM
     * @param deadTimeNs dead time, ns
     * @param afterpulseProbability afterpulses per click
     */
    public record Typical(
            double efficiency,
            double darkCountsPerSecond,
            double jitterFwhmPs,
            double deadTimeNs,
            double afterpulseProbability) {}

    private final String text;
    private final String meaning;
    private final Typical typical;
    private final double shortestNm;
    private final double longestNm;
    private final String provenance;

    DetectorClass(
            String text, String meaning, Typical typical, double shortestNm, double longestNm, String provenance) {
        this.text = text;
        this.meaning = meaning;
        this.typical = typical;
        this.shortestNm = shortestNm;
        this.longestNm = longestNm;
        this.provenance = provenance;
    }

    @Override
    public String text() {
        return text;
    }

    /** What the class is, in a few words. */
    public String meaning() {
        return meaning;
    }

    /** Planning values. */
    public Typical typical() {
        return typical;
    }

    /** Shortest wavelength at which the planning values hold, nm (common practice). */
    public double shortestNm() {
        return shortestNm;
    }

    /** Longest wavelength at which they hold, nm (common practice). */
    public double longestNm() {
        return longestNm;
    }

    /** Where the numbers come from. */
    public String provenance() {
        return provenance;
    }

    /** Whether the class needs liquid helium or a cryocooler. */
    public boolean cryogenic() {
        return this == SNSPD || this == SNSPD_COLD_FILTER;
    }

    /** Settings between which a detector of the class can be operated; one where it has no trade to offer. */
    public List<OperatingPoint> operatingPoints() {
        return OperatingPoints.of(this);
    }

    /** Gating of the class: one gate of 1 ns for every slot, 2e-5 dark clicks each; absent when it is free-running. */
    public Optional<Gate> gate() {
        return this == INGAAS_GATED ? Optional.of(new Gate(OptionalDouble.empty(), 1.0, 2e-5)) : Optional.empty();
    }
}
