package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import binspan.planner.document.Change.Delete;
import binspan.planner.document.Change.Insert;
import binspan.planner.document.Change.Move;
import binspan.planner.document.Change.Put;
import binspan.planner.document.Change.Remove;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** The text after a change, character by character; the expected texts are written by hand. */
final class ChangeWriterTest {
    private static final String PANEL = "{ \"type\": \"loss\", \"lossDb\": 0.5 }";

    private static String written(String text, Change... changes) throws RefusedEditException {
        return ChangeWriter.written(text, List.of(changes));
    }

    private static Map<String, Object> loss(Object lossDb) {
        Map<String, Object> element = new LinkedHashMap<>();
        element.put("type", "loss");
        element.put("lossDb", lossDb);
        return element;
    }

    @Test
    void onlyTheCharactersOfAValueAreReplaced() throws RefusedEditException {
        assertThat(written("{ \"a\" /* x */ : /* y */ 1.50 /* z */ , \"b\":2 } // end", new Put("a", 2.5)))
                .isEqualTo("{ \"a\" /* x */ : /* y */ 2.5 /* z */ , \"b\":2 } // end");
    }

    @Test
    void numbersAreWrittenAsTheShortestTextThatReadsBack() throws RefusedEditException {
        assertThat(written("{\"a\":1}", new Put("a", 2.0))).isEqualTo("{\"a\":2}");
        assertThat(written("{\"a\":1}", new Put("a", 0.1 + 0.2))).isEqualTo("{\"a\":0.30000000000000004}");
        assertThat(written("{\"a\":1}", new Put("a", -0.0))).isEqualTo("{\"a\":-0.0}");
        assertThat(written("{\"a\":1}", new Put("a", 7))).isEqualTo("{\"a\":7}");
        assertThat(written("{\"a\":1}", new Put("a", true))).isEqualTo("{\"a\":true}");
        assertThat(written("{\"a\":1}", new Put("a", "x\"y"))).isEqualTo("{\"a\":\"x\\\"y\"}");
    }

    @Test
    void newMemberStandsOnItsOwnLineBehindTheCommentOfTheLast() throws RefusedEditException {
        String before = "{\n    \"a\": 1, // first\n    \"b\": 2 // last, so far\n    // remark\n}\n";
        assertThat(written(before, new Put("c", 3)))
                .isEqualTo(
                        "{\n    \"a\": 1, // first\n    \"b\": 2, // last, so far\n    \"c\": 3\n    // remark\n}\n");
    }

    @Test
    void newMemberStandsInlineAmongInlineOnes() throws RefusedEditException {
        assertThat(written("{ \"a\": { \"b\": 1 } }", new Put("a.c", 2)))
                .isEqualTo("{ \"a\": { \"b\": 1, \"c\": 2 } }");
        assertThat(written("{\n \"a\": 1, \"b\": 2 // both\n}", new Put("c", 3)))
                .isEqualTo("{\n \"a\": 1, \"b\": 2, \"c\": 3 // both\n}");
    }

    @Test
    void newMemberBehindABlockCommentLeavesItWhereItIs() throws RefusedEditException {
        assertThat(written("{\r\n\t\"a\": 1 /* one */ }", new Put("b", 2)))
                .isEqualTo("{\r\n\t\"a\": 1, /* one */\r\n\t\"b\": 2 }");
    }

    @Test
    void emptyObjectsTakeTheirFirstMember() throws RefusedEditException {
        assertThat(written("{\"a\":{}}", new Put("a.b", 1))).isEqualTo("{\"a\":{ \"b\": 1 }}");
        assertThat(written("{\n  \"a\": {\n    // none yet\n  }\n}", new Put("a.b", 1)))
                .isEqualTo("{\n  \"a\": {\n    // none yet\n    \"b\": 1\n  }\n}");
        assertThat(written("{\"a\":{ /* none */ }}", new Put("a.b", 1))).isEqualTo("{\"a\":{ /* none */  \"b\": 1 }}");
    }

