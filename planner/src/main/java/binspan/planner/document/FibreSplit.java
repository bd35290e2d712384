package binspan.planner.document;

import binspan.optics.FibreOptics;
import binspan.planner.document.Change.Insert;
import binspan.planner.document.Change.Put;
import binspan.scenario.ClassicalChannel;
import binspan.scenario.Content;
import binspan.scenario.Direction;
import binspan.scenario.FibreSpan;
import binspan.scenario.Field;
import binspan.scenario.Range;
import binspan.scenario.ScenarioSections;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A fibre span cut in two. */
final class FibreSplit {
    /** Digits that spare the file endings such as 14.700000000000001 and change nothing that could be measured. */
    private static final MathContext DIGITS = new MathContext(14);

    private final String list;
    private final int index;
    private final FibreSpan span;
    private final double firstKm;
    private final double secondKm;

    FibreSplit(String list, int index, FibreSpan span, double atKm) {
        this.list = list;
        this.index = index;
        this.span = span;
        if (!Range.between(0.0, span.lengthKm()).contains(atKm)) {
            throw new IllegalArgumentException(list + "[" + index + "]: found a cut at " + Range.plain(atKm)
                    + " km; allowed " + Range.between(0.0, span.lengthKm()).text("km"));
        }
        firstKm = atKm;
        secondKm = rounded(span.lengthKm() - atKm);
    }

    /** The changes of the first span and the second, with its label, behind it. */
    List<Change> changes(String label) {
        List<Change> changes = new ArrayList<>();
        String at = list + "[" + index + "]";
        changes.add(new Put(at + ".lengthKm", firstKm));
        shares(firstKm).forEach((name, value) -> changes.add(new Put(at + "." + name, value)));
        for (int i = 0; i < span.classicalChannels().size(); i++) {
            ClassicalChannel channel = span.classicalChannels().get(i);
            if (channel.direction() == Direction.BACKWARD) {
                changes.add(new Put(at + ".classicalChannels[" + i + "].launchDbm", arriving(channel, secondKm)));
            }
        }
        changes.add(new Insert(list, index + 1, second(label)));
        return changes;
    }

    private Map<String, Object> second(String label) {
        Map<String, Object> second = new LinkedHashMap<>();
        StatedFields.of(elements(), span).forEach((name, value) -> {
            second.put(name, value);
            if (name.equals("type")) {
                second.put("label", label);
            }
        });
        second.put("label", label);
        second.put("lengthKm", secondKm);
        second.putAll(shares(secondKm));
        if (second.get("classicalChannels") instanceof List<?> channels) {
            second.put("classicalChannels", continued(channels));
        }
        return second;
    }

    private List<Object> continued(List<?> channels) {
        List<Object> continued = new ArrayList<>();
        for (int i = 0; i < channels.size(); i++) {
            Map<Object, Object> channel = new LinkedHashMap<>((Map<?, ?>) channels.get(i));
            ClassicalChannel light = span.classicalChannels().get(i);
            channel.put("direction", light.direction().text());
            if (light.direction() == Direction.FORWARD) {
                channel.put("launchDbm", arriving(light, firstKm));
            }
            continued.add(channel);
        }
        return continued;
    }

    /** What a part of the span has of that which is counted or measured over the whole. */
    private Map<String, Object> shares(double partKm) {
        Map<String, Object> shares = new LinkedHashMap<>();
        double share = partKm / span.lengthKm();
        span.measuredLossDb().ifPresent(loss -> shares.put("measuredLossDb", rounded(loss * share)));
        if (span.connectors() > 0.0) {
            shares.put("connectors", rounded(span.connectors() * share));
        }
        if (span.splices() > 0.0) {
            shares.put("splices", rounded(span.splices() * share));
        }
        return shares;
    }

    /** Power of a classical channel behind a length of the fibre, dBm. */
    private double arriving(ClassicalChannel channel, double behindKm) {
        return rounded(channel.launchDbm() - FibreOptics.attenuationDbPerKm(span, channel) * behindKm);
    }

    private static double rounded(double value) {
        return new BigDecimal(value).round(DIGITS).doubleValue();
    }

    private static Content elements() {
        Field arm = ScenarioSections.SCENARIO.field("alice").orElseThrow();
        return arm.content()
                .section("")
                .orElseThrow()
                .field("path")
                .orElseThrow()
                .content();
    }
}
