package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import binspan.planner.io.Mutations;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** Damaged scenarios get a verdict or clear errors, never a failure of the program. */
final class MutationTest {
    private static final int RUNS = 10_000;
    private static final Pattern ERROR = Pattern.compile("\\(standard input\\)(:\\d+:\\d+)?: .+");
    private static final Pattern INSIDES = Pattern.compile("\\b(java|javax|jdk|sun|binspan|tools|picocli)\\.[a-z]|"
            + "\\w(Exception|Error)\\b|\\bat [a-z]+\\.|\\$\\w+@|jackson|\\bnull\\b(?!;)");

    @Test
    void damageNeverLeadsToAFailure() {
        List<String> presets =
                Arrays.stream(Preset.values()).map(Preset::scenario).toList();
        Mutations mutations = new Mutations(20_261_201);
        int[] ends = new int[ExitStatus.FAILED + 1];
        for (int i = 0; i < RUNS; i++) {
            byte[] bytes = mutations.damaged(presets.get(i % presets.size()));
            Run run = Run.reading(bytes, "check", "-");
            ends[run.status()]++;
            if (!isClear(run)) {
                fail(run + " for\n" + new String(bytes, StandardCharsets.ISO_8859_1));
            }
        }
        assertThat(ends[ExitStatus.REFUSED]).isGreaterThan(RUNS / 3);
        assertThat(ends[ExitStatus.MET] + ends[ExitStatus.UNMET]).isGreaterThan(RUNS / 10);
    }

    /**
     * A verdict without errors, or errors without a verdict that show the place and nothing of the program's insides.
     */
    private static boolean isClear(Run run) {
        if (run.status() != ExitStatus.REFUSED) {
            return run.status() != ExitStatus.FAILED
                    && run.err().isEmpty()
                    && !run.out().isEmpty();
        }
        return run.out().isEmpty()
                && !run.err().isEmpty()
                && run.err().lines().allMatch(line -> ERROR.matcher(line).matches())
                && !INSIDES.matcher(run.err()).find();
    }
}
