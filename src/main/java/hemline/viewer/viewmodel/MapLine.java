package hemline.viewer.viewmodel;

/** A line of a map on the radar's plane. Two lines are the same only if they are one object. */
public final class MapLine {
    private final Kind kind;
    private final double[] xKm;
    private final double[] yKm;

    /** What a line stands for; the order is that of the base-lines file, from 1. */
    public enum Kind {
        COAST, BORDER, STATE_BORDER,
        /** From a file of the user's. */
        OWN
    }

    /** Coordinates are km east and north of the radar; arrays are handed over. */
    MapLine(Kind kind, double[] xKm, double[] yKm) {
        if (xKm.length != yKm.length || xKm.length < 2) {
            throw new IllegalArgumentException("a map line needs two points, got " + xKm.length + " x and "
                    + yKm.length + " y");
        }
        this.kind = kind;
        this.xKm = xKm;
        this.yKm = yKm;
    }

    public Kind kind() {
        return kind;
    }

    public int points() {
        return xKm.length;
    }

    public double xKm(int point) {
        return xKm[point];
    }

    public double yKm(int point) {
        return yKm[point];
    }
}
