package hemline.detection;

import java.util.ArrayList;
import java.util.List;

/**
 * Cuts out of a curve what its own sweep does not bear out: rain and its edges, silence, nothing on the profile; and
 * trims ends that only the strips' length made.
 */
final class CurveCuts {
    private static final double RAIN_KM = 2.4;
    private static final double RAIN_EDGE_KM = 9;
    private static final double RAIN_EDGE_LINE_DB = 2;
    private static final double MOST_CREST_DBZ = 19;
    private static final double MOST_UNDETECT = 0.75;
    private static final double LEAST_LINE_DB = 1;
    private static final double LEAST_STEP_DB = 1.5;
    private static final double MOST_ROUGH_DB = 2.9;
    private static final double END_LINE_DB = 1.5;
    private static final double END_STEP_DB = 3;
    /** On a step the curve lies part way up; lower than this share below the brighter side it is the foot of a line. */
    private static final double STEP_SAG = 0.65;
    private static final int BRIDGED = 2;

    private CurveCuts() {
    }

    /** Runs {@code {from, to}} of vertices that the sweep bears out, at least {@code fewest} long. */
    static List<int[]> runs(CurveMeasures m, int fewest) {
        int n = m.lineDb().length;
        boolean[] good = new boolean[n];
        for (int i = 0; i < n; i++) {
            good[i] = borneOut(m, i);
        }
        bridge(good);
        List<int[]> runs = new ArrayList<>();
        int from = -1;
        for (int i = 0; i <= n; i++) {
            boolean in = i < n && good[i];
            if (in && from < 0) {
                from = i;
            } else if (!in && from >= 0) {
                if (i - from >= fewest) {
                    runs.add(new int[] {from, i});
                }
                from = -1;
            }
        }
        return runs;
    }

    private static boolean borneOut(CurveMeasures m, int i) {
        if (m.rainKm()[i] < RAIN_KM || m.undetect()[i] > MOST_UNDETECT || m.roughDb()[i] > MOST_ROUGH_DB) {
            return false;
        }
        if (m.rainKm()[i] < RAIN_EDGE_KM && m.rainAhead()[i] && !(m.lineDb()[i] >= RAIN_EDGE_LINE_DB)) {
            return false;
        }
        if (m.lineDb()[i] < -STEP_SAG * m.stepDb()[i] && m.lineDb()[i] < 0) {
            return false;
        }
        return m.crestDbz()[i] <= MOST_CREST_DBZ && (m.lineDb()[i] >= LEAST_LINE_DB || m.stepDb()[i] >= LEAST_STEP_DB);
    }

    /** A vertex or two between good ones are carried along. */
    private static void bridge(boolean[] good) {
        int last = -1;
        for (int i = 0; i < good.length; i++) {
            if (good[i]) {
                if (last >= 0 && i - last - 1 <= BRIDGED) {
                    java.util.Arrays.fill(good, last + 1, i, true);
                }
                last = i;
            }
        }
    }

    /** What remains of {@code 0…n} after ends without line or step in the short profile are trimmed, and 1 km more. */
    static int[] trimmed(CurveMeasures sharp) {
        int from = 0;
        int to = sharp.lineDb().length;
        while (from < to && !plain(sharp, from)) {
            from++;
        }
        while (to > from && !plain(sharp, to - 1)) {
            to--;
        }
        int start = from > 0 ? from + 1 : 0;
        int end = to < sharp.lineDb().length ? to - 1 : to;
        return new int[] {start, Math.max(start, end)};
    }

    private static boolean plain(CurveMeasures sharp, int i) {
        return sharp.lineDb()[i] >= END_LINE_DB || sharp.stepDb()[i] >= END_STEP_DB;
    }
}
