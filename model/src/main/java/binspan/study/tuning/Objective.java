package binspan.study.tuning;

import binspan.prediction.LinkPrediction;
import binspan.prediction.Requirement;
import binspan.prediction.RequirementMargins;
import java.util.List;

/** What tuning makes as large as it can. */
public enum Objective {
    /** Asymptotic secret key rate, bit/s. */
    KEY("key", "secret key rate", "bit/s"),
    /** Raw two-photon visibility. */
    VISIBILITY("visibility", "raw visibility", ""),
    /** S of the CHSH test. */
    CHSH("chsh", "CHSH S", ""),
    /** The least margin of all requirements, as the logarithm of a ratio. */
    MARGIN("margin", "least margin", "");

    private static final RequirementMargins ANY_KEY = RequirementMargins.of(List.of(Requirement.KEY_RATE), 1.0);

    private final String text;
    private final String meaning;
    private final String unit;

    Objective(String text, String meaning, String unit) {
        this.text = text;
        this.meaning = meaning;
        this.unit = unit;
    }

    /** The word for it on a command line. */
    public String text() {
        return text;
    }

    /** What it is, in words. */
    public String meaning() {
        return meaning;
    }

    /** Unit of {@link #value}. */
    public String unit() {
        return unit;
    }

    /** The figure itself. */
    public double value(LinkPrediction prediction, RequirementMargins margins) {
        return switch (this) {
            case KEY -> prediction.key().asymptoticPerSecond();
            case VISIBILITY -> prediction.fringe().raw();
            case CHSH -> prediction.bell().chsh();
            case MARGIN -> margins.least(prediction);
        };
    }

    /** What the search sees of it: smooth, finite, rising with it; the key on a logarithmic scale that goes on where there is none. */
    public double merit(LinkPrediction prediction, RequirementMargins margins) {
        return this == KEY ? ANY_KEY.margin(0, prediction) : value(prediction, margins);
    }

    /**
     * What a link without special wishes is tuned for: the key where its detectors allow one, otherwise S.
     *
     * @param prediction any prediction of the link
     */
    public static Objective natural(LinkPrediction prediction) {
        return Double.isNaN(prediction.key().asymptoticPerSecond()) ? CHSH : KEY;
    }
}
