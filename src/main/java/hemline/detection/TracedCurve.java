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

    /** Normals of the line through the vertices, three on either side, signed as before. */
    TracedCurve withOwnNormals() {
        int n = size();
        double[] nx = new double[n];
        double[] ny = new double[n];
        for (int i = 0; i < n; i++) {
            int a = Math.max(0, i - 3);
            int b = Math.min(n - 1, i + 3);
            double tx = x[b] - x[a];
            double ty = y[b] - y[a];
            double length = Math.hypot(tx, ty);
            double sign = -ty * normalX[i] + tx * normalY[i] < 0 ? -1 : 1;
            nx[i] = length > 0 ? -ty / length * sign : normalX[i];
            ny[i] = length > 0 ? tx / length * sign : normalY[i];
        }
        return new TracedCurve(x, y, nx, ny, speedMs, evidence);
    }
}
