package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.planner.io.Node.ListNode;
import binspan.planner.io.Node.Member;
import binspan.planner.io.Node.NumberNode;
import binspan.planner.io.Node.ObjectNode;
import binspan.planner.io.Node.TextNode;
import binspan.planner.io.Node.WordNode;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class TreeReaderTest {

    @Test
    void everyValueAndNameKnowsItsPlace() throws SyntaxException {
        ObjectNode root = TreeReader.read("""
                {
                  "a": 1.50, // note
                    "b" : [true, null,
                  "x\\ty", {}],
                  /* long
                     note */ "c": { "d": -2e3 }
                }
                """);
        assertThat(root)
                .isEqualTo(new ObjectNode(
                        at(1, 1),
                        List.of(
                                new Member("a", at(2, 3), new NumberNode(at(2, 8), "1.50", 1.5)),
                                new Member(
                                        "b",
                                        at(3, 5),
                                        new ListNode(
                                                at(3, 11),
                                                List.of(
                                                        new WordNode(at(3, 12), "true"),
                                                        new WordNode(at(3, 18), "null"),
                                                        new TextNode(at(4, 3), "x\ty"),
                                                        new ObjectNode(at(4, 11), List.of())))),
                                new Member(
                                        "c",
                                        at(6, 14),
                                        new ObjectNode(
                                                at(6, 19),
                                                List.of(new Member(
                                                        "d",
                                                        at(6, 21),
                                                        new NumberNode(at(6, 26), "-2e3", -2000.0))))))));
    }

    @ParameterizedTest
    @CsvSource({"'\n', 2", "'\r\n', 2", "'\r', 2", "'\n\n\r\n', 4", "'\n\r', 3"})
    void linesEndAsOnAnySystem(String end, int line) throws SyntaxException {
        assertThat(TreeReader.read("{" + end + "\"a\":1}").member("a").place()).isEqualTo(at(line, 1));
        assertThat(FileText.endOf("{" + end)).isEqualTo(at(line, 1));
    }

    @Test
    void tabsAndLettersBeyondAsciiAreOneColumnEach() throws SyntaxException {
        assertThat(TreeReader.read("{\t\"é€\":\t1}").member("é€"))
                .isEqualTo(new Member("é€", at(1, 3), new NumberNode(at(1, 9), "1", 1.0)));
    }

    @Test
    void repeatedNamesStayInTheTree() throws SyntaxException {
        ObjectNode root = TreeReader.read("{\"a\":1,\"a\":2}");
        assertThat(root.members()).hasSize(2);
        assertThat(root.member("a").value().found()).isEqualTo("1");
    }

    @Test
    void numbersThatAreNoneAreNotFinite() throws SyntaxException {
        ObjectNode root = TreeReader.read("{\"a\":NaN,\"b\":-Infinity,\"c\":1e999,\"d\":-1e99999999999}");
        assertThat(root.members())
                .extracting(member -> ((NumberNode) member.value()).value())
                .containsExactly(
                        Double.NaN, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY);
    }

    @Test
    void fiftyLevelsAreReadAndFiftyOneRefused() throws SyntaxException {
        String inner = "[".repeat(49) + "]".repeat(49);
        assertThat(TreeReader.read("{\"a\":" + inner + "}").members()).hasSize(1);
        assertThatThrownBy(() -> TreeReader.read("{\"a\":[" + inner + "]}"))
                .isInstanceOf(SyntaxException.class)
                .hasMessage("found more; allowed at most 50 levels of objects and lists");
    }

    private static Place at(int line, int column) {
        return new Place(line, column);
    }
}
