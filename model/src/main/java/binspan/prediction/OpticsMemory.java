package binspan.prediction;

import binspan.optics.CaptureInputs;
import binspan.optics.OpticalPath;
import binspan.optics.OpticalPaths;
import binspan.optics.PairSpectra;
import binspan.optics.PairSpectrum;
import binspan.optics.PathInputs;
import binspan.optics.SlotCaptures;
import binspan.optics.SlotCapturing;
import binspan.optics.SpectrumInputs;
import binspan.scenario.Scenario;

/** The last result of each optical stage with the inputs it came from. */
final class OpticsMemory {
    private SpectrumInputs spectrumInputs;
    private PairSpectrum spectrum;
    private PathInputs aliceInputs;
    private OpticalPath alice;
    private PathInputs bobInputs;
    private OpticalPath bob;
    private CaptureInputs captureInputs;
    private SlotCaptures captures;

    PairSpectrum spectrum(Scenario scenario) {
        SpectrumInputs inputs = SpectrumInputs.of(scenario);
        if (spectrumInputs == null || !inputs.same(spectrumInputs)) {
            spectrum = PairSpectra.of(inputs);
            spectrumInputs = inputs;
        }
        return spectrum;
    }

    OpticalPath alice(Scenario scenario) {
        PathInputs inputs = PathInputs.of(scenario, scenario.alice());
        if (aliceInputs == null || !inputs.same(aliceInputs)) {
            alice = OpticalPaths.of(inputs);
            aliceInputs = inputs;
        }
        return alice;
    }

    OpticalPath bob(Scenario scenario) {
        PathInputs inputs = PathInputs.of(scenario, scenario.bob());
        if (bobInputs == null || !inputs.same(bobInputs)) {
            bob = OpticalPaths.of(inputs);
            bobInputs = inputs;
        }
        return bob;
    }

    SlotCaptures captures(CaptureInputs inputs) {
        if (captureInputs == null || !inputs.same(captureInputs)) {
            captures = SlotCapturing.of(inputs);
            captureInputs = inputs;
        }
        return captures;
    }
}
