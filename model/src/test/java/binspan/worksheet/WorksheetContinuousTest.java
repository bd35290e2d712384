package binspan.worksheet;

import static binspan.worksheet.WorksheetChecks.FWHM_PER_RMS;
import static binspan.worksheet.WorksheetChecks.captured;
import static binspan.worksheet.WorksheetChecks.entropy;
import static binspan.worksheet.WorksheetChecks.square;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

/** Every kind of formula of a continuous pump, recomputed from the numbers that the worksheet says it puts in. */
final class WorksheetContinuousTest {
    private final Worksheet sheet = WorksheetScenarios.sheet(WorksheetScenarios.continuous());
    private final WorksheetChecks check = new WorksheetChecks(sheet);

    @Test
    void spectrumAndArrival() {
        check.line("s_B1", l -> 2.0 * Math.PI * l.term("B_B1") / FWHM_PER_RMS);
        check.line("Sigma_AA", l -> 1.0 / (1.0 / l.term("v_A") + 1.0 / l.term("v_B")));
        check.line("Sigma_AB", l -> -l.term("Sigma_AA"));
        check.line("h_AB", l -> Math.sqrt(l.term("v_A") / (l.term("v_A") + l.term("v_B"))));
        check.line("N_A", l -> l.term("R") / l.term("h_BA") + l.term("u_A"));
        check.line("beta", l -> l.term("beta_A") + l.term("beta_B"));
        check.line(
                "St",
                l -> (1.0 / l.term("v_A") + 1.0 / l.term("v_B")) / 4.0 + square(l.term("beta")) * l.term("Sigma_AA"));
        check.line("rms", l -> Math.sqrt(l.term("St") + l.term("V_A1") + l.term("V_B1")));
        check.line("C_12(0)", l -> captured(l.term("w"), l.term("late_A") - l.term("late_B"), l.term("rms_12")));
        assertThat(check.recomputed()).isEqualTo(9);
    }

    @Test
    void coherence() {
        check.line("T_e", l -> (l.term("T_A") + l.term("T_B")) / 2.0);
        check.line("g_pump", l -> Math.exp(-l.term("T_e") / l.term("t_c")));
        check.line("chirp", l -> (l.term("k_A") + l.term("k_B")) * l.term("Sigma_AA"));
        check.line(
                "g_spec",
                l -> Math.pow(1.0 + square(l.term("chirp")), -0.25)
                        * Math.exp(-square(l.term("d_A") - l.term("d_B"))
                                * l.term("Sigma_AA")
                                / (2.0 * (1.0 + square(l.term("chirp"))))));
        check.line("T_eff", l -> (l.term("T_A") + l.term("T_B")) / 2.0);
        check.line("v_dr", l -> square(2.0 * Math.PI * l.term("dr") * l.term("T_eff")));
        check.line("g_pol", l -> l.term("pol_A") * l.term("pol_B"));
        check.line("delta", l -> l.term("set_A") + l.term("set_B"));
        check.line("gamma", l -> l.term("g_pump") * l.term("g_spec") * l.term("g_phase") * l.term("g_pol"));
        assertThat(check.recomputed()).isEqualTo(9);
    }

    @Test
    void counts() {
        check.line("ph_A1", l -> l.term("N_A") * (l.term("sh_A1") + l.term("lo_A1")));
        check.line("S_B2", l -> l.term("raw_B2") * (1.0 + l.term("pa_B2")) * l.term("live_B2"));
        check.line(
                "m_12", l -> l.term("R") * (l.term("sh_A1") + l.term("lo_A1")) * (l.term("sh_B2") + l.term("lo_B2")));
        check.line(
                "c_12",
                l -> l.term("R")
                        * l.term("jl_12")
                        * (l.term("C_12(0)") * (l.term("sh_A1") * l.term("sh_B2") + l.term("lo_A1") * l.term("lo_B2"))
                                + l.term("C_12(A)") * l.term("lo_A1") * l.term("sh_B2")
                                + l.term("C_12(-B)") * l.term("sh_A1") * l.term("lo_B2")));
        check.line(
                "k_12",
                l -> -2.0
                        * l.term("R")
                        * l.term("jl_12")
                        * l.term("C_12(0)")
                        * l.term("gamma")
                        * Math.sqrt(l.term("sh_A1") * l.term("sh_B2") * l.term("lo_A1") * l.term("lo_B2")));
        check.line("acc_12", l -> l.term("S_A1") * l.term("S_B2") * l.term("w"));
        check.line("R_12(b)", l -> l.term("c_12") + l.term("k_12") * l.term("cos_b") + l.term("acc_12"));
        check.line(
                "R_11(A)",
                l -> l.term("R")
                                * l.term("jl_11")
                                * (l.term("C_11(-A)")
                                                * (l.term("sh_A1") * l.term("sh_B1")
                                                        + l.term("lo_A1") * l.term("lo_B1"))
                                        + l.term("C_11(0)") * l.term("lo_A1") * l.term("sh_B1")
                                        + l.term("C_11(-A-B)") * l.term("sh_A1") * l.term("lo_B1"))
                        + l.term("acc_11"));
        check.line(
                "C_side",
                l -> l.terms().stream().mapToDouble(WorksheetTerm::value).sum());
        check.line("C_all", l -> l.term("C") + l.term("C_side"));
        assertThat(check.recomputed()).isEqualTo(10);
    }

    @Test
    void merit() {
        check.line("V", l -> (l.term("R_11(max)") - l.term("R_11(min)")) / (l.term("R_11(max)") + l.term("R_11(min)")));
        check.line(
                "V_net",
                l -> (l.term("R_11(max)") - l.term("R_11(min)"))
                        / (l.term("R_11(max)") + l.term("R_11(min)") - 2.0 * l.term("acc_11")));
        check.line("V_6", l -> l.term("k_11") / l.term("c_11"));
        check.line("live0_B", l -> 1.0 / (1.0 + l.term("ph_B1") * l.term("td_B1")));
        check.line(
                "R0(min)", l -> (l.term("c_11") - l.term("k_11")) * l.term("jl_0") / l.term("jl_11") + l.term("acc_0"));
        check.line(
                "E_c",
                l -> (l.term("R_11(c)") + l.term("R_22(c)") - l.term("R_12(c)") - l.term("R_21(c)"))
                        / (l.term("R_11(c)") + l.term("R_22(c)") + l.term("R_12(c)") + l.term("R_21(c)")));
        check.line("sift", l -> l.term("Q_X") / 2.0);
        check.line("h_X", l -> entropy(l.term("e_X")));
        check.line("key", l -> l.term("sift") * l.term("r_X"));
        check.line("n", l -> l.term("sift") * l.term("t_up") / 2.0);
        check.line("modes", l -> Math.sqrt(l.term("Sigma_AA") / Math.PI));
        assertThat(check.recomputed()).isEqualTo(11);
    }

    @Test
    void hasNoPulsedLines() {
        for (String symbol : new String[] {"K", "K_A", "s_P", "c_A1(0)", "q_A1(1)", "e_Z", "g2_A", "mu_app", "f"}) {
            assertThatThrownBy(() -> sheet.line(symbol)).isInstanceOf(IllegalArgumentException.class);
        }
    }
}
