package binspan.study.comparison;

import binspan.scenario.Scenario;
import java.util.List;

/**
 * One of several links that are compared.
 *
 * @param name what distinguishes it
 * @param settings the same link at settings of its devices between which one may choose; the best one counts
 */
public record LinkOption(String name, List<Setting> settings) {
    /**
     * A setting.
     *
     * @param meaning in a few words, empty where there is nothing to choose
     * @param scenario the link with it
     */
    public record Setting(String meaning, Scenario scenario) {}

    /** A link without a choice of settings. */
    public static LinkOption of(String name, Scenario scenario) {
        return new LinkOption(name, List.of(new Setting("", scenario)));
    }
}
