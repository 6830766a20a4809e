package hemline.viewer.render;

/**
 * Radial velocity to colour: dark at rest, blue toward the radar, amber away from it, lighter with speed. Blue and
 * amber stay apart for every common kind of colour vision.
 */
public final class VelocityScale {
    /** Speed at and beyond which the end colours are used, m s⁻¹. */
    public static final double LARGEST_MS = 32;
    private static final int[][] TOWARD = {{0x26, 0x28, 0x2c}, {0x1f, 0x4e, 0x8c}, {0x3f, 0x8f, 0xd8},
        {0xb9, 0xe0, 0xff}};
    private static final int[][] AWAY = {{0x26, 0x28, 0x2c}, {0x7d, 0x4a, 0x12}, {0xd6, 0x88, 0x1e},
        {0xff, 0xe2, 0xa8}};

    private VelocityScale() {
    }

    /** Colour as {@code 0xAARRGGBB}; positive is away from the radar; NaN is transparent. */
    public static int argb(double velocityMs) {
        if (Double.isNaN(velocityMs)) {
            return 0;
        }
        int[][] arm = velocityMs < 0 ? TOWARD : AWAY;
        double place = Math.min(1, Math.abs(velocityMs) / LARGEST_MS) * (arm.length - 1);
        int corner = Math.min((int) place, arm.length - 2);
        int colour = 0xff;
        for (int band = 0; band < 3; band++) {
            double mixed = arm[corner][band] + (place - corner) * (arm[corner + 1][band] - arm[corner][band]);
            colour = colour << 8 | (int) Math.round(mixed);
        }
        return colour;
    }
}
