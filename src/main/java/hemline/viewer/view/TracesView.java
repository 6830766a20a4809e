package hemline.viewer.view;

import hemline.boundary.Track;
import hemline.viewer.viewmodel.Trace;
import hemline.viewer.viewmodel.Traces;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.viewer.viewmodel.Words;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.scene.control.Label;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/** Speed, radius, length and reflectivity of the selected track against time. */
final class TracesView extends StackPane {
    private final ViewerModel model;
    private final Label heading = new Label();
    private final Label hint = new Label("Select a track on the plane, the rail or in the ledger to see its speed,"
            + " radius, length and reflectivity against time.");
    private final List<TraceView> views;
    private final VBox column;

    TracesView(ViewerModel model) {
        this.model = model;
        getStyleClass().add("traces");
        setId("traces");
        views = Stream.of(false, false, false, true).map(timed -> new TraceView(model, timed)).toList();
        column = new VBox(heading);
        column.getChildren().addAll(views);
        views.forEach(view -> VBox.setVgrow(view, Priority.ALWAYS));
        heading.setWrapText(true);
        heading.setMinHeight(USE_PREF_SIZE);
        heading.setId("traces-heading");
        heading.getStyleClass().add("traces-heading");
        hint.setWrapText(true);
        hint.setId("traces-hint");
        hint.getStyleClass().add("muted");
        getChildren().addAll(column, hint);
        setMinSize(0, 0);
        new Redraw(this::say).on(model.selection().trackProperty(), model.sessionProperty());
        say();
    }

    private void say() {
        Optional<Track> track = model.track(model.selection().track());
        column.setVisible(track.isPresent());
        hint.setVisible(track.isEmpty());
        track.ifPresent(this::show);
    }

    private void show(Track track) {
        StringBuilder words = new StringBuilder(track.id());
        // A ring moves every way at once and has no bearing as a whole.
        boolean oneWay = Double.isFinite(track.bearingDeg());
        words.append(oneWay ? " toward " + Words.bearing(track.bearingDeg()) + " at " : ", ")
                .append(track.speed().isKnown() ? Words.speed(track.speed()) : "speed not known");
        track.arc().ifPresent(arc -> words.append(", radius growing ").append(Words.speed(arc.expansion())));
        heading.setText(words.append(" (\u00b1 2 sd)").toString());
        List<Trace> traces = Traces.of(track);
        for (int i = 0; i < views.size(); i++) {
            views.get(i).show(track, traces.get(i));
        }
    }
}
