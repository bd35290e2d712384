package binspan.prediction.histogram;

import static binspan.scenario.SampleScenarios.part;

import binspan.prediction.LinkPrediction;
import binspan.prediction.LinkPredictor;
import binspan.scenario.PassbandShape;
import binspan.scenario.SampleScenarios;
import binspan.scenario.Values;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;

/** Links of all kinds whose histograms are tested: pump modes, filters, tails, gates, ports, lateness. */
final class HistogramLinks {
    private static final List<String> ARMS = List.of("alice", "bob");

    private HistogramLinks() {}

    /** All of them by name. */
    static Map<String, LinkPrediction> all() {
        Map<String, Supplier<Values>> modes = new LinkedHashMap<>();
        modes.put("pulse pair", SampleScenarios::pulsePair);
        modes.put("pulse train", SampleScenarios::pulseTrain);
        modes.put("continuous", SampleScenarios::continuous);
        Map<String, LinkPrediction> links = new LinkedHashMap<>();
        modes.forEach((mode, stated) -> {
            links.put(mode, predicted(stated.get()));
            links.put(mode + ", late", predicted(late(stated.get())));
            links.put(mode + ", tailed", predicted(tailed(stated.get())));
            links.put(mode + ", flat tops", predicted(flat(stated.get())));
            links.put(mode + ", flat tops and tails", predicted(late(tailed(flat(stated.get())))));
            links.put(mode + ", mixed filters", predicted(mixed(stated.get())));
            links.put(mode + ", one port and uneven paths", predicted(uneven(stated.get())));
            links.put(mode + ", noisy", predicted(noisy(stated.get())));
            links.put(mode + ", bright", predicted(bright(stated.get())));
        });
        links.put("pulse pair, gated", predicted(gated(SampleScenarios.pulsePair())));
        links.put("pulse train, gated", predicted(gated(SampleScenarios.pulseTrain())));
        links.put("everything", predicted(SampleScenarios.everything()));
        return links;
    }

    static LinkPrediction predicted(Values stated) {
        return LinkPredictor.predict(SampleScenarios.build(stated));
    }

    static Values tailed(Values stated) {
        return detectors(stated, "jitterTailFraction", 0.3, "jitterTailPs", 150.0);
    }

    static Values flat(Values stated) {
        for (String band : List.of("signal", "idler")) {
            part(stated, "source." + band).put("passband", PassbandShape.FLAT_TOP);
        }
        return stated;
    }

    private static Values mixed(Values stated) {
        part(stated, "source.signal").put("passband", PassbandShape.FLAT_TOP);
        return stated;
    }

    static Values late(Values stated) {
        part(stated, "alice").put("delayErrorPs", 40.0);
        part(stated, "bob").put("delayErrorPs", -65.0).put("clockJitterRmsPs", 20.0);
        return stated;
    }

    private static Values uneven(Values stated) {
        part(stated, "alice")
                .put(
                        "detectors",
                        List.of(part(stated, "alice").list("detectors").get(0)));
        part(stated, "alice.analyzer").put("inputShortFraction", 0.4).put("longPathExtraLossDb", 1.0);
        part(stated, "bob.analyzer").put("outputShortToPort1", 0.6).put("mismatchPs", 1.0);
        part(stated, "bob.detectors[1]").put("efficiency", 0.6);
        return stated;
    }

    private static Values noisy(Values stated) {
        return detectors(stated, "darkCountsPerSecond", 2e4, "afterpulseProbability", 0.05);
    }

    private static Values bright(Values stated) {
        Values source = part(stated, "source");
        return source.has("pairRatePerSecond")
                ? stated.put("source", source.put("pairRatePerSecond", 1e9))
                : stated.put("source", source.put("meanPairsPerCycle", 0.3));
    }

    private static Values gated(Values stated) {
        Values detector =
                new Values().put("efficiency", 0.2).put("jitterFwhmPs", 60.0).put("deadTimeNs", 1000.0);
        detector.put("afterpulseProbability", 0.03)
                .put("gate", new Values().put("widthNs", 0.25).put("darkProbability", 2e-5));
        for (String arm : ARMS) {
            part(stated, arm).put("detectors", List.of(detector, detector));
        }
        return stated;
    }

    private static Values detectors(Values stated, String first, double one, String second, double two) {
        for (String arm : ARMS) {
            part(stated, arm)
                    .list("detectors")
                    .forEach(detector -> detector.put(first, one).put(second, two));
        }
        return stated;
    }
}
