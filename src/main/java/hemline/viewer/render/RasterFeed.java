package hemline.viewer.render;

import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.SweepStore;
import hemline.viewer.viewmodel.ViewTransform;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Executor;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

/**
 * Draws wanted sweeps in the background and their neighbours after them, so that a step finds its picture ready.
 * Only the newest wish counts. Call on the user's thread.
 */
public final class RasterFeed {
    /** Pictures kept: the one shown, neighbours on both sides, and some just seen. */
    private static final int KEPT = 10;
    private static final int AHEAD = 3;
    private static final int BEHIND = 1;
    private static final long GRID_BUDGET_BYTES = 256L << 20;

    private final Executor background;
    private final Executor ui;
    private final ReadOnlyObjectWrapper<SweepRaster> raster = new ReadOnlyObjectWrapper<>(this, "raster");
    private final Map<Wish, SweepRaster> kept = new LinkedHashMap<>(16, 0.75f, true) {
        private static final long serialVersionUID = 1;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Wish, SweepRaster> eldest) {
            return size() > KEPT;
        }
    };
    private final GridCache grids = new GridCache(GRID_BUDGET_BYTES);
    private volatile Wish wanted;
    private PolarMap map;
    private ViewTransform mapView;
    private double mapScale;

    private record Wish(SweepStore store, int index, PlaneField field, ViewTransform view, Backdrop backdrop,
                        double scale) {
        Wish at(int otherIndex) {
            return new Wish(store, otherIndex, field, view, backdrop, scale);
        }

        boolean samePlace(Wish other) {
            return other != null && store == other.store && field == other.field && view.equals(other.view)
                    && backdrop.equals(other.backdrop) && scale == other.scale;
        }
    }

    public RasterFeed(Executor background, Executor ui) {
        this.background = background;
        this.ui = ui;
    }

    /**
     * Asks for a picture; {@link #rasterProperty} brings it, at once when it is ready.
     *
     * @param scene     the sweep, the view and its backdrop
     * @param direction +1 when later sweeps are likely to be asked for next, −1 for earlier ones
     * @param scale     device pixels a unit of the view
     */
    public void want(SweepStore store, PlaneScene scene, PlaneField field, int direction, double scale) {
        ViewTransform view = scene.view();
        int size = scene.session().frames().size();
        if (view.widthPx() < 1 || view.heightPx() < 1) {
            return;
        }
        Wish wish = new Wish(store, scene.index(), field, view, Backdrop.of(scene), scale);
        wanted = wish;
        SweepRaster ready = kept.get(wish);
        if (ready != null) {
            raster.set(ready);
            prefetch(wish, size, direction);
        } else {
            draw(wish, () -> prefetch(wish, size, direction));
        }
    }

    /** Nothing is open. */
    public void clear() {
        wanted = null;
        kept.clear();
        raster.set(null);
    }

    private void prefetch(Wish from, int size, int direction) {
        for (int step = 1; step <= AHEAD; step++) {
            prefetchOne(from.at(Math.floorMod(from.index() + step * direction, size)));
            if (step <= BEHIND) {
                prefetchOne(from.at(Math.floorMod(from.index() - step * direction, size)));
            }
        }
    }

    private void prefetchOne(Wish wish) {
        if (!kept.containsKey(wish)) {
            draw(wish, () -> { });
        }
    }

    private void draw(Wish wish, Runnable afterwards) {
        background.execute(() -> {
            if (!wish.samePlace(wanted)) {
                return;
            }
            Optional<LevelGrid> there = grids.peek(wish.store(), wish.index(), wish.field());
            if (there.isPresent()) {
                paint(wish, there.get(), afterwards);
                return;
            }
            // A sweep that cannot be read is reported where it is shown; here there is only nothing to draw.
            wish.store().load(wish.index()).thenAcceptAsync(held -> {
                if (wish.samePlace(wanted)) {
                    paint(wish, grids.of(wish.store(), held, wish.field()), afterwards);
                }
            }, background);
        });
    }

    private void paint(Wish wish, LevelGrid grid, Runnable afterwards) {
        SweepRaster drawn = SweepRaster.draw(grid, mapFor(wish.view(), wish.scale()), wish.backdrop(), wish.view(),
                wish.index(),
                wish.field());
        ui.execute(() -> {
            kept.put(wish, drawn);
            if (wish.equals(wanted)) {
                raster.set(drawn);
                afterwards.run();
            }
        });
    }

    private synchronized PolarMap mapFor(ViewTransform view, double scale) {
        if (!view.equals(mapView) || scale != mapScale) {
            map = new PolarMap(view, scale);
            mapView = view;
            mapScale = scale;
        }
        return map;
    }

    /** The newest picture that came; may be of an earlier view than the one wanted. Null for none. */
    public ReadOnlyObjectProperty<SweepRaster> rasterProperty() {
        return raster.getReadOnlyProperty();
    }
}
