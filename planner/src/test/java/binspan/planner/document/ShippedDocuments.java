package binspan.planner.document;

import binspan.planner.io.InvalidScenarioException;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** The scenarios that come with the program, presets included, as documents. */
final class ShippedDocuments {
    private static final List<Path> FOLDERS =
            List.of(Path.of("..", "scenarios"), Path.of("src", "main", "resources", "binspan", "planner", "presets"));

    private ShippedDocuments() {}

    static List<ScenarioDocument> all() {
        return FOLDERS.stream().flatMap(ShippedDocuments::in).toList();
    }

    /** One of them by its file name without ending. */
    static ScenarioDocument named(String name) {
        return all().stream()
                .filter(each -> each.name().equals(name + ".json"))
                .findFirst()
                .orElseThrow();
    }

    static boolean isPreset(ScenarioDocument document) {
        return Files.exists(FOLDERS.get(1).resolve(document.name()));
    }

    private static Stream<ScenarioDocument> in(Path folder) {
        try (Stream<Path> files = Files.list(folder)) {
            return files
                    .filter(file -> file.toString().endsWith(".json")
                            && !file.toString().contains("schema"))
                    .sorted()
                    .map(ShippedDocuments::read)
                    .toList()
                    .stream();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static ScenarioDocument read(Path file) {
        try {
            return ScenarioDocument.of(
                    Files.readString(file), file.getFileName().toString());
        } catch (IOException | InvalidScenarioException e) {
            throw new IllegalStateException(file.toString(), e);
        }
    }
}
