package binspan.planner.viewmodel;

import binspan.planner.report.Figure;
import java.util.function.DoubleFunction;

/**
 * How a figure differs from that of the saved link.
 *
 * @param text the difference with its sign and unit, or what the figure was where there is no difference; empty without change
 * @param effect whether that is for the better
 */
public record ChangeMark(String text, Effect effect) {
    /** No change. */
    public static final ChangeMark NONE = new ChangeMark("", Effect.NONE);

    /** Less than this share of the figure counts as no change: the last digit shown is ten times as large. */
    private static final double NOTICEABLE = 1e-4;

    /** What a change means. */
    public enum Effect {
        NONE,
        BETTER,
        WORSE,
        /** Neither: more singles are no aim of their own. */
        OTHER
    }

    /** Which way a figure is better. */
    enum Aim {
        HIGH,
        LOW,
        NEITHER
    }

    /**
     * The change of a figure.
     *
     * @param before the figure of the saved link; NaN or infinite where it has none
     * @param now the present one
     * @param aim which way is better
     * @param difference puts a difference into words
     * @param value puts a figure, or that there is none, into words
     */
    static ChangeMark of(
            double before, double now, Aim aim, DoubleFunction<String> difference, DoubleFunction<String> value) {
        if (Double.isFinite(before) && Double.isFinite(now)) {
            double size = Math.max(Math.abs(before), Math.abs(now));
            return Math.abs(now - before) <= NOTICEABLE * size
                    ? NONE
                    : new ChangeMark(difference.apply(now - before), effect(aim, now > before));
        }
        if (!Double.isFinite(before) && !Double.isFinite(now)) {
            return NONE;
        }
        boolean found = Double.isFinite(now);
        Effect effect = aim == Aim.NEITHER ? Effect.OTHER : found ? Effect.BETTER : Effect.WORSE;
        return new ChangeMark(Words.of("verdict.change.was", value.apply(before)), effect);
    }

    private static Effect effect(Aim aim, boolean risen) {
        return switch (aim) {
            case HIGH -> risen ? Effect.BETTER : Effect.WORSE;
            case LOW -> risen ? Effect.WORSE : Effect.BETTER;
            case NEITHER -> Effect.OTHER;
        };
    }

    /** 1 where the figure has risen, -1 where it has fallen, 0 where there is no difference to tell. */
    public int direction() {
        return text.startsWith("+") ? 1 : text.startsWith("-") ? -1 : 0;
    }

    /** The change for somebody who hears it; empty without change. */
    public String spoken() {
        return switch (effect) {
            case NONE -> "";
            case BETTER -> Words.of("verdict.change.better", Figure.spelt(text));
            case WORSE -> Words.of("verdict.change.worse", Figure.spelt(text));
            case OTHER -> Words.of("verdict.change.other", Figure.spelt(text));
        };
    }
}
