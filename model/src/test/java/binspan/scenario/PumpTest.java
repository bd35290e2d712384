package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

final class PumpTest {

    /** Only a pulse pair can be made by an interferometer, whatever stands beside the other modes. */
    @ParameterizedTest
    @EnumSource(Preparation.class)
    void onlyAPulsePairIsMadeByAnInterferometer(Preparation preparation) {
        boolean split = preparation == Preparation.INTERFEROMETER;

        assertThat(pump(SampleScenarios.pulsePair(), preparation).madeByInterferometer())
                .isEqualTo(split);
        assertThat(pump(SampleScenarios.pulseTrain(), preparation).madeByInterferometer())
                .isFalse();
        assertThat(pump(SampleScenarios.continuous(), preparation).madeByInterferometer())
                .isFalse();
    }

    private static Pump pump(Values values, Preparation preparation) {
        SampleScenarios.part(values, "source.pump").put("preparation", preparation);
        return SampleScenarios.build(values).source().pump();
    }
}
