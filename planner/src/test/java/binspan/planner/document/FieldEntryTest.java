package binspan.planner.document;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.document.Change.Put;
import binspan.planner.document.Change.Remove;
import binspan.planner.document.FieldEntry.Accepted;
import binspan.planner.document.FieldEntry.Refused;
import binspan.planner.io.InvalidScenarioException;
import binspan.planner.io.ScenarioReader;
import binspan.scenario.Field;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Typed values become changes or the refusals of the command line. */
final class FieldEntryTest {
    private static final ScenarioDocument DOCUMENT = ShippedDocuments.named("kestrel-dam-to-millbrook");

    private static FieldEntry entry(String path, String typed) {
        return FieldEntry.read(field(path), path, typed);
    }

    private static Field field(String path) {
        DocumentText text = new DocumentText(DOCUMENT.text());
        try {
            return text.field(DocumentPath.of(path, text.root())).orElseThrow();
        } catch (RefusedEditException e) {
            throw new AssertionError(e);
        }
    }

    @ParameterizedTest
    @CsvSource({
        "imbalanceNs, ' 2.50 ', 2.5",
        "imbalanceNs, 1e-3, 1e-3",
        "imbalanceNs, .5, 0.5",
        "imbalanceNs, +3., 3",
        "acquisition.fringePoints, 24, 24"
    })
    void numbersAreRead(String path, String typed, double value) {
        assertThat(entry(path, typed)).isEqualTo(new Accepted(new Put(path, value)));
    }

    @ParameterizedTest
    @CsvSource({
        "source.pump.preparation, modulator, modulator",
        "source.idler.channel, C31.5, C31.5",
        "source.idler.channel, 31, C31",
        "name, ' A to B ', A to B"
    })
    void wordsChannelsAndTextsAreRead(String path, String typed, String value) {
        assertThat(entry(path, typed)).isEqualTo(new Accepted(new Put(path, value)));
    }

    @Test
    void nothingTypedLeavesTheDefault() {
        assertThat(entry("alice.tagBinPs", "  ")).isEqualTo(new Accepted(new Remove("alice.tagBinPs")));
        assertThat(entry("source.schmidtNumber", "")).isEqualTo(new Accepted(new Remove("source.schmidtNumber")));
        assertThat(entry("imbalanceNs", ""))
                .isEqualTo(new Refused(new EditProblem(
                        "imbalanceNs",
                        "missing; needs 1e-6 to 10000 ns: nominal imbalance of all interferometers and bin separation (train:"
                                + " pulse period)")));
    }

    /** The reader of files is the independent means: it must say the same of the same value in a file. */
    @ParameterizedTest
    @CsvSource({
        "alice.detectors[0].efficiency, 1.2, 1.2",
        "alice.detectors[0].efficiency, NaN, NaN",
        "alice.detectors[0].efficiency, -Infinity, -Infinity",
        "alice.detectors[0].efficiency, 1e999, 1e999",
        "alice.detectors[0].efficiency, true, true",
        "source.pump.preparation, modulater, '\"modulater\"'",
        "source.pump.mode, Continuous, '\"Continuous\"'",
        "source.idler.channel, C999, '\"C999\"'"
    })
    void refusalsAreThoseOfTheReader(String path, String typed, String inFile) {
        String name = path.substring(path.lastIndexOf('.') + 1);
        String text = DOCUMENT.text().replaceFirst("(\"" + name + "\": )[^,}\n]+", "$1" + inFile);
        String words = "";
        try {
            ScenarioReader.parse(text, "file");
        } catch (InvalidScenarioException e) {
            words = e.errors().stream()
                    .filter(error -> error.path().equals(path))
                    .findFirst()
                    .orElseThrow()
                    .message();
        }
        assertThat(words).startsWith("found ");
        assertThat(entry(path, typed)).isEqualTo(new Refused(new EditProblem(path, words)));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "imbalanceNs | 2,5 | found 2,5; allowed a number, 1e-6 to 10000 ns; the decimal sign is a point: 2.5",
                "imbalanceNs | two | found two; allowed a number, 1e-6 to 10000 ns",
                "imbalanceNs | 0x10 | found 0x10; allowed a number, 1e-6 to 10000 ns",
                "imbalanceNs | 2d | found 2d; allowed a number, 1e-6 to 10000 ns",
                "acquisition.fringePoints | 3.5 | found 3.5; allowed a whole number, 3 to 100000"
            })
    void whatIsNoNumberIsRefused(String path, String typed, String words) {
        assertThat(entry(path, typed)).isEqualTo(new Refused(new EditProblem(path, words)));
    }

    @Test
    void flagsAreRead() {
        Field relative = field("spread.both.detectors.efficiency.relative");
        assertThat(FieldEntry.read(relative, "r", "true")).isEqualTo(new Accepted(new Put("r", true)));
        assertThat(FieldEntry.read(relative, "r", "yes"))
                .isEqualTo(new Refused(new EditProblem("r", "found \"yes\"; allowed true or false")));
    }
}
