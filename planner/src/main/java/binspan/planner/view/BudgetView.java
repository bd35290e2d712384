package binspan.planner.view;

import binspan.planner.report.VerdictBudget;
import binspan.planner.viewmodel.Budget;
import binspan.planner.viewmodel.Words;
import binspan.units.Digits;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;

/** The visibility budget: bars that step down from 1 to the raw visibility. */
final class BudgetView extends GridPane {
    private static final double[] COLUMNS = {43.0, 31.0, -26.0};

    private final List<Step> steps = new ArrayList<>();
    private final Label floor;

    BudgetView() {
        getStyleClass().add("budget");
        setId("verdict-budget");
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.TEXT);
        getColumnConstraints().setAll(Columns.grid(COLUMNS).getColumnConstraints());
        ScaleLabels scale = new ScaleLabels();
        floor = scale.add(0.0, "");
        scale.add(1.0, "1");
        add(Columns.label(VerdictBudget.TITLE, "heading"), 0, 0);
        add(scale, 1, 0);
        add(Columns.label(Words.of("verdict.loss"), "soft", "small"), 2, 0);
        setOnMousePressed(event -> requestFocus());
    }

    void show(Budget budget) {
        for (int i = steps.size(); i < budget.steps().size(); i++) {
            steps.add(new Step());
            addRow(i + 1, steps.get(i).cause, steps.get(i).bar, steps.get(i).loss);
        }
        floor.setText(Digits.decimals(budget.floor(), 1));
        for (int i = 0; i < steps.size(); i++) {
            steps.get(i).show(budget, budget.steps().get(i));
        }
        setAccessibleText(budget.spoken());
    }

    /** One cause. */
    private static final class Step {
        private final Label cause = Columns.label("", "row");
        private final SpanBar bar = new SpanBar(0.0, 0.0, 1.0);
        private final Label loss = Columns.label("", "row");
        private final Tooltip tooltip = new Tooltip();

        Step() {
            Tooltip.install(cause, tooltip);
            Tooltip.install(bar, tooltip);
            Tooltip.install(loss, tooltip);
        }

        void show(Budget budget, Budget.Step step) {
            cause.setText(step.cause());
            loss.setText(step.loss());
            boolean gain = step.to() > step.from();
            bar.show(budget.share(step.from()), budget.share(step.to()), !gain);
            bar.showQuiet(budget.share(Math.min(step.from(), step.to())));
            tooltip.setText(Words.of(
                    "verdict.budget.row", step.cause(), step.loss(), step.factor(), Digits.decimals(step.to(), 4)));
        }
    }
}
