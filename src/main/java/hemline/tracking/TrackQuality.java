package hemline.tracking;

import hemline.numerics.Robust;
import java.util.Locale;

/**
 * What speaks for a group of pieces being a boundary that moves through the air.
 *
 * <p>The score is the logit of a logistic regression on the terms below, fitted to invented loops and parts of loops;
 * every weight has the sign that physics asks for.
 *
 * @param sweeps     sweeps in which it is seen
 * @param lengthKm   length in its longest sweep, km
 * @param meanKm     mean length in the sweeps that see it, km
 * @param strength   median evidence in one sweep and its neighbours, standard deviations of the background
 * @param chain      median evidence along the best chain through the loop
 * @param speedMs    median speed, m s⁻¹
 * @param advanceMs  median speed relative to what drifts with the air, m s⁻¹
 */
record TrackQuality(int sweeps, double lengthKm, double meanKm, double strength, double chain, double speedMs,
                    double advanceMs) {
    private static final double PER_STRENGTH = 1.45;
    private static final double PER_LOG_LENGTH = 1.45;
    private static final double PER_CHAIN = 0.55;
    private static final double MOST_CHAIN = 6;
    private static final double PER_ADVANCE = 0.55;
    private static final double LEAST_ADVANCE = -3;
    private static final double MOST_ADVANCE = 8;
    private static final double CONSTANT = -13.6;

    static TrackQuality of(int[] vertices, VertexCloud cloud, MotionLattice.Motion motion, AmbientDrift drift) {
        int n = vertices.length;
        double[] strength = new double[n];
        double[] chain = new double[n];
        double[] speed = new double[n];
        double[] advance = new double[n];
        int[] perSweep = new int[cloud.sweeps];
        for (int k = 0; k < n; k++) {
            int i = vertices[k];
            perSweep[cloud.sweep[i]]++;
            strength[k] = cloud.strength[i];
            chain[k] = motion.total()[i];
            speed[k] = Math.abs(motion.speedMs()[i]);
            advance[k] = drift.advanceMs(cloud.normalX[i], cloud.normalY[i], motion.speedMs()[i]);
        }
        int sweeps = 0;
        int longest = 0;
        for (int count : perSweep) {
            sweeps += count > 0 ? 1 : 0;
            longest = Math.max(longest, count);
        }
        return new TrackQuality(sweeps, longest, (double) n / sweeps, Robust.median(strength), Robust.median(chain),
                Robust.median(speed), Robust.median(advance));
    }

    /** What speaks for it before it is known what drifts with the air. */
    double scoreAtRest() {
        return CONSTANT + PER_STRENGTH * strength + PER_LOG_LENGTH * Math.log(Math.max(1, meanKm))
                + PER_CHAIN * Math.min(MOST_CHAIN, chain);
    }

    /** Larger is surer; 0 is the default limit. */
    double score() {
        return scoreAtRest() + PER_ADVANCE * Math.max(LEAST_ADVANCE, Math.min(MOST_ADVANCE, advanceMs));
    }

    boolean keep(TrackingSettings settings) {
        return sweeps >= settings.minSweeps() && lengthKm >= settings.minLengthKm() && score() >= settings.minScore();
    }

    /** The terms of the score, for people. */
    String inWords() {
        return String.format(Locale.ROOT,
                "score %.1f: %d sweeps, %.0f km on average, strength %.1f, chain %.1f, %.1f m/s, %.1f m/s through the air",
                score(), sweeps, meanKm, strength, chain, speedMs, advanceMs);
    }
}
