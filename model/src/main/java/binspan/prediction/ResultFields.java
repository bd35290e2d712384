package binspan.prediction;

import binspan.counting.DetectorLoad;
import binspan.counting.LinkCounts;
import binspan.merit.PhotonStatistics;
import binspan.merit.RepeaterlessBound;
import binspan.optics.OpticalPath;
import binspan.optics.PairSpectrum;
import binspan.prediction.ResultField.Stage;
import binspan.units.Decibels;
import binspan.units.Scale;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** The registry of result fields, in the order of the result. */
public final class ResultFields {
    private static final double NOT_APPLICABLE = Double.NaN;

    /** All figures of a check. */
    public static final List<ResultField> ALL = all();

    private ResultFields() {}

    private static List<ResultField> all() {
        List<ResultField> fields = new ArrayList<>();
        source(fields);
        arm(fields, "alice", true);
        arm(fields, "bob", false);
        coincidence(fields);
        merit(fields);
        key(fields);
        return List.copyOf(fields);
    }

    private static void source(List<ResultField> fields) {
        optical(fields, "source.cyclesPerSecond", "1/s", LinkPrediction::cyclesPerSecond);
        optical(
                fields,
                "source.schmidtNumber",
                "",
                p -> p.scenario().pulsed() ? p.spectrum().schmidtNumber() : NOT_APPLICABLE);
        counted(fields, "source.apparentMeanPairs", "", ResultFields::apparentMeanPairs);
    }

    private static void arm(List<ResultField> fields, String name, boolean alice) {
        optical(fields, name + ".lossDb", "dB", p -> path(p, alice).lossDb());
        optical(fields, name + ".fibreLossDb", "dB", p -> path(p, alice).fibreLossDb());
        optical(
                fields,
                name + ".dispersionPsPerNm",
                "ps/nm",
                p -> path(p, alice).dispersionPsPerNm());
        optical(
                fields,
                name + ".arrivalRmsPs",
                "ps",
                p -> p.scenario().pulsed() ? p.arrivalRms(alice) / Scale.PICO : NOT_APPLICABLE);
        optical(fields, name + ".delayErrorPs", "ps", p -> late(p, alice) / Scale.PICO);
        perPort(
                fields,
                name + ".singlesPerSecond",
                "1/s",
                (p, finite, port) -> loads(p, alice).get(port).recordedPerSecond());
        perPort(
                fields,
                name + ".liveFraction",
                "",
                (p, finite, port) -> loads(p, alice).get(port).liveFraction());
        counted(fields, name + ".backgroundPerSecond", "1/s", p -> background(loads(p, alice)));
        counted(
                fields,
                name + ".coincidencesPerSingle",
                "",
                p -> p.counts().central().mean() / LinkCounts.recorded(loads(p, alice)));
        optical(fields, name + ".partnerPassProbability", "", p -> partnerPass(p.spectrum(), alice));
        optical(
                fields,
                name + ".unheraldedG2",
                "",
                p -> p.scenario().pulsed() ? PairSpectrum.unheraldedG2(modes(p, alice)) : NOT_APPLICABLE);
        counted(fields, name + ".heraldedG2", "", p -> p.scenario().pulsed() ? heraldedG2(p, alice) : NOT_APPLICABLE);
    }

    private static void coincidence(List<ResultField> fields) {
        counted(fields, "coincidence.fringeMaxPerSecond", "1/s", p -> p.fringe().maxPerSecond());
        counted(fields, "coincidence.fringeMinPerSecond", "1/s", p -> p.fringe().minPerSecond());
        counted(
                fields,
                "coincidence.accidentalPerSecond",
                "1/s",
                p -> p.fringe().accidentalPerSecond());
        counted(
                fields,
                "coincidence.allPortsPerSecond",
                "1/s",
                p -> p.counts().central().mean());
        counted(fields, "coincidence.sidePerSecond", "1/s", p -> p.counts().sidePerSecond());
        counted(fields, "coincidence.car", "", p -> p.fringe().car());
        optical(
                fields,
                "coincidence.correlationRmsPs",
                "ps",
                p -> p.scenario().pulsed() ? NOT_APPLICABLE : p.correlationRms() / Scale.PICO);
    }

