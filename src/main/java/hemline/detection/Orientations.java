package hemline.detection;

/**
 * The directions in which lines are looked for. Orientation {@code o} of {@link #COUNT} has its normal {@code o·180°/COUNT}
 * counter-clockwise from east; signed normal {@code d} of {@link #SIGNED} is orientation {@code d mod COUNT}, turned about for
 * {@code d ≥ COUNT}.
 */
final class Orientations {
    static final int COUNT = 16;
    static final int SIGNED = 2 * COUNT;

    private static final double[] EAST = new double[SIGNED];
    private static final double[] NORTH = new double[SIGNED];

    static {
        for (int d = 0; d < SIGNED; d++) {
            EAST[d] = exact(Math.cos(2 * Math.PI * d / SIGNED));
            NORTH[d] = exact(Math.sin(2 * Math.PI * d / SIGNED));
        }
    }

    private Orientations() {
    }

    /** Rounds away the last bits, so that directions turned by 90° are each other's mirror images exactly. */
    private static double exact(double value) {
        return Math.rint(value * 1e12) / 1e12;
    }

    static double normalEast(int signed) {
        return EAST[signed];
    }

    static double normalNorth(int signed) {
        return NORTH[signed];
    }
}
