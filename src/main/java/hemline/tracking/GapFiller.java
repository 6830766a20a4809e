package hemline.tracking;

import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;

/**
 * Fills what a sweep does not show of a line that the sweeps before and after it do, where both agree: each vertex of
 * an earlier sweep is carried along its normal toward where the line is later. Filled vertices are marked as not seen.
 */
final class GapFiller {
    /** How many sweeps ahead the other side may lie. */
    private static final int REACH = 4;
    private static final double GATE_KM = 1.5;
    private static final double GATE_MS = 2;
    /** The line counts as shown where it passes this near, km. */
    private static final double SHOWN_KM = 3;
    private static final int LEAST_VERTICES = 3;

    private final List<SweepFrame> frames;
    private final double[] sweepTimeS;
    private final long originMs;

    GapFiller(List<SweepFrame> frames, long originMs) {
        this.frames = frames;
        this.originMs = originMs;
        sweepTimeS = VertexCloud.sweepTimesS(frames);
    }

    void fill(Draft draft) {
        for (int k = draft.firstSweep() + 1; k < draft.lastSweep(); k++) {
            List<Strand> filled = new ArrayList<>();
            for (int before = k - 1; before >= Math.max(0, k - REACH); before--) {
                for (Strand strand : draft.at(before)) {
                    carry(draft, strand, k, filled);
                }
            }
            filled.forEach(draft::add);
        }
    }

    private void carry(Draft draft, Strand strand, int k, List<Strand> filled) {
        List<double[]> run = new ArrayList<>();
        for (int i = 0; i < strand.size(); i++) {
            double[] row = strand.seen[i] || strand.sweep == k - 1 ? filledAt(draft, strand, i, k, filled) : null;
            if (row == null || !run.isEmpty()
                    && Math.hypot(row[0] - run.get(run.size() - 1)[0], row[1] - run.get(run.size() - 1)[1]) > 3) {
                close(run, strand, k, filled);
            }
            if (row != null) {
                run.add(row);
            }
        }
        close(run, strand, k, filled);
    }

    /** x, y, time, speed, normal of the filled vertex; null where the line is shown or the later side is missing. */
    private double[] filledAt(Draft draft, Strand strand, int i, int k, List<Strand> filled) {
        double nx = strand.normalX[i];
        double ny = strand.normalY[i];
        double span = (sweepTimeS[k] - sweepTimeS[strand.sweep]) / 1000;
        double expected = strand.speedMs[i] * span;
        NormalCrossing crossing = new NormalCrossing();
        double near = SHOWN_KM + GATE_MS * span;
        if (crossing.find(strand.x[i], strand.y[i], nx, ny, draft.at(k), expected, near)
                || crossing.find(strand.x[i], strand.y[i], nx, ny, filled, expected, near)) {
            return null;
        }
        for (int after = k + 1; after <= Math.min(draft.sweeps() - 1, k + REACH); after++) {
            double whole = (sweepTimeS[after] - sweepTimeS[strand.sweep]) / 1000;
            if (crossing.find(strand.x[i], strand.y[i], nx, ny, draft.at(after), strand.speedMs[i] * whole,
                    GATE_KM + GATE_MS * whole)) {
                double speed = crossing.offsetKm / Math.max(1e-6, crossing.timeS / 1000 - strand.timeS[i] / 1000);
                return vertex(strand, i, k, speed);
            }
        }
        return null;
    }

    private double[] vertex(Strand strand, int i, int k, double speedMs) {
        double time = sweepTimeS[k];
        double px = 0;
        double py = 0;
        for (int round = 0; round < 2; round++) {
            double moved = speedMs * (time - strand.timeS[i]) / 1000;
            px = strand.x[i] + moved * strand.normalX[i];
            py = strand.y[i] + moved * strand.normalY[i];
            time = (frames.get(k).timeAtMs(new Point(px, py)) - originMs) / 1000.0;
        }
        return new double[] {px, py, time, speedMs, strand.normalX[i], strand.normalY[i], strand.evidence[i]};
    }

    private static void close(List<double[]> run, Strand from, int k, List<Strand> filled) {
        if (run.size() >= LEAST_VERTICES) {
            int n = run.size();
            double[][] columns = new double[6][n];
            double[] nx = new double[n];
            double[] ny = new double[n];
            for (int i = 0; i < n; i++) {
                double[] row = run.get(i);
                columns[0][i] = row[0];
                columns[1][i] = row[1];
                columns[2][i] = row[2];
                columns[3][i] = Double.NaN;
                columns[4][i] = row[3];
                columns[5][i] = row[6];
                nx[i] = row[4];
                ny[i] = row[5];
            }
            filled.add(new Strand(k, from.kind, columns, new boolean[n], nx, ny));
        }
        run.clear();
    }
}
