package hemline.simulation.scene;

/**
 * Coming and going of a thing, as a share from 0 to 1.
 *
 * @param fromS start of its coming, s after the scene's start
 * @param riseS time to full strength, s
 * @param toS   start of its going, s after the scene's start
 * @param fallS time to nothing, s
 */
public record Life(double fromS, double riseS, double toS, double fallS) {
    /** There at all times. */
    public static final Life ALWAYS = new Life(-1e9, 1, 1e9, 1);

    public Life {
        if (!(riseS > 0) || !(fallS > 0) || !(toS >= fromS + riseS)) {
            throw new IllegalArgumentException("a life rises and falls in more than 0 s and falls after it has risen, got "
                    + fromS + " + " + riseS + " s, " + toS + " + " + fallS + " s");
        }
    }

    public double share(double timeS) {
        return Steps.smooth((timeS - fromS) / riseS) * (1 - Steps.smooth((timeS - toS) / fallS));
    }
}
