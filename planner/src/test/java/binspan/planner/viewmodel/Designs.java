package binspan.planner.viewmodel;

import binspan.planner.document.Differences;
import binspan.planner.document.RefusedEditException;
import binspan.planner.document.ScenarioDocument;
import binspan.planner.io.InvalidScenarioException;
import binspan.scenario.Scenario;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;

/** Designs of shipped links, also with some of their numbers changed. */
public final class Designs {
    private static final Path SCENARIOS = Path.of("..", "scenarios");

    private Designs() {}

    /** The design of a shipped link, or of one that differs from a shipped link of the same name in numbers and words only. */
    public static Design of(Scenario scenario) {
        ScenarioDocument base = named(scenario.name());
        try {
            return new Design(base.with(Differences.between(base.scenario(), scenario)));
        } catch (RefusedEditException e) {
            throw new IllegalStateException(e);
        }
    }

    /** The document of a shipped file. */
    public static ScenarioDocument shipped(String file) {
        return read(SCENARIOS.resolve(file + ".json"));
    }

    private static ScenarioDocument named(String name) {
        try (Stream<Path> files = Files.list(SCENARIOS)) {
            return files.filter(file -> file.toString().endsWith(".json")
                            && !file.toString().contains("schema"))
                    .map(Designs::read)
                    .filter(document -> document.scenario().name().equals(name))
                    .findFirst()
                    .orElseThrow();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static ScenarioDocument read(Path file) {
        try {
            return ScenarioDocument.of(Files.readString(file), file.toString());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
    }
}
