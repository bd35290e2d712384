package binspan.scenario;

import static binspan.scenario.FibreLimit.Quantity.ATTENUATION;
import static binspan.scenario.FibreLimit.Quantity.DISPERSION;
import static binspan.scenario.FibreLimit.Quantity.DISPERSION_SLOPE;
import static binspan.scenario.FibreLimit.Quantity.DISPERSION_VARIATION;
import static binspan.scenario.FibreLimit.Quantity.PMD;
import static binspan.scenario.FibreLimit.Quantity.ZERO_SLOPE;
import static binspan.scenario.FibreLimit.Quantity.ZERO_WAVELENGTH;

import java.util.ArrayList;
import java.util.List;

/**
 * Attribute limits of ITU-T G.652 (11/2016; A and C: 2009), G.653, G.654, G.655 and G.657, from memory: compare with the
 * Recommendations before quoting them. Confirmed in summaries and articles are the zero near 1310 nm of G.652, 1.0 to
 * 10.0 ps/(nm km) of G.655.C and the PMD of 0.20 of G.654.
 */
final class FibreLimits {
    private FibreLimits() {}

    static List<FibreLimit> of(FibreClass fibre) {
        return switch (fibre) {
            case G652A -> join(loss(1310, 0.50), loss(1550, 0.40), zero(1300, 1324, Range.of(0.0, 0.093)), pmd(0.50));
            case G652B -> join(g652b(), standardZero(0.0), pmd(0.20));
            case G652C -> join(g652d().subList(0, 2), zero(1300, 1324, Range.of(0.0, 0.093)), pmd(0.50));
            case G652D -> join(g652d(), standardZero(0.073), pmd(0.20));
            case G653A -> join(loss(1550, 0.35), g653a(), pmd(0.50));
            case G653B -> join(loss(1550, 0.35), pmd(0.20));
            case G654A -> join(loss(1550, 0.22), submarine(20.0), pmd(0.50));
            case G654B -> join(loss(1550, 0.22), submarine(22.0), pmd(0.20));
            case G654C -> join(loss(1550, 0.22), submarine(20.0), pmd(0.20));
            case G654D -> join(loss(1550, 0.20), submarine(23.0), pmd(0.20));
            case G654E -> join(loss(1550, 0.23), at1550(Range.of(17.0, 23.0), Range.of(0.050, 0.070)), pmd(0.20));
            case G655C -> join(loss(1550, 0.35), loss(1625, 0.40), g655c(), pmd(0.20));
            case G655D, G655E -> join(loss(1550, 0.35), loss(1625, 0.40), pmd(0.20));
            case G657A1, G657A2 -> join(g657a(), standardZero(0.0), pmd(0.20));
            case G657B2, G657B3 -> join(g657b(), zero(1250, 1350, Range.of(0.0, 0.11)), pmd(0.50));
        };
    }

    private static List<FibreLimit> g652b() {
        return join(loss(1310, 0.40), loss(1550, 0.35), loss(1625, 0.40));
    }

    /** The dispersion limits are remembered with little confidence. */
    private static List<FibreLimit> g652d() {
        return List.of(
                FibreLimit.inBand(ATTENUATION, 1310, 1625, Range.of(0.0, 0.40)),
                FibreLimit.inBand(ATTENUATION, 1530, 1565, Range.of(0.0, 0.30)),
                FibreLimit.at(DISPERSION, 1550, Range.of(13.3, 18.6)),
                FibreLimit.at(DISPERSION, 1625, Range.of(17.2, 23.7)));
    }

    private static List<FibreLimit> g653a() {
        return join(
                zero(1500, 1600, Range.of(0.0, 0.085)),
                List.of(FibreLimit.inBand(DISPERSION, 1525, 1575, Range.of(-3.5, 3.5))));
    }

    private static List<FibreLimit> g655c() {
        return List.of(
                FibreLimit.inBand(DISPERSION, 1530, 1565, Range.of(1.0, 10.0)),
                FibreLimit.inBand(DISPERSION_VARIATION, 1530, 1565, Range.of(0.0, 5.0)));
    }

    private static List<FibreLimit> g657a() {
        return join(List.of(FibreLimit.inBand(ATTENUATION, 1310, 1625, Range.of(0.0, 0.40))), loss(1550, 0.30));
    }

    private static List<FibreLimit> g657b() {
        return join(loss(1310, 0.50), loss(1550, 0.30), loss(1625, 0.40));
    }

    /** Only the largest dispersion is limited; it is positive, as the zero lies near 1300 nm. */
    private static List<FibreLimit> submarine(double highest) {
        return at1550(Range.of(0.0, highest), Range.of(0.0, 0.070));
    }

    private static List<FibreLimit> at1550(Range dispersion, Range slope) {
        return List.of(FibreLimit.at(DISPERSION, 1550, dispersion), FibreLimit.at(DISPERSION_SLOPE, 1550, slope));
    }

    private static List<FibreLimit> standardZero(double flattest) {
        return zero(1300, 1324, Range.of(flattest, 0.092));
    }

    private static List<FibreLimit> zero(double shortestNm, double longestNm, Range slope) {
        return List.of(
                FibreLimit.of(ZERO_WAVELENGTH, Range.of(shortestNm, longestNm)), FibreLimit.of(ZERO_SLOPE, slope));
    }

    private static List<FibreLimit> loss(double wavelengthNm, double highest) {
        return List.of(FibreLimit.at(ATTENUATION, wavelengthNm, Range.of(0.0, highest)));
    }

    private static List<FibreLimit> pmd(double highest) {
        return List.of(FibreLimit.of(PMD, Range.of(0.0, highest)));
    }

    @SafeVarargs
    private static List<FibreLimit> join(List<FibreLimit>... parts) {
        List<FibreLimit> joined = new ArrayList<>();
        for (List<FibreLimit> part : parts) {
            joined.addAll(part);
        }
        return List.copyOf(joined);
    }
}
