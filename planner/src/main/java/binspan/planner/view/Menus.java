package binspan.planner.view;

import binspan.planner.viewmodel.Words;
import javafx.beans.value.ObservableValue;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuItem;
import javafx.scene.control.RadioMenuItem;
import javafx.scene.control.ToggleGroup;
import javafx.scene.input.KeyCombination;

/** Items of menus, named by their key in the bundle; a key that ends in {@code .keys} there gives the shortcut. */
final class Menus {
    private static final String MENU = "menu.";

    private Menus() {}

    /** A menu. */
    static Menu menu(String key, MenuItem... items) {
        Menu menu = new Menu(Words.of(MENU + key), null, items);
        menu.setId("menu-" + key);
        return menu;
    }

    /** An item that does something. */
    static MenuItem item(String key, Runnable action) {
        return dressed(new MenuItem(), key, action);
    }

    /** An item that can be done only at times. */
    static MenuItem item(String key, ObservableValue<Boolean> possible, Runnable action) {
        MenuItem item = item(key, action);
        item.disableProperty().bind(possible.map(each -> !each));
        return item;
    }

    /** One of several items of which one is chosen. */
    static RadioMenuItem choice(String key, ToggleGroup group, Runnable action) {
        RadioMenuItem item = dressed(new RadioMenuItem(), key, action);
        item.setToggleGroup(group);
        return item;
    }

    private static <T extends MenuItem> T dressed(T item, String key, Runnable action) {
        item.setText(Words.of(MENU + key));
        item.setId("menu-" + key.replace('.', '-'));
        item.setOnAction(event -> action.run());
        String keys = MENU + key + ".keys";
        if (Words.has(keys)) {
            item.setAccelerator(KeyCombination.valueOf(Words.of(keys)));
        }
        return item;
    }
}
