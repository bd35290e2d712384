package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Range;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The limits of the headroom: up to them every requirement that was met stays met, beyond them one fails. */
final class HeadroomPropertiesTest {
    private static final int LINKS = 300;
    private static final double SLIGHTLY = 1e-3;
    private static final double AT_THE_LIMIT = 1e-3;
    private static final double WITHIN_RANGE = 1e-12;

    private static final FiniteKeyOutlook NOT_ASKED = new FiniteKeyOutlook(Double.NaN, Double.NaN, Double.NaN);

    private static List<LinkCheck> checks;

    @BeforeAll
    static void check() {
        checks = IntStream.range(0, LINKS)
                .parallel()
                .mapToObj(number -> LinkCheck.of(withRequirements(number)))
                .toList();
    }

    @Test
    void randomLinksHaveRequirementsAndLimits() {
        assertThat(checks).filteredOn(check -> !check.outcomes().isEmpty()).hasSizeGreaterThan(LINKS * 9 / 10);
        assertThat(checks).allMatch(LinkCheck::met);
        assertThat(checks.stream().mapToInt(check -> check.headroom().size()).sum())
                .isGreaterThan(10 * LINKS);
    }

    @Test
    void namedRequirementIsJustMetAtTheLimit() {
        everyLimit((check, limit) -> {
            RequirementOutcome outcome = outcomes(check, limit, limit.limit()).stream()
                    .filter(each -> each.requirement() == limit.requirement())
                    .findFirst()
                    .orElseThrow();
            double scale = Math.max(outcome.required(), Double.MIN_NORMAL);
            double margin = outcome.margin().orElse(Double.NaN) / scale;
            return Math.abs(margin) <= AT_THE_LIMIT ? "" : outcome.requirement() + " has margin " + margin;
        });
    }

    @Test
    void allRequirementsHoldInside() {
        everyLimit((check, limit) -> {
            for (double share : new double[] {0.2, 0.5, 0.8, 1.0 - SLIGHTLY}) {
                double value = limit.value() + share * (limit.limit() - limit.value());
                List<RequirementOutcome> failed = failed(check, limit, value);
                if (!failed.isEmpty()) {
                    return failed.get(0) + " at " + value;
                }
            }
            return "";
        });
    }

    @Test
    void oneRequirementFailsOutside() {
        everyLimit((check, limit) -> {
            double value = limit.limit() + SLIGHTLY * (limit.limit() - limit.value());
            Range range = ParameterPaths.find(check.prediction().scenario(), limit.path())
                    .range();
            boolean beyond =
                    !range.contains(value) || !failed(check, limit, value).isEmpty();
            return beyond ? "" : "all hold at " + value;
        });
    }

    @Test
    void stabilityRepeatsTheHeadroomOfWhatMustBeHeld() {
        for (LinkCheck check : checks) {
            long held = check.headroom().stream()
                    .map(Headroom::path)
                    .filter(path -> path.startsWith("source.pump.")
                            || path.contains(".analyzer.")
                            || path.equals("timing.cableTemperatureStepK"))
                    .count();
            assertThat(check.stability()).hasSize((int) held);
        }
    }

    /** Looks at one limit of a check. */
    private interface Look {
        String at(LinkCheck check, Headroom limit);
    }

    private static void everyLimit(Look look) {
        RandomChecks.none(LINKS, number -> {
            StringBuilder wrong = new StringBuilder();
            for (Headroom limit : checks.get(number).headroom()) {
                String complaint = look.at(checks.get(number), limit);
                wrong.append(complaint.isEmpty() ? "" : limit + ": " + complaint + "; ");
            }
            return wrong.toString();
        });
    }

    private static List<RequirementOutcome> failed(LinkCheck check, Headroom limit, double value) {
        return outcomes(check, limit, value).stream()
                .filter(outcome -> !outcome.met())
                .toList();
    }

    private static List<RequirementOutcome> outcomes(LinkCheck check, Headroom limit, double value) {
        Scenario scenario = check.prediction().scenario();
        Scenario drifted = ParameterPaths.find(scenario, limit.path()).with(scenario, value);
        LinkPrediction prediction = LinkPredictor.predict(drifted);
        boolean finite = scenario.require().firstKeyWithinHours().isPresent();
        return RequirementOutcome.all(prediction, finite ? FiniteKeyOutlook.of(prediction) : NOT_ASKED);
    }

    /** An everyday link with some requirements that it meets with small or large margins. */
    private static Scenario withRequirements(long number) {
        Scenario scenario =
                number % 20 == 0 ? RandomScenarios.everyday(number) : RandomScenarios.everydayGaussian(number);
        LinkCheck check = RandomChecks.check(scenario);
        SplittableRandom random = new SplittableRandom(number);
        for (Requirement requirement : Requirement.stateable()) {
            double predicted = requirement.predicted(check.prediction(), check.finite());
            double eased = random.nextDouble(0.02, 0.6);
            double required = requirement.atLeast() ? predicted / (1.0 + eased) : predicted * (1.0 + eased);
            Parameter parameter = ParameterPaths.find(scenario, "require." + requirement.fieldName());
            if (random.nextInt(3) > 0
                    && required > WITHIN_RANGE
                    && parameter.range().contains(required)) {
                scenario = parameter.with(scenario, required);
            }
        }
        return scenario;
    }
}
