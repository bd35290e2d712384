package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.Change.Delete;
import binspan.planner.document.Change.Insert;
import binspan.planner.document.Change.Move;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Long runs of seeded edits on all shipped scenarios, laid out as they are and in hostile ways. */
final class RandomEditsTest {
    private static final int EDITS = 20;
    private static final Pattern TOKEN =
            Pattern.compile("\"(?:[^\"\\\\]|\\\\.)*\"|//[^\n]*|[-+0-9.eE]+|true|false|[{}\\[\\],:]");

    @ParameterizedTest
    @ValueSource(longs = {1, 2})
    void editsLeaveAValidFileAndUntouchedLines(long seed) {
        int made = 0;
        for (ScenarioDocument shipped : ShippedDocuments.all()) {
            made += run(shipped, seed);
        }
        assertThat(made).isGreaterThan(100);
    }

    @ParameterizedTest
    @ValueSource(longs = {11, 12, 14})
    void hostileLayoutsAreEditedAsWell(long seed) throws InvalidScenarioException {
        int made = 0;
        for (ScenarioDocument shipped : ShippedDocuments.all()) {
            String text = hostile(shipped.text(), new Random(seed));
            made += run(ScenarioDocument.of(text, shipped.name()), seed);
        }
        assertThat(made).isGreaterThan(100);
    }

    /** Makes edits one after the other; the number of those that were not refused. */
    private static int run(ScenarioDocument start, long seed) {
        RandomEdits edits = new RandomEdits(seed);
        ScenarioDocument document = start;
        int made = 0;
        for (int i = 0; i < EDITS; i++) {
            Change change = edits.next(document.scenario());
            try {
                ScenarioDocument next = document.with(List.of(change));
                assertFollows(document, next, change);
                document = next;
                made++;
            } catch (RefusedEditException e) {
                assertThat(e.problems()).isNotEmpty();
            }
        }
        assertThat(reread(document)).isEqualTo(document.scenario());
        return made;
    }

    private static void assertFollows(ScenarioDocument before, ScenarioDocument after, Change change) {
        if (change instanceof Insert || change instanceof Delete || change instanceof Move) {
            assertThat(path(after, change)).isEqualTo(expected(before, after, change));
        }
        // Words of comments: an edit loses at most those in the lines of one element or member, and adds none.
        List<String> comments = comments(after.text());
        assertThat(comments(before.text())).containsAll(comments);
        if (!(change instanceof Delete || change instanceof Change.Remove || change instanceof Change.Put)) {
            assertThat(comments).containsExactlyInAnyOrderElementsOf(comments(before.text()));
        }
    }

    private static Scenario reread(ScenarioDocument document) {
        try {
            return ScenarioReader.parse(document.text(), document.name());
        } catch (InvalidScenarioException e) {
            throw new AssertionError(e);
        }
    }

    private static List<PathElement> path(ScenarioDocument document, Change change) {
        String list = change instanceof Insert insert
                ? insert.listPath()
                : change instanceof Delete delete ? delete.listPath() : ((Move) change).listPath();
        Scenario scenario = document.scenario();
        return list.startsWith("alice")
                ? scenario.alice().path()
                : scenario.bob().path();
    }

    /** The path by list operations of the language. */
    private static List<PathElement> expected(ScenarioDocument before, ScenarioDocument after, Change change) {
        List<PathElement> expected = new ArrayList<>(path(before, change));
        if (change instanceof Insert insert) {
            expected.add(insert.index(), path(after, change).get(insert.index()));
        } else if (change instanceof Delete delete) {
            expected.remove(delete.index());
        } else if (change instanceof Move move) {
            expected.add(move.to(), expected.remove(move.from()));
        }
        return expected;
    }

    private static List<String> comments(String text) {
        List<String> comments = new ArrayList<>();
        Matcher matcher = Pattern.compile("\"(?:[^\"\\\\]|\\\\.)*\"|//[^\r\n]*|(?s:/\\*.*?\\*/)")
                .matcher(text);
        while (matcher.find()) {
            if (matcher.group().startsWith("/")) {
                comments.add(matcher.group().strip());
            }
        }
        return comments;
    }

    /** The same tokens with breaks, blanks and comments of all kinds strewn between them. */
    static String hostile(String text, Random random) {
        List<String> blanks = List.of(
                "",
                "",
                "",
                " ",
                "\t",
                "\r\n",
                "\n",
                " // c%d\n",
                "/* c%d */",
                "/* c%d\r\n */",
                "\r",
                " //c%d {[\"\r\n");
        StringBuilder hostile = new StringBuilder();
        Matcher matcher = TOKEN.matcher(text);
        int count = 0;
        while (matcher.find()) {
            if (!matcher.group().startsWith("//")) {
                hostile.append(matcher.group());
                hostile.append(blanks.get(random.nextInt(blanks.size())).replace("%d", Integer.toString(count++)));
            }
        }
        return hostile.toString();
    }

    @Test
    void aHostileLayoutStatesTheSameScenario() throws InvalidScenarioException {
        for (ScenarioDocument shipped : ShippedDocuments.all()) {
            ScenarioDocument hostile = ScenarioDocument.of(hostile(shipped.text(), new Random(5)), "hostile");
            assertThat(hostile.scenario()).isEqualTo(shipped.scenario());
        }
    }

    @Test
    void linesThatAnEditDoesNotTouchAreTheSame() throws RefusedEditException {
        for (ScenarioDocument shipped : ShippedDocuments.all()) {
            ScenarioDocument after = shipped.with(
                    List.of(new Change.Put("timing.windowWidthPs", 123.0), new Change.Put("bob.repairMarginDb", 1.25)));
            List<String> before = shipped.text().lines().toList();
            List<String> now = after.text().lines().toList();
            assertThat(now).hasSameSizeAs(before);
            for (int i = 0; i < now.size(); i++) {
                String line = before.get(i);
                if (!line.contains("windowWidthPs") && !line.contains("repairMarginDb")) {
                    assertThat(now.get(i)).isEqualTo(line);
                }
            }
        }
    }
}
