package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.study.Progress;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;

/** The order in which work is done, dropped and shown, step by step. */
class LatestTaskTest {
    private final HeldBackground held = new HeldBackground();
    private final List<String> done = new ArrayList<>();
    private final List<String> shown = new ArrayList<>();

    private void ask(LatestTask task, String name) {
        task.run(
                progress -> {
                    done.add(name);
                    return name;
                },
                shown::add);
    }

    @Test
    void idleTaskBeginsAtOnceAndShowsItsResultWhenTheWindowHasTime() {
        LatestTask task = LatestTask.quick(held.background());
        assertThat(task.runningProperty().get()).isFalse();
        ask(task, "a");
        assertThat(task.runningProperty().get()).isTrue();
        assertThat(held.started()).isEqualTo(1);
        held.doWork();
        assertThat(shown).isEmpty();
        held.showResult();
        assertThat(shown).containsExactly("a");
        assertThat(task.runningProperty().get()).isFalse();
    }

    @Test
    void ofAllThatWaitsOnlyTheNewestIsDone() {
        LatestTask task = LatestTask.quick(held.background());
        List.of("a", "b", "c", "d").forEach(name -> ask(task, name));
        assertThat(held.started()).as("one at a time").isEqualTo(1);
        held.finish();
        assertThat(done).containsExactly("a", "d");
        assertThat(shown).containsExactly("a", "d");
        assertThat(task.runningProperty().get()).isFalse();
    }

    @Test
    void lengthyWorkIsToldToStopAndItsResultDropped() {
        LatestTask task = LatestTask.lengthy(held.background());
        List<Boolean> told = new ArrayList<>();
        task.run(
                progress -> {
                    told.add(progress.cancelled());
                    return "a";
                },
                shown::add);
        ask(task, "b");
        held.finish();
        assertThat(told).containsExactly(true);
        assertThat(shown).containsExactly("b");
    }

    @Test
    void quickWorkIsNotStoppedByNewerWork() {
        LatestTask task = LatestTask.quick(held.background());
        List<Boolean> told = new ArrayList<>();
        task.run(
                progress -> {
                    told.add(progress.cancelled());
                    return "a";
                },
                shown::add);
        ask(task, "b");
        held.finish();
        assertThat(told).containsExactly(false);
        assertThat(shown).containsExactly("a", "b");
    }

    @Test
    void lengthyWorkThatEndsByItselfBeforeNewerIsAskedForIsShown() {
        LatestTask task = LatestTask.lengthy(held.background());
        ask(task, "a");
        held.finish();
        ask(task, "b");
        held.finish();
        assertThat(shown).containsExactly("a", "b");
    }

    @Test
    void lengthyResultThatIsOvertakenOnItsWayToTheWindowIsDropped() {
        LatestTask task = LatestTask.lengthy(held.background());
        ask(task, "a");
        held.doWork();
        ask(task, "b");
        held.finish();
        assertThat(shown).containsExactly("b");
    }

    @Test
    void cancellingDropsWhatRunsAndWhatWaits() {
        for (LatestTask task : List.of(LatestTask.quick(held.background()), LatestTask.lengthy(held.background()))) {
            ask(task, "a");
            ask(task, "b");
            task.cancel();
            held.finish();
            assertThat(shown).isEmpty();
            assertThat(task.runningProperty().get()).isFalse();
            ask(task, "c");
            held.finish();
            assertThat(shown).as("it can be used again").containsExactly("c");
            shown.clear();
        }
    }

    @Test
    void workAskedForAfterCancellingIsDone() {
        LatestTask task = LatestTask.quick(held.background());
        ask(task, "a");
        task.cancel();
        ask(task, "b");
        held.finish();
        assertThat(shown).containsExactly("b");
    }

    @Test
    void cancellingAnIdleTaskDoesNothing() {
        LatestTask task = LatestTask.quick(held.background());
        task.cancel();
        ask(task, "a");
        held.finish();
        assertThat(shown).containsExactly("a");
    }

