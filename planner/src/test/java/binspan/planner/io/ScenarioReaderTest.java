package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import binspan.scenario.DetectorClass;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreSpan;
import binspan.scenario.Photon;
import binspan.scenario.Preparation;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class ScenarioReaderTest {
    private static final String PULSED = BrokenScenario.text("pulsed.json");
    private static final String CONTINUOUS = BrokenScenario.text("continuous.json");

    @TempDir
    private Path directory;

    private static List<String> errors(String text) {
        return catchThrowableOfType(InvalidScenarioException.class, () -> ScenarioReader.parse(text, "f"))
                .lines();
    }

    private static List<String> fileErrors(String file) {
        return catchThrowableOfType(InvalidScenarioException.class, () -> ScenarioReader.read(file))
                .lines();
    }

    private String file(String text) throws IOException {
        return Files.writeString(directory.resolve("link.json"), text).toString();
    }

    @Test
    void fieldsOfTheFileStandInTheScenario() throws InvalidScenarioException {
        Scenario scenario = ScenarioReader.parse(PULSED, "f");
        assertThat(scenario.name()).isEqualTo("Fox Weir to Long Barn");
        assertThat(scenario.imbalanceNs()).isEqualTo(2.0);
        assertThat(scenario.source().pump().mode()).isEqualTo(PumpMode.PULSE_PAIR);
        assertThat(scenario.source().pump().preparation()).isEqualTo(Preparation.MODULATOR);
        assertThat(scenario.source().pump().repetitionRateMHz()).hasValue(80.0);
        assertThat(scenario.source().idler().channel()).hasValue(30.0);
        assertThat(scenario.acquisition().fringePoints()).isEqualTo(16);
        assertThat(scenario.require().rawVisibilityAtLeast()).hasValue(0.85);
        assertThat(scenario.spread().get("alice.detectors.efficiency").relative())
                .isTrue();
        assertThat(scenario.provenance()).containsEntry("alice.path.duct.lengthKm", "route plan");
    }

    @Test
    void pathElementsKeepTheirOrderAndType() throws InvalidScenarioException {
        Scenario scenario = ScenarioReader.parse(PULSED, "f");
        assertThat(scenario.alice().path())
                .extracting(element -> element.getClass().getSimpleName())
                .containsExactly("FibreSpan", "FilterElement", "LossElement", "Compensator");
        FibreSpan span = (FibreSpan) scenario.alice().path().get(0);
        assertThat(span.fibre()).isEqualTo(FibreClass.G652D);
        assertThat(span.label()).hasValue("duct");
        assertThat(span.classicalChannels()).hasSize(1);
        assertThat(span.classicalChannels().get(0).ramanCoefficientPerKmNm()).isEqualTo(1e-10);
    }

    @Test
    void whatTheFileLeavesOutHasItsDefault() throws InvalidScenarioException {
        Scenario scenario = ScenarioReader.parse(PULSED, "f");
        assertThat(scenario.bob().photon()).isEqualTo(Photon.IDLER);
        assertThat(scenario.protocol().errorCorrectionEfficiency()).isEqualTo(1.16);
        assertThat(scenario.alice().detectors().get(0).detectorClass()).hasValue(DetectorClass.SNSPD);
        assertThat(scenario.alice().detectors().get(0).efficiency())
                .isEqualTo(DetectorClass.SNSPD.typical().efficiency());
    }

    @Test
    void commentsMayStandAnywhere() throws InvalidScenarioException {
        String commented = "// first\n"
                + CONTINUOUS.replace(",\n", ", // note\n").replace(": ", " /* here */ : /* and\nhere */ ")
                + "/* last */ // line";
        assertThat(ScenarioReader.parse(commented, "f")).isEqualTo(ScenarioReader.parse(CONTINUOUS, "f"));
    }

    @Test
    void schemaReferenceAtTheTopMeansNothing() throws InvalidScenarioException {
        String referring = CONTINUOUS.replaceFirst("\\{", "{ \"\\$schema\": \"./binspan-scenario.schema.json\",");
        assertThat(ScenarioReader.parse(referring, "f")).isEqualTo(ScenarioReader.parse(CONTINUOUS, "f"));
    }

    @ParameterizedTest
    @CsvSource({"C30, 30", "C30.5, 30.5", "30, 30", "C-20, -20", "-20.5, -20.5", "C0, 0", "C99, 99"})
    void channelIsANumberWithOrWithoutItsLetter(String channel, double number) throws InvalidScenarioException {
        Scenario scenario = ScenarioReader.parse(CONTINUOUS.replace("C30", channel), "f");
        assertThat(scenario.source().idler().channel()).hasValue(number);
    }

    @ParameterizedTest
    @CsvSource({
        "C",
        "c30",
        "L70",
        "C30.",
        "C.5",
        "C3 0",
        "C30.5.1",
        "C--3",
        "30C",
        "C1e1",
        "C+30",
        "C٣٠",
        "C00000000000000000000000030"
    })
    void otherTextsAreNoChannel(String channel) {
        assertThat(errors(CONTINUOUS.replace("C30", channel)))
                .containsExactly("f:9:27: source.idler.channel: found \"" + channel
                        + "\"; allowed a channel such as \"C30\", -60 to 99");
    }

    @ParameterizedTest
    @CsvSource({"16.0", "1.6e1", "160e-1"})
    void wholeNumberMayBeSpeltWithAPoint(String spelling) throws InvalidScenarioException {
        String text = PULSED.replace("\"fringePoints\": 16", "\"fringePoints\": " + spelling);
        assertThat(ScenarioReader.parse(text, "f").acquisition().fringePoints()).isEqualTo(16);
    }

    @Test
    void endsOfAClosedRangeAreAllowed() throws InvalidScenarioException {
        String lowest = PULSED.replace("\"excessLossDb\": 1.5", "\"excessLossDb\": 0");
        String highest = PULSED.replace("\"excessLossDb\": 1.5", "\"excessLossDb\": 60");
        assertThat(ScenarioReader.parse(lowest, "f").alice().analyzer().excessLossDb())
                .isZero();
        assertThat(ScenarioReader.parse(highest, "f").alice().analyzer().excessLossDb())
                .isEqualTo(60.0);
    }

    @Test
    void textsBeyondAsciiAreKept() throws InvalidScenarioException {
        String name = "Müller-Wehr → Σ 🜁";
        assertThat(ScenarioReader.parse(CONTINUOUS.replace("Fox Weir to Long Barn", name), "f")
                        .name())
                .isEqualTo(name);
    }

    @Test
    void fileIsReadWithOrWithoutAByteOrderMark() throws Exception {
        assertThat(ScenarioReader.read(file("\ufeff" + CONTINUOUS)))
                .isEqualTo(ScenarioReader.read(new ByteArrayInputStream(bytes(CONTINUOUS)), "f"));
    }

    @Test
    void placesCountCharactersBehindAByteOrderMark() throws IOException {
        String file = file("\ufeff[]");
        assertThat(fileErrors(file)).containsExactly(file + ":1:1: found a list; allowed a scenario object");
    }

    @Test
    void missingFileDirectoryAndImpossibleNameAreSaid() {
        String missing = directory.resolve("no.json").toString();
        assertThat(fileErrors(missing)).containsExactly(missing + ": no such file");
        assertThat(fileErrors(directory.toString()))
                .containsExactly(directory + ": found a directory; allowed a scenario file");
        assertThat(fileErrors("a\0b")).containsExactly("a\\u0000b: not a file name on this system");
    }

    @Test
    void unreadableFileIsSaid() throws IOException {
        String file = file(CONTINUOUS);
        Files.setPosixFilePermissions(Path.of(file), PosixFilePermissions.fromString("---------"));
        assumeFalse(Files.isReadable(Path.of(file)), "this user may read everything");
        assertThat(fileErrors(file)).containsExactly(file + ": not readable: permission denied");
    }

    @Test
    void brokenStreamIsSaid() {
        InputStream broken = new InputStream() {
            @Override
            public int read() throws IOException {
                throw new IOException("gone");
            }

            @Override
            public int read(byte[] bytes, int offset, int length) throws IOException {
                throw new IOException("gone");
            }
        };
        assertThat(catchThrowableOfType(InvalidScenarioException.class, () -> ScenarioReader.read(broken, "f"))
                        .lines())
                .containsExactly("f: not readable");
    }

    @Test
    void tenMegabytesAreReadAndOneByteMoreIsRefused() throws Exception {
        String padded = CONTINUOUS + " ".repeat(10_000_000 - CONTINUOUS.length());
        assertThat(ScenarioReader.read(file(padded)).name()).isEqualTo("Fox Weir to Long Barn");
        String file = file(padded + " ");
        assertThat(fileErrors(file))
                .containsExactly(file + ": found more than 10 MB; allowed a scenario of at most 10 MB");
    }

    @Test
    void hugeHostileFilesEndSoon() {
        String lists = "{\"a\":[" + "[],".repeat(3_000_000) + "[]]}";
        String fields = "{" + "\"alise\":1,".repeat(900_000) + "\"b\":1}";
        Assertions.assertTimeout(Duration.ofSeconds(20), () -> {
            assertThat(errors(lists).get(0)).startsWith("f:1:1: formatVersion: missing");
            assertThat(errors(fields)).hasSize(101);
        });
    }

    @Test
    void ofVeryManyErrorsTheFirstHundredAndTheirNumberAreSaid() {
        StringBuilder text = new StringBuilder("{\n");
        for (int i = 0; i < 250; i++) {
            text.append("\"zzzzzz").append(i).append("\": 1,\n");
        }
        List<String> lines = errors(text + CONTINUOUS.substring(1));
        assertThat(lines).hasSize(101);
        assertThat(lines.get(99)).startsWith("f:101:1: zzzzzz99: unknown field");
        assertThat(lines.get(100)).isEqualTo("f: and 150 more errors");
    }

    @Test
    void longValuesAndNamesAreShortenedInMessages() {
        String value = "x".repeat(5000);
        List<String> lines =
                errors(CONTINUOUS.replace("continuous", value).replace("\"timing\"", "\"" + "y".repeat(900) + "\""));
        assertThat(lines).hasSize(3).allSatisfy(line -> assertThat(line).hasSizeLessThan(1100));
        assertThat(lines).anyMatch(line -> line.contains("found \"" + "x".repeat(60) + "...\""));
    }

    @Test
    void fieldNameOverAThousandCharactersIsRefused() {
        assertThat(errors("{\"" + "k".repeat(2000) + "\":1}"))
                .containsExactly("f:1:1: found more; allowed a field name of at most 1000 characters");
    }

    @Test
    void numberOverAThousandCharactersIsRefused() {
        assertThat(errors("{\"imbalanceNs\": " + "1".repeat(1200) + "}"))
                .containsExactly("f:1:2: found more; allowed a number of at most 1000 characters");
    }

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }
}
