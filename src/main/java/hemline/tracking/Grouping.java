package hemline.tracking;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.PriorityQueue;
import java.util.TreeMap;
import java.util.function.BiPredicate;

/**
 * Pieces to groups by agglomeration over the whole loop: the two groups with the most shared length for their size
 * are joined first, unless a check forbids it.
 */
final class Grouping {
    private final double leastShare;
    private final BiPredicate<List<Integer>, List<Integer>> mayJoin;
    private final List<List<Integer>> members = new ArrayList<>();
    private final List<Double> sizeKm = new ArrayList<>();
    private final List<Map<Integer, Double>> weights = new ArrayList<>();
    private final List<Integer> version = new ArrayList<>();

    Grouping(double leastShare, BiPredicate<List<Integer>, List<Integer>> mayJoin) {
        this.leastShare = leastShare;
        this.mayJoin = mayJoin;
    }

    private record Pair(double share, int a, int b, int versionA, int versionB) {
    }

    /** Groups of piece numbers, each in rising order, by their first piece. */
    List<List<Integer>> group(List<Piece> pieces, List<PieceLinks.Link> links) {
        for (int p = 0; p < pieces.size(); p++) {
            members.add(new ArrayList<>(List.of(p)));
            sizeKm.add(pieces.get(p).lengthKm());
            weights.add(new TreeMap<>());
            version.add(0);
        }
        PriorityQueue<Pair> queue = new PriorityQueue<>((s, t) -> {
            int byShare = Double.compare(t.share(), s.share());
            return byShare != 0 ? byShare : s.a() != t.a() ? Integer.compare(s.a(), t.a())
                    : Integer.compare(s.b(), t.b());
        });
        for (PieceLinks.Link link : links) {
            weights.get(link.p()).put(link.q(), link.km());
            weights.get(link.q()).put(link.p(), link.km());
            offer(queue, link.p(), link.q());
        }
        while (!queue.isEmpty()) {
            Pair next = queue.poll();
            if (version.get(next.a()) != next.versionA() || version.get(next.b()) != next.versionB()) {
                continue;
            }
            if (mayJoin.test(members.get(next.a()), members.get(next.b()))) {
                join(queue, next.a(), next.b());
            }
        }
        List<List<Integer>> groups = new ArrayList<>();
        for (List<Integer> group : members) {
            if (!group.isEmpty()) {
                group.sort(null);
                groups.add(group);
            }
        }
        groups.sort(java.util.Comparator.comparingInt(group -> group.get(0)));
        return groups;
    }

    private void offer(PriorityQueue<Pair> queue, int p, int q) {
        int a = Math.min(p, q);
        int b = Math.max(p, q);
        double share = weights.get(a).get(b) / Math.min(sizeKm.get(a), sizeKm.get(b));
        if (share >= leastShare) {
            queue.add(new Pair(share, a, b, version.get(a), version.get(b)));
        }
    }

    private void join(PriorityQueue<Pair> queue, int a, int b) {
        members.get(a).addAll(members.get(b));
        members.get(b).clear();
        sizeKm.set(a, sizeKm.get(a) + sizeKm.get(b));
        version.set(a, version.get(a) + 1);
        version.set(b, -1);
        weights.get(a).remove(b);
        weights.get(b).remove(a);
        weights.get(b).forEach((other, km) -> {
            weights.get(a).merge(other, km, Double::sum);
            weights.get(other).remove(b);
            weights.get(other).merge(a, km, Double::sum);
        });
        weights.get(b).clear();
        for (int other : weights.get(a).keySet()) {
            offer(queue, a, other);
        }
    }
}
