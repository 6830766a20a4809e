package hemline.tracking;

import hemline.geometry.GrowingArc;
import hemline.geometry.GrowingArcFit;
import hemline.numerics.Robust;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.PriorityQueue;

/**
 * Whether one growing arc explains two groups of pieces, or each wants its own: the joint fit decides which groups are
 * one boundary. Two rings that met are told apart however well their pieces overlap; two parts of a ring are one
 * however wide the gap.
 */
final class GroupArcs {
    private static final double NOISE_KM = 0.5;
    private static final double EFFECTIVE_SHARE = 0.2;
    private static final int MOST_POINTS = 240;
    /** Groups with fewer vertices are not tested. */
    private static final int LEAST_GUARDED = 80;
    private static final int LEAST_JOINED = 24;
    /** Rise of the cost by which two arcs are better than one, in all and for each independent point. */
    private static final double FORBID_COST = 40;
    private static final double FORBID_MEAN = 4;
    private static final double JOIN_MEAN = 1.6;

    private final VertexCloud cloud;
    private final MotionLattice.Motion motion;
    private final List<Piece> pieces;
    private final Map<List<Integer>, Optional<GrowingArc>> fits = new HashMap<>();

    GroupArcs(VertexCloud cloud, MotionLattice.Motion motion, List<Piece> pieces) {
        this.cloud = cloud;
        this.motion = motion;
        this.pieces = pieces;
    }

    private int vertices(List<Integer> group) {
        return group.stream().mapToInt(p -> pieces.get(p).to() - pieces.get(p).from()).sum();
    }

    /** False when two groups large enough to tell fit each its own arc but not one together. */
    boolean mayJoin(List<Integer> a, List<Integer> b) {
        if (vertices(a) < LEAST_GUARDED || vertices(b) < LEAST_GUARDED || sweeps(a) < 3 || sweeps(b) < 3) {
            return true;
        }
        Excess excess = excess(a, b);
        return excess == null || excess.cost() < FORBID_COST || excess.mean() < FORBID_MEAN;
    }

    private long sweeps(List<Integer> group) {
        return group.stream().map(p -> pieces.get(p).sweep()).distinct().count();
    }

    /**
     * @param cost rise of the robust cost from two arcs to one
     * @param mean the same for each independent point of the smaller group
     */
    private record Excess(double cost, double mean) {
    }

    private Excess excess(List<Integer> a, List<Integer> b) {
        Optional<GrowingArc> alone = fit(a);
        Optional<GrowingArc> other = fit(b);
        List<Integer> both = new ArrayList<>(a);
        both.addAll(b);
        both.sort(null);
        Optional<GrowingArc> joint = fit(both);
        if (alone.isEmpty() || other.isEmpty() || joint.isEmpty()) {
            return null;
        }
        double cost = costOf(joint.get(), both) - costOf(alone.get(), a) - costOf(other.get(), b);
        double independent = Math.max(1, EFFECTIVE_SHARE * Math.min(vertices(a), vertices(b)));
        return new Excess(cost, cost / independent);
    }

    /** Robust cost of all vertices of a group against an arc, in noise variances of independent points. */
    private double costOf(GrowingArc arc, List<Integer> group) {
        double c = 2 * NOISE_KM;
        double sum = 0;
        double middle = middleS(group);
        for (int p : group) {
            for (int i = pieces.get(p).from(); i < pieces.get(p).to(); i++) {
                double r = arc.offsetKm(cloud.x[i], cloud.y[i], (cloud.timeS[i] - middle) / 1000);
                sum += c * c / (NOISE_KM * NOISE_KM) * Math.log1p(r * r / (c * c));
            }
        }
        return EFFECTIVE_SHARE * sum;
    }

    private double middleS(List<Integer> group) {
        double first = Double.POSITIVE_INFINITY;
        double last = Double.NEGATIVE_INFINITY;
        for (int p : group) {
            first = Math.min(first, cloud.timeS[pieces.get(p).from()]);
            last = Math.max(last, cloud.timeS[pieces.get(p).from()]);
        }
        return 0.5 * (first + last);
    }

    private Optional<GrowingArc> fit(List<Integer> group) {
        return fits.computeIfAbsent(List.copyOf(group), this::fitNow);
    }

