package hemline.casefile.edit;

import hemline.boundary.Meeting;
import java.util.List;
import java.util.OptionalInt;

/** Finds a meeting again after a run that may have named its tracks anew. */
public final class SameMeeting {
    /** Between two runs a first contact moves by a sweep or two at most, ms. */
    private static final double WITHIN_MS = 10 * 60_000;
    /** As far as a gust front goes in that time, km. */
    private static final double WITHIN_KM = 8;
    /** What another pair of tracks costs; the best possible rank is 0, the worst 2. */
    private static final double OTHER_PAIR = 0.5;

    private SameMeeting() {
    }

    /** Whether both are the same meeting of tracks with the same ids. */
    static boolean is(Meeting a, Meeting b) {
        return samePair(a, b) && Double.isFinite(rank(a, b));
    }

    /** The meeting of a list that another one is: by place and time first, by its tracks' ids next. */
    public static OptionalInt in(List<Meeting> list, Meeting sought) {
        int best = -1;
        double bestRank = Double.POSITIVE_INFINITY;
        for (int i = 0; i < list.size(); i++) {
            double rank = rank(list.get(i), sought) + (samePair(list.get(i), sought) ? 0 : OTHER_PAIR);
            if (rank < bestRank) {
                best = i;
                bestRank = rank;
            }
        }
        return best < 0 ? OptionalInt.empty() : OptionalInt.of(best);
    }

    private static boolean samePair(Meeting a, Meeting b) {
        return a.trackA().equals(b.trackA()) && a.trackB().equals(b.trackB());
    }

    /** 0 for the same place and time; infinite where either is too far off. */
    private static double rank(Meeting a, Meeting b) {
        double time = Math.abs(a.timeMs() - b.timeMs()) / WITHIN_MS;
        double place = a.place().distanceKm(b.place()) / WITHIN_KM;
        return time <= 1 && place <= 1 ? time + place : Double.POSITIVE_INFINITY;
    }
}
