package hemline.tracking;

import hemline.geometry.PointGrid;
import java.util.Arrays;
import java.util.stream.IntStream;

/**
 * Which normal speed each vertex has, decided over the whole loop: evidence flows forward and backward along the
 * chains of vertices that one speed joins, and is averaged along each curve, since chance matches do not agree in
 * speed over several kilometres.
 *
 * <p>A max-plus recursion on states (vertex, speed), after the track-before-detect idea of Reed, Gagliardi and
 * Stotts (1988), IEEE Trans. Aerosp. Electron. Syst. 24:327–344.
 */
final class MotionLattice {
    /** Share of the evidence that survives one sweep. */
    private static final double DECAY = 0.88;
    /** Cost of a change of speed, per m s⁻¹. */
    private static final double SPEED_COST = 0.12;
    /** How far a link may miss along the line, km; vertices are about 1 km apart. */
    private static final double MISS_KM = 0.8;
    /** Half length over which evidence is averaged along a curve, vertices. */
    private static final int ALONG = 4;
    /** Position noise of one vertex, km. */
    private static final double NOISE_KM = 0.35;
    /** Speed of a resting line: within this of nothing, m s⁻¹. */
    private static final double REST_MS = 2;

    private final VertexCloud cloud;
    private final PointGrid[] cells;
    private final int bins;
    private final int most;
    private final double cosTurn;

    MotionLattice(VertexCloud cloud, PointGrid[] cells, TrackingSettings settings) {
        this.cloud = cloud;
        this.cells = cells;
        most = (int) Math.ceil(settings.maxSpeedMs());
        bins = 2 * most + 1;
        cosTurn = Math.cos(Math.toRadians(settings.maxTurnDeg()));
    }

    /** Evidence and speed of each vertex. */
    Motion solve() {
        float[] forward = pass(true);
        float[] backward = pass(false);
        int n = cloud.size;
        double[] speed = new double[n];
        double[] total = new double[n];
        double[] past = new double[n];
        double[] future = new double[n];
        float[] sum = new float[bins];
        for (int i = 0; i < n; i++) {
            int best = 0;
            for (int b = 0; b < bins; b++) {
                sum[b] = forward[i * bins + b] + backward[i * bins + b] - (float) own(i) + hintBonus(i, b);
                if (sum[b] > sum[best]) {
                    best = b;
                }
            }
            speed[i] = best - most + peakShift(sum, best);
            total[i] = sum[best];
            past[i] = forward[i * bins + best] - own(i);
            future[i] = backward[i * bins + best] - own(i);
        }
        return new Motion(alongMedian(speed), total, past, future);
    }

    /** Part of a bin by which the mean of the peak and its neighbours differs from its bin. */
    private double peakShift(float[] sum, int best) {
        if (best == 0 || best == bins - 1) {
            return 0;
        }
        double a = sum[best - 1];
        double b = sum[best];
        double c = sum[best + 1];
        double bend = a - 2 * b + c;
        return bend < -1e-9 ? Math.max(-0.5, Math.min(0.5, 0.5 * (a - c) / bend)) : 0;
    }

    private double own(int i) {
        return Math.max(0.1, Math.min(1.25, cloud.strength[i] / 4));
    }

    private float hintBonus(int i, int bin) {
        double hint = cloud.hintMs[i];
        return Double.isNaN(hint) ? 0 : (float) Math.max(0, 0.6 - 0.15 * Math.abs(bin - most - hint));
    }

    private float[] pass(boolean forward) {
        float[] score = new float[cloud.size * bins];
        float[] reached = new float[cloud.size * bins];
        int sweeps = cloud.sweeps;
        for (int step = 0; step < sweeps; step++) {
            int k = forward ? step : sweeps - 1 - step;
            int from = cloud.sweepStart[k];
            int to = cloud.sweepStart[k + 1];
            for (int i = from; i < to; i++) {
                int vertex = i;
                double weight = DECAY;
                for (int gap = 1; gap <= 3; gap++) {
                    int other = forward ? k - gap : k + gap;
                    if (other >= 0 && other < sweeps) {
                        double share = weight;
                        double span = sweepSpan(k, other);
                        cells[other].within(cloud.x[i], cloud.y[i], most * span / 1000 + 1,
                                j -> link(vertex, j, share, score, reached));
                    }
                    weight *= DECAY * 0.9;
                }
            }
            average(from, to, score, reached);
        }
        return score;
    }

