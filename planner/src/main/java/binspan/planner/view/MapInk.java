package binspan.planner.view;

import binspan.prediction.Requirement;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;

/** How the line of each requirement is told apart on the map: by colour and by dash, always the same for one requirement. */
enum MapInk {
    RAW_VISIBILITY("#6a3fa0", "#c3a6ff"),
    CHSH("#a12a6c", "#ff9bd0", 0.7, 0.3),
    PHASE_QBER("#8a5a00", "#e6b450", 0.35, 0.3),
    TIME_QBER("#566300", "#c4d04a", 1.1, 0.35),
    KEY_RATE("#006d76", "#5fd3dc", 1.1, 0.3, 0.2, 0.3),
    CAR("#a8481c", "#ffa27a", 0.15, 0.3),
    FIRST_KEY("#3b4cc0", "#a3b4ff", 0.6, 0.25, 0.15, 0.25, 0.15, 0.25),
    FIVE_SIGMA("#6b4a3a", "#d7b8a8", 1.6, 0.4),
    SLOTS("#525c6b", "#aeb6c2", 0.3, 0.15);

    private static final double WIDTH = 0.14;
    private static final double SWATCH = 2.4;
    private static final double SWATCH_HEIGHT = 1.2;

    private final Color light;
    private final Color dark;
    private final double[] dashes;

    MapInk(String light, String dark, double... dashes) {
        this.light = Color.web(light);
        this.dark = Color.web(dark);
        this.dashes = dashes;
    }

    /** That of a requirement. */
    static MapInk of(Requirement requirement) {
        return valueOf(requirement.name());
    }

    /** Its colour, readable on the panel. */
    Color colour(Look look) {
        return look.themeProperty().get() == Theme.DARK ? dark : light;
    }

    /** Readies a pen. */
    void ready(GraphicsContext pen, Look look) {
        pen.setStroke(colour(look));
        pen.setLineWidth(look.em(WIDTH));
        double[] lengths = dashes.clone();
        for (int i = 0; i < lengths.length; i++) {
            lengths[i] = look.em(lengths[i]);
        }
        pen.setLineDashes(lengths);
    }

    /** A piece of a requirement's line. */
    static Canvas swatch(Requirement requirement, Look look) {
        Canvas canvas = new Canvas(look.em(SWATCH), look.em(SWATCH_HEIGHT));
        GraphicsContext pen = canvas.getGraphicsContext2D();
        of(requirement).ready(pen, look);
        double y = Math.floor(look.em(SWATCH_HEIGHT) / 2.0) + 0.5;
        pen.strokeLine(look.em(WIDTH), y, look.em(SWATCH - WIDTH), y);
        return canvas;
    }
}
