package hemline.tracking;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * One line per place: of lines side by side that move the same way, the surer track's stays; and a track is not twice
 * along one normal.
 */
final class OnePlace {
    private static final double OTHERS_KM = 2;
    private static final double OWN_KM = 20;
    private static final double ACROSS_KM = 1.5;
    private static final double PARALLEL_COS = Math.cos(Math.toRadians(35));

    private OnePlace() {
    }

    /** Drafts by falling score; vertices of lower ones that double a higher one are cut away. */
    static void enforce(List<Draft> drafts) {
        for (int d = 0; d < drafts.size(); d++) {
            for (int k = 0; k < drafts.get(d).sweeps(); k++) {
                List<Strand> own = drafts.get(d).at(k);
                own.sort(java.util.Comparator.comparingDouble((Strand s) -> -weight(s)).thenComparingDouble(s -> s.x[0]));
                List<Strand> kept = new ArrayList<>();
                for (Strand strand : own) {
                    boolean[] drop = new boolean[strand.size()];
                    for (int i = 0; i < drop.length; i++) {
                        drop[i] = doubled(strand, i, kept, OWN_KM);
                        for (int higher = 0; higher < d && !drop[i]; higher++) {
                            drop[i] = doubled(strand, i, drafts.get(higher).at(k), OTHERS_KM);
                        }
                    }
                    kept.addAll(remaining(strand, drop));
                }
                own.clear();
                own.addAll(kept);
            }
        }
    }

    private static double weight(Strand strand) {
        return Arrays.stream(strand.evidence).sum();
    }

    private static boolean doubled(Strand strand, int i, List<Strand> others, double alongNormalKm) {
        for (Strand other : others) {
            for (int j = 0; j < other.size(); j++) {
                double dx = other.x[j] - strand.x[i];
                double dy = other.y[j] - strand.y[i];
                double ahead = dx * strand.normalX[i] + dy * strand.normalY[i];
                double across = -dx * strand.normalY[i] + dy * strand.normalX[i];
                double cos = strand.normalX[i] * other.normalX[j] + strand.normalY[i] * other.normalY[j];
                if (Math.abs(ahead) <= alongNormalKm && Math.abs(across) <= ACROSS_KM && cos > PARALLEL_COS) {
                    return true;
                }
            }
        }
        return false;
    }

    private static List<Strand> remaining(Strand strand, boolean[] drop) {
        List<Strand> parts = new ArrayList<>();
        int start = 0;
        for (int i = 0; i <= drop.length; i++) {
            if (i == drop.length || drop[i]) {
                if (i - start >= 3) {
                    parts.add(strand.part(start, i));
                }
                start = i + 1;
            }
        }
        return parts;
    }
}
