package hemline.viewer.view;

import hemline.boundary.Track;
import hemline.viewer.render.Inks;
import hemline.viewer.render.TracePainter;
import hemline.viewer.viewmodel.TimeScale;
import hemline.viewer.viewmodel.Trace;
import hemline.viewer.viewmodel.ViewerModel;
import java.util.Optional;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Tooltip;

/** One trace of the selected track; hover reads it out, a click goes to that sweep. */
final class TraceView extends CanvasRegion {
    private final ViewerModel model;
    private final boolean timed;
    private final TracePainter painter = new TracePainter();
    private final Tooltip about = new Tooltip();
    private Track track;
    private Trace trace;
    private Optional<Trace.Sample> hovered = Optional.empty();

    /** @param timed whether times are written under it */
    TraceView(ViewerModel model, boolean timed) {
        super(model.settings());
        this.timed = timed;
        this.model = model;
        Tooltip.install(this, about);
        setMinHeight(timed ? 55 : 46);
        setPrefHeight(timed ? 99 : 88);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        redraw().on(model.loop().indexProperty());
        setOnMouseMoved(e -> hover(e.getX()));
        setOnMouseExited(e -> {
            hovered = Optional.empty();
            redraw().request();
        });
        setOnMouseClicked(e -> hovered.ifPresent(sample -> model.loop().show(sample.sweep())));
    }

    void show(Track newTrack, Trace newTrace) {
        track = newTrack;
        trace = newTrace;
        hovered = Optional.empty();
        setId("trace-" + trace.name().toLowerCase(java.util.Locale.ROOT).replace(' ', '-'));
        setAccessibleText(trace.name() + " of " + track.id() + ": " + (trace.samples().isEmpty() ? trace.none()
                : trace.words(trace.samples().get(0)) + " to "
                        + trace.words(trace.samples().get(trace.samples().size() - 1))));
        about.setText(trace.about());
        redraw().request();
    }

    private TimeScale time() {
        long from = track.firstMs();
        return new TimeScale(from, Math.max(from + 60_000, track.lastMs()), TracePainter.LEFT_PX + 6,
                Math.max(TracePainter.LEFT_PX + 7, getWidth() - TracePainter.RIGHT_PX - 6));
    }

    private void hover(double x) {
        if (trace != null) {
            hovered = trace.nearest(time().timeMs(x));
            redraw().request();
        }
    }

    @Override
    void paint() {
        if (trace != null && model.session() != null) {
            painter.paint(canvas().getGraphicsContext2D(), trace, time(),
                    model.session().frames().get(model.loop().index()).meanTimeMs(), hovered,
                    Inks.of(track, model.session().tracks()), chrome(),
                    timed, getWidth(), getHeight());
        }
    }
}