    @Test
    void workThatGivesUpWhenToldLeavesTheWayFree() {
        LatestTask task = LatestTask.lengthy(held.background());
        task.run(LatestTaskTest::givingUp, shown::add, failure -> shown.add("failed"));
        ask(task, "b");
        held.finish();
        assertThat(shown).containsExactly("b");
        assertThat(task.runningProperty().get()).isFalse();
    }

    private static String givingUp(Progress progress) {
        if (progress.cancelled()) {
            throw new CancellationException();
        }
        return "kept on";
    }

    @Test
    void failureIsToldToWhoeverAskedAndTheNextIsDone() {
        LatestTask task = LatestTask.quick(held.background());
        task.run(LatestTaskTest::failing, shown::add, failure -> shown.add(failure.getMessage()));
        ask(task, "b");
        held.finish();
        assertThat(shown).containsExactly("out of order", "b");
    }

    private static String failing(Progress progress) {
        throw new IllegalStateException("out of order");
    }

    @Test
    void failureOfStoppedWorkIsNotTold() {
        LatestTask task = LatestTask.lengthy(held.background());
        task.run(LatestTaskTest::failing, shown::add, failure -> shown.add(failure.getMessage()));
        ask(task, "b");
        held.finish();
        assertThat(shown).containsExactly("b");
    }

    @Test
    void failureThatNobodyWantsToHearComesToTheWindowAndTheTaskLivesOn() {
        LatestTask task = LatestTask.quick(held.background());
        task.run(LatestTaskTest::failing, shown::add);
        held.doWork();
        assertThatThrownBy(held::showResult).hasMessage("out of order");
        assertThat(task.runningProperty().get()).isFalse();
        ask(task, "b");
        held.finish();
        assertThat(shown).containsExactly("b");
    }

    @Test
    void errorOfTheMachineComesToTheWindowTooAndTheTaskLivesOn() {
        LatestTask task = LatestTask.quick(held.background());
        task.run(LatestTaskTest::breaking, shown::add);
        held.doWork();
        assertThatThrownBy(held::showResult).isInstanceOf(StackOverflowError.class);
        assertThat(task.runningProperty().get()).isFalse();
        ask(task, "b");
        held.finish();
        assertThat(shown).containsExactly("b");
    }

    private static String breaking(Progress progress) {
        throw new StackOverflowError("too deep");
    }

    @Test
    void showingThatFailsDoesNotBlockWhatWaits() {
        LatestTask task = LatestTask.quick(held.background());
        task.run(progress -> "a", result -> {
            throw new IllegalStateException("no room for " + result);
        });
        ask(task, "b");
        held.doWork();
        assertThatThrownBy(held::showResult).hasMessage("no room for a");
        held.finish();
        assertThat(shown).containsExactly("b");
    }

    @Test
    void showingAResultMayAskForMore() {
        LatestTask task = LatestTask.quick(held.background());
        task.run(progress -> "a", result -> {
            shown.add(result);
            ask(task, "b");
        });
        held.finish();
        assertThat(shown).containsExactly("a", "b");
    }

    @Test
    void whatShowingAResultAsksForReplacesWhatWaitedBefore() {
        LatestTask task = LatestTask.quick(held.background());
        task.run(progress -> "a", result -> {
            shown.add(result);
            ask(task, "newest");
        });
        ask(task, "waited");
        held.finish();
        assertThat(shown).startsWith("a").endsWith("newest");
    }

    @Test
    void withoutABackgroundEverythingIsShownBeforeTheRequestReturns() {
        for (LatestTask task : List.of(LatestTask.quick(Background.NONE), LatestTask.lengthy(Background.NONE))) {
            ask(task, "a");
            assertThat(shown).containsExactly("a");
            task.run(progress -> "b", result -> {
                shown.add(result);
                ask(task, "c");
            });
            assertThat(shown).containsExactly("a", "b", "c");
            shown.clear();
        }
    }

    @Test
    void runningIsTrueWithoutAGapWhileOneWorkFollowsTheOther() {
        LatestTask task = LatestTask.quick(held.background());
        List<Boolean> changes = new ArrayList<>();
        task.runningProperty().addListener((source, before, now) -> changes.add(now));
        ask(task, "a");
        ask(task, "b");
        held.finish();
        assertThat(changes).containsExactly(true, false);
    }
}
