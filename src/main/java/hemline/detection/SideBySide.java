package hemline.detection;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Of lines side by side that move alike, only the strongest is kept: the others are its flanks. */
final class SideBySide {
    private static final double WITHIN_KM = 6;
    private static final double ALONG_KM = 2.5;
    /** A line this near to a stronger one is its shadow whichever way it seems to move. */
    private static final double SHADOW_KM = 3.5;
    private static final double SHADOW_SHARE = 0.85;
    private static final double COSINE = Math.cos(Math.toRadians(35));

    private SideBySide() {
    }

    /** Curves cut where a stronger one runs beside them; what is left shorter than {@code fewest} vertices is dropped. */
    static List<TracedCurve> strongest(List<TracedCurve> curves, int fewest) {
        List<TracedCurve> sorted = new ArrayList<>(curves);
        sorted.sort(Comparator.comparingDouble((TracedCurve c) -> -c.meanEvidence() * Math.sqrt(c.size()))
                .thenComparingDouble(c -> c.x()[0]).thenComparingDouble(c -> c.y()[0]));
        List<TracedCurve> kept = new ArrayList<>();
        for (TracedCurve curve : sorted) {
            int from = -1;
            List<TracedCurve> parts = new ArrayList<>();
            for (int i = 0; i <= curve.size(); i++) {
                boolean free = i < curve.size() && !beside(curve, i, kept);
                if (free && from < 0) {
                    from = i;
                } else if (!free && from >= 0) {
                    if (i - from >= fewest) {
                        parts.add(curve.part(from, i));
                    }
                    from = -1;
                }
            }
            kept.addAll(parts);
        }
        return kept;
    }

    private static boolean beside(TracedCurve curve, int i, List<TracedCurve> kept) {
        for (TracedCurve other : kept) {
            for (int j = 0; j < other.size(); j++) {
                double dx = curve.x()[i] - other.x()[j];
                double dy = curve.y()[i] - other.y()[j];
                if (Math.abs(dx) > WITHIN_KM || Math.abs(dy) > WITHIN_KM) {
                    continue;
                }
                double across = dx * other.normalX()[j] + dy * other.normalY()[j];
                double along = Math.abs(dx * other.normalY()[j] - dy * other.normalX()[j]);
                double cosine = curve.normalX()[i] * other.normalX()[j] + curve.normalY()[i] * other.normalY()[j];
                boolean alike = Math.abs(across) <= WITHIN_KM && cosine > COSINE;
                boolean shadow = Math.abs(across) <= SHADOW_KM && Math.abs(cosine) > COSINE
                        && curve.evidence()[i] < SHADOW_SHARE * other.evidence()[j];
                if (along <= ALONG_KM && (alike || shadow)) {
                    return true;
                }
            }
        }
        return false;
    }
}
