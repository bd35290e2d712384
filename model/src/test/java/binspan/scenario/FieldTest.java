package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.Field.Kind;
import binspan.scenario.Field.Presence;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** One field of the registry: words for people, components for records. */
final class FieldTest {
    private static final Field LENGTH = Field.number("lengthKm", "km", Range.above(0, 50), "length");
    private static final Field POINTS = Field.count("points", Range.of(3, 9), "settings");
    private static final Field SHAPE = Field.choice("passband", PassbandShape.class, "shape");

    @Test
    void whatIsAllowedIsSaidInWords() {
        assertThat(LENGTH.allowed()).isEqualTo("above 0 to 50 km");
        assertThat(POINTS.allowed()).isEqualTo("a whole number, 3 to 9");
        assertThat(SHAPE.allowed()).isEqualTo("gaussian | flat-top");
        assertThat(Field.plain("name", Kind.TEXT, "name").allowed()).isEqualTo("a text");
        assertThat(Field.plain("relative", Kind.FLAG, "share").allowed()).isEqualTo("true or false");
        assertThat(Field.list("path", Content.NONE, Range.of(0, 200), "elements")
                        .allowed())
                .isEqualTo("a list of 0 to 200 objects");
        assertThat(RegistryTest.fields()
                        .filter(entry -> entry.field().kind() == Kind.CHANNEL)
                        .map(entry -> entry.field().allowed()))
                .containsExactly("a channel such as \"C30\", -60 to 99");
    }

    @Test
    void fieldIsRequiredUntilItSaysOtherwise() {
        assertThat(LENGTH.presence()).isEqualTo(Presence.REQUIRED);
        assertThat(LENGTH.byDefault().given(Map.of())).isNull();
        assertThat(LENGTH.optional().presence()).isEqualTo(Presence.OPTIONAL);
        assertThat(LENGTH.optional("computed").defaultText()).isEqualTo("computed");
        assertThat(LENGTH.orElse(12.5).presence()).isEqualTo(Presence.DEFAULTED);
    }

    @Test
    void defaultIsStatedAsTheFileWouldWriteIt() {
        assertThat(LENGTH.orElse(12.0).defaultText()).isEqualTo("12");
        assertThat(LENGTH.orElse(1e-10).defaultText()).isEqualTo("1e-10");
        assertThat(POINTS.orElse(5).defaultText()).isEqualTo("5");
        assertThat(SHAPE.orElse(PassbandShape.FLAT_TOP).defaultText()).isEqualTo("flat-top");
        assertThat(SHAPE.orElse(PassbandShape.FLAT_TOP).byDefault().given(Map.of()))
                .isEqualTo(PassbandShape.FLAT_TOP);
    }

    @Test
    void componentFitsTheRecord() {
        assertThat(LENGTH.component(4.0)).isEqualTo(4.0);
        assertThat(LENGTH.optional().component(4.0)).isEqualTo(OptionalDouble.of(4.0));
        assertThat(LENGTH.optional().absent()).isEqualTo(OptionalDouble.empty());
        assertThat(POINTS.component(4.0)).isEqualTo(4);
        assertThat(SHAPE.optional().component(PassbandShape.GAUSSIAN)).isEqualTo(Optional.of(PassbandShape.GAUSSIAN));
        assertThat(SHAPE.optional().absent()).isEqualTo(Optional.empty());
    }

    @Test
    void numbersAndCountsAndChannelsCanBeSwept() {
        assertThat(List.of(Kind.values()).stream().filter(Kind::numeric))
                .containsExactly(Kind.NUMBER, Kind.COUNT, Kind.CHANNEL);
    }
}
