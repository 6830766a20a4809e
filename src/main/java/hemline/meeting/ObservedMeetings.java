package hemline.meeting;

import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
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
        double lastS = (frames.get(frames.size() - 1).meanTimeMs() - originMs) / 1000.0;
        Approach before = null;
        for (int k = 0; k < frames.size(); k++) {
            if (!atA.containsKey(k) || !atB.containsKey(k)) {
                continue;
            }
            double timeS = (frames.get(k).meanTimeMs() - originMs) / 1000.0;
            double nextS = k + 1 < frames.size() ? (frames.get(k + 1).meanTimeMs() - originMs) / 1000.0 : lastS;
            List<MovingLine> linesA = lines(atA.get(k), a);
            List<MovingLine> linesB = lines(atB.get(k), b);
            Approach now = Approach.nearest(linesA, linesB, timeS, settings.minCrossDeg());
            if (now == null) {
                continue;
            }
            boolean touching = now.gapKm() <= settings.contactKm();
            boolean both = atA.containsKey(k + 1) && atB.containsKey(k + 1);
            double due = now.closingMs() > LEAST_CLOSING_MS ? 1000 * now.gapKm() / now.closingMs() : Double.NaN;
            boolean dueSoon = due <= (both ? 0 : 1.2) * (nextS - timeS);
            if (touching || dueSoon) {
                if (touching && before == null && now.gapKm() < settings.contactKm() / 2) {
                    return Optional.empty();
                }
                return Optional.of(meeting(a, b, now, timeS, lastS));
            }
            before = now;
        }
        return Optional.empty();
    }

    private List<MovingLine> lines(List<TrackPiece> pieces, Track track) {
        List<MovingLine> lines = new ArrayList<>();
        double fallback = track.speed().isKnown() ? track.speed().speedMs() : 5;
        for (TrackPiece piece : pieces) {
            lines.add(MovingLine.of(piece, originMs, settings.extendKm(), fallback));
        }
        return lines;
    }

    private Meeting meeting(Track a, Track b, Approach near, double timeS, double lastS) {
        double closing = Math.max(near.closingMs(), LEAST_CLOSING_MS);
        double wait = Math.min(1000 * near.gapKm() / closing, Math.max(0, lastS - timeS));
        // sₜ = sqrt(s_d² + t²(s₁² + s₂²)) / (c₁ + c₂)
        double sdS = 1000 * Math.hypot(GAP_SD_KM + 0.1 * near.carriedKm(), wait / 1000 * near.sdMs()) / closing;
        double across = GAP_SD_KM;
        double along = Math.max(across, across / Math.max(0.1, Math.sin(Math.toRadians(near.crossDeg()))));
        double bearing = new Point(near.alongX(), near.alongY()).bearingDeg() % 180;
        return new Meeting("-", a.id(), b.id(), originMs + Math.round(1000 * (timeS + wait)), sdS,
                new Point(near.x(), near.y()), new Meeting.Ellipse(along, across, bearing), near.crossDeg(),
                new Speed(closing, near.sdMs()), Meeting.Status.OBSERVED, 1);
    }
}
