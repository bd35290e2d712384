package binspan.planner.view;

import javafx.scene.paint.Color;

/** Colours of what the window draws itself; the controls take theirs from the style sheet of the same name. */
public enum Theme {
    LIGHT(
            "light",
            new Palette(
                    Color.web("#f4f5f7"),
                    Color.web("#ffffff"),
                    Color.web("#1d2330"),
                    Color.web("#525c6b"),
                    Color.web("#dfe3e8"),
                    Color.web("#1f5fa8"),
                    Color.web("#17714e"),
                    Color.web("#b02a30"),
                    Color.web("#8a5a00"))),
    DARK(
            "dark",
            new Palette(
                    Color.web("#191d22"),
                    Color.web("#22272e"),
                    Color.web("#e8eaee"),
                    Color.web("#aeb6c2"),
                    Color.web("#3a414b"),
                    Color.web("#7db8f5"),
                    Color.web("#62cf9f"),
                    Color.web("#ff8f8a"),
                    Color.web("#e6b450")));

    private final String text;
    private final Palette palette;

    Theme(String text, Palette palette) {
        this.text = text;
        this.palette = palette;
    }

    /** Its name in the settings. */
    public String text() {
        return text;
    }

    /** Its colours. */
    public Palette palette() {
        return palette;
    }

    /** The theme of a name, light for an unknown one. */
    public static Theme of(String text) {
        return text.equals(DARK.text) ? DARK : LIGHT;
    }

    /**
     * Colours.
     *
     * @param window behind everything
     * @param panel behind what is drawn
     * @param ink texts and main lines
     * @param soft secondary texts, axes
     * @param grid faint lines
     * @param accent what is selected or can be dragged
     * @param good what is met
     * @param bad what fails
     * @param warn what deserves care
     */
    public record Palette(
            Color window,
            Color panel,
            Color ink,
            Color soft,
            Color grid,
            Color accent,
            Color good,
            Color bad,
            Color warn) {}
}
