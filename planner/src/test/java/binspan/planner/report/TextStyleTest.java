package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

final class TextStyleTest {
    private static final String[] PROPERTIES = {"stdout.encoding", "sun.stdout.encoding", "native.encoding"};

    private final String[] before = new String[PROPERTIES.length];

    @BeforeEach
    void remember() {
        for (int i = 0; i < PROPERTIES.length; i++) {
            before[i] = System.getProperty(PROPERTIES[i]);
            System.clearProperty(PROPERTIES[i]);
        }
    }

    @AfterEach
    void restore() {
        for (int i = 0; i < PROPERTIES.length; i++) {
            if (before[i] == null) {
                System.clearProperty(PROPERTIES[i]);
            } else {
                System.setProperty(PROPERTIES[i], before[i]);
            }
        }
    }

    @Test
    void otherCharactersThanAsciiNeedAnOutputThatIsSurelyUtf8() {
        System.setProperty("native.encoding", "UTF-8");
        assertThat(TextStyle.ofStandardOutput(false)).isEqualTo(new TextStyle(false, true));
        System.setProperty("sun.stdout.encoding", "ANSI_X3.4-1968");
        assertThat(TextStyle.ofStandardOutput(true)).isEqualTo(new TextStyle(true, false));
        System.setProperty("stdout.encoding", "utf-8");
        assertThat(TextStyle.ofStandardOutput(true)).isEqualTo(new TextStyle(true, true));
        assertThat(TextStyle.of(StandardCharsets.ISO_8859_1, false).unicode()).isFalse();
    }

    @Test
    void coloursAreUsedOnlyWhenTold() {
        assertThat(TextStyle.PLAIN.bad("NOT MET")).isEqualTo("NOT MET");
        assertThat(new TextStyle(true, false).bad("NOT MET")).isEqualTo("\u001b[1;31mNOT MET\u001b[0m");
        assertThat(new TextStyle(true, false).good("")).isEmpty();
    }

    @Test
    void signsDegradeToAscii() {
        TextStyle rich = new TextStyle(false, true);
        assertThat(rich.met() + rich.notMet() + rich.plusMinus() + rich.atLeast() + rich.atMost() + rich.arrow())
                .isEqualTo("\u2713\u2717\u00b1\u2265\u2264\u2192");
        TextStyle plain = TextStyle.PLAIN;
        String signs = plain.met()
                + plain.notMet()
                + plain.plusMinus()
                + plain.atLeast()
                + plain.atMost()
                + plain.arrow()
                + plain.bar()
                + plain.lost();
        assertThat(signs).isEqualTo("+!+->=<=->#-").isASCII();
    }

    @Test
    void namesFromFilesCannotSteerTheTerminal() {
        String name = "Ber\u00edn \u001b[2J\u0007\u009b31m";
        assertThat(TextStyle.PLAIN.clean(name)).isEqualTo("Ber?n ?[2J??31m");
        assertThat(new TextStyle(true, true).clean(name)).isEqualTo("Ber\u00edn ?[2J??31m");
    }
}
