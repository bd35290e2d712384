package binspan.planner.viewmodel;

import binspan.planner.report.VerdictHeadroom;
import binspan.planner.report.VerdictNotes;
import binspan.planner.report.VerdictStability;
import binspan.prediction.Caution;

/** Headroom, stability, cautions and changes as a text to be pasted elsewhere, columns parted by tabulators. */
public final class VerdictText {
    private final StringBuilder text = new StringBuilder(2048);

    private VerdictText() {}

    /**
     * The text.
     *
     * @param sheet verdict
     * @param room headroom of the same link, or null if it is not found yet
     */
    public static String of(VerdictSheet sheet, VerdictRoom room) {
        VerdictText page = new VerdictText();
        page.line(sheet.scenario().name());
        page.line(sheet.headline());
        if (room != null) {
            page.room(room);
        }
        page.heading(VerdictNotes.CAUTIONS);
        sheet.cautions().forEach(caution -> page.line(line(caution)));
        page.orElse(sheet.cautions().isEmpty(), "verdict.cautions.none");
        page.heading(Words.of("verdict.changes"));
        sheet.changes().forEach(change -> page.line(change.text()));
        page.orElse(sheet.changes().isEmpty(), "verdict.changes.none");
        page.heading(VerdictNotes.SAFETY);
        sheet.safety().forEach(page::line);
        return page.text.toString();
    }

    private void room(VerdictRoom room) {
        heading(room.title() + ", " + VerdictHeadroom.ORDER);
        if (room.rows().isEmpty()) {
            line(room.none());
        } else {
            columns(
                    Words.of("verdict.column.quantity"),
                    Words.of("verdict.column.planned"),
                    Words.of("verdict.column.limit"),
                    Words.of("verdict.column.room"),
                    Words.of("verdict.column.fails"));
            room.rows().forEach(row -> columns(row.name(), row.planned(), row.sidedLimit(), row.room(), row.fails()));
        }
        heading(VerdictStability.TITLE + ", " + VerdictStability.MEANING);
        room.limits().forEach(limit -> columns(limit.quantity(), limit.value()));
        orElse(room.limits().isEmpty(), "verdict.stability.none");
    }

    private void heading(String title) {
        text.append('\n').append(title).append('\n');
    }

    private void line(String line) {
        text.append(line).append('\n');
    }

    private void columns(String... cells) {
        line(String.join("\t", cells));
    }

    private void orElse(boolean empty, String key) {
        if (empty) {
            line(Words.of(key));
        }
    }

    /** A caution with its code, as the command line tells it. */
    public static String line(Caution caution) {
        return caution.text() + " [" + caution.code() + "]";
    }
}
