package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

final class PrintableTest {

    @ParameterizedTest
    @ValueSource(strings = {"plain", "Müller → Σ", "tilde ~ and \\ stay", "🜁", ""})
    void readableTextStaysAsItIs(String text) {
        assertThat(Printable.line(text)).isEqualTo(text);
        assertThat(Printable.oneLine(text)).isTrue();
    }

    @Test
    void whatMovesTheCursorOrHidesTextIsEscaped() {
        assertThat(Printable.line("a\u001b[31mb\n\u007f\u0085\u2028"))
                .isEqualTo("a\\u001b[31mb\\u000a\\u007f\\u0085\\u2028");
        assertThat(Printable.line("x\u202ey\u200b\ue000\ud800")).isEqualTo("x\\u202ey\\u200b\\ue000\\ud800");
    }

    @ParameterizedTest
    @ValueSource(strings = {"a\nb", "a\tb", "\u0000", "a\u0085", "\u2029", "\udc00"})
    void lineBreaksControlsAndHalfCharactersAreNotOneLine(String text) {
        assertThat(Printable.oneLine(text)).isFalse();
    }

    @Test
    void longTextIsCut() {
        assertThat(Printable.quoted("x".repeat(60))).isEqualTo('"' + "x".repeat(60) + '"');
        assertThat(Printable.quoted("x".repeat(61))).isEqualTo('"' + "x".repeat(60) + "...\"");
        assertThat(Printable.line("y".repeat(5000))).hasSize(1003).endsWith("...");
    }
}
