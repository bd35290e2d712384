package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

final class SpreadTest {

    @ParameterizedTest
    @EnumSource(SpreadShape.class)
    void shapeAndWidthAreThoseThatTheFileStates(SpreadShape shape) {
        Values stated = new Values().put(shape.text(), 0.25).put("relative", true);
        Values values = SampleScenarios.pulsePair().put("spread", Map.of("timing.windowWidthPs", stated));
        Spread spread = SampleScenarios.build(values).spread().get("timing.windowWidthPs");

        assertThat(spread.shape()).isEqualTo(shape);
        assertThat(spread.width()).isEqualTo(0.25);
        assertThat(spread.relative()).isTrue();
        assertThat(spread).isEqualTo(Spread.of(shape, 0.25, true)).isNotEqualTo(Spread.of(shape, 0.25, false));
    }
}
