package binspan.worksheet;

import static binspan.scenario.SampleScenarios.part;
import static binspan.worksheet.WorksheetChecks.FWHM_PER_RMS;
import static binspan.worksheet.WorksheetChecks.LIGHT;
import static binspan.worksheet.WorksheetChecks.square;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import binspan.scenario.PassbandShape;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;

/** Forms of the physics that not every link needs: flat-top filters, classical light, measured statistics, gates. */
final class WorksheetVariantsTest {
    private static final double PLANCK = 6.62607015e-34;

    @Test
    void flatTopAndGaussianInOneArm() {
        WorksheetChecks check = new WorksheetChecks(WorksheetScenarios.sheet(WorksheetScenarios.flatTops()));
        check.line("a_A1", l -> Math.PI * l.term("B_A1"));
        check.line("s_A2", l -> 2.0 * Math.PI * l.term("B_A2") / FWHM_PER_RMS);
        check.line("v_A", l -> {
            double x = l.term("x_A");
            double cut = Math.sqrt(2.0 / Math.PI) * x * Math.exp(-x * x / 2.0) / Erf.erf(x / Math.sqrt(2.0));
            return square(l.term("s_A")) * (1.0 - cut);
        });
        check.line("v_B", l -> square(l.term("a_B")) / 3.0);
        check.line("h_AB", l -> l.term("h_BA") * l.term("F_A") / l.term("F_B"));
        assertThat(check.recomputed()).isEqualTo(5);
    }

    @Test
    void twoFlatTopsWithAPulse() {
        Values stated = SampleScenarios.pulsePair();
        part(stated, "source.signal").put("passband", PassbandShape.FLAT_TOP);
        part(stated, "source.idler").put("passband", PassbandShape.FLAT_TOP).put("bandwidthFwhmGHz", 60.0);
        WorksheetChecks check = new WorksheetChecks(WorksheetScenarios.sheet(stated));
        check.line(
                "h_BA",
                l -> l.term("s_P")
                        / (2.0 * l.term("a_A"))
                        * (ramp(l.term("y_1")) + ramp(-l.term("y_1")) - ramp(l.term("y_2")) - ramp(-l.term("y_2"))));
        check.line("X_B1", l -> 2.0 * l.term("a_B") * Math.abs(l.term("beta_B")));
        check.line("blur_B1", l -> Math.sqrt((1.0 / l.term("v_B") + l.term("L_AB")) / 4.0 + l.term("V_B1")));
        check.line(
                "c_B1(0)",
                l -> box(l.term("w") / 2.0 - l.term("late_B"), l.term("X_B1"), l.term("blur_B1"))
                        - box(-l.term("w") / 2.0 - l.term("late_B"), l.term("X_B1"), l.term("blur_B1")));
        assertThat(check.recomputed()).isEqualTo(4);
    }

    private static double box(double z, double width, double sigma) {
        return sigma / width * (ramp((z + width / 2.0) / sigma) - ramp((z - width / 2.0) / sigma));
    }

    /** I(y) = y Phi(y) + phi(y). */
    private static double ramp(double y) {
        return y * Erf.erfc(-y / Math.sqrt(2.0)) / 2.0 + Math.exp(-y * y / 2.0) / Math.sqrt(2.0 * Math.PI);
    }

    @Test
    void twoFlatTopsWithAContinuousPump() {
        Values stated = SampleScenarios.continuous();
        part(stated, "source.signal").put("passband", PassbandShape.FLAT_TOP);
        part(stated, "source.idler").put("passband", PassbandShape.FLAT_TOP).put("bandwidthFwhmGHz", 60.0);
        WorksheetChecks check = new WorksheetChecks(WorksheetScenarios.sheet(stated));
        check.line("Sigma_AA", l -> square(Math.min(l.term("a_A"), l.term("a_B"))) / 3.0);
        check.line("h_AB", l -> Math.min(l.term("a_A"), l.term("a_B")) / l.term("a_B"));
        check.line(
                "C_11(0)",
                l -> box(l.term("w") / 2.0, l.term("X_11"), l.term("blur_11"))
                        - box(-l.term("w") / 2.0, l.term("X_11"), l.term("blur_11")));
        check.line("modes", l -> Math.min(l.term("a_A"), l.term("a_B")) / Math.PI);
        assertThat(check.recomputed()).isEqualTo(4);
    }

