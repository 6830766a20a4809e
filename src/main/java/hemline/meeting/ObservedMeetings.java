package hemline.meeting;

import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;

/** First contact of a pair of tracks within the loop, to less than a sweep interval. */
final class ObservedMeetings {
    /** Position error of a gap between two lines, km. */
    private static final double GAP_SD_KM = 0.7;
    private static final double LEAST_CLOSING_MS = 2;

    private final List<SweepFrame> frames;
    private final MeetingSettings settings;
    private final long originMs;

    ObservedMeetings(List<SweepFrame> frames, MeetingSettings settings) {
        this.frames = frames;
        this.settings = settings;
        originMs = frames.get(0).meanTimeMs();
    }

    /** The first contact, if the loop shows one. The id is not yet given. */
    Optional<Meeting> of(Track a, Track b) {
        SortedMap<Integer, List<TrackPiece>> atA = a.bySweep();
        SortedMap<Integer, List<TrackPiece>> atB = b.bySweep();
        Approach before = null;
        double beforeS = Double.NaN;
        double endS = timeS(frames.size() - 1);
        for (int k = 0; k < frames.size(); k++) {
            if (!atA.containsKey(k) || !atB.containsKey(k)) {
                continue;
            }
            Approach now = Approach.nearest(
                    CurrentLines.of(a, atA.get(k), originMs, settings.extendKm()),
                    CurrentLines.of(b, atB.get(k), originMs, settings.extendKm()), timeS(k), settings.minCrossDeg());
            if (now == null) {
                continue;
            }
            if (now.gapKm() + now.carrySdKm() <= settings.contactKm()) {
                return before == null ? Optional.empty() : Optional.of(touched(a, b, before, beforeS, timeS(k)));
            }
            before = now;
            beforeS = timeS(k);
        }
        if (before == null || before.closingMs() < LEAST_CLOSING_MS) {
            return Optional.empty();
        }
        // One of the two ended; the gap may have closed before the next sweep that could show it.
        double waitS = 1000 * before.gapKm() / before.closingMs();
        double lastS = beforeS;
        double nextS = frames.stream().mapToDouble(f -> timeS(f.index())).filter(t -> t > lastS).findFirst()
                .orElse(endS);
        return beforeS + waitS <= nextS + 0.2 * (nextS - beforeS)
                ? Optional.of(meeting(a, b, before, Math.min(beforeS + waitS, endS), waitS)) : Optional.empty();
    }

    private double timeS(int sweep) {
        return (frames.get(sweep).meanTimeMs() - originMs) / 1000.0;
    }

    /** Contact between a sweep that shows a gap and one that shows none, by the speed at which the gap closed. */
    private Meeting touched(Track a, Track b, Approach apart, double apartS, double togetherS) {
        double waitS = 1000 * apart.gapKm() / Math.max(LEAST_CLOSING_MS, apart.closingMs());
        double timeS = Math.min(apartS + waitS, togetherS);
        return meeting(a, b, apart, timeS, timeS - apartS);
    }

    private Meeting meeting(Track a, Track b, Approach near, double timeS, double waitS) {
        double closing = Math.max(near.closingMs(), LEAST_CLOSING_MS);
        // sₜ = sqrt(s_d² + t²(s₁² + s₂²)) / (c₁ + c₂)
        double sdS = 1000 * Math.hypot(Math.hypot(GAP_SD_KM, near.carrySdKm()), waitS / 1000 * near.sdMs()) / closing;
        double across = Math.hypot(GAP_SD_KM, near.carrySdKm());
        double along = Math.max(across, across / Math.max(0.1, Math.sin(Math.toRadians(near.crossDeg()))));
        double bearing = new Point(near.alongX(), near.alongY()).bearingDeg() % 180;
        return new Meeting("-", a.id(), b.id(), originMs + Math.round(1000 * timeS), sdS,
                near.placeAfter(waitS), new Meeting.Ellipse(along, across, bearing), near.crossDeg(),
                new Speed(closing, near.sdMs()), Meeting.Status.OBSERVED, 1);
    }
}
