package binspan.planner.view;

import binspan.planner.viewmodel.LinkCommand;
import binspan.planner.viewmodel.LinkCommands;
import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkModel;
import binspan.planner.viewmodel.LinkPart;
import binspan.planner.viewmodel.Site;
import binspan.planner.viewmodel.Words;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.binding.Bindings;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.StackPane;
import javafx.scene.shape.SVGPath;

/** The commands of the drawn link as a row of buttons; where one cannot be used, its tooltip says why. */
final class LinkTools extends HBox {
    private static final String PLUS = "M4,0 H7 V4 H11 V7 H7 V11 H4 V7 H0 V4 H4 Z";
    private static final String CUT = "M0,5 H4 V7 H0 Z M8,5 H12 V7 H8 Z M5.2,0 H6.8 V4 H5.2 Z M5.2,8 H6.8 V12 H5.2 Z";
    private static final String LEFT = "M8,0 L8,11 L0,5.5 Z";
    private static final String RIGHT = "M0,0 L0,11 L8,5.5 Z";
    private static final String CROSS =
            "M0,2 L2,0 L5.5,3.5 L9,0 L11,2 L7.5,5.5 L11,9 L9,11 L5.5,7.5 L2,11 L0,9 L3.5,5.5 Z";

    private final LinkModel model;
    private final MenuButton add = new MenuButton(Words.of("link.add"));
    private final Runnable openSplit;

    /**
     * The row.
     *
     * @param model the link
     * @param openSplit asks where to split
     */
    LinkTools(LinkModel model, Runnable openSplit) {
        this.model = model;
        this.openSplit = openSplit;
        getStyleClass().add("link-tools");
        LinkCommands commands = model.commands();
        Button split = new Button(Words.of("link.split"));
        split.setOnAction(event -> split());
        add.setOnShowing(event -> fillMenu());
        fillMenu();
        tool(add, "link-add", PLUS, "link.add.tip", commands.add());
        tool(split, "link-split", CUT, "link.split.tip", commands.split());
        move("link-left", LEFT, "link.left", Site.ALICE);
        move("link-right", RIGHT, "link.right", Site.BOB);
        Button remove = new Button(Words.of("link.remove"));
        remove.setOnAction(event -> commands.remove().run());
        tool(remove, "link-remove", CROSS, "link.remove.tip", commands.remove());
    }

    /** Opens the menu of what can be added. */
    void add() {
        if (!add.isDisabled()) {
            add.requestFocus();
            add.show();
        }
    }

    /** Asks where to split. */
    void split() {
        if (model.commands().split().enabledProperty().get()) {
            openSplit.run();
        }
    }

    private void move(String id, String icon, String words, Site site) {
        Button button = new Button();
        button.setOnAction(event -> model.commands().towards(site).run());
        tool(button, id, icon, words, model.commands().towards(site));
    }

    private void tool(ButtonBase button, String id, String icon, String words, LinkCommand command) {
        button.setId(id);
        SVGPath shape = new SVGPath();
        shape.setContent(icon);
        shape.getStyleClass().add("link-icon");
        button.setGraphic(shape);
        button.setAccessibleText(Words.of(words));
        button.disableProperty().bind(Bindings.not(command.enabledProperty()));
        Tooltip tooltip = new Tooltip();
        tooltip.textProperty()
                .bind(Bindings.when(command.refusalProperty().isEmpty())
                        .then(Words.of(words))
                        .otherwise(command.refusalProperty()));
        Node holder = new StackPane(button);
        Tooltip.install(holder, tooltip);
        getChildren().add(holder);
    }

    private void fillMenu() {
        add.getItems().clear();
        if (!model.commands().addsOnBothSides()) {
            group(Words.of("link.add.here"), true);
            return;
        }
        group(Words.of("link.add.outside", site().map(Site::path).orElse("")), true);
        add.getItems().add(new SeparatorMenuItem());
        group(Words.of("link.add.inside"), false);
    }

    private Optional<Site> site() {
        int selected = model.selectedProperty().get();
        return selected >= 0 && model.items().get(selected).part() instanceof LinkPart.Element element
                ? Optional.of(element.site())
                : Optional.empty();
    }

    private void group(String heading, boolean outside) {
        MenuItem title = new MenuItem(heading);
        title.setDisable(true);
        title.getStyleClass().add("link-menu-heading");
        add.getItems().add(title);
        for (Kind kind : LinkCommands.ADDABLE) {
            MenuItem item = new MenuItem(Words.of("link.kind." + kind.name()));
            item.setId("link-add-" + (outside ? "" : "inside-") + kind.name().toLowerCase(Locale.ROOT));
            item.setOnAction(event -> model.commands().add(kind, outside));
            add.getItems().add(item);
        }
    }
}
