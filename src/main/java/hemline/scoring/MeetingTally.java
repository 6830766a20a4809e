package hemline.scoring;

import hemline.boundary.Meeting;
import hemline.boundary.truth.Truth.TruthMeeting;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * What became of the meetings of one scene.
 *
 * <p>Found and true meetings are paired one to one, nearest first, where both distance and time are within bounds;
 * nearness is the sum of the squared distance and time, each as a share of its bound. A found meeting paired with one
 * that could not be seen is neither a hit nor a false alarm; one that could not be seen and was not found is no miss.
 * Only observed meetings are scored: an expected one lies after the end of the loop.
 *
 * @param hits        seen meetings found
 * @param misses      seen meetings not found
 * @param falseAlarms found meetings near no true one
 * @param neither     found meetings paired with one that could not be seen
 * @param placeKm     distance of each hit, km
 * @param timeMin     found less true time of each hit, minutes
 */
record MeetingTally(int hits, int misses, int falseAlarms, int neither, ErrorSamples placeKm, ErrorSamples timeMin) {

    static MeetingTally of(List<Meeting> found, List<TruthMeeting> truth, ScoreSettings settings) {
        List<Meeting> observed = found.stream().filter(m -> m.status() == Meeting.Status.OBSERVED).toList();
        List<Pair> pairs = new ArrayList<>();
        for (int f = 0; f < observed.size(); f++) {
            for (int t = 0; t < truth.size(); t++) {
                double km = kmBetween(observed.get(f), truth.get(t));
                double minutes = (observed.get(f).timeMs() - truth.get(t).timeMs()) / 60000.0;
                if (km <= settings.meetingKm() && Math.abs(minutes) <= settings.meetingMinutes()) {
                    pairs.add(new Pair(f, t, km, minutes, Math.pow(km / settings.meetingKm(), 2)
                            + Math.pow(minutes / settings.meetingMinutes(), 2)));
                }
            }
        }
        pairs.sort(Comparator.comparingDouble(Pair::cost).thenComparing(Pair::truth).thenComparing(Pair::found));
        boolean[] usedFound = new boolean[observed.size()];
        boolean[] usedTruth = new boolean[truth.size()];
        ErrorSamples.Collector place = new ErrorSamples.Collector();
        ErrorSamples.Collector time = new ErrorSamples.Collector();
        int hits = 0;
        int neither = 0;
        for (Pair pair : pairs) {
            if (usedFound[pair.found] || usedTruth[pair.truth]) {
                continue;
            }
            usedFound[pair.found] = true;
            usedTruth[pair.truth] = true;
            if (truth.get(pair.truth).detectable()) {
                hits++;
                Meeting meeting = observed.get(pair.found);
                place.add(pair.km, Double.NaN, 1);
                time.add(pair.minutes, meeting.timeSdS() / 60, 1);
            } else {
                neither++;
            }
        }
        int seen = (int) truth.stream().filter(TruthMeeting::detectable).count();
        return new MeetingTally(hits, seen - hits, observed.size() - hits - neither, neither, place.collected(),
                time.collected());
    }

    private static double kmBetween(Meeting found, TruthMeeting truth) {
        return Math.hypot(found.place().xKm() - truth.xKm(), found.place().yKm() - truth.yKm());
    }

    private record Pair(int found, int truth, double km, double minutes, double cost) {
    }
}
