package hemline.scoring;

import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthArc;

/** The true mean rate of growth of a boundary's radius over the sweeps in which a track follows it. */
final class ExpansionCheck {
    private final Truth truth;
    private final TruthClock clock;

    ExpansionCheck(Truth truth, TruthClock clock) {
        this.truth = truth;
        this.clock = clock;
    }

    /**
     * @param followed which sweeps to take, by place in the truth
     * @return m s⁻¹; NaN when the boundary has no arc in fewer than two of those sweeps
     */
    double meanExpansionMs(int boundary, boolean[] followed) {
        double sum = 0;
        int n = 0;
        for (TruthArc arc : truth.boundaries().get(boundary).arcs()) {
            if (followed[clock.placeOf(arc.sweep())] && Double.isFinite(arc.expansionMs())) {
                sum += arc.expansionMs();
                n++;
            }
        }
        return n < 2 ? Double.NaN : sum / n;
    }
}
