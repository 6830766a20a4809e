package hemline.tracking;

import hemline.numerics.ConstantVelocity;
import java.util.ArrayList;
import java.util.List;

/**
 * Moves vertices along their normals to where the whole track says the line was: the offsets of the sweeps around are
 * followed forward by a Kalman filter and smoothed back (Rauch, Tung and Striebel 1965), at the rays' own times.
 */
final class PositionSmoother {
    /** Sweeps taken on either side. */
    private static final int REACH = 4;
    /** Position error of a seen line, km. */
    private static final double SEEN_SD_KM = 0.35;
    private static final double FILLED_SD_KM = 0.9;
    /** Spectral density of the acceleration, (m s⁻¹)² per 1000 s. */
    private static final double DENSITY = 0.8;
    private static final double SPEED_SD_MS = 3;
    private static final double LARGEST_SHIFT_KM = 1.2;
    /** A crossing this much farther off than expected is another line, km and m s⁻¹. */
    private static final double GATE_KM = 2;
    private static final double GATE_MS = 2.5;

    private PositionSmoother() {
    }

    static void smooth(Draft draft) {
        List<Strand> strands = draft.all();
        List<double[]> shifts = new ArrayList<>();
        for (Strand strand : strands) {
            double[] shift = new double[strand.size()];
            for (int i = 0; i < shift.length; i++) {
                shift[i] = shift(draft, strand, i);
            }
            shifts.add(alongMean(shift));
        }
        for (int s = 0; s < strands.size(); s++) {
            Strand strand = strands.get(s);
            for (int i = 0; i < strand.size(); i++) {
                strand.x[i] += shifts.get(s)[i] * strand.normalX[i];
                strand.y[i] += shifts.get(s)[i] * strand.normalY[i];
            }
        }
    }

    private static double shift(Draft draft, Strand strand, int i) {
        int from = Math.max(0, strand.sweep - REACH);
        int to = Math.min(draft.sweeps() - 1, strand.sweep + REACH);
        double[] time = new double[to - from + 1];
        double[] offset = new double[time.length];
        double[] sd = new double[time.length];
        NormalCrossing crossing = new NormalCrossing();
        int n = 0;
        int own = -1;
        for (int k = from; k <= to; k++) {
            if (k == strand.sweep) {
                own = n;
                time[n] = strand.timeS[i] / 1000;
                offset[n] = 0;
                sd[n++] = strand.seen[i] ? SEEN_SD_KM : FILLED_SD_KM;
            } else if (!draft.at(k).isEmpty()) {
                double span = (draft.at(k).get(0).timeS[0] - strand.timeS[i]) / 1000;
                if (crossing.find(strand.x[i], strand.y[i], strand.normalX[i], strand.normalY[i], draft.at(k),
                        strand.speedMs[i] * span, GATE_KM + GATE_MS * Math.abs(span))) {
                    time[n] = crossing.timeS / 1000;
                    offset[n] = crossing.offsetKm;
                    sd[n++] = crossing.seen ? SEEN_SD_KM : FILLED_SD_KM;
                }
            }
        }
        if (n < 3) {
            return 0;
        }
        double smoothed = ConstantVelocity.smooth(java.util.Arrays.copyOf(time, n), java.util.Arrays.copyOf(offset, n),
                java.util.Arrays.copyOf(sd, n), DENSITY, strand.speedMs[i], SPEED_SD_MS).position(own);
        return Math.max(-LARGEST_SHIFT_KM, Math.min(LARGEST_SHIFT_KM, smoothed));
    }

    /** Mean over five vertices, so that a shift does not make a line ragged. */
    private static double[] alongMean(double[] values) {
        double[] mean = new double[values.length];
        for (int i = 0; i < values.length; i++) {
            int a = Math.max(0, i - 2);
            int b = Math.min(values.length - 1, i + 2);
            for (int j = a; j <= b; j++) {
                mean[i] += values[j] / (b - a + 1);
            }
        }
        return mean;
    }
}
