package hemline.tracking;

import hemline.boundary.ObservedBoundary;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.geometry.PointGrid;
import hemline.sweep.Progress;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Links the boundaries of all sweeps of a loop into tracks. */
public final class Tracking {
    /** Least shared length for the size of the smaller group at which two groups are joined. */
    private static final double LEAST_SHARE = 0.05;

    private Tracking() {
    }

    /**
     * Tracks of a loop, the surest first; ids {@code T01}, {@code T02}, … in that order.
     *
     * @param found  boundaries of all sweeps, in any order
     * @param frames every sweep of the loop, by rising index from 0
     * @throws java.util.concurrent.CancellationException if cancelled
     */
    public static List<Track> link(List<ObservedBoundary> found, List<SweepFrame> frames, TrackingSettings settings,
                                   Progress progress) {
        VertexCloud cloud = new VertexCloud(found, frames);
        PointGrid[] cells = new PointGrid[cloud.sweeps];
        for (int k = 0; k < cells.length; k++) {
            cells[k] = new PointGrid(cloud.x, cloud.y, cloud.sweepStart[k], cloud.sweepStart[k + 1], 4);
        }
        progress.step("linking", 0, 3);
        progress.check();
        MotionLattice.Motion motion = new MotionLattice(cloud, cells, settings).solve();
        progress.step("linking", 1, 3);
        progress.check();
        List<Piece> pieces = PieceCutter.cut(cloud, motion);
        List<PieceLinks.Link> links = new PieceLinks(cloud, motion, cells, pieces, settings).links(pieces);
        List<List<Integer>> groups = new Grouping(LEAST_SHARE, (a, b) -> true).group(pieces, links);
        progress.step("linking", 2, 3);
        progress.check();
        TrackBuilder builder = new TrackBuilder(cloud, motion, frames);
        List<Track> kept = new ArrayList<>();
        for (List<Integer> group : groups) {
            TrackQuality quality = TrackQuality.of(group, pieces, cloud, motion);
            if (quality.keep(settings)) {
                List<TrackPiece> stretches = builder.stretches(group, pieces);
                kept.add(Track.linked("-", stretches, quality.score()));
            }
        }
        kept.sort(Comparator.comparingDouble(Track::score).reversed().thenComparingLong(Track::firstMs));
        List<Track> named = new ArrayList<>(kept.size());
        for (int i = 0; i < kept.size(); i++) {
            named.add(Track.linked(String.format(java.util.Locale.ROOT, "T%02d", i + 1), kept.get(i).pieces(),
                    kept.get(i).score()));
        }
        progress.step("linking", 3, 3);
        return named;
    }
}
