package hemline.detection;

import hemline.sweep.Field;
import hemline.sweep.Loop;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.Sweep;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;

/** Tiny invented loops: clear air with speckle and whatever a test puts into it. */
final class InventedAir {
    /** Reflectivity without speckle at a place and time, dBZ. */
    interface Echo {
        double dbz(double xKm, double yKm, double seconds);
    }

    int rays = 360;
    int gates = 120;
    double gateM = 500;
    double intervalS = 300;
    int sweeps = 6;
    double speckleDb = 2;
    /** Lowest value shown; below it gates hold no echo, dBZ at 1 km. */
    double floorAt1Km = -45;
    long seed = 1;
    Echo echo = (x, y, t) -> 2;

    Loop loop() {
        List<Sweep> made = new ArrayList<>();
        for (int k = 0; k < sweeps; k++) {
            made.add(sweep(k));
        }
        return Loop.of(made);
    }

    private Sweep sweep(int k) {
        Random random = new Random(seed * 1000 + k);
        double[] azimuth = new double[rays];
        double[] elevation = new double[rays];
        long[] time = new long[rays];
        float[] values = new float[rays * gates];
        double startS = k * intervalS;
        for (int r = 0; r < rays; r++) {
            azimuth[r] = (r + 0.5) * 360 / rays;
            elevation[r] = 0.5;
            double seconds = startS + 20.0 * r / rays;
            time[r] = Math.round(1000 * seconds);
            for (int g = 0; g < gates; g++) {
                double range = (g + 0.5) * gateM / 1000;
                double angle = Math.toRadians(azimuth[r]);
                double dbz = echo.dbz(range * Math.sin(angle), range * Math.cos(angle), seconds)
                        + speckleDb * random.nextGaussian();
                boolean heard = dbz > floorAt1Km + 20 * Math.log10(range);
                values[r * gates + g] = Double.isNaN(dbz) ? Field.NOT_MEASURED
                        : heard ? (float) dbz : Field.BELOW_DETECTION;
            }
        }
        Field field = new Field("DBZH", "dBZ", rays, gates, values);
        return new Sweep(new RadarSite("invented", Optional.empty(), Double.NaN), "sweep " + k, 0.5, 1, gateM / 2, gateM,
                new RayGeometry(azimuth, elevation, time), field, Optional.empty(), Double.NaN);
    }

    /** A thin line across the plane, moving along a bearing; Gaussian across, of the given half-power width. */
    static Echo line(double bearingDeg, double startKm, double speedMs, double peakDb, double widthKm) {
        double nx = Math.sin(Math.toRadians(bearingDeg));
        double ny = Math.cos(Math.toRadians(bearingDeg));
        double sigma = widthKm / 2.355;
        return (x, y, t) -> {
            double across = x * nx + y * ny - startKm - speedMs * t / 1000;
            double along = -x * ny + y * nx;
            double fade = Math.abs(along) < 30 ? 1 : 0;
            return 2 + fade * peakDb * Math.exp(-0.5 * across * across / (sigma * sigma));
        };
    }
}
