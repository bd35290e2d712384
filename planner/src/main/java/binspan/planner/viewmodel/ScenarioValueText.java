package binspan.planner.viewmodel;

import binspan.planner.report.Figure;
import binspan.planner.report.RequirementWords;
import binspan.scenario.Choice;
import binspan.scenario.Field;
import binspan.scenario.Spread;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/** Values of scenario fields as a person reads them. */
final class ScenarioValueText {
    private static final double PERCENT = 100.0;

    private ScenarioValueText() {}

    /**
     * A component of a record in words.
     *
     * @param field its field
     * @param path its scenario path
     * @param component what stands there
     */
    static String of(Field field, String path, Object component) {
        if (component instanceof OptionalDouble number) {
            return number.isPresent() ? number(field, path, number.getAsDouble()) : presence(false);
        }
        if (component instanceof Optional<?> optional) {
            return optional.map(value -> of(field, path, value)).orElse(presence(false));
        }
        if (component instanceof Number number) {
            return number(field, path, number.doubleValue());
        }
        if (component instanceof Boolean flag) {
            return Words.of(flag ? "verdict.yes" : "verdict.no");
        }
        return component instanceof Choice choice ? choice.text() : component.toString();
    }

    private static String number(Field field, String path, double value) {
        if (path.startsWith("require.")) {
            return RequirementWords.required(ScenarioChanges.requirement(path), value);
        }
        if (field.kind() == Field.Kind.CHANNEL) {
            return "C" + Figure.stated(value, "");
        }
        return field.unit().equals("1/s") ? Figure.statedCounts(value) : Figure.stated(value, field.unit());
    }

    /** Whether an object or a value is there. */
    static String presence(boolean there) {
        return Words.of(there ? "verdict.stated" : "verdict.not-stated");
    }

    /** An entry of the scenario's spreads or notes; null for none. */
    static String ofEntry(Object entry) {
        if (entry instanceof Spread spread) {
            String width = spread.relative()
                    ? Figure.stated(PERCENT * spread.width(), "%")
                    : Figure.stated(spread.width(), "");
            return spread.shape().name().toLowerCase(Locale.ROOT) + " " + width;
        }
        return entry == null ? presence(false) : entry.toString();
    }
}
