package binspan.prediction;

import static binspan.prediction.RandomChecks.figure;
import static org.assertj.core.api.Assertions.assertThat;

import binspan.counting.LinkCounts;
import binspan.merit.BellTest;
import binspan.merit.RepeaterlessBound;
import binspan.merit.VisibilityBudget;
import binspan.scenario.Arm;
import binspan.scenario.Detector;
import binspan.scenario.PumpMode;
import binspan.units.Decibels;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** What holds of every link, looked for in random ones. */
final class PredictionPropertiesTest {
    private static final int LINKS = 10_000;
    private static final double ROUNDING = 1e-12;

    /** Figures that some links do not have, each with the links that do; all other figures every link has. */
    private static final Map<String, Predicate<LinkCheck>> APPLIES = applies();

    /** Smallest and largest value of the figures that are shares, probabilities or errors. */
    private static final Map<String, double[]> RANGES = ranges();

    private static RandomChecks links;

    @BeforeAll
    static void predict() {
        links = RandomChecks.first(LINKS);
    }

    @AfterAll
    static void forget() {
        links = null;
    }

    @Test
    void figuresAreFiniteExactlyWhereTheyApply() {
        links.satisfy(check -> {
            StringBuilder wrong = new StringBuilder();
            for (ResultField field : ResultFields.ALL) {
                boolean applies =
                        APPLIES.getOrDefault(field.name(), any -> true).test(check);
                for (int port = 0; port < field.count(check.prediction()); port++) {
                    double value = field.of(check, port);
                    if (Double.isFinite(value) != applies) {
                        wrong.append(field.name()).append(" is ").append(value).append("; ");
                    }
                }
            }
            return wrong.toString();
        });
    }

    @Test
    void namesOfTheTablesExist() {
        List<String> names = ResultFields.ALL.stream().map(ResultField::name).toList();
        assertThat(names).containsAll(APPLIES.keySet()).containsAll(RANGES.keySet());
    }

    @Test
    void figuresStayInsideTheirMeaning() {
        links.satisfy(check -> {
            StringBuilder wrong = new StringBuilder();
            for (ResultField field : ResultFields.ALL) {
                boolean signed = field.name().endsWith("dispersionPsPerNm")
                        || field.name().endsWith("delayErrorPs")
                        || field.name().equals("bell.chsh");
                double[] range = RANGES.getOrDefault(
                        field.name(), new double[] {signed ? Double.NEGATIVE_INFINITY : 0.0, Double.POSITIVE_INFINITY});
                for (int port = 0; port < field.count(check.prediction()); port++) {
                    double value = field.of(check, port);
                    if (value < range[0] * (1.0 - ROUNDING) || value > range[1] * (1.0 + ROUNDING)) {
                        wrong.append(field.name()).append(" is ").append(value).append("; ");
                    }
                }
            }
            return wrong.toString();
        });
    }

    /**
     * The bound holds for any measurement whose number of coincidences does not depend on the settings. Where both sides have ports of different
     * efficiency it does depend on them, and the normalised correlation overstates S, as in an experiment that does not correct for it.
     */
    @Test
    void chshStaysBelowTsirelsonsBoundWhereOneSidesPortsAreAlike() {
        links.satisfy(check -> {
            LinkPrediction p = check.prediction();
            double highest = alike(p.scenario().alice())
                            || alike(p.scenario().bob())
                            || !p.counts().bothPorts()
                    ? BellTest.TSIRELSON
                    : 4.0;
            double chsh = p.bell().chsh();
            return Math.abs(chsh) <= highest + 1e-9 ? "" : "S is " + chsh;
        });
    }

    @Test
    void budgetMultipliesToTheRawVisibility() {
        links.satisfy(check -> {
            double product = 1.0;
            for (VisibilityBudget.Entry entry : check.prediction().budget().entries()) {
                product *= entry.factor();
            }
            double raw = check.prediction().fringe().raw();
            return Math.abs(product - raw) <= ROUNDING * raw + Math.ulp(1.0)
                    ? ""
                    : "product " + product + ", raw " + raw;
        });
    }

    @Test
    void asymptoticKeyIsNeverMoreThanTheSiftedBits() {
        links.satisfy(check -> {
            double sifted = figure(check, "key.siftedPhaseBps") + zeroIfNone(figure(check, "key.siftedTimeBps"));
            double key = zeroIfNone(figure(check, "key.asymptoticBps"));
            return key <= sifted ? "" : "key " + key + ", sifted " + sifted;
        });
    }

