package hemline.kinematics;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.geometry.PointGrid;
import java.util.ArrayList;
import java.util.List;

/**
 * The vertices of one track in flat arrays, stretch by stretch and the stretches by rising sweep. Normals point to
 * one side of the line, the side the track as a whole moves toward where that is told.
 */
final class TrackPoints {
    /** Half length over which a direction is taken, km. */
    private static final double DIRECTION_KM = 2;

    final int size;
    final double[] x;
    final double[] y;
    /** Seconds from {@code originMs}. */
    final double[] timeS;
    final double[] normalX;
    final double[] normalY;
    final boolean[] seen;
    final int[] sweep;
    final int[] pieceStart;
    final List<TrackPiece> pieces;
    /** The sweeps that hold vertices, rising. */
    final int[] sweepsHeld;
    private final PointGrid[] grids;
    private final int[] gridFrom;

    TrackPoints(Track track, long originMs) {
        pieces = track.pieces();
        size = pieces.stream().mapToInt(p -> p.vertices().size()).sum();
        x = new double[size];
        y = new double[size];
        timeS = new double[size];
        normalX = new double[size];
        normalY = new double[size];
        seen = new boolean[size];
        sweep = new int[size];
        pieceStart = new int[pieces.size() + 1];
        int at = 0;
        for (int p = 0; p < pieces.size(); p++) {
            pieceStart[p] = at;
            for (TrackVertex vertex : pieces.get(p).vertices()) {
                x[at] = vertex.position().xKm();
                y[at] = vertex.position().yKm();
                timeS[at] = (vertex.timeMs() - originMs) / 1000.0;
                seen[at] = vertex.seen();
                sweep[at] = pieces.get(p).sweep();
                at++;
            }
            normals(pieceStart[p], at, pieces.get(p).vertices());
        }
        pieceStart[pieces.size()] = at;
        sweepsHeld = java.util.Arrays.stream(sweep).distinct().toArray();
        grids = new PointGrid[sweepsHeld.length];
        gridFrom = new int[sweepsHeld.length + 1];
        for (int g = 0, i = 0; g < grids.length; g++) {
            gridFrom[g] = i;
            while (i < size && sweep[i] == sweepsHeld[g]) {
                i++;
            }
            grids[g] = new PointGrid(x, y, gridFrom[g], i, 4);
            gridFrom[g + 1] = i;
        }
    }

    private void normals(int from, int to, List<TrackVertex> vertices) {
        for (int i = from; i < to; i++) {
            int a = i;
            while (a > from && Math.hypot(x[a] - x[i], y[a] - y[i]) < DIRECTION_KM) {
                a--;
            }
            int b = i;
            while (b < to - 1 && Math.hypot(x[b] - x[i], y[b] - y[i]) < DIRECTION_KM) {
                b++;
            }
            double tx = x[b] - x[a];
            double ty = y[b] - y[a];
            double length = Math.max(1e-9, Math.hypot(tx, ty));
            double sign = 1;
            double told = vertices.get(i - from).normalBearingDeg();
            if (!Double.isNaN(told)) {
                Point toward = Point.towards(told);
                sign = -ty * toward.xKm() + tx * toward.yKm() < 0 ? -1 : 1;
            }
            normalX[i] = -ty / length * sign;
            normalY[i] = tx / length * sign;
        }
    }

    int gridCount() {
        return grids.length;
    }

    /** First vertex of held sweep {@code g}; for the number of held sweeps, the number of vertices. */
    int gridStart(int g) {
        return gridFrom[g];
    }

    PointGrid grid(int g) {
        return grids[g];
    }

    /** Mean time of the vertices in held sweep {@code g}, s. */
    double gridTimeS(int g) {
        double sum = 0;
        for (int i = gridFrom[g]; i < gridFrom[g + 1]; i++) {
            sum += timeS[i];
        }
        return sum / (gridFrom[g + 1] - gridFrom[g]);
    }

    Point point(int i) {
        return new Point(x[i], y[i]);
    }

    /** The track's stretches with new motion at every vertex. */
    List<TrackPiece> withMotion(VertexMotion[] motion) {
        List<TrackPiece> measured = new ArrayList<>(pieces.size());
        for (int p = 0; p < pieces.size(); p++) {
            TrackPiece piece = pieces.get(p);
            List<TrackVertex> vertices = new ArrayList<>(piece.vertices().size());
            for (int i = 0; i < piece.vertices().size(); i++) {
                VertexMotion one = motion[pieceStart[p] + i];
                vertices.add(piece.vertices().get(i).withMotion(one.bearingDeg(), one.speed()));
            }
            measured.add(new TrackPiece(piece.sweep(), piece.kind(), piece.origin(), vertices));
        }
        return measured;
    }
}
