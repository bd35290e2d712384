package binspan.worksheet;

import static binspan.worksheet.WorksheetChecks.captured;
import static binspan.worksheet.WorksheetChecks.entropy;
import static binspan.worksheet.WorksheetChecks.square;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * What a pulse train computes otherwise than a pulse pair, recomputed from the numbers that the worksheet says it puts
 * in.
 */
final class WorksheetPulseTrainTest {
    private final Worksheet sheet = WorksheetScenarios.sheet(WorksheetScenarios.pulseTrain());
    private final WorksheetChecks check = new WorksheetChecks(sheet);

    @Test
    void timesAndCoherence() {
        check.line("f", l -> 1.0 / l.term("T"));
        check.line("K", l -> 1.0 / Math.sqrt(1.0 - square(l.term("r"))));
        check.line("St_BB", l -> l.term("L_BB") / 4.0 + square(l.term("beta_B")) * l.term("Sigma_BB"));
        check.line("rms_B2", l -> Math.sqrt(l.term("S1_B") + l.term("V_B2")));
        check.line("c_A1(0)", l -> captured(l.term("w"), l.term("late_A"), l.term("rms_A1")));
        check.line("c_A1(1)", l -> captured(l.term("w"), l.term("late_A") + l.term("T"), l.term("rms_A1")));
        check.line("c_A1(-1)", l -> captured(l.term("w"), l.term("late_A") - l.term("T"), l.term("rms_A1")));
        check.line("T_e", l -> l.term("T"));
        check.line("g_pump", l -> Math.exp(-l.term("T_e") / l.term("t_c")));
        check.line("d_A", l -> l.term("T_A") - l.term("T"));
        check.line("T_eff", l -> (l.term("T_A") + l.term("T_B")) / 2.0);
        check.line("v_dr", l -> square(2.0 * Math.PI * l.term("dr") * l.term("T_eff")));
        assertThat(check.recomputed()).isEqualTo(12);
    }

    @Test
    void photonsAndPairsOfAllSlots() {
        check.line("b", l -> l.term("mu") * (1.0 + l.term("mu") / l.term("K")));
        check.line("n_A1(0)", l -> l.term("N_A") * (l.term("sh_A1") + l.term("lo_A1")) * sum(l, "c_A1("));
        check.line(
                "q_B2(0)",
                l -> -Math.expm1(-l.term("d_B2") - l.term("K") * Math.log1p(l.term("n_B2(0)") / l.term("K"))));
        check.line(
                "c_11",
                l -> l.term("b")
                        * ((l.term("sh_A1") * l.term("sh_B1") + l.term("lo_A1") * l.term("lo_B1")) * apart(l, 0)
                                + l.term("sh_A1") * l.term("lo_B1") * apart(l, 1)
                                + l.term("lo_A1") * l.term("sh_B1") * apart(l, -1)));
        check.line(
                "k_11",
                l -> 2.0
                        * l.term("b")
                        * apart(l, 0)
                        * l.term("gamma")
                        * Math.sqrt(l.term("lo_A1") * l.term("lo_B1") * l.term("sh_A1") * l.term("sh_B1")));
        check.line(
                "c_11(0,1)",
                l -> l.term("b")
                        * ((l.term("sh_A1") * l.term("sh_B1") + l.term("lo_A1") * l.term("lo_B1")) * apart(l, -1)
                                + l.term("sh_A1") * l.term("lo_B1") * apart(l, 0)
                                + l.term("lo_A1") * l.term("sh_B1") * apart(l, -2)));
        check.line("C_side", l -> sum(l, "R_"));
        check.line("C_all", l -> l.term("C") + l.term("C_side"));
        assertThat(check.recomputed()).isEqualTo(8);
    }

    /** Sum of the terms whose symbol starts so. */
    private static double sum(WorksheetLine line, String start) {
        List<WorksheetTerm> terms = line.terms();
        return terms.stream()
                .filter(term -> term.symbol().startsWith(start))
                .mapToDouble(WorksheetTerm::value)
                .sum();
    }

    /** Sum of the joint captures whose offsets differ by so many slots. */
    private static double apart(WorksheetLine line, int difference) {
        return line.terms().stream()
                .filter(term -> term.symbol().startsWith("J_"))
                .filter(term -> difference(term.symbol()) == difference)
                .mapToDouble(WorksheetTerm::value)
                .sum();
    }

    private static int difference(String symbol) {
        int comma = symbol.indexOf(',');
        int first = Integer.parseInt(symbol.substring(symbol.indexOf('(') + 1, comma));
        return Integer.parseInt(symbol.substring(comma + 1, symbol.length() - 1)) - first;
    }

    @Test
    void merit() {
        check.line("A_11", l -> l.term("f_11") * l.term("acc_11"));
        check.line("V", l -> (l.term("R_11(max)") - l.term("R_11(min)")) / (l.term("R_11(max)") + l.term("R_11(min)")));
        check.line(
                "V_5",
                l -> 2.0
                        * Math.sqrt(l.term("l1_A") * l.term("l1_B") * l.term("s1_A") * l.term("s1_B"))
                        * l.term("gamma")
                        / (l.term("l1_A") * l.term("l1_B") + l.term("s1_A") * l.term("s1_B")));
        check.line("F_6", l -> l.term("V_6") / l.term("V_5"));
        check.line("sift", l -> l.term("Q_X") / 2.0);
        check.line("h_X", l -> entropy(l.term("e_X")));
        check.line("r_X", l -> Math.max(0.0, 1.0 - l.term("f_EC") * l.term("h_X") - l.term("h_X")));
        check.line("leak", l -> l.term("f_EC") * l.term("h_X") * l.term("n"));
        check.line("x", l -> l.term("mu") / (l.term("h_AB") * l.term("h_BA")));
        check.line("modes", l -> l.term("f") * l.term("K"));
        assertThat(check.recomputed()).isEqualTo(10);
    }
}
