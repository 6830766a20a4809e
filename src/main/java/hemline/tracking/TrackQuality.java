package hemline.tracking;

import hemline.numerics.Robust;
import java.util.ArrayList;
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
 * @param logFalse   median over its vertices of log₁₀ of the chance lines expected in the loop
 */
record TrackQuality(int sweeps, double lengthKm, double meanKm, double movedKm, double evidence, double speedMs,
                    double logFalse) {
    /** Evidence that uneven air reaches in three sweeps. */
    private static final double CHANCE_IN_THREE = 2.3;
    /** What each further sweep adds to the evidence that uneven air reaches: it drifts, and so coheres a little. */
    private static final double CHANCE_A_SWEEP = 0.2;
    /** Evidence that uneven air does not reach however long it is watched. */
    private static final double CHANCE_AT_MOST = 3.7;

    static TrackQuality of(List<Integer> group, List<Piece> pieces, VertexCloud cloud, MotionLattice.Motion motion) {
        SortedMap<Integer, Double> bySweep = new TreeMap<>();
        double evidence = 0;
        double total = 0;
        double first = Double.POSITIVE_INFINITY;
        double last = Double.NEGATIVE_INFINITY;
        List<Double> speeds = new ArrayList<>();
        List<Double> logFalse = new ArrayList<>();
        for (int p : group) {
            Piece piece = pieces.get(p);
            bySweep.merge(piece.sweep(), piece.lengthKm(), Double::sum);
            for (int i = piece.from(); i < piece.to(); i++) {
                evidence += motion.total()[i];
                total++;
                first = Math.min(first, cloud.timeS[i]);
                last = Math.max(last, cloud.timeS[i]);
                speeds.add(Math.abs(motion.speedMs()[i]));
                logFalse.add(cloud.boundaries.get(cloud.curve[i]).evidence().logExpectedFalse());
            }
        }
        double speed = median(speeds);
        double longest = bySweep.values().stream().mapToDouble(v -> v).max().orElse(0);
        return new TrackQuality(bySweep.size(), longest, total / bySweep.size(), speed * (last - first) / 1000,
                evidence / total, speed, median(logFalse));
    }

    private static double median(List<Double> values) {
        return Robust.median(values.stream().mapToDouble(v -> v).toArray());
    }

    /**
     * Larger is surer; 0 is the default limit. What counts is by how much the evidence exceeds the most that drifting
     * unevenness of the air was seen to reach in as many sweeps; improbable single sweeps and length add to it.
     */
    double score() {
        double chance = Math.min(CHANCE_AT_MOST, CHANCE_IN_THREE + CHANCE_A_SWEEP * (sweeps - 3));
        double improbable = Math.max(-0.4, Math.min(0.6, 0.1 * (-logFalse - 6)));
        return 1.5 * (evidence - chance + improbable) + 0.3 * Math.log(Math.max(meanKm, 1) / 20);
    }

    boolean keep(TrackingSettings settings) {
        return sweeps >= settings.minSweeps() && lengthKm >= settings.minLengthKm() && movedKm >= 2.5
                && score() >= settings.minScore();
    }
}
