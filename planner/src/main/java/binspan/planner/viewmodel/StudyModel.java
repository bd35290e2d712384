package binspan.planner.viewmodel;

import binspan.scenario.Scenario;
import binspan.study.Execution;
import java.util.function.Function;
import javafx.beans.Observable;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleBooleanProperty;

/**
 * A study of the design with its options: says at once what is wrong with them and runs in the background. All methods
 * are for the window's thread.
 *
 * @param <F> what the study finds, beside its report
 */
public abstract class StudyModel<F> {
    private final String name;
    private final Design design;
    private final Background background;
    private final StudyRun<F> run;
    private final BooleanProperty watched = new SimpleBooleanProperty(this, "watched", true);
    private final ReadOnlyStringWrapper problem = new ReadOnlyStringWrapper(this, "problem", "");
    private Runnable renew = this::check;
    private boolean behind;

    /**
     * A study that has not run.
     *
     * @param name its name on the command line
     * @param design the link
     * @param background where it runs
     */
    StudyModel(String name, Design design, Background background) {
        this.name = name;
        this.design = design;
        this.background = background;
        this.run = new StudyRun<>(design, background);
    }

    /**
     * The study as the options ask for it; quick, since it is asked for with every option that changes.
     *
     * @param scenario the link
     * @return does the work
     * @throws IllegalArgumentException if an option is wrong
     */
    abstract Function<Execution, StudyRun.Result<F>> work(Scenario scenario);

    /** Follows options: each change is checked. */
    final void follow(Observable... options) {
        for (Observable option : options) {
            option.addListener(changed -> check());
        }
    }

    /** Follows the link: at once while somebody looks, else as soon as somebody does or the study is run. */
    final void followDesign(Runnable followed) {
        renew = followed;
        design.scenarioProperty().addListener((source, before, after) -> {
            behind = true;
            catchUp(watched.get());
        });
        watched.addListener((source, before, now) -> catchUp(now));
    }

    private void catchUp(boolean wanted) {
        if (wanted && behind) {
            behind = false;
            renew.run();
        }
    }

    /** Whether anybody looks: otherwise options do not follow each step of a drag. */
    public final BooleanProperty watchedProperty() {
        return watched;
    }

    /** Looks whether the options can be followed. */
    final void check() {
        try {
            work(design.scenario());
            problem.set("");
        } catch (IllegalArgumentException e) {
            problem.set(e.getMessage());
        }
    }

    /** Runs the study, unless its options are wrong. */
    public final void start() {
        catchUp(true);
        check();
        if (problem.get().isEmpty()) {
            run.start(work(design.scenario()), design.scenario());
        }
    }

    /** Name of the study on the command line, for words and files. */
    public final String name() {
        return name;
    }

    /** What is wrong with the options, empty if nothing is. */
    public final ReadOnlyStringProperty problemProperty() {
        return problem.getReadOnlyProperty();
    }

    /** The running study and the last result. */
    public final StudyRun<F> run() {
        return run;
    }

    /** The link. */
    public final Design design() {
        return design;
    }

    /** Where work is done. */
    public final Background background() {
        return background;
    }
}
