package binspan.planner.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Tables of routes as people and programs write them, good and broken, through the command {@code routes}. */
final class RouteTableTest {
    private static final String DAM = "kestrel-dam-to-millbrook";
    private static final String HEADER = "name,alice.lengthKm,bob.lengthKm\n";

    @TempDir
    private Path directory;

    private StudyRun study;

    @BeforeEach
    void writeScenario() throws IOException {
        study = StudyRun.of("routes", directory, StudyRun.shipped(DAM));
    }

    private String table(String text) throws IOException {
        return Files.writeString(directory.resolve("routes.csv"), text).toString();
    }

    private Run run(String table, String... more) throws IOException {
        List<String> words = new ArrayList<>(List.of("--table", table(table)));
        words.addAll(List.of(more));
        return study.run(words.toArray(String[]::new));
    }

    @Test
    void badRowsAreReportedByTheirLines() throws IOException {
        String table = """
                name,alice.lengthKm,bob.lengthKm,fibre
                good,10,10,
                ,10,10,
                far,10001,10,
                negative,10,-1,
                comma,"1,5",10,
                none,NaN,10,
                hex,0x10,10,
                empty,10,,
                glass,10,10,G.652.X
                few,10
                many,10,10,,5
                good too,10,10,G.652.D
                """;
        Run run = run(table);
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        String file = directory.resolve("routes.csv") + ":";
        assertThat(run.errLines())
                .containsExactly(
                        file + "3: name: found an empty cell",
                        file + "4: alice.lengthKm: found \"10001\"; allowed 0 to 10000 km",
                        file + "5: bob.lengthKm: found \"-1\"; allowed 0 to 10000 km",
                        file + "6: alice.lengthKm: found \"1,5\"; allowed 0 to 10000 km",
                        file + "7: alice.lengthKm: found \"NaN\"; allowed 0 to 10000 km",
                        file + "8: alice.lengthKm: found \"0x10\"; allowed 0 to 10000 km",
                        file + "9: bob: neither a length nor a measured loss",
                        file
                                + "10: fibre: unknown fibre class \"G.652.X\"; did you mean G.652.A or G.652.B or G.652.C?",
                        file + "11: found 2 cells; allowed 4",
                        file + "12: found 5 cells; allowed 4");
        assertThat(run.out()).contains("2 of 2 routes meet all requirements", "10 rows are bad and left out");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'' | : found an empty table; allowed a header and a row for each route",
                "name,alice.lengthKm,bob.lengthKm~ | : found no routes below the header; allowed a row for each",
                "alice.lengthKm,bob.lengthKm~1,2~ | :1: missing column name",
                "name,alice.lengthKm~a,1~ | :1: missing column bob.lengthKm or bob.measuredLossDb",
                "name,bob.measuredLossDb~a,1~ | :1: missing column alice.lengthKm or alice.measuredLossDb",
                "name,alice.length,bob.lengthKm~a,1,2~ | :1: unknown column \"alice.length\"; did you mean"
                        + " alice.lengthKm?",
                "name,colour,alice.lengthKm,bob.lengthKm~a,1,2~ | :1: unknown column \"colour\"; allowed name,"
                        + " alice.lengthKm, alice.measuredLossDb, bob.lengthKm, bob.measuredLossDb, fibre, alice.fibre,"
                        + " bob.fibre",
                "name,alice.lengthKm,alice.lengthKm,bob.lengthKm~a,1,2,3~ | :1: found column alice.lengthKm twice;"
                        + " allowed once",
                "name,alice.lengthKm,,bob.lengthKm~a,1,2,3~ | :1: column 3 has no name",
                "~~nam,alice.lengthKm,bob.lengthKm~a,1,2~ | :3: unknown column \"nam\"; did you mean name?",
                "name,alice.lengthKm,bob.lengthKm~a,1,2~\"b,2,3~c,3,3~ | :3: a quoted cell is not closed as it should be",
                "name,alice.lengthKm,bob.lengthKm~a,1,2~\"b\"x,2,3~c,3,3~ | :3: a quoted cell is not closed as it should be",
                "\"name,alice.lengthKm,bob.lengthKm~a,1,2~ | :1: a quoted cell is not closed as it should be"
            })
    void brokenTableIsOneLineAndNothingIsWritten(String table, String message) throws IOException {
        Path ranking = directory.resolve("ranking.csv");
        Run run = run(table.replace('~', '\n'), "--csv", ranking.toString());
        assertThat(run).isEqualTo(new Run(2, "", "binspan: " + directory.resolve("routes.csv") + message + "\n"));
        assertThat(ranking).doesNotExist();
        assertThat(directory).isDirectoryNotContaining("glob:**.part");
    }

    @Test
    void tableThatCannotBeReadIsOneLine() throws IOException {
        assertThat(study.run("--table", directory.resolve("no.csv").toString()).err())
                .isEqualTo("binspan: " + directory.resolve("no.csv") + ": no such file\n");
        assertThat(study.run("--table", directory.toString()).err())
                .isEqualTo("binspan: " + directory + ": found a directory; allowed a table\n");
        Path latin = Files.write(
                directory.resolve("latin.csv"), (HEADER + "Br\u00fccke,1,2\n").getBytes(StandardCharsets.ISO_8859_1));
        Run run = study.run("--table", latin.toString());
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines()).singleElement().asString().endsWith(": not UTF-8 text");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "name,alice.lengthKm,bob.lengthKm\na,20,20\nb,60,60\n",
                "name,alice.lengthKm,bob.lengthKm\r\na,20,20\r\nb,60,60\r\n",
                "\ufeffname,alice.lengthKm,bob.lengthKm\na,20,20\nb,60,60",
                "\"name\",\"alice.lengthKm\",\"bob.lengthKm\"\n\"a\",\"20\",\"20\"\nb,60,60\n",
                "bob.lengthKm,name,alice.lengthKm\n20,a,20\n60,b,60\n",
                "name, alice.lengthKm, bob.lengthKm\n a, 20 , 20\nb,6e1,+60.0\n",
                "name,alice.lengthKm,bob.lengthKm,fibre,alice.measuredLossDb\na,20,20,,\nb,60,60,,\n"
            })
    void tableMayBeWrittenInManyWays(String table) throws IOException {
        String plain = study.run("--table", table(HEADER + "a,20,20\nb,60,60\n"), "--csv", "-")
                .out();
        assertThat(run(table, "--csv", "-")).isEqualTo(new Run(ExitStatus.UNMET, plain, ""));
    }

    /** The line is that on which a row ends, blank lines and lines inside a quoted cell counted. */
    @Test
    void linesAreThoseOfTheFile() throws IOException {
        String table = "\n" + HEADER + "\n\na,10,10\n\"two\nlines\",20,20\nbad,x,1\n\nc,30,30";
        Run run = run(table, "--csv", "-");
        assertThat(run.errLines()).singleElement().asString().contains("routes.csv:8: alice.lengthKm");
        List<CSVRecord> rows = StudyRun.records(run.out());
        assertThat(rows)
                .extracting(row -> row.get("name") + " " + row.get("line"))
                .containsExactlyInAnyOrder("a 5", "two\nlines 7", "c 10");
    }

    @Test
    void nameOfAnyLengthIsRefusedWhereItIsNone() throws IOException {
        Run run = run(HEADER + "a,1,1\n" + "n".repeat(70_000) + ",1,1\n");
        assertThat(run.status()).isEqualTo(ExitStatus.REFUSED);
        assertThat(run.errLines())
                .singleElement()
                .asString()
                .endsWith("routes.csv:3: name: found 70000 characters; allowed at most 200");
    }
}
