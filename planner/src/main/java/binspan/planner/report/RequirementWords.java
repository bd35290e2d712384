package binspan.planner.report;

import binspan.prediction.Requirement;
import binspan.units.Digits;

/** Requirements in the words and units of the trade. */
public final class RequirementWords {
    private static final double HOUR = 3600.0;
    private static final double PERCENT = 100.0;
    private static final int FEWEST_DIGITS = 3;
    private static final int MOST_DIGITS = 9;

    private RequirementWords() {}

    /** Name of the required figure. */
    public static String name(Requirement requirement) {
        return switch (requirement) {
            case RAW_VISIBILITY -> "raw visibility";
            case CHSH -> "CHSH S";
            case PHASE_QBER -> "phase-basis error rate";
            case TIME_QBER -> "time-basis error rate";
            case KEY_RATE -> "secret key rate";
            case CAR -> "coincidences/accidentals";
            case FIRST_KEY -> "time to the first key";
            case FIVE_SIGMA -> "time to S > 2 by 5 sigma";
            case SLOTS -> "fit of the slots";
        };
    }

    /** The same within a sentence, behind an article. */
    public static String noun(Requirement requirement) {
        return requirement == Requirement.CAR ? "ratio of coincidences to accidentals" : name(requirement);
    }

    /** The required figure as the subject of a sentence. */
    static String subject(Requirement requirement) {
        return switch (requirement) {
            case CHSH -> "S of the CHSH test";
            case PHASE_QBER -> "The error rate of the phase basis";
            case TIME_QBER -> "The error rate of the time basis";
            case CAR -> "The ratio of coincidences to accidentals";
            default -> "The " + name(requirement);
        };
    }

    /** What it means that there is no figure. */
    static String absent(Requirement requirement) {
        return switch (requirement) {
            case FIRST_KEY -> "There never is a first key";
            case FIVE_SIGMA -> "S does not exceed 2";
            case TIME_QBER -> "There is no time basis";
            default -> "There is no " + name(requirement);
        };
    }

    /** The word in place of a figure that there is not. */
    public static String missing(Requirement requirement) {
        return switch (requirement) {
            case FIRST_KEY, FIVE_SIGMA -> "never";
            default -> "none";
        };
    }

    /** The required figure as it was stated. */
    public static String required(Requirement requirement, double value) {
        return switch (requirement) {
            case PHASE_QBER, TIME_QBER -> Figure.stated(value * PERCENT, "%");
            case KEY_RATE -> value < 1000.0 ? Figure.stated(value, "bit/s") : Figure.bits(value);
            case FIRST_KEY, FIVE_SIGMA -> Figure.stated(value, "h");
            default -> Figure.stated(value, "");
        };
    }

    /** The predicted figure, with as many digits as it takes to tell it from the required one. */
    public static String predicted(Requirement requirement, double value, double required) {
        int digits = FEWEST_DIGITS;
        while (digits < MOST_DIGITS && value != required && rounded(value, digits) == required) {
            digits++;
        }
        return switch (requirement) {
            case PHASE_QBER, TIME_QBER -> Figure.digits(value * PERCENT, digits, "%");
            case KEY_RATE -> digits == FEWEST_DIGITS ? Figure.bits(value) : Figure.digits(value, digits, "bit/s");
            case FIRST_KEY, FIVE_SIGMA ->
                digits == FEWEST_DIGITS ? Figure.duration(value * HOUR) : Figure.digits(value, digits, "h");
            default -> Figure.digits(value, digits, "");
        };
    }

    /**
     * The predicted figure of tuned settings, or that there is none; best settings often meet a requirement exactly, and then it is not told to its
     * last digit.
     */
    public static String tuned(Requirement requirement, double value, double required, boolean met) {
        return Double.isFinite(value) ? predicted(requirement, value, met ? value : required) : missing(requirement);
    }

    /** How much room is left, with its sign, in the requirement's own unit. */
    public static String margin(Requirement requirement, double margin) {
        return switch (requirement) {
            case PHASE_QBER, TIME_QBER -> Figure.signed(margin * PERCENT, "%");
            case KEY_RATE -> Figure.signedRate(margin, "bit/s");
            case FIRST_KEY, FIVE_SIGMA -> Figure.signed(margin, "h");
            default -> Figure.signed(margin, "");
        };
    }

    /** The same where a bare % could be taken for a share of the figure: error rates in percentage points. */
    public static String room(Requirement requirement, double margin) {
        return errorRate(requirement) ? Figure.points(margin) : margin(requirement, margin);
    }

    private static boolean errorRate(Requirement requirement) {
        return requirement == Requirement.PHASE_QBER || requirement == Requirement.TIME_QBER;
    }

    /** How much a predicted figure has risen or fallen, with its sign; times in the unit that one says aloud. */
    public static String difference(Requirement requirement, double difference) {
        return switch (requirement) {
            case FIRST_KEY, FIVE_SIGMA -> (difference < 0.0 ? "-" : "+") + Figure.duration(Math.abs(difference) * HOUR);
            default -> room(requirement, difference);
        };
    }

    /** A missing amount, without a sign. */
    static String amount(Requirement requirement, double missing) {
        return switch (requirement) {
            case FIRST_KEY, FIVE_SIGMA -> Figure.duration(missing * HOUR);
            case PHASE_QBER, TIME_QBER -> Figure.digits(missing * PERCENT, 2, Figure.POINTS);
            default -> margin(requirement, -missing).substring(1);
        };
    }

    private static double rounded(double value, int digits) {
        return Double.parseDouble(Digits.significant(value, digits));
    }
}
