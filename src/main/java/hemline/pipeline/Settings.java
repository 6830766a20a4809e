package hemline.pipeline;

/**
 * Everything that decides what a run finds, apart from its input.
 *
 * @param heightCeilingM height of the beam centre above the radar beyond which nothing is claimed, m
 */
public record Settings(double heightCeilingM) {
    /** Outflow heads are about 1.3 km deep (Mahoney 1988, Mon. Wea. Rev. 116:1474); above this little is seen. */
    private static final double DEFAULT_CEILING_M = 1500;

    public Settings {
        if (!(heightCeilingM > 0 && heightCeilingM <= 10_000)) {
            throw new IllegalArgumentException("the height ceiling must lie within 0..10000 m, got " + heightCeilingM);
        }
    }

    public static Settings defaults() {
        return new Settings(DEFAULT_CEILING_M);
    }

    public Settings withHeightCeilingM(double newCeilingM) {
        return new Settings(newCeilingM);
    }
}