    @Test
    void classicalLightAndCompensator() {
        WorksheetChecks check = new WorksheetChecks(WorksheetScenarios.sheet(WorksheetScenarios.flatTops()));
        check.line("P0_A1", l -> 1e-3 * Math.pow(10.0, l.term("dBm_A1") / 10.0));
        check.line("a_c_A1", l -> Math.log(10.0) / 10.0 * l.term("alpha_c_A1"));
        check.line("dl_A1", l -> square(l.term("lambda_A") * 1e-9) * l.term("B_n_A1") / LIGHT * 1e9);
        check.line(
                "P_r_A1",
                l -> l.term("P0_A1")
                        * l.term("rho_A1")
                        * l.term("dl_A1")
                        * (Math.exp(-l.term("a_c_A1") * l.term("L_A1")) - Math.exp(-l.term("a_q_A1") * l.term("L_A1")))
                        / (l.term("a_q_A1") - l.term("a_c_A1")));
        check.line(
                "P_r_A2",
                l -> l.term("P0_A2")
                        * l.term("rho_A2")
                        * l.term("dl_A1")
                        * (1.0 - Math.exp(-(l.term("a_c_A2") + l.term("a_q_A1")) * l.term("L_A1")))
                        / (l.term("a_c_A2") + l.term("a_q_A1")));
        check.line("ram_A1", l -> l.term("P_r_A1") / (PLANCK * l.term("nu_A")));
        check.line(
                "leak_A1",
                l -> l.term("P0_A1")
                        * Math.exp(-l.term("a_c_A1") * l.term("L_A1"))
                        * l.term("lambda_c_A1")
                        * 1e-9
                        / (PLANCK * LIGHT)
                        * Math.pow(10.0, -l.term("iso_A1") / 10.0));
        check.line("st_A2", l -> l.term("ram_A2") * Math.pow(10.0, -l.term("aft_A1") / 10.0));
        check.line("stray_A", l -> l.term("st_A1") + l.term("st_A2"));
        check.line("DL_B2", l -> -l.term("cs_B2") * l.term("D_fib_B"));
        check.line("loss_B2", l -> l.term("l0_B2") + Math.abs(l.term("DL_B2")) / l.term("fom_B2"));
        check.line("D_B", l -> l.term("DL_B1") + l.term("DL_B2"));
        assertThat(check.recomputed()).isEqualTo(12);
    }

    @Test
    void gatesMeasuredStatisticsAndOtherFibres() {
        Worksheet sheet = WorksheetScenarios.sheet(WorksheetScenarios.gated());
        WorksheetChecks check = new WorksheetChecks(sheet);
        check.line("K_m", l -> 1.0 / (l.term("g2_m") - 1.0));
        check.line("p", l -> l.term("v_A") / (square(l.term("K_m")) - 1.0));
        check.line("K_B", l -> Math.sqrt(1.0 + l.term("v_B") / l.term("p")));
        check.line("D_A1", l -> (l.term("Dlow_A1") + l.term("Dhigh_A1")) / 2.0);
        check.line("D_B1", l -> l.term("D0_B1") + l.term("S0_B1") * (l.term("lambda_B") - l.term("l0_B1")));
        check.line("du_B1", l -> Math.min(1.0, l.term("fg_B1") * l.term("wg_B1")));
        check.line("gs_B1", l -> Math.min(1.0, l.term("fg_B1") / (3.0 * l.term("f"))));
        check.line("dk_B1", l -> l.term("pd_B1") / l.term("wg_B1") * l.term("du_B1"));
        check.line("d_B1", l -> l.term("nd_B1") * Math.min(l.term("w"), l.term("wg_B1")));
        check.line("f_11", l -> l.term("f") * l.term("jl_11") * l.term("gs_B1"));
        assertThat(check.recomputed()).isEqualTo(10);
        assertThat(sheet.line("h_BA").input()).isTrue();
        assertThat(sheet.line("loss_A1").input()).isTrue();
    }

    @Test
    void missedEnergyCostsPairs() {
        Values stated = SampleScenarios.pulsePair();
        part(stated, "source.pump").put("wavelengthNm", 774.9);
        WorksheetChecks check = new WorksheetChecks(WorksheetScenarios.sheet(stated));
        check.line("nu_P", l -> LIGHT / (l.term("lambda_P") * 1e-9));
        check.line(
                "D_m",
                l -> Math.exp(-square(2.0 * Math.PI * l.term("m"))
                        / (2.0 * (l.term("v_A") + l.term("v_B") + square(l.term("s_P"))))));
        check.line(
                "h_BA",
                l -> l.term("D_m")
                        * Math.sqrt(l.term("v_B") / (l.term("v_A") + l.term("v_B") + square(l.term("s_P")))));
        assertThat(check.recomputed()).isEqualTo(3);
    }

    @Test
    void measuredG2OfOneMeansPoissonianClicks() {
        Values stated = SampleScenarios.pulsePair();
        part(stated, "source").put("unheraldedG2", 1.0);
        Worksheet sheet = WorksheetScenarios.sheet(stated);
        assertThat(sheet.line("K").value()).isInfinite();
        assertThat(sheet.line("K").valueText()).isEqualTo("infinite");
        WorksheetChecks check = new WorksheetChecks(sheet);
        check.line("q_A1(1)", l -> -Math.expm1(-l.term("d_A1") - l.term("n_A1(1)")));
        check.line(
                "R_11(max)",
                l -> l.term("f_11")
                        * (l.term("acc_11")
                                + l.term("sil_11") * Math.expm1(l.term("c_11") + l.term("k_11") * l.term("cos_max"))));
        assertThat(check.recomputed()).isEqualTo(2);
    }

    @Test
    void narrowBoxIsAGaussianThatTakesItIn() {
        Values stated = SampleScenarios.continuous();
        part(stated, "source.signal").put("passband", PassbandShape.FLAT_TOP);
        part(stated, "source.idler").put("passband", PassbandShape.FLAT_TOP);
        part(stated, "alice.path[0]").put("lengthKm", 0.001);
        part(stated, "bob.path[0]").put("lengthKm", 0.001);
        WorksheetLine line = WorksheetScenarios.sheet(stated).line("C_11(0)");
        double rms = Math.sqrt(square(line.term("blur_11")) + square(line.term("X_11")) / 12.0);
        assertThat(line.formula()).contains("erf");
        assertThat(line.value()).isCloseTo(WorksheetChecks.captured(line.term("w"), 0.0, rms), within(1e-12));
    }
}
