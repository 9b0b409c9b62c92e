package throwbench.app.drawing;

import java.util.List;
import java.util.function.BiConsumer;
import java.util.function.Predicate;
import javafx.geometry.Side;
import javafx.scene.control.CheckMenuItem;
import javafx.scene.control.MenuButton;
import throwbench.solver.revolution.Column;

/** A button from which columns are chosen by name, each switched on or off. */
public final class ColumnMenu extends MenuButton {

    /**
     * @param accessible what is chosen, for those who hear the window
     * @param columns to choose from
     * @param isOn whether a column is shown now
     * @param choose takes a column and whether it shall be shown
     */
    public ColumnMenu(
            String accessible, List<Column> columns, Predicate<Column> isOn, BiConsumer<Column, Boolean> choose) {
        super("+");
        getStyleClass().add("column-menu");
        setAccessibleText(accessible);
        setPopupSide(Side.BOTTOM);
        for (Column column : columns) {
            CheckMenuItem item = new CheckMenuItem(ColumnWords.title(column));
            item.setId("column-" + column.fileName());
            item.setOnAction(e -> choose.accept(column, !isOn.test(column)));
            getItems().add(item);
        }
        setOnShowing(e -> {
            for (int i = 0; i < columns.size(); i++) {
                ((CheckMenuItem) getItems().get(i)).setSelected(isOn.test(columns.get(i)));
            }
        });
    }
}
