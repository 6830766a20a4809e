package hemline.outflow;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.station.StationObservation;
import hemline.boundary.station.StationSeries;
import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.SplittableRandom;

/**
 * An invented line that moves north at 10 m/s and passes the station 30 km north of the radar at {@link #PASSAGE_MS},
 * and the station's record: pressure rises from 3 minutes before, the wind jumps at the passage, temperature falls from
 * then over 8 minutes.
 */
final class InventedStation {
    static final LocalPlane PLANE = new LocalPlane(new GeoPoint(48, 9));
    static final long PASSAGE_MS = 1_780_000_000_000L;
    static final double FALL_K = 6;
    static final double RISE_HPA = 1.5;

    private InventedStation() {
    }

    /** Sweeps each 5 minutes, 2 minutes off the passage; x from −20 to 20 km. */
    static Track track(double positionNoiseKm, long seed) {
        Random random = new Random(seed);
        List<TrackPiece> pieces = new ArrayList<>();
        for (int sweep = 0; sweep < 8; sweep++) {
            long time = PASSAGE_MS + (sweep - 4) * 300_000L + 120_000;
            double y = 30 + 0.01 * (time - PASSAGE_MS) / 1000.0 + positionNoiseKm * random.nextGaussian();
            List<TrackVertex> vertices = new ArrayList<>();
            for (int x = -20; x <= 20; x++) {
                vertices.add(new TrackVertex(new Point(x, y), time, 12, 600, 0, new Speed(10, 0.5), true));
            }
            pieces.add(new TrackPiece(sweep, BoundaryKind.THIN_LINE, Origin.AUTO, vertices));
        }
        return Track.linked("T1", pieces, 1);
    }

    static StationSeries station(long stepMs, double noise, long seed) {
        Random random = new Random(seed);
        List<StationObservation> observations = new ArrayList<>();
        // The passage falls anywhere between two observations.
        long from = PASSAGE_MS - 3_600_000 - (long) (stepMs * new SplittableRandom(seed).nextDouble());
        for (long time = from; time <= PASSAGE_MS + 3_600_000; time += stepMs) {
            double minutes = (time - PASSAGE_MS) / 60000.0;
            double fallen = Math.max(0, Math.min(1, minutes / 8));
            double risen = Math.max(0, Math.min(1, (minutes + 3) / 6));
            double north = minutes < 0 ? -2 : 9;
            double wind = north + 2 * noise * random.nextGaussian();
            double across = 1 + 2 * noise * random.nextGaussian();
            double temperature = 30 - FALL_K * fallen + noise * 0.6 * random.nextGaussian();
            double dewPoint = Math.min(temperature, 17 + noise * 0.6 * random.nextGaussian());
            double pressure = 960 + RISE_HPA * risen + 0.1 * noise * random.nextGaussian();
            double fromDeg = Math.toDegrees(Math.atan2(-across, -wind));
            observations.add(new StationObservation(time, temperature, dewPoint, pressure, Math.hypot(wind, across),
                    fromDeg < 0 ? fromDeg + 360 : fromDeg));
        }
        return new StationSeries("S1", PLANE.toGeo(new Point(0, 30)), 450, observations);
    }

    static StationSeries with(StationSeries series, List<StationObservation> observations) {
        return new StationSeries(series.name(), series.place(), series.altitudeM(), observations);
    }
}
