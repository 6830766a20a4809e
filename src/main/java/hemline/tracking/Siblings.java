package hemline.tracking;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;

/** Decides by joint arc fits which groups of pieces are one boundary. */
final class Siblings {
    /** Groups with fewer vertices cannot tell their own arc. */
    private static final int LEAST_GUARDED = 80;
    private static final int LEAST_JOINED = 24;
    /** Rise of the cost for each independent point from which two groups are held apart, and to which joined. */
    private static final double FORBID_COST = 40;
    private static final double FORBID_MEAN = 4;
    private static final double JOIN_MEAN = 1.6;
    /** Length on either side of a gap between ends that is tested by itself, and the longest such gap, km. */
    private static final double LOCAL_KM = 35;
    private static final double LOCAL_GAP_KM = 32;
    private static final double LOCAL_MEAN = 1.0;
    /** Groups whose arcs pass each other by more than this are not compared further, km. */
    private static final double FAR_OFF_KM = 12;
    private static final double LONGEST_PAUSE_S = 2400;

    private final VertexCloud cloud;
    private final List<Piece> pieces;
    private final ArcTest test;

    Siblings(VertexCloud cloud, MotionLattice.Motion motion, List<Piece> pieces) {
        this.cloud = cloud;
        this.pieces = pieces;
        test = new ArcTest(cloud, motion);
    }

    /** The vertices of a group, rising. */
    int[] vertices(List<Integer> group) {
        int[] all = new int[group.stream().mapToInt(p -> pieces.get(p).to() - pieces.get(p).from()).sum()];
        int at = 0;
        for (int p : group.stream().sorted().toList()) {
            for (int i = pieces.get(p).from(); i < pieces.get(p).to(); i++) {
                all[at++] = i;
            }
        }
        return all;
    }

    private long sweeps(int[] vertices) {
        return Arrays.stream(vertices).map(i -> cloud.sweep[i]).distinct().count();
    }

    /** False when two groups large enough to tell fit each its own arc but not one together. */
    boolean mayJoin(List<Integer> a, List<Integer> b) {
        int[] first = vertices(a);
        int[] second = vertices(b);
        if (Math.min(first.length, second.length) < LEAST_GUARDED || sweeps(first) < 3 || sweeps(second) < 3) {
            return true;
        }
        Optional<ArcTest.Outcome> found = test.compare(first, second);
        return found.isEmpty() || found.get().cost() < FORBID_COST || found.get().mean() < FORBID_MEAN;
    }

    private record Pair(double mean, int a, int b) {
    }

    /** Joins groups that one arc explains, the best-fitting pair first. */
    List<List<Integer>> join(List<List<Integer>> groups) {
        List<List<Integer>> live = new ArrayList<>(groups);
        List<int[]> vertices = new ArrayList<>(groups.stream().map(this::vertices).toList());
        PriorityQueue<Pair> queue = new PriorityQueue<>(Comparator.comparingDouble(Pair::mean)
                .thenComparingInt(Pair::a).thenComparingInt(Pair::b));
        for (int b = 1; b < live.size(); b++) {
            offerAll(queue, vertices, live, b);
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
            vertices.add(vertices(both));
            offerAll(queue, vertices, live, live.size() - 1);
        }
        List<List<Integer>> kept = new ArrayList<>(live.stream().filter(group -> group != null).toList());
        kept.sort(Comparator.comparingInt(group -> group.get(0)));
        return kept;
    }

    private void offerAll(PriorityQueue<Pair> queue, List<int[]> vertices, List<List<Integer>> live, int b) {
        for (int a = 0; a < b; a++) {
            if (live.get(a) != null) {
                double mean = meanIfOne(vertices.get(a), vertices.get(b));
                if (!Double.isNaN(mean)) {
                    queue.add(new Pair(mean, a, b));
                }
            }
        }
    }

    /** How well one arc explains both; NaN when it does not. */
    private double meanIfOne(int[] a, int[] b) {
        if (Math.min(a.length, b.length) < LEAST_JOINED || sweeps(a) < 2 || sweeps(b) < 2 || pause(a, b) > LONGEST_PAUSE_S) {
            return Double.NaN;
        }
        if (!test.near(a, b, FAR_OFF_KM)) {
            return Double.NaN;
        }
        Optional<ArcTest.Outcome> whole = test.compare(a, b);
        if (whole.isPresent() && whole.get().moving() && whole.get().mean() < JOIN_MEAN) {
            return whole.get().mean();
        }
        return localMean(a, b);
    }

    /** Long lines are no arcs as a whole; what counts is whether their near ends continue each other. */
    private double localMean(int[] a, int[] b) {
        List<Integer> nearA = new ArrayList<>();
        List<Integer> nearB = new ArrayList<>();
        int shared = 0;
        for (int k = 0; k < cloud.sweeps; k++) {
            int[] inA = inSweep(a, k);
            int[] inB = inSweep(b, k);
            double[] gap = gap(inA, inB);
            if (gap[0] <= LOCAL_GAP_KM) {
                shared++;
                collect(inA, gap, nearA);
                collect(inB, gap, nearB);
            }
        }
        if (shared < 3 || Math.min(nearA.size(), nearB.size()) < LEAST_JOINED) {
            return Double.NaN;
        }
        Optional<ArcTest.Outcome> local = test.compare(nearA.stream().mapToInt(i -> i).toArray(),
                nearB.stream().mapToInt(i -> i).toArray());
        return local.isPresent() && local.get().moving() && local.get().mean() < LOCAL_MEAN ? local.get().mean()
                : Double.NaN;
    }

    private int[] inSweep(int[] vertices, int sweep) {
        return Arrays.stream(vertices).filter(i -> cloud.sweep[i] == sweep).toArray();
    }

    /** Shortest distance between two sets and the middle of it. */
    private double[] gap(int[] a, int[] b) {
        double[] best = {Double.POSITIVE_INFINITY, 0, 0};
        for (int i : a) {
            for (int j : b) {
                double distance = Math.hypot(cloud.x[i] - cloud.x[j], cloud.y[i] - cloud.y[j]);
                if (distance < best[0]) {
                    best = new double[] {distance, 0.5 * (cloud.x[i] + cloud.x[j]), 0.5 * (cloud.y[i] + cloud.y[j])};
                }
            }
        }
        return best;
    }

    private void collect(int[] vertices, double[] gap, List<Integer> into) {
        for (int i : vertices) {
            if (Math.hypot(cloud.x[i] - gap[1], cloud.y[i] - gap[2]) < LOCAL_KM) {
                into.add(i);
            }
        }
    }

    /** Time between the end of one and the start of the other, s; negative when they overlap. */
    private double pause(int[] a, int[] b) {
        double firstA = cloud.timeS[a[0]];
        double firstB = cloud.timeS[b[0]];
        return Math.max(firstA, firstB) - Math.min(cloud.timeS[a[a.length - 1]], cloud.timeS[b[b.length - 1]]);
    }
}
