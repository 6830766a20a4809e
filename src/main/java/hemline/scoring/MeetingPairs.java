package hemline.scoring;

import hemline.boundary.Meeting;
import hemline.boundary.truth.Truth.TruthMeeting;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Found and true meetings paired one to one, nearest first, where both distance and time are within bounds; nearness is
 * the sum of the squared distance and time, each as a share of its bound.
 */
final class MeetingPairs {

    private MeetingPairs() {
    }

    static List<Pair> of(List<Meeting> found, List<TruthMeeting> truth, ScoreSettings settings) {
        List<Pair> near = new ArrayList<>();
        for (int f = 0; f < found.size(); f++) {
            for (int t = 0; t < truth.size(); t++) {
                double km = Math.hypot(found.get(f).place().xKm() - truth.get(t).xKm(),
                        found.get(f).place().yKm() - truth.get(t).yKm());
                double minutes = (found.get(f).timeMs() - truth.get(t).timeMs()) / 60000.0;
                if (km <= settings.meetingKm() && Math.abs(minutes) <= settings.meetingMinutes()) {
                    near.add(new Pair(f, t, km, minutes, Math.pow(km / settings.meetingKm(), 2)
                            + Math.pow(minutes / settings.meetingMinutes(), 2)));
                }
            }
        }
        near.sort(Comparator.comparingDouble(Pair::cost).thenComparing(Pair::truth).thenComparing(Pair::found));
        boolean[] usedFound = new boolean[found.size()];
        boolean[] usedTruth = new boolean[truth.size()];
        List<Pair> pairs = new ArrayList<>();
        for (Pair pair : near) {
            if (!usedFound[pair.found] && !usedTruth[pair.truth]) {
                usedFound[pair.found] = true;
                usedTruth[pair.truth] = true;
                pairs.add(pair);
            }
        }
        return pairs;
    }

    /**
     * @param found   index of the found meeting
     * @param truth   index of the true one
     * @param km      distance, km
     * @param minutes found less true time, minutes
     */
    record Pair(int found, int truth, double km, double minutes, double cost) {
    }
}
