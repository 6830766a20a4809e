package hemline.detection;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Follows crests of stacked evidence: from seeds, the strongest first, both ways along the line, a kilometre at a time,
 * the place across found to a fraction of a pixel by a parabola.
 */
final class CurveTracer {
    private static final float SEED = 1.7f;
    private static final float GO_ON = 0.9f;
    private static final double STEP_KM = 1;
    private static final double ACROSS_KM = 1.6;
    private static final double ACROSS_STEP_KM = 0.4;
    private static final double LEAST_COSINE = Math.cos(Math.toRadians(30));
    private static final int MOST_WEAK = 3;
    private static final double TAKEN_KM = 2;
    private static final double TAKEN_COSINE = Math.cos(Math.toRadians(40));

    private final EvidenceStack stack;
    private final PlaneGrid grid;
    /** Normal of the curve that has taken a pixel, as signed direction + 1; 0 free. */
    private final byte[] taken;

    private CurveTracer(EvidenceStack stack) {
        this.stack = stack;
        this.grid = stack.grid;
        this.taken = new byte[grid.size()];
    }

    /** Curves of at least {@code fewest} vertices whose mean evidence is at least {@code leastMean}. */
    static List<TracedCurve> trace(EvidenceStack stack, int fewest, double leastMean) {
        CurveTracer tracer = new CurveTracer(stack);
        List<TracedCurve> curves = new ArrayList<>();
        int[] seeds = IntStream.range(0, stack.evidence.length).filter(i -> stack.evidence[i] >= SEED).boxed()
                .sorted((i, j) -> stack.evidence[i] != stack.evidence[j]
                        ? Float.compare(stack.evidence[j], stack.evidence[i]) : Integer.compare(i, j))
                .mapToInt(Integer::intValue).toArray();
        for (int seed : seeds) {
            if (tracer.isTaken(seed, stack.normal[seed])) {
                continue;
            }
            TracedCurve curve = tracer.from(seed);
            tracer.take(curve);
            if (curve.size() >= fewest && curve.meanEvidence() >= leastMean) {
                curves.add(curve);
            }
        }
        return curves;
    }

    private boolean isTaken(int pixel, int normal) {
        if (taken[pixel] == 0) {
            return false;
        }
        int by = taken[pixel] - 1;
        return Orientations.normalEast(by) * Orientations.normalEast(normal)
                + Orientations.normalNorth(by) * Orientations.normalNorth(normal) > TAKEN_COSINE;
    }

    private void take(TracedCurve curve) {
        int reach = (int) Math.round(TAKEN_KM / grid.spacingKm());
        for (int i = 0; i < curve.size(); i++) {
            int cx = (int) Math.rint(grid.index(curve.x()[i]));
            int cy = (int) Math.rint(grid.index(curve.y()[i]));
            double angle = Math.atan2(curve.normalY()[i], curve.normalX()[i]);
            int d = Math.floorMod((int) Math.rint(angle / (2 * Math.PI) * Orientations.SIGNED), Orientations.SIGNED);
            for (int y = Math.max(0, cy - reach); y <= Math.min(grid.width() - 1, cy + reach); y++) {
                for (int x = Math.max(0, cx - reach); x <= Math.min(grid.width() - 1, cx + reach); x++) {
                    if (taken[y * grid.width() + x] == 0) {
                        taken[y * grid.width() + x] = (byte) (d + 1);
                    }
                }
            }
        }
    }

    /** A vertex being followed. */
    private record Place(double x, double y, double nx, double ny, double speedMs, double evidence) {
    }

    private TracedCurve from(int seed) {
        int d = stack.normal[seed];
        Place start = settle(grid.km(seed % grid.width()), grid.km(seed / grid.width()), Orientations.normalEast(d),
                Orientations.normalNorth(d), 0.8);
        if (start == null) {
            start = new Place(grid.km(seed % grid.width()), grid.km(seed / grid.width()), Orientations.normalEast(d),
                    Orientations.normalNorth(d), stack.speedMs[seed], stack.evidence[seed]);
        }
        List<Place> left = walk(start, 1);
        List<Place> right = walk(start, -1);
        List<Place> all = new ArrayList<>(left.size() + right.size() + 1);
        for (int i = left.size() - 1; i >= 0; i--) {
            all.add(left.get(i));
        }
        all.add(start);
        all.addAll(right);
        int n = all.size();
        double[][] columns = new double[6][n];
        for (int i = 0; i < n; i++) {
            Place p = all.get(i);
            columns[0][i] = p.x;
            columns[1][i] = p.y;
            columns[2][i] = p.nx;
            columns[3][i] = p.ny;
            columns[4][i] = p.speedMs;
            columns[5][i] = p.evidence;
        }
        return new TracedCurve(columns[0], columns[1], columns[2], columns[3], columns[4], columns[5]);
    }

