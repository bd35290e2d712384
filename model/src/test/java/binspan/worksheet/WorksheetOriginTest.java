package binspan.worksheet;

import static binspan.scenario.SampleScenarios.part;
import static org.assertj.core.api.Assertions.assertThat;

import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The scenario's notes reach the inputs that they speak of, whichever way their path is spelt. */
final class WorksheetOriginTest {
    private static Worksheet noted(String path) {
        Values stated = SampleScenarios.pulsePair().put("provenance", Map.of(path, "measured 2026-10-02"));
        part(stated, "source.pump").put("linewidthMHz", 0.2).put("preparation", binspan.scenario.Preparation.MODULATOR);
        return WorksheetScenarios.sheet(stated);
    }

    @ParameterizedTest
    @CsvSource({
        "alice.path.cable.lengthKm, L_A1",
        "alice.path[0].lengthKm, L_A1",
        "both.path.cable.lengthKm, L_B1",
        "both.path[0].lengthKm, L_A1",
        "alice.path.cable, n_c_A1",
        "alice.path, L_A1",
        "alice.detectors.efficiency, eff_A2",
        "alice.detectors[1].efficiency, eff_A2",
        "both.detectors.jitterFwhmPs, jit_B1",
        "bob.detectors, td_B2",
        "bob.analyzer.excessLossDb, exc_B",
        "both.analyzer, ph_A",
        "alice, rep_A",
        "source.meanPairsPerCycle, mu",
        "source.signal.bandwidthFwhmGHz, B_A1",
        "source.idler.channel, ch_B",
        "source.pump.linewidthMHz, lw",
        "timing.windowWidthPs, w",
        "imbalanceNs, T",
        "protocol.errorCorrectionEfficiency, f_EC",
        "acquisition, t_run"
    })
    void noteIsFound(String path, String symbol) {
        assertThat(noted(path).line(symbol).source()).isEqualTo("measured 2026-10-02");
    }

    @Test
    void noteOfOneIsNotThatOfAnother() {
        Worksheet sheet = noted("alice.detectors[1].efficiency");
        assertThat(sheet.line("eff_A1").source()).isEqualTo("of the class snspd, common practice");
        assertThat(sheet.line("eff_B2").source()).isEqualTo("of the class snspd, common practice");
        assertThat(sheet.line("mu").source()).isEqualTo("scenario");
    }

    @Test
    void classValuesNameTheirClass() {
        Worksheet sheet = WorksheetScenarios.sheet(WorksheetScenarios.pulsePair());
        assertThat(sheet.line("alpha_A1").source()).startsWith("of the class G.652.D, common practice");
        assertThat(sheet.line("S0_B1").source()).isEqualTo("of the class G.652.D, common practice");
        assertThat(sheet.line("td_A1").source()).isEqualTo("of the class snspd, common practice");
        assertThat(sheet.line("eff_B2").source()).isEqualTo("scenario");
    }

    @Test
    void publishedFormulasNameTheirPublication() {
        Worksheet sheet = WorksheetScenarios.sheet(WorksheetScenarios.pulsePair());
        assertThat(sheet.line("D_A1").source()).contains("G.650.1");
        assertThat(sheet.line("q_A1(1)").source()).contains("New J. Phys. 17, 043030 (2015)");
        assertThat(sheet.line("l_1").source()).contains("arXiv:1103.4130");
        assertThat(sheet.line("l_2").source()).contains("arXiv:2009.04882");
        assertThat(sheet.line("bpm").source()).contains("arXiv:1510.08863");
        assertThat(sheet.line("V").source()).isEqualTo(WorksheetLine.MODEL);
    }
}
