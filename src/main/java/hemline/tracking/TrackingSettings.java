package hemline.tracking;

/**
 * How boundaries are linked.
 *
 * @param maxSpeedMs      fastest normal speed looked for, m s⁻¹
 * @param maxTurnDeg      largest turn of a line's normal between sweeps, degrees
 * @param minSweeps       sweeps in which a track must be seen
 * @param minLengthKm     length that a track must reach in some sweep, km
 * @param minScore        score from which a track is kept
 * @param maxBridgeKm     longest gap along a line that is bridged, km
 */
public record TrackingSettings(double maxSpeedMs, double maxTurnDeg, int minSweeps, double minLengthKm,
                               double minScore, double maxBridgeKm) {
    public TrackingSettings {
        if (!(maxSpeedMs > 0 && maxSpeedMs <= 60)) {
            throw new IllegalArgumentException("the fastest speed must be within 0..60 m/s, got " + maxSpeedMs);
        }
        if (!(maxTurnDeg > 0 && maxTurnDeg <= 60)) {
            throw new IllegalArgumentException("the largest turn must be within 0..60 degrees, got " + maxTurnDeg);
        }
        if (minSweeps < 2) {
            throw new IllegalArgumentException("a track needs at least 2 sweeps, got " + minSweeps);
        }
        if (!(minLengthKm >= 2)) {
            throw new IllegalArgumentException("the least length must be at least 2 km, got " + minLengthKm);
        }
        if (!(maxBridgeKm >= 0)) {
            throw new IllegalArgumentException("the longest bridge must be at least 0 km, got " + maxBridgeKm);
        }
    }

    public static TrackingSettings defaults() {
        return new TrackingSettings(30, 32, 3, 10, 0, 12);
    }

    public TrackingSettings withMinSweeps(int sweeps) {
        return new TrackingSettings(maxSpeedMs, maxTurnDeg, sweeps, minLengthKm, minScore, maxBridgeKm);
    }

    public TrackingSettings withMinLengthKm(double lengthKm) {
        return new TrackingSettings(maxSpeedMs, maxTurnDeg, minSweeps, lengthKm, minScore, maxBridgeKm);
    }

    public TrackingSettings withMinScore(double score) {
        return new TrackingSettings(maxSpeedMs, maxTurnDeg, minSweeps, minLengthKm, score, maxBridgeKm);
    }
}
