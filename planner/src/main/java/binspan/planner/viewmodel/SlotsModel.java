package binspan.planner.viewmodel;

import binspan.prediction.LinkPredictor;
import binspan.scenario.Parameter;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.units.Digits;
import java.util.List;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleBooleanProperty;

/** Expected arrival times of the clicks of both sides and of the pairs, with windows and separation that can be moved. */
public final class SlotsModel {
    private static final String WINDOW = "timing.windowWidthPs";
    private static final String IMBALANCE = "imbalanceNs";
    private static final double PICO = 1e12;
    private static final double NANO = 1e9;
    private static final int DIGITS = 12;

    private final Design design;
    private final LatestTask task;
    private final LinkPredictor predictor = new LinkPredictor();
    private final ReadOnlyObjectWrapper<List<SlotPlot>> plots = new ReadOnlyObjectWrapper<>(this, "plots", List.of());
    private final BooleanProperty allPorts = new SimpleBooleanProperty(this, "allPorts");
    private final BooleanProperty logarithmic = new SimpleBooleanProperty(this, "logarithmic");
    private final BooleanProperty watched = new SimpleBooleanProperty(this, "watched", true);

    /** The histograms of a design, computed in the background. */
    public SlotsModel(Design design, Background background) {
        this.design = design;
        this.task = LatestTask.quick(background);
        design.scenarioProperty().addListener((source, before, now) -> renew());
        allPorts.addListener((source, before, now) -> renew());
        watched.addListener((source, before, now) -> renew());
        renew();
    }

    private void renew() {
        if (watched.get()) {
            Scenario scenario = design.scenario();
            boolean all = allPorts.get();
            // One task at a time, so that one thread at a time has the predictor.
            task.run(progress -> SlotPlots.of(predictor.of(scenario), all), plots::set);
        }
    }

    /** The plots, both sides before the pair. */
    public ReadOnlyObjectProperty<List<SlotPlot>> plotsProperty() {
        return plots.getReadOnlyProperty();
    }

    /** Whether coincidences of all ports are added, or those of ports (1,1) shown, whose fringe is the visibility's. */
    public BooleanProperty allPortsProperty() {
        return allPorts;
    }

    /** Whether rates are drawn on a logarithmic scale. */
    public BooleanProperty logarithmicProperty() {
        return logarithmic;
    }

    /** Whether anybody looks: otherwise nothing is computed. */
    public BooleanProperty watchedProperty() {
        return watched;
    }

    /** Whether a newer picture is being computed. */
    public ReadOnlyBooleanProperty runningProperty() {
        return task.runningProperty();
    }

    /** Window width as planned, s. */
    public double window() {
        return design.scenario().timing().windowWidthPs() / PICO;
    }

    /** Distance of the peaks as planned, s. */
    public double separation() {
        return design.scenario().imbalanceNs() / NANO;
    }

    /**
     * Sets the full width of the windows.
     *
     * @param seconds wanted width, pulled into the allowed range
     * @param drag stands for one movement of the hand
     */
    public void window(double seconds, Object drag) {
        set(WINDOW, seconds * PICO, drag);
    }

    /** Sets the common imbalance, which is the distance of the peaks, s. */
    public void separation(double seconds, Object drag) {
        set(IMBALANCE, seconds * NANO, drag);
    }

    /** Ends a movement. */
    public void settle() {
        design.settle();
    }

    private void set(String path, double wanted, Object drag) {
        Parameter parameter = ParameterPaths.find(design.scenario(), path);
        // Without the last digits, which the change of unit has left.
        double plain = Double.parseDouble(Digits.significant(wanted, DIGITS));
        double value =
                Math.max(parameter.range().lowest(), Math.min(parameter.range().highest(), plain));
        design.change(Words.of("slots.change." + path), drag, scenario -> parameter.with(scenario, value));
    }
}
