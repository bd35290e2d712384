package binspan.worksheet;

import static binspan.worksheet.WorksheetChecks.FWHM_PER_RMS;
import static binspan.worksheet.WorksheetChecks.LIGHT;
import static binspan.worksheet.WorksheetChecks.captured;
import static binspan.worksheet.WorksheetChecks.entropy;
import static binspan.worksheet.WorksheetChecks.square;
import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** Every kind of formula of a pulse pair, recomputed from the numbers that the worksheet says it puts in. */
final class WorksheetPulsePairTest {
    private final WorksheetChecks check = new WorksheetChecks(WorksheetScenarios.sheet(WorksheetScenarios.pulsePair()));

    @Test
    void spectrum() {
        check.line("nu_A", l -> LIGHT / (l.term("lambda_A") * 1e-9));
        check.line("nu_B", l -> 190e12 + l.term("ch_B") * 0.1e12);
        check.line("s_A1", l -> 2.0 * Math.PI * l.term("B_A1") / FWHM_PER_RMS);
        check.line("v_A", l -> square(l.term("s_A")));
        check.line("t_p", l -> l.term("t_FWHM") / FWHM_PER_RMS);
        check.line("s_P", l -> 1.0 / (2.0 * l.term("t_p")));
        check.line("L_AA", l -> 1.0 / l.term("v_A") + 1.0 / square(l.term("s_P")));
        check.line(
                "Sigma_AA",
                l -> l.term("v_A")
                        * (l.term("v_B") + square(l.term("s_P")))
                        / (l.term("v_A") + l.term("v_B") + square(l.term("s_P"))));
        check.line(
                "Sigma_AB",
                l -> -l.term("v_A") * l.term("v_B") / (l.term("v_A") + l.term("v_B") + square(l.term("s_P"))));
        check.line("K_B", l -> Math.sqrt(1.0 + l.term("v_B") / square(l.term("s_P"))));
        check.line("r", l -> l.term("Sigma_AB") / Math.sqrt(l.term("Sigma_AA") * l.term("Sigma_BB")));
        check.line("K", l -> 1.0 / Math.sqrt(1.0 - square(l.term("r"))));
        check.line("h_BA", l -> Math.sqrt(l.term("v_B") / (l.term("v_A") + l.term("v_B") + square(l.term("s_P")))));
        check.line("N_A", l -> l.term("mu") / l.term("h_BA") + l.term("u_A"));
        assertThat(check.recomputed()).isEqualTo(14);
    }

    @Test
    void path() {
        check.line(
                "loss_B1",
                l -> l.term("alpha_B1") * l.term("L_B1")
                        + l.term("n_c_B1") * l.term("l_c_B1")
                        + l.term("n_s_B1") * l.term("l_s_B1"));
        check.line(
                "D_A1",
                l -> l.term("S0_A1")
                        / 4.0
                        * (l.term("lambda_A") - Math.pow(l.term("l0_A1"), 4) / Math.pow(l.term("lambda_A"), 3)));
        check.line("DL_A1", l -> l.term("D_A1") * l.term("L_A1"));
        check.line(
                "tau_B1", l -> 0.5e-12 * l.term("pmd_B1") * Math.sqrt(l.term("L_B1")) * Math.sqrt(3.0 * Math.PI / 8.0));
        check.line("dt_A1", l -> 1e-12 * l.term("kap_A1") * l.term("L_A1") * l.term("dT"));
        check.line("loss_B", l -> l.term("cpl_B") + l.term("loss_B1") + l.term("rep_B") + l.term("exc_B"));
        check.line("eta_B", l -> Math.pow(10.0, -l.term("loss_B") / 10.0));
        check.line("beta_A", l -> -square(l.term("lambda_A") * 1e-9) / (2.0 * Math.PI * LIGHT) * l.term("D_A") * 1e-3);
        check.line("late_B", l -> l.term("off_B") + l.term("dt_B1"));
        assertThat(check.recomputed()).isEqualTo(9);
    }

