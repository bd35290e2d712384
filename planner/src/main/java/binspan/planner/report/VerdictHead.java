package binspan.planner.report;

import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.prediction.RequirementOutcome;
import binspan.scenario.Arm;
import binspan.scenario.FibreSpan;
import binspan.scenario.PathElement;
import binspan.scenario.Preparation;
import binspan.scenario.Pump;
import binspan.scenario.Scenario;
import binspan.units.Digits;

/** Headline of the verdict: the link, its source and arms, and the answer. */
public final class VerdictHead {
    private static final int LABEL = 9;

    private VerdictHead() {}

    static void write(LinkCheck check, TextPage page) {
        LinkPrediction p = check.prediction();
        Scenario scenario = p.scenario();
        page.wrapped(page.style().clean(scenario.name()));
        answer(check, page);
        page.gap();
        String blank = " ".repeat(LABEL);
        page.wrapped(TextPage.left("source", LABEL), blank, source(scenario));
        page.wrapped(TextPage.left("timing", LABEL), blank, timing(scenario));
        page.wrapped(
                TextPage.left("alice", LABEL),
                blank,
                arm(scenario, scenario.alice(), p.pathA().lossDb()));
        page.wrapped(
                TextPage.left("bob", LABEL),
                blank,
                arm(scenario, scenario.bob(), p.pathB().lossDb()));
    }

    private static void answer(LinkCheck check, TextPage page) {
        TextStyle style = page.style();
        if (check.outcomes().isEmpty()) {
            page.line(answer(check));
        } else {
            page.line(
                    check.met()
                            ? style.good(style.met() + " " + answer(check))
                            : style.bad(style.notMet() + " " + answer(check)));
        }
    }

    /** Whether the link meets its requirements, in words without a sign. */
    public static String answer(LinkCheck check) {
        int failed = 0;
        for (RequirementOutcome outcome : check.outcomes()) {
            failed += outcome.met() ? 0 : 1;
        }
        int all = check.outcomes().size();
        if (all == 0) {
            return "No requirement is stated: these are predictions without a verdict.";
        }
        if (failed == 0) {
            return all == 1 ? "MEETS its requirement" : "MEETS all " + all + " requirements";
        }
        return all == 1 ? "DOES NOT MEET its requirement" : "DOES NOT MEET " + failed + " of " + all + " requirements";
    }

    private static String source(Scenario scenario) {
        Pump pump = scenario.source().pump();
        return switch (pump.mode()) {
            case PULSE_PAIR ->
                "pulse pair, "
                        + (pump.preparation() == Preparation.INTERFEROMETER
                                ? "made by an interferometer, "
                                : "carved by a modulator, ")
                        + Figure.stated(pump.repetitionRateMHz().orElseThrow(), "MHz") + ", " + perCycle(scenario)
                        + " pairs per cycle";
            case PULSE_TRAIN ->
                "pulse train, " + Digits.shortestPrefixed(1e9 / scenario.imbalanceNs(), "Hz", 6) + ", "
                        + perCycle(scenario) + " pairs per pulse";
            case CONTINUOUS ->
                "continuous pump, "
                        + Figure.statedPairs(
                                scenario.source().pairRatePerSecond().orElseThrow());
        };
    }

    private static String timing(Scenario scenario) {
        String delay = Figure.stated(scenario.imbalanceNs(), "ns");
        String slots = switch (scenario.source().pump().mode()) {
            case PULSE_PAIR -> "bins " + delay + " apart";
            case PULSE_TRAIN -> "pulses " + delay + " apart";
            case CONTINUOUS -> "interferometers of " + delay;
        };
        return slots + ", window " + Figure.stated(scenario.timing().windowWidthPs(), "ps");
    }

    private static String perCycle(Scenario scenario) {
        return Figure.stated(scenario.source().meanPairsPerCycle().orElseThrow(), "");
    }

    private static String arm(Scenario scenario, Arm arm, double lossDb) {
        int ports = arm.detectors().size();
        return Digits.shortest(lengthKm(arm), 4) + " km of fibre, " + Figure.decibels(lossDb) + " in all; "
                + arm.photon().text() + " at "
                + Digits.decimals(scenario.bandOf(arm).centreNm(), 2) + " nm, "
                + (ports == 1 ? "one port" : "both ports");
    }

    private static double lengthKm(Arm arm) {
        double length = 0.0;
        for (PathElement element : arm.path()) {
            length += element instanceof FibreSpan span ? span.lengthKm() : 0.0;
        }
        return length;
    }
}
