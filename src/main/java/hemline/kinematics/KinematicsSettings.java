package hemline.kinematics;

/**
 * How motion is measured.
 *
 * @param halfLengthKm    half length along the line over which one speed is fitted, km
 * @param halfSpanS       half span of time over which one speed is fitted, s; less for a fast line, more for rare sweeps
 * @param opposedKm       distance from another track's opposed line within which no speed is given, km
 * @param maxRelativeRadiusSd largest standard deviation of a radius, as a share of it, at which an arc is reported
 */
public record KinematicsSettings(double halfLengthKm, double halfSpanS, double opposedKm,
                                 double maxRelativeRadiusSd) {
    public KinematicsSettings {
        if (!(halfLengthKm >= 1 && halfLengthKm <= 50)) {
            throw new IllegalArgumentException("the half length must be within 1..50 km, got " + halfLengthKm);
        }
        if (!(halfSpanS >= 60 && halfSpanS <= 7200)) {
            throw new IllegalArgumentException("the half span must be within 60..7200 s, got " + halfSpanS);
        }
        if (!(opposedKm >= 0)) {
            throw new IllegalArgumentException("the distance from opposed lines must be at least 0 km, got " + opposedKm);
        }
        if (!(maxRelativeRadiusSd > 0 && maxRelativeRadiusSd <= 1)) {
            throw new IllegalArgumentException("the share must be within 0..1, got " + maxRelativeRadiusSd);
        }
    }

    public static KinematicsSettings defaults() {
        return new KinematicsSettings(6, 900, 5, 0.3);
    }

    public KinematicsSettings withHalfLengthKm(double km) {
        return new KinematicsSettings(km, halfSpanS, opposedKm, maxRelativeRadiusSd);
    }

    public KinematicsSettings withHalfSpanS(double seconds) {
        return new KinematicsSettings(halfLengthKm, seconds, opposedKm, maxRelativeRadiusSd);
    }
}
