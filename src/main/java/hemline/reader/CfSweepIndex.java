package hemline.reader;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Which rays of a CfRadial 1 file form which sweep: by {@code sweep_start_ray_index} and
 * {@code sweep_end_ray_index} (both inclusive) where these make sense, else by jumps of the elevation.
 */
final class CfSweepIndex {
    /** Sweeps closer than this are not told apart by elevation, degrees. */
    private static final double JUMP_DEG = 0.25;

    private CfSweepIndex() {
    }

    /** First ray and one past the last ray of each sweep. */
    static List<int[]> of(Optional<double[]> start, Optional<double[]> end, double[] elevationDeg,
                          List<String> notes) {
        int rays = elevationDeg.length;
        if (start.isPresent() && end.isPresent()) {
            List<int[]> sweeps = stated(start.get(), end.get(), rays, notes);
            if (sweeps != null) {
                return sweeps;
            }
            notes.add("the sweeps' ray indices make no sense; sweeps are told apart by elevation");
        } else {
            notes.add("no sweep indices; sweeps are told apart by elevation");
        }
        return byElevation(elevationDeg);
    }

    private static List<int[]> stated(double[] start, double[] end, int rays, List<String> notes) {
        if (start.length != end.length || start.length == 0 || start.length > Limits.MAX_SWEEPS) {
            return null;
        }
        // Some writers give the end as one past the last ray: each end is then the next start, the last the count.
        int n = start.length;
        boolean exclusive = end[n - 1] == rays;
        for (int i = 0; exclusive && i < n - 1; i++) {
            exclusive = end[i] == start[i + 1];
        }
        if (exclusive) {
            notes.add("sweep_end_ray_index counts one ray too many and is taken as exclusive");
        }
        List<int[]> sweeps = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            double past = exclusive ? end[i] : end[i] + 1;
            if (!(start[i] >= 0 && past > start[i] && past <= rays) || start[i] != Math.rint(start[i])
                    || past != Math.rint(past)) {
                return null;
            }
            sweeps.add(new int[] {(int) start[i], (int) past});
        }
        return sweeps;
    }

    private static List<int[]> byElevation(double[] elevationDeg) {
        List<int[]> sweeps = new ArrayList<>();
        int from = 0;
        double level = elevationDeg[0];
        for (int i = 1; i <= elevationDeg.length; i++) {
            boolean jumped = i < elevationDeg.length && Math.abs(elevationDeg[i] - level) > JUMP_DEG
                    && Math.abs(elevationDeg[Math.min(i + 2, elevationDeg.length - 1)] - level) > JUMP_DEG;
            if (i == elevationDeg.length || jumped) {
                sweeps.add(new int[] {from, i});
                from = i;
                level = i < elevationDeg.length ? median(elevationDeg, i, Math.min(i + 10, elevationDeg.length)) : 0;
            }
        }
        if (sweeps.size() > Limits.MAX_SWEEPS || sweeps.size() > elevationDeg.length / 10) {
            // A moving elevation: one sweep, whose mode the angles tell.
            return List.of(new int[] {0, elevationDeg.length});
        }
        return sweeps;
    }

    private static double median(double[] values, int from, int to) {
        double[] part = Arrays.copyOfRange(values, from, to);
        Arrays.sort(part);
        return part[part.length / 2];
    }
}