    private List<Place> walk(Place start, int way) {
        List<Place> path = new ArrayList<>();
        Place at = start;
        double nx = start.nx;
        double ny = start.ny;
        int weak = 0;
        int most = 4 * grid.width();
        while (weak <= MOST_WEAK && path.size() < most) {
            double x = at.x - way * ny * STEP_KM;
            double y = at.y + way * nx * STEP_KM;
            Place next = settle(x, y, nx, ny, ACROSS_KM);
            if (next == null) {
                weak++;
                next = new Place(x, y, nx, ny, at.speedMs, Math.max(0, sample(x, y)));
            } else {
                weak = next.evidence < GO_ON ? weak + 1 : 0;
            }
            int pixel = pixel(next.x, next.y);
            if (pixel < 0 || isTaken(pixel, nearestNormal(next))) {
                break;
            }
            path.add(next);
            double mixX = 0.65 * nx + 0.35 * next.nx;
            double mixY = 0.65 * ny + 0.35 * next.ny;
            double length = Math.hypot(mixX, mixY);
            nx = mixX / length;
            ny = mixY / length;
            at = next;
            if (path.size() > 12 && closesOn(path, start)) {
                break;
            }
        }
        while (!path.isEmpty() && path.get(path.size() - 1).evidence < GO_ON) {
            path.remove(path.size() - 1);
        }
        return path;
    }

    private static boolean closesOn(List<Place> path, Place start) {
        Place end = path.get(path.size() - 1);
        return Math.hypot(end.x - start.x, end.y - start.y) < 1.2 * STEP_KM;
    }

    private int nearestNormal(Place p) {
        double angle = Math.atan2(p.ny, p.nx);
        return Math.floorMod((int) Math.rint(angle / (2 * Math.PI) * Orientations.SIGNED), Orientations.SIGNED);
    }

    private int pixel(double x, double y) {
        int column = (int) Math.rint(grid.index(x));
        int row = (int) Math.rint(grid.index(y));
        return column < 0 || row < 0 || column >= grid.width() || row >= grid.width() ? -1 : row * grid.width() + column;
    }

    /** The crest nearest across the line through a place with about its normal; null where there is none. */
    private Place settle(double x, double y, double nx, double ny, double acrossKm) {
        int half = (int) Math.round(acrossKm / ACROSS_STEP_KM);
        double[] across = new double[2 * half + 3];
        int best = -1;
        double bestScore = Double.NEGATIVE_INFINITY;
        for (int k = -half - 1; k <= half + 1; k++) {
            double px = x + k * ACROSS_STEP_KM * nx;
            double py = y + k * ACROSS_STEP_KM * ny;
            across[k + half + 1] = aligned(px, py, nx, ny) ? sample(px, py) : Double.NEGATIVE_INFINITY;
            double score = across[k + half + 1] - 0.15 * Math.abs(k) * ACROSS_STEP_KM;
            if (Math.abs(k) <= half && score > bestScore) {
                bestScore = score;
                best = k + half + 1;
            }
        }
        if (best < 0) {
            return null;
        }
        double offset = (best - half - 1 + parabola(across, best)) * ACROSS_STEP_KM;
        double px = x + offset * nx;
        double py = y + offset * ny;
        int pixel = pixel(px, py);
        if (pixel < 0 || across[best] == Double.NEGATIVE_INFINITY) {
            return null;
        }
        int d = stack.normal[pixel];
        double cosine = Orientations.normalEast(d) * nx + Orientations.normalNorth(d) * ny;
        return cosine < LEAST_COSINE ? new Place(px, py, nx, ny, stack.speedMs[pixel], across[best])
                : new Place(px, py, Orientations.normalEast(d), Orientations.normalNorth(d), stack.speedMs[pixel],
                across[best]);
    }

    private static double parabola(double[] y, int i) {
        double below = y[i - 1];
        double above = y[i + 1];
        double bend = below - 2 * y[i] + above;
        if (Double.isInfinite(below) || Double.isInfinite(above) || bend >= 0) {
            return 0;
        }
        return Math.max(-0.5, Math.min(0.5, 0.5 * (below - above) / bend));
    }

    private boolean aligned(double x, double y, double nx, double ny) {
        int pixel = pixel(x, y);
        if (pixel < 0 || stack.evidence[pixel] == Float.NEGATIVE_INFINITY) {
            return false;
        }
        int d = stack.normal[pixel];
        return Orientations.normalEast(d) * nx + Orientations.normalNorth(d) * ny >= LEAST_COSINE;
    }

    /** Evidence between pixel centres, bilinear; −∞ beside pixels that say nothing. */
    private double sample(double x, double y) {
        double column = grid.index(x);
        double row = grid.index(y);
        int c = (int) Math.floor(column);
        int r = (int) Math.floor(row);
        if (c < 0 || r < 0 || c + 1 >= grid.width() || r + 1 >= grid.width()) {
            return Double.NEGATIVE_INFINITY;
        }
        double fx = column - c;
        double fy = row - r;
        int i = r * grid.width() + c;
        float[] e = stack.evidence;
        return (1 - fy) * ((1 - fx) * e[i] + fx * e[i + 1])
                + fy * ((1 - fx) * e[i + grid.width()] + fx * e[i + grid.width() + 1]);
    }
}
