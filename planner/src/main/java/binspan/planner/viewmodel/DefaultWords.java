package binspan.planner.viewmodel;

import binspan.optics.FibreOptics;
import binspan.planner.report.Figure;
import binspan.scenario.Arm;
import binspan.scenario.Choice;
import binspan.scenario.ClassicalChannel;
import binspan.scenario.FibreSpan;
import binspan.scenario.Field;
import binspan.scenario.Range;
import binspan.scenario.Scenario;
import java.util.Optional;
import java.util.OptionalDouble;

/** What stands where a field is left empty: in words, and as a number where there is one. */
final class DefaultWords {
    private final Scenario scenario;
    private final FieldPlace place;
    private final Optional<Object> byDefault;

    /**
     * Looks at one field.
     *
     * @param byDefault what the registry lets stand in its place, given the other fields of its object
     */
    DefaultWords(Scenario scenario, FieldPlace place, Optional<Object> byDefault) {
        this.scenario = scenario;
        this.place = place;
        this.byDefault = byDefault;
    }

    /** The number or word alone, empty if there is none: fit for an empty field. */
    String value() {
        if (byDefault.orElse(null) instanceof Choice choice) {
            return choice.text();
        }
        OptionalDouble number = number();
        return number.isPresent()
                ? Range.plain(number.getAsDouble())
                : place.field().presence() == Field.Presence.REQUIRED ? "" : words();
    }

    /** The number that stands, absent if none does or if it takes a prediction to know it. */
    OptionalDouble number() {
        if (byDefault.orElse(null) instanceof Double number) {
            return OptionalDouble.of(number);
        }
        Object object = PlannedValue.at(scenario, place.parent()).orElse(null);
        if (object instanceof FibreSpan span) {
            return fibre(span);
        }
        boolean ofFibre =
                object instanceof ClassicalChannel && place.field().name().equals("attenuationDbPerKm");
        return ofFibre ? channel((ClassicalChannel) object) : OptionalDouble.empty();
    }

    private OptionalDouble fibre(FibreSpan span) {
        Arm arm = place.parent().startsWith("alice") ? scenario.alice() : scenario.bob();
        double nm = scenario.bandOf(arm).centreNm();
        return switch (place.field().name()) {
            case "attenuationDbPerKm" -> rounded(span.fibre().attenuation().at(nm));
            case "dispersionPsPerNmKm" -> rounded(span.fibre().dispersion().at(nm));
            case "measuredLossDb" ->
                span.measuredLossDb().isPresent() ? OptionalDouble.empty() : rounded(FibreOptics.lossDb(span, nm));
            default -> OptionalDouble.empty();
        };
    }

    private OptionalDouble channel(ClassicalChannel channel) {
        String span = place.parent().substring(0, place.parent().lastIndexOf('.'));
        return PlannedValue.at(scenario, span)
                .map(found -> rounded(((FibreSpan) found).fibre().attenuation().at(channel.wavelengthNm())))
                .orElse(OptionalDouble.empty());
    }

    private static OptionalDouble rounded(double value) {
        return OptionalDouble.of(Double.parseDouble(binspan.units.Digits.shortest(value, 3)));
    }

    /** The default in words with its number and unit: "of the fibre class: 0.22 dB/km". */
    String words() {
        Field field = place.field();
        if (field.presence() == Field.Presence.REQUIRED) {
            return Words.of("form.default.required");
        }
        String text = field.defaultText().isEmpty() ? Words.of("form.default.none") : field.defaultText();
        OptionalDouble number = number();
        if (number.isEmpty()) {
            return byDefault.orElse(null) instanceof Choice choice && !text.startsWith(choice.text())
                    ? text + ": " + choice.text()
                    : text;
        }
        String figure = Figure.stated(number.getAsDouble(), field.unit());
        return text.equals(Range.plain(number.getAsDouble())) ? figure : text + ": " + figure;
    }
}
