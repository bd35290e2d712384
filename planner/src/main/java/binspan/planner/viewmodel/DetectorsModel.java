package binspan.planner.viewmodel;

import binspan.planner.document.Change;
import binspan.planner.document.Differences;
import binspan.planner.export.CompareReport;
import binspan.scenario.Arm;
import binspan.scenario.Choice;
import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.DefaultAxes;
import binspan.study.Execution;
import binspan.study.comparison.Comparison;
import binspan.study.comparison.LinkOption;
import binspan.study.comparison.LinkOptions;
import binspan.study.tuning.Objective;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableSet;

/** Which detectors or fibres serve the link best, or what an element of its path costs. */
public final class DetectorsModel extends StudyModel<List<Comparison.Entry>> {
    private final ObjectProperty<Kind> kind = new SimpleObjectProperty<>(this, "kind", Kind.DETECTORS);
    private final ObservableSet<String> leftOut = FXCollections.observableSet();
    private final ObservableSet<DetectorClass> detectorClasses =
            FXCollections.observableSet(DetectorClass.SNSPD, DetectorClass.INGAAS_FREE_RUNNING);
    private final ObservableSet<FibreClass> fibreClasses =
            FXCollections.observableSet(FibreClass.G652D, FibreClass.G654E);
    private final BooleanProperty present = new SimpleBooleanProperty(this, "present", true);
    private final BooleanProperty mixed = new SimpleBooleanProperty(this, "mixed", false);
    private final BooleanProperty retuned = new SimpleBooleanProperty(this, "retuned", true);
    private final ObjectProperty<Aim> aim = new SimpleObjectProperty<>(this, "aim", Aim.USUAL);

    /** What is exchanged. */
    public enum Kind {
        DETECTORS,
        FIBRES,
        WITHOUT
    }

    /** The study of a link, not run yet. */
    public DetectorsModel(Design design, Background background) {
        super("compare", design, background);
        follow(kind, detectorClasses, fibreClasses, leftOut, present, mixed, retuned, aim);
        followDesign(this::check);
        check();
    }

    @Override
    Function<Execution, StudyRun.Result<List<Comparison.Entry>>> work(Scenario scenario) {
        List<LinkOption> options = options(scenario);
        boolean tuned = retuned.get();
        Aim wanted = aim.get();
        return execution -> {
            Objective objective = wanted.of(scenario);
            Function<Scenario, List<Axis>> free = tuned ? DefaultAxes::tuned : each -> List.of();
            List<Comparison.Entry> entries = new Comparison(options, free, objective).run(execution);
            return new StudyRun.Result<>(CompareReport.of(scenario.name(), objective, entries), entries);
        };
    }

    private List<LinkOption> options(Scenario scenario) {
        List<LinkOption> options = new ArrayList<>();
        if (present.get()) {
            options.add(LinkOption.of(Words.of("studies.compare.present"), scenario));
        }
        switch (kind.get()) {
            case DETECTORS -> detectors(scenario, options);
            case FIBRES ->
                fibreClasses.stream().sorted().forEach(each -> options.add(LinkOptions.fibre(scenario, each)));
            case WITHOUT ->
                labels(scenario).stream()
                        .filter(leftOut::contains)
                        .forEach(label -> options.add(LinkOptions.without(scenario, label)));
        }
        if (options.isEmpty()) {
            throw new IllegalArgumentException(Words.of("studies.compare.nothing"));
        }
        return options;
    }

    /** Labels of the elements of both paths, each once. */
    public static List<String> labels(Scenario scenario) {
        return Stream.of(scenario.alice(), scenario.bob())
                .flatMap(arm -> arm.path().stream())
                .flatMap(element -> element.label().stream())
                .distinct()
                .toList();
    }

    private void detectors(Scenario scenario, List<LinkOption> options) {
        List<DetectorClass> chosen = detectorClasses.stream().sorted().toList();
        for (DetectorClass alice : chosen) {
            for (DetectorClass bob : chosen) {
                if (alice == bob || mixed.get()) {
                    options.add(LinkOptions.detectors(scenario, alice, bob));
                }
            }
        }
    }

    /**
     * Takes an entry with its settings over into the link, as one change; not if the link has changed since.
     *
     * @return whether it was done
     */
    public boolean apply(Comparison.Entry entry) {
        if (run().staleProperty().get()) {
            return false;
        }
        Scenario chosen = entry.prediction().scenario();
        Optional<String> label = labels(design().scenario()).stream()
                .filter(each -> entry.option().name().equals("without " + each))
                .findFirst();
        if (label.isPresent()) {
            return design().edit(entry.option().name(), removal(label.get(), chosen));
        }
        return design().change(change(entry.option().name()), null, scenario -> chosen);
    }

    /** Leaves an element out on both sides, then takes the settings over. */
    private List<Change> removal(String label, Scenario chosen) {
        Scenario scenario = design().scenario();
        List<Change> changes = new ArrayList<>();
        changes.addAll(deleted("alice.path", scenario.alice(), label));
        changes.addAll(deleted("bob.path", scenario.bob(), label));
        Scenario without =
                LinkOptions.without(scenario, label).settings().get(0).scenario();
        changes.addAll(Differences.between(without, chosen));
        return changes;
    }

    /** From the last to the first, so that the numbers of the others stay. */
    private static List<Change> deleted(String list, Arm arm, String label) {
        List<Change> deleted = new ArrayList<>();
        for (int i = arm.path().size() - 1; i >= 0; i--) {
            if (arm.path().get(i).label().filter(label::equals).isPresent()) {
                deleted.add(new Change.Delete(list, i));
            }
        }
        return deleted;
    }

    private static String change(String option) {
        if (option.equals(Words.of("studies.compare.present"))) {
            return Words.of("studies.compare.change.written");
        }
        boolean fibre = Choice.texts(FibreClass.class).contains(option);
        return Words.of(fibre ? "studies.compare.change.fibres" : "studies.compare.change", option);
    }

    /** What is exchanged. */
    public ObjectProperty<Kind> kindProperty() {
        return kind;
    }

    /** Labels of the elements that are left out, one in each link. */
    public ObservableSet<String> leftOut() {
        return leftOut;
    }

    /** Detector classes to compare. */
    public ObservableSet<DetectorClass> detectorClasses() {
        return detectorClasses;
    }

    /** Fibre classes to compare. */
    public ObservableSet<FibreClass> fibreClasses() {
        return fibreClasses;
    }

    /** Whether the link as written takes part. */
    public BooleanProperty presentProperty() {
        return present;
    }

    /** Whether alice and bob may have different detectors. */
    public BooleanProperty mixedProperty() {
        return mixed;
    }

    /** Whether each link is tuned for itself. */
    public BooleanProperty retunedProperty() {
        return retuned;
    }

    /** What the links are tuned and ranked for. */
    public ObjectProperty<Aim> aimProperty() {
        return aim;
    }
}
