package binspan.planner.view;

import binspan.planner.view.Theme.Palette;
import java.util.List;
import java.util.stream.Stream;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ChangeListener;
import javafx.scene.Scene;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;

/** How the window looks: theme and scale. All sizes follow one length, the em, which is the size of ordinary text. */
public final class Look {
    /** Scales that one may choose, per cent. */
    public static final List<Integer> SCALES = List.of(100, 125, 150, 175, 200);

    private static final double TEXT = 12.0;
    private static final double PERCENT = 100.0;
    private static final List<String> SHEETS = List.of("base", "link", "form", "verdict", "slots", "map", "studies");

    private final ObjectProperty<Theme> theme = new SimpleObjectProperty<>(this, "theme", Theme.LIGHT);
    private final IntegerProperty scalePercent = new SimpleIntegerProperty(this, "scalePercent", 100);

    /** Light or dark. */
    public ObjectProperty<Theme> themeProperty() {
        return theme;
    }

    /** Size of everything, per cent. */
    public IntegerProperty scalePercentProperty() {
        return scalePercent;
    }

    /** The colours of what is drawn. */
    public Palette palette() {
        return theme.get().palette();
    }

    /** A length in pixels. */
    public double em(double lengths) {
        return lengths * TEXT * scalePercent.get() / PERCENT;
    }

    /** An ordinary font, its size as a share of ordinary text. */
    public Font font(double share) {
        return Font.font("System", em(share));
    }

    /** The same in bold. */
    public Font bold(double share) {
        return Font.font("System", FontWeight.BOLD, em(share));
    }

    /** Calls back now and whenever theme or scale change. */
    public void follow(Runnable change) {
        ChangeListener<Object> listener = (source, before, after) -> change.run();
        theme.addListener(listener);
        scalePercent.addListener(listener);
        change.run();
    }

    /** Gives a scene this look and keeps it so. */
    public void dress(Scene scene) {
        follow(() -> apply(scene));
    }

    /** Gives a scene, such as that of a dialog, the look of this moment. */
    public void apply(Scene scene) {
        // At once: sheets use the colours of the theme.
        scene.getStylesheets()
                .setAll(Stream.concat(Stream.of(theme.get().text()), SHEETS.stream())
                        .map(Look::sheet)
                        .toList());
        scene.getRoot().setStyle("-fx-font-size: " + em(1.0) + "px;");
    }

    private static String sheet(String name) {
        return Look.class.getResource(name + ".css").toExternalForm();
    }
}
