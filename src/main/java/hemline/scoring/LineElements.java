package hemline.scoring;

import java.util.Arrays;

/**
 * Lines of one sweep cut into short straight elements, so that lengths can be counted by their share that matches.
 *
 * <p>Each element knows its line's direction there, taken over 2 km so that jitter of the vertices does not turn it;
 * a line shorter than 1 km has no direction.
 */
final class LineElements {
    private static final double CHORD_REACH_KM = 1;
    private static final double LEAST_CHORD_KM = 1;

    private final double sampleKm;
    private int size;
    private int lines;
    private double[] ax = new double[64];
    private double[] ay = new double[64];
    private double[] bx = new double[64];
    private double[] by = new double[64];
    private double[] tangentX = new double[64];
    private double[] tangentY = new double[64];
    private double[] share = new double[64];
    private int[] line = new int[64];
    private int[] segment = new int[64];
    private int[] owner = new int[64];
    private boolean[] plain = new boolean[64];

    LineElements(double sampleKm) {
        this.sampleKm = sampleKm;
    }

    /**
     * Cuts one line, the next in order of line index.
     *
     * @param ofOwner       whose line it is
     * @param x             km east, one a vertex
     * @param y             km north
     * @param detectability at each vertex, 0 to 1
     * @param plainFrom     least detectability of an element that counts as plain to see
     */
    void add(int ofOwner, double[] x, double[] y, double[] detectability, double plainFrom) {
        double[] along = new double[x.length];
        for (int i = 1; i < x.length; i++) {
            along[i] = along[i - 1] + Math.hypot(x[i] - x[i - 1], y[i] - y[i - 1]);
        }
        for (int i = 0; i + 1 < x.length; i++) {
            double span = along[i + 1] - along[i];
            int cuts = (int) Math.ceil(span / sampleKm - 1e-9);
            for (int k = 0; k < cuts; k++) {
                double mid = (k + 0.5) / cuts;
                int e = grow();
                ax[e] = x[i] + (x[i + 1] - x[i]) * k / cuts;
                ay[e] = y[i] + (y[i + 1] - y[i]) * k / cuts;
                bx[e] = x[i] + (x[i + 1] - x[i]) * (k + 1) / cuts;
                by[e] = y[i] + (y[i + 1] - y[i]) * (k + 1) / cuts;
                share[e] = mid;
                segment[e] = i;
                line[e] = lines;
                owner[e] = ofOwner;
                plain[e] = detectability[i] + mid * (detectability[i + 1] - detectability[i]) >= plainFrom;
                direct(e, x, y, along, along[i] + mid * span);
            }
        }
        lines++;
    }

    private void direct(int e, double[] x, double[] y, double[] along, double at) {
        double from = Math.max(0, at - CHORD_REACH_KM);
        double to = Math.min(along[along.length - 1], at + CHORD_REACH_KM);
        double dx = interpolate(x, along, to) - interpolate(x, along, from);
        double dy = interpolate(y, along, to) - interpolate(y, along, from);
        double chord = Math.hypot(dx, dy);
        boolean directed = along[along.length - 1] >= LEAST_CHORD_KM && chord > 0;
        tangentX[e] = directed ? dx / chord : Double.NaN;
        tangentY[e] = directed ? dy / chord : Double.NaN;
    }

    private static double interpolate(double[] values, double[] along, double at) {
        int found = Arrays.binarySearch(along, at);
        if (found >= 0) {
            return values[found];
        }
        int after = Math.min(along.length - 1, -found - 1);
        double span = along[after] - along[after - 1];
        double part = span > 0 ? (at - along[after - 1]) / span : 0;
        return values[after - 1] + part * (values[after] - values[after - 1]);
    }

    private int grow() {
        if (size == ax.length) {
            int more = 2 * size;
            ax = Arrays.copyOf(ax, more);
            ay = Arrays.copyOf(ay, more);
            bx = Arrays.copyOf(bx, more);
            by = Arrays.copyOf(by, more);
            tangentX = Arrays.copyOf(tangentX, more);
            tangentY = Arrays.copyOf(tangentY, more);
            share = Arrays.copyOf(share, more);
            line = Arrays.copyOf(line, more);
            segment = Arrays.copyOf(segment, more);
            owner = Arrays.copyOf(owner, more);
            plain = Arrays.copyOf(plain, more);
        }
        return size++;
    }

    int size() {
        return size;
    }

    double midX(int e) {
        return (ax[e] + bx[e]) / 2;
    }

    double midY(int e) {
        return (ay[e] + by[e]) / 2;
    }

    double lengthKm(int e) {
        return Math.hypot(bx[e] - ax[e], by[e] - ay[e]);
    }

    /** Index of the line the element was cut from, in order of adding. */
    int line(int e) {
        return line[e];
    }

    /** Index of the vertex before the element on its line. */
    int segment(int e) {
        return segment[e];
    }

    /** Where the element's middle lies between that vertex and the next, 0 to 1. */
    double share(int e) {
        return share[e];
    }

    /** Index of the vertex nearest to the element's middle. */
    int nearestVertex(int e) {
        return share[e] < 0.5 ? segment[e] : segment[e] + 1;
    }

    int owner(int e) {
        return owner[e];
    }

    boolean plain(int e) {
        return plain[e];
    }

    double tangentX(int e) {
        return tangentX[e];
    }

    double tangentY(int e) {
        return tangentY[e];
    }

    /** Distance from a place to the element, km. */
    double distanceKm(int e, double x, double y) {
        double part = footShare(e, x, y);
        double dx = x - ax[e] - part * (bx[e] - ax[e]);
        double dy = y - ay[e] - part * (by[e] - ay[e]);
        return Math.sqrt(dx * dx + dy * dy);
    }

    /** Whether a place lies beside the element rather than past an end of its line. */
    boolean beside(int e, double x, double y) {
        double part = footShare(e, x, y);
        double dx = x - ax[e] - part * (bx[e] - ax[e]);
        double dy = y - ay[e] - part * (by[e] - ay[e]);
        double ux = bx[e] - ax[e];
        double uy = by[e] - ay[e];
        return Math.abs(dx * ux + dy * uy) <= Math.abs(dx * uy - dy * ux) + 1e-9;
    }

    private double footShare(int e, double x, double y) {
        double ux = bx[e] - ax[e];
        double uy = by[e] - ay[e];
        double part = ((x - ax[e]) * ux + (y - ay[e]) * uy) / (ux * ux + uy * uy);
        return Math.max(0, Math.min(1, part));
    }
}
