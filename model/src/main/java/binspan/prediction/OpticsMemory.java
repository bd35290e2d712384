package binspan.prediction;

import binspan.optics.ArrivalTime;
import binspan.optics.CaptureInputs;
import binspan.optics.Imbalances;
import binspan.optics.PairSpectra;
import binspan.optics.PairSpectrum;
import binspan.optics.SlotCaptures;
import binspan.optics.SlotCapturing;
import binspan.optics.SpectrumInputs;
import binspan.optics.TwoPhotonCoherence;
import binspan.scenario.PumpMode;
import binspan.scenario.Scenario;
import binspan.scenario.Source;
import binspan.units.Scale;

/**
 * The optics of the last scenario, of which each stage is reused while what it depends on stays the same object or number: an edited scenario shares all
 * unchanged parts with the one it came from.
 */
@SuppressWarnings("ReferenceEquality") // identity is enough here and quicker than comparing the parts
final class OpticsMemory {
    private final ArmMemory alice = new ArmMemory();
    private final ArmMemory bob = new ArmMemory();
    private Scenario last;
    private SpectrumInputs spectrumInputs;
    private PairSpectrum spectrum;
    private Imbalances imbalances;
    private TwoPhotonCoherence coherence;
    private SlotCaptures captures;
    private LinkOptics optics;

    /** The optics of a scenario. */
    LinkOptics of(Scenario scenario) {
        boolean sameSource = last != null && sameLight(scenario.source(), last.source());
        boolean sameArms = last != null && scenario.alice() == last.alice() && scenario.bob() == last.bob();
        if (!sameSource || !sameArms || !sameTiming(scenario)) {
            optics = renewed(scenario, sameSource && sameArms);
        }
        last = scenario;
        return optics;
    }

    private boolean sameTiming(Scenario scenario) {
        return scenario.imbalanceNs() == last.imbalanceNs() && scenario.timing() == last.timing();
    }

    /** Whether two sources give the same light but for its brightness. */
    private static boolean sameLight(Source source, Source other) {
        return source == other
                || (source.pump() == other.pump()
                        && source.signal() == other.signal()
                        && source.idler() == other.idler()
                        && source.schmidtNumber() == other.schmidtNumber()
                        && source.unheraldedG2() == other.unheraldedG2()
                        && source.partnerPassProbability() == other.partnerPassProbability());
    }

    private LinkOptics renewed(Scenario scenario, boolean sameSpectrum) {
        if (!sameSpectrum) {
            spectrum(scenario);
        }
        LinkOptics.ArmOptics armA = alice.of(scenario, scenario.alice());
        LinkOptics.ArmOptics armB = bob.of(scenario, scenario.bob());
        coherence(scenario, sameSpectrum);
        if (!scenario.pulsed()) {
            return new LinkOptics(spectrum, armA, armB, imbalances, coherence, null, arrival(armA, armB));
        }
        captures(scenario, armA, armB);
        return new LinkOptics(spectrum, armA, armB, imbalances, coherence, captures, captures.arrival());
    }

    private void spectrum(Scenario scenario) {
        SpectrumInputs inputs = SpectrumInputs.of(scenario);
        if (spectrumInputs == null || !inputs.same(spectrumInputs)) {
            spectrum = PairSpectra.of(inputs);
            spectrumInputs = inputs;
        }
    }

    /** The coherence is that of the last scenario if its source, its arms' analyzers and the imbalance are; it is quick to compute otherwise. */
    private void coherence(Scenario scenario, boolean sameSourceAndArms) {
        if (!sameSourceAndArms || scenario.imbalanceNs() != last.imbalanceNs()) {
            imbalances = Imbalances.of(scenario);
            coherence = TwoPhotonCoherence.of(scenario, spectrum, imbalances);
        }
    }

    /** With a continuous pump: the last one where the spectrum and both dispersions are the same. */
    private ArrivalTime arrival(LinkOptics.ArmOptics armA, LinkOptics.ArmOptics armB) {
        double betaA = armA.path().groupDelayDispersion();
        double betaB = armB.path().groupDelayDispersion();
        boolean same = optics != null
                && optics.spectrum() == spectrum
                && optics.alice().path().groupDelayDispersion() == betaA
                && optics.bob().path().groupDelayDispersion() == betaB;
        return same ? optics.arrival() : ArrivalTime.of(spectrum, betaA, betaB);
    }

    private void captures(Scenario scenario, LinkOptics.ArmOptics armA, LinkOptics.ArmOptics armB) {
        CaptureInputs inputs = new CaptureInputs(
                spectrum,
                armA.path().groupDelayDispersion(),
                armB.path().groupDelayDispersion(),
                armA.ports(),
                armB.ports(),
                scenario.timing().windowWidthPs() * Scale.PICO,
                imbalances.common(),
                LinkPrediction.late(scenario.alice(), armA.path()),
                LinkPrediction.late(scenario.bob(), armB.path()),
                scenario.source().pump().mode() == PumpMode.PULSE_TRAIN);
        if (captures == null || !inputs.same(captures.inputs())) {
            captures = SlotCapturing.of(inputs, captures);
        }
    }
}