    @Test
    void finiteKeyIsNeverMoreThanTheAsymptoticOneOfTheWorkingTime() {
        links.satisfy(check -> {
            double asymptotic = zeroIfNone(figure(check, "key.asymptoticBps"))
                    * check.prediction().uptimeShare();
            double finite = zeroIfNone(figure(check, "key.finiteBps"));
            return finite <= asymptotic ? "" : "finite " + finite + ", asymptotic " + asymptotic;
        });
    }

    @Test
    void keyStaysBelowTheStrictRepeaterlessBound() {
        links.satisfy(check -> {
            LinkPrediction p = check.prediction();
            double worse = Math.max(p.pathA().fibreLossDb(), p.pathB().fibreLossDb());
            double bound = RepeaterlessBound.bitsPerMode(Decibels.transmittance(worse)) * p.modesPerSecond();
            double key = zeroIfNone(p.key().asymptoticPerSecond());
            boolean biased = !alike(p.scenario().alice()) || !alike(p.scenario().bob());
            return biased || key <= bound ? "" : "key " + key + ", bound " + bound;
        });
    }

    private static boolean alike(Arm arm) {
        List<Detector> ports = arm.detectors();
        return ports.size() == 1 || ports.get(0).equals(ports.get(1));
    }

    private static double zeroIfNone(double value) {
        return Double.isNaN(value) ? 0.0 : value;
    }

    private static Map<String, Predicate<LinkCheck>> applies() {
        Predicate<LinkCheck> pulsed = check -> check.prediction().scenario().pulsed();
        Predicate<LinkCheck> finiteModes = pulsed.and(
                check -> check.prediction().scenario().source().unheraldedG2().orElse(2.0) > 1.0);
        Predicate<LinkCheck> timeBasis =
                check -> check.prediction().scenario().source().pump().mode() == PumpMode.PULSE_PAIR;
        Predicate<LinkCheck> key =
                timeBasis.or(check -> check.prediction().counts().bothPorts());
        Predicate<LinkCheck> coincidences = check -> check.prediction().bell().coincidencesPerSecond() > 0.0;
        Map<String, Predicate<LinkCheck>> map = new HashMap<>();
        map.put("source.cyclesPerSecond", pulsed);
        map.put("source.schmidtNumber", finiteModes);
        map.put("source.apparentMeanPairs", pulsed.and(coincidences));
        for (String arm : List.of("alice", "bob")) {
            map.put(arm + ".arrivalRmsPs", pulsed);
            map.put(arm + ".unheraldedG2", pulsed);
            map.put(arm + ".heraldedG2", pulsed);
        }
        map.put(
                "alice.coincidencesPerSingle",
                check -> LinkCounts.recorded(check.prediction().counts().loadsA()) > 0.0);
        map.put(
                "bob.coincidencesPerSingle",
                check -> LinkCounts.recorded(check.prediction().counts().loadsB()) > 0.0);
        map.put("coincidence.correlationRmsPs", pulsed.negate());
        map.put("coincidence.car", check -> check.prediction().fringe().accidentalPerSecond() > 0.0);
        map.put("visibility.sigma", check -> check.prediction().countsPerPoint() > 0.0);
        map.put("bell.sigma", coincidences);
        Predicate<LinkCheck> violation = check -> check.prediction().bell().chsh() > 2.0;
        map.put("bell.secondsToThreeSigma", violation);
        map.put("bell.secondsToFiveSigma", violation);
        map.put("qber.time", timeBasis);
        map.put("key.siftedTimeBps", timeBasis);
        map.put("key.asymptoticBps", key);
        map.put("key.finiteBits", key);
        map.put("key.finiteBps", key);
        map.put("key.secondsToFirstKey", check -> check.finite().secondsToFirstKey() < Double.POSITIVE_INFINITY);
        Predicate<LinkCheck> fibre =
                check -> Decibels.transmittance(check.prediction().pathA().fibreLossDb()
                                + check.prediction().pathB().fibreLossDb())
                        < 1.0;
        map.put("key.repeaterlessBoundBps", fibre.and(finiteModes.or(pulsed.negate())));
        return map;
    }

    private static Map<String, double[]> ranges() {
        double[] share = {0.0, 1.0};
        double[] error = {0.0, 0.5};
        Map<String, double[]> map = new HashMap<>();
        for (String arm : List.of("alice", "bob")) {
            map.put(arm + ".liveFraction", share);
            map.put(arm + ".partnerPassProbability", share);
            map.put(arm + ".unheraldedG2", new double[] {1.0, 2.0});
            map.put(arm + ".heraldedG2", new double[] {0.0, 2.0});
        }
        map.put("visibility.raw", share);
        map.put("visibility.net", share);
        map.put("qber.phase", error);
        map.put("qber.time", error);
        map.put("source.schmidtNumber", new double[] {1.0, Double.POSITIVE_INFINITY});
        return map;
    }
}
