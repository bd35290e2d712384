package binspan.scenario;

import java.util.List;

/**
 * One arm of the link with the site at its end.
 *
 * @param photon which photon of the pair travels here
 * @param sourceCouplingLossDb loss from inside the passband to the first path element, dB
 * @param path elements from the source to the analyzer
 * @param repairMarginDb loss set aside for later splices, dB
 * @param analyzer unbalanced interferometer
 * @param detectors one per detected output port, one or two
 * @param clockJitterRmsPs jitter of the site clock against the source, ps rms
 * @param tagBinPs bin width of the time tagger, ps
 * @param delayErrorPs how late the photons arrive against the windows, ps
 */
public record Arm(
        Photon photon,
        double sourceCouplingLossDb,
        List<PathElement> path,
        double repairMarginDb,
        Analyzer analyzer,
        List<Detector> detectors,
        double clockJitterRmsPs,
        double tagBinPs,
        double delayErrorPs) {

    public Arm {
        path = List.copyOf(path);
        detectors = List.copyOf(detectors);
    }
}
