package hemline.viewer.view;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.viewer.viewmodel.ViewerModel;
import javafx.collections.ListChangeListener;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** The tables of tracks and meetings with their filter. */
final class LedgerView extends VBox {
    private final ViewerModel model;
    private final TextField filter = new TextField();
    private final Tab tracks = new Tab();
    private final Tab meetings = new Tab();

    LedgerView(ViewerModel model) {
        this.model = model;
        getStyleClass().add("ledger");
        LedgerTable<Track> trackTable = new LedgerTable<>("tracks", model.ledger().trackColumns(),
                model.ledger().tracks(), Track::id, model.selection().trackProperty(), model::goToTrack,
                "No tracks yet: they appear when the loop is analysed, or none fits the filter.");
        LedgerTable<Meeting> meetingTable = new LedgerTable<>("meetings", model.ledger().meetingColumns(),
                model.ledger().meetings(), Meeting::id, model.selection().meetingProperty(), model::goToMeeting,
                "No meetings: no two tracks touch in the loop or are expected to, or none fits the filter.");
        tracks.setContent(trackTable.node());
        meetings.setContent(meetingTable.node());
        TabPane tabs = new TabPane(tracks, meetings);
        tabs.setId("ledger-tabs");
        tabs.setTabClosingPolicy(TabPane.TabClosingPolicy.UNAVAILABLE);
        model.ledger().tracks().addListener((ListChangeListener<Track>) change -> count());
        model.ledger().meetings().addListener((ListChangeListener<Meeting>) change -> count());
        model.selection().meetingProperty().addListener((o, was, now) -> {
            if (!now.isEmpty()) {
                tabs.getSelectionModel().select(meetings);
            }
        });
        model.selection().trackProperty().addListener((o, was, now) -> {
            if (!now.isEmpty()) {
                tabs.getSelectionModel().select(tracks);
            }
        });
        filter.setId("ledger-filter");
        filter.setPromptText("Filter, for example T03 or observed");
        filter.setTooltip(new Tooltip("Rows stay in which every word typed occurs (Ctrl+F)"));
        filter.textProperty().bindBidirectional(model.ledger().filterProperty());
        Button copy = new Button("Copy as text");
        copy.setId("ledger-copy");
        copy.setMinWidth(USE_PREF_SIZE);
        copy.setTooltip(new Tooltip("Copies the rows and columns shown, tab-separated (Ctrl+C in the table)"));
        copy.setOnAction(e -> {
            if (tabs.getSelectionModel().getSelectedItem() == tracks) {
                trackTable.copy();
            } else {
                meetingTable.copy();
            }
        });
        HBox.setHgrow(filter, Priority.ALWAYS);
        HBox tools = new HBox(6, filter, copy);
        tools.setAlignment(Pos.CENTER_LEFT);
        tools.getStyleClass().add("tools");
        VBox.setVgrow(tabs, Priority.ALWAYS);
        getChildren().addAll(tools, tabs);
        setMinWidth(220);
        count();
    }

    private void count() {
        tracks.setText("Tracks  " + model.ledger().tracks().size());
        meetings.setText("Meetings  " + model.ledger().meetings().size());
    }

    void focusFilter() {
        filter.requestFocus();
        filter.selectAll();
    }
}
