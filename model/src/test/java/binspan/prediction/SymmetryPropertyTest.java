package binspan.prediction;

import binspan.scenario.Scenario;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/**
 * Alice and bob are names only: exchanging them together with their photons exchanges their figures and changes no other.
 *
 * <p>The averages over a joint spectrum with flat-top filters run over alice's photon first, so that their quadrature error shows here: up to a few
 * parts in ten thousand of the counts.
 */
final class SymmetryPropertyTest {
    private static final int LINKS = 1_500;
    private static final double EXACT = 1e-9;
    private static final double QUADRATURE = 5e-3;
    private static final double NARROWEST_PS = 0.01;
    private static final Map<String, ResultField> FIELDS =
            ResultFields.ALL.stream().collect(Collectors.toMap(ResultField::name, Function.identity()));

    @Test
    void exchangingAliceAndBobExchangesTheirFigures() {
        RandomChecks.none(LINKS, number -> {
            Scenario scenario = RandomScenarios.any(number);
            LinkCheck check = RandomChecks.check(scenario);
            boolean closedForm =
                    !scenario.pulsed() || check.prediction().spectrum().gaussian();
            return asymmetric(scenario) || !closedForm ? "" : differences(check, EXACT);
        });
    }

    @Test
    void quadratureOverFlatTopsHardlyDependsOnWhoIsAlice() {
        RandomChecks.none(LINKS, number -> {
            Scenario scenario = RandomScenarios.everyday(number);
            LinkCheck check = RandomChecks.check(scenario);
            boolean closedForm =
                    !scenario.pulsed() || check.prediction().spectrum().gaussian();
            return asymmetric(scenario) || closedForm ? "" : differences(check, QUADRATURE);
        });
    }

    /** A measured unheralded g2 is that of alice's arm; a window far below a femtosecond is a difference of nearly equal numbers. */
    private static boolean asymmetric(Scenario scenario) {
        return scenario.source().unheraldedG2().isPresent() || scenario.timing().windowWidthPs() < NARROWEST_PS;
    }

    private static String differences(LinkCheck check, double tolerance) {
        LinkCheck exchanged = RandomChecks.check(exchanged(check.prediction().scenario()));
        StringBuilder wrong = new StringBuilder();
        for (ResultField field : ResultFields.ALL) {
            ResultField other = FIELDS.get(exchanged(field.name()));
            double rounding = rounding(field, check.prediction());
            if (tolerance > EXACT && field.name().startsWith("bell.secondsTo")) {
                // Runs to infinity where S comes down to 2, and any error of S with it.
                continue;
            }
            for (int port = 0; port < field.count(check.prediction()); port++) {
                double before = field.of(check, port);
                double after = other.of(exchanged, port);
                double largest = Math.max(Math.abs(before), Math.abs(after));
                if (Double.compare(before, after) != 0
                        && !(Math.abs(before - after) <= tolerance * largest + rounding)) {
                    wrong.append(field.name() + " from " + before + " to " + after + "; ");
                }
            }
        }
        return wrong.toString();
    }

    /** What rounding may change: the last bit of a key of whole bits, and the last digits of differences of shares. */
    private static double rounding(ResultField field, LinkPrediction p) {
        return switch (field.name()) {
            case "key.finiteBits" -> 1.0;
            case "key.finiteBps" -> 1.0 / p.scenario().acquisition().durationS();
            default -> 4.0 * Math.ulp(1.0);
        };
    }

    private static Scenario exchanged(Scenario s) {
        return new Scenario(
                s.formatVersion(),
                s.name(),
                s.imbalanceNs(),
                s.source(),
                /* alice= */ s.bob(),
                /* bob= */ s.alice(),
                s.timing(),
                s.protocol(),
                s.acquisition(),
                s.require(),
                s.spread(),
                s.provenance());
    }

    private static String exchanged(String name) {
        if (name.startsWith("alice.")) {
            return "bob." + name.substring("alice.".length());
        }
        return name.startsWith("bob.") ? "alice." + name.substring("bob.".length()) : name;
    }
}
