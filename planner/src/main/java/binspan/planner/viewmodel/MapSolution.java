package binspan.planner.viewmodel;

import binspan.planner.viewmodel.MapModel.BoxChoice;
import binspan.study.Execution;
import binspan.study.Progress;
import binspan.study.box.OperatingBox;
import binspan.study.box.ToleranceBox;
import binspan.study.region.OperatingRegion;
import binspan.study.region.RegionMap;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.function.BiConsumer;
import java.util.function.Consumer;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleObjectProperty;

/** What takes long of a map: when nothing has changed for a moment the exact lines, then the largest box and the recommended point. */
final class MapSolution {
    private static final long NAP_MILLIS = 10;

    private final long stillMillis;
    private final LatestTask exact;
    private final LatestTask boxing;
    private final Consumer<String> notice;
    private final ReadOnlyObjectWrapper<RegionMap> region = new ReadOnlyObjectWrapper<>(this, "region");
    private final ReadOnlyObjectWrapper<OperatingBox> box = new ReadOnlyObjectWrapper<>(this, "box");
    private final ReadOnlyObjectWrapper<MapRecommendation> recommended =
            new ReadOnlyObjectWrapper<>(this, "recommended");
    private final ObjectProperty<BoxChoice> boxChoice = new SimpleObjectProperty<>(this, "boxChoice", BoxChoice.SHARE);
    private MapQuestion question;

    /**
     * Nothing solved yet.
     *
     * @param background where it is computed
     * @param stillMillis how long nothing must change before
     * @param notice is told why there can be no box
     */
    MapSolution(Background background, long stillMillis, Consumer<String> notice) {
        this.stillMillis = stillMillis;
        this.exact = LatestTask.lengthy(background);
        this.boxing = LatestTask.lengthy(background);
        this.notice = notice;
        boxChoice.addListener((source, before, after) -> findBox());
    }

    private record Solved(RegionMap map, MapShape shape) {}

    private record Boxed(OperatingBox box, Optional<MapRecommendation> middle) {}

    ReadOnlyObjectWrapper<RegionMap> region() {
        return region;
    }

    ReadOnlyObjectWrapper<OperatingBox> box() {
        return box;
    }

    ReadOnlyObjectWrapper<MapRecommendation> recommended() {
        return recommended;
    }

    ObjectProperty<BoxChoice> boxChoice() {
        return boxChoice;
    }

    ReadOnlyBooleanProperty solving() {
        return exact.runningProperty();
    }

    ReadOnlyBooleanProperty boxing() {
        return boxing.runningProperty();
    }

    /** Stops, and what was found means nothing any more. */
    void forget() {
        question = null;
        exact.cancel();
        boxing.cancel();
        region.set(null);
        box.set(null);
        recommended.set(null);
    }

    /**
     * Answers a question once nothing has changed for a moment.
     *
     * @param asked the question
     * @param show is told the exact map and its shape
     * @param fail is told why there is none
     */
    void solve(MapQuestion asked, BiConsumer<RegionMap, MapShape> show, Consumer<RuntimeException> fail) {
        question = asked;
        exact.run(
                progress -> {
                    waitWhileStill(progress);
                    RegionMap map = asked.region(OperatingRegion.USUAL_STEPS).run(considerate(progress));
                    return new Solved(map, MapShape.of(map));
                },
                found -> {
                    if (asked.equals(question)) {
                        region.set(found.map());
                        show.accept(found.map(), found.shape());
                        findBox();
                    }
                },
                reason -> {
                    if (asked.equals(question)) {
                        fail.accept(reason);
                    }
                });
    }

    /** One processor is left for what follows the hand. */
    private static Execution considerate(Progress progress) {
        Execution all = Execution.parallel(progress);
        return new Execution(Math.max(1, all.threads() - 1), progress, all.from(), all.to());
    }

    private void waitWhileStill(Progress progress) {
        try {
            for (long waited = 0; waited < stillMillis && !progress.cancelled(); waited += NAP_MILLIS) {
                Thread.sleep(NAP_MILLIS);
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new CancellationException("interrupted");
        }
        if (progress.cancelled()) {
            throw new CancellationException("not still");
        }
    }

    private void findBox() {
        box.set(null);
        boxing.cancel();
        recommended.set(null);
        RegionMap map = region.get();
        if (map == null || !map.best().met()) {
            return;
        }
        if (boxChoice.get() == BoxChoice.NONE) {
            recommendBest();
            return;
        }
        MapQuestion asked = question;
        ToleranceBox.Sense sense =
                boxChoice.get() == BoxChoice.SHARE ? ToleranceBox.Sense.SHARE : ToleranceBox.Sense.TOLERANCE;
        boxing.run(
                progress -> {
                    OperatingBox found = asked.box(sense).run(considerate(progress));
                    return new Boxed(found, MapRecommendation.middle(asked, found));
                },
                found -> showBox(asked, found),
                reason -> showNoBox(asked, reason));
    }

    private void recommendBest() {
        recommended.set(MapRecommendation.best(region.get()).orElse(null));
    }

    private void showBox(MapQuestion asked, Boxed found) {
        if (asked.equals(question)) {
            box.set(found.box().found() ? found.box() : null);
            found.middle().ifPresentOrElse(recommended::set, this::recommendBest);
        }
    }

    /** A box of equal tolerances needs ranges that do not touch zero. */
    private void showNoBox(MapQuestion asked, RuntimeException reason) {
        if (!(reason instanceof IllegalArgumentException)) {
            throw reason;
        }
        if (asked.equals(question)) {
            recommendBest();
            notice.accept(reason.getMessage());
        }
    }
}
