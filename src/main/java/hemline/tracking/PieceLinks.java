package hemline.tracking;

import hemline.geometry.PointGrid;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * How much of one piece becomes another: kilometres that lie on each other once each vertex is carried along its
 * normal at its own speed, to up to four sweeps ahead.
 */
final class PieceLinks {
    private static final double[] SWEEP_WEIGHT = {1, 0.5, 0.35, 0.25};
    private static final double TOLERANCE_KM = 1.5;
    private static final double TOLERANCE_MS = 1.2;
    private static final double WIDEST_KM = 3;
    private static final double SPEED_GATE_MS = 7;

    private final VertexCloud cloud;
    private final MotionLattice.Motion motion;
    private final PointGrid[] cells;
    private final double cosTurn;
    private final int[] pieceOf;

    PieceLinks(VertexCloud cloud, MotionLattice.Motion motion, PointGrid[] cells, List<Piece> pieces,
               TrackingSettings settings) {
        this.cloud = cloud;
        this.motion = motion;
        this.cells = cells;
        cosTurn = Math.cos(Math.toRadians(settings.maxTurnDeg()));
        pieceOf = new int[cloud.size];
        Arrays.fill(pieceOf, -1);
        for (int p = 0; p < pieces.size(); p++) {
            Arrays.fill(pieceOf, pieces.get(p).from(), pieces.get(p).to(), p);
        }
    }

    /** Weights in km between pieces, each pair once with the lower index first. */
    List<Link> links(List<Piece> pieces) {
        Map<Long, Double> weight = new TreeMap<>();
        for (int p = 0; p < pieces.size(); p++) {
            alongCurve(p, pieces, weight);
            for (int i = pieces.get(p).from(); i < pieces.get(p).to(); i++) {
                for (int gap = 1; gap <= SWEEP_WEIGHT.length; gap++) {
                    vote(i, pieces.get(p).sweep() + gap, SWEEP_WEIGHT[gap - 1] / 2, weight);
                    vote(i, pieces.get(p).sweep() - gap, SWEEP_WEIGHT[gap - 1] / 2, weight);
                }
            }
        }
        List<Link> links = new ArrayList<>(weight.size());
        weight.forEach((key, km) -> links.add(new Link((int) (key >> 32), (int) (key & 0xffffffffL), km)));
        return links;
    }

    /** Pieces next to each other on a curve that move alike. */
    private void alongCurve(int p, List<Piece> pieces, Map<Long, Double> weight) {
        if (p + 1 < pieces.size()) {
            Piece next = pieces.get(p + 1);
            int last = pieces.get(p).to() - 1;
            if (cloud.curve[last] == cloud.curve[next.from()] && next.from() - last <= 3) {
                double dot = cloud.normalX[last] * cloud.normalX[next.from()]
                        + cloud.normalY[last] * cloud.normalY[next.from()];
                double jump = Math.abs(motion.speedMs()[last] - motion.speedMs()[next.from()]);
                if (dot > 0.9 && jump < 5) {
                    weight.merge(key(p, p + 1), 8.0, Double::sum);
                }
            }
        }
    }

    private void vote(int i, int sweep, double share, Map<Long, Double> weight) {
        if (sweep < 0 || sweep >= cloud.sweeps || cloud.sweepStart[sweep] == cloud.sweepStart[sweep + 1]) {
            return;
        }
        double span = cloud.timeS[cloud.sweepStart[sweep]] - cloud.timeS[i];
        double reach = motion.speedMs()[i] * span / 1000;
        double tolerance = Math.min(WIDEST_KM, TOLERANCE_KM + TOLERANCE_MS * Math.abs(span) / 1000);
        double px = cloud.x[i] + reach * cloud.normalX[i];
        double py = cloud.y[i] + reach * cloud.normalY[i];
        double[] nearest = {Double.POSITIVE_INFINITY, -1};
        cells[sweep].within(px, py, tolerance + 1, j -> {
            double dot = cloud.normalX[i] * cloud.normalX[j] + cloud.normalY[i] * cloud.normalY[j];
            double speed = dot < 0 ? -motion.speedMs()[j] : motion.speedMs()[j];
            if (pieceOf[j] < 0 || Math.abs(dot) < cosTurn || Math.abs(speed - motion.speedMs()[i]) > SPEED_GATE_MS) {
                return;
            }
            // The ray times of both vertices, not the sweeps' own.
            double moved = motion.speedMs()[i] * (cloud.timeS[j] - cloud.timeS[i]) / 1000;
            double distance = Math.hypot(cloud.x[j] - cloud.x[i] - moved * cloud.normalX[i],
                    cloud.y[j] - cloud.y[i] - moved * cloud.normalY[i]);
            if (distance < nearest[0]) {
                nearest[0] = distance;
                nearest[1] = j;
            }
        });
        if (nearest[0] <= tolerance) {
            weight.merge(key(pieceOf[i], pieceOf[(int) nearest[1]]), share, Double::sum);
        }
    }

    private static long key(int p, int q) {
        return ((long) Math.min(p, q) << 32) | Math.max(p, q);
    }

    /**
     * @param p  a piece
     * @param q  another, of higher index
     * @param km length they share
     */
    record Link(int p, int q, double km) {
    }
}
