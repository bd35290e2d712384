package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.Values;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/**
 * Whole verdicts as they were last read and approved by eye; a changed one must be read again before its file is
 * renewed.
 */
final class VerdictRegressionTest {
    private static void assertVerdict(Values stated, String file) throws IOException {
        try (InputStream in = VerdictRegressionTest.class.getResourceAsStream(file)) {
            assertThat(in).as(file).isNotNull();
            String approved = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            assertThat(Verdict.text(ReportScenarios.check(stated), TextStyle.PLAIN))
                    .isEqualTo(approved);
        }
    }

    @Test
    void linkThatMeetsItsRequirements() throws IOException {
        assertVerdict(ReportScenarios.good(), "verdict-meets.txt");
    }

    @Test
    void linkThatFails() throws IOException {
        assertVerdict(ReportScenarios.failing(), "verdict-fails.txt");
    }
}