    private static void merit(List<ResultField> fields) {
        counted(fields, "visibility.raw", "", p -> p.fringe().raw());
        counted(fields, "visibility.net", "", p -> p.fringe().net());
        counted(fields, "visibility.sigma", "", LinkPrediction::visibilitySigma);
        counted(fields, "visibility.countsPerPoint", "", LinkPrediction::countsPerPoint);
        counted(fields, "bell.chsh", "", p -> p.bell().chsh());
        counted(fields, "bell.sigma", "", p -> p.bell().sigma(p.uptime()));
        counted(fields, "bell.secondsToThreeSigma", "s", p -> p.bell().secondsTo(3.0) / p.uptimeShare());
        counted(fields, "bell.secondsToFiveSigma", "s", p -> p.bell().secondsTo(Requirement.FIVE) / p.uptimeShare());
        counted(fields, "qber.phase", "", p -> p.key().errors().phase());
        counted(fields, "qber.time", "", p -> p.key().errors().time());
    }

    private static void key(List<ResultField> fields) {
        counted(fields, "key.siftedPhaseBps", "bit/s", p -> p.key().siftedPhasePerSecond());
        counted(fields, "key.siftedTimeBps", "bit/s", p -> p.key().siftedTimePerSecond());
        counted(fields, "key.asymptoticBps", "bit/s", p -> p.key().asymptoticPerSecond());
        fields.add(
                new ResultField("key.finiteBits", "bit", false, Stage.FINITE_KEY, (p, finite, port) -> finite.bits()));
        fields.add(new ResultField(
                "key.finiteBps", "bit/s", false, Stage.FINITE_KEY, (p, finite, port) -> finite.bitsPerSecond()));
        fields.add(new ResultField(
                "key.secondsToFirstKey",
                "s",
                false,
                Stage.FINITE_KEY,
                (p, finite, port) -> finite.secondsToFirstKey()));
        optical(fields, "key.repeaterlessBoundBps", "bit/s", ResultFields::repeaterlessBound);
    }

    private static void optical(
            List<ResultField> fields, String name, String unit, ToDoubleFunction<LinkPrediction> reading) {
        add(fields, name, unit, Stage.OPTICS, reading);
    }

    private static void counted(
            List<ResultField> fields, String name, String unit, ToDoubleFunction<LinkPrediction> reading) {
        add(fields, name, unit, Stage.COUNTS, reading);
    }

    private static void add(
            List<ResultField> fields, String name, String unit, Stage stage, ToDoubleFunction<LinkPrediction> reading) {
        fields.add(new ResultField(name, unit, false, stage, (p, finite, port) -> reading.applyAsDouble(p)));
    }

    private static void perPort(List<ResultField> fields, String name, String unit, ResultField.Reading reading) {
        fields.add(new ResultField(name, unit, true, Stage.COUNTS, reading));
    }

    private static OpticalPath path(LinkPrediction p, boolean alice) {
        return alice ? p.pathA() : p.pathB();
    }

    private static List<DetectorLoad> loads(LinkPrediction p, boolean alice) {
        return alice ? p.counts().loadsA() : p.counts().loadsB();
    }

    private static double late(LinkPrediction p, boolean alice) {
        return alice
                ? LinkPrediction.late(p.scenario().alice(), p.pathA())
                : LinkPrediction.late(p.scenario().bob(), p.pathB());
    }

    private static double background(List<DetectorLoad> loads) {
        double sum = 0.0;
        for (DetectorLoad load : loads) {
            sum += load.backgroundPerSecond();
        }
        return sum;
    }

    /** Probability that the partner of an arm's photon passes its own filters. */
    private static double partnerPass(PairSpectrum spectrum, boolean alice) {
        return alice ? spectrum.bobPassesGivenAlice() : spectrum.alicePassesGivenBob();
    }

    private static double modes(LinkPrediction p, boolean alice) {
        return alice ? p.spectrum().armSchmidtA() : p.spectrum().armSchmidtB();
    }

    private static double heraldedG2(LinkPrediction p, boolean alice) {
        double pass = p.spectrum().alicePassesGivenBob() * p.spectrum().bobPassesGivenAlice();
        return PhotonStatistics.heraldedG2(p.binPairs(), pass, p.spectrum().schmidtNumber(), modes(p, alice));
    }

    private static double apparentMeanPairs(LinkPrediction p) {
        return PhotonStatistics.apparentMeanPairs(
                LinkCounts.recorded(p.counts().loadsA()),
                LinkCounts.recorded(p.counts().loadsB()),
                p.counts().allSlotsPerSecond(),
                p.cyclesPerSecond());
    }

    private static double repeaterlessBound(LinkPrediction p) {
        double transmittance =
                Decibels.transmittance(p.pathA().fibreLossDb() + p.pathB().fibreLossDb());
        return RepeaterlessBound.bitsPerMode(transmittance) * p.modesPerSecond();
    }
}
