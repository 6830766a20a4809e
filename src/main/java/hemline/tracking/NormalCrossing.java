package hemline.tracking;

import java.util.List;

/** Where a vertex's normal meets a track's lines in another sweep. */
final class NormalCrossing {
    /** Cosine of the largest angle between the normal and that of the line it meets. */
    private static final double LEAST_COS = Math.cos(Math.toRadians(45));

    double offsetKm;
    double timeS;
    boolean seen;

    /**
     * Looks for the crossing nearest to where it is expected.
     *
     * @param expectedKm signed distance along the normal at which the line is expected
     * @param withinKm   largest departure from it
     * @return whether there is one; then the fields hold its signed distance, time and whether it was seen
     */
    boolean find(double x, double y, double nx, double ny, List<Strand> lines, double expectedKm, double withinKm) {
        double best = withinKm;
        boolean found = false;
        for (Strand line : lines) {
            double before = across(line, 0, x, y, nx, ny);
            for (int i = 1; i < line.size(); i++) {
                double after = across(line, i, x, y, nx, ny);
                if (before * after <= 0 && before != after) {
                    double share = before / (before - after);
                    double along = (1 - share) * ahead(line, i - 1, x, y, nx, ny) + share * ahead(line, i, x, y, nx, ny);
                    double cos = line.normalX[i] * nx + line.normalY[i] * ny;
                    if (Math.abs(along - expectedKm) <= best && cos > LEAST_COS) {
                        best = Math.abs(along - expectedKm);
                        found = true;
                        offsetKm = along;
                        timeS = (1 - share) * line.timeS[i - 1] + share * line.timeS[i];
                        seen = line.seen[i - 1] && line.seen[i];
                    }
                }
                before = after;
            }
        }
        return found;
    }

    private static double across(Strand line, int i, double x, double y, double nx, double ny) {
        return -(line.x[i] - x) * ny + (line.y[i] - y) * nx;
    }

    private static double ahead(Strand line, int i, double x, double y, double nx, double ny) {
        return (line.x[i] - x) * nx + (line.y[i] - y) * ny;
    }
}
