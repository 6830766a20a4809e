package hemline.detection;

/**
 * A crest of evidence, vertex by vertex, about 1 km apart. The signed normal lies on the same side all along.
 *
 * @param x        km east of the radar
 * @param y        km north of the radar
 * @param normalX  east component of the unit normal toward which it moves
 * @param normalY  north component
 * @param speedMs  along the normal, m s⁻¹
 * @param evidence stacked, standard deviations
 */
record TracedCurve(double[] x, double[] y, double[] normalX, double[] normalY, double[] speedMs, double[] evidence) {

    /** Vertices on either side that a vertex is smoothed with. */
    private static final int SMOOTHED_OVER = 4;

    int size() {
        return x.length;
    }

    double meanEvidence() {
        double sum = 0;
        for (double one : evidence) {
            sum += one;
        }
        return sum / evidence.length;
    }

    /** Vertices {@code from} to {@code to} (excluded). */
    TracedCurve part(int from, int to) {
        return new TracedCurve(java.util.Arrays.copyOfRange(x, from, to), java.util.Arrays.copyOfRange(y, from, to),
                java.util.Arrays.copyOfRange(normalX, from, to), java.util.Arrays.copyOfRange(normalY, from, to),
                java.util.Arrays.copyOfRange(speedMs, from, to), java.util.Arrays.copyOfRange(evidence, from, to));
    }

    /**
     * Vertices moved onto parabolas fitted to those within {@link #SMOOTHED_OVER} on either side, and normals across
     * them, signed as before.
     */
    TracedCurve smoothed() {
        int n = size();
        double[][] fitted = new double[4][n];
        for (int i = 0; i < n; i++) {
            int from = Math.max(0, Math.min(i - SMOOTHED_OVER, n - 1 - 2 * SMOOTHED_OVER));
            int to = Math.min(n - 1, Math.max(i + SMOOTHED_OVER, 2 * SMOOTHED_OVER));
            double[] px = parabola(x, from, to, i);
            double[] py = parabola(y, from, to, i);
            fitted[0][i] = px[0];
            fitted[1][i] = py[0];
            double length = Math.hypot(px[1], py[1]);
            double sign = -py[1] * normalX[i] + px[1] * normalY[i] < 0 ? -1 : 1;
            fitted[2][i] = length > 1e-9 ? -py[1] / length * sign : normalX[i];
            fitted[3][i] = length > 1e-9 ? px[1] / length * sign : normalY[i];
        }
        return new TracedCurve(fitted[0], fitted[1], fitted[2], fitted[3], speedMs, evidence);
    }

    /**
     * Value at {@code at} of the least-squares parabola through {@code values[from…to]} (a line below four), and its
     * slope half way from the middle to there: the slope at an end is too wild.
     */
    private static double[] parabola(double[] values, int from, int to, int at) {
        int n = to - from + 1;
        double centre = (from + to) / 2.0;
        double s2 = 0;
        double s4 = 0;
        double y0 = 0;
        double y1 = 0;
        double y2 = 0;
        for (int i = from; i <= to; i++) {
            double t = i - centre;
            s2 += t * t;
            s4 += t * t * t * t;
            y0 += values[i];
            y1 += t * values[i];
            y2 += t * t * values[i];
        }
        double slope = s2 > 0 ? y1 / s2 : 0;
        double determinant = n * s4 - s2 * s2;
        double bend = n >= 4 ? (n * y2 - s2 * y0) / determinant : 0;
        double level = (y0 - bend * s2) / n;
        double t = at - centre;
        return new double[] {level + slope * t + bend * t * t, slope + bend * t};
    }
}
