package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** The words of the file format. */
final class ChoiceTest {

    @Test
    void wordsAreThoseOfTheFileFormat() {
        assertThat(Choice.texts(PumpMode.class)).containsExactly("continuous", "pulse-pair", "pulse-train");
        assertThat(Choice.texts(Preparation.class)).containsExactly("interferometer", "modulator");
        assertThat(Choice.texts(Lineshape.class)).containsExactly("lorentzian", "gaussian");
        assertThat(Choice.texts(PassbandShape.class)).containsExactly("gaussian", "flat-top");
        assertThat(Choice.texts(Photon.class)).containsExactly("signal", "idler");
        assertThat(Choice.texts(Direction.class)).containsExactly("forward", "backward");
        assertThat(Choice.texts(SpreadShape.class)).containsExactly("normal", "uniform", "triangular");
        assertThat(Choice.texts(DetectorClass.class)).contains("snspd").doesNotHaveDuplicates();
    }
}