    @Test
    void missingParentsAreMade() throws RefusedEditException {
        assertThat(written("{\n  \"name\": \"x\"\n}", new Put("acquisition.durationS", 60)))
                .isEqualTo("{\n  \"name\": \"x\",\n  \"acquisition\": { \"durationS\": 60 }\n}");
        assertThat(written("{\n  \"name\": \"x\"\n}", new Put("provenance.alice.path[0].lossDb", "a.b")))
                .isEqualTo("{\n  \"name\": \"x\",\n  \"provenance\": {\n    \"alice.path[0].lossDb\": \"a.b\"\n  }\n}");
    }

    @Test
    void fieldOfAnEntryIsToldFromAnEntry() throws RefusedEditException {
        String before = "{ \"spread\": { \"bob.path.a.b.lossDb\": { \"normal\": 1 } } }";
        assertThat(written(before, new Put("spread.bob.path.a.b.lossDb.normal", 2)))
                .isEqualTo("{ \"spread\": { \"bob.path.a.b.lossDb\": { \"normal\": 2 } } }");
        assertThat(written(before, new Put("spread.bob.path.a.b.lossDb.uniform", 2)))
                .isEqualTo("{ \"spread\": { \"bob.path.a.b.lossDb\": { \"uniform\": 2 } } }");
        assertThat(written(before, new Remove("spread.bob.path.a.b.lossDb"))).isEqualTo("{ \"spread\": {} }");
    }

    @Test
    void removingALineTakesItsCommaAndItsComment() throws RefusedEditException {
        String before =
                "{\n  // above a\n  \"a\": 1, // of a\n  // above b\n  \"b\": 2, /* of */ // b\n  \"c\": 3 // of c\n}\n";
        assertThat(written(before, new Remove("a")))
                .isEqualTo("{\n  // above a\n  // above b\n  \"b\": 2, /* of */ // b\n  \"c\": 3 // of c\n}\n");
        assertThat(written(before, new Remove("b")))
                .isEqualTo("{\n  // above a\n  \"a\": 1, // of a\n  // above b\n  \"c\": 3 // of c\n}\n");
        assertThat(written(before, new Remove("c")))
                .isEqualTo("{\n  // above a\n  \"a\": 1, // of a\n  // above b\n  \"b\": 2 /* of */ // b\n}\n");
        assertThat(written(before, new Remove("nothing"))).isEqualTo(before);
    }

    @Test
    void removingInlineLeavesTheOthersAsTheyStand() throws RefusedEditException {
        String before = "{ \"a\": 1, \"b\": 2,\n  \"c\": 3, \"d\": 4 } // all";
        assertThat(written(before, new Remove("a"))).isEqualTo("{ \"b\": 2,\n  \"c\": 3, \"d\": 4 } // all");
        assertThat(written(before, new Remove("b"))).isEqualTo("{ \"a\": 1,\n  \"c\": 3, \"d\": 4 } // all");
        assertThat(written(before, new Remove("c"))).isEqualTo("{ \"a\": 1, \"b\": 2,\n  \"d\": 4 } // all");
        assertThat(written(before, new Remove("d"))).isEqualTo("{ \"a\": 1, \"b\": 2,\n  \"c\": 3 } // all");
        assertThat(written("{ \"a\": 1 }", new Remove("a"))).isEqualTo("{}");
        assertThat(written("{\n  \"a\": 1\n}", new Remove("a"))).isEqualTo("{}");
        assertThat(written("{ \"a\": 1, // x\n \"b\": 2 }", new Remove("b"))).isEqualTo("{ \"a\": 1 // x\n }");
    }

