package binspan.planner.report;

import binspan.planner.io.JsonText;
import binspan.prediction.LinkCheck;

/** The result of a check as JSON for programs: stable names, plain numbers, what does not apply is absent. */
public final class ResultJson {
    private ResultJson() {}

    /** The result as the text of a JSON object, without a line end. */
    public static String text(LinkCheck check) {
        return JsonText.of(ResultTree.of(check));
    }
}
