package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.merit.VisibilityBudget;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Range;
import binspan.scenario.Scenario;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** A prediction depends on its scenario alone: not on the thread, nor on what the predictor has predicted before. */
final class PredictorMemoryTest {
    private static final int LINKS = 150;
    private static final int EDITS = 25;
    private static final double UNDONE = 0.3;
    private static final Set<String> WHOLE = Set.of("formatVersion", "acquisition.fringePoints");

    @Test
    void sameScenarioGivesTheSameBitsOnAnyThread() {
        List<List<Long>> here = IntStream.range(0, LINKS)
                .mapToObj(number -> bits(LinkPredictor.predict(RandomScenarios.any(number))))
                .toList();
        List<List<Long>> everywhere = IntStream.range(0, LINKS)
                .parallel()
                .mapToObj(number -> bits(LinkPredictor.predict(RandomScenarios.any(number))))
                .toList();
        assertThat(everywhere).isEqualTo(here);
    }

    @Test
    void reusedPredictorGivesTheBitsOfAFreshOne() {
        RandomChecks.none(LINKS, number -> {
            SplittableRandom random = new SplittableRandom(number);
            Scenario planned = RandomScenarios.any(number);
            List<String> paths = paths(RandomScenarios.stated(number), "");
            LinkPredictor reused = new LinkPredictor();
            Scenario edited = planned;
            for (int edit = 0; edit < EDITS; edit++) {
                Parameter parameter = ParameterPaths.find(planned, paths.get(random.nextInt(paths.size())));
                boolean undo = random.nextDouble() < UNDONE;
                edited = undo ? planned : parameter.with(edited, another(parameter, edited, random));
                if (!bits(reused.of(edited)).equals(bits(LinkPredictor.predict(edited)))) {
                    return "differs after edit " + edit + ", of " + (undo ? "nothing" : parameter.path());
                }
            }
            return "";
        });
    }

    /** Also a link with an entirely different one predicted in between. */
    @Test
    void nothingIsKeptFromAnotherLink() {
        LinkPredictor reused = new LinkPredictor();
        RandomChecks.noneInTurn(LINKS, number -> {
            Scenario scenario = RandomScenarios.any(number);
            boolean same = bits(reused.of(scenario)).equals(bits(LinkPredictor.predict(scenario)));
            return same ? "" : "differs after scenario " + (number - 1);
        });
    }

    private static double another(Parameter parameter, Scenario scenario, SplittableRandom random) {
        Range range = parameter.range();
        double planned = parameter.value(scenario).orElse(0.0);
        double value = planned == 0.0 ? random.nextDouble() : planned * (0.5 + random.nextDouble());
        return range.contains(value) ? value : planned;
    }

    /** Paths of all numbers that a scenario file states, whole numbers apart. */
    private static List<String> paths(Object stated, String path) {
        List<String> paths = new ArrayList<>();
        if (stated instanceof Double && !WHOLE.contains(path)) {
            paths.add(path);
        } else if (stated instanceof Values values) {
            for (Map.Entry<String, Object> field : values.asMap().entrySet()) {
                paths.addAll(paths(field.getValue(), path.isEmpty() ? field.getKey() : path + "." + field.getKey()));
            }
        } else if (stated instanceof List<?> items) {
            for (int i = 0; i < items.size(); i++) {
                paths.addAll(paths(items.get(i), path + "[" + i + "]"));
            }
        }
        return paths;
    }

    private static List<Long> bits(LinkPrediction prediction) {
        LinkCheck check = new LinkCheck(
                prediction, new FiniteKeyOutlook(0.0, 0.0, 0.0), List.of(), List.of(), List.of(), List.of());
        DoubleStream figures = ResultFields.ALL.stream()
                .flatMapToDouble(field ->
                        IntStream.range(0, field.count(check.prediction())).mapToDouble(port -> field.of(check, port)));
        DoubleStream budget = prediction.budget().entries().stream().mapToDouble(VisibilityBudget.Entry::factor);
        return DoubleStream.concat(figures, budget)
                .mapToObj(Double::doubleToLongBits)
                .toList();
    }
}
