package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.export.StudyDefaults;
import binspan.planner.export.StudyReport;
import binspan.planner.export.ToleranceReport;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.planner.table.Table;
import binspan.planner.viewmodel.StudyRun.Result;
import binspan.planner.viewmodel.StudyRun.State;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.study.Execution;
import binspan.study.tolerance.Tolerance;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

/** A study in the background: most tests do its work and show its results by hand, in their own order. */
final class StudyRunTest {
    private static final long MILLI = 1_000_000L;

    private final Scenario kestrel = scenario();
    private final Design design = Designs.of(kestrel);
    private final Deque<Runnable> work = new ArrayDeque<>();
    private final Deque<Runnable> shown = new ArrayDeque<>();
    private final AtomicLong nanos = new AtomicLong();
    private final StudyRun<String> run = new StudyRun<>(design, new Background(work::add, shown::add), nanos::get);

    private static Scenario scenario() {
        try {
            return ScenarioReader.read("../scenarios/kestrel-dam-to-millbrook.json");
        } catch (InvalidScenarioException e) {
            throw new IllegalStateException(e);
        }
    }

    private static Result<String> result(String found) {
        Table table = new Table(List.of("a"), writer -> {});
        return new Result<>(new StudyReport(Map.of(), table, style -> found, Optional.empty()), found);
    }

    private void show() {
        while (!shown.isEmpty()) {
            shown.remove().run();
        }
    }

    private void finish(String found) {
        run.start(execution -> result(found), design.scenario());
        work.remove().run();
        show();
    }

    private State state() {
        return run.stateProperty().get();
    }

    @Test
    void showsNothingBeforeTheFirstStart() {
        assertThat(state()).isEqualTo(State.IDLE);
        assertThat(run.resultProperty().get()).isNull();
        assertThat(run.staleProperty().get()).isFalse();
    }

    @Test
    void runsOnAllProcessorsAndKeepsItsResult() {
        List<Integer> threads = new ArrayList<>();
        run.start(
                execution -> {
                    threads.add(execution.threads());
                    nanos.addAndGet(1500 * MILLI);
                    return result("found");
                },
                kestrel);
        assertThat(state()).isEqualTo(State.RUNNING);
        work.remove().run();
        show();
        assertThat(state()).isEqualTo(State.DONE);
        assertThat(run.resultProperty().get().found()).isEqualTo("found");
        assertThat(run.progressProperty().get()).isEqualTo(1.0);
        assertThat(run.elapsedProperty().get()).isEqualTo(1.5);
        assertThat(threads).containsExactly(Runtime.getRuntime().availableProcessors());
    }

    @Test
    void neverGoesBackAndReportsSomeTwentyTimesASecond() {
        List<Double> seen = new ArrayList<>();
        run.progressProperty().addListener((source, before, after) -> seen.add(after.doubleValue()));
        run.start(
                execution -> {
                    for (int i = 0; i < 1000; i++) {
                        nanos.addAndGet(MILLI);
                        execution.reached(i % 7 == 3 ? 0.01 : i / 1000.0);
                    }
                    return result("");
                },
                kestrel);
        work.remove().run();
        assertThat(shown).hasSizeBetween(18, 22);
        show();
        assertThat(seen).isSorted().hasSizeGreaterThan(15).endsWith(1.0);
    }

    @Test
    void cancellingEndsAtOnceAndKeepsTheFormerResult() {
        finish("former");
        run.start(
                execution -> {
                    execution.stopIfCancelled();
                    return result("late");
                },
                kestrel);
        run.cancel();
        assertThat(state()).isEqualTo(State.CANCELLED);
        work.remove().run();
        show();
        assertThat(state()).isEqualTo(State.CANCELLED);
        assertThat(run.resultProperty().get().found()).isEqualTo("former");
    }

    @Test
    void whatACancelledStudyStillFindsIsDropped() {
        run.start(execution -> result("deaf"), kestrel);
        run.cancel();
        work.remove().run();
        show();
        assertThat(run.resultProperty().get()).isNull();
    }

    @Test
    void aNewStartReplacesARunningStudy() {
        run.start(execution -> result("first"), kestrel);
        run.start(execution -> result("second"), kestrel);
        work.forEach(Runnable::run);
        show();
        assertThat(run.resultProperty().get().found()).isEqualTo("second");
        assertThat(state()).isEqualTo(State.DONE);
    }

    @Test
    void refusalsAreForPeopleAndFailuresSaySo() {
        assertThat(failure(new IllegalArgumentException("found 0; allowed 1"))).isEqualTo("found 0; allowed 1");
        assertThat(failure(new IllegalStateException("broken")))
                .startsWith("The program failed: ")
                .contains("broken");
        assertThat(failure(new OutOfMemoryError("heap")))
                .startsWith("The program failed: ")
                .contains("heap");
    }

    private String failure(Throwable thrown) {
        run.start(
                execution -> {
                    if (thrown instanceof Error error) {
                        throw error;
                    }
                    throw (RuntimeException) thrown;
                },
                kestrel);
        work.remove().run();
        show();
        assertThat(state()).isEqualTo(State.FAILED);
        return run.failureProperty().get();
    }

    @Test
    void aFailureKeepsTheFormerResultAndGoesWithTheNextStart() {
        finish("former");
        failure(new IllegalArgumentException("no"));
        assertThat(run.resultProperty().get().found()).isEqualTo("former");
        finish("next");
        assertThat(run.failureProperty().get()).isEmpty();
    }

    @Test
    void aResultIsStaleWhileTheLinkIsAnotherOne() {
        finish("found");
        window(500.0);
        assertThat(run.staleProperty().get()).isTrue();
        design.change("back", null, scenario -> kestrel);
        assertThat(run.staleProperty().get()).isFalse();
    }

    @Test
    void aResultThatComesAfterAChangeIsStaleAtOnce() {
        run.start(execution -> result("found"), design.scenario());
        window(500.0);
        assertThat(run.staleProperty().get()).isFalse();
        work.remove().run();
        show();
        assertThat(run.staleProperty().get()).isTrue();
    }

    private void window(double ps) {
        design.change(
                "window",
                null,
                scenario ->
                        ParameterPaths.find(scenario, "timing.windowWidthPs").with(scenario, ps));
    }

    @Test
    void theThreadsOfALongStudyEndSoonAfterItIsCancelled() throws InterruptedException {
        CountDownLatch begun = new CountDownLatch(1);
        CountDownLatch ended = new CountDownLatch(1);
        Tolerance usual = StudyDefaults.tolerance(kestrel);
        Tolerance many = new Tolerance(kestrel, usual.spreads(), 65_536, 1L, usual.columns());
        Background threads = Background.of(Runnable::run);
        StudyRun<String> real = new StudyRun<>(design, threads);
        Function<Execution, Result<String>> study = execution -> {
            begun.countDown();
            try {
                return new Result<>(ToleranceReport.of(many.run(execution)), "");
            } catch (CancellationException e) {
                ended.countDown();
                throw e;
            }
        };
        real.start(study, kestrel);
        assertThat(begun.await(10, TimeUnit.SECONDS)).isTrue();
        Thread.sleep(300);
        real.cancel();
        assertThat(real.stateProperty().get()).isEqualTo(State.CANCELLED);
        assertThat(ended.await(1, TimeUnit.SECONDS)).isTrue();
    }
}
