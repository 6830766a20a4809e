package hemline.scoring;

import hemline.boundary.Meeting;
import hemline.boundary.truth.Truth.TruthMeeting;
import java.util.List;

/**
 * What became of the meetings of one scene.
 *
 * <p>A found meeting paired with one that could not be seen is neither a hit nor a false alarm; one that could not be
 * seen and was not found is no miss.
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
        ErrorSamples.Collector place = new ErrorSamples.Collector();
        ErrorSamples.Collector time = new ErrorSamples.Collector();
        int hits = 0;
        int neither = 0;
        for (MeetingPairs.Pair pair : MeetingPairs.of(observed, truth, settings)) {
            if (truth.get(pair.truth()).detectable()) {
                hits++;
                Meeting meeting = observed.get(pair.found());
                place.add(pair.km(), Double.NaN, 1);
                time.add(pair.minutes(), meeting.timeSdS() / 60, 1);
            } else {
                neither++;
            }
        }
        int seen = (int) truth.stream().filter(TruthMeeting::detectable).count();
        return new MeetingTally(hits, seen - hits, observed.size() - hits - neither, neither, place.collected(),
                time.collected());
    }
}
