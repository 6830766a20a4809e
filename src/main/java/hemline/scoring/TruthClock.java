package hemline.scoring;

import hemline.boundary.truth.Truth.TruthSweep;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Which sweep of the truth a found line belongs to: the one whose rays are nearest in time. */
final class TruthClock {
    private final List<TruthSweep> sweeps;
    private final Map<Integer, Integer> placeByIndex = new HashMap<>();
    private long worstGapMs;

    TruthClock(List<TruthSweep> sweeps) {
        if (sweeps.isEmpty()) {
            throw new IllegalArgumentException("a truth needs at least one sweep, got 0");
        }
        this.sweeps = sweeps;
        for (int i = 0; i < sweeps.size(); i++) {
            placeByIndex.put(sweeps.get(i).index(), i);
        }
    }

    /** Place in the list of the sweep with an index. */
    int placeOf(int index) {
        Integer place = placeByIndex.get(index);
        if (place == null) {
            throw new IllegalArgumentException("the truth has a line in sweep " + index + ", but no such sweep");
        }
        return place;
    }

    /** Place in the list of the sweep nearest to a time; of several that hold it, the one with the nearer middle. */
    int nearest(long timeMs) {
        int best = 0;
        for (int i = 1; i < sweeps.size(); i++) {
            long gap = gapMs(i, timeMs);
            long bestGap = gapMs(best, timeMs);
            if (gap < bestGap || gap == bestGap && offMiddleMs(i, timeMs) < offMiddleMs(best, timeMs)) {
                best = i;
            }
        }
        worstGapMs = Math.max(worstGapMs, gapMs(best, timeMs));
        return best;
    }

    private long gapMs(int i, long timeMs) {
        return Math.max(0, Math.max(sweeps.get(i).startMs() - timeMs, timeMs - sweeps.get(i).endMs()));
    }

    private long offMiddleMs(int i, long timeMs) {
        return Math.abs(sweeps.get(i).startMs() + sweeps.get(i).endMs() - 2 * timeMs);
    }

    /** A word where found lines lie more than a minute from any sweep of the truth: perhaps it is another loop. */
    List<String> cautions() {
        return worstGapMs <= 60_000 ? List.of() : List.of("found lines lie up to " + worstGapMs / 1000
                + " s from the nearest sweep of the truth: check that both are of the same loop");
    }
}
