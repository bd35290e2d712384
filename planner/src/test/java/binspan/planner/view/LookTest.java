package binspan.planner.view;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.atomic.AtomicInteger;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.control.MenuItem;
import javafx.scene.control.ToggleGroup;
import javafx.scene.image.Image;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

/** What all parts of the window share: theme and scale, items of menus, images. */
@ExtendWith(ApplicationExtension.class)
class LookTest {
    private final Look look = new Look();
    private Label label;

    @Start
    void show(Stage stage) {
        label = new Label("ink");
        label.setStyle("-fx-text-fill: -ink;");
        Scene scene = new Scene(new StackPane(label), 200.0, 100.0);
        look.dress(scene);
        stage.setScene(scene);
        stage.show();
        stage.sizeToScene();
    }

    @Test
    void lengthsAndFontsFollowTheScale() {
        assertThat(look.em(1.0)).isEqualTo(12.0);
        assertThat(look.font(0.5).getSize()).isEqualTo(6.0);
        look.scalePercentProperty().set(175);
        assertThat(look.em(2.0)).isEqualTo(42.0);
        assertThat(look.bold(1.0).getSize()).isEqualTo(21.0);
    }

    @Test
    void followersHearAtOnceAndOfEveryChange() {
        AtomicInteger calls = new AtomicInteger();
        look.follow(calls::incrementAndGet);
        assertThat(calls).hasValue(1);
        look.scalePercentProperty().set(200);
        look.scalePercentProperty().set(200);
        assertThat(calls).hasValue(2);
    }

    @Test
    void dressedSceneFollowsThemeAndScale(FxRobot robot) {
        assertThat(label.getTextFill()).isEqualTo(Theme.LIGHT.palette().ink());
        double size = label.getFont().getSize();
        robot.interact(() -> {
            look.themeProperty().set(Theme.DARK);
            look.scalePercentProperty().set(200);
        });
        robot.interact(() -> label.getScene().getRoot().applyCss());
        assertThat(label.getTextFill()).isEqualTo(Theme.DARK.palette().ink());
        assertThat(label.getFont().getSize()).isEqualTo(2.0 * size);
    }

    @Test
    void itemsHaveWordsShortcutsAndActions(FxRobot robot) {
        List<String> done = new ArrayList<>();
        SimpleObjectProperty<Boolean> possible = new SimpleObjectProperty<>(false);
        robot.interact(() -> {
            MenuItem open = Menus.item("open", possible, () -> done.add("open"));
            assertThat(open.getText()).isEqualTo("_Open…");
            assertThat(open.getId()).isEqualTo("menu-open");
            assertThat(open.getAccelerator())
                    .isEqualTo(new KeyCodeCombination(KeyCode.O, KeyCombination.SHORTCUT_DOWN));
            assertThat(open.isDisable()).isTrue();
            possible.set(true);
            assertThat(open.isDisable()).isFalse();
            open.fire();
            assertThat(Menus.item("copy.link", () -> {}).getAccelerator()).isNull();
            assertThat(Menus.item("copy.link", () -> {}).getId()).isEqualTo("menu-copy-link");
        });
        assertThat(done).containsExactly("open");
    }

    @Test
    void ofChoicesOneIsChosen(FxRobot robot) {
        robot.interact(() -> {
            ToggleGroup group = new ToggleGroup();
            var light = Menus.choice("light", group, () -> {});
            var dark = Menus.choice("dark", group, () -> {});
            light.setSelected(true);
            dark.setSelected(true);
            assertThat(light.isSelected()).isFalse();
        });
    }

    /** Opaque colours survive exactly; of translucent ones the window keeps colours multiplied by their opacity. */
    @Test
    void imagesComeBackAsTheyWere() {
        Random random = new Random(7);
        BufferedImage image = new BufferedImage(17, 9, BufferedImage.TYPE_INT_ARGB);
        for (int y = 0; y < 9; y++) {
            for (int x = 0; x < 17; x++) {
                image.setRGB(x, y, x == 3 ? 0 : 0xff000000 | random.nextInt(1 << 24));
            }
        }
        Image shown = FxImages.of(image);
        assertThat(shown.getWidth()).isEqualTo(17.0);
        BufferedImage back = FxImages.of(shown);
        for (int y = 0; y < 9; y++) {
            for (int x = 0; x < 17; x++) {
                assertThat(back.getRGB(x, y)).isEqualTo(image.getRGB(x, y));
            }
        }
    }
}