    @Test
    void arrival() {
        check.line("St_AA", l -> l.term("L_AA") / 4.0 + square(l.term("beta_A")) * l.term("Sigma_AA"));
        check.line("St_AB", l -> l.term("L_AB") / 4.0 + l.term("beta_A") * l.term("beta_B") * l.term("Sigma_AB"));
        check.line("S1_B", l -> l.term("L_BB") / 4.0 + square(l.term("beta_B")) * l.term("v_B"));
        check.line("j_B2", l -> l.term("jit_B2") / FWHM_PER_RMS);
        check.line(
                "V_B2",
                l -> square(l.term("j_B2"))
                        + square(l.term("clk_B"))
                        + square(l.term("tag_B")) / 12.0
                        + square(l.term("tau_B")));
        check.line("rms_A1", l -> Math.sqrt(l.term("S1_A") + l.term("V_A1")));
        check.line("c_A1(0)", l -> captured(l.term("w"), l.term("late_A"), l.term("rms_A1")));
        check.line("c_B2(0)", l -> captured(l.term("w"), l.term("late_B"), l.term("rms_B2")));
        check.line("rho_12", l -> l.term("St_AB") / (l.term("ra_12") * l.term("rb_12")));
        assertThat(check.recomputed()).isEqualTo(9);
    }

    @Test
    void analyzerAndCoherence() {
        check.line("e_A", l -> Math.pow(10.0, -l.term("xl_A") / 10.0));
        check.line("s2_A", l -> l.term("i_A") * (1.0 - l.term("o_A")));
        check.line("l1_A", l -> (1.0 - l.term("i_A")) * (1.0 - l.term("o_A")) * l.term("e_A"));
        check.line("l2_A", l -> (1.0 - l.term("i_A")) * l.term("o_A") * l.term("e_A"));
        check.line("T_A", l -> l.term("T") + l.term("mis_A"));
        check.line("t_c", l -> 2.0 * Math.sqrt(Math.log(2.0)) / (Math.PI * l.term("lw")));
        check.line("g_pump", l -> Math.exp(-square(l.term("T_e") / l.term("t_c"))));
        check.line("d_B", l -> l.term("T_B") - l.term("T_P"));
        check.line(
                "det_L",
                l -> 1.0 / (l.term("v_A") * l.term("v_B"))
                        + l.term("L_AB") * (1.0 / l.term("v_A") + 1.0 / l.term("v_B")));
        check.line("M_im", l -> -(l.term("L_AA") * l.term("k_B") + l.term("L_BB") * l.term("k_A")));
        check.line(
                "Q_re",
                l -> square(l.term("d_A")) / l.term("v_B")
                        + square(l.term("d_B")) / l.term("v_A")
                        + l.term("L_AB") * square(l.term("d_A") - l.term("d_B")));
        check.line("g_spec", WorksheetPulsePairTest::spectral);
        check.line("rK_A", l -> 2.0 * Math.PI * l.term("nu_A") * l.term("T_A") * l.term("kT_A"));
        check.line("vt_A", l -> square(l.term("rK_A") * l.term("dTr_A")));
        check.line("v_dr", l -> square(2.0 * Math.PI * l.term("dr") * l.term("T_eff")));
        check.line("var", l -> l.term("vp_A") + l.term("vp_B") + l.term("vt_A") + l.term("vt_B") + l.term("v_dr"));
        check.line("g_phase", l -> Math.exp(-l.term("var") / 2.0));
        check.line("gamma", l -> l.term("g_pump") * l.term("g_spec") * l.term("g_phase") * l.term("g_pol"));
        assertThat(check.recomputed()).isEqualTo(18);
    }

    private static double spectral(WorksheetLine l) {
        double real = l.term("M_re");
        double imaginary = l.term("M_im");
        double modulus = real * real + imaginary * imaginary;
        double exponent = (l.term("Q_re") * real + l.term("Q_im") * imaginary) / modulus;
        return Math.sqrt(l.term("det_L") / Math.sqrt(modulus)) * Math.exp(-exponent / 2.0);
    }

    @Test
    void detectors() {
        check.line("sh_B2", l -> l.term("eff_B2") * l.term("eta_B") * l.term("s2_B"));
        check.line("ph_B2", l -> l.term("N_B") * l.term("f") * (l.term("sh_B2") + l.term("lo_B2")));
        check.line(
                "back_B2",
                l -> l.term("bg_B2") + l.term("stray_B") * (l.term("s2_B") + l.term("l2_B")) * l.term("eff_B2"));
        check.line("raw_B2", l -> l.term("ph_B2") + l.term("dk_B2") + l.term("back_B2"));
        check.line("live_B2", l -> 1.0 / (1.0 + l.term("raw_B2") * (1.0 + l.term("pa_B2")) * l.term("td_B2")));
        check.line("S_B2", l -> l.term("raw_B2") * (1.0 + l.term("pa_B2")) * l.term("live_B2"));
        check.line(
                "nd_B2",
                l -> l.term("dk_B2") + l.term("back_B2") + l.term("pa_B2") * l.term("raw_B2") * l.term("live_B2"));
        check.line("d_B2", l -> l.term("nd_B2") * l.term("w"));
        assertThat(check.recomputed()).isEqualTo(8);
    }

