package throwbench.app.linkage;

import java.util.EnumSet;
import javafx.geometry.Side;
import javafx.scene.control.CheckBox;
import javafx.scene.control.CustomMenuItem;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import throwbench.app.linkage.force.ForceKind;

/** What the user chooses to see in the linkage view: kinds of arrows, their length, the other throws. */
final class LinkageMenu extends MenuButton {

    private static final double LENGTH_STEP = 1.25;
    private static final double SHORTEST = 0.25;
    private static final double LONGEST = 4;

    private final LinkageView view;

    LinkageMenu(LinkageView view) {
        super("arrows");
        this.view = view;
        setId("linkage-menu");
        setAccessibleText("Arrows and throws shown in the linkage view");
        setFocusTraversable(true);
        setManaged(false);
        // below stands the strip
        setPopupSide(Side.TOP);
        getStyleClass().add("small");
        for (ForceKind kind : ForceKind.values()) {
            getItems().add(kind(kind));
        }
        getItems().add(new SeparatorMenuItem());
        getItems().add(item("longer arrows", () -> stretch(LENGTH_STEP)));
        getItems().add(item("shorter arrows", () -> stretch(1 / LENGTH_STEP)));
        getItems().add(item("usual length", () -> view.arrowFactor().set(1)));
        getItems().add(new SeparatorMenuItem());
        CheckBox alone = new CheckBox("this throw only");
        alone.selectedProperty().bindBidirectional(view.alone());
        getItems().add(staying(alone));
        getItems().add(item("frame all (F)", view::frameAll));
    }

    /** A box for one kind; the menu stays open, for one rarely wants to change one kind alone. */
    private CustomMenuItem kind(ForceKind kind) {
        CheckBox box = new CheckBox(kind.label());
        box.setSelected(view.kinds().get().contains(kind));
        box.setOnAction(e -> {
            EnumSet<ForceKind> next = EnumSet.copyOf(view.kinds().get());
            if (box.isSelected()) {
                next.add(kind);
            } else {
                next.remove(kind);
            }
            view.kinds().set(next);
        });
        view.kinds().addListener((o, before, now) -> box.setSelected(now.contains(kind)));
        return staying(box);
    }

    private static CustomMenuItem staying(CheckBox box) {
        CustomMenuItem item = new CustomMenuItem(box, false);
        item.setMnemonicParsing(false);
        return item;
    }

    private static MenuItem item(String text, Runnable action) {
        MenuItem item = new MenuItem(text);
        item.setMnemonicParsing(false);
        item.setOnAction(e -> action.run());
        return item;
    }

    private void stretch(double by) {
        double factor = view.arrowFactor().get() * by;
        view.arrowFactor().set(Math.max(SHORTEST, Math.min(LONGEST, factor)));
    }

    /** Stands in the lower right corner of a view of this size. */
    void stand(double width, double height, double border) {
        autosize();
        relocate(width - border - getWidth(), height - border / 2 - getHeight());
    }
}
