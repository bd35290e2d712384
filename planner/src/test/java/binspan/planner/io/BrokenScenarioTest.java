package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.ByteArrayInputStream;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every broken scenario of {@code broken.txt} gets exactly the messages that stand beside it. */
final class BrokenScenarioTest {
    static List<BrokenScenario> all() {
        return BrokenScenario.all();
    }

    @ParameterizedTest
    @MethodSource("all")
    void getsItsMessages(BrokenScenario broken) {
        InvalidScenarioException error = catchThrowableOfType(
                InvalidScenarioException.class,
                () -> ScenarioReader.read(new ByteArrayInputStream(broken.bytes()), "link.json"));
        List<String> expected = broken.messages().stream()
                .map(message -> "link.json:" + message)
                .toList();
        assertThat(error).as(broken.name()).isNotNull();
        assertThat(error.lines()).containsExactlyElementsOf(expected);
    }
}
