package hemline.simulation.making;

import hemline.simulation.echo.Decibels;
import hemline.simulation.radar.Packing;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.random.Speckle;
import hemline.simulation.random.Streams;
import hemline.sweep.Field;
import hemline.sweep.Sweep;
import java.util.Optional;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.util.FastMath;

/**
 * What a receiver makes of a clean sweep: the echo and the receiver's noise fluctuate together, the noise is taken off,
 * what is left is reported when it is strong enough, and the number is rounded to what the file can hold.
 */
final class Reception {
    /** Spectrum width of clear air and rain, m s⁻¹: sets the error of a velocity. */
    private static final double SPECTRUM_WIDTH_MS = 1.5;
    private final RadarSpec radar;
    private final Speckle speckle;
    private final Streams streams;

    Reception(RadarSpec radar, Streams streams) {
        this.radar = radar;
        this.speckle = new Speckle(radar.receiver().samples());
        this.streams = streams;
    }

    Sweep receive(CleanSweep clean, long sceneStartMs, int sweep, String source) {
        float[] dbz = new float[clean.rays * clean.gates];
        float[] velocity = new float[clean.velocity.length];
        for (int r = 0; r < clean.rays; r++) {
            receiveRay(clean, r, streams.stream("receiver", sweep, clean.plan.scannedAt(r)), dbz, velocity);
        }
        Field reflectivity = new Field("DBZH", "dBZ", clean.rays, clean.gates, dbz);
        Optional<Field> radial = velocity.length == 0 ? Optional.empty()
                : Optional.of(new Field("VRADH", "m s-1", clean.rays, clean.gates, velocity));
        return new Sweep(radar.site(), source, radar.dish().elevationDeg(), radar.dish().beamWidthDeg(),
                radar.gates().firstCentreM(), radar.gates().spacingM(),
                clean.plan.geometry(sceneStartMs, radar.dish().elevationDeg()), reflectivity, radial,
                velocity.length == 0 ? Double.NaN : radar.receiver().nyquistMs());
    }

    private void receiveRay(CleanSweep clean, int ray, RandomGenerator random, float[] dbz, float[] velocity) {
        Packing packing = radar.receiver().packing();
        double threshold = Decibels.toLinear(radar.receiver().thresholdDb());
        double velocitySd = SPECTRUM_WIDTH_MS / Math.sqrt(radar.receiver().samples());
        for (int g = 0; g < clean.gates; g++) {
            int i = ray * clean.gates + g;
            double noise = clean.noise(g);
            double fluctuation = speckle.drawDb(random);
            double error = random.nextGaussian();
            if (clean.lost[ray]) {
                dbz[i] = Field.NOT_MEASURED;
            } else {
                double left = (clean.total[i] + noise) * Decibels.toLinear(fluctuation) - noise;
                double value = left >= threshold * noise ? Decibels.fromLinear(left) : Double.NEGATIVE_INFINITY;
                dbz[i] = (float) packing.unpack(packing.pack(value));
            }
            if (velocity.length > 0) {
                velocity[i] = Field.isEcho(dbz[i]) ? folded(clean, i, noise, velocitySd * error) : dbz[i];
            }
        }
    }

    private float folded(CleanSweep clean, int gate, double noise, double error) {
        double worse = Math.sqrt(1 + noise / Math.max(1e-12, clean.total[gate]));
        double nyquist = radar.receiver().nyquistMs();
        double value = clean.velocity[gate] + worse * error;
        double turn = FastMath.floor((value + nyquist) / (2 * nyquist));
        Packing packing = radar.receiver().velocityPacking();
        return (float) packing.unpack(packing.pack(value - 2 * nyquist * turn));
    }
}
