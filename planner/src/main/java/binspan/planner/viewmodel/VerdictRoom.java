package binspan.planner.viewmodel;

import binspan.planner.report.DriftWords;
import binspan.planner.report.RequirementWords;
import binspan.planner.report.VerdictHeadroom;
import binspan.planner.report.VerdictStability;
import binspan.prediction.Headroom;
import binspan.prediction.LinkCheck;
import binspan.scenario.Scenario;
import java.util.List;
import java.util.Optional;

/**
 * How far each quantity may drift before the first requirement fails.
 *
 * @param check what was found
 * @param title what the table of headroom is about
 * @param none why there is no headroom, empty where there is some
 * @param rows headroom, the tightest first
 * @param limits how tightly temperatures, phases and delays must be held
 */
public record VerdictRoom(LinkCheck check, String title, String none, List<Row> rows, List<Limit> limits) {
    /**
     * Headroom of one quantity.
     *
     * @param path scenario path of the quantity
     * @param name the quantity
     * @param planned planned value
     * @param side whether the limit lies below or above it, in words
     * @param limit value at which the first requirement fails
     * @param room how far it is there
     * @param fails which requirement that is
     */
    public record Row(String path, String name, String planned, String side, String limit, String room, String fails) {
        /** The limit with the word for its side. */
        public String sidedLimit() {
            return side + " " + limit;
        }

        private static Row of(Headroom headroom) {
            return new Row(
                    headroom.path(),
                    DriftWords.of(headroom.path()),
                    VerdictHeadroom.planned(headroom),
                    VerdictHeadroom.side(headroom),
                    VerdictHeadroom.limit(headroom),
                    VerdictHeadroom.room(headroom),
                    RequirementWords.name(headroom.requirement()));
        }
    }

    /**
     * How tightly something must be held.
     *
     * @param quantity what
     * @param value below which it must stay
     */
    public record Limit(String quantity, String value) {}

    static VerdictRoom of(LinkCheck check) {
        List<Row> rows = VerdictHeadroom.sorted(check).stream().map(Row::of).toList();
        return new VerdictRoom(
                check,
                VerdictHeadroom.title(check.met()),
                rows.isEmpty() ? VerdictHeadroom.none(check) : "",
                rows,
                check.stability().stream()
                        .map(limit -> new Limit(limit.quantity(), VerdictStability.value(limit)))
                        .toList());
    }

    /** The link that it is about. */
    public Scenario scenario() {
        return check.prediction().scenario();
    }

    /** The quantity with the least headroom for its size. */
    public Optional<Row> tightest() {
        return rows.stream().findFirst();
    }
}
