package hemline.tracking;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;

/** Pieces of a group to the stretches of a track: neighbours on a curve are rejoined. */
final class TrackBuilder {
    private final VertexCloud cloud;
    private final MotionLattice.Motion motion;
    private final List<SweepFrame> frames;

    TrackBuilder(VertexCloud cloud, MotionLattice.Motion motion, List<SweepFrame> frames) {
        this.cloud = cloud;
        this.motion = motion;
        this.frames = frames;
    }

    /** The stretches of a group, by sweep and then by place on the curve. */
    List<TrackPiece> stretches(List<Integer> group, List<Piece> pieces) {
        SortedSet<Integer> vertices = new TreeSet<>();
        for (int p : group) {
            for (int i = pieces.get(p).from(); i < pieces.get(p).to(); i++) {
                vertices.add(i);
            }
        }
        List<TrackPiece> stretches = new ArrayList<>();
        List<Integer> run = new ArrayList<>();
        for (int i : vertices) {
            if (!run.isEmpty()) {
                int last = run.get(run.size() - 1);
                if (cloud.curve[last] != cloud.curve[i] || i - last > 3) {
                    close(run, stretches);
                } else {
                    for (int between = last + 1; between < i; between++) {
                        run.add(between);
                    }
                }
            }
            run.add(i);
        }
        close(run, stretches);
        return stretches;
    }

    private void close(List<Integer> run, List<TrackPiece> stretches) {
        if (run.size() >= 2) {
            SweepFrame frame = frames.get(cloud.sweep[run.get(0)]);
            BoundaryKind kind = cloud.boundaries.get(cloud.curve[run.get(0)]).kind();
            List<TrackVertex> vertices = run.stream().map(i -> vertex(i, frame)).toList();
            stretches.add(new TrackPiece(frame.index(), kind, Origin.AUTO, vertices));
        }
        run.clear();
    }

    private TrackVertex vertex(int i, SweepFrame frame) {
        Point position = new Point(cloud.x[i], cloud.y[i]);
        double sign = motion.speedMs()[i] < 0 ? -1 : 1;
        Point toward = new Point(sign * cloud.normalX[i], sign * cloud.normalY[i]);
        return new TrackVertex(position, cloud.vertices.get(i).timeMs(), cloud.vertices.get(i).reflectivityDbz(),
                frame.beamHeightM(position), toward.bearingDeg(), hemline.boundary.Speed.UNKNOWN, true);
    }
}
