package hemline.tracking;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.geometry.Polyline;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** Pieces of a group to strands, neighbours on a curve rejoined; and strands to the stretches of a track. */
final class TrackBuilder {
    /** Just under 1 km, so that it still holds when tables round places to the metre. */
    private static final double MOST_SPACING_KM = 0.998;

    private final VertexCloud cloud;
    private final MotionLattice.Motion motion;
    private final List<SweepFrame> frames;

    TrackBuilder(VertexCloud cloud, MotionLattice.Motion motion, List<SweepFrame> frames) {
        this.cloud = cloud;
        this.motion = motion;
        this.frames = frames;
    }

    /** The strands of a group. */
    List<Strand> strands(List<Integer> group, List<Piece> pieces) {
        List<Integer> vertices = new ArrayList<>();
        for (int p : group) {
            for (int i = pieces.get(p).from(); i < pieces.get(p).to(); i++) {
                vertices.add(i);
            }
        }
        Collections.sort(vertices);
        List<Strand> strands = new ArrayList<>();
        List<Integer> run = new ArrayList<>();
        for (int i : vertices) {
            if (!run.isEmpty()) {
                int last = run.get(run.size() - 1);
                if (cloud.curve[last] != cloud.curve[i] || i - last > 3) {
                    close(run, strands);
                } else {
                    for (int between = last + 1; between < i; between++) {
                        run.add(between);
                    }
                }
            }
            run.add(i);
        }
        close(run, strands);
        return strands;
    }

    private void close(List<Integer> run, List<Strand> strands) {
        int n = run.size();
        if (n >= 3) {
            double[][] columns = new double[6][n];
            double[] towardX = new double[n];
            double[] towardY = new double[n];
            boolean[] seen = new boolean[n];
            for (int k = 0; k < n; k++) {
                int i = run.get(k);
                double sign = motion.speedMs()[i] < 0 ? -1 : 1;
                columns[0][k] = cloud.x[i];
                columns[1][k] = cloud.y[i];
                columns[2][k] = cloud.timeS[i];
                columns[3][k] = cloud.vertices.get(i).reflectivityDbz();
                columns[4][k] = Math.abs(motion.speedMs()[i]);
                columns[5][k] = motion.total()[i];
                towardX[k] = sign * cloud.normalX[i];
                towardY[k] = sign * cloud.normalY[i];
                seen[k] = true;
            }
            BoundaryKind kind = cloud.boundaries.get(cloud.curve[run.get(0)]).kind();
            strands.add(new Strand(cloud.sweep[run.get(0)], kind, columns, seen, towardX, towardY));
        }
        run.clear();
    }

    /** The stretches of a finished draft, with vertices at most 1 km apart. */
    List<TrackPiece> stretches(Draft draft) {
        List<TrackPiece> stretches = new ArrayList<>();
        for (Strand strand : draft.all()) {
            List<TrackVertex> vertices = new ArrayList<>();
            for (int i = 0; i < strand.size(); i++) {
                if (i > 0) {
                    between(strand, i, vertices);
                }
                vertices.add(vertex(strand, i, strand.x[i], strand.y[i], strand.dbz[i], strand.seen[i]));
            }
            if (distinct(vertices)) {
                stretches.add(new TrackPiece(strand.sweep, strand.kind, Origin.AUTO, vertices));
            }
        }
        return stretches;
    }

    private static boolean distinct(List<TrackVertex> vertices) {
        return vertices.stream().map(TrackVertex::position).distinct().count() >= 2
                && new Polyline(vertices.stream().map(TrackVertex::position).toList()).lengthKm() > 1;
    }

    private void between(Strand strand, int i, List<TrackVertex> into) {
        double gap = Math.hypot(strand.x[i] - strand.x[i - 1], strand.y[i] - strand.y[i - 1]);
        int parts = (int) Math.ceil(gap / MOST_SPACING_KM - 1e-9);
        for (int p = 1; p < parts; p++) {
            double share = p / (double) parts;
            into.add(vertex(strand, share < 0.5 ? i - 1 : i, (1 - share) * strand.x[i - 1] + share * strand.x[i],
                    (1 - share) * strand.y[i - 1] + share * strand.y[i],
                    (1 - share) * strand.dbz[i - 1] + share * strand.dbz[i], strand.seen[i - 1] && strand.seen[i]));
        }
    }

    private TrackVertex vertex(Strand strand, int like, double x, double y, double dbz, boolean seen) {
        SweepFrame frame = frames.get(strand.sweep);
        Point position = new Point(x, y);
        double bearing = new Point(strand.normalX[like], strand.normalY[like]).bearingDeg();
        return new TrackVertex(position, frame.timeAtMs(position), dbz, frame.beamHeightM(position), bearing,
                Speed.UNKNOWN, seen);
    }
}
