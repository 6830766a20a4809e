package hemline.viewer.view;

import hemline.viewer.viewmodel.LedgerColumn;
import hemline.viewer.viewmodel.LedgerModel;
import java.util.Comparator;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.value.ObservableValue;
import javafx.collections.ObservableList;
import javafx.collections.transformation.SortedList;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.VBox;

/** One table of the ledger; its selection is the window's. */
final class LedgerTable<R> {
    private final TableView<R> table = new TableView<>();
    private final List<LedgerColumn<R>> columns;
    private final SortedList<R> sorted;
    private final Function<R, String> id;
    private boolean following;

    /**
     * @param chosen   told the id of a row the user selects
     * @param selected the window's selection, an id, empty for none
     */
    LedgerTable(String name, List<LedgerColumn<R>> columns, ObservableList<R> rows, Function<R, String> id,
                ObservableValue<String> selected, Consumer<String> chosen, String whenEmpty) {
        this.columns = columns;
        this.id = id;
        sorted = new SortedList<>(rows);
        table.setId(name);
        table.setAccessibleText("Ledger: " + name);
        table.setItems(sorted);
        table.setTableMenuButtonVisible(true);
        Label empty = new Label(whenEmpty);
        empty.setWrapText(true);
        empty.getStyleClass().add("muted");
        table.setPlaceholder(empty);
        columns.forEach(column -> table.getColumns().add(tableColumn(column)));
        // JavaFX would put rows without a value first when descending.
        table.setSortPolicy(t -> {
            sorted.setComparator(order());
            return true;
        });
        table.getSelectionModel().selectedItemProperty().addListener((o, was, now) -> {
            if (now != null && !following) {
                chosen.accept(id.apply(now));
            }
        });
        selected.addListener((o, was, now) -> follow(now));
        rows.addListener((javafx.collections.ListChangeListener<R>) change -> follow(selected.getValue()));
        table.setOnKeyPressed(e -> {
            if (e.isShortcutDown() && !e.isShiftDown() && e.getCode() == KeyCode.C) {
                copy();
                e.consume();
            }
        });
    }

    TableView<R> node() {
        return table;
    }

    private TableColumn<R, String> tableColumn(LedgerColumn<R> column) {
        TableColumn<R, String> made = new TableColumn<>();
        Label unit = new Label(column.unit());
        unit.getStyleClass().add("muted");
        VBox heading = new VBox(new Label(column.title()), unit);
        heading.setAlignment(column.numeric() ? Pos.CENTER_RIGHT : Pos.CENTER_LEFT);
        Tooltip.install(heading, new Tooltip(column.heading() + ": " + column.tooltip()));
        // The column chooser and screen readers take the text; the header shows the graphic alone.
        made.setGraphic(heading);
        made.setText(column.heading());
        made.setId("column-" + column.title());
        made.setCellValueFactory(row -> new ReadOnlyObjectWrapper<>(column.text().apply(row.getValue())));
        made.setUserData(column);
        if (column.numeric()) {
            made.getStyleClass().add("numeric");
        }
        made.setPrefWidth(Math.max(50, 7.6 * Math.max(column.title().length(), 4) + 20));
        return made;
    }

    private Comparator<R> order() {
        Comparator<R> order = null;
        for (TableColumn<R, ?> column : table.getSortOrder()) {
            boolean descending = column.getSortType() == TableColumn.SortType.DESCENDING;
            Comparator<R> next = columns.get(indexOf(column)).order(descending);
            order = order == null ? next : order.thenComparing(next);
        }
        return order;
    }

    private int indexOf(TableColumn<R, ?> wanted) {
        for (int i = 0; i < columns.size(); i++) {
            if (wanted.getUserData() == columns.get(i)) {
                return i;
            }
        }
        throw new IllegalStateException("the table has a column the ledger does not know");
    }

    private void follow(String wanted) {
        following = true;
        if (wanted.isEmpty()) {
            table.getSelectionModel().clearSelection();
        } else {
            for (int i = 0; i < sorted.size(); i++) {
                if (id.apply(sorted.get(i)).equals(wanted)) {
                    table.getSelectionModel().clearAndSelect(i);
                    table.scrollTo(Math.max(0, i - 3));
                }
            }
        }
        following = false;
    }

    /** All rows, as sorted and filtered, in the columns shown, as text. */
    void copy() {
        List<LedgerColumn<R>> shown = table.getColumns().stream().filter(TableColumn::isVisible)
                .map(column -> columns.get(indexOf(column))).toList();
        ClipboardContent content = new ClipboardContent();
        content.putString(LedgerModel.asText(shown, sorted));
        Clipboard.getSystemClipboard().setContent(content);
    }
}
