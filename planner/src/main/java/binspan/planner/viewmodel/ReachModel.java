package binspan.planner.viewmodel;

import binspan.planner.export.ReachReport;
import binspan.planner.io.WrittenNumber;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureColumns;
import binspan.study.tuning.Reach;
import binspan.study.tuning.SourcePosition;
import java.util.List;
import java.util.function.Function;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;

/** How far the link reaches. */
public final class ReachModel extends StudyModel<Reach.Outcome> {
    private final ObjectProperty<Place> place = new SimpleObjectProperty<>(this, "place", Place.AS_WRITTEN);
    private final StringProperty share = new SimpleStringProperty(this, "share", "0.5");
    private final BooleanProperty retuned = new SimpleBooleanProperty(this, "retuned", true);
    private final ObjectProperty<Aim> aim = new SimpleObjectProperty<>(this, "aim", Aim.USUAL);
    private final FreeParameters free;

    /** Where the source stands. */
    public enum Place {
        AS_WRITTEN,
        MIDDLE,
        ALICE,
        BOB,
        SHARE
    }

    /** The study of a link, not run yet. */
    public ReachModel(Design design, Background background) {
        super("reach", design, background);
        free = new FreeParameters(design, this::check);
        followDesign(free::follow);
        follow(place, share, retuned, aim);
        check();
    }

    @Override
    Function<Execution, StudyRun.Result<Reach.Outcome>> work(Scenario scenario) {
        Scenario placed = placed(scenario);
        List<Axis> axes = retuned.get() ? free.used(placed) : List.of();
        Aim wanted = aim.get();
        return execution -> {
            Reach reach = new Reach(placed, axes, wanted.of(placed), FigureColumns.all(placed));
            Reach.Outcome outcome = reach.run(execution);
            return new StudyRun.Result<>(ReachReport.of(reach, outcome), outcome);
        };
    }

    private Scenario placed(Scenario scenario) {
        return switch (place.get()) {
            case AS_WRITTEN -> scenario;
            case MIDDLE -> SourcePosition.moved(scenario, 0.5);
            case ALICE -> SourcePosition.moved(scenario, 0.0);
            case BOB -> SourcePosition.moved(scenario, 1.0);
            case SHARE ->
                SourcePosition.moved(scenario, WrittenNumber.of(share.get().strip()));
        };
    }

    /** Where the source stands. */
    public ObjectProperty<Place> placeProperty() {
        return place;
    }

    /** Alice's share of the fibre, 0 to 1, as it is written; counts for {@link Place#SHARE}. */
    public StringProperty shareProperty() {
        return share;
    }

    /** Whether the free parameters are set anew at every length. */
    public BooleanProperty retunedProperty() {
        return retuned;
    }

    /** What they are set for. */
    public ObjectProperty<Aim> aimProperty() {
        return aim;
    }

    /** What is set anew. */
    public FreeParameters free() {
        return free;
    }
}