    @Test
    void commasInFrontAreRespected() throws RefusedEditException {
        String before = "{ \"a\": 1\n, \"b\": 2\n, \"c\": 3\n}";
        assertThat(written(before, new Remove("b"))).isEqualTo("{ \"a\": 1\n, \"c\": 3\n}");
        assertThat(written(before, new Remove("c"))).isEqualTo("{ \"a\": 1\n, \"b\": 2\n}");
        assertThat(written(before, new Put("d", 4))).isEqualTo("{ \"a\": 1\n, \"b\": 2\n, \"c\": 3, \"d\": 4\n}");
    }

    private static final String LIST = "{\"alice\": {\n  \"path\": [ // of alice\n    { \"lossDb\": 1 }, // one\n"
            + "    // before two\n    { \"lossDb\": 2 }, // two\n    { \"lossDb\": 3 } // three\n  ]\n}}";

    @Test
    void elementsAreInsertedOnLinesOfTheirOwn() throws RefusedEditException {
        assertThat(written(LIST, new Insert("alice.path", 0, loss(0.5))))
                .isEqualTo(LIST.replace("// of alice\n", "// of alice\n    " + PANEL + ",\n"));
        assertThat(written(LIST, new Insert("alice.path", 1, loss(0.5))))
                .isEqualTo(LIST.replace("// one\n", "// one\n    " + PANEL + ",\n"));
        assertThat(written(LIST, new Insert("alice.path", 3, loss(0.5))))
                .isEqualTo(LIST.replace("3 } // three", "3 }, // three\n    " + PANEL));
    }

    @Test
    void elementsAreInsertedInlineAmongInlineOnes() throws RefusedEditException {
        String before = "{\"alice\":{\"path\":[{\"lossDb\":1},{\"lossDb\":2}]}}";
        assertThat(written(before, new Insert("alice.path", 1, loss(0.5))))
                .isEqualTo("{\"alice\":{\"path\":[{\"lossDb\":1}," + PANEL + ", {\"lossDb\":2}]}}");
        assertThat(written(before, new Insert("alice.path", 2, loss(0.5))))
                .isEqualTo("{\"alice\":{\"path\":[{\"lossDb\":1},{\"lossDb\":2}, " + PANEL + "]}}");
        assertThat(written("{\"alice\":{\"path\":[]}}", new Insert("alice.path", 0, loss(0.5))))
                .isEqualTo("{\"alice\":{\"path\":[ " + PANEL + " ]}}");
        assertThat(written("{\"alice\": {\n  \"path\": []\n}}", new Insert("alice.path", 0, loss(0.5))))
                .isEqualTo("{\"alice\": {\n  \"path\": [\n    " + PANEL + "\n  ]\n}}");
    }

    @Test
    void anElementMovesWithItsComment() throws RefusedEditException {
        assertThat(written(LIST, new Move("alice.path", 0, 2)))
                .isEqualTo(
                        "{\"alice\": {\n  \"path\": [ // of alice\n    // before two\n"
                                + "    { \"lossDb\": 2 }, // two\n    { \"lossDb\": 3 }, // three\n    { \"lossDb\": 1 } // one\n  ]\n}}");
        assertThat(written(LIST, new Move("alice.path", 2, 0)))
                .isEqualTo(
                        "{\"alice\": {\n  \"path\": [ // of alice\n    { \"lossDb\": 3 }, // three\n    { \"lossDb\": 1 }, // one\n"
                                + "    // before two\n    { \"lossDb\": 2 } // two\n  ]\n}}");
        assertThat(written("{\"alice\":{\"path\":[1, 2 /* b */, 3]}}", new Move("alice.path", 1, 2)))
                .isEqualTo("{\"alice\":{\"path\":[1, 3, 2 /* b */]}}");
    }

    @Test
    void aCommentToTheEndOfItsLineNeverSwallowsWhatFollows() throws RefusedEditException {
        assertThat(written("{\"alice\":{\"path\":[1, 2 // b\n, 3]}}", new Move("alice.path", 1, 0)))
                .isEqualTo("{\"alice\":{\"path\":[2, // b\n1, 3]}}");
        assertThat(written("{\"alice\":{\"path\":[1, 2 // b\n, 3]}}", new Move("alice.path", 1, 2)))
                .isEqualTo("{\"alice\":{\"path\":[1, 3, 2 // b\n]}}");
    }

