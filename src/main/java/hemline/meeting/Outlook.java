package hemline.meeting;

/** How the uncertainty of a line grows once it is no longer seen. */
final class Outlook {
    /** Standard deviation of an unforeseen steady change of speed, m s⁻¹ per 1000 s. */
    static final double CHANGE = 0.8;
    /** Length beyond the seen end over which the chance that the line goes on falls to 1/e, km. */
    private static final double FADE_KM = 10;

    private Outlook() {
    }

    /** Standard deviation of the path after a time, km. */
    static double pathSdKm(double positionSdKm, double speedSdMs, double afterS) {
        double tau = afterS / 1000;
        return Math.sqrt(positionSdKm * positionSdKm + square(speedSdMs * tau) + square(0.5 * CHANGE * tau * tau));
    }

    /** Standard deviation of the speed after a time, m s⁻¹. */
    static double speedSdMs(double speedSdMs, double afterS) {
        return Math.hypot(speedSdMs, CHANGE * afterS / 1000);
    }

    /** Chance that a line goes on so far beyond its seen end. */
    static double presence(double carriedKm) {
        return Math.exp(-carriedKm / FADE_KM);
    }

    private static double square(double value) {
        return value * value;
    }
}
