package hemline.viewer.view;

import hemline.geometry.Point;
import hemline.viewer.render.Letters;
import hemline.viewer.render.OverlayPainter;
import hemline.viewer.render.PlaneScene;
import hemline.viewer.render.RasterFeed;
import hemline.viewer.render.SweepRaster;
import hemline.viewer.viewmodel.Motion;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.ViewTransform;
import hemline.viewer.viewmodel.ViewerModel;
import java.util.EnumSet;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Stream;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.canvas.Canvas;
import javafx.scene.image.ImageView;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;
import javafx.scene.shape.Rectangle;

/**
 * The sweep from above with its overlays. While the view moves, the last picture is moved and stretched; a sharp one
 * follows.
 */
final class PlaneView extends Region {
    /** A press that moves less than this is a click, pixels. */
    private static final double CLICK_PX = 4;
    private static final double HIT_PX = 9;
    private static final double WHEEL_ZOOM = 1.0016;

    private final ViewerModel model;
    private final RasterFeed feed;
    private final ImageView sweep = new ImageView();
    private final Canvas overlays = new Canvas();
    private final OverlayPainter painter = new OverlayPainter();
    private Letters letters = new Letters(1);
    private final Redraw redraw = new Redraw(this::paint);
    private double pressX;
    private double pressY;
    private double lastX;
    private double lastY;
    private int direction = 1;

    PlaneView(ViewerModel model, RasterFeed feed) {
        this.model = model;
        this.feed = feed;
        getStyleClass().add("plane");
        setId("plane");
        setMinSize(80, 80);
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        sweep.setManaged(false);
        overlays.setManaged(false);
        overlays.setMouseTransparent(true);
        sweep.setMouseTransparent(true);
        sweep.opacityProperty().bind(model.plane().opacityProperty());
        getChildren().addAll(sweep, overlays);
        Rectangle clip = new Rectangle();
        clip.widthProperty().bind(widthProperty());
        clip.heightProperty().bind(heightProperty());
        setClip(clip);
        widthProperty().addListener((o, was, now) -> resized());
        heightProperty().addListener((o, was, now) -> resized());
        model.loop().indexProperty().addListener((o, was, now) ->
                direction = now.intValue() < was.intValue() && model.loop().motionProperty().get() != Motion.FORWARD
                        ? -1 : 1);
        watch();
        mouse();
    }

    private void watch() {
        redraw.on(model.sessionProperty(), model.shownProperty(), model.loop().indexProperty(),
                model.plane().viewProperty(), model.plane().fieldProperty(), model.selection().trackProperty(),
                model.selection().meetingProperty(), model.measure().fromProperty(), model.measure().toProperty(),
                        model.map().linesProperty());
        for (Overlay overlay : Overlay.values()) {
            redraw.on(model.overlays().shown(overlay));
        }
        model.settings().textScaleProperty().addListener((o, was, now) -> {
            letters = new Letters(now.doubleValue());
            redraw.request();
        });
        feed.rasterProperty().addListener((o, was, now) -> placeSweep());
        model.sweepTroubleProperty().addListener((o, was, now) -> placeSweep());
        model.measure().onProperty().addListener((o, was, now) -> setCursor(now ? Cursor.CROSSHAIR : Cursor.DEFAULT));
    }

    private void resized() {
        overlays.setWidth(getWidth());
        overlays.setHeight(getHeight());
        model.plane().resize(getWidth(), getHeight());
        redraw.request();
    }

    private void paint() {
        if (model.session() == null || getWidth() < 1 || getHeight() < 1) {
            return;
        }
        double scale = getScene() == null || getScene().getWindow() == null ? 1
                : getScene().getWindow().getOutputScaleX();
        PlaneScene scene = scene();
        feed.want(model.store(), scene, model.plane().fieldProperty().get(), direction, scale);
        placeSweep();
        painter.paint(overlays.getGraphicsContext2D(), scene);
        setAccessibleText(PlaneWords.of(model));
    }

    /** What the overlays are drawn from now. */
    PlaneScene scene() {
        Set<Overlay> shown = EnumSet.noneOf(Overlay.class);
        for (Overlay overlay : Overlay.values()) {
            if (model.overlays().isShown(overlay)) {
                shown.add(overlay);
            }
        }
        return new PlaneScene(model.session(), model.loop().index(), model.plane().view(), shown,
                model.selection().track(), model.selection().meeting(),
                Stream.of(model.measure().fromProperty().get(), model.measure().toProperty().get())
                        .filter(Objects::nonNull).toList(), model.map().linesProperty().get(),
                letters);
    }

    /** Whether the picture is of the sweep, field and view wanted, rather than an earlier one stretched. */
    boolean isSharp() {
        SweepRaster raster = feed.rasterProperty().get();
        return raster != null && raster.view().equals(model.plane().view()) && raster.index() == model.loop().index()
                && raster.field() == model.plane().fieldProperty().get();
    }

    /** Lays the newest picture where its view lies in the present one. */
    private void placeSweep() {
        SweepRaster raster = feed.rasterProperty().get();
        boolean any = raster != null && model.session() != null && model.sweepTroubleProperty().get().isEmpty();
        sweep.setVisible(any);
        if (!any) {
            return;
        }
        ViewTransform now = model.plane().view();
        ViewTransform then = raster.view();
        Point corner = then.toPlane(0, 0);
        double stretch = now.pxPerKm() / then.pxPerKm();
        sweep.setImage(raster.image());
        sweep.setFitWidth(then.widthPx() * stretch);
        sweep.setFitHeight(then.heightPx() * stretch);
        sweep.setSmooth(false);
        sweep.setX(now.equals(then) ? 0 : now.screenX(corner));
        sweep.setY(now.equals(then) ? 0 : now.screenY(corner));
    }

    private void mouse() {
        setOnMousePressed(e -> {
            requestFocus();
            pressX = lastX = e.getX();
            pressY = lastY = e.getY();
        });
        setOnMouseDragged(e -> {
            cursorAt(e);
            if (e.isPrimaryButtonDown() || e.isMiddleButtonDown()) {
                model.plane().pan(e.getX() - lastX, e.getY() - lastY);
                lastX = e.getX();
                lastY = e.getY();
            }
        });
        setOnMouseReleased(e -> {
            if (e.getButton() == MouseButton.PRIMARY && Math.hypot(e.getX() - pressX, e.getY() - pressY) < CLICK_PX) {
                click(e);
            }
        });
        setOnMouseMoved(this::cursorAt);
        setOnMouseExited(e -> model.plane().cursorProperty().set(null));
        setOnScroll(e -> {
            if (e.getDeltaY() != 0 && model.session() != null) {
                model.plane().zoom(Math.pow(WHEEL_ZOOM, e.getDeltaY() * 3), e.getX(), e.getY());
            }
            e.consume();
        });
        setOnZoom(e -> {
            model.plane().zoom(e.getZoomFactor(), e.getX(), e.getY());
            e.consume();
        });
    }

    private void cursorAt(MouseEvent e) {
        if (model.session() != null) {
            model.plane().cursorProperty().set(model.plane().view().toPlane(e.getX(), e.getY()));
        }
    }

    private void click(MouseEvent e) {
        Point place = model.plane().view().toPlane(e.getX(), e.getY());
        if (model.measure().onProperty().get()) {
            model.markAt(place);
        } else {
            model.selectAt(place, HIT_PX / model.plane().view().pxPerKm());
        }
    }
}
