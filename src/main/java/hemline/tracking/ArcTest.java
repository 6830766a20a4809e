package hemline.tracking;

import hemline.geometry.GrowingArc;
import hemline.geometry.GrowingArcFit;
import hemline.numerics.Robust;
import java.util.Arrays;
import java.util.IdentityHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * Whether one growing arc explains two sets of vertices, or each wants its own. Two rings that met are told apart
 * however well their pieces overlap; two parts of a ring are one however wide the gap.
 */
final class ArcTest {
    private static final double NOISE_KM = 0.5;
    /** Vertices 1 km apart share their error over some 5 km. */
    static final double EFFECTIVE_SHARE = 0.2;
    private static final int MOST_POINTS = 240;
    /** Time over which a set's own speed is checked against the common arc, 1000 s, and the miss allowed, km. */
    private static final double STEP = 0.3;
    private static final double MISS_KM = 1.5;

    private final VertexCloud cloud;
    private final MotionLattice.Motion motion;
    private final Map<int[], Optional<GrowingArc>> fits = new IdentityHashMap<>();

    ArcTest(VertexCloud cloud, MotionLattice.Motion motion) {
        this.cloud = cloud;
        this.motion = motion;
    }

    /**
     * @param cost   rise of the robust cost from two arcs to one, in noise variances of independent points
     * @param mean   the same for each independent point of the smaller set
     * @param moving whether both sets move as the common arc does
     */
    record Outcome(double cost, double mean, boolean moving) {
    }

    /** Empty when a fit does not converge. */
    Optional<Outcome> compare(int[] a, int[] b) {
        int[] both = Arrays.copyOf(a, a.length + b.length);
        System.arraycopy(b, 0, both, a.length, b.length);
        Arrays.sort(both);
        Optional<GrowingArc> alone = fit(a);
        Optional<GrowingArc> other = fit(b);
        Optional<GrowingArc> joint = fit(both);
        if (alone.isEmpty() || other.isEmpty() || joint.isEmpty()) {
            return Optional.empty();
        }
        double middle = middleS(both);
        double cost = cost(joint.get(), both, middle) - cost(alone.get(), a, middleS(a))
                - cost(other.get(), b, middleS(b));
        double independent = Math.max(1, EFFECTIVE_SHARE * Math.min(a.length, b.length));
        return Optional.of(new Outcome(cost, cost / independent,
                moves(joint.get(), a, middle) && moves(joint.get(), b, middle)));
    }

    private double cost(GrowingArc arc, int[] vertices, double middleS) {
        double c = 2 * NOISE_KM;
        double sum = 0;
        for (int i : vertices) {
            double r = arc.offsetKm(cloud.x[i], cloud.y[i], (cloud.timeS[i] - middleS) / 1000);
            sum += c * c / (NOISE_KM * NOISE_KM) * Math.log1p(r * r / (c * c));
        }
        return EFFECTIVE_SHARE * sum;
    }

    /** Whether most vertices, carried on at their own speeds, stay on the arc. */
    private boolean moves(GrowingArc arc, int[] vertices, double middleS) {
        double agree = 0;
        for (int i : vertices) {
            double tau = (cloud.timeS[i] - middleS) / 1000;
            double moved = motion.speedMs()[i] * STEP;
            double now = arc.offsetKm(cloud.x[i], cloud.y[i], tau);
            double later = arc.offsetKm(cloud.x[i] + moved * cloud.normalX[i], cloud.y[i] + moved * cloud.normalY[i],
                    tau + STEP);
            agree += Math.abs(later - now) < MISS_KM ? 1 : 0;
        }
        return agree >= 0.6 * vertices.length;
    }

    private double middleS(int[] vertices) {
        double first = Double.POSITIVE_INFINITY;
        double last = Double.NEGATIVE_INFINITY;
        for (int i : vertices) {
            first = Math.min(first, cloud.timeS[i]);
            last = Math.max(last, cloud.timeS[i]);
        }
        return 0.5 * (first + last);
    }

    /** Fits are kept by the very array, since groups are compared with many others. */
    private Optional<GrowingArc> fit(int[] vertices) {
        return fits.computeIfAbsent(vertices, this::fitNow);
    }

    /**
     * Whether the arc of either set alone comes anywhere near the other: a cheap question before the joint fit. Sets
     * without an arc of their own are near everything.
     */
    boolean near(int[] a, int[] b, double withinKm) {
        return medianOffKm(a, b) < withinKm || medianOffKm(b, a) < withinKm;
    }

    private double medianOffKm(int[] fitted, int[] vertices) {
        Optional<GrowingArc> arc = fit(fitted);
        double middle = middleS(fitted);
        return arc.isEmpty() ? 0 : Robust.median(Arrays.stream(vertices).filter(i -> (i & 3) == 0).mapToDouble(
                i -> Math.abs(arc.get().offsetKm(cloud.x[i], cloud.y[i], (cloud.timeS[i] - middle) / 1000))).toArray());
    }

    private Optional<GrowingArc> fitNow(int[] vertices) {
        int stride = Math.max(1, vertices.length / MOST_POINTS);
        int n = (vertices.length + stride - 1) / stride;
        double[] x = new double[n];
        double[] y = new double[n];
        double[] tau = new double[n];
        double[] nx = new double[n];
        double[] ny = new double[n];
        double[] speed = new double[n];
        double middle = middleS(vertices);
        for (int k = 0; k < n; k++) {
            int i = vertices[k * stride];
            double sign = motion.speedMs()[i] < 0 ? -1 : 1;
            x[k] = cloud.x[i];
            y[k] = cloud.y[i];
            tau[k] = (cloud.timeS[i] - middle) / 1000;
            nx[k] = sign * cloud.normalX[i];
            ny[k] = sign * cloud.normalY[i];
            speed[k] = Math.abs(motion.speedMs()[i]);
        }
        return new GrowingArcFit(x, y, tau, NOISE_KM, Math.min(1, EFFECTIVE_SHARE * stride), true)
                .fit(nx, ny, Robust.median(speed));
    }
}
