package hemline.viewer.view;

import hemline.viewer.render.Chrome;
import hemline.viewer.render.RailPainter;
import hemline.viewer.viewmodel.RailLayout;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.viewer.viewmodel.Words;
import hemline.workflow.LoopSession;
import javafx.scene.AccessibleRole;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;

/** The time axis: drag to scrub, click a bar or a mark to select it, Left and Right to step. */
final class RailView extends CanvasRegion {
    private final ViewerModel model;
    private final RailPainter painter = new RailPainter();
    private RailLayout layout;
    private LoopSession laidOut;
    private double laidWidth;
    private double laidHeight;

    RailView(ViewerModel model) {
        super(model.settings());
        this.model = model;
        setId("rail");
        getStyleClass().add("rail");
        setPrefHeight(112);
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.SLIDER);
        redraw().on(model.sessionProperty(), model.loop().indexProperty(), model.loop().firstProperty(),
                model.loop().lastProperty(), model.selection().trackProperty(), model.selection().meetingProperty());
        setOnMousePressed(this::press);
        setOnMouseDragged(e -> scrub(e.getX()));
        setOnScroll(e -> {
            if (e.getDeltaY() != 0 && layout != null) {
                model.loop().step(e.getDeltaY() > 0 ? -1 : 1);
            }
        });
        setOnKeyPressed(this::key);
    }

    private void press(MouseEvent e) {
        requestFocus();
        if (layout == null) {
            return;
        }
        var meeting = layout.meetingAt(e.getX(), e.getY());
        var track = layout.trackAt(e.getX(), e.getY());
        if (meeting.isPresent()) {
            model.goToMeeting(meeting.get().id());
        } else if (track.isPresent()) {
            model.selection().selectTrack(track.get().id());
        } else {
            scrub(e.getX());
        }
    }

    private void scrub(double x) {
        if (layout != null) {
            model.loop().show(layout.sweepAt(x));
        }
    }

    private void key(KeyEvent e) {
        if (layout == null || e.isShortcutDown() || e.isAltDown()) {
            return;
        }
        switch (e.getCode()) {
            case LEFT -> model.loop().step(-1);
            case RIGHT -> model.loop().step(1);
            default -> {
                return;
            }
        }
        e.consume();
    }

    @Override
    void paint() {
        LoopSession session = model.session();
        Chrome chrome = chrome();
        if (session == null) {
            layout = null;
            var g = canvas().getGraphicsContext2D();
            g.setFill(chrome.ground());
            g.fillRect(0, 0, getWidth(), getHeight());
            return;
        }
        if (layout == null || session != laidOut || getWidth() != laidWidth || getHeight() != laidHeight) {
            layout = RailLayout.of(session, getWidth(), getHeight());
            laidOut = session;
            laidWidth = getWidth();
            laidHeight = getHeight();
        }
        painter.paint(canvas().getGraphicsContext2D(), layout, new RailPainter.State(model.loop().index(),
                model.loop().firstProperty().get(), model.loop().lastProperty().get(), model.selection().track(),
                model.selection().meeting(), session.tracks()), chrome, getWidth(), getHeight());
        setAccessibleText("Rail: sweep " + (model.loop().index() + 1) + " of " + session.frames().size() + " at "
                + Words.clock(session.frames().get(model.loop().index()).meanTimeMs()) + " UTC");
    }
}
