package hemline.meeting;

import hemline.boundary.Arrival;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.geometry.Point;
import hemline.numerics.Distributions;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;

/**
 * When moving boundaries reach places: every vertex goes on along its normal at its speed, and a place is reached by
 * the part of the line whose path leads over it. Only what the loop holds is used, so that a loop cut short gives the
 * forecast that could have been made then.
 */
public final class Arrivals {
    /** How far a line is carried on beyond its ends, km. */
    private static final double EXTEND_KM = 10;
    /** Vertices of one line farther apart than this, once moved, do not sweep what lies between them, km. */
    private static final double WIDEST_KM = 15;
    /** Position error of a line at the end of the loop, km. */
    private static final double POSITION_SD_KM = 0.5;
    private static final double LEAST_SPEED_MS = 1;

    private Arrivals() {
    }

    /**
     * One arrival for each site and each track that is there at the end of the loop, by site and then by track.
     *
     * @param tracks   with speeds measured
     * @param frames   every sweep of the loop, by rising index from 0
     * @param horizonS how far ahead from the last sweep is looked, s
     */
    public static List<Arrival> forecast(List<Track> tracks, List<SweepFrame> frames, List<Site> sites,
                                         double horizonS) {
        if (!(horizonS > 0)) {
            throw new IllegalArgumentException("the horizon must be above 0 s, got " + horizonS);
        }
        List<Arrival> arrivals = new ArrayList<>();
        if (frames.isEmpty()) {
            return arrivals;
        }
        long originMs = frames.get(0).meanTimeMs();
        double nowS = (frames.get(frames.size() - 1).meanTimeMs() - originMs) / 1000.0;
        List<List<MovingLine>> lines = tracks.stream().map(t -> CurrentLines.atEnd(t, frames, EXTEND_KM)).toList();
        for (Site site : sites) {
            for (int t = 0; t < tracks.size(); t++) {
                if (!lines.get(t).isEmpty()) {
                    arrivals.add(arrival(site, tracks.get(t).id(), lines.get(t), nowS, originMs, horizonS));
                }
            }
        }
        return arrivals;
    }

    private static Arrival arrival(Site site, String track, List<MovingLine> lines, double nowS, long originMs,
                                   double horizonS) {
        Passage best = null;
        for (MovingLine line : lines) {
            for (int i = 0; i + 1 < line.size(); i++) {
                Passage found = passage(site.position(), line, i, nowS, horizonS);
                if (found != null && (best == null || found.timeS < best.timeS)) {
                    best = found;
                }
            }
        }
        if (best == null || best.timeS > nowS + horizonS) {
            double probability = best == null ? 0 : best.probability;
            return new Arrival(site.name(), track, originMs, Double.NaN, probability, Speed.UNKNOWN, Double.NaN, false);
        }
        return new Arrival(site.name(), track, originMs + Math.round(1000 * best.timeS), best.sdS, best.probability,
                new Speed(best.speedMs, best.speedSdMs), best.bearingDeg, true);
    }

    private record Passage(double timeS, double sdS, double probability, double speedMs, double speedSdMs,
                           double bearingDeg) {
    }

    /** Passage of the stretch between a vertex and the next over a place, if it lies ahead of it. */
    private static Passage passage(Point place, MovingLine line, int i, double nowS, double horizonS) {
        double before = sideways(place, line, i);
        double after = sideways(place, line, i + 1);
        if (Double.isNaN(before) || Double.isNaN(after) || before * after > 0 || before == after) {
            return null;
        }
        double share = before / (before - after);
        double speed = (1 - share) * line.speedMs(i) + share * line.speedMs(i + 1);
        double ahead = (1 - share) * ahead(place, line, i) + share * ahead(place, line, i + 1);
        if (speed < LEAST_SPEED_MS || ahead < 0) {
            return null;
        }
        double seenS = (1 - share) * line.timeS()[i] + share * line.timeS()[i + 1];
        double travelS = 1000 * ahead / speed;
        if (line.at(i, seenS + travelS).distanceKm(line.at(i + 1, seenS + travelS)) > WIDEST_KM
                || seenS + travelS < nowS - 60) {
            return null;
        }
        double speedSd = line.sdMs()[i];
        double sdS = 1000 * Outlook.pathSdKm(POSITION_SD_KM, speedSd, travelS) / speed;
        double carried = Math.max(line.carriedKm()[i], line.carriedKm()[i + 1]);
        double probability = Outlook.presence(carried)
                * Distributions.normalBelow((nowS + horizonS - seenS - travelS) / sdS);
        Point toward = new Point((1 - share) * line.velocityX()[i] + share * line.velocityX()[i + 1],
                (1 - share) * line.velocityY()[i] + share * line.velocityY()[i + 1]);
        return new Passage(seenS + travelS, sdS, probability, speed, Outlook.speedSdMs(speedSd, travelS),
                toward.bearingDeg());
    }

    /** Distance of a place from the path of a vertex, km, positive to the left; NaN for a vertex at rest. */
    private static double sideways(Point place, MovingLine line, int i) {
        double speed = line.speedMs(i);
        return speed < 1e-6 ? Double.NaN : (-(place.xKm() - line.x()[i]) * line.velocityY()[i]
                + (place.yKm() - line.y()[i]) * line.velocityX()[i]) / speed;
    }

    private static double ahead(Point place, MovingLine line, int i) {
        double speed = Math.max(1e-6, line.speedMs(i));
        return ((place.xKm() - line.x()[i]) * line.velocityX()[i] + (place.yKm() - line.y()[i]) * line.velocityY()[i])
                / speed;
    }
}
