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
import java.util.Locale;

/** Links the boundaries of all sweeps of a loop into tracks. */
public final class Tracking {
    /** Least shared length for the size of the smaller group at which two groups are joined. */
    private static final double LEAST_SHARE = 0.05;

    private static final int LEAST_LITTER = 12;
    private static final double LITTER_SCORE = -3.5;

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
        Siblings siblings = new Siblings(cloud, motion, pieces);
        List<List<Integer>> groups = siblings.join(new Grouping(LEAST_SHARE, siblings::mayJoin).group(pieces, links));
        progress.step("linking", 2, 3);
        progress.check();
        List<int[]> vertices = groups.stream().map(siblings::vertices).toList();
        AmbientDrift drift = AmbientDrift.of(litter(vertices, cloud, motion), cloud, motion);
        TrackBuilder builder = new TrackBuilder(cloud, motion, frames);
        List<Draft> drafts = new ArrayList<>();
        for (int g = 0; g < groups.size(); g++) {
            TrackQuality quality = TrackQuality.of(vertices.get(g), cloud, motion, drift);
            if (quality.keep(settings)) {
                drafts.add(new Draft(builder.strands(groups.get(g), pieces), cloud.sweeps, quality.score()));
            }
        }
        List<Track> named = name(finish(drafts, frames, cloud.originMs, settings), builder);
        progress.step("linking", 3, 3);
        return named;
    }

    /** Groups that are no boundaries whatever their motion: they tell how the air drifts. */
    private static List<int[]> litter(List<int[]> groups, VertexCloud cloud, MotionLattice.Motion motion) {
        return groups.stream().filter(group -> group.length >= LEAST_LITTER
                && TrackQuality.of(group, cloud, motion, AmbientDrift.NONE).scoreAtRest() < LITTER_SCORE).toList();
    }

    private static List<Draft> finish(List<Draft> drafts, List<SweepFrame> frames, long originMs,
                                      TrackingSettings settings) {
        drafts.sort(Comparator.comparingDouble((Draft d) -> d.score).reversed().thenComparingInt(Draft::firstSweep));
        OnePlace.enforce(drafts);
        GapFiller filler = new GapFiller(frames, originMs);
        EndBridger bridger = new EndBridger(frames, originMs, settings.maxBridgeKm());
        for (Draft draft : drafts) {
            PositionSmoother.smooth(draft);
            filler.fill(draft);
            bridger.bridge(draft);
            draft.sort();
        }
        OnePlace.enforce(drafts);
        drafts.removeIf(draft -> draft.sweepsSeen() < settings.minSweeps()
                || draft.maxLengthKm() < settings.minLengthKm());
        return drafts;
    }

    private static List<Track> name(List<Draft> drafts, TrackBuilder builder) {
        List<Track> named = new ArrayList<>();
        for (Draft draft : drafts) {
            List<TrackPiece> stretches = builder.stretches(draft);
            if (!stretches.isEmpty()) {
                named.add(Track.linked(String.format(Locale.ROOT, "T%02d", named.size() + 1), stretches, draft.score));
            }
        }
        return named;
    }
}
