package hemline.detection;

/**
 * How boundaries are looked for.
 *
 * @param maxRangeKm     farthest range looked at, km
 * @param pixelKm        side of a raster pixel, km
 * @param maxSpeedMs     fastest normal speed looked for, m s⁻¹
 * @param sweepsEachSide sweeps before and after that lend evidence; 0 for each sweep on its own
 * @param onlyPast       whether only earlier sweeps lend evidence, as in live use
 * @param expectedFalse  curves expected by chance in one sweep above which a curve is not reported
 * @param minLengthKm    shortest curve reported, km
 */
public record DetectionSettings(double maxRangeKm, double pixelKm, double maxSpeedMs, int sweepsEachSide,
                                boolean onlyPast, double expectedFalse, double minLengthKm) {
    public DetectionSettings {
        if (!(maxRangeKm >= 10 && maxRangeKm <= 300)) {
            throw new IllegalArgumentException("the farthest range must be within 10..300 km, got " + maxRangeKm);
        }
        if (!(pixelKm >= 0.2 && pixelKm <= 1)) {
            throw new IllegalArgumentException("pixels must be within 0.2..1 km, got " + pixelKm);
        }
        if (!(maxSpeedMs > 0 && maxSpeedMs <= 60)) {
            throw new IllegalArgumentException("the fastest speed must be within 0..60 m/s, got " + maxSpeedMs);
        }
        if (sweepsEachSide < 0 || sweepsEachSide > 6) {
            throw new IllegalArgumentException("sweeps on each side must be within 0..6, got " + sweepsEachSide);
        }
        if (!(expectedFalse > 0)) {
            throw new IllegalArgumentException("expected false curves must be above 0, got " + expectedFalse);
        }
        if (!(minLengthKm >= 2)) {
            throw new IllegalArgumentException("the least length must be at least 2 km, got " + minLengthKm);
        }
    }

    public static DetectionSettings defaults() {
        return new DetectionSettings(150, 0.5, 30, 2, false, 0.1, 6);
    }

    public DetectionSettings withMaxRangeKm(double rangeKm) {
        return new DetectionSettings(rangeKm, pixelKm, maxSpeedMs, sweepsEachSide, onlyPast, expectedFalse, minLengthKm);
    }

    public DetectionSettings withMaxSpeedMs(double speedMs) {
        return new DetectionSettings(maxRangeKm, pixelKm, speedMs, sweepsEachSide, onlyPast, expectedFalse, minLengthKm);
    }

    public DetectionSettings withSweepsEachSide(int sweeps) {
        return new DetectionSettings(maxRangeKm, pixelKm, maxSpeedMs, sweeps, onlyPast, expectedFalse, minLengthKm);
    }

    public DetectionSettings withOnlyPast(boolean only) {
        return new DetectionSettings(maxRangeKm, pixelKm, maxSpeedMs, sweepsEachSide, only, expectedFalse, minLengthKm);
    }

    public DetectionSettings withExpectedFalse(double curves) {
        return new DetectionSettings(maxRangeKm, pixelKm, maxSpeedMs, sweepsEachSide, onlyPast, curves, minLengthKm);
    }

    public DetectionSettings withMinLengthKm(double lengthKm) {
        return new DetectionSettings(maxRangeKm, pixelKm, maxSpeedMs, sweepsEachSide, onlyPast, expectedFalse, lengthKm);
    }
}
