package binspan.planner.view;

import binspan.planner.report.Figure;
import binspan.planner.view.Theme.Palette;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkLayout;
import binspan.planner.viewmodel.LinkRoom;
import binspan.planner.viewmodel.LossProfile;
import binspan.planner.viewmodel.LossProfile.Corner;
import binspan.planner.viewmodel.Words;
import binspan.prediction.LossRoom;
import binspan.units.Digits;
import java.util.List;
import java.util.Optional;
import javafx.geometry.VPos;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.text.TextAlignment;

/** The running loss of both arms under the drawn link, the room for more, and the scale of the fibre. */
final class LossCanvas extends Canvas {
    private static final double TOP_EM = 1.2;
    private static final double BOTTOM_EM = 1.35;
    private static final double MOST_ROOM_SHARE = 0.3;
    private static final double TEXT = 0.85;
    private static final double HATCH_EM = 0.45;

    private final Look look;
    private LinkLayout layout;
    private double pxPerDb;
    private double end;

    LossCanvas(Look look) {
        this.look = look;
        setMouseTransparent(true);
    }

    /**
     * Draws.
     *
     * @param profiles both arms
     * @param place where the link is drawn
     * @param room room for more loss, if it is known
     * @param fresh whether that is the room of this very link
     */
    void draw(List<LossProfile> profiles, LinkLayout place, Optional<LinkRoom> room, boolean fresh) {
        layout = place;
        double top = look.em(TOP_EM);
        end = getHeight() - look.em(BOTTOM_EM);
        double deepest = profiles.stream()
                .mapToDouble(profile -> profile.totalDb() + shown(profile, room))
                .max()
                .orElse(0.0);
        pxPerDb = (end - top) / Math.max(deepest, 1.0);
        GraphicsContext pen = getGraphicsContext2D();
        pen.clearRect(0.0, 0.0, getWidth(), getHeight());
        pen.setFont(look.font(TEXT));
        zero(pen);
        for (LossProfile profile : profiles) {
            line(pen, profile);
            numbers(pen, profile);
            room.ifPresent(known -> room(pen, profile, known, fresh));
            total(pen, profile);
        }
        scale(pen);
    }

    private static double shown(LossProfile profile, Optional<LinkRoom> room) {
        double extra = room.flatMap(known -> known.at(profile.site()))
                .map(LossRoom.Room::extraDb)
                .orElse(0.0);
        return Math.min(extra, MOST_ROOM_SHARE * profile.totalDb());
    }

    private double y(double db) {
        return look.em(TOP_EM) + db * pxPerDb;
    }

    private void zero(GraphicsContext pen) {
        pen.setFill(look.palette().soft());
        pen.setTextAlign(TextAlignment.CENTER);
        pen.setTextBaseline(VPos.BOTTOM);
        pen.fillText(Words.of("link.zero"), sourceX(), y(0.0));
    }

    private double sourceX() {
        return layout.columns().stream()
                .filter(column -> column.kind() == Kind.SOURCE)
                .findFirst()
                .orElseThrow()
                .centre();
    }

    private void line(GraphicsContext pen, LossProfile profile) {
        pen.setStroke(look.palette().ink());
        pen.setLineWidth(look.em(0.13));
        pen.beginPath();
        Corner first = profile.line().get(0);
        pen.moveTo(first.x(), y(first.db()));
        for (Corner corner : profile.line()) {
            pen.lineTo(corner.x(), y(corner.db()));
        }
        pen.lineTo(profile.rimX(), y(profile.totalDb()));
        pen.stroke();
    }

    private void numbers(GraphicsContext pen, LossProfile profile) {
        pen.setFill(look.palette().soft());
        double gap = look.em(0.25);
        profile.numbers().forEach(number -> beside(pen, profile, number.x(), y(number.db()) - gap, number.text()));
    }

    private void total(GraphicsContext pen, LossProfile profile) {
        pen.setFont(look.bold(TEXT));
        pen.setFill(look.palette().ink());
        beside(pen, profile, profile.endX(), y(profile.totalDb()) - look.em(0.25), Figure.decibels(profile.totalDb()));
        pen.setFont(look.font(TEXT));
    }

    /** A text on a level of the line, outside its step. */
    private void beside(GraphicsContext pen, LossProfile profile, double x, double y, String text) {
        double gap = look.em(0.25) * (profile.leftwards() ? -1.0 : 1.0);
        pen.setTextAlign(profile.leftwards() ? TextAlignment.RIGHT : TextAlignment.LEFT);
        pen.setTextBaseline(VPos.BOTTOM);
        pen.fillText(text, x + gap, y + look.em(0.15));
    }

    private void room(GraphicsContext pen, LossProfile profile, LinkRoom known, boolean fresh) {
        Palette colours = look.palette();
        boolean fails = !known.unmet().isEmpty();
        double deep = shown(profile, Optional.of(known)) * pxPerDb;
        double from = y(profile.totalDb());
        pen.setStroke(fresh ? fails ? colours.bad() : colours.good() : colours.soft());
        pen.setFill(fresh ? fails ? colours.bad() : colours.good() : colours.soft());
        double left = Math.min(profile.endX(), profile.rimX());
        double width = Math.abs(profile.rimX() - profile.endX());
        if (!fails && deep > 0.0) {
            hatch(pen, left, from, width, deep);
        }
        String text = LinkTexts.room(known, profile.site());
        pen.setTextBaseline(VPos.TOP);
        pen.setTextAlign(profile.leftwards() ? TextAlignment.LEFT : TextAlignment.RIGHT);
        pen.fillText(text, profile.rimX(), from + (fails ? 0.0 : deep) + look.em(0.15));
    }

    private void hatch(GraphicsContext pen, double x, double y, double width, double height) {
        pen.save();
        pen.beginPath();
        pen.rect(x, y, width, height);
        pen.clip();
        pen.setLineWidth(look.em(0.07));
        for (double at = x - height; at < x + width; at += look.em(HATCH_EM)) {
            pen.strokeLine(at, y + height, at + height, y);
        }
        pen.restore();
        pen.setLineWidth(look.em(0.13));
        pen.setLineDashes(look.em(0.4), look.em(0.3));
        pen.strokeLine(x, y + height, x + width, y + height);
        pen.setLineDashes();
    }

    private void scale(GraphicsContext pen) {
        if (layout.bar() <= 0.0) {
            return;
        }
        double width = layout.bar() * layout.pxPerKm();
        double y = getHeight() - look.em(0.7);
        double left = Math.max(0.0, sourceX() - width / 2.0);
        double tick = look.em(0.25);
        pen.setStroke(look.palette().soft());
        pen.setFill(look.palette().soft());
        pen.setLineWidth(look.em(0.1));
        pen.strokeLine(left, y, left + width, y);
        pen.strokeLine(left, y - tick, left, y + tick);
        pen.strokeLine(left + width, y - tick, left + width, y + tick);
        pen.setTextAlign(TextAlignment.CENTER);
        pen.setTextBaseline(VPos.BOTTOM);
        pen.fillText(Words.of("link.scale", Digits.shortest(layout.bar(), 2)), left + width / 2.0, y - look.em(0.1));
    }
}
