package binspan.worksheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import binspan.prediction.LinkCheck;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What holds for the worksheet of any link: nothing comes from nowhere, nothing is left out. */
final class WorksheetTest {
    private static final List<String> COMMON = List.of(
            "B_A1 s_A v_A Sigma_AA Sigma_BB Sigma_AB h_BA h_AB N_A N_B",
            "cpl_A alpha_A1 loss_A1 D_A1 DL_A1 pmd_A1 tau_A1 rep_A exc_A fib_A loss_A",
            "eta_A D_A beta_A tau_A late_A stray_A",
            "T jit_A1 j_A1 V_A1 w s1_A s2_A l1_A l2_A",
            "T_A T_B g_pump d_A k_A g_spec vp_A rK_A vt_A v_dr var g_phase pol_A g_pol delta gamma",
            "eff_A1 sh_A1 lo_A1 ph_A1 dk_A1 back_A1 raw_A1 live_A1 S_A1 nd_A1 m_11 jl_11 c_11 k_11 acc_11",
            "C C_side C_all R_11(max) R_11(min) V V_net CAR N_M sig_V V_1 F_1 V_8 F_8",
            "E_a E_b E_c S N_E sig_S t_3 t_5 Q_X e_X h_X r_X key",
            "n k e_bit e_ph leak dev h_dev l_1 l_2 l l_s t_key eta bpm modes bound cps_A");

    private static final String PULSED = "t_FWHM t_p s_P L_AA L_BB L_AB K_A K_B r K mu"
            + " St_AA St_BB St_AB S1_A S1_B rms_A1"
            + " c_A1(0) rho_11 J_11(0,0) f d_A1 n_A1(%1$s) q_A1(%1$s) f_11 sil_11"
            + " sp_11 A_11 x g2_A g2h_A mu_app";

    static Stream<Values> links() {
        return Stream.of(
                SampleScenarios.pulsePair(),
                SampleScenarios.continuous(),
                SampleScenarios.pulseTrain(),
                SampleScenarios.everything(),
                WorksheetScenarios.pulsePair(),
                WorksheetScenarios.continuous(),
                WorksheetScenarios.pulseTrain(),
                WorksheetScenarios.flatTops(),
                WorksheetScenarios.gated());
    }

    @ParameterizedTest
    @MethodSource("links")
    void everyNumberPutInStandsOnALineAbove(Values stated) {
        Map<String, WorksheetLine> above = new HashMap<>();
        for (WorksheetLine line : WorksheetScenarios.sheet(stated).lines()) {
            for (WorksheetTerm term : line.terms()) {
                WorksheetLine origin = above.get(term.symbol());
                assertThat(origin)
                        .as("%s puts in %s", line.symbol(), term.symbol())
                        .isNotNull();
                assertThat(term.value()).isEqualTo(origin.value());
                assertThat(term.unit()).isEqualTo(origin.unit());
                assertThat(line.numbers()).contains(term.text());
            }
            assertThat(above.put(line.symbol(), line))
                    .as("%s a second time", line.symbol())
                    .isNull();
        }
    }

    @ParameterizedTest
    @MethodSource("links")
    void everyLineSaysWhatItIsAndWhereItComesFrom(Values stated) {
        assertThat(WorksheetScenarios.sheet(stated).lines()).allSatisfy(line -> {
            assertThat(line.section()).matches("(1[0-2]|[1-9]) .+");
            assertThat(line.meaning()).isNotBlank();
            assertThat(line.source()).isNotBlank();
            assertThat(line.value()).isNotNaN();
            assertThat(line.formula() + line.numbers()).doesNotContain("{").doesNotContain("}");
            assertThat(line.input()).isEqualTo(line.numbers().isEmpty());
        });
    }

    @ParameterizedTest
    @MethodSource("links")
    void sectionsFollowThePhysics(Values stated) {
        List<String> sections = new ArrayList<>();
        for (WorksheetLine line : WorksheetScenarios.sheet(stated).lines()) {
            if (sections.isEmpty() || !sections.get(sections.size() - 1).equals(line.section())) {
                sections.add(line.section());
            }
        }
        assertThat(sections).doesNotHaveDuplicates();
        assertThat(sections)
                .extracting(section -> Integer.parseInt(section.substring(0, section.indexOf(' '))))
                .isSorted()
                .doesNotHaveDuplicates();
        assertThat(sections)
                .startsWith(
                        "1 Spectrum of the pair",
                        "2 Path",
                        "3 Arrival time",
                        "4 Analyzer",
                        "5 Coherence",
                        "6 Detectors");
    }

