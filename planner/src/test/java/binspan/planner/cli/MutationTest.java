package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.Mutations;
import binspan.planner.io.Preset;
import binspan.planner.io.ScenarioReader;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** Damaged scenarios get a verdict or clear errors, never a failure of the program. */
final class MutationTest {
    private static final int RUNS = 10_000;

    /** Of so many damaged scenarios that can still be read one is predicted too, which takes longer than reading. */
    private static final int PREDICTED_OF = 10;

    private static final Pattern ERROR = Pattern.compile("\\(standard input\\)(:\\d+:\\d+)?: .+");
    private static final Pattern INSIDES = Pattern.compile("\\b(java|javax|jdk|sun|binspan|tools|picocli)\\.[a-z]|"
            + "\\w(Exception|Error)\\b|\\bat [a-z]+\\.|\\$\\w+@|jackson|\\bnull\\b(?!;)");

    @Test
    void damageNeverLeadsToAFailure() {
        List<String> presets =
                Arrays.stream(Preset.values()).map(Preset::scenario).toList();
        Mutations mutations = new Mutations(20_261_201);
        int accepted = 0;
        for (int i = 0; i < RUNS; i++) {
            byte[] bytes = mutations.damaged(presets.get(i % presets.size()));
            boolean reads = reads(bytes);
            accepted += reads ? 1 : 0;
            if (!reads || accepted % PREDICTED_OF == 0) {
                assertClear(Run.reading(bytes, "check", "-"), reads, bytes);
            }
        }
        assertThat(accepted).isBetween(RUNS / 10, RUNS / 2);
    }

    private static boolean reads(byte[] bytes) {
        try {
            ScenarioReader.read(new ByteArrayInputStream(bytes), "link.json");
            return true;
        } catch (InvalidScenarioException e) {
            return false;
        }
    }

    private static void assertClear(Run run, boolean reads, byte[] bytes) {
        if (reads ? !isVerdict(run) : !isRefusal(run)) {
            fail(run + " for\n" + new String(bytes, StandardCharsets.ISO_8859_1));
        }
    }

    private static boolean isVerdict(Run run) {
        return run.status() <= ExitStatus.UNMET
                && run.err().isEmpty()
                && !run.out().isEmpty();
    }

    /** Errors only, which show the place and nothing of the program's insides. */
    private static boolean isRefusal(Run run) {
        return run.status() == ExitStatus.REFUSED
                && run.out().isEmpty()
                && !run.err().isEmpty()
                && run.err().lines().allMatch(line -> ERROR.matcher(line).matches())
                && !INSIDES.matcher(run.err()).find();
    }
}
