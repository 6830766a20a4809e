package hemline.tracking;

import java.util.ArrayList;
import java.util.List;

/** Cuts curves where speed or direction jumps, and what remains to even runs. */
final class PieceCutter {
    private static final int PIECE_VERTICES = 8;
    private static final int LEAST_VERTICES = 3;
    private static final double SPEED_JUMP_MS = 5;
    /** Cosine of the turn between normals two vertices apart at which a corner is cut. */
    private static final double CORNER_COS = Math.cos(Math.toRadians(40));

    private PieceCutter() {
    }

    static List<Piece> cut(VertexCloud cloud, MotionLattice.Motion motion) {
        List<Piece> pieces = new ArrayList<>();
        for (int c = 0; c < cloud.curveCount(); c++) {
            int start = cloud.curveStart[c];
            int end = cloud.curveStart[c + 1];
            for (int i = start + 1; i <= end; i++) {
                if (i == end || breaks(cloud, motion, i, start)) {
                    split(pieces, start, i, cloud.sweep[start]);
                    start = i;
                }
            }
        }
        return pieces;
    }

    private static boolean breaks(VertexCloud cloud, MotionLattice.Motion motion, int i, int start) {
        double dot = dot(cloud, i, i - 1);
        if (dot < 0 || Math.abs(motion.speedMs()[i] - motion.speedMs()[i - 1]) > SPEED_JUMP_MS) {
            return true;
        }
        return i - 2 >= start && dot(cloud, i, i - 2) < CORNER_COS;
    }

    private static double dot(VertexCloud cloud, int i, int j) {
        return cloud.normalX[i] * cloud.normalX[j] + cloud.normalY[i] * cloud.normalY[j];
    }

    private static void split(List<Piece> pieces, int from, int to, int sweep) {
        int length = to - from;
        if (length < LEAST_VERTICES) {
            return;
        }
        int parts = Math.max(1, (int) Math.round(length / (double) PIECE_VERTICES));
        for (int p = 0; p < parts; p++) {
            pieces.add(new Piece(from + length * p / parts, from + length * (p + 1) / parts, sweep));
        }
    }
}