    private double sweepSpan(int a, int b) {
        if (cloud.sweepStart[a] == cloud.sweepStart[a + 1] || cloud.sweepStart[b] == cloud.sweepStart[b + 1]) {
            return 0;
        }
        return Math.abs(cloud.timeS[cloud.sweepStart[a]] - cloud.timeS[cloud.sweepStart[b]]) + 30;
    }

    private void link(int i, int j, double weight, float[] score, float[] reached) {
        double dot = cloud.normalX[i] * cloud.normalX[j] + cloud.normalY[i] * cloud.normalY[j];
        double span = cloud.timeS[i] - cloud.timeS[j];
        if (Math.abs(dot) < cosTurn || Math.abs(span) < 1) {
            return;
        }
        double sign = Math.signum(dot);
        double nx = cloud.normalX[i] + sign * cloud.normalX[j];
        double ny = cloud.normalY[i] + sign * cloud.normalY[j];
        double length = Math.hypot(nx, ny);
        double dx = cloud.x[i] - cloud.x[j];
        double dy = cloud.y[i] - cloud.y[j];
        if (Math.abs(dx * ny - dy * nx) / length > MISS_KM) {
            return;
        }
        double speed = (dx * nx + dy * ny) / length * 1000 / span;
        double blur = Math.min(4, NOISE_KM * 1000 / Math.abs(span) + 0.5);
        int low = Math.max(0, (int) Math.ceil(speed - 2 * blur) + most);
        int high = Math.min(bins - 1, (int) Math.floor(speed + 2 * blur) + most);
        for (int b = low; b <= high; b++) {
            double off = Math.max(0, Math.abs(b - most - speed) - blur);
            int mirrored = sign > 0 ? b : bins - 1 - b;
            double best = 0;
            for (int change = -2; change <= 2; change++) {
                int before = mirrored + change;
                if (before >= 0 && before < bins) {
                    best = Math.max(best, score[j * bins + before] - SPEED_COST * Math.abs(change));
                }
            }
            float value = (float) (weight * best - SPEED_COST * off);
            if (value > reached[i * bins + b]) {
                reached[i * bins + b] = value;
            }
        }
    }

    /** Own evidence plus the mean along the curve of what reached it. */
    private void average(int from, int to, float[] score, float[] reached) {
        for (int i = from; i < to; i++) {
            int a = Math.max(cloud.curveStart[cloud.curve[i]], i - ALONG);
            int z = Math.min(cloud.curveStart[cloud.curve[i] + 1] - 1, i + ALONG);
            float share = 1f / (z - a + 1);
            float self = (float) own(i);
            for (int b = 0; b < bins; b++) {
                float sum = 0;
                for (int j = a; j <= z; j++) {
                    boolean same = cloud.normalX[i] * cloud.normalX[j] + cloud.normalY[i] * cloud.normalY[j] >= 0;
                    sum += reached[j * bins + (same ? b : bins - 1 - b)];
                }
                score[i * bins + b] = self + share * sum;
            }
        }
    }

    /** Median of seven neighbours along the curve, each counted along the vertex's own normal. */
    private double[] alongMedian(double[] speed) {
        return IntStream.range(0, cloud.size).mapToDouble(i -> {
            int a = Math.max(cloud.curveStart[cloud.curve[i]], i - 3);
            int z = Math.min(cloud.curveStart[cloud.curve[i] + 1] - 1, i + 3);
            double[] near = new double[z - a + 1];
            for (int j = a; j <= z; j++) {
                double dot = cloud.normalX[i] * cloud.normalX[j] + cloud.normalY[i] * cloud.normalY[j];
                near[j - a] = dot >= 0 ? speed[j] : -speed[j];
            }
            Arrays.sort(near);
            return near[near.length / 2];
        }).toArray();
    }

    /**
     * @param speedMs along each vertex's normal, signed, m s⁻¹
     * @param total   evidence of the best chain through the vertex, forward and backward
     * @param past    evidence from earlier sweeps
     * @param future  evidence from later sweeps
     */
    record Motion(double[] speedMs, double[] total, double[] past, double[] future) {
        boolean rests(int i) {
            return Math.abs(speedMs[i]) < REST_MS;
        }
    }
}
