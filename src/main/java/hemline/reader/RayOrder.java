package hemline.reader;

import hemline.sweep.RayGeometry;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * The rays of a sweep by rising azimuth: each direction once, and unmeasured rays where a sector is missing, so that
 * the nearest ray to any azimuth is either a ray that looked there or one that says it was not measured.
 *
 * @param stored   for each ray, its index in the file, or −1 for an unmeasured one
 * @param geometry directions and times
 * @param notes    what was left out or put in
 */
record RayOrder(int[] stored, RayGeometry geometry, List<String> notes) {
    /** A gap of more than so many ray spacings is a missing sector rather than an uneven antenna. */
    private static final double GAP_SPACINGS = 1.8;
    /** Rays closer than this part of the spacing are the same ray twice. */
    private static final double SAME_SPACINGS = 0.05;
    private static final int MAX_FILLED = 7200;

    static RayOrder of(RayTable rays, double nominalElevationDeg) {
        List<String> notes = new ArrayList<>();
        int n = rays.rays();
        double[] azimuth = new double[n];
        for (int i = 0; i < n; i++) {
            azimuth[i] = turned(rays.azimuthDeg()[i]);
        }
        double spacing = spacingDeg(azimuth);
        Integer[] order = firstTurn(azimuth, spacing, notes);
        Arrays.sort(order, Comparator.<Integer>comparingDouble(i -> azimuth[i]).thenComparingInt(i -> i));

        List<Ray> sorted = new ArrayList<>();
        boolean twice = false;
        for (int i : order) {
            Ray last = sorted.isEmpty() ? null : sorted.get(sorted.size() - 1);
            if (last != null && azimuth[i] - last.azimuthDeg < SAME_SPACINGS * spacing) {
                twice = true;
                if (i < last.stored) {
                    sorted.set(sorted.size() - 1, ray(rays, i, azimuth[i], nominalElevationDeg));
                }
                continue;
            }
            sorted.add(ray(rays, i, azimuth[i], nominalElevationDeg));
        }
        if (twice) {
            notes.add("rays at the azimuth of another are left out");
        }
        List<Ray> filled = withGapsFilled(sorted, spacing, nominalElevationDeg, notes);
        return new RayOrder(filled.stream().mapToInt(r -> r.stored).toArray(), new RayGeometry(
                filled.stream().mapToDouble(r -> r.azimuthDeg).toArray(),
                filled.stream().mapToDouble(r -> r.elevationDeg).toArray(),
                filled.stream().mapToLong(r -> r.timeMs).toArray()), notes);
    }

    private record Ray(int stored, double azimuthDeg, double elevationDeg, long timeMs) {
    }

    private static Ray ray(RayTable rays, int i, double azimuthDeg, double nominalDeg) {
        double elevation = rays.elevationDeg()[i];
        return new Ray(i, azimuthDeg, Math.abs(elevation) <= 90 ? elevation : nominalDeg, rays.timeMs()[i]);
    }

    /** An azimuth in [0, 360). */
    static double turned(double azimuthDeg) {
        double in = (azimuthDeg % 360 + 360) % 360;
        return in >= 360 ? 0 : in;
    }

    /** The median step between rays that follow each other in the file, degrees. */
    private static double spacingDeg(double[] azimuth) {
        double[] steps = new double[azimuth.length - 1];
        for (int i = 0; i < steps.length; i++) {
            steps[i] = RayGeometry.gapDeg(azimuth[i], azimuth[i + 1]);
        }
        double[] moved = Arrays.stream(steps).filter(s -> s > 1e-6).sorted().toArray();
        return moved.length == 0 ? 360.0 / azimuth.length : moved[moved.length / 2];
    }

    /** Rays up to a full turn from the first: what comes after was looked at already, a minute earlier. */
    private static Integer[] firstTurn(double[] azimuth, double spacing, List<String> notes) {
        double travelled = 0;
        int n = 1;
        for (; n < azimuth.length; n++) {
            double step = ((azimuth[n] - azimuth[n - 1]) % 360 + 540) % 360 - 180;
            travelled += step;
            if (Math.abs(travelled) > 360 - spacing / 2) {
                notes.add("rays beyond a full turn are left out");
                break;
            }
        }
        Integer[] order = new Integer[n];
        Arrays.setAll(order, i -> i);
        return order;
    }

    private static List<Ray> withGapsFilled(List<Ray> sorted, double spacing, double nominalDeg, List<String> notes) {
        List<Ray> filled = new ArrayList<>();
        boolean missing = false;
        int n = sorted.size();
        for (int i = 0; i < n; i++) {
            Ray here = sorted.get(i);
            Ray next = sorted.get((i + 1) % n);
            filled.add(here);
            double gap = n == 1 ? 360 : (next.azimuthDeg - here.azimuthDeg + 360) % 360;
            int between = (int) Math.min(MAX_FILLED, Math.round(gap / spacing) - 1);
            if (gap > GAP_SPACINGS * spacing && between > 0 && filled.size() + between < Limits.MAX_RAYS) {
                for (int k = 1; k <= between; k++) {
                    double part = k / (between + 1.0);
                    filled.add(new Ray(-1, turned(here.azimuthDeg + part * gap), nominalDeg,
                            here.timeMs + Math.round(part * (next.timeMs - here.timeMs))));
                }
                missing = true;
            }
        }
        if (missing) {
            notes.add("directions without a ray are kept as not measured");
            filled.sort(Comparator.comparingDouble(Ray::azimuthDeg));
        }
        return filled;
    }
}
