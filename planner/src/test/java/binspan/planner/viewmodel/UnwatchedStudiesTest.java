package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.concurrent.atomic.AtomicInteger;
import javafx.collections.ListChangeListener;
import org.junit.jupiter.api.Test;

/** Options of studies that nobody looks at do not follow each step of a drag, but are right when they are looked at or run. */
class UnwatchedStudiesTest {
    private final Design design = new Design(Designs.shipped("kestrel-dam-to-millbrook"));

    @Test
    void axesFollowWhenSomebodyLooks() {
        TuneModel model = new TuneModel(design, Background.NONE);
        model.watchedProperty().set(false);
        int before = model.free().axes().size();
        String first = model.free().axes().get(0).pathProperty().get();
        design.begin(Designs.shipped("stonebridge-to-lower-weir"));
        assertThat(model.free().axes().get(0).pathProperty().get()).isEqualTo(first);
        model.watchedProperty().set(true);
        TuneModel fresh = new TuneModel(design, Background.NONE);
        assertThat(before).isPositive();
        assertThat(model.free().axes().stream().map(axis -> axis.pathProperty().get()))
                .containsExactlyElementsOf(fresh.free().axes().stream()
                        .map(axis -> axis.pathProperty().get())
                        .toList())
                .doesNotContain(first);
    }

    @Test
    void runningCatchesUpToo() {
        HeldBackground held = new HeldBackground();
        TuneModel model = new TuneModel(design, held.background());
        model.watchedProperty().set(false);
        design.begin(Designs.shipped("stonebridge-to-lower-weir"));
        model.start();
        assertThat(model.problemProperty().get()).isEmpty();
        assertThat(model.run().stateProperty().get()).isEqualTo(StudyRun.State.RUNNING);
        model.run().cancel();
    }

    /** Rows were once made anew at each step, since parameters of two scenarios are two objects. */
    @Test
    void spreadsThatSayTheSameAreNotMadeAnew() {
        ToleranceModel model = new ToleranceModel(design, Background.NONE);
        AtomicInteger changes = new AtomicInteger();
        model.rows().addListener((ListChangeListener<ToleranceModel.Row>) change -> changes.incrementAndGet());
        assertThat(model.rows()).isNotEmpty();
        design.change("margin", null, scenario -> VerdictLinks.with(scenario, "alice.repairMarginDb", 1.7));
        assertThat(changes).hasValue(0);
        design.begin(Designs.shipped("stonebridge-to-lower-weir"));
        assertThat(changes).hasPositiveValue();
    }
}
