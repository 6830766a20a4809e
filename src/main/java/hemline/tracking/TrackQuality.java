package hemline.tracking;

import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What speaks for a group of pieces being a moving boundary.
 *
 * @param sweeps     sweeps in which it is seen
 * @param lengthKm   length in its longest sweep, km
 * @param meanKm     mean length in the sweeps that see it, km
 * @param movedKm    median path along the normals over its life, km
 * @param evidence   mean over its vertices of the evidence along the best chain
 * @param speedMs    median speed, m s⁻¹
 */
record TrackQuality(int sweeps, double lengthKm, double meanKm, double movedKm, double evidence, double speedMs) {

    static TrackQuality of(List<Integer> group, List<Piece> pieces, VertexCloud cloud, MotionLattice.Motion motion) {
        SortedMap<Integer, Double> bySweep = new TreeMap<>();
        double evidence = 0;
        double total = 0;
        double first = Double.POSITIVE_INFINITY;
        double last = Double.NEGATIVE_INFINITY;
        java.util.List<Double> speeds = new java.util.ArrayList<>();
        for (int p : group) {
            Piece piece = pieces.get(p);
            bySweep.merge(piece.sweep(), piece.lengthKm(), Double::sum);
            for (int i = piece.from(); i < piece.to(); i++) {
                evidence += motion.total()[i];
                total++;
                first = Math.min(first, cloud.timeS[i]);
                last = Math.max(last, cloud.timeS[i]);
                speeds.add(Math.abs(motion.speedMs()[i]));
            }
        }
        double speed = hemline.numerics.Robust.median(speeds.stream().mapToDouble(v -> v).toArray());
        double longest = bySweep.values().stream().mapToDouble(v -> v).max().orElse(0);
        return new TrackQuality(bySweep.size(), longest, total / bySweep.size(), speed * (last - first) / 1000,
                evidence / total, speed);
    }

    /** Larger is surer; 0 is the default limit. */
    double score() {
        return Math.log(Math.max(meanKm, 1) / 12) + 0.5 * Math.log(sweeps / 4.0) + 0.5 * (evidence - 2);
    }

    boolean keep(TrackingSettings settings) {
        return sweeps >= settings.minSweeps() && lengthKm >= settings.minLengthKm() && movedKm >= 2.5
                && score() >= settings.minScore();
    }
}
