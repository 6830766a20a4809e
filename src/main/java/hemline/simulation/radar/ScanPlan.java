package hemline.simulation.radar;

import hemline.simulation.random.Streams;
import hemline.sweep.RayGeometry;
import java.util.stream.IntStream;
import org.apache.commons.math3.random.RandomGenerator;

/**
 * One turn of an invented antenna: rays in the order of scanning, each with its own azimuth and time. The antenna starts
 * at some azimuth, turns clockwise at an even speed and each ray lies a little off its nominal place.
 */
public final class ScanPlan {
    private final double startAzimuthDeg;
    private final double startS;
    private final double turnDegS;
    private final double[] turnedDeg;
    private final int[] byAzimuth;

    /**
     * @param startS time of the first ray, s after the scene's start
     * @param sweep  index of the sweep, for its random numbers
     */
    public ScanPlan(RadarSpec radar, double startS, int sweep, Streams streams) {
        RandomGenerator random = streams.stream("scan", sweep, 0);
        this.startS = startS;
        startAzimuthDeg = 360 * random.nextDouble();
        turnDegS = radar.dish().turnDegS();
        double step = radar.dish().stepDeg();
        turnedDeg = new double[radar.dish().rays()];
        for (int i = 0; i < turnedDeg.length; i++) {
            double jitter = radar.dish().jitterDeg() * random.nextGaussian();
            turnedDeg[i] = (i + 0.5) * step + Math.max(-0.35 * step, Math.min(0.35 * step, jitter));
        }
        byAzimuth = IntStream.range(0, turnedDeg.length).boxed()
                .sorted(java.util.Comparator.comparingDouble(this::azimuthDeg)).mapToInt(Integer::intValue).toArray();
    }

    public int rays() {
        return turnedDeg.length;
    }

    /** How far the antenna had turned at a ray in the order of scanning, degrees. */
    public double turnedDeg(int scanned) {
        return turnedDeg[scanned];
    }

    /** Azimuth of an angle turned, degrees clockwise from north in [0, 360). */
    public double azimuthOfDeg(double turned) {
        double azimuth = (startAzimuthDeg + turned) % 360;
        return azimuth < 0 ? azimuth + 360 : azimuth;
    }

    public double azimuthDeg(int scanned) {
        return azimuthOfDeg(turnedDeg[scanned]);
    }

    /** Time of an angle turned, s after the scene's start. */
    public double timeOfS(double turned) {
        return startS + turned / turnDegS;
    }

    /** Time of the ray over an azimuth, s after the scene's start. */
    public double timeOverS(double azimuthDeg) {
        double turned = (azimuthDeg - startAzimuthDeg) % 360;
        return timeOfS(turned < 0 ? turned + 360 : turned);
    }

    /** The scanned ray at a place in the order of azimuth. */
    public int scannedAt(int rank) {
        return byAzimuth[rank];
    }

    /** Rays by rising azimuth, with their times as whole milliseconds. */
    public RayGeometry geometry(long sceneStartMs, double elevationDeg) {
        int n = rays();
        double[] azimuth = new double[n];
        double[] elevation = new double[n];
        long[] time = new long[n];
        for (int rank = 0; rank < n; rank++) {
            azimuth[rank] = storedDeg(azimuthDeg(byAzimuth[rank]));
            elevation[rank] = elevationDeg;
            time[rank] = sceneStartMs + Math.round(1000 * timeOfS(turnedDeg[byAzimuth[rank]]));
        }
        return new RayGeometry(azimuth, elevation, time);
    }

    /** Azimuths are recorded in single precision, as files hold them. */
    private static double storedDeg(double azimuthDeg) {
        float stored = (float) azimuthDeg;
        return stored >= 360 ? 0 : stored;
    }
}
