package binspan.planner.viewmodel;

import binspan.planner.report.Figure;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.scenario.Band;
import binspan.scenario.Compensator;
import binspan.scenario.Detector;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.PassbandShape;
import binspan.scenario.PathElement;
import binspan.scenario.PumpMode;
import binspan.scenario.Source;
import binspan.units.Digits;
import java.util.ArrayList;
import java.util.List;

/** The drawn link in words. */
final class LinkWords {
    private static final double PERCENT = 100.0;

    private LinkWords() {}

    static String kind(Kind kind) {
        return Words.of("link.kind." + kind.name());
    }

    static String source(Source source) {
        return Words.of("link.source." + source.pump().mode().text());
    }

    static String brightness(Source source) {
        if (source.pump().mode() == PumpMode.CONTINUOUS) {
            return Figure.statedPairs(source.pairRatePerSecond().orElseThrow());
        }
        String mean = Figure.stated(source.meanPairsPerCycle().orElseThrow(), "");
        boolean train = source.pump().mode() == PumpMode.PULSE_TRAIN;
        return Words.of(train ? "link.perPulse" : "link.perCycle", mean);
    }

    static String centre(Band band) {
        return Digits.decimals(band.centreNm(), 2) + " nm";
    }

    /** The main number of an element; nothing where its loss says everything. */
    static String detail(PathElement element, double dispersionPsPerNm) {
        if (element instanceof FibreSpan span) {
            return span.fibre().text() + " " + kilometres(span.lengthKm());
        }
        if (element instanceof FilterElement filter) {
            String width = Figure.stated(filter.bandwidthFwhmGHz(), "GHz");
            return filter.passband() == PassbandShape.GAUSSIAN
                    ? width
                    : width + " " + filter.passband().text();
        }
        return element instanceof Compensator ? Digits.decimals(dispersionPsPerNm, 0) + " ps/nm" : "";
    }

    /** A length to a tenth of a kilometre, shorter ones finer. */
    static String kilometres(double lengthKm) {
        return lengthKm < 1.0 ? Digits.shortest(lengthKm, 2) + " km" : Digits.decimals(lengthKm, 1) + " km";
    }

    static String detector(Detector detector) {
        String efficiency = Digits.shortest(detector.efficiency() * PERCENT, 3) + " %";
        return detector.detectorClass()
                .map(known -> Words.of("link.detector." + known.text(), efficiency))
                .orElse(efficiency);
    }

    static String losses(double lossDb, double runningDb) {
        return Words.of("link.described.loss", Figure.decibels(lossDb), Figure.decibels(runningDb));
    }

    /** A sentence: "alice, upper duct: fibre span, G.652.D 30.2 km, ..."; empty parts are left out. */
    static String described(Site site, Kind kind, String name, String detail, String losses) {
        List<String> parts = new ArrayList<>();
        if (!name.equals(kind(kind))) {
            parts.add(kind(kind));
        }
        parts.add(detail);
        parts.add(losses);
        parts.removeIf(String::isEmpty);
        String about = String.join(", ", parts);
        return Words.of(about.isEmpty() ? "link.described.bare" : "link.described", site.path(), name, about);
    }
}