    @Test
    void clicks() {
        check.line("b_E", l -> l.term("mu_E") * (1.0 + l.term("mu_E") / l.term("K")));
        check.line(
                "n_A1(1)",
                l -> l.term("N_A")
                        * l.term("c_A1(0)")
                        * (l.term("e") * l.term("lo_A1") + (1.0 - l.term("e")) * l.term("sh_A1")));
        check.line("n_A1(0)", l -> l.term("N_A") * l.term("c_A1(0)") * l.term("e") * l.term("sh_A1"));
        check.line(
                "q_A1(1)",
                l -> -Math.expm1(-l.term("d_A1") - l.term("K") * Math.log1p(l.term("n_A1(1)") / l.term("K"))));
        check.line("jl_12", WorksheetPulsePairTest::jointLive);
        check.line(
                "c_12",
                l -> l.term("J_12(0,0)")
                        * (l.term("b_E") * l.term("lo_A1") * l.term("lo_B2")
                                + l.term("b_L") * l.term("sh_A1") * l.term("sh_B2")));
        check.line(
                "k_12",
                l -> -2.0
                        * l.term("J_12(0,0)")
                        * l.term("gamma")
                        * Math.sqrt(l.term("b_E")
                                * l.term("b_L")
                                * l.term("lo_A1")
                                * l.term("lo_B2")
                                * l.term("sh_A1")
                                * l.term("sh_B2")));
        check.line("acc_12", l -> l.term("q_A1(1)") * l.term("q_B2(1)"));
        check.line("sp_12", l -> (1.0 + l.term("n_A1(1)") / l.term("K")) * (1.0 + l.term("n_B2(1)") / l.term("K")));
        check.line("R_11(max)", l -> rate(l, l.term("c_11") + l.term("k_11") * l.term("cos_max"), "_11"));
        check.line("R_11(2,0)", l -> rate(l, l.term("c_11(2,0)"), "_11(2,0)"));
        check.line("C", l -> l.term("R_11(mean)") + l.term("R_12(mean)") + l.term("R_21(mean)") + l.term("R_22(mean)"));
        check.line("C_00", l -> l.term("R_11(0,0)") + l.term("R_12(0,0)") + l.term("R_21(0,0)") + l.term("R_22(0,0)"));
        check.line(
                "C_all",
                l -> l.term("C")
                        + l.term("C_side")
                        + l.term("C_00")
                        + l.term("C_22")
                        + l.term("C_02")
                        + l.term("C_20"));
        assertThat(check.recomputed()).isEqualTo(14);
    }

    private static double jointLive(WorksheetLine l) {
        double a = l.term("live_A1");
        double b = l.term("live_B2");
        double dead = Math.min(l.term("td_A1"), l.term("td_B2"));
        return Math.min(a * b * (1.0 + l.term("m_12") * dead * Math.sqrt(a * b)), Math.min(a, b));
    }

    private static double rate(WorksheetLine l, double pairs, String at) {
        double more = Math.expm1(-l.term("K") * Math.log1p(-pairs / (l.term("K") * l.term("sp" + at))));
        return l.term("f_11") * (l.term("acc" + at) + l.term("sil" + at) * more);
    }

    @Test
    void windowsOneSeparationApart() {
        String[] slots = {"(1,2)", "(0,1)", "(1,0)", "(2,1)"};
        check.line("C_side", l -> {
            double sum = 0.0;
            for (String windows : slots) {
                for (String ports : new String[] {"11", "12", "21", "22"}) {
                    sum += l.term("R_" + ports + windows);
                }
            }
            return sum;
        });
        check.line("c_11(1,2)", l -> l.term("J_11(0,0)") * l.term("b_L") * l.term("sh_A1") * l.term("lo_B1"));
    }

