package binspan.planner.cli;

import binspan.planner.export.StudyDefaults;
import binspan.planner.report.RequiredFigure;
import binspan.scenario.Scenario;
import binspan.study.tuning.Objective;
import java.util.Arrays;
import java.util.List;
import picocli.CommandLine.Option;

/** The option {@code --for OBJECTIVE}: what a study makes as large as possible. */
final class ObjectiveOption {
    private static final String NAME = "--for";

    @Option(
            names = NAME,
            paramLabel = "OBJECTIVE",
            description = "What is made as large as possible: key, visibility, chsh or margin (the least margin of all"
                    + " requirements); the key if not given, S where the detectors allow no key.")
    private String word;

    /**
     * The objective that was named, or the natural one of a link.
     *
     * @throws UsageException if there is no such objective, or the link cannot have it
     */
    Objective of(Scenario scenario) throws UsageException {
        Objective natural = StudyDefaults.objective(scenario);
        if (word == null) {
            return natural;
        }
        Objective objective = Arrays.stream(Objective.values())
                .filter(each -> each.text().equals(word))
                .findFirst()
                .orElseThrow(() -> UsageException.unknown("objective", word, words()));
        if (objective == Objective.MARGIN
                && RequiredFigure.of(scenario.require()).isEmpty()) {
            throw UsageException.of(NAME + " margin: the scenario states no requirement to keep a margin to");
        }
        if (objective == Objective.KEY && natural != Objective.KEY) {
            throw UsageException.of(NAME + " key: this link makes no key: both sides need both ports detected");
        }
        return objective;
    }

    private static List<String> words() {
        return Arrays.stream(Objective.values()).map(Objective::text).toList();
    }
}
