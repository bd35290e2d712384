package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.report.TextStyle;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;

final class ProgressBarTest {
    private static final long MILLISECOND = 1_000_000L;

    private final ByteArrayOutputStream screen = new ByteArrayOutputStream();
    private final AtomicLong clock = new AtomicLong(-5_000 * MILLISECOND);

    private ProgressBar bar(boolean terminal, TextStyle style) {
        return new ProgressBar(new PrintStream(screen, true, StandardCharsets.UTF_8), style, clock::get, terminal);
    }

    private void wait(int milliseconds) {
        clock.addAndGet(milliseconds * MILLISECOND);
    }

    private String drawn() {
        return screen.toString(StandardCharsets.UTF_8);
    }

    /** What is left on the screen once carriage returns have moved the cursor back. */
    private String visible() {
        StringBuilder line = new StringBuilder();
        int column = 0;
        for (char c : drawn().toCharArray()) {
            if (c == '\r') {
                column = 0;
            } else {
                line.replace(column, Math.min(line.length(), column + 1), String.valueOf(c));
                column++;
            }
        }
        return line.toString();
    }

    @Test
    void nothingIsDrawnWithinASecond() {
        try (ProgressBar bar = bar(true, TextStyle.PLAIN)) {
            for (int i = 0; i < 99; i++) {
                wait(10);
                bar.reached(i / 100.0);
            }
        }
        assertThat(drawn()).isEmpty();
    }

    @Test
    void nothingIsDrawnWithoutATerminal() {
        try (ProgressBar bar = bar(false, TextStyle.PLAIN)) {
            wait(60_000);
            bar.reached(0.5);
        }
        assertThat(drawn()).isEmpty();
    }

    @Test
    void shareBarAndTimeLeftAreDrawn() {
        ProgressBar bar = bar(true, TextStyle.PLAIN);
        wait(15_000);
        bar.reached(0.25);
        assertThat(drawn()).isEqualTo("\r  25 %  ##########------------------------------  about 45 seconds left");
        wait(15_000);
        bar.reached(0.998);
        assertThat(visible())
                .startsWith("  99 %  " + "#".repeat(39) + "-  a few seconds left")
                .doesNotContain("about");
        bar.close();
        assertThat(visible()).isBlank();
        assertThat(drawn()).endsWith("\r");
    }

    @Test
    void screensThatShowThemGetBlocks() {
        ProgressBar bar = bar(true, new TextStyle(false, true));
        wait(2_000);
        bar.reached(0.5);
        assertThat(drawn()).contains("\u2588".repeat(20) + "\u2592".repeat(20)).doesNotContain("#");
    }

    @Test
    void atMostTenLinesASecondAreDrawn() {
        try (ProgressBar bar = bar(true, TextStyle.PLAIN)) {
            for (int i = 0; i < 3_000; i++) {
                wait(1);
                bar.reached(i / 3_000.0);
            }
        }
        long lines = drawn().chars().filter(c -> c == '%').count();
        assertThat(lines).isBetween(19L, 21L);
    }

    @Test
    void lateReportsDoNotMoveTheBarBack() {
        ProgressBar bar = bar(true, TextStyle.PLAIN);
        wait(2_000);
        bar.reached(0.5);
        wait(1_000);
        bar.reached(0.4);
        assertThat(visible()).startsWith("  50 %");
    }

    @Test
    void nothingIsDrawnAfterTheEnd() {
        ProgressBar bar = bar(true, TextStyle.PLAIN);
        wait(2_000);
        bar.reached(0.5);
        bar.close();
        String before = drawn();
        wait(2_000);
        bar.reached(0.6);
        bar.close();
        assertThat(drawn()).isEqualTo(before);
    }

    @Test
    void severalThreadsDrawWholeLines() throws InterruptedException {
        ProgressBar bar = bar(true, TextStyle.PLAIN);
        wait(1_000);
        List<Thread> threads = new ArrayList<>();
        for (int t = 0; t < 4; t++) {
            threads.add(new Thread(() -> {
                for (int i = 1; i <= 1_000; i++) {
                    wait(1);
                    bar.reached(i / 1_000.0);
                }
            }));
        }
        threads.forEach(Thread::start);
        for (Thread thread : threads) {
            thread.join();
        }
        bar.close();
        String[] lines = drawn().split("\r", -1);
        assertThat(lines).hasSizeBetween(5, 45);
        assertThat(lines).allSatisfy(line -> assertThat(line).matches("| +| {1,3}\\d+ %  [#-]{40}  [a-z0-9 ]+left *"));
    }

    @Test
    void studyIsNeverCancelled() {
        assertThat(bar(true, TextStyle.PLAIN).cancelled()).isFalse();
    }
}
