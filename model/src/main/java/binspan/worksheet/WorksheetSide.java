package binspan.worksheet;

import binspan.counting.ArmLight;
import binspan.counting.DetectorLoad;
import binspan.optics.OpticalPath;
import binspan.optics.Passband;
import binspan.optics.PortTiming;
import binspan.prediction.LinkPrediction;
import binspan.scenario.Arm;
import binspan.scenario.Band;
import binspan.scenario.Photon;
import binspan.scenario.Scenario;
import java.util.List;

/**
 * One arm as the worksheet sees it.
 *
 * @param letter suffix of its symbols, A or B
 * @param name name of the arm in scenario paths
 * @param prediction the prediction
 */
record WorksheetSide(String letter, String name, LinkPrediction prediction) {
    static WorksheetSide alice(LinkPrediction prediction) {
        return new WorksheetSide("A", "alice", prediction);
    }

    static WorksheetSide bob(LinkPrediction prediction) {
        return new WorksheetSide("B", "bob", prediction);
    }

    boolean isAlice() {
        return letter.equals("A");
    }

    Scenario scenario() {
        return prediction.scenario();
    }

    Arm arm() {
        return isAlice() ? scenario().alice() : scenario().bob();
    }

    Band band() {
        return scenario().bandOf(arm());
    }

    /** Scenario path of the arm's filter band. */
    String bandPath() {
        return arm().photon() == Photon.SIGNAL ? "source.signal" : "source.idler";
    }

    Passband filters() {
        return isAlice() ? prediction.spectrum().alice() : prediction.spectrum().bob();
    }

    OpticalPath path() {
        return isAlice() ? prediction.pathA() : prediction.pathB();
    }

    List<PortTiming> ports() {
        return isAlice() ? prediction.portsA() : prediction.portsB();
    }

    ArmLight light() {
        return isAlice() ? prediction.counts().alice() : prediction.counts().bob();
    }

    List<DetectorLoad> loads() {
        return isAlice() ? prediction.counts().loadsA() : prediction.counts().loadsB();
    }

    double late() {
        return LinkPrediction.late(arm(), path());
    }

    /** A symbol of this arm, for example {@code s_A}. */
    String of(String symbol) {
        return symbol + "_" + letter;
    }

    /** A symbol of an element or port of this arm, counted from 1. */
    String of(String symbol, int index) {
        return symbol + "_" + letter + (index + 1);
    }

    /** A symbol of this arm inside a formula. */
    String in(String symbol) {
        return "{" + of(symbol) + "}";
    }

    /** A symbol of an element or port of this arm inside a formula. */
    String in(String symbol, int index) {
        return "{" + of(symbol, index) + "}";
    }
}
