package binspan.planner.view;

import binspan.planner.document.RecentFiles;
import binspan.planner.io.Preset;
import binspan.planner.viewmodel.Design;
import binspan.planner.viewmodel.LinkCommands;
import binspan.planner.viewmodel.LinkItem;
import binspan.planner.viewmodel.PlannerModel;
import binspan.planner.viewmodel.Site;
import binspan.planner.viewmodel.Words;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javafx.beans.value.ObservableValue;
import javafx.collections.ListChangeListener;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuItem;
import javafx.scene.control.RadioMenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.ToggleGroup;
import javafx.scene.input.KeyCombination;

/** The menu bar. */
final class WindowMenus {
    private final PlannerModel model;
    private final Look look;
    private final Filing filing;
    private final Exports exports;
    private final Pages pages;
    private final Help help;

    /** What the menu of the view needs of the window. */
    interface Pages {
        /** Keys of the pages in their order. */
        List<String> keys();

        /** Shows a page. */
        void show(String key);

        /** Calls back with the key of the page that is shown, now and whenever it changes. */
        void followPage(Consumer<String> change);

        /** Goes to the next part of the window. */
        void nextPart();
    }

    /** The actions that the menus lead to. */
    WindowMenus(PlannerModel model, Look look, Filing filing, Exports exports, Pages pages, Help help) {
        this.model = model;
        this.look = look;
        this.filing = filing;
        this.exports = exports;
        this.pages = pages;
        this.help = help;
    }

    /** The bar. */
    MenuBar bar(Runnable close) {
        MenuBar bar = new MenuBar(file(close), edit(), link(), show(), helping());
        bar.setId("menus");
        return bar;
    }

    private Menu file(Runnable close) {
        Menu starters = Menus.menu("new");
        for (Preset preset : Preset.values()) {
            MenuItem item = new MenuItem(preset.text() + ": " + preset.summary());
            item.setId("menu-new-" + preset.text());
            item.setOnAction(event -> filing.begin(preset));
            starters.getItems().add(item);
        }
        return Menus.menu(
                "file",
                starters,
                Menus.item("open", filing::open),
                recent(),
                new SeparatorMenuItem(),
                Menus.item("save", filing::save),
                Menus.item("saveAs", filing::saveAs),
                Menus.menu(
                        "export",
                        Menus.item("export.verdict", exports::verdict),
                        Menus.item("export.json", exports::json),
                        Menus.item("export.worksheet", exports::worksheet),
                        Menus.item("export.window", exports::window)),
                new SeparatorMenuItem(),
                Menus.item("close", close));
    }

    private Menu recent() {
        Menu recent = Menus.menu("recent");
        model.file().recent().addListener((ListChangeListener<RecentFiles.Entry>) change -> fill(recent));
        fill(recent);
        return recent;
    }

    private void fill(Menu recent) {
        List<MenuItem> items = new ArrayList<>();
        for (RecentFiles.Entry entry : model.file().recent()) {
            String name = entry.file().toString();
            MenuItem item = new MenuItem(entry.missing() ? Words.of("menu.recent.missing", name) : name);
            item.setMnemonicParsing(false);
            item.setDisable(entry.missing());
            item.setOnAction(event -> filing.open(entry.file()));
            items.add(item);
        }
        if (items.isEmpty()) {
            MenuItem none = new MenuItem(Words.of("menu.recent.none"));
            none.setDisable(true);
            items.add(none);
        }
        recent.getItems().setAll(items);
    }

    private Menu edit() {
        Design design = model.design();
        MenuItem undo = named("undo", design.undoTextProperty(), design::undo);
        MenuItem redo = named("redo", design.redoTextProperty(), design::redo);
        return Menus.menu(
                "edit",
                undo,
                redo,
                new SeparatorMenuItem(),
                Menus.item("copy.verdict", exports::copyVerdict),
                Menus.item("copy.picture", exports::copyPage),
                Menus.item("copy.link", exports::copyLink));
    }

    /** An item that says what it would do, where there is something to do. */
    private static MenuItem named(String key, ObservableValue<String> what, Runnable action) {
        MenuItem item = Menus.item(key, what.map(each -> !each.isEmpty()), action);
        item.textProperty()
                .bind(what.map(
                        each -> each.isEmpty() ? Words.of("menu." + key) : Words.of("menu." + key + ".what", each)));
        return item;
    }

    /** The commands of the drawn link, for those who look for them in a menu. */
    private Menu link() {
        LinkCommands commands = model.link().commands();
        Menu add = Menus.menu("link.add");
        add.disableProperty().bind(commands.add().enabledProperty().not());
        for (LinkItem.Kind kind : LinkCommands.ADDABLE) {
            MenuItem item = new MenuItem(Words.of("link.kind." + kind.name()));
            item.setOnAction(event -> commands.add(kind, false));
            add.getItems().add(item);
        }
        return Menus.menu(
                "link",
                add,
                Menus.item("link.split", commands.split().enabledProperty(), commands.split()::run),
                Menus.item(
                        "link.alice",
                        commands.towards(Site.ALICE).enabledProperty(),
                        commands.towards(Site.ALICE)::run),
                Menus.item("link.bob", commands.towards(Site.BOB).enabledProperty(), commands.towards(Site.BOB)::run),
                Menus.item("link.remove", commands.remove().enabledProperty(), commands.remove()::run));
    }

    private Menu show() {
        Menu menu = Menus.menu("show");
        List<String> keys = pages.keys();
        ToggleGroup shown = new ToggleGroup();
        for (int i = 0; i < keys.size(); i++) {
            String key = keys.get(i);
            RadioMenuItem item = new RadioMenuItem(Words.of("page." + key));
            item.setToggleGroup(shown);
            pages.followPage(now -> {
                if (now.equals(key)) {
                    item.setSelected(true);
                }
            });
            item.setId("menu-page-" + key);
            item.setAccelerator(KeyCombination.valueOf(Words.of("menu.page.keys", i + 1)));
            item.setOnAction(event -> pages.show(key));
            menu.getItems().add(item);
        }
        menu.getItems().addAll(new SeparatorMenuItem(), Menus.item("parts", pages::nextPart), new SeparatorMenuItem());
        ToggleGroup themes = new ToggleGroup();
        for (Theme theme : Theme.values()) {
            RadioMenuItem item = Menus.choice(
                    theme.text(), themes, () -> look.themeProperty().set(theme));
            look.themeProperty().subscribe(now -> item.setSelected(now == theme));
            menu.getItems().add(item);
        }
        menu.getItems().addAll(new SeparatorMenuItem(), scale());
        return menu;
    }

    private Menu scale() {
        Menu menu = Menus.menu("scale");
        ToggleGroup scales = new ToggleGroup();
        for (int percent : Look.SCALES) {
            RadioMenuItem item = new RadioMenuItem(Words.of("menu.scale.percent", percent));
            item.setId("menu-scale-" + percent);
            item.setToggleGroup(scales);
            item.setOnAction(event -> look.scalePercentProperty().set(percent));
            look.scalePercentProperty().subscribe(now -> item.setSelected(now.intValue() == percent));
            menu.getItems().add(item);
        }
        return menu;
    }

    private Menu helping() {
        return Menus.menu(
                "help",
                Menus.item("keys", help::keys),
                Menus.item("care", help::care),
                Menus.item("about", help::about));
    }
}
