package hemline.simulation.front;

/** Bearings of many places, quickly and with the same bits on every platform. */
final class Bearing {
    /** Abramowitz and Stegun (1964), Handbook of Mathematical Functions, eq. 4.4.49: arctan x / x in x², error 2·10⁻⁸. */
    private static final double[] ARCTAN = {1, -0.3333314528, 0.1999355085, -0.1420889944, 0.1065626393, -0.0752896400,
        0.0429096138, -0.0161657367, 0.0028662257};

    private Bearing() {
    }

    /** Radians clockwise from north in [0, 2π) of a displacement east and north; 0 for none. */
    static double of(double east, double north) {
        double across = Math.abs(east);
        double along = Math.abs(north);
        if (across + along == 0) {
            return 0;
        }
        boolean steep = across > along;
        double x = steep ? along / across : across / along;
        double square = x * x;
        double series = 0;
        for (int i = ARCTAN.length - 1; i >= 0; i--) {
            series = series * square + ARCTAN[i];
        }
        double angle = steep ? Math.PI / 2 - x * series : x * series;
        if (north < 0) {
            angle = Math.PI - angle;
        }
        return east < 0 && angle > 0 ? 2 * Math.PI - angle : angle;
    }
}
