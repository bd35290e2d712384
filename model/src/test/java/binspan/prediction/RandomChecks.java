package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.Scenario;
import java.util.List;
import java.util.function.Function;
import java.util.function.IntFunction;
import java.util.stream.IntStream;

/** What is predicted of random links, for tests that ask something of all of them. */
final class RandomChecks {
    private final List<LinkCheck> checks;

    private RandomChecks(List<LinkCheck> checks) {
        this.checks = checks;
    }

    /** Predicts the first so many random links. */
    static RandomChecks first(int count) {
        return new RandomChecks(IntStream.range(0, count)
                .parallel()
                .mapToObj(number -> check(RandomScenarios.any(number)))
                .toList());
    }

    /** Figures and outcomes of a link, without headroom and cautions. */
    static LinkCheck check(Scenario scenario) {
        LinkPrediction prediction = LinkPredictor.predict(scenario);
        FiniteKeyOutlook finite = FiniteKeyOutlook.of(prediction);
        return new LinkCheck(
                prediction, finite, RequirementOutcome.all(prediction, finite), List.of(), List.of(), List.of());
    }

    /**
     * Asserts something of every link.
     *
     * @param complaint what is wrong with a link, empty if nothing
     */
    void satisfy(Function<LinkCheck, String> complaint) {
        none(checks.size(), number -> complaint.apply(checks.get(number)));
    }

    /**
     * Asserts that nothing is wrong with the first so many cases, computed on all processors.
     *
     * @param complaint what is wrong with the case of a number, empty if nothing
     */
    static void none(int count, IntFunction<String> complaint) {
        none(IntStream.range(0, count).parallel(), complaint);
    }

    /** The same, one case after another. */
    static void noneInTurn(int count, IntFunction<String> complaint) {
        none(IntStream.range(0, count), complaint);
    }

    private static void none(IntStream numbers, IntFunction<String> complaint) {
        assertThat(numbers.mapToObj(number -> complained(number, complaint.apply(number)))
                        .filter(text -> !text.isEmpty())
                        .toList())
                .as("complaints")
                .isEmpty();
    }

    private static String complained(int number, String complaint) {
        return complaint.isEmpty() ? "" : "scenario " + number + ": " + complaint;
    }

    /** The value of a figure that every link has once. */
    static double figure(LinkCheck check, String name) {
        return field(name).of(check, 0);
    }

    static ResultField field(String name) {
        return ResultFields.ALL.stream()
                .filter(each -> each.name().equals(name))
                .findFirst()
                .orElseThrow();
    }
}