    private Optional<GrowingArc> fitNow(List<Integer> group) {
        int total = vertices(group);
        int stride = Math.max(1, total / MOST_POINTS);
        int n = (total + stride - 1) / stride;
        double[] x = new double[n];
        double[] y = new double[n];
        double[] tau = new double[n];
        double[] nx = new double[n];
        double[] ny = new double[n];
        double[] speed = new double[n];
        double middle = middleS(group);
        int count = 0;
        int k = 0;
        for (int p : group) {
            for (int i = pieces.get(p).from(); i < pieces.get(p).to(); i++) {
                if (count++ % stride == 0) {
                    double sign = motion.speedMs()[i] < 0 ? -1 : 1;
                    x[k] = cloud.x[i];
                    y[k] = cloud.y[i];
                    tau[k] = (cloud.timeS[i] - middle) / 1000;
                    nx[k] = sign * cloud.normalX[i];
                    ny[k] = sign * cloud.normalY[i];
                    speed[k++] = Math.abs(motion.speedMs()[i]);
                }
            }
        }
        return new GrowingArcFit(x, y, tau, NOISE_KM, Math.min(1, EFFECTIVE_SHARE * stride), true)
                .fit(nx, ny, Robust.median(speed));
    }

    private record Pair(double mean, int a, int b) {
    }

    /** Joins groups, the best-fitting pair first, that one arc explains and that are near in time. */
    List<List<Integer>> joinSiblings(List<List<Integer>> groups) {
        List<List<Integer>> live = new ArrayList<>(groups);
        PriorityQueue<Pair> queue = new PriorityQueue<>(Comparator.comparingDouble(Pair::mean)
                .thenComparingInt(Pair::a).thenComparingInt(Pair::b));
        for (int a = 0; a < live.size(); a++) {
            for (int b = a + 1; b < live.size(); b++) {
                offer(queue, live, a, b);
            }
        }
        while (!queue.isEmpty()) {
            Pair best = queue.poll();
            if (live.get(best.a()) == null || live.get(best.b()) == null) {
                continue;
            }
            List<Integer> both = new ArrayList<>(live.get(best.a()));
            both.addAll(live.get(best.b()));
            both.sort(null);
            live.set(best.a(), null);
            live.set(best.b(), null);
            live.add(both);
            for (int other = 0; other + 1 < live.size(); other++) {
                if (live.get(other) != null) {
                    offer(queue, live, other, live.size() - 1);
                }
            }
        }
        List<List<Integer>> kept = new ArrayList<>(live.stream().filter(group -> group != null).toList());
        kept.sort(Comparator.comparingInt(group -> group.get(0)));
        return kept;
    }

    private void offer(PriorityQueue<Pair> queue, List<List<Integer>> live, int a, int b) {
        List<Integer> first = live.get(a);
        List<Integer> second = live.get(b);
        if (vertices(first) < LEAST_JOINED || vertices(second) < LEAST_JOINED || sweeps(first) < 2
                || sweeps(second) < 2 || !near(first, second)) {
            return;
        }
        Excess excess = excess(first, second);
        if (excess != null && excess.mean() < JOIN_MEAN && outward(first, second)) {
            queue.add(new Pair(excess.mean(), a, b));
        }
    }

    /** Whether both groups move the same way with respect to their common arc, out or in, at its speed. */
    private boolean outward(List<Integer> a, List<Integer> b) {
        List<Integer> both = new ArrayList<>(a);
        both.addAll(b);
        both.sort(null);
        GrowingArc arc = fit(both).orElseThrow();
        double middle = middleS(both);
        for (List<Integer> group : List.of(a, b)) {
            double agree = 0;
            double count = 0;
            for (int p : group) {
                for (int i = pieces.get(p).from(); i < pieces.get(p).to(); i++) {
                    double tau = (cloud.timeS[i] - middle) / 1000;
                    double dx = cloud.x[i] - arc.centreAt(tau).xKm();
                    double dy = cloud.y[i] - arc.centreAt(tau).yKm();
                    double out = (dx * cloud.normalX[i] + dy * cloud.normalY[i]) / Math.hypot(dx, dy);
                    double expected = arc.radialSpeedMs(cloud.x[i], cloud.y[i], tau) * Math.signum(out);
                    agree += Math.abs(expected - motion.speedMs()[i]) < 5 && Math.abs(out) > 0.8 ? 1 : 0;
                    count++;
                }
            }
            if (agree < 0.6 * count) {
                return false;
            }
        }
        return true;
    }

    /** Overlapping in time or at most 40 minutes apart. */
    private boolean near(List<Integer> a, List<Integer> b) {
        double gap = Math.max(firstS(a), firstS(b)) - Math.min(lastS(a), lastS(b));
        return gap < 2400;
    }

    private double firstS(List<Integer> group) {
        return group.stream().mapToDouble(p -> cloud.timeS[pieces.get(p).from()]).min().orElseThrow();
    }

    private double lastS(List<Integer> group) {
        return group.stream().mapToDouble(p -> cloud.timeS[pieces.get(p).from()]).max().orElseThrow();
    }
}
