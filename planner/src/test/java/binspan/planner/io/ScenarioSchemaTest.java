package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.json.JsonReadFeature;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The schema against the reader: a second opinion by an independent validator. */
final class ScenarioSchemaTest {
    private static final Path SCENARIOS = Path.of("..", "scenarios");
    private static final Path COMMITTED = SCENARIOS.resolve("binspan-scenario.schema.json");
    private static final JsonMapper MAPPER = JsonMapper.builder(JsonFactory.builder()
                    .enable(JsonReadFeature.ALLOW_JAVA_COMMENTS)
                    .build())
            .build();
    private static final SchemaRegistry REGISTRY =
            SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
    private static final Schema SCHEMA = REGISTRY.getSchema(ScenarioSchema.text());

    /**
     * Broken scenarios whose error lies between parts of the file, or in a word for a path, where no schema sees it.
     */
    private static final Set<String> BEYOND_SCHEMA = Set.of(
            "channel above its range",
            "classical light without a filter",
            "duplicate field",
            "duplicate list of which the first has errors",
            "duplicate object",
            "duplicate path in a spread",
            "field of another pump mode",
            "gated detector with a continuous pump",
            "missing compensator loss",
            "missing dark counts",
            "missing pair rate",
            "missing pump fields of the mode",
            "noise of another pump mode",
            "provenance of an unknown label",
            "provenance without a dot",
            "spread of a detector that is not there",
            "spread of a word",
            "spread of an unknown path",
            "the same label twice",
            "the same photon twice");

    static Stream<Path> shipped() throws IOException {
        List<Path> shipped;
        try (Stream<Path> files = Files.walk(SCENARIOS)) {
            shipped = files.filter(file -> file.toString().endsWith(".json") && !file.equals(COMMITTED))
                    .toList();
        }
        Path presets = Path.of("src/main/resources/binspan/planner/presets");
        try (Stream<Path> files = Files.list(presets)) {
            return Stream.concat(shipped.stream(), files.toList().stream());
        }
    }

    @Test
    void committedSchemaIsTheGeneratedOne() {
        assertThat(COMMITTED).hasContent(ScenarioSchema.text());
    }

    @Test
    void schemaIsASchema() {
        Schema dialect = REGISTRY.getSchema(
                com.networknt.schema.SchemaLocation.of("https://json-schema.org/draft/2020-12/schema"));
        assertThat(dialect.validate(ScenarioSchema.text(), InputFormat.JSON)).isEmpty();
    }

    @ParameterizedTest
    @MethodSource("shipped")
    void shippedScenariosPassSchemaAndReader(Path file) throws Exception {
        assertThat(SCHEMA.validate(MAPPER.readTree(Files.readString(file)))).isEmpty();
        assertThat(ScenarioReader.read(file.toString()).name()).isNotEmpty();
    }

    @Test
    void schemaFindsWhateverIsWrongInOnePlace() {
        Set<String> passed = new TreeSet<>();
        for (BrokenScenario broken : BrokenScenario.all()) {
            if (isJson(broken) && SCHEMA.validate(MAPPER.readTree(broken.raw())).isEmpty()) {
                passed.add(broken.name());
            }
        }
        assertThat(passed).isEqualTo(new TreeSet<>(BEYOND_SCHEMA));
    }

    @Test
    void whatTheReaderAcceptsTheSchemaAccepts() {
        List<String> texts = List.of(BrokenScenario.text("pulsed.json"), BrokenScenario.text("continuous.json"));
        Mutations mutations = new Mutations(20_261_204);
        int accepted = 0;
        for (int i = 0; i < 6000; i++) {
            byte[] bytes = mutations.damaged(texts.get(i % texts.size()));
            if (reads(bytes)) {
                JsonNode tree = MAPPER.readTree(new String(bytes, StandardCharsets.UTF_8));
                assertThat(SCHEMA.validate(tree))
                        .as(new String(bytes, StandardCharsets.UTF_8))
                        .isEmpty();
                accepted++;
            }
        }
        assertThat(accepted).isGreaterThan(400);
    }

    private static boolean reads(byte[] bytes) {
        try {
            ScenarioReader.read(new ByteArrayInputStream(bytes), "f");
            return true;
        } catch (InvalidScenarioException e) {
            return false;
        }
    }

    private static boolean isJson(BrokenScenario broken) {
        try {
            String text = FileText.of(new ByteArrayInputStream(broken.bytes()), "f");
            TreeReader.read(text);
            return !text.contains(" NaN") && !text.contains("Infinity");
        } catch (SyntaxException | InvalidScenarioException | IOException e) {
            return false;
        }
    }
}