    @Test
    void merit() {
        check.line("V", l -> (l.term("R_11(max)") - l.term("R_11(min)")) / (l.term("R_11(max)") + l.term("R_11(min)")));
        check.line("CAR", l -> (l.term("R_11(max)") + l.term("R_11(min)")) / (2.0 * l.term("A_11")));
        check.line("sig_V", l -> Math.sqrt((2.0 - square(l.term("V"))) / (l.term("M") * l.term("N_M"))));
        check.line("V_5", WorksheetPulsePairTest::balanced);
        check.line("V_7", l -> (l.term("R0(max)") - l.term("R0(min)")) / (l.term("R0(max)") + l.term("R0(min)")));
        check.line("F_8", l -> l.term("V_8") / l.term("V_7"));
        check.line("cos_a", l -> Math.cos(l.term("delta") - Math.PI / 4.0));
        check.line(
                "E_b",
                l -> (l.term("R_11(b)") + l.term("R_22(b)") - l.term("R_12(b)") - l.term("R_21(b)"))
                        / (l.term("R_11(b)") + l.term("R_22(b)") + l.term("R_12(b)") + l.term("R_21(b)")));
        check.line("S", l -> l.term("E_a") + 2.0 * l.term("E_b") - l.term("E_c"));
        check.line("sig_S", l -> 2.0 * Math.sqrt((1.0 - square(l.term("S")) / 16.0) / l.term("N_E")));
        check.line(
                "t_5",
                l -> 400.0
                        * (1.0 - square(l.term("S")) / 16.0)
                        / (square(l.term("S") - 2.0) * l.term("C") * l.term("up")));
        assertThat(check.recomputed()).isEqualTo(11);
    }

    private static double balanced(WorksheetLine l) {
        double longs = l.term("b_E") * l.term("l1_A") * l.term("l1_B");
        double shorts = l.term("b_L") * l.term("s1_A") * l.term("s1_B");
        return 2.0 * Math.sqrt(longs * shorts) * l.term("gamma") / (longs + shorts);
    }

    @Test
    void key() {
        check.line("e_X", l -> (l.term("R_12(delta)") + l.term("R_21(delta)")) / l.term("Q_X"));
        check.line("e_Z", l -> (l.term("C_02") + l.term("C_20")) / l.term("Q_Z"));
        check.line("eph_Z", l -> (1.0 - l.term("I") / l.term("Q_Z")) / 2.0);
        check.line(
                "ratio",
                l -> (l.term("l1_A") + l.term("l2_A"))
                        * (l.term("s1_B") + l.term("s2_B"))
                        / ((l.term("s1_A") + l.term("s2_A")) * (l.term("l1_B") + l.term("l2_B"))));
        check.line("eph_X", l -> (l.term("C_02") * l.term("ratio") + l.term("C_20") / l.term("ratio")) / l.term("Q_X"));
        check.line("h_Z", l -> entropy(l.term("e_Z")));
        check.line("r_Z", l -> Math.max(0.0, 1.0 - l.term("f_EC") * l.term("h_Z") - l.term("hp_Z")));
        check.line("key", l -> l.term("Q_Z") * l.term("r_Z") + l.term("Q_X") * l.term("r_X"));
        check.line("n", l -> l.term("Q_Z") * l.term("t_up"));
        check.line("leak", l -> l.term("f_EC") * l.term("h_Z") * l.term("n"));
        check.line(
                "dev",
                l -> Math.sqrt((l.term("n") + l.term("k"))
                        / (l.term("n") * l.term("k"))
                        * (l.term("k") + 1.0)
                        / l.term("k")
                        * Math.log(4.0 / l.term("eps_s"))));
        check.line("h_dev", l -> entropy(l.term("e_ph") + l.term("dev")));
        check.line(
                "l_1",
                l -> l.term("n") * (1.0 - l.term("h_dev"))
                        - l.term("leak")
                        - Math.log(2.0 / (square(l.term("eps_s")) * l.term("eps_c"))) / Math.log(2.0));
        check.line("l", l -> Math.floor(Math.max(l.term("l_1"), l.term("l_2"))));
        assertThat(check.recomputed()).isEqualTo(14);
    }

    @Test
    void sourceAndBenchmark() {
        check.line("x", l -> l.term("mu_L") / (l.term("h_AB") * l.term("h_BA")));
        check.line("g2_A", l -> 1.0 + 1.0 / l.term("K_A"));
        check.line(
                "g2h_B",
                l -> (square(l.term("x")) * (1.0 + 1.0 / l.term("K_B"))
                                + 2.0 * l.term("x") * (1.0 + (1.0 / l.term("K") + 1.0 / l.term("K_B")) / 2.0))
                        / square(1.0 + l.term("x")));
        check.line(
                "mu_app",
                l -> (l.term("S_A1") + l.term("S_A2"))
                        * (l.term("S_B1") + l.term("S_B2"))
                        / (l.term("C_all") * l.term("f")));
        check.line("eta", l -> Math.pow(10.0, -(l.term("fib_A") + l.term("fib_B")) / 10.0));
        check.line("bpm", l -> -Math.log(1.0 - l.term("eta")) / Math.log(2.0));
        check.line("bound", l -> l.term("bpm") * l.term("modes"));
        assertThat(check.recomputed()).isEqualTo(7);
    }
}