    @Test
    void everyIntermediateOfAPulsePairIsThere() {
        List<String> symbols = symbols(SampleScenarios.pulsePair());
        assertThat(symbols).containsAll(words(COMMON));
        assertThat(symbols).containsAll(words(List.of(PULSED.formatted("1"))));
        assertThat(symbols)
                .contains(
                        "T_P", "vp_P", "e", "mu_E", "mu_L", "b_E", "b_L", "n_A1(0)", "n_A1(2)", "C_00", "C_22", "C_02",
                        "C_20");
        assertThat(symbols)
                .contains(
                        "Q_Z", "e_Z", "I", "eph_Z", "ratio", "eph_X", "h_Z", "hp_Z", "hp_X", "r_Z", "q0_A", "R0(max)");
    }

    @Test
    void everyIntermediateOfAPulseTrainIsThere() {
        List<String> symbols = symbols(SampleScenarios.pulseTrain());
        assertThat(symbols).containsAll(words(COMMON));
        assertThat(symbols).containsAll(words(List.of(PULSED.formatted("0"))));
        assertThat(symbols)
                .contains("t_c", "T_e", "b", "sift", "R_11(0,1)", "R_11(0,-1)")
                .doesNotContain("e_Z", "C_00", "mu_E", "T_P");
    }

    @Test
    void everyIntermediateOfAContinuousPumpIsThere() {
        List<String> symbols = symbols(SampleScenarios.continuous());
        assertThat(symbols).containsAll(words(COMMON));
        assertThat(symbols)
                .contains(
                        "t_c",
                        "T_e",
                        "R",
                        "beta",
                        "St",
                        "rms",
                        "C_11(0)",
                        "C_11(A)",
                        "C_11(-B)",
                        "R_11(A)",
                        "R_11(B)",
                        "sift",
                        "acc_0");
    }

    @Test
    void valuesAreThoseOfTheCheck() {
        LinkCheck check = LinkCheck.of(SampleScenarios.build(WorksheetScenarios.pulsePair()));
        Worksheet sheet = Worksheet.of(check);
        assertThat(sheet.line("V").value())
                .isEqualTo(check.prediction().fringe().raw());
        assertThat(sheet.line("key").value()).isEqualTo(check.prediction().key().asymptoticPerSecond());
        assertThat(sheet.line("l").value()).isEqualTo(check.finite().bits());
        assertThat(sheet.line("S").value()).isEqualTo(check.prediction().bell().chsh());
        assertThat(sheet.line("R_12(mean)").value())
                .isEqualTo(check.prediction().counts().central().of(0, 1).atCosine(0.0));
    }

    @Test
    void linkWithoutKeyHasNoKeyLines() {
        Values stated = SampleScenarios.continuous();
        for (String arm : new String[] {"alice", "bob"}) {
            Values site = SampleScenarios.part(stated, arm);
            site.put("detectors", List.of(site.list("detectors").get(0)));
        }
        List<String> symbols = symbols(stated);
        assertThat(symbols).contains("e_X", "r_X", "V").doesNotContain("key", "n", "l_1", "R_12(max)", "E_a");
        assertThat(WorksheetScenarios.sheet(stated).line("S").formula()).isEqualTo("2 sqrt(2) V cos(delta)");
    }

    @Test
    void unknownSymbolsAreRefused() {
        Worksheet sheet = WorksheetScenarios.sheet(SampleScenarios.pulsePair());
        assertThatThrownBy(() -> sheet.line("nonsense"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("no line nonsense");
        WorksheetLine line = sheet.line("s_P");
        assertThatThrownBy(() -> line.term("nonsense"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("s_P puts in no nonsense");
    }

    private static List<String> symbols(Values stated) {
        return WorksheetScenarios.sheet(stated).lines().stream()
                .map(WorksheetLine::symbol)
                .toList();
    }

    private static List<String> words(List<String> lines) {
        return lines.stream().flatMap(line -> Stream.of(line.split(" ", -1))).toList();
    }
}