    @Test
    void positionsInKeysFollowTheList() throws RefusedEditException {
        String before = """
                {"alice": { "path": [ {}, { "label": "b.x" }, {} ] }, "spread": {
                  "alice.path[0].lossDb": 1, // zero
                  "alice.path[1].lossDb": 2,
                  "both.path[2].lossDb": 3,
                  "alice.path.b.x.lossDb": 4
                }}""";
        assertThat(written(before, new Insert("alice.path", 0, Map.of())))
                .endsWith(
                        "\"spread\": {\n  \"alice.path[1].lossDb\": 1, // zero\n  \"alice.path[2].lossDb\": 2,\n"
                                + "  \"alice.path[3].lossDb\": 3,\n  \"bob.path[2].lossDb\": 3,\n  \"alice.path.b.x.lossDb\": 4\n}}");
        assertThat(written(before, new Delete("alice.path", 1)))
                .endsWith("\"spread\": {\n  \"alice.path[0].lossDb\": 1, // zero\n"
                        + "  \"alice.path[1].lossDb\": 3,\n  \"bob.path[2].lossDb\": 3\n}}");
        assertThat(written(before, new Move("alice.path", 0, 1)))
                .endsWith("\"spread\": {\n  \"alice.path[1].lossDb\": 1, // zero\n  \"alice.path[0].lossDb\": 2,\n"
                        + "  \"both.path[2].lossDb\": 3,\n  \"alice.path.b.x.lossDb\": 4\n}}");
        assertThat(written(before, new Put("alice.path[1].label", "c")))
                .endsWith("\"both.path[2].lossDb\": 3,\n  \"alice.path.c.lossDb\": 4\n}}");
        assertThat(written(before, new Remove("alice.path[1].label")))
                .contains("\"alice.path[1].lossDb\": 2,")
                .doesNotContain("b.x")
                .endsWith("\"both.path[2].lossDb\": 3\n}}");
    }

    @Test
    void channelsAndDetectorsInKeysFollowToo() throws RefusedEditException {
        String before =
                "{\"bob\": { \"detectors\": [ {}, {} ], \"path\": [ { \"label\": \"t\", \"classicalChannels\": [ {}, {} ] } ] },"
                        + " \"provenance\": { \"bob.detectors[1].efficiency\": \"e\", \"bob.path.t.classicalChannels[1].launchDbm\": \"l\","
                        + " \"bob.path[0].classicalChannels[0].launchDbm\": \"m\", \"bob.detectors.efficiency\": \"all\" } }";
        assertThat(written(before, new Delete("bob.detectors", 0)))
                .contains("{ \"bob.detectors[0].efficiency\": \"e\",")
                .contains("\"bob.detectors.efficiency\": \"all\"");
        assertThat(written(before, new Delete("bob.path[0].classicalChannels", 0)))
                .contains("\"bob.path.t.classicalChannels[0].launchDbm\": \"l\"")
                .doesNotContain("\"m\"");
    }

    @Test
    void pathsThatLeadNowhereAreRefused() {
        assertThatExceptionOfType(RefusedEditException.class)
                .isThrownBy(() -> written(LIST, new Delete("alice.path", 3)))
                .withMessage("alice.path: found position 3; allowed 0 to 2");
        assertThatExceptionOfType(RefusedEditException.class)
                .isThrownBy(() -> written(LIST, new Put("alice.path[7].lossDb", 1)))
                .withMessage("alice.path[7].lossDb: leads nowhere");
        assertThatExceptionOfType(RefusedEditException.class)
                .isThrownBy(() -> written(LIST, new Put("alice..path", 1)))
                .withMessageContaining("no path; allowed one such as");
    }
}
