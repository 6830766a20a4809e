package hemline.simulation.scene;

/**
 * Air behind a front that holds fewer insects than the air ahead.
 *
 * @param depthDb      loss behind the front, dB; 0 for none
 * @param transitionKm width of the step, km
 * @param recoveryKm   distance behind over which the loss falls to 1/e; infinite when the whole pool is clear
 */
public record Clearing(double depthDb, double transitionKm, double recoveryKm) {
    public static final Clearing NONE = new Clearing(0, 1, Double.POSITIVE_INFINITY);

    public Clearing {
        if (!(depthDb >= 0) || !(transitionKm > 0) || !(recoveryKm > 0)) {
            throw new IllegalArgumentException("a clearing has no negative depth and widths above 0 km, got "
                    + depthDb + " dB, " + transitionKm + " km, " + recoveryKm + " km");
        }
    }
}
