package hemline.export;

import hemline.sweep.Field;
import hemline.sweep.RadarSite;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import java.util.Optional;

/** A sweep with a bright ring, gates below detection north of it and a lost sector. */
final class InventedSweep {
    static final int GATES = 120;

    private InventedSweep() {
    }

    static Sweep of(int index, RadarSite site) {
        SweepFrame frame = InventedAnalysis.frame(index);
        float[] dbz = new float[360 * GATES];
        for (int ray = 0; ray < 360; ray++) {
            for (int gate = 0; gate < GATES; gate++) {
                dbz[ray * GATES + gate] = value(ray + 0.5, 0.25 + 0.5 * gate, 10 + 3 * index);
            }
        }
        return new Sweep(site, "invented " + index, 0.5, 1, 250, 500, frame.rays(),
                new Field("DBZH", "dBZ", 360, GATES, dbz), Optional.empty(), Double.NaN);
    }

    private static float value(double azimuth, double rangeKm, double radiusKm) {
        if (azimuth > 200 && azimuth < 206) {
            return Field.NOT_MEASURED;
        }
        double x = rangeKm * Math.sin(Math.toRadians(azimuth));
        double y = rangeKm * Math.cos(Math.toRadians(azimuth));
        double off = Math.hypot(x + 30, y + 5) - radiusKm;
        return y > 30 ? Field.BELOW_DETECTION : (float) (2 + 16 * Math.exp(-off * off / 2));
    }
}
