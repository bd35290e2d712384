package binspan.planner.report;

import binspan.counting.DetectorLoad;
import binspan.counting.LinkCounts;
import binspan.merit.VisibilityBudget;
import binspan.prediction.Caution;
import binspan.prediction.LinkCheck;
import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;

/** Finds what costs a failing requirement most: a cause of the visibility budget, the errors, or a loss of rate. */
final class LargestCost {
    private static final double CLEAR_VIOLATION = 2.3;
    private static final double HARDLY_ANY_KEY = 0.2;

    private final LinkPrediction p;
    private final String rootCause;

    LargestCost(LinkCheck check) {
        this.p = check.prediction();
        this.rootCause = rootCause(check);
    }

    /** What a caution has found that spoils everything else, or an empty text. */
    private static String rootCause(LinkCheck check) {
        for (Caution caution : check.cautions()) {
            if (caution.code().equals("windows-missed")) {
                return "Most photons miss their windows: they arrive too far off the centre (see the caution below).";
            }
            if (caution.code().equals("energy-not-conserved")) {
                return "Hardly any pair passes both filters: their centres miss the pump's energy (see the caution"
                        + " below).";
            }
        }
        return "";
    }

    /** A sentence on what costs the requirement most. */
    String of(Requirement requirement) {
        return rootCause.isEmpty() ? ofAligned(requirement) : rootCause;
    }

    private String ofAligned(Requirement requirement) {
        return switch (requirement) {
            case RAW_VISIBILITY -> visibility(0.0);
            case CHSH, PHASE_QBER -> visibility(p.coherence().phaseOffset());
            case TIME_QBER -> p.counts().hasTimeBasis() ? outerSlots() : "Only a pulse pair has a time basis.";
            case CAR -> accidentals();
            case SLOTS -> SlotWords.UNFIT;
            case KEY_RATE -> key(p.scenario().require().keyRateAtLeastBps().orElse(0.0));
            case FIRST_KEY -> key(0.0);
            case FIVE_SIGMA ->
                p.bell().chsh() < CLEAR_VIOLATION ? visibility(p.coherence().phaseOffset()) : rate();
        };
    }

    private String visibility(double phaseOffset) {
        VisibilityBudget.Entry worst = p.budget().entries().get(0);
        for (VisibilityBudget.Entry entry : p.budget().entries()) {
            worst = entry.factor() < worst.factor() ? entry : worst;
        }
        double setting = 1.0 - Math.cos(phaseOffset);
        if (setting > 1.0 - worst.factor()) {
            return "The largest loss, " + Figure.percent(setting) + ", is by the static phase error.";
        }
        return "The largest loss of visibility, " + Figure.percent(1.0 - worst.factor()) + ", is by "
                + words(worst.cause()) + ".";
    }

    private static String words(VisibilityBudget.Cause cause) {
        return switch (cause) {
            case SPECTRAL -> "the mismatch of the imbalances within the photons' spectrum";
            case PHASE -> "phase noise";
            case MULTI_PAIR -> "the emission of several pairs at once";
            case PATH_BALANCE -> "the unequal weight of the two paths";
            case SLOT_OVERLAP -> "the overlap of neighbouring slots";
            case PUMP_COHERENCE -> "the pump's coherence";
            case POLARIZATION -> "polarization";
            case NOISE -> "dark counts and background";
        };
    }

    /** Errors of the time basis come from chance coincidences or from photons that reach a neighbouring slot. */
    private String outerSlots() {
        double wrong =
                p.counts().timeBasis().get(LinkCounts.EARLY_LATE).of(0, 0).atCosine(0.0);
        double chance =
                p.counts().timeBasis().get(LinkCounts.EARLY_LATE).of(0, 0).accidentalPerSecond();
        return chance > wrong / 2.0
                ? accidentals()
                : "Photons that reach a neighbouring slot cost most: they arrive too widely spread for the separation.";
    }

    private String accidentals() {
        double alice = noise(p.counts().loadsA().get(0));
        double bob = noise(p.counts().loadsB().get(0));
        if (Math.max(alice, bob) < 0.5) {
            return "Chance coincidences of photons from different pairs cost most: fewer pairs per window would help.";
        }
        String side = alice > bob ? "alice" : "bob";
        return "Dark counts and background cost most: " + Figure.percent(Math.max(alice, bob)) + " of " + side
                + "'s singles.";
    }

    private static double noise(DetectorLoad load) {
        double noise = load.darkPerSecond() + load.backgroundPerSecond();
        return noise / (noise + load.photonsPerSecond());
    }

    private String key(double required) {
        if (Double.isNaN(p.key().asymptoticPerSecond())) {
            return "The detected ports allow no key: both ports are needed on both sides.";
        }
        double sifted = sifted();
        double fraction = p.key().asymptoticPerSecond() / sifted;
        if (sifted < required) {
            String ports =
                    p.counts().bothPorts() ? "" : " With one detected port on a side, half or more of them are lost.";
            return "Only " + Figure.bits(sifted) + " are sifted." + ports + " " + rate();
        }
        return fraction < HARDLY_ANY_KEY
                ? "The errors leave " + Figure.bare(fraction) + " secret bits of each sifted one. " + errors()
                : rate();
    }

    /** Sifted bits that a key can be made from: those of the phase basis need both ports. */
    private double sifted() {
        boolean timeBasis = p.counts().hasTimeBasis();
        double phase = !timeBasis || p.counts().bothPorts() ? p.key().siftedPhasePerSecond() : 0.0;
        return phase + (timeBasis ? p.key().siftedTimePerSecond() : 0.0);
    }

    private String errors() {
        boolean timeBasis = p.counts().hasTimeBasis()
                && p.key().errors().time() > p.key().errors().phase();
        return timeBasis ? outerSlots() : visibility(p.coherence().phaseOffset());
    }

    /** The largest single loss on the way of the pairs. */
    private String rate() {
        double alice = p.pathA().fibreLossDb();
        double bob = p.pathB().fibreLossDb();
        double detectors = -10.0
                * Math.log10(p.scenario().alice().detectors().get(0).efficiency()
                        * p.scenario().bob().detectors().get(0).efficiency());
        double parts = p.pathA().lossDb() - alice + p.pathB().lossDb() - bob;
        double most = Math.max(Math.max(alice, bob), Math.max(detectors, parts));
        double all = p.pathA().lossDb() + p.pathB().lossDb() + detectors;
        String what = "the detectors' efficiencies cost";
        if (most == alice || most == bob) {
            what = (most == alice ? "alice" : "bob") + "'s fibre costs";
        } else if (most == parts) {
            what = "coupling, components and analyzers cost";
        }
        return "On the way to the clicks " + what + " most: " + Figure.decibels(most) + " of " + Figure.decibels(all)
                + ".";
    }
}
