package binspan.planner.viewmodel;

import binspan.planner.export.StudyDefaults;
import binspan.planner.export.ToleranceReport;
import binspan.planner.io.WrittenNumber;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.scenario.Spread;
import binspan.scenario.SpreadShape;
import binspan.study.Execution;
import binspan.study.FigureColumns;
import binspan.study.tolerance.ParameterSpread;
import binspan.study.tolerance.Tolerance;
import binspan.study.tolerance.ToleranceResult;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

/** How surely the built link meets its requirements. */
public final class ToleranceModel extends StudyModel<ToleranceResult> {
    /** Numbers of builds that one may choose. */
    public static final List<Integer> BUILDS = List.of(256, 1024, 4096, StudyDefaults.SAMPLES, 16_384, 65_536);

    private static final double PERCENT = 100.0;

    private final ObjectProperty<Integer> builds = new SimpleObjectProperty<>(this, "builds", StudyDefaults.SAMPLES);
    private final StringProperty seed = new SimpleStringProperty(this, "seed", Long.toString(StudyDefaults.SEED));
    private final ObservableList<Row> rows = FXCollections.observableArrayList();
    /** Kept, so that those who listen to it are not forgotten. */
    private final ObservableList<Row> shown = FXCollections.unmodifiableObservableList(rows);

    private final Map<String, Spread> added = new LinkedHashMap<>();
    private final ReadOnlyStringWrapper refusal = new ReadOnlyStringWrapper(this, "refusal", "");

    /**
     * A spread.
     *
     * @param spread parameter and distribution
     * @param added whether it counts for this study alone and is not in the scenario
     */
    public record Row(ParameterSpread spread, boolean added) {}

    /** The study of a link, not run yet. */
    public ToleranceModel(Design design, Background background) {
        super("tolerance", design, background);
        follow(builds, seed);
        followDesign(this::list);
        list();
    }

    private void list() {
        Scenario scenario = design().scenario();
        added.keySet().removeIf(path -> !leads(scenario, path));
        List<Row> present = ParameterSpread.of(scenario, added).stream()
                .map(spread ->
                        new Row(spread, added.containsKey(spread.parameter().path())))
                .toList();
        if (!said(present).equals(said(rows))) {
            rows.setAll(present);
        }
        check();
    }

    /** What distinguishes rows: the same parameter of another scenario is another object. */
    private static List<List<Object>> said(List<Row> rows) {
        return rows.stream()
                .map(row -> List.<Object>of(
                        row.spread().parameter().path(), row.spread().spread(), row.added()))
                .toList();
    }

    private static boolean leads(Scenario scenario, String path) {
        try {
            ParameterPaths.find(scenario, path);
            return true;
        } catch (IllegalArgumentException e) {
            return false;
        }
    }

    @Override
    Function<Execution, StudyRun.Result<ToleranceResult>> work(Scenario scenario) {
        Tolerance plain = new Tolerance(scenario, ParameterSpread.of(scenario, added), builds.get(), seed(), List.of());
        return execution -> {
            Tolerance tolerance = new Tolerance(
                    scenario, plain.spreads(), plain.samples(), plain.seed(), FigureColumns.all(scenario));
            ToleranceResult result = tolerance.run(execution);
            return new StudyRun.Result<>(ToleranceReport.of(result), result);
        };
    }

    private long seed() {
        try {
            return Long.parseLong(seed.get().strip());
        } catch (NumberFormatException e) {
            throw new IllegalArgumentException(Words.of("studies.tolerance.seed.wrong", seed.get()), e);
        }
    }

    /**
     * Adds a spread for this study, or replaces that of the same parameter.
     *
     * @param path scenario path
     * @param shape its distribution
     * @param width standard deviation or half width as it is written, per cent of the planned value with % behind it
     * @return whether it was added; the refusal says why not
     */
    public boolean add(String path, SpreadShape shape, String width) {
        try {
            Scenario scenario = design().scenario();
            ParameterSpread spread = new ParameterSpread(ParameterPaths.find(scenario, path), written(shape, width));
            new Tolerance(scenario, List.of(spread), Tolerance.FEWEST_SAMPLES, StudyDefaults.SEED, List.of());
            added.put(path, spread.spread());
            refusal.set("");
            list();
            return true;
        } catch (IllegalArgumentException e) {
            refusal.set(e.getMessage());
            return false;
        }
    }

    private static Spread written(SpreadShape shape, String width) {
        String text = width.strip();
        boolean relative = text.endsWith("%");
        double number = WrittenNumber.of((relative ? text.substring(0, text.length() - 1) : text).strip());
        return Spread.of(shape, relative ? number / PERCENT : number, relative);
    }

    /** Takes a spread away that was added for this study; the scenario's own stands again. */
    public void remove(Row row) {
        added.remove(row.spread().parameter().path());
        list();
    }

    /** Number of builds. */
    public ObjectProperty<Integer> buildsProperty() {
        return builds;
    }

    /** Seed as it is written. */
    public StringProperty seedProperty() {
        return seed;
    }

    /** What spreads. */
    public ObservableList<Row> rows() {
        return shown;
    }

    /** Why the last spread was not added, empty if it was. */
    public ReadOnlyStringProperty refusalProperty() {
        return refusal.getReadOnlyProperty();
    }
}
