package hemline.outflow;

import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * When a tracked line passed over a place, and how it moved there.
 *
 * @param timeMs     ms since 1970-01-01T00:00Z
 * @param timeSdS    standard deviation, s
 * @param bearingDeg compass bearing moved toward, degrees
 * @param speed      along that bearing
 */
record TrackCrossing(long timeMs, double timeSdS, double bearingDeg, Speed speed) {

    /**
     * The first time the line's distance ahead of the place changes from before to past: a straight line is fitted to
     * the signed distances of up to two sweeps on either side, at the times of their rays. Empty when that does not
     * happen within the track, the place is past the ends of the line, or the track has no direction of motion.
     */
    static Optional<TrackCrossing> of(Track track, Point place, StationSettings settings) {
        List<Side> sides = new ArrayList<>();
        for (List<TrackPiece> pieces : track.bySweep().values()) {
            Side.of(track, pieces, place, settings.pastEndKm()).ifPresent(sides::add);
        }
        for (int i = 0; i + 1 < sides.size(); i++) {
            double minutes = (sides.get(i + 1).timeMs - sides.get(i).timeMs) / 60000.0;
            if (sides.get(i).aheadKm > 0 && sides.get(i + 1).aheadKm <= 0 && minutes <= settings.maxStepMinutes()) {
                return Optional.of(fitted(sides, i, settings));
            }
        }
        return Optional.empty();
    }

    private static TrackCrossing fitted(List<Side> sides, int before, StationSettings settings) {
        List<Side> near = new ArrayList<>();
        long reference = sides.get(before).timeMs;
        for (int i = Math.max(0, before - 1); i <= Math.min(sides.size() - 1, before + 2); i++) {
            boolean own = i == before || i == before + 1;
            if (own || Math.abs(sides.get(i).timeMs - reference) <= 60_000 * settings.maxStepMinutes()) {
                near.add(sides.get(i));
            }
        }
        Fit fit = Fit.of(near, reference, settings.positionSdKm());
        // Points farther off must not bend the answer out of the interval the line was seen to pass in.
        if (!(fit.slope < 0) || fit.crossingS < 0
                || fit.crossingS > (sides.get(before + 1).timeMs - reference) / 1000.0) {
            fit = Fit.of(sides.subList(before, before + 2), reference, settings.positionSdKm());
        }
        Side nearest = Math.abs(sides.get(before).aheadKm) < Math.abs(sides.get(before + 1).aheadKm)
                ? sides.get(before) : sides.get(before + 1);
        Speed speed = nearest.speed.isKnown() ? nearest.speed : new Speed(-1000 * fit.slope, 1000 * fit.slopeSd);
        return new TrackCrossing(reference + Math.round(1000 * fit.crossingS), fit.crossingSdS, nearest.bearingDeg, speed);
    }

    /**
     * The least-squares line of signed distance on time.
     *
     * @param slope       km s⁻¹
     * @param crossingS   when it is 0, s after the reference
     */
    private record Fit(double slope, double slopeSd, double crossingS, double crossingSdS) {
        static Fit of(List<Side> sides, long referenceMs, double positionSdKm) {
            int n = sides.size();
            double meanT = sides.stream().mapToDouble(s -> (s.timeMs - referenceMs) / 1000.0).average().orElseThrow();
            double meanD = sides.stream().mapToDouble(s -> s.aheadKm).average().orElseThrow();
            double sxx = 0;
            double sxy = 0;
            for (Side side : sides) {
                double t = (side.timeMs - referenceMs) / 1000.0 - meanT;
                sxx += t * t;
                sxy += t * (side.aheadKm - meanD);
            }
            double slope = sxy / sxx;
            double squares = 0;
            for (Side side : sides) {
                double t = (side.timeMs - referenceMs) / 1000.0 - meanT;
                squares += Math.pow(side.aheadKm - meanD - slope * t, 2);
            }
            double sd = n > 2 ? Math.max(positionSdKm, Math.sqrt(squares / (n - 2))) : positionSdKm;
            double crossing = meanT - meanD / slope;
            return new Fit(slope, sd / Math.sqrt(sxx), crossing,
                    sd / Math.abs(slope) * Math.sqrt(1.0 / n + Math.pow(crossing - meanT, 2) / sxx));
        }
    }

    /**
     * Where a place lies to the line in one sweep.
     *
     * @param timeMs  time of the line's nearest point, ms
     * @param aheadKm distance of the place from the line, km, positive where the line has yet to come
     */
    private record Side(long timeMs, double aheadKm, double bearingDeg, Speed speed) {

        static Optional<Side> of(Track track, List<TrackPiece> pieces, Point place, double pastEndKm) {
            Side best = null;
            double bestKm = Double.POSITIVE_INFINITY;
            for (TrackPiece piece : pieces) {
                List<TrackVertex> vertices = piece.vertices();
                for (int i = 0; i + 1 < vertices.size(); i++) {
                    Point a = vertices.get(i).position();
                    Point step = vertices.get(i + 1).position().minus(a);
                    double length2 = step.dot(step);
                    double share = length2 == 0 ? 0 : Math.max(0, Math.min(1, place.minus(a).dot(step) / length2));
                    Point off = place.minus(a.plus(step.times(share)));
                    TrackVertex nearer = vertices.get(share < 0.5 ? i : i + 1);
                    double bearing = Double.isNaN(nearer.normalBearingDeg()) ? track.bearingDeg()
                            : nearer.normalBearingDeg();
                    if (off.lengthKm() >= bestKm || Double.isNaN(bearing)) {
                        continue;
                    }
                    Point normal = Point.towards(bearing);
                    if (Math.abs(off.cross(normal)) > Math.max(pastEndKm, 0.5 * Math.abs(off.dot(normal)))) {
                        continue;
                    }
                    bestKm = off.lengthKm();
                    long time = vertices.get(i).timeMs()
                            + Math.round(share * (vertices.get(i + 1).timeMs() - vertices.get(i).timeMs()));
                    best = new Side(time, off.dot(normal), bearing, nearer.speed());
                }
            }
            return Optional.ofNullable(best);
        }
    }
}
