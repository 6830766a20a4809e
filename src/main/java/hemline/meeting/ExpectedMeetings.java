package hemline.meeting;

import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;

/**
 * Meetings to come: both lines are carried on along their normals in many sampled futures, each track with an error of
 * its speed and an unforeseen change of it, drawn anew. The futures in which they touch give the probability, the time
 * and the place with their spread.
 */
final class ExpectedMeetings {
    private static final double POSITION_SD_KM = 0.5;

    private final List<SweepFrame> frames;
    private final MeetingSettings settings;
    private final long originMs;
    private final double nowS;

    ExpectedMeetings(List<SweepFrame> frames, MeetingSettings settings) {
        this.frames = frames;
        this.settings = settings;
        originMs = frames.get(0).meanTimeMs();
        nowS = (frames.get(frames.size() - 1).meanTimeMs() - originMs) / 1000.0;
    }

    /** The meeting to come of a pair that has not met; empty when it is less likely than the settings ask. */
    Optional<Meeting> of(Track a, Track b) {
        double horizonKs = settings.horizonS() / 1000;
        FacingPairs pairs = new FacingPairs(CurrentLines.atEnd(a, frames, settings.extendKm()),
                CurrentLines.atEnd(b, frames, settings.extendKm()), nowS, settings.minCrossDeg(), horizonKs);
        if (pairs.isEmpty()) {
            return Optional.empty();
        }
        SplittableRandom random = new SplittableRandom(settings.seed());
        List<FacingPairs.Contact> contacts = new ArrayList<>();
        for (int draw = 0; draw < settings.draws(); draw++) {
            FacingPairs.Contact found = pairs.first(gaussian(random), Outlook.CHANGE * gaussian(random),
                    gaussian(random), Outlook.CHANGE * gaussian(random), random.nextDouble(), horizonKs);
            if (found != null) {
                contacts.add(found);
            }
        }
        double probability = (double) contacts.size() / settings.draws();
        return contacts.size() >= 2 && probability >= settings.minProbability()
                ? Optional.of(meeting(a, b, contacts, probability)) : Optional.empty();
    }

    private static double gaussian(SplittableRandom random) {
        // Box and Muller; StrictMath so that the same seed gives the same futures everywhere.
        return StrictMath.sqrt(-2 * StrictMath.log(1 - random.nextDouble()))
                * StrictMath.cos(2 * Math.PI * random.nextDouble());
    }

    private Meeting meeting(Track a, Track b, List<FacingPairs.Contact> contacts, double probability) {
        int n = contacts.size();
        double t = 0;
        double x = 0;
        double y = 0;
        double closing = 0;
        double cross = 0;
        for (FacingPairs.Contact one : contacts) {
            t += one.afterKs() / n;
            x += one.place().xKm() / n;
            y += one.place().yKm() / n;
            closing += one.closingMs() / n;
            cross += one.crossDeg() / n;
        }
        double tt = 0;
        double cc = 0;
        double xx = POSITION_SD_KM * POSITION_SD_KM;
        double yy = xx;
        double xy = 0;
        for (FacingPairs.Contact one : contacts) {
            double dx = one.place().xKm() - x;
            double dy = one.place().yKm() - y;
            tt += (one.afterKs() - t) * (one.afterKs() - t) / (n - 1);
            cc += (one.closingMs() - closing) * (one.closingMs() - closing) / (n - 1);
            xx += dx * dx / (n - 1);
            yy += dy * dy / (n - 1);
            xy += dx * dy / (n - 1);
        }
        double positionKs = POSITION_SD_KM * Math.sqrt(2) / Math.max(1, closing);
        return new Meeting("-", a.id(), b.id(), originMs + Math.round(1000 * (nowS + 1000 * t)),
                1000 * Math.sqrt(tt + positionKs * positionKs),
                new Point(x, y), Ellipses.of(xx, yy, xy), cross, new Speed(closing, Math.sqrt(cc)),
                Meeting.Status.EXPECTED, probability);
    }
}
