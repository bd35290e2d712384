package binspan.prediction;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.optics.PairSpectra;
import binspan.optics.PairSpectrum;
import binspan.optics.SpectrumInputs;
import binspan.scenario.Arm;
import binspan.scenario.Compensator;
import binspan.scenario.Detector;
import binspan.scenario.FibreSpan;
import binspan.scenario.Field;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;

/** The random links are valid, reproducible, and of all the kinds that the properties are asked of. */
final class RandomScenariosTest {
    private static final int LINKS = 2_000;
    private static final int SOME = LINKS / 100;

    @Test
    void everyNumberLiesInTheRangeOfTheRegistry() {
        RandomChecks.none(
                LINKS, number -> String.join("; ", outside(ScenarioSections.SCENARIO, RandomScenarios.stated(number))));
    }

    @Test
    void sameNumberGivesTheSameScenario() {
        assertThat(RandomScenarios.any(7)).isEqualTo(RandomScenarios.any(7)).isNotEqualTo(RandomScenarios.any(8));
    }

    @Test
    void everyKindOfLinkOccurs() {
        for (PumpMode mode : PumpMode.values()) {
            occurs(scenario ->
                    scenario.source().pump().mode() == mode && filters(scenario).gaussian());
            occurs(
                    scenario -> scenario.source().pump().mode() == mode
                            && !filters(scenario).gaussian(),
                    SOME / 2);
        }
        occurs(scenario ->
                filters(scenario).alice().flat() && filters(scenario).bob().flat());
        occurs(scenario -> scenario.alice().detectors().size() == 1
                && scenario.bob().detectors().size() == 2);
        occurs(scenario -> scenario.alice().detectors().size() == 2
                && scenario.bob().detectors().size() == 2);
        occurs(scenario -> anyDetector(scenario, detector -> detector.gate().isPresent()));
        occurs(scenario -> anyDetector(scenario, detector -> detector.jitterTailFraction() > 0.0));
        occurs(scenario -> anyElement(
                scenario,
                element -> element instanceof Compensator c && c.share().isPresent()));
        occurs(scenario -> anyElement(
                scenario,
                element -> element instanceof Compensator c
                        && c.dispersionPsPerNm().isPresent()));
        occurs(scenario -> anyElement(
                scenario,
                element ->
                        element instanceof FibreSpan f && !f.classicalChannels().isEmpty()));
        occurs(scenario -> scenario.source().unheraldedG2().isPresent());
        occurs(scenario -> scenario.source().partnerPassProbability().isPresent());
        occurs(scenario -> scenario.alice().analyzer().inputShortFraction() != 0.5);
        occurs(scenario -> scenario.alice().analyzer().mismatchPs()
                != scenario.bob().analyzer().mismatchPs());
        occurs(scenario -> scenario.alice().delayErrorPs() != 0.0);
    }

    @Test
    void numbersReachTheEndsOfTheirRangesAndZero() {
        occurs(scenario -> scenario.alice().tagBinPs() == 0.0, 1);
        occurs(scenario -> scenario.timing().windowWidthPs() == 1e7, 1);
        occurs(scenario -> scenario.timing().windowWidthPs() == 1e-3, 1);
        occurs(scenario -> anyDetector(scenario, detector -> detector.efficiency() == 1.0), 1);
        occurs(scenario -> anyDetector(scenario, detector -> detector.deadTimeNs() == 1e9), 1);
        occurs(scenario -> anyElement(scenario, element -> element instanceof FibreSpan f && f.lengthKm() > 1000.0), 1);
    }

    /** A share of the random links carries a signal that interferes visibly, so that the properties are not asked of dead links only. */
    @Test
    void manyOfTheLinksWork() {
        long working = LongStream.range(0, LINKS)
                .parallel()
                .filter(number -> LinkPredictor.predict(RandomScenarios.any(number))
                                .fringe()
                                .raw()
                        > 0.5)
                .count();
        assertThat(working).isGreaterThan(LINKS / 4);
    }

    private static void occurs(Predicate<Scenario> kind) {
        occurs(kind, SOME);
    }

    private static void occurs(Predicate<Scenario> kind, int often) {
        long count = LongStream.range(0, LINKS)
                .mapToObj(RandomScenarios::any)
                .filter(kind)
                .limit(often)
                .count();
        assertThat(count).isEqualTo(often);
    }

    private static PairSpectrum filters(Scenario scenario) {
        return PairSpectra.of(SpectrumInputs.of(scenario));
    }

    private static boolean anyDetector(Scenario scenario, Predicate<Detector> kind) {
        return arms(scenario).stream().flatMap(arm -> arm.detectors().stream()).anyMatch(kind);
    }

    private static boolean anyElement(Scenario scenario, Predicate<Object> kind) {
        return arms(scenario).stream().flatMap(arm -> arm.path().stream()).anyMatch(kind);
    }

    private static List<Arm> arms(Scenario scenario) {
        return List.of(scenario.alice(), scenario.bob());
    }

    private static List<String> outside(Section section, Values stated) {
        List<String> wrong = new ArrayList<>();
        for (Map.Entry<String, Object> entry : stated.asMap().entrySet()) {
            Field field = section.field(entry.getKey()).orElseThrow();
            if (entry.getValue() instanceof Double value && !field.range().contains(value)) {
                wrong.add(field.name() + " is " + value);
            } else if (entry.getValue() instanceof Values object) {
                wrong.addAll(outside(field.content().section(object.type()).orElseThrow(), object));
            } else if (entry.getValue() instanceof List<?> items) {
                items.forEach(item -> wrong.addAll(
                        outside(field.content().section(((Values) item).type()).orElseThrow(), (Values) item)));
            }
        }
        return wrong;
    }
}
