package hemline.scoring;

import hemline.boundary.Meeting;
import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthMeeting;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Scores meetings foreseen at several times of a loop, each from what was known then, against those that came.
 *
 * <p>At each time of issue the foreseen and the later true meetings are paired as observed ones are. A foreseen meeting
 * is a hit or a false alarm only when its probability is at least a half; all count for reliability. One paired with a
 * meeting that could not be seen is neither, but did come. One foreseen for after the end of the truth is left out.
 */
public final class ForecastScoring {
    private static final double[] LEADS_MIN = {10, 20, 30, 45, 60};
    private static final int PROBABILITY_CLASSES = 5;
    private static final double SAID = 0.5;

    private final long endMs;
    private final int[] opportunities = new int[LEADS_MIN.length];
    private final int[] hits = new int[LEADS_MIN.length];
    private final int[] falseAlarms = new int[LEADS_MIN.length];
    private final ErrorSamples.Collector[] place = new ErrorSamples.Collector[LEADS_MIN.length];
    private final ErrorSamples.Collector[] time = new ErrorSamples.Collector[LEADS_MIN.length];
    private final int[] forecasts = new int[PROBABILITY_CLASSES];
    private final double[] stated = new double[PROBABILITY_CLASSES];
    private final int[] came = new int[PROBABILITY_CLASSES];
    private double squares;

    private ForecastScoring(Truth truth) {
        endMs = truth.sweeps().stream().mapToLong(Truth.TruthSweep::endMs).max().orElseThrow(
                () -> new IllegalArgumentException("a truth needs at least one sweep, got 0"));
        for (int i = 0; i < LEADS_MIN.length; i++) {
            place[i] = new ErrorSamples.Collector();
            time[i] = new ErrorSamples.Collector();
        }
    }

    /**
     * Meetings foreseen at one time.
     *
     * @param issuedMs when the last sweep used was seen, ms since 1970-01-01T00:00Z
     * @param meetings foreseen then; those of the past are ignored
     */
    public record Issued(long issuedMs, List<Meeting> meetings) {
        public Issued {
            meetings = List.copyOf(meetings);
        }
    }

    /** @throws IllegalArgumentException when the truth has no sweep */
    public static ForecastScore score(Truth truth, List<Issued> issued, ScoreSettings settings) {
        ForecastScoring scoring = new ForecastScoring(truth);
        for (Issued one : issued) {
            scoring.count(truth, one, settings);
        }
        return scoring.told();
    }

    private void count(Truth truth, Issued issued, ScoreSettings settings) {
        List<Meeting> foreseen = issued.meetings().stream()
                .filter(m -> m.timeMs() > issued.issuedMs() && m.timeMs() <= endMs).toList();
        List<TruthMeeting> later = truth.meetings().stream().filter(m -> m.timeMs() > issued.issuedMs()).toList();
        Map<Integer, MeetingPairs.Pair> byFound = new HashMap<>();
        Map<Integer, MeetingPairs.Pair> byTruth = new HashMap<>();
        for (MeetingPairs.Pair pair : MeetingPairs.of(foreseen, later, settings)) {
            byFound.put(pair.found(), pair);
            byTruth.put(pair.truth(), pair);
        }
        for (int t = 0; t < later.size(); t++) {
            int lead = lead(later.get(t).timeMs() - issued.issuedMs());
            if (lead >= 0 && later.get(t).detectable()) {
                opportunities[lead]++;
                MeetingPairs.Pair pair = byTruth.get(t);
                if (pair != null && foreseen.get(pair.found()).probability() >= SAID) {
                    hits[lead]++;
                    place[lead].add(pair.km(), Double.NaN, 1);
                    time[lead].add(pair.minutes(), foreseen.get(pair.found()).timeSdS() / 60, 1);
                }
            }
        }
        for (int f = 0; f < foreseen.size(); f++) {
            Meeting meeting = foreseen.get(f);
            boolean did = byFound.containsKey(f);
            int lead = lead(meeting.timeMs() - issued.issuedMs());
            if (lead >= 0 && !did && meeting.probability() >= SAID) {
                falseAlarms[lead]++;
            }
            int c = Math.min(PROBABILITY_CLASSES - 1, (int) (meeting.probability() * PROBABILITY_CLASSES));
            forecasts[c]++;
            stated[c] += meeting.probability();
            came[c] += did ? 1 : 0;
            squares += Math.pow(meeting.probability() - (did ? 1 : 0), 2);
        }
    }

    /** Class of a lead time, bounded midway between the classes' middles and as far beyond the outer ones; −1 for none. */
    private static int lead(long ms) {
        double minutes = ms / 60000.0;
        for (int i = 0; i < LEADS_MIN.length; i++) {
            double low = i == 0 ? LEADS_MIN[0] - (LEADS_MIN[1] - LEADS_MIN[0]) / 2 : (LEADS_MIN[i - 1] + LEADS_MIN[i]) / 2;
            double high = i == LEADS_MIN.length - 1 ? LEADS_MIN[i] + (LEADS_MIN[i] - LEADS_MIN[i - 1]) / 2
                    : (LEADS_MIN[i] + LEADS_MIN[i + 1]) / 2;
            if (minutes >= low && minutes < high) {
                return i;
            }
        }
        return -1;
    }

    private ForecastScore told() {
        List<ForecastScore.Lead> leads = new ArrayList<>();
        int[] once = {1};
        for (int i = 0; i < LEADS_MIN.length; i++) {
            PooledErrors km = new PooledErrors(List.of(place[i].collected()));
            PooledErrors minutes = new PooledErrors(List.of(time[i].collected()));
            leads.add(new ForecastScore.Lead(LEADS_MIN[i], opportunities[i], hits[i], falseAlarms[i],
                    km.quantileAbs(0.5, once), minutes.quantileAbs(0.5, once), minutes.bias(once),
                    minutes.shareWithin(2, once)));
        }
        List<ForecastScore.Reliability> reliability = new ArrayList<>();
        for (int c = 0; c < PROBABILITY_CLASSES; c++) {
            reliability.add(new ForecastScore.Reliability((double) c / PROBABILITY_CLASSES,
                    (c + 1.0) / PROBABILITY_CLASSES, forecasts[c], forecasts[c] == 0 ? Double.NaN : stated[c] / forecasts[c],
                    forecasts[c] == 0 ? Double.NaN : (double) came[c] / forecasts[c]));
        }
        int all = Arrays.stream(forecasts).sum();
        return new ForecastScore(leads, reliability, all == 0 ? Double.NaN : squares / all);
    }
}
